import { DEG, wrap180 } from '../../quantity/degrees.ts'
import type { GridProjection } from '../claim.ts'

/**
 * The series of the projection hold to 3900 km from the central meridian (Karney 2011, Journal of Geodesy 85, 475). 50 km
 * less of it is taken here, where the sphere stands for the ellipsoid, which at that distance comes to some 10 km.
 */
const REACH_M = 3_850_000
/** Of WGS 84 at the equator; those of the other ellipsoids differ by less than a kilometre. */
const EARTH_RADIUS_M = 6_378_137

/**
 * Whether a place, in degrees, is so far from the central meridian that a transverse Mercator projection is not good for
 * it, or is not defined: over 90° of longitude, or over 3850 km on the grid.
 *
 * Source: Snyder 1987, Map projections, a working manual (USGS professional paper 1395), equations 8-1 and 8-5, from memory.
 */
export function isBeyondGrid(
  { latitudeDeg, longitudeDeg }: { latitudeDeg: number; longitudeDeg: number },
  { centralMeridianDeg, scale }: Pick<GridProjection, 'centralMeridianDeg' | 'scale'>,
): boolean {
  const turnDeg = Math.abs(wrap180(longitudeDeg - centralMeridianDeg))
  if (turnDeg > 90) return true
  const sine = Math.cos(latitudeDeg * DEG) * Math.sin(turnDeg * DEG)
  return scale * EARTH_RADIUS_M * Math.atanh(sine) > REACH_M
}
