import { describe, expect, test } from 'vitest'
import { closeCompanionOf, STARS_WITH_CLOSE_COMPANIONS } from '../../src/sky/close-companions.ts'
import { designationOf, STARS, type Star } from '../../src/sky/star-catalogue.ts'
import { starDeclinationSdDeg } from '../../src/sky/star-error.ts'
import { STARS_OF_UNSTEADY_LIGHT, unsteadinessOf } from '../../src/sky/unsteady-stars.ts'
import { expectWithin } from '../published/expect-within.ts'

const starOfHr = (hr: number): Star => STARS.find((star) => star.hr === hr)!
const VEGA = starOfHr(7001)

describe('the error of the catalogue', () => {
  // Method notes of this project, section 4: motions are good to 5 to 10 mas a year, 10,000 years cost about 1′.
  test('is about 1′ after 10,000 years', () => {
    const arcmin = starDeclinationSdDeg(VEGA, -8000) * 60
    expect(arcmin).toBeGreaterThan((0.005 * 10_000) / 60)
    expect(arcmin).toBeLessThan((0.01 * 10_000) / 60)
  })

  test('at J2000 is that of a place printed to 1″ and 0.1 s', () => {
    // The rectangular half-widths 0.5″ and 1.5″ at most have these standard deviations.
    const arcsec = starDeclinationSdDeg(VEGA, 2000) * 3600
    expect(arcsec).toBeGreaterThan(0.5 / Math.sqrt(3))
    expect(arcsec).toBeLessThan(1.5 / Math.sqrt(3))
  })

  test('grows alike into the past and the future', () => {
    expect(starDeclinationSdDeg(VEGA, -1000)).toBe(starDeclinationSdDeg(VEGA, 5000))
    expect(starDeclinationSdDeg(VEGA, -2000)).toBeGreaterThan(starDeclinationSdDeg(VEGA, -1000))
  })

  test('is larger for a star with a close companion, most for alpha Centauri', () => {
    // The heading of the catalogue here: up to some 0.05″ a year, 0.2″ for alpha Centauri; rectangular.
    const [vega, sirius, alphaCen] = [7001, 2491, 5459].map((hr) => starDeclinationSdDeg(starOfHr(hr), -8000))
    const own = 0.0075 * 10_000
    expectWithin(sirius! * 3600, Math.hypot(own, (0.05 * 10_000) / Math.sqrt(3)), 0.01, 'arcsec', 'Sirius')
    expectWithin(alphaCen! * 3600, Math.hypot(own, (0.2 * 10_000) / Math.sqrt(3)), 0.01, 'arcsec', 'alpha')
    expect(vega!).toBeLessThan(sirius!)
  })
})

describe('stars with a close companion', () => {
  test.each(STARS_WITH_CLOSE_COMPANIONS)('HR %s is the star that the list means', (hr) => {
    expect(designationOf(starOfHr(hr))).toBe(closeCompanionOf({ hr })!.of)
  })

  test('include both of a listed pair, and no single star', () => {
    for (const hr of [5459, 5460, 2891, 2890, 4825, 4826]) expect(closeCompanionOf({ hr })).not.toBeNull()
    expect(closeCompanionOf(VEGA)).toBeNull()
  })
})

describe('stars of unsteady light', () => {
  test.each(STARS_OF_UNSTEADY_LIGHT)('HR %s is listed with a magnitude in its range', (hr) => {
    const { brightest, faintest } = unsteadinessOf({ hr })!
    // The extremes are rounded to 0.1, and averages differ from one catalogue to the next.
    expect(starOfHr(hr).magnitude).toBeGreaterThan(brightest - 0.1)
    expect(starOfHr(hr).magnitude).toBeLessThan(faintest + 0.1)
    expect(faintest - brightest).toBeGreaterThan(0.8)
  })

  test('a steady star is none', () => {
    expect(unsteadinessOf(VEGA)).toBeNull()
  })
})
