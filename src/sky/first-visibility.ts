import { DEG } from '../quantity/degrees.ts'

/** The rules for the altitude at which a rising star is first, and a setting star last, to be seen. */
export type VisibilityRule = 'extinction' | 'magnitude in degrees'

/** Light lost in the air, magnitudes per air mass at sea level on clear nights: the middle of 0.2 to 0.3. */
export const EXTINCTION_PER_AIR_MASS = { usual: 0.25, low: 0.2, high: 0.3 } as const

/** The faintest star that a good eye sees in a dark sky, magnitudes. */
export const LIMITING_MAGNITUDE = 6

/** By the older rule no star, however bright, is seen lower than this. */
const LOWEST_BY_RULE_DEG = 1

/**
 * Air that a star's light comes through, in units of the air overhead: X = 1/(cos z + 0.025 e^(−11 cos z)), which is
 * 40 at the horizon.
 *
 * @param altitudeDeg Apparent altitude, from 0° to 90°.
 * Source: Rozenberg 1966, Twilight, p. 160.
 */
export function airMass(altitudeDeg: number): number {
  const cosine = Math.sin(altitudeDeg * DEG)
  return 1 / (cosine + 0.025 * Math.exp(-11 * cosine))
}

/**
 * Apparent altitude in degrees from which a star is visible by extinction: there its magnitude and what the air takes
 * come to the limiting magnitude, m + k X = limit. 0 for a star that shines down to a level horizon; null for one too
 * faint to be seen even overhead.
 */
export function extinctionAltitudeDeg(
  magnitude: number,
  perAirMass: number = EXTINCTION_PER_AIR_MASS.usual,
  limit: number = LIMITING_MAGNITUDE,
): number | null {
  const most = (limit - magnitude) / perAirMass
  if (airMass(90) > most) return null
  if (airMass(0) <= most) return 0
  let low = 0
  let high = 90
  while (high - low > 1e-9) {
    const middle = (low + high) / 2
    if (airMass(middle) > most) low = middle
    else high = middle
  }
  return high
}

/**
 * Apparent altitude in degrees from which a star is visible, and its standard deviation. By extinction with the usual
 * loss of light, the loss being uncertain from 0.2 to 0.3 magnitudes (rectangular); or by the older rule, as many
 * degrees as the star has magnitudes, but at least 1°, which states no uncertainty. Null where it is never visible.
 * What stands on the horizon may hide the star higher up: then that altitude counts.
 */
export function firstVisibility(
  magnitude: number,
  rule: VisibilityRule,
): { altitudeDeg: number; sdDeg: number } | null {
  if (rule === 'magnitude in degrees')
    return magnitude > LIMITING_MAGNITUDE
      ? null
      : { altitudeDeg: Math.max(LOWEST_BY_RULE_DEG, magnitude), sdDeg: 0 }
  const altitudeDeg = extinctionAltitudeDeg(magnitude)
  if (altitudeDeg === null) return null
  const low = extinctionAltitudeDeg(magnitude, EXTINCTION_PER_AIR_MASS.low)!
  const high = extinctionAltitudeDeg(magnitude, EXTINCTION_PER_AIR_MASS.high) ?? 90
  return { altitudeDeg, sdDeg: (high - low) / (2 * Math.sqrt(3)) }
}
