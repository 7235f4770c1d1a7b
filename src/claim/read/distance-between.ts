import { DEG } from '../../quantity/degrees.ts'
import type { GeographicPoint, Point } from '../claim.ts'

/** Mean radius of the Earth, metres: (2a + b)/3 of the WGS84 ellipsoid, 6,371,009 m, to a thousand metres. */
const EARTH_RADIUS_M = 6_371_000

/**
 * How far two points of one kind are apart along the ground, metres: as the plan or the grid has it, or on the sphere,
 * which is within 0.6 % of the ellipsoid. Null where they are of two kinds.
 */
export function distanceBetween(a: Point, b: Point): number | null {
  if (a.by === 'plan' && b.by === 'plan') return Math.hypot(b.eastM - a.eastM, b.northM - a.northM)
  if (a.by === 'grid' && b.by === 'grid')
    return Math.hypot(b.eastingM - a.eastingM, b.northingM - a.northingM)
  return a.by === 'geographic' && b.by === 'geographic' ? onSphere(a, b) : null
}

/** By haversines, which keep their figures at short distances. */
function onSphere(a: GeographicPoint, b: GeographicPoint): number {
  const haversine = (deg: number) => Math.sin((deg * DEG) / 2) ** 2
  const cosines = Math.cos(a.latitudeDeg * DEG) * Math.cos(b.latitudeDeg * DEG)
  const whole =
    haversine(b.latitudeDeg - a.latitudeDeg) + cosines * haversine(b.longitudeDeg - a.longitudeDeg)
  return 2 * EARTH_RADIUS_M * Math.asin(Math.min(1, Math.sqrt(whole)))
}
