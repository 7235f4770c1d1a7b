import type { Claim, GridPoint, Point } from '../../claim/claim.ts'
import { DEG } from '../../quantity/degrees.ts'
import type { GeographicPoint } from '../../site/geographic-point.ts'
import { tiedPlace } from '../../site/points-tie.ts'
import { geographicOf } from '../../site/transverse-mercator.ts'
import { DEFAULTS } from '../defaults.ts'
import { statedOr } from '../stated-or.ts'
import { northOfPlan } from './north-of-plan.ts'
import { projectionOf } from './projection-of.ts'
import { tieOf } from './tie-of.ts'

/** The reader of the claim file has made sure that the point exists. */
export function pointNamed({ points }: Claim, name: string): Point {
  const point = points.get(name)
  if (point === undefined) throw new Error(`a claim without errors names no missing point: ${name}`)
  return point
}

/** One standard deviation of a point in each of east and north, metres; by what it was given in where not stated. */
export function pointSdM({ by, uncertaintyM }: Point): number {
  return statedOr(uncertaintyM, DEFAULTS.pointSdM[by])
}

/**
 * Where a point is on the Earth; null where its coordinates alone do not tell. A place of a grid is taken as it is on
 * the grid's own ellipsoid. Another datum shifts all points of one grid alike, which turns no line between them; a line
 * from one datum to another is told of in the warnings.
 */
export function placeOfPoint(claim: Claim, point: Point): GeographicPoint | null {
  switch (point.by) {
    case 'geographic':
      return point
    case 'grid':
      return placeOnGrid(claim, point)
    case 'plan': {
      const tie = tieOf(claim)
      if (tie === null) return null
      const { turnDeg } = northOfPlan(claim)
      return tiedPlace(turned(point, turnDeg), { plan: turned(tie.point, turnDeg), place: tie.place })
    }
  }
}

function placeOnGrid({ grid }: Claim, { eastingM, northingM }: GridPoint): GeographicPoint | null {
  return grid?.by === 'projection'
    ? geographicOf({ eastingM, northingM }, projectionOf(grid.projection))
    : null
}

/** A place of the plan about its origin, with true north up. */
export function turned(
  { eastM, northM }: { eastM: number; northM: number },
  turnDeg: number,
): { eastM: number; northM: number } {
  const [sine, cosine] = [Math.sin(turnDeg * DEG), Math.cos(turnDeg * DEG)]
  return { eastM: eastM * cosine + northM * sine, northM: northM * cosine - eastM * sine }
}
