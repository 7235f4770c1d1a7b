import { ARCSEC } from '../quantity/degrees.ts'
import { ECLIPTIC_POLE_SERIES, EQUATOR_POLE_SERIES, type PoleSeries } from './precession-coefficients.ts'

export type Vector = readonly [number, number, number]

/** Obliquity at J2000.0 that the ecliptic series is referred to: IAU 2006, 84381.406″, in radians. */
const OBLIQUITY_J2000 = 84381.406 * ARCSEC

/**
 * Pole of the ecliptic of date: unit vector in the J2000 mean equator and equinox.
 *
 * @param year Julian epoch; good within 200,000 years of J2000.
 * Source: Vondrák, Capitaine & Wallace 2011, A&A 534, A22, section 5 and table 1.
 */
export function eclipticPole(year: number): Vector {
  const [p, q] = evaluate(ECLIPTIC_POLE_SERIES, year)
  const w = Math.sqrt(Math.max(0, 1 - p * p - q * q))
  const cos = Math.cos(OBLIQUITY_J2000)
  const sin = Math.sin(OBLIQUITY_J2000)
  return [p, -q * cos - w * sin, -q * sin + w * cos]
}

/**
 * Pole of the equator of date: unit vector in the J2000 mean equator and equinox.
 *
 * @param year Julian epoch; good within 200,000 years of J2000.
 * Source: Vondrák, Capitaine & Wallace 2011, A&A 534, A22, section 5 and table 2.
 */
export function equatorPole(year: number): Vector {
  const [x, y] = evaluate(EQUATOR_POLE_SERIES, year)
  return [x, y, Math.sqrt(Math.max(0, 1 - x * x - y * y))]
}

/** Both coordinates of a pole, radians. */
function evaluate(series: PoleSeries, year: number): [number, number] {
  const t = (year - 2000) / 100
  let first = polynomial(series.polynomials[0], t)
  let second = polynomial(series.polynomials[1], t)
  for (const [period, cosFirst, cosSecond, sinFirst, sinSecond] of series.periodic) {
    const angle = (2 * Math.PI * t) / period
    const cos = Math.cos(angle)
    const sin = Math.sin(angle)
    first += cosFirst * cos + sinFirst * sin
    second += cosSecond * cos + sinSecond * sin
  }
  return [first * ARCSEC, second * ARCSEC]
}

/** c₀ + c₁ t + c₂ t² + … by Horner's rule. */
export function polynomial(coefficients: readonly number[], t: number): number {
  return coefficients.reduceRight((sum, c) => sum * t + c, 0)
}
