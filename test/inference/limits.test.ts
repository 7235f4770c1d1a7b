import { describe, expect, test } from 'vitest'
import { halfBitLimit, type LimitValue, otherIn95Limit, ratio3Limit } from '../../src/inference/limits.ts'
import type { Stretch, SweepGround } from '../../src/inference/sweep.ts'
import { expectWithin } from '../published/expect-within.ts'
import { straightSample } from './sights.ts'

/** A ground on which the target moves by `perYear` degrees a year and stands on the line in the year 0. */
function ground(
  perYear: number,
  variance: number,
  asserted: number,
  other: Stretch,
  reach = 3000,
): SweepGround {
  const sample = (from: number, to: number, steps: number) =>
    straightSample(from, to, steps, (year) => perYear * year, variance)
  return {
    window: sample(-reach, reach, 2000),
    asserted: sample(asserted, asserted, 0),
    others: [sample(other.from, other.to, other.from === other.to ? 0 : 100)],
    otherStretches: [other],
  }
}

const arcmin = (limit: LimitValue) => ('arcmin' in limit ? limit.arcmin : Number.NaN)
const at = (year: number) => ({ from: year, to: year })

describe('ratio3Limit', () => {
  // One year on the line against one off by d: exp(d²/2s²) = 3 where s² = τ² + v = d²/(2 ln 3).
  test.each([
    [0.5, 0],
    [0.5, 0.1],
    [2, 0.04],
  ])('of a date off by %s° with a variance of %s is in closed form', (d, variance) => {
    const want = 60 * Math.sqrt(d ** 2 / (2 * Math.log(3)) - variance)
    expectWithin(arcmin(ratio3Limit(ground(d / 1000, variance, 0, at(1000)), 0)), want, 0.005, 'arcmin')
  })

  test('is never where both dates fit alike, or the other fits better', () => {
    expect(ratio3Limit(ground(0.001, 0.01, 0, at(0)), 0)).toEqual({ reason: 'never' })
    expect(ratio3Limit(ground(0.001, 0.01, 1000, at(0)), 0)).toEqual({ reason: 'never' })
  })

  test('is always where the other date is far beyond the largest tolerance', () => {
    // At 5° a date off by 40° is exp(32) times worse.
    expect(ratio3Limit(ground(0.04, 0.01, 0, at(1000)), 0)).toEqual({ reason: 'always' })
  })

  test('against a date without a target is always, of a date without one never', () => {
    const usual = ground(0.001, 0.01, 0, at(1000))
    const unseen = { years: Float64Array.of(0), cells: Float64Array.of(1), comparisons: [[[null]]] }
    expect(ratio3Limit({ ...usual, others: [unseen] }, 0)).toEqual({ reason: 'always' })
    expect(ratio3Limit({ ...usual, asserted: unseen }, 0)).toEqual({ reason: 'never' })
    expect(ratio3Limit({ ...usual, asserted: unseen, others: [unseen] }, 0)).toEqual({ reason: 'never' })
  })
})

describe('otherIn95Limit', () => {
  // In a wide window the set reaches 1.959964 s/(drift) years: 500 years from s = 0.2551°.
  test('is where 1.96 standard deviations reach the far end', () => {
    const want = 60 * Math.sqrt((0.001 * 500) ** 2 / 1.959964 ** 2 - 0.01)
    const limit = otherIn95Limit(ground(0.001, 0.01, 0, { from: 400, to: 500 }), 0)
    // The grid of 3 years and the search's 0.005′: 0.02′.
    expectWithin(arcmin(limit), want, 0.02, 'arcmin')
  })

  test('is nothing where the set holds the date from the start, never where it does not at 5°', () => {
    expect(otherIn95Limit(ground(0.001, 0.01, 0, { from: -20, to: 20 }), 0)).toEqual({ arcmin: 0 })
    expect(otherIn95Limit(ground(0.04, 0.01, 0, { from: 2000, to: 2100 }), 0)).toEqual({ reason: 'never' })
  })

  test('knows a date that is not wholly in the window, and one that ends with it', () => {
    for (const other of [
      { from: 2900, to: 3001 },
      { from: -3001, to: -2900 },
      { from: 4000, to: 4100 },
    ])
      expect(otherIn95Limit(ground(0.001, 0.01, 0, other), 0)).toEqual({ reason: 'outside' })
    expect(otherIn95Limit(ground(0.001, 0.01, 0, { from: 2900, to: 3000 }), 0)).not.toEqual({
      reason: 'outside',
    })
  })
})

describe('halfBitLimit', () => {
  /** Bits of a normal density of `sd` years cut off at ±`reach`, by plain sums. */
  function cutBits(sd: number, reach: number): number {
    const heights = Array.from({ length: 20_001 }, (_, i) => {
      const year = reach * (i / 10_000 - 1)
      return Math.exp(-(year ** 2) / (2 * sd ** 2))
    })
    const mean = heights.reduce((sum, h) => sum + h, 0) / heights.length
    return heights.reduce((sum, h) => sum + (h / mean) * Math.log2(h / mean), 0) / heights.length
  }

  test('is where the normal density cut off by the window has half a bit', () => {
    let [narrow, wide] = [10, 30_000]
    while (wide - narrow > 0.001) {
      const middle = (narrow + wide) / 2
      if (cutBits(middle, 3000) >= 0.5) narrow = middle
      else wide = middle
    }
    const want = 60 * Math.sqrt((narrow / 1000) ** 2 - 0.01)
    // Half a cell at either end of both sums: 1e-4 of the bits.
    expectWithin(arcmin(halfBitLimit(ground(0.001, 0.01, 0, at(0)))), want, 0.02, 'arcmin')
  })

  test('is nothing where the line never told half a bit, never where it still does at 5°', () => {
    expect(halfBitLimit(ground(0.001, 9, 0, at(0)))).toEqual({ arcmin: 0 })
    expect(halfBitLimit(ground(0.04, 0.01, 0, at(0)))).toEqual({ reason: 'never' })
  })
})
