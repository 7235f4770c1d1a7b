import { describe, expect, test } from 'vitest'
import { normalSource } from '../../src/inference/random.ts'
import { expectWithin } from '../published/expect-within.ts'

const DRAWS = 40_000

function draws(seed: number): number[] {
  const normal = normalSource(seed)
  return Array.from({ length: DRAWS }, normal)
}

describe('normalSource', () => {
  const sample = draws(20)
  const mean = (of: (x: number, i: number) => number) =>
    sample.reduce((sum, x, i) => sum + of(x, i), 0) / DRAWS

  // Moments of the standard normal distribution, within four times their sampling error √(variance/n): the variances
  // of x, x², x³ and x⁴ are 1, 2, 15 and 96.
  test.each([
    [1, 0, 1],
    [2, 1, 2],
    [3, 0, 15],
    [4, 3, 96],
  ])('has the moment of power %s', (power, want, variance) => {
    expectWithin(
      mean((x) => x ** power),
      want,
      4 * Math.sqrt(variance / DRAWS),
      '',
    )
  })

  test('has as many draws beyond 1, 2 and 3 as the tables say', () => {
    // Two-sided tails of the normal distribution.
    for (const [bound, share] of [
      [1, 0.3173105],
      [2, 0.0455003],
      [3, 0.0026998],
    ] as const) {
      const found = mean((x) => (Math.abs(x) > bound ? 1 : 0))
      expectWithin(
        found,
        share,
        4 * Math.sqrt((share * (1 - share)) / DRAWS),
        'of the draws',
        `beyond ${bound}`,
      )
    }
  })

  test('has draws that do not follow from the one before, nor pairs from each other', () => {
    for (const lag of [1, 2, 3])
      expectWithin(
        mean((x, i) => x * (sample[i + lag] ?? 0)),
        0,
        4 / Math.sqrt(DRAWS),
        '',
      )
  })

  test('repeats itself with a seed, and differs with another', () => {
    expect(draws(20).slice(0, 10)).toEqual(sample.slice(0, 10))
    expect(draws(21).slice(0, 10)).not.toEqual(sample.slice(0, 10))
  })
})
