import type { ObliquityModelName } from './obliquity-models.ts'
import { tabulatedObliquityDeg } from './tabulated-obliquity.ts'

/** Where the Moon's monthly swing is widest (major) or narrowest (minor), at its northern or southern end. */
export type StandstillEvent =
  | 'northern major standstill'
  | 'southern major standstill'
  | 'northern minor standstill'
  | 'southern minor standstill'

/** Mean inclination of the Moon's path to the ecliptic, degrees. */
export const MOON_INCLINATION_DEG = 5.145

/** How far that inclination swings about its mean, every 173 days, arcminutes. */
export const MOON_WOBBLE_ARCMIN = 9

/**
 * Standard deviation of the wobble, arcminutes: the swing is a cosine of which nobody knows the phase at the moment
 * that builders watched, so its distribution is the arcsine one, with most of its weight at the ends: amplitude/√2.
 */
export const MOON_WOBBLE_SD_ARCMIN = MOON_WOBBLE_ARCMIN / Math.SQRT2

/** Years from one major standstill to the next: a turn of the Moon's node against the equinox. */
export const STANDSTILL_CYCLE_YEARS = 18.6

/** Semidiameter and equatorial horizontal parallax at the Moon's mean distance, arcminutes. */
export const MOON_SEMIDIAMETER_ARCMIN = 15.54
export const MOON_PARALLAX_ARCMIN = 57.04

/**
 * Standard deviation of both as a share of their means, from the Moon's changing distance. They grow and shrink
 * together. Source: the terms of Brown's parallax (186.5″, 34.3″, 28.2″, 10.2″ on 3422.7″), root of half their squares.
 */
export const MOON_NEARNESS_SD = 0.04

/**
 * Declination of the Moon at a standstill, degrees: ±(ε + i) major, ±(ε − i) minor, without the wobble.
 *
 * @param year Julian epoch.
 */
export function standstillDeclinationDeg(
  year: number,
  event: StandstillEvent,
  model: ObliquityModelName,
): number {
  const obliquity = tabulatedObliquityDeg(model, year)
  const tilt = event.endsWith('major standstill') ? MOON_INCLINATION_DEG : -MOON_INCLINATION_DEG
  return (event.startsWith('northern') ? 1 : -1) * (obliquity + tilt)
}
