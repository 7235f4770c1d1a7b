import {
  Body,
  Equator,
  EquatorFromVector,
  GeoMoon,
  Horizon,
  Illumination,
  MakeTime,
  Observer,
  RotateVector,
  Rotation_ECT_EQD,
  Rotation_EQJ_EQD,
  SearchSunLongitude,
  SiderealTime,
  SunPosition,
} from 'astronomy-engine'
import { DEG, wrap180, wrap360 } from '../quantity/degrees.ts'
import type { LocatedPlace } from './sky-place.ts'
import { TROPICAL_YEAR_DAYS } from './sun.ts'

/**
 * The Sun and the Moon of the present centuries by astronomy-engine 2.1.19: VSOP87 and Brown's theory, shortened, with
 * nutation and aberration, good to 1′ and mostly much better. Instants are days of UT from J2000.0 (noon of
 * 1 January 2000). Everything asked of that library is asked here: it throws bare strings, which leave this file as
 * errors, and its `Seasons` mistakes the years 0 and 1, so that it is not used.
 */
export const YEARS_OF_PRESENT_SKY = { from: 1900, to: 2200 } as const

/** Where a body's centre is seen from a place: topocentric, without air, in degrees. */
export interface SeenBody {
  /** From true north through east, 0 to 360. */
  azimuthDeg: number
  altitudeDeg: number
  declinationDeg: number
  /** Westward from the upper meridian, −180 to 180. */
  hourAngleDeg: number
}

export function utDaysOf(date: Date): number {
  return (date.getTime() - Date.UTC(2000, 0, 1, 12)) / 86_400_000
}

/** The same instant as a year and its part; the minute between UT and TT does not matter to its users. */
export function julianEpochOf(utDays: number): number {
  return 2000 + utDays / 365.25
}

/** The Sun or the Moon as seen from a place. */
export function seenBody(body: 'sun' | 'moon', place: LocatedPlace, utDays: number): SeenBody {
  return withoutBareStrings(() => {
    const time = MakeTime(utDays)
    const observer = new Observer(place.latitudeDeg, place.longitudeDeg, place.heightM)
    const { ra, dec } = Equator(body === 'sun' ? Body.Sun : Body.Moon, time, observer, true, true)
    const { azimuth, altitude } = Horizon(time, observer, ra, dec)
    const hourAngle = 15 * (SiderealTime(time) - ra) + place.longitudeDeg
    return {
      azimuthDeg: azimuth,
      altitudeDeg: altitude,
      declinationDeg: dec,
      hourAngleDeg: wrap180(hourAngle),
    }
  })
}

/** Apparent declination of the Moon as seen from the middle of the Earth, equator of date, degrees. */
export function moonDeclinationDeg(utDays: number): number {
  return withoutBareStrings(() => {
    const time = MakeTime(utDays)
    return EquatorFromVector(RotateVector(Rotation_EQJ_EQD(time), GeoMoon(time))).dec
  })
}

/** The part of the Moon's disc that is lit, 0 to 1. */
export function moonLitShare(utDays: number): number {
  return withoutBareStrings(() => Illumination(Body.Moon, MakeTime(utDays)).phase_fraction)
}

/** Apparent sidereal time at Greenwich as an angle, 0 to 360 degrees. */
export function siderealDegAtGreenwich(utDays: number): number {
  return withoutBareStrings(() => wrap360(15 * SiderealTime(MakeTime(utDays))))
}

/** True obliquity of the ecliptic, degrees. */
export function trueObliquityDeg(utDays: number): number {
  const { rot } = withoutBareStrings(() => Rotation_ECT_EQD(MakeTime(utDays)))
  return Math.abs(Math.atan2(rot[1]![2]!, rot[1]![1]!)) / DEG
}

/** The Sun's speed in longitude is uneven: it comes at most 3.9 days before or after its mean. */
const MOST_DAYS_ASTRAY = 5

/** The first instant, at or after one, at which the Sun has an apparent longitude of date, degrees. */
export function sunAtLongitude(longitude: number, fromUtDays: number): number {
  return withoutBareStrings(() => {
    const ahead = wrap360(longitude - SunPosition(MakeTime(fromUtDays)).elon)
    const mean = fromUtDays + (ahead / 360) * TROPICAL_YEAR_DAYS
    const start = MakeTime(mean - MOST_DAYS_ASTRAY)
    const found = SearchSunLongitude(wrap360(longitude), start, 2 * MOST_DAYS_ASTRAY)
    if (found === null) throw new Error(`no instant of the Sun at longitude ${longitude} near ${mean}`)
    return found.ut
  })
}

/** The result of a computation, what it throws as a bare string being thrown as an error. */
export function withoutBareStrings<Result>(compute: () => Result): Result {
  try {
    return compute()
  } catch (thrown) {
    throw thrown instanceof Error ? thrown : new Error(`astronomy-engine: ${thrown}`)
  }
}
