import { describe, expect, test } from 'vitest'
import { bitsAt, lnRatio, otherIn95, prepareSweep, sweepPoint } from '../../src/inference/sweep.ts'
import { expectWithin } from '../published/expect-within.ts'
import { artificialLine, branchedSight, exactBranch, horizonSight, WORKED } from './sights.ts'

// The azimuth moves by 0.001° a year and the line is right in the year 0 to 0.06°: dates are normal about it with a
// standard deviation of 60 years, or of √(60² + τ²) with a tolerance of τ in thousandths of a degree.
const line = artificialLine((year) => 60 + year / 1000, { azimuthSdDeg: 0.06 })
const sight = horizonSight(line)
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

// A grid of a quarter of the standard deviation, straight in between, moves an edge by a hundredth of it.
describe('the joint step of several lines', () => {
  test('of two alike lines with errors of their own has √2 times less spread', () => {
    const two = prepareSweep([sight, sight], { from: -3000, to: 3000 }, { from: 0, to: 0 }, [])
    expectWithin(sweepPoint(two, 0).sets95[0]![1], (60 * 1.959964) / Math.SQRT2, 0.01 * 42, 'years')
  })

  test('of two alike lines with one north gains nothing on north', () => {
    const shared = { ...sight, measuredSdDeg: 0.001, northSdDeg: 0.06 }
    const two = prepareSweep([shared, shared], { from: -3000, to: 3000 }, { from: 0, to: 0 }, [])
    expectWithin(sweepPoint(two, 0).sets95[0]![1], 60 * 1.959964, 0.01 * 60, 'years')
  })

  test('of two alike lines between the same points gains nothing, at any tolerance', () => {
    const same = horizonSight({ ...line, axis: 'a\nb' })
    const two = prepareSweep([same, same], { from: -3000, to: 3000 }, { from: 0, to: 0 }, [])
    for (const tolerance of [0, TOLERANCE, 30]) {
      expect(sweepPoint(two, tolerance).sets95).toEqual(sweepPoint(ground, tolerance).sets95)
    }
  })
})

describe('a line whose target has two branches', () => {
  const branches = [exactBranch((year) => 60 + year / 1000), exactBranch((year) => 62 + year / 1000)]
  const twofold = branchedSight(branches, { measuredSdDeg: 0.1 })
  const window = { from: -5000, to: 3000 }

  test('has a set of two parts, each as likely, and is as much surer as one of its dates is', () => {
    const twice = prepareSweep([twofold], window, { from: 0, to: 0 }, [{ from: -2000, to: -2000 }])
    const { sets95, bits, lnRatios } = sweepPoint(twice, 0)
    for (const [i, middle] of [-2000, 0].entries()) {
      expectWithin(sets95[i]![0], middle - 195.9964, 0.3, 'years')
      expectWithin(sets95[i]![1], middle + 195.9964, 0.3, 'years')
    }
    // Two normal densities of 100 years share the probability: a bit less than one of them.
    expectWithin(bits, Math.log2(8000 / (200 * Math.sqrt(2 * Math.PI * Math.E))), 1e-4, 'bits')
    expectWithin(lnRatios[0]!, 0, 1e-9, 'nepers')
  })

  test('loses nothing but a constant where one branch is not to be seen', () => {
    const half = branchedSight([branches[0]!, exactBranch(() => null)], { measuredSdDeg: 0.1 })
    const grounds = [half, branchedSight([branches[0]!], { measuredSdDeg: 0.1 })].map((given) =>
      prepareSweep([given], window, { from: 0, to: 0 }, [{ from: 300, to: 300 }]),
    )
    const [with_, without] = grounds.map((given) => sweepPoint(given, 5))
    expectWithin(with_!.bits, without!.bits, 1e-9, 'bits')
    expectWithin(with_!.lnRatios[0]!, without!.lnRatios[0]!, 1e-9, 'nepers')
  })

  test('is sampled finely enough for the faster of them', () => {
    const fast = branchedSight([exactBranch(() => 40), exactBranch((year) => 60 + year / 50)], {
      measuredSdDeg: 0.06,
    })
    const { years } = prepareSweep([fast], window, { from: 0, to: 0 }, []).window
    // A standard deviation of 3 years: the finest step, one year.
    expectWithin(years[1]! - years[0]!, 1, 1e-9, 'years')
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
    // A standard deviation of 6 years: a quarter of it.
    const sharp = { ...sight, measuredSdDeg: 0.006 }
    const { window } = prepareSweep([sharp], { from: -3000, to: 3000 }, { from: 0, to: 0 }, [])
    expect(window.years[1]! - window.years[0]!).toBeLessThanOrEqual(1.5)
    expect(window.years[1]! - window.years[0]!).toBeGreaterThan(1)
  })

  test('does not change a figure by being finer', () => {
    const fine = prepareSweep(
      [sight, { ...sight, measuredSdDeg: 0.02, measuredDeg: 60.01 }],
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
  const never = horizonSight({ ...line, altitudeDeg: () => 80 })
  const later = horizonSight({ ...line, altitudeDeg: (year) => (year > 0 ? 0 : 80) })

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
