import { OBLIQUITY_MODELS, type ObliquityModelName } from './obliquity-models.ts'
import { hemisphere, type SolsticeEvent } from './sun.ts'
import { tabulatedObliquityDeg } from './tabulated-obliquity.ts'

/** Amplitude of the main term of nutation in obliquity, degrees: 9.2″ over 18.6 years (IAU 2000A). */
const NUTATION_AMPLITUDE_DEG = 9.2 / 3600

/** Standard deviation of that term over its cycle: amplitude/√2, degrees. */
export const NUTATION_SD_DEG = NUTATION_AMPLITUDE_DEG / Math.SQRT2

/** Declination of the Sun at a solstice, degrees: the obliquity, with the sign of the event. */
export function solsticeDeclinationDeg(
  year: number,
  event: SolsticeEvent,
  model: ObliquityModelName,
): number {
  return hemisphere(event) * tabulatedObliquityDeg(model, year)
}

/**
 * Standard deviation that the choice of a long-term model leaves, degrees: half of the distance between
 * Vondrák 2011 and Laskar 2004, the standard deviation of two values about their mean.
 * Where Laskar's table ends, its last distance is used.
 */
export function modelSpreadSdDeg(year: number): number {
  const { from, to } = OBLIQUITY_MODELS.laskar2004.computable
  const held = Math.min(Math.max(year, from), to)
  return Math.abs(tabulatedObliquityDeg('vondrak2011', held) - tabulatedObliquityDeg('laskar2004', held)) / 2
}
