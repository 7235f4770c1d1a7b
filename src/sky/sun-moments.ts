import { DEG } from '../quantity/degrees.ts'
import { sunAtLongitude, trueObliquityDeg } from './present-sky.ts'
import { type SolsticeEvent, solsticeLongitudeDeg, TROPICAL_YEAR_DAYS } from './sun.ts'
import type { EquinoxSense } from './sun-days.ts'

/** What the Sun does on a day of the year, as an instant that is the same for all places. */
export type SunMoment =
  | { name: SolsticeEvent }
  | { name: 'equinox'; sense: EquinoxSense }
  /** So many days of 86,400 s after a solstice; negative before it. */
  | { name: 'day'; days: number; after: SolsticeEvent }
  /**
   * The Sun at a declination, degrees, twice a year: the latitude of a place for its zenith passage; the declination of
   * the direction midway between the solstices' for an equinox in that sense.
   */
  | { name: 'declination'; declinationDeg: number }

const BOTH_SOLSTICES = [90, 270] as const
const BOTH_EQUINOXES = [0, 180] as const

/**
 * The next two instants or more, at or after one, in ascending order; days of UT from J2000.0. Empty where the Sun never
 * has that declination.
 */
export function sunMoments(moment: SunMoment, fromUtDays: number): number[] {
  switch (moment.name) {
    case 'june solstice':
    case 'december solstice':
      return atLongitudes([solsticeLongitudeDeg(moment.name)], fromUtDays)
    case 'day': {
      const { days, after } = moment
      if (!Number.isFinite(days)) throw new RangeError(`${days} days after a solstice: give a number of days`)
      return atLongitudes([solsticeLongitudeDeg(after)], fromUtDays - days).map((solstice) => solstice + days)
    }
    case 'equinox':
      return moment.sense === 'declination zero'
        ? atLongitudes(BOTH_EQUINOXES, fromUtDays)
        : midwayInDays(fromUtDays)
    case 'declination':
      return atDeclination(moment.declinationDeg, fromUtDays)
  }
}

/** Twice in a row at each longitude. */
function atLongitudes(longitudes: readonly number[], from: number): number[] {
  return longitudes
    .flatMap((longitude) => twice((start) => sunAtLongitude(longitude, start), from))
    .sort(byTime)
}

/** Halfway from each solstice to the next. */
function midwayInDays(from: number): number[] {
  const solstices = atLongitudes(BOTH_SOLSTICES, from - TROPICAL_YEAR_DAYS / 2)
  return solstices
    .slice(1)
    .map((solstice, i) => (solstices[i]! + solstice) / 2)
    .filter((middle) => middle >= from)
}

function atDeclination(declination: number, from: number): number[] {
  if (!(Math.abs(declination) <= 90))
    throw new RangeError(`declination is ${declination}°: give one from −90 to 90`)
  if (longitudeNorthward(declination, from) === null) return []
  return [false, true]
    .flatMap((southward) => twice((start) => nextAtDeclination(declination, southward, start), from))
    .sort(byTime)
}

/**
 * By sin δ = sin ε sin λ with the obliquity of the day itself; the Sun's latitude, 1″, is left out. Where the obliquity
 * has fallen short of that declination since it was asked about, by seconds of arc, the solstice is the nearest to it.
 */
function nextAtDeclination(declination: number, southward: boolean, start: number): number {
  const atObliquityOf = (utDays: number) => {
    const northward = longitudeNorthward(declination, utDays) ?? Math.sign(declination) * 90
    return sunAtLongitude(southward ? 180 - northward : northward, start)
  }
  return atObliquityOf(atObliquityOf(start))
}

function longitudeNorthward(declination: number, utDays: number): number | null {
  const sine = Math.sin(declination * DEG) / Math.sin(trueObliquityDeg(utDays) * DEG)
  return Math.abs(sine) > 1 ? null : Math.asin(sine) / DEG
}

function twice(next: (start: number) => number, from: number): number[] {
  const first = next(from)
  // Far enough on not to find the same again.
  return [first, next(first + TROPICAL_YEAR_DAYS / 2)]
}

function byTime(a: number, b: number): number {
  return a - b
}
