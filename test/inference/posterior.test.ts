import { describe, expect, test } from 'vitest'
import { bits, posterior } from '../../src/inference/posterior.ts'
import { expectWithin } from '../published/expect-within.ts'
import { straightAt, straightSample } from './sights.ts'

describe('posterior', () => {
  // Uniform prior, offset of y/1000 degrees and s = 0.1°: normal about the year 0 with a standard deviation of 100.
  test('of a straight track is the normal density', () => {
    const { years, density } = posterior(
      straightSample(-1000, 1000, 2000, (year) => year / 1000, 0.01),
      0,
    )!
    for (const [i, year] of years.entries()) {
      const want = Math.exp(-(year ** 2) / 20_000) / (100 * Math.sqrt(2 * Math.PI))
      expectWithin(density[i]!, want, 1e-12, 'a year', year)
    }
  })

  test('widens with the tolerance as the two variances add: 0.06° and 0.08° are 0.1°', () => {
    const line = (year: number) => year / 1000
    const both = posterior(straightSample(-1000, 1000, 200, line, 0.06 ** 2), 0.08)!
    const one = posterior(straightSample(-1000, 1000, 200, line, 0.1 ** 2), 0)!
    both.density.forEach((height, i) => {
      expectWithin(height, one.density[i]!, 1e-14, 'a year', both.years[i]!)
    })
  })

  // Between two years of the same offset the one whose target is the surer has the higher weight: 1/s.
  test('weighs a year by 1/s besides its offset', () => {
    const surer = straightSample(0, 1, 1, () => 0, 0.01)
    const sample = {
      ...surer,
      comparisons: [surer.comparisons[0]!, [[straightAt(0, 0.04)]]],
    }
    const { density } = posterior(sample, 0)!
    expectWithin(density[0]! / density[1]!, 2, 1e-12, '')
  })

  test('is nothing where no date has a target, and leaves such dates out', () => {
    const years = Float64Array.of(0, 1, 2)
    const cells = Float64Array.of(0.5, 1, 0.5)
    expect(posterior({ years, cells, comparisons: [[[null]], [[null]], [[null]]] }, 0.1)).toBeNull()
    const seen = straightAt(0.1, 0.01)
    expect([
      ...posterior({ years, cells, comparisons: [[[null]], [[seen]], [[null]]] }, 0.1)!.density,
    ]).toEqual([0, 1, 0])
  })

  test('keeps its shape where every date is far beyond the reach of a number', () => {
    const far = posterior(
      straightSample(0, 1000, 1000, (year) => 20 + year / 1000, 0.01 ** 2),
      0,
    )!
    // d²/2s² grows from 2,000,000 by d/s² a degree: exp(−200 y) a year from the window's edge.
    expectWithin(far.density[1]! / far.density[0]!, Math.exp(-200.005), 1e-90, '')
  })
})

describe('bits', () => {
  const cells = (n: number) => Float64Array.from({ length: n + 1 }, (_, i) => (i === 0 || i === n ? 0.5 : 1))
  const years = (n: number) => Float64Array.from({ length: n + 1 }, (_, i) => i)

  test('of the prior are none, of half the window one, of a quarter two', () => {
    const over = (share: number) => {
      const density = years(4000).map((year) => (year < share * 4000 ? 1 / (share * 4000) : 0))
      return bits({ years: years(4000), cells: cells(4000), density })
    }
    expectWithin(bits({ years: years(10), cells: cells(10), density: years(10).fill(0.1) }), 0, 1e-12, 'bits')
    // The half cell at the window's edge: 1/4000 of the mass.
    expectWithin(over(0.5), 1, 0.001, 'bits')
    expectWithin(over(0.25), 2, 0.002, 'bits')
  })

  // Differential entropy of the normal distribution: ln(σ√(2πe)).
  test.each([10, 100, 300])('of a normal density of %s years in 6,000 are log2(W/(σ√(2πe)))', (sd) => {
    const whole = posterior(
      straightSample(-3000, 3000, 6000, (year) => year / 1000, (sd / 1000) ** 2),
      0,
    )!
    expectWithin(bits(whole), Math.log2(6000 / (sd * Math.sqrt(2 * Math.PI * Math.E))), 1e-9, 'bits')
  })
})
