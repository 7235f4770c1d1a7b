import { eclipticPole, equatorPole } from './long-term-poles.ts'
import { cross, type Matrix, unit } from './vector.ts'

/**
 * Rotation from the mean equator and equinox of J2000 to those of date, by the long-term precession: the x axis is
 * the equinox, where the ecliptic crosses the equator northward (equator pole × ecliptic pole).
 *
 * @param year Julian epoch; good within 200,000 years of J2000.
 * Source: Vondrák, Capitaine & Wallace 2011, A&A 534, A22, section 5.
 */
export function precessionMatrix(year: number): Matrix {
  const equator = equatorPole(year)
  const equinox = unit(cross(equator, eclipticPole(year)))
  return [equinox, cross(equator, equinox), equator]
}
