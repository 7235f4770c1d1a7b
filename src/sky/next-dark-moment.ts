import { wrap360 } from '../quantity/degrees.ts'
import { seenBody, siderealDegAtGreenwich } from './present-sky.ts'
import type { LocatedPlace } from './sky-place.ts'

/**
 * A night is dark here while the Sun's centre is at least so far below the horizon, degrees: the nautical night, in
 * which the brighter stars and the horizon are both to be seen. Our choice.
 */
const DARK_SUN_ALTITUDE_DEG = -12

const DEGREES_PER_DAY = 360.985_647
const SIDEREAL_DAY_DAYS = 360 / DEGREES_PER_DAY

/** At one sidereal time the Sun's altitude changes by no more a day than the Sun moves among the stars. */
const SUN_MOVES_DEG_PER_DAY = 1.025

/** In so many sidereal days any sidereal time has been at every time of the night. */
const SIDEREAL_DAYS_OF_YEAR = 367

/**
 * The first instant, at or after one, at which it is a local sidereal time (an angle in degrees) in the dark; null where
 * that falls in daylight or twilight all the year. Instants are days of UT from J2000.0.
 */
export function nextDarkMoment(place: LocatedPlace, siderealDeg: number, fromUtDays: number): number | null {
  const ahead = wrap360(siderealDeg - place.longitudeDeg - siderealDegAtGreenwich(fromUtDays))
  const first = fromUtDays + ahead / DEGREES_PER_DAY
  let days = 0
  while (days < SIDEREAL_DAYS_OF_YEAR) {
    const utDays = first + days * SIDEREAL_DAY_DAYS
    const sunAltitudeDeg = seenBody('sun', place, utDays).altitudeDeg
    if (sunAltitudeDeg <= DARK_SUN_ALTITUDE_DEG) return utDays
    days += Math.max(1, Math.floor((sunAltitudeDeg - DARK_SUN_ALTITUDE_DEG) / SUN_MOVES_DEG_PER_DAY))
  }
  return null
}
