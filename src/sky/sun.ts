import { DEG } from '../quantity/degrees.ts'
import { eccentricity, heldInTable, ORBIT_SPAN, perihelionDeg, shareBeyondTable } from './orbit.ts'

/** Semidiameter of the Sun at 1 au, arcminutes: 959.63″ (Auwers 1891, the almanacs' value). */
export const SEMIDIAMETER_AT_1_AU_ARCMIN = 959.63 / 60

/** Equatorial horizontal parallax of the Sun at 1 au, arcseconds. */
export const SUN_PARALLAX_ARCSEC = 8.794

/** Where no orbit is tabulated: the mean of the semidiameter at the solstices, and how far it strays. */
export const SEMIDIAMETER_BEYOND_TABLE = { arcmin: 15.99, sdArcmin: 0.27 }

export type SolsticeEvent = 'june solstice' | 'december solstice'

/**
 * Days of 86,400 s in which the Sun goes once round from equinox to equinox, in 2000. At other epochs the year
 * differs by a minute or two, which is 2″ of longitude in half a year.
 */
export const TROPICAL_YEAR_DAYS = 365.2422

/** True longitude of the Sun at a solstice, degrees. */
export function solsticeLongitudeDeg(event: SolsticeEvent): number {
  return event === 'june solstice' ? 90 : 270
}

/** +1 where the Sun stands north of the equator at the event, −1 where it stands south. */
export function hemisphere(event: SolsticeEvent): 1 | -1 {
  return event === 'june solstice' ? 1 : -1
}

/**
 * Distance of the Sun in astronomical units at a true longitude: r = (1 − e²)/(1 + e cos(λ − ϖ − 180°)).
 *
 * @param year Julian epoch within the span of the orbit's table.
 */
export function sunDistanceAu(year: number, longitude: number): number {
  const e = eccentricity(year)
  return (1 - e * e) / (1 + e * Math.cos((longitude - perihelionDeg(year) - 180) * DEG))
}

/**
 * Semidiameter of the Sun at a solstice, arcminutes, with its standard deviation: zero within the span of the
 * orbit's table; beyond it the last value passes in 1,000 years into the mean, 15.99′ ± 0.27′.
 */
export function sunSemidiameter(year: number, event: SolsticeEvent): { arcmin: number; sdArcmin: number } {
  return sunSemidiameterAt(year, solsticeLongitudeDeg(event))
}

/** The same on any day: at a true longitude in degrees. */
export function sunSemidiameterAt(year: number, longitude: number): { arcmin: number; sdArcmin: number } {
  const tabulated = SEMIDIAMETER_AT_1_AU_ARCMIN / sunDistanceAu(heldInTable(year), longitude)
  // A jump where the table ends would be read as a crossing: the last value passes into the mean instead.
  const share = shareBeyondTable(year)
  return {
    arcmin: (1 - share) * tabulated + share * SEMIDIAMETER_BEYOND_TABLE.arcmin,
    sdArcmin: share * SEMIDIAMETER_BEYOND_TABLE.sdArcmin,
  }
}

/** Whether the table of the orbit answers for a Julian epoch. */
export function isOrbitTabulated(year: number): boolean {
  return year >= ORBIT_SPAN.from && year <= ORBIT_SPAN.to
}

/**
 * Days about a solstice in which the Sun's declination stays within `marginDeg` of its extreme: from
 * sin δ = sin ε sin λ the longitude strays by x on either side, and the Sun moves through it at the speed of
 * that part of the orbit (Kepler's second law).
 *
 * @param year Julian epoch; beyond the orbit's table the mean speed is used.
 */
export function solsticeDwellDays(
  year: number,
  event: SolsticeEvent,
  obliquityDeg: number,
  marginDeg: number,
): number {
  const ratio = Math.sin((obliquityDeg - marginDeg) * DEG) / Math.sin(obliquityDeg * DEG)
  const strayDeg = Math.acos(Math.max(-1, ratio)) / DEG
  return (2 * strayDeg) / sunSpeedDegPerDay(year, solsticeLongitudeDeg(event))
}

/**
 * Motion of the Sun in true longitude when it stands at one, degrees a day (Kepler's second law).
 *
 * @param year Julian epoch; beyond the orbit's table the mean speed is used.
 */
export function sunSpeedDegPerDay(year: number, longitude: number): number {
  const mean = 360 / TROPICAL_YEAR_DAYS
  if (!isOrbitTabulated(year)) return mean
  const e = eccentricity(year)
  return (mean * Math.sqrt(1 - e * e)) / sunDistanceAu(year, longitude) ** 2
}
