import { DEG, wrap180, wrap360 } from '../quantity/degrees.ts'
import { type SolsticeEvent, solsticeLongitudeDeg, sunSpeedDegPerDay } from './sun.ts'
import { daysBetweenLongitudes, sunLongitudeAfterDeg, sunLongitudeSdDeg } from './sun-in-orbit.ts'

/**
 * Which half of the year: the Sun moves north from the December solstice to the June one (spring, in the northern
 * hemisphere, lies in it) and south from June to December.
 */
export type SunSide = 'northward' | 'southward'

/** The senses of equinox that are the same at every place; `midway in direction` depends on latitude and horizon. */
export type EquinoxSense = 'declination zero' | 'midway in days'

/** Where the Sun stands on a day of the year of an epoch. Degrees. */
export interface SunDay {
  /** True longitude from the equinox of date, 0 to 360. */
  longitudeDeg: number
  declinationDeg: number
  /** Change of the declination, degrees a day; positive while the Sun moves north. */
  perDayDeg: number
  /**
   * Standard deviation of the declination at a rising or setting: it falls up to half a day from the instant meant
   * (rectangular), and beyond the orbit's table the ellipse is unknown. The obliquity's own is not in it.
   */
  declinationSdDeg: number
  side: SunSide
}

/** A rising or setting is this far from a given instant at most. */
const HALF_DAY = 0.5

/** The Sun at a true longitude: sin δ = sin ε sin λ. */
export function sunDayAt(year: number, longitude: number, obliquityDeg: number): SunDay {
  const declination = Math.asin(Math.sin(obliquityDeg * DEG) * Math.sin(longitude * DEG))
  const perLongitude = (Math.sin(obliquityDeg * DEG) * Math.cos(longitude * DEG)) / Math.cos(declination)
  const perDayDeg = perLongitude * sunSpeedDegPerDay(year, longitude)
  return {
    longitudeDeg: wrap360(longitude),
    declinationDeg: declination / DEG,
    perDayDeg,
    declinationSdDeg: (Math.abs(perDayDeg) * HALF_DAY) / Math.sqrt(3),
    side: Math.abs(wrap180(longitude)) < 90 ? 'northward' : 'southward',
  }
}

/**
 * The Sun a number of days of 86,400 s after the instant of a solstice, or before it where negative.
 *
 * @param year Julian epoch; beyond the orbit's table the Sun's mean speed is used, and the uncertainty is larger.
 */
export function sunDayFromSolstice(
  year: number,
  event: SolsticeEvent,
  days: number,
  obliquityDeg: number,
): SunDay {
  const start = solsticeLongitudeDeg(event)
  const longitude = sunLongitudeAfterDeg(year, start, days)
  return loosened(
    sunDayAt(year, longitude, obliquityDeg),
    sunLongitudeSdDeg(year, start, longitude),
    obliquityDeg,
  )
}

/**
 * The Sun at an equinox: where its declination is zero, or on the day halfway between the two solstices about it.
 *
 * @param side `northward` for the March equinox, `southward` for the September one.
 */
export function equinoxDay(year: number, sense: EquinoxSense, side: SunSide, obliquityDeg: number): SunDay {
  if (sense === 'declination zero') return sunDayAt(year, side === 'northward' ? 0 : 180, obliquityDeg)
  const [from, to]: [SolsticeEvent, SolsticeEvent] =
    side === 'northward' ? ['december solstice', 'june solstice'] : ['june solstice', 'december solstice']
  const halfway = daysBetweenLongitudes(year, solsticeLongitudeDeg(from), solsticeLongitudeDeg(to)) / 2
  return sunDayFromSolstice(year, from, halfway, obliquityDeg)
}

/**
 * The day on which the Sun has a declination: of the zenith passage, where that is the latitude; of an equinox midway
 * in direction, where it is that of the direction halfway between the solstices'. Null where the Sun never gets there.
 */
export function sunDayOfDeclination(
  year: number,
  declination: number,
  side: SunSide,
  obliquityDeg: number,
): SunDay | null {
  const sine = Math.sin(declination * DEG) / Math.sin(obliquityDeg * DEG)
  if (!(Math.abs(sine) <= 1)) return null
  const rising = Math.asin(sine) / DEG
  return { ...sunDayAt(year, side === 'northward' ? rising : 180 - rising, obliquityDeg), side }
}

/** The same day with its longitude uncertain by a standard deviation. */
function loosened(day: SunDay, longitudeSdDeg: number, obliquityDeg: number): SunDay {
  if (longitudeSdDeg === 0) return day
  const slope =
    (Math.sin(obliquityDeg * DEG) * Math.cos(day.longitudeDeg * DEG)) / Math.cos(day.declinationDeg * DEG)
  return { ...day, declinationSdDeg: Math.hypot(day.declinationSdDeg, slope * longitudeSdDeg) }
}
