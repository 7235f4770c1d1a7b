import { describe, expect, test } from 'vitest'
import { normalBetween } from '../../src/inference/normal.ts'
import { expectWithin } from '../published/expect-within.ts'

/** The error function, from the probability that is looked for. */
const erf = (x: number) => normalBetween(-x * Math.SQRT2, x * Math.SQRT2)
const erfc = (x: number) => 2 * normalBetween(x * Math.SQRT2, 60)

describe('normalBetween', () => {
  // Abramowitz & Stegun 1964, tables 7.1 and 7.3 (from memory). The fit is good to 1.2e-7 by its authors.
  test.each([
    [0.5, 0.5204998778],
    [1, 0.8427007929],
    [2, 0.995322265],
  ])('gives erf %s', (x, published) => {
    expectWithin(erf(x), published, 1.2e-7, 'of probability')
  })

  test.each([
    [1, 0.1572992071],
    [3, 2.2090497e-5],
    [5, 1.5374597944e-12],
  ])('gives the tail erfc %s with its own figures', (x, published) => {
    expectWithin(erfc(x) / published, 1, 1.2e-7, 'of the tail')
  })

  // The two numbers of every table of the normal distribution.
  test('holds 95 % between ±1.959964 and 68.27 % between ±1', () => {
    expectWithin(normalBetween(-1.959964, 1.959964), 0.95, 2e-7, 'of probability')
    expectWithin(normalBetween(-1, 1), 0.6826895, 2e-7, 'of probability')
  })

  test('does not mind the order of its ends, nor the side', () => {
    for (const [a, b] of [
      [-1, 2],
      [0.5, 3],
      [6, 7],
    ] as const) {
      expect(normalBetween(b, a)).toBe(normalBetween(a, b))
      expectWithin(normalBetween(-b, -a) / normalBetween(a, b), 1, 1e-12, 'of the probability')
    }
    expect(normalBetween(1.5, 1.5)).toBe(0)
  })

  test('adds up over neighbouring stretches', () => {
    const ends = [-9, -3, -1, -0.2, 0, 0.7, 2, 9]
    const sum = ends.slice(1).reduce((total, end, i) => total + normalBetween(ends[i]!, end), 0)
    expectWithin(sum, 1, 3e-7, 'of probability')
  })
})
