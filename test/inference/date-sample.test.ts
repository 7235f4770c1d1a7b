import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { lnAverageWeight, lnWeights, sampleDates } from '../../src/inference/date-sample.ts'
import { expectWithin } from '../published/expect-within.ts'
import { artificialSight, straightSample } from './sights.ts'

const SIGHT = artificialSight((year) => 60 + year / 1000, { azimuthSdDeg: 0.1 })

describe('sampleDates', () => {
  test('begins and ends at the very years it was given, and its cells make up the whole', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -20_000, max: 2000, noNaN: true }),
        fc.double({ min: 0.1, max: 3000, noNaN: true }),
        fc.double({ min: 0.5, max: 30, noNaN: true }),
        (from, length, step) => {
          const to = from + length
          const { years, cells } = sampleDates([SIGHT], from, to, step)
          expectWithin(years[0]!, from, 0, 'years', 'first')
          expectWithin(years.at(-1)!, to, 0, 'years', 'last')
          const steps = Array.from(years.slice(1), (year, i) => year - years[i]!)
          expect(Math.max(...steps)).toBeLessThanOrEqual(step * (1 + 1e-9))
          expect(Math.min(...steps)).toBeGreaterThan(0)
          expectWithin(
            cells.reduce((a, b) => a + b, 0),
            to - from,
            1e-8,
            'years',
          )
        },
      ),
      { seed: 5, numRuns: 200 },
    )
  })

  test('of one year is that year', () => {
    const { years, cells, comparisons } = sampleDates([SIGHT, SIGHT], 300, 300, 10)
    expect([...years]).toEqual([300])
    expect([...cells]).toEqual([1])
    expect(comparisons).toHaveLength(1)
    expect(comparisons[0]).toHaveLength(2)
  })
})

describe('the average weight', () => {
  // The mean of (1/s) exp(−d²/2s²) over d from −2s to 2s is √(2π) erf(√2)/(4s); erf(√2) = 0.9544997361.
  test.each([0.1, 1])('over four standard deviations is the integral in closed form, s = %s°', (s) => {
    const sample = straightSample(-2000, 2000, 400, (year) => (s * year) / 1000, s * s)
    const want = (Math.sqrt(2 * Math.PI) * 0.9544997361) / (4 * s)
    // Trapezoids of a hundredth of s leave (0.01)²/12 of the slopes' difference: 1e-6 of the sum.
    expectWithin(Math.exp(lnAverageWeight(sample, 0)) / want, 1, 5e-6, 'of the weight')
  })

  test('keeps its digits where the weights themselves are nothing', () => {
    const sample = straightSample(0, 1000, 100, () => 50, 0.01 ** 2)
    // (1/s) exp(−d²/2s²) with d/s = 5000.
    expectWithin(lnAverageWeight(sample, 0), -(5000 ** 2) / 2 - Math.log(0.01), 1e-6, 'nepers')
  })

  test('is −∞ where no target is to be seen', () => {
    const sample = { years: Float64Array.of(0), cells: Float64Array.of(1), comparisons: [[[null]]] }
    expect(lnAverageWeight(sample, 0.1)).toBe(-Infinity)
    expect([...lnWeights(sample, 0.1)]).toEqual([-Infinity])
  })
})
