import { ARCSEC } from '../quantity/degrees.ts'
import { polynomial } from './long-term-poles.ts'
import type { Matrix } from './vector.ts'

/** Obliquity at J2000.0, arcseconds (ε₀), and the angles of precession from there; centuries from J2000.0. */
const OBLIQUITY_J2000 = 84381.406
const PSI_A = [0, 5038.481507, -1.0790069, -0.00114045, 0.000132851, -9.51e-8]
const OMEGA_A = [OBLIQUITY_J2000, -0.025754, 0.0512623, -0.00772503, -4.67e-7, 3.337e-7]
const CHI_A = [0, 10.556403, -2.3814292, -0.00121197, 0.000170663, -5.6e-8]

/**
 * Rotation from the mean equator and equinox of J2000 to those of date by the polynomials of IAU 2006, which most
 * programs use: R₃(χA) R₁(−ωA) R₃(−ψA) R₁(ε₀).
 *
 * @param year Julian epoch; any year gives a rotation, see `PRECESSION_MODELS` for where it means something.
 * Source: Capitaine, Wallace & Chapront 2003, A&A 412, 567, equations 37 and 39 and the four-rotation form.
 */
export function shortPrecessionMatrix(year: number): Matrix {
  const t = (year - 2000) / 100
  const angle = (coefficients: readonly number[]) => polynomial(coefficients, t) * ARCSEC
  const ecliptic = turnAboutX(OBLIQUITY_J2000 * ARCSEC)
  const movedEquinox = product(turnAboutZ(-angle(PSI_A)), ecliptic)
  return product(turnAboutZ(angle(CHI_A)), product(turnAboutX(-angle(OMEGA_A)), movedEquinox))
}

/** R₁: turns the frame about its x axis, counter-clockwise as seen from the axis' end. */
function turnAboutX(angle: number): Matrix {
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)]
  return [
    [1, 0, 0],
    [0, cos, sin],
    [0, -sin, cos],
  ]
}

/** R₃: the same about the z axis. */
function turnAboutZ(angle: number): Matrix {
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)]
  return [
    [cos, sin, 0],
    [-sin, cos, 0],
    [0, 0, 1],
  ]
}

function product(a: Matrix, b: Matrix): Matrix {
  const row = (i: 0 | 1 | 2) =>
    [0, 1, 2].map((k) => a[i][0] * b[0][k]! + a[i][1] * b[1][k]! + a[i][2] * b[2][k]!) as unknown as Matrix[0]
  return [row(0), row(1), row(2)]
}
