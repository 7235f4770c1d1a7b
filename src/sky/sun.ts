import { DEG } from '../quantity/degrees.ts'
import { eccentricity, ORBIT_SPAN, perihelionDeg } from './orbit.ts'

/** Semidiameter of the Sun at 1 au, arcminutes: 959.63″ (Auwers 1891, the almanacs' value). */
export const SEMIDIAMETER_AT_1_AU_ARCMIN = 959.63 / 60

/** Equatorial horizontal parallax of the Sun at 1 au, arcseconds. */
export const SUN_PARALLAX_ARCSEC = 8.794

/** Where no orbit is tabulated: the mean of the semidiameter at the solstices, and how far it strays. */
const SEMIDIAMETER_BEYOND_TABLE = { arcmin: 15.99, sdArcmin: 0.27 }

export type SolsticeEvent = 'june solstice' | 'december solstice'

/** True longitude of the Sun at a solstice, degrees. */
function longitudeDeg(event: SolsticeEvent): number {
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
 * orbit's table, 0.27′ about the mean of 15.99′ beyond it.
 */
export function sunSemidiameter(year: number, event: SolsticeEvent): { arcmin: number; sdArcmin: number } {
  if (year < ORBIT_SPAN.from || year > ORBIT_SPAN.to) return SEMIDIAMETER_BEYOND_TABLE
  return { arcmin: SEMIDIAMETER_AT_1_AU_ARCMIN / sunDistanceAu(year, longitudeDeg(event)), sdArcmin: 0 }
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
  return (2 * strayDeg) / sunSpeedDegPerDay(year, event)
}

/** Motion of the Sun in true longitude, degrees a day. */
function sunSpeedDegPerDay(year: number, event: SolsticeEvent): number {
  const mean = 360 / 365.2422
  if (year < ORBIT_SPAN.from || year > ORBIT_SPAN.to) return mean
  const e = eccentricity(year)
  return (mean * Math.sqrt(1 - e * e)) / sunDistanceAu(year, longitudeDeg(event)) ** 2
}
