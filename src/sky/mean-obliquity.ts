import { DEG } from '../quantity/degrees.ts'
import { eclipticPole, equatorPole } from './long-term-poles.ts'

/**
 * Mean obliquity of the ecliptic of date, degrees: the angle between the poles of the ecliptic and the equator.
 *
 * @param year Julian epoch; good within 200,000 years of J2000.
 * Source: Vondrák, Capitaine & Wallace 2011, A&A 534, A22; agrees with the series given there for the angle.
 */
export function meanObliquityDeg(year: number): number {
  const a = eclipticPole(year)
  const b = equatorPole(year)
  const cross = Math.hypot(a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0])
  const dot = a[0] * b[0] + a[1] * b[1] + a[2] * b[2]
  return Math.atan2(cross, dot) / DEG
}
