import { DEG } from '../quantity/degrees.ts'
import { horizontalPlace } from './horizontal-place.ts'
import { nextDarkMoment } from './next-dark-moment.ts'
import { type NextSighting, type NoSighting, type SoughtSighting, sightingAt } from './next-sighting.ts'
import { julianEpochOf, utDaysOf } from './present-sky.ts'
import { locatedPlace, type SkyPlace } from './sky-place.ts'
import type { Star } from './star-catalogue.ts'
import { type StarPlace, starPlace } from './star-place.ts'

/** A star where it is sighted. */
export type StarSight = { star: Star } & (
  | {
      at: 'rising' | 'setting'
      /** True altitude, degrees: without air, so that the caller takes refraction off. */
      altitudeDeg: number
    }
  | { at: 'upper culmination' | 'lower culmination' }
)

/**
 * The next night in the dark of which a star passes an altitude or the meridian, by sidereal time. Aberration and
 * nutation, 0.5′ together, are left out of the star's place.
 *
 * Throws a RangeError for an impossible place, altitude or date.
 */
export function nextStarSighting(place: SkyPlace, sight: StarSight, now: Date): SoughtSighting<NextSighting> {
  const located = locatedPlace(place, now)
  const start = utDaysOf(now)
  const star = starPlace(sight.star, julianEpochOf(start))
  const sidereal = siderealDegOf(sight, star, place.latitudeDeg)
  if (typeof sidereal === 'string') return { sighting: null, because: sidereal }
  const moment = nextDarkMoment(located, sidereal, start)
  if (moment === null) return { sighting: null, because: 'never on a dark night' }
  return { sighting: sightingAt(place, moment, null), because: null }
}

/** Local sidereal time of the sighting, degrees, or why there is none. */
function siderealDegOf(sight: StarSight, star: StarPlace, latitudeDeg: number): number | NoSighting {
  if (sight.at === 'rising' || sight.at === 'setting') {
    const hourAngle = hourAngleDeg(star.decDeg, sight.altitudeDeg, latitudeDeg)
    if (typeof hourAngle === 'string') return hourAngle
    return star.raDeg + (sight.at === 'rising' ? -hourAngle : hourAngle)
  }
  const sidereal = star.raDeg + (sight.at === 'upper culmination' ? 0 : 180)
  const { altitudeDeg } = horizontalPlace(star, sidereal, latitudeDeg)
  return altitudeDeg < 0 ? 'stays below that altitude' : sidereal
}

/** cos H = (sin h − sin φ sin δ)/(cos φ cos δ). */
function hourAngleDeg(declination: number, altitudeDeg: number, latitudeDeg: number): number | NoSighting {
  if (!(Math.abs(altitudeDeg) <= 90))
    throw new RangeError(`altitude of the star is ${altitudeDeg}°: give one from −90 to 90`)
  const [delta, h, phi] = [declination * DEG, altitudeDeg * DEG, latitudeDeg * DEG]
  const cosine = (Math.sin(h) - Math.sin(phi) * Math.sin(delta)) / (Math.cos(phi) * Math.cos(delta))
  if (cosine >= 1) return 'stays below that altitude'
  if (cosine <= -1) return 'stays above that altitude'
  return Math.acos(cosine) / DEG
}
