import { describe, expect, test } from 'vitest'
import { type Astrometry, astrometryAfter, positionAfter, spaceMotion } from '../../src/sky/space-motion.ts'
import { lengthOf } from '../../src/sky/vector.ts'
import { expectWithin } from '../published/expect-within.ts'

// liberfa's own test program (t_erfa_c.c: t_starpm), from memory: MJD 50083.0 to 53736.0.
const EARLIER: Astrometry = {
  ra: 0.01686756,
  dec: -1.093989828,
  raPerYear: -1.78323516e-5,
  decPerYear: 2.336024047e-6,
  parallaxArcsec: 0.74723,
  radialVelocityKmPerS: -21.6,
}
const DAYS = 53_736 - 50_083

describe('motion through space', () => {
  const later = astrometryAfter(EARLIER, DAYS)
  // The tolerances are those of that program.
  test.each([
    ['ra', '0.01668919069414256149', 1e-13],
    ['dec', '-1.093966454217127897', 1e-13],
    ['raPerYear', '-0.1783662682153176524e-4', 1e-17],
    ['decPerYear', '0.2338092915983989595e-5', 1e-17],
    ['parallaxArcsec', '0.7473533835317719243', 1e-13],
    ['radialVelocityKmPerS', '-21.59905170476417175', 1e-11],
  ] as const)('gives the published %s', (key, want, tolerance) => {
    expectWithin(later[key], Number(want), tolerance, 'in the unit of the value', key)
  })

  test('there and back again ends where it began', () => {
    const back = astrometryAfter(astrometryAfter(EARLIER, 1e6), -1e6)
    expectWithin(back.ra, EARLIER.ra, 1e-12, 'rad', 'ra')
    expectWithin(back.dec, EARLIER.dec, 1e-12, 'rad', 'dec')
    expectWithin(back.radialVelocityKmPerS, EARLIER.radialVelocityKmPerS, 1e-8, 'km/s')
  })

  // Barnard's star comes nearest to the Sun in about 11,800 CE at 3.75 to 3.8 light years, in print since Hipparcos
  // (from memory): a parallax of 0.862″ ± 0.01″. Catalogue values of Hipparcos (from memory), epoch 1991.25.
  test('brings Barnard’s star nearest when print has it', () => {
    const [motionRa, motionDec] = [-0.79784, 10.32693]
    const [ra, dec] = [(269.4541 * Math.PI) / 180, (4.6683 * Math.PI) / 180]
    const arcsec = Math.PI / 648_000
    const barnard = spaceMotion({
      ra,
      dec,
      raPerYear: (motionRa * arcsec) / Math.cos(dec),
      decPerYear: motionDec * arcsec,
      parallaxArcsec: 0.54901,
      radialVelocityKmPerS: -110.5,
    })
    const years = Array.from({ length: 300 }, (_, i) => 100 * i)
    const distances = years.map((year) => lengthOf(positionAfter(barnard, (year - 1991.25) * 365.25)))
    const nearest = Math.min(...distances)
    expectWithin(years[distances.indexOf(nearest)]!, 11_800, 200, 'years')
    expectWithin(nearest / 63_241.077, 3.775, 0.05, 'light years')
  })

  test('a star that stands still stays', () => {
    const still = { ...EARLIER, raPerYear: 0, decPerYear: 0, radialVelocityKmPerS: 0 }
    expect(lengthOf(spaceMotion(still).velocity)).toBe(0)
    expectWithin(astrometryAfter(still, 1e6).dec, still.dec, 1e-15, 'rad')
  })
})
