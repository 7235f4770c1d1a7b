import { DEG, wrap180, wrap360 } from '../quantity/degrees.ts'
import { horizontalPlace } from './horizontal-place.ts'
import type { Vector } from './long-term-poles.ts'
import type { StarPlace } from './star-place.ts'
import { cross, unit } from './vector.ts'

/** One of the moments of a day at which two stars stand one above the other. Degrees. */
export interface OneAboveOther {
  /** From true north, −180 to 180, eastward positive: the same for both stars. Refraction does not change it. */
  azimuthDeg: number
  above: 'first' | 'second'
  /** True altitudes of the first and the second star; below 0 where one has set. */
  altitudesDeg: readonly [number, number]
  /** Local sidereal time of the moment as an angle, 0 to 360. */
  siderealDeg: number
}

/**
 * The moments of a day at which two stars have the same azimuth at a latitude: none, one or two. The great circle
 * through both then goes through the zenith, so that its pole stands on the horizon, rising or setting; moments at
 * which the zenith is between the stars are left out. Where the circle passes over the pole of the sky, the direction
 * is due north.
 *
 * @param latitudeDeg Strictly between −90 and 90.
 */
export function momentsOneAboveOther(
  first: StarPlace,
  second: StarPlace,
  latitudeDeg: number,
): OneAboveOther[] {
  const [x, y, z] = unit(cross(vectorOf(first), vectorOf(second)))
  const cosine = (-Math.tan(latitudeDeg * DEG) * z) / Math.hypot(x, y)
  if (!(Math.abs(cosine) <= 1)) return []
  const hourAngle = Math.acos(cosine) / DEG
  const ra = Math.atan2(y, x) / DEG
  return [ra - hourAngle, ra + hourAngle].flatMap((siderealDeg) => {
    const places = [first, second].map((star) => horizontalPlace(star, siderealDeg, latitudeDeg))
    const [one, other] = [places[0]!, places[1]!]
    if (Math.abs(wrap180(one.azimuthDeg - other.azimuthDeg)) > 90) return []
    const above = one.altitudeDeg > other.altitudeDeg ? 'first' : 'second'
    const { azimuthDeg } = above === 'first' ? other : one
    const altitudesDeg = [one.altitudeDeg, other.altitudeDeg] as const
    return [{ azimuthDeg, above, altitudesDeg, siderealDeg: wrap360(siderealDeg) }]
  })
}

/**
 * Azimuth in degrees, −180 to 180, at which two stars stand one above the other while a given one is the upper; null
 * where that does not happen above a level horizon. Where it happens twice a day, the one nearer to a
 * direction, north unless another is given: in the far south both may be up.
 */
export function azimuthOneAboveOtherDeg(
  first: StarPlace,
  second: StarPlace,
  latitudeDeg: number,
  above: 'first' | 'second',
  nearDeg = 0,
): number | null {
  const azimuths = momentsOneAboveOther(first, second, latitudeDeg)
    .filter((moment) => moment.above === above && Math.min(...moment.altitudesDeg) > 0)
    .map((moment) => moment.azimuthDeg)
  const distance = (azimuth: number) => Math.abs(wrap180(azimuth - nearDeg))
  return azimuths.sort((a, b) => distance(a) - distance(b))[0] ?? null
}

function vectorOf({ raDeg, decDeg }: StarPlace): Vector {
  const [ra, dec] = [raDeg * DEG, decDeg * DEG]
  return [Math.cos(dec) * Math.cos(ra), Math.cos(dec) * Math.sin(ra), Math.sin(dec)]
}
