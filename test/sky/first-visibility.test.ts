import { describe, expect, test } from 'vitest'
import {
  airMass,
  EXTINCTION_PER_AIR_MASS,
  extinctionAltitudeDeg,
  firstVisibility,
  LIMITING_MAGNITUDE,
} from '../../src/sky/first-visibility.ts'
import { expectWithin } from '../published/expect-within.ts'

/** Kasten & Young 1989, Applied Optics 28, 4735 (from memory): another fit, to a standard atmosphere. */
function kastenYoung(altitudeDeg: number): number {
  return 1 / (Math.sin((altitudeDeg * Math.PI) / 180) + 0.50572 * (altitudeDeg + 6.07995) ** -1.6364)
}

describe('the air mass', () => {
  test('is 1 overhead and 40 at the horizon, as its formula is known for', () => {
    expectWithin(airMass(90), 1, 1e-6, 'air masses')
    expectWithin(airMass(0), 40, 1e-9, 'air masses')
  })

  // The two fits suppose different air: at the horizon they have 40 and 38, at 2° 19.6 and 19.9.
  test.each([
    [60, 0.005],
    [30, 0.005],
    [10, 0.01],
    [5, 0.03],
    [2, 0.06],
    [0, 0.06],
  ])('at %s° is that of another formula within a share of %s', (altitude, share) => {
    const want = kastenYoung(altitude)
    expectWithin(airMass(altitude), want, share * want, 'air masses')
  })
})

describe('the altitude at which a star is first visible by extinction', () => {
  test.each([0.5, 1, 2, 3, 4])('a star of magnitude %s is there at the limit of sight', (magnitude) => {
    const altitude = extinctionAltitudeDeg(magnitude)!
    expectWithin(magnitude + 0.25 * airMass(altitude), 6, 1e-6, 'magnitudes')
  })

  test('is that of the other formula for the air within a tenth of a degree or so', () => {
    // Where 0.25 magnitudes are lost per air mass of Kasten & Young: from their formula, by the step of 0.01°.
    for (const magnitude of [1, 2, 3, 4]) {
      let altitude = 0
      while (magnitude + 0.25 * kastenYoung(altitude) > 6) altitude += 0.01
      // The formulas part by up to 6 % below 5°, which is 0.1° to 0.2° of altitude.
      expectWithin(extinctionAltitudeDeg(magnitude)!, altitude, 0.2, 'degrees', magnitude)
    }
  })

  test('rises as the star is fainter and the air dimmer', () => {
    const altitudes = [0, 1, 2, 3, 4, 5].map((magnitude) => extinctionAltitudeDeg(magnitude)!)
    expect(altitudes).toEqual([...altitudes].sort((a, b) => a - b))
    expect(extinctionAltitudeDeg(2, EXTINCTION_PER_AIR_MASS.high)!).toBeGreaterThan(
      extinctionAltitudeDeg(2, EXTINCTION_PER_AIR_MASS.low)!,
    )
  })

  test('is the horizon for one that shines through 40 air masses, and none for one too faint overhead', () => {
    expect(extinctionAltitudeDeg(6 - 40 * 0.25 - 0.01)).toBe(0)
    expect(extinctionAltitudeDeg(6 - 40 * 0.25 + 0.01)!).toBeGreaterThan(0)
    // So high up the air is flat, and its mass is 1/sin h: 0.26/0.25 here.
    const high = (Math.asin(0.25 / 0.26) * 180) / Math.PI
    expectWithin(extinctionAltitudeDeg(5.74)!, high, 0.01, 'degrees')
    expect(extinctionAltitudeDeg(5.76)).toBeNull()
  })
})

describe('first visibility', () => {
  // The older rule: as many degrees as magnitudes, at least 1°.
  test.each([
    [-1.46, 1],
    [0.9, 1],
    [1, 1],
    [2.5, 2.5],
    [4, 4],
  ])('by the older rule is at %s → %s°', (magnitude, altitudeDeg) => {
    expect(firstVisibility(magnitude, 'magnitude in degrees')).toEqual({ altitudeDeg, sdDeg: 0 })
  })

  test('by extinction has the standard deviation of a loss spread evenly from 0.2 to 0.3', () => {
    for (const magnitude of [0, 1, 2, 3, 4]) {
      const altitudes = Array.from(
        { length: 1001 },
        (_, i) => extinctionAltitudeDeg(magnitude, 0.2 + i * 0.0001)!,
      )
      const mean = altitudes.reduce((sum, x) => sum + x, 0) / altitudes.length
      const sd = Math.sqrt(altitudes.reduce((sum, x) => sum + (x - mean) ** 2, 0) / altitudes.length)
      const got = firstVisibility(magnitude, 'extinction')!
      // The altitude is not quite straight in the loss.
      expectWithin(got.sdDeg, sd, 0.02 * sd, 'degrees', magnitude)
      expectWithin(got.altitudeDeg, mean, 0.1 * sd + 0.01, 'degrees', magnitude)
    }
  })

  test('is never for a star beyond the limit', () => {
    for (const rule of ['extinction', 'magnitude in degrees'] as const)
      expect(firstVisibility(LIMITING_MAGNITUDE + 0.1, rule)).toBeNull()
  })
})
