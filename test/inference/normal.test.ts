import { describe, expect, test } from 'vitest'
import { lnNormalBetween, normalBetween } from '../../src/inference/normal.ts'
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

describe('lnNormalBetween', () => {
  test('is the logarithm where there is a number', () => {
    for (const [a, b] of [
      [-1, 2],
      [3, 5],
      [-9, -8],
      [20, 30],
    ] as const)
      expectWithin(lnNormalBetween(a, b), Math.log(normalBetween(a, b)), 1e-12, 'nepers', a)
  })

  // ln of the tail beyond 10, 20 and 40: the first two are 7.619853e-24 and 2.753624e-89 (tables), the third is the
  // density over 40 less its 1,600th part (the asymptotic series, Abramowitz & Stegun 1964, 26.2.12).
  test.each([
    [10, Math.log(7.619853e-24)],
    [20, Math.log(2.753624e-89)],
    [40, -800 - Math.log(40 * Math.sqrt(2 * Math.PI)) - 1 / 1600],
    [1000, -500_000 - Math.log(1000 * Math.sqrt(2 * Math.PI))],
  ])('gives the tail beyond %s', (from, want) => {
    // 1/x² of the tail is left out where no number reaches.
    expectWithin(lnNormalBetween(from, from + 100), want, 1e-3, 'nepers')
    expectWithin(lnNormalBetween(-from, -from - 100), want, 1e-3, 'nepers')
  })

  // Over a stretch of width w the density about the middle m makes φ(m) · w · sinh(mw/2)/(mw/2).
  test.each([
    [0.5, 1e-7],
    [3, 1e-5],
    [3, 1.1e-5],
    [35, 1e-4],
    [40, 1e-6],
    [40, 0.01],
    [200, 0.002],
    [5000, 1e-5],
  ])('keeps its digits over a narrow stretch: at %s, %s wide', (from, width) => {
    const middle = from + width / 2
    const half = (middle * width) / 2
    const density = -(middle ** 2) / 2 - Math.log(2 * Math.PI) / 2
    const want = density + Math.log((width * Math.sinh(half)) / half)
    expectWithin(lnNormalBetween(from, from + width), want, 1e-3, 'nepers')
  })

  test('does not jump where one way of computing takes over from another', () => {
    for (const width of [1e-5, 1e-3, 0.1, 3]) {
      let before = lnNormalBetween(36, 36 + width)
      for (let from = 36.001; from < 38; from += 0.001) {
        const ln = lnNormalBetween(from, from + width)
        // d ln/dx is −x where narrow: 0.038 a step, and 1/x² where the ways part.
        expectWithin(ln - before, -0.0375, 0.002, 'nepers', `${from}, ${width} wide`)
        before = ln
      }
    }
  })
})
