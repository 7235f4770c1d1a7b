import { describe, test } from 'vitest'
import { ARCSEC } from '../../src/quantity/degrees.ts'
import { eclipticPole, equatorPole, polynomial } from '../../src/sky/long-term-poles.ts'
import { ECLIPTIC_POLE_SERIES, EQUATOR_POLE_SERIES } from '../../src/sky/precession-coefficients.ts'
import { expectWithin } from '../published/expect-within.ts'

const OBLIQUITY_J2000 = 84381.406 * ARCSEC

/** P and Q of the ecliptic pole, X and Y of the equator pole, arcseconds, t centuries from J2000. */
function poles(t: number): Record<'P' | 'Q' | 'X' | 'Y', number> {
  const [p, y, z] = eclipticPole(2000 + 100 * t)
  const [equatorX, equatorY] = equatorPole(2000 + 100 * t)
  const q = -(y * Math.cos(OBLIQUITY_J2000) + z * Math.sin(OBLIQUITY_J2000))
  return { P: p / ARCSEC, Q: q / ARCSEC, X: equatorX / ARCSEC, Y: equatorY / ARCSEC }
}

/** IAU 2006 precession (Capitaine, Wallace & Chapront 2003, A&A 412, 567), from memory; arcseconds. */
const IAU_2006 = {
  P: [0, 4.199094, 0.1939873, -0.00022466, -9.12e-7],
  Q: [0, -46.811015, 0.0510283, 0.00052413, -6.46e-7],
  X: [0, 2004.191898, -0.4297829, -0.19861834, 7.578e-6],
  Y: [0, -0.025896, -22.4072747, 0.00190059, 0.001112526],
}

describe('the long-term precession', () => {
  // Both series are fitted to the same theory near J2000; the long-term one parts from it by milliarcseconds in a
  // century and by some hundredths of an arcsecond in five (Vondrák et al. 2011, section 5).
  test.each([
    { t: 0, tolerance: 0.0002 },
    { t: 1, tolerance: 0.001 },
    { t: -1, tolerance: 0.001 },
    { t: 5, tolerance: 0.03 },
    { t: -5, tolerance: 0.03 },
  ])('agrees with IAU 2006 $t centuries from J2000', ({ t, tolerance }) => {
    const got = poles(t)
    for (const name of ['P', 'Q', 'X', 'Y'] as const)
      expectWithin(got[name], polynomial(IAU_2006[name], t), tolerance, 'arcsec', name)
  })

  // A slip in one constant would part a pole from the other's theory at J2000 by as much.
  test('has constants and cosines that cancel at J2000 in all four coordinates', () => {
    for (const { polynomials, periodic } of [ECLIPTIC_POLE_SERIES, EQUATOR_POLE_SERIES]) {
      for (const which of [0, 1] as const) {
        const cosines = periodic.reduce((sum, row) => sum + row[1 + which]!, 0)
        expectWithin(polynomials[which][0]! + cosines, 0, 0.0002, 'arcsec', `coordinate ${which}`)
      }
    }
  })
})
