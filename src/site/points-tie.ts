import { DEG, wrap360 } from '../quantity/degrees.ts'
import { type Ellipsoid, WGS84 } from './ellipsoid.ts'
import { geodesicDestination } from './geodesic-line.ts'
import type { GeographicPoint } from './geographic-point.ts'

/** A place on a local plan, metres east and north of its origin. */
export interface PlanPoint {
  eastM: number
  northM: number
}

/** One place known both on a local plan and on the Earth. The plan's north is true north there. */
export interface PointsTie {
  plan: PlanPoint
  place: GeographicPoint
}

/**
 * Where a place of a local plan lies on the Earth: as far from the tie and in the same direction as on the plan.
 *
 * Distances are taken as they are on the ellipsoid: on ground of height h they are longer by h/6400 km, 0.3 m in 1 km
 * at 2000 m. Throws a RangeError where a coordinate is not finite or the tie is no place.
 */
export function tiedPlace(point: PlanPoint, tie: PointsTie, ellipsoid: Ellipsoid = WGS84): GeographicPoint {
  const east = point.eastM - tie.plan.eastM
  const north = point.northM - tie.plan.northM
  if (!Number.isFinite(east) || !Number.isFinite(north))
    throw new RangeError(`the place is ${east} m east and ${north} m north of the tie; write metres`)
  const azimuthDeg = wrap360(Math.atan2(east, north) / DEG)
  return geodesicDestination(tie.place, azimuthDeg, Math.hypot(east, north), ellipsoid)
}
