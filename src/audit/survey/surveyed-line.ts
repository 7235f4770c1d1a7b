import type { Claim, Grid, GridPoint, Point } from '../../claim/claim.ts'
import { DEG, wrap360 } from '../../quantity/degrees.ts'
import { formatDegrees } from '../../quantity/format-angle.ts'
import { isUnstated } from '../../quantity/unstated.ts'
import type { GeographicPoint } from '../../site/geographic-point.ts'
import { gridConvergenceDeg } from '../../site/grid-convergence.ts'
import { gridLineByConvergence } from '../../site/grid-line.ts'
import { lineDirection } from '../../site/line-direction.ts'
import { gridOf } from '../../site/transverse-mercator.ts'
import { NORTH_SD_DEG } from '../../site/true-north.ts'
import { DEFAULTS } from '../defaults.ts'
import { lineOnEarth } from './line-on-earth.ts'
import { eastOrWest, northOfPlan } from './north-of-plan.ts'
import { placeOfPoint, pointNamed, pointSdM, turned } from './place-of-point.ts'
import { projectionOf } from './projection-of.ts'
import { tieOf } from './tie-of.ts'

/** A line between two points of a survey. */
export interface SurveyedLine {
  /** From true north through east, of the line of the middles, degrees. */
  azimuthDeg: number
  /** Of the points, across the line. */
  sdDeg: number
  /** Of the north that its direction rests on; 0 where it is true by itself, negative where it turns the other way. */
  northSdDeg: number
  /** Which north that is: lines of the same one share its error. */
  northOf: 'plan' | 'grid' | null
  lengthM: number
  /** By the survey's own north, that of a plan or of a grid, degrees; null where that is true north itself. */
  bearingDeg: number | null
  /** How the direction follows from the coordinates, in sentences. */
  steps: readonly string[]
}

/** The line from one named point to another, by the kinds of their coordinates. */
export function surveyedLine(claim: Claim, fromName: string, toName: string): SurveyedLine {
  const [from, to] = [pointNamed(claim, fromName), pointNamed(claim, toName)]
  if (from.by === 'plan' && to.by === 'plan') return onPlan(claim, from, to)
  if (from.by === 'grid' && to.by === 'grid' && claim.grid?.by === 'convergence') {
    return onUnknownGrid(from, to, claim.grid.convergenceDeg)
  }
  return onEarth(claim, from, to)
}

function onPlan(
  claim: Claim,
  from: Extract<Point, { by: 'plan' }>,
  to: Extract<Point, { by: 'plan' }>,
): SurveyedLine {
  const line = lineDirection({ ...from, sdM: pointSdM(from) }, { ...to, sdM: pointSdM(to) })
  const north = northOfPlan(claim)
  const bearing = `Bearing on the plan ${formatDegrees(line.azimuthDeg)}.`
  return {
    ...line,
    azimuthDeg: wrap360(line.azimuthDeg + north.turnDeg),
    northSdDeg: north.sdDeg,
    northOf: 'plan',
    bearingDeg: north.turnDeg === 0 ? null : line.azimuthDeg,
    steps: north.steps.length === 0 ? [] : [bearing, ...north.steps],
  }
}

function onUnknownGrid(
  from: GridPoint & Point,
  to: GridPoint & Point,
  convergence: { value: number; sd: number | 'omitted' | 'unknown' },
): SurveyedLine {
  const { azimuthDeg, planeBearingDeg, planeLengthM } = gridLineByConvergence(from, to, convergence.value)
  return {
    azimuthDeg,
    sdDeg: Math.hypot(pointSdM(from), pointSdM(to)) / planeLengthM / DEG,
    northSdDeg: isUnstated(convergence.sd) ? NORTH_SD_DEG.grid : convergence.sd,
    northOf: 'grid',
    lengthM: planeLengthM,
    bearingDeg: planeBearingDeg,
    steps: [
      `Grid bearing ${formatDegrees(planeBearingDeg)}, turned by the convergence stated: grid north lies ${eastOrWest(convergence.value)} of true north.`,
    ],
  }
}

/** Both ends by their places on the Earth; one on the plan is carried there from the tie, and its north with it. */
function onEarth(claim: Claim, from: Point, to: Point): SurveyedLine {
  const [start, end] = [placeOfPoint(claim, from), placeOfPoint(claim, to)]
  const line = lineOnEarth(claim, from, to)
  // The reader of the claim file has made sure that both can be placed.
  if (start === null || end === null || line === null)
    throw new Error('a claim without errors joins no points of two kinds')
  if (line.lengthM === 0) throw new Error('a claim without errors joins no two points at one place')
  const grid = claim.grid?.by === 'projection' ? claim.grid : null
  const stone = from.by === 'plan' ? from : to
  // A plan turned clockwise carries a stone ahead of its tie to the right, and a line that begins there to the left.
  const side = stone === from ? -1 : 1
  // The whole plan is as well placed on the Earth as its tie is.
  const tieSdM = stone.by === 'plan' ? DEFAULTS.pointSdM.geographic : 0
  const isOfGrid = from.by === 'grid' || to.by === 'grid'
  const onGrid = grid !== null && isOfGrid ? seenOnGrid(grid, start, end) : null
  return {
    ...line,
    sdDeg: Math.hypot(pointSdM(from), pointSdM(to), tieSdM) / line.lengthM / DEG,
    northSdDeg:
      (northOfPlan(claim).sdDeg * side * alongFromTieM(claim, stone, line.azimuthDeg)) / line.lengthM,
    northOf: stone.by === 'plan' ? 'plan' : null,
    bearingDeg: onGrid?.planeBearingDeg ?? null,
    steps: [
      'From the places of both ends on the Earth: the azimuth of the geodesic, true north by itself.',
      ...(onGrid === null ? [] : [onGrid.words]),
    ],
  }
}

/**
 * How far along a line a point lies ahead of the tie, metres: a turn of the plan about the tie, clockwise, moves it so
 * far to the right for each radian. 0 for a point that is not on the plan.
 */
function alongFromTieM(claim: Claim, point: Point, azimuthDeg: number): number {
  const tie = tieOf(claim)?.point
  if (point.by !== 'plan' || tie === undefined) return 0
  const offset = { eastM: point.eastM - tie.eastM, northM: point.northM - tie.northM }
  const { eastM, northM } = turned(offset, northOfPlan(claim).turnDeg)
  return eastM * Math.sin(azimuthDeg * DEG) + northM * Math.cos(azimuthDeg * DEG)
}

/** What the line looks like on the grid, which a source may have taken for true. */
function seenOnGrid(
  { projection, name }: Extract<Grid, { by: 'projection' }>,
  start: GeographicPoint,
  end: GeographicPoint,
): { planeBearingDeg: number; words: string } {
  const grid = projectionOf(projection)
  const { planeBearingDeg } = gridLineByConvergence(gridOf(start, grid), gridOf(end, grid), 0)
  const convergence = eastOrWest(gridConvergenceDeg(start, grid))
  const words = `On the grid (${name}) its bearing is ${formatDegrees(planeBearingDeg)}, and grid north lies ${convergence} of true north at its start.`
  return { planeBearingDeg, words }
}
