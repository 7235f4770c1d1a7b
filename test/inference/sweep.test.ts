import { describe, expect, test } from 'vitest'
import { bitsAt, lnRatio, otherIn95, prepareSweep, sweepPoint } from '../../src/inference/sweep.ts'
import { expectWithin } from '../published/expect-within.ts'
import { artificialSight, WORKED } from './sights.ts'

// The azimuth moves by 0.001° a year and the line is right in the year 0 to 0.06°: dates are normal about it with a
// standard deviation of 60 years, or of √(60² + τ²) with a tolerance of τ in thousandths of a degree.
const sight = artificialSight((year) => 60 + year / 1000, { azimuthSdDeg: 0.06 })
const ground = prepareSweep([sight], { from: -3000, to: 3000 }, { from: -50, to: 50 }, [
  { from: 200, to: 300 },
  { from: 1000, to: 1000 },
])
/** 0.08° besides 0.06°: 100 years. */
const TOLERANCE = 0.08 * 60

describe('a step of the sweep on a straight track', () => {
  const { sets68, sets95, bits, lnRatios, toleranceArcmin } = sweepPoint(ground, TOLERANCE)

  // The grid's straight pieces of 10 years under a bend of 100 years move an edge by less than 0.2 years.
  test('has the sets of the normal distribution', () => {
    expect(toleranceArcmin).toBe(TOLERANCE)
    expect([sets68.length, sets95.length]).toEqual([1, 1])
    for (const [i, side] of [-1, 1].entries()) {
      expectWithin(sets68[0]![i]!, side * 99.4458, 0.3, 'years', '68 %')
      expectWithin(sets95[0]![i]!, side * 195.9964, 0.3, 'years', '95 %')
    }
  })

  test('has the bits of the normal distribution', () => {
    expectWithin(bits, Math.log2(6000 / (100 * Math.sqrt(2 * Math.PI * Math.E))), 1e-4, 'bits')
    expect(bitsAt(ground, TOLERANCE)).toBe(bits)
  })

  // Averages of the normal density over −50 to 50, and over 200 to 300: (Φ(0.5) − Φ(−0.5)) = 0.3829249 and
  // Φ(3) − Φ(2) = 0.0214002 (tables); against one year, 1000: √(2π) 0.3829249 against exp(−50).
  test('has the ratios of the averages', () => {
    // Ten trapezoids over the other date's hundred years on the tail's bend are 0.4 % too much.
    expectWithin(Math.exp(lnRatios[0]!) / (0.3829249 / 0.0214002), 1, 0.006, 'of the ratio')
    expectWithin(lnRatios[1]!, Math.log(Math.sqrt(2 * Math.PI) * 0.3829249) + 50, 0.001, 'nepers')
    expect(lnRatio(ground, 1, TOLERANCE)).toBe(lnRatios[1])
  })

  test('says whether the set holds a date', () => {
    // The set reaches 300 years from the standard deviation 300/1.96 = 153 on: τ = 0.141° = 8.45′.
    expect(otherIn95(ground, 0, 8.3)).toBe(false)
    expect(otherIn95(ground, 0, 8.6)).toBe(true)
  })
})

describe('the joint step of several lines', () => {
  test('of two alike lines with errors of their own has √2 times less spread', () => {
    const two = prepareSweep([sight, sight], { from: -3000, to: 3000 }, { from: 0, to: 0 }, [])
    expectWithin(sweepPoint(two, 0).sets95[0]![1], (60 * 1.959964) / Math.SQRT2, 0.2, 'years')
  })

  test('of two alike lines with one north gains nothing on north', () => {
    const shared = { ...sight, azimuthSdDeg: 0.001, northSdDeg: 0.06 }
    const two = prepareSweep([shared, shared], { from: -3000, to: 3000 }, { from: 0, to: 0 }, [])
    expectWithin(sweepPoint(two, 0).sets95[0]![1], 60 * 1.959964, 0.2, 'years')
  })
})

describe('the ground', () => {
  test('ends at the very ends of the window', () => {
    for (const window of [
      { from: -20_000, to: 2026 },
      { from: -12_000.5, to: 1987.3 },
    ]) {
      const { years } = prepareSweep([WORKED], window, window, []).window
      expect([years[0], years.at(-1)]).toEqual([window.from, window.to])
    }
  })

  test('is fine enough for the narrowest peak', () => {
    // A standard deviation of 6 years: a sixth of it is one year.
    const sharp = { ...sight, azimuthSdDeg: 0.006 }
    const { window } = prepareSweep([sharp], { from: -3000, to: 3000 }, { from: 0, to: 0 }, [])
    expect(window.years[1]! - window.years[0]!).toBeLessThanOrEqual(1)
    expect(window.years[1]! - window.years[0]!).toBeGreaterThan(0.4)
  })

  test('does not change a figure by being finer', () => {
    const fine = prepareSweep(
      [sight, { ...sight, azimuthSdDeg: 0.02, azimuthDeg: 60.01 }],
      { from: -3000, to: 3000 },
      { from: 0, to: 10 },
      [],
    )
    const coarse = prepareSweep([sight], { from: -3000, to: 3000 }, { from: 0, to: 10 }, [])
    const step = (g: typeof fine) => g.window.years[1]! - g.window.years[0]!
    expect(step(fine)).toBeLessThan(step(coarse))
    const only = {
      ...fine,
      window: { ...fine.window, comparisons: fine.window.comparisons.map(([first]) => [first!]) },
    }
    for (const tolerance of [0, 10, 60]) {
      expectWithin(bitsAt(only, tolerance), bitsAt(coarse, tolerance), 1e-3, 'bits', tolerance)
      const [a, b] = [only, coarse].map((g) => sweepPoint(g, tolerance).sets95[0]!)
      expectWithin(a![0], b![0], 0.5, 'years', tolerance)
    }
  })
})

describe('years without a target', () => {
  const never = { ...sight, altitudeDeg: () => 80 }
  const later = { ...sight, altitudeDeg: (year: number) => (year > 0 ? 0 : 80) }

  test('leave nothing to say where there are no others', () => {
    const bare = prepareSweep([never], { from: -3000, to: 3000 }, { from: -50, to: 50 }, [
      { from: 200, to: 300 },
    ])
    expect(sweepPoint(bare, 10)).toEqual({
      toleranceArcmin: 10,
      sets68: [],
      sets95: [],
      bits: 0,
      lnRatios: [null],
    })
    expect(otherIn95(bare, 0, 10)).toBe(false)
    expect(bitsAt(bare, 10)).toBe(0)
  })

  test('lose against every year with one, without bounds', () => {
    const half = prepareSweep([later], { from: -3000, to: 3000 }, { from: -500, to: -400 }, [
      { from: 200, to: 300 },
    ])
    expect(sweepPoint(half, 10).lnRatios).toEqual([-Infinity])
    const other = prepareSweep([later], { from: -3000, to: 3000 }, { from: 200, to: 300 }, [
      { from: -500, to: -400 },
    ])
    expect(sweepPoint(other, 10).lnRatios).toEqual([Infinity])
    expect(sweepPoint(other, 10).sets95[0]![0]).toBeGreaterThanOrEqual(-10)
  })
})
