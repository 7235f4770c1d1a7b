import type { Claim, Grid, GridPoint, Point } from '../../claim/claim.ts'
import { DEG, wrap360 } from '../../quantity/degrees.ts'
import { formatDegrees } from '../../quantity/format-angle.ts'
import { isUnstated } from '../../quantity/unstated.ts'
import { WGS84 } from '../../site/ellipsoid.ts'
import { geodesicLine } from '../../site/geodesic-line.ts'
import type { GeographicPoint } from '../../site/geographic-point.ts'
import { gridConvergenceDeg } from '../../site/grid-convergence.ts'
import { gridLineByConvergence } from '../../site/grid-line.ts'
import { lineDirection } from '../../site/line-direction.ts'
import { gridOf } from '../../site/transverse-mercator.ts'
import { NORTH_SD_DEG } from '../../site/true-north.ts'
import { DEFAULTS } from '../defaults.ts'
import { eastOrWest, northOfPlan } from './north-of-plan.ts'
import { placeOfPoint, pointNamed, pointSdM, turned } from './place-of-point.ts'
import { projectionOf } from './projection-of.ts'

/** A line between two points of a survey. */
export interface SurveyedLine {
  /** From true north through east, of the line of the middles, degrees. */
  azimuthDeg: number
  /** Of the points, across the line. */
  sdDeg: number
  /** Of the north that its direction rests on, shared with the other lines of its plan; 0 where it is true by itself. */
  northSdDeg: number
  lengthM: number
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
    lengthM: planeLengthM,
    steps: [
      `Grid bearing ${formatDegrees(planeBearingDeg)}, turned by the convergence stated: grid north lies ${eastOrWest(convergence.value)} of true north.`,
    ],
  }
}

/** Both ends by their places on the Earth; one on the plan is carried there from the tie, and its north with it. */
function onEarth(claim: Claim, from: Point, to: Point): SurveyedLine {
  const [start, end] = [placeOfPoint(claim, from), placeOfPoint(claim, to)]
  // The reader of the claim file has made sure that both can be placed.
  if (start === null || end === null) throw new Error('a claim without errors joins no points of two kinds')
  const grid = claim.grid?.by === 'projection' ? claim.grid : null
  const isGrid = grid !== null && from.by === 'grid' && to.by === 'grid'
  const ellipsoid = isGrid ? projectionOf(grid.projection).ellipsoid : WGS84
  const line = geodesicLine(start, end, ellipsoid)
  const stone = from.by === 'plan' ? from : to
  // The whole plan is as well placed on the Earth as its tie is.
  const tieSdM = stone.by === 'plan' ? DEFAULTS.pointSdM.geographic : 0
  return {
    ...line,
    sdDeg: Math.hypot(pointSdM(from), pointSdM(to), tieSdM) / line.lengthM / DEG,
    northSdDeg: (northOfPlan(claim).sdDeg * alongFromTieM(claim, stone, line.azimuthDeg)) / line.lengthM,
    steps: [
      'From the places of both ends on the Earth: the azimuth of the geodesic, true north by itself.',
      ...(grid !== null && (from.by === 'grid' || to.by === 'grid') ? [gridWords(grid, start, end)] : []),
    ],
  }
}

/**
 * How far along a line a point lies from the tie, metres: a turn of the plan about the tie moves it so far across the
 * line for each radian. 0 for a point that is not on the plan.
 */
function alongFromTieM(claim: Claim, point: Point, azimuthDeg: number): number {
  const tie = [...claim.points.values()].find((held) => held.by === 'plan' && held.tie !== null)
  if (point.by !== 'plan' || tie?.by !== 'plan') return 0
  const offset = { eastM: point.eastM - tie.eastM, northM: point.northM - tie.northM }
  const { eastM, northM } = turned(offset, northOfPlan(claim).turnDeg)
  return Math.abs(eastM * Math.sin(azimuthDeg * DEG) + northM * Math.cos(azimuthDeg * DEG))
}

/** What the line looks like on the grid, which a source may have taken for true. */
function gridWords(
  { projection, name }: Extract<Grid, { by: 'projection' }>,
  start: GeographicPoint,
  end: GeographicPoint,
): string {
  const grid = projectionOf(projection)
  const { planeBearingDeg } = gridLineByConvergence(gridOf(start, grid), gridOf(end, grid), 0)
  const convergence = eastOrWest(gridConvergenceDeg(start, grid))
  return `On the grid (${name}) its bearing is ${formatDegrees(planeBearingDeg)}, and grid north lies ${convergence} of true north at its start.`
}
