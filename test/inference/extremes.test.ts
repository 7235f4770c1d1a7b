import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { dateBudget } from '../../src/inference/budget.ts'
import { compare, nearestOffset, offsetDeg, offsetSdDeg } from '../../src/inference/comparison.ts'
import { bestFit } from '../../src/inference/fit.ts'
import {
  dateSdYears,
  driftDegPerYear,
  impliedDates,
  nearestApproach,
} from '../../src/inference/implied-dates.ts'
import { halfBitLimit, otherIn95Limit, ratio3Limit } from '../../src/inference/limits.ts'
import { sampleDate } from '../../src/inference/sampled-date.ts'
import { prepareSweep, sweepPoint } from '../../src/inference/sweep.ts'
import { solsticeDeclinationDeg } from '../../src/sky/solstice-declination.ts'
import { exactBranch, horizonSight } from './sights.ts'

const WINDOW = { from: -12_000, to: 2026 }
const ASSERTED = { from: -9700, to: -9500 }
const OTHERS = [
  { from: -800, to: -500 },
  { from: 300, to: 300 },
]

/** Lines and errors at the far ends of what a claim may hold, and anything between. */
const sights = fc
  .record({
    latitudeDeg: fc.oneof(
      fc.constantFrom(-90, -89.9, -66.4, 0, 1e-9, 66.4, 89.9, 90),
      fc.double({ min: -90, max: 90, noNaN: true }),
    ),
    altitude: fc.oneof(fc.constantFrom(-5, -0.6, 0, 60), fc.double({ min: -5, max: 60, noNaN: true })),
    azimuthDeg: fc.oneof(
      fc.constantFrom(0, 90, 180, 270, 359.999),
      fc.double({ min: 0, max: 360, noNaN: true }),
    ),
    azimuthSdDeg: fc.constantFrom(0, 1e-6, 1 / 60, 30),
    northSdDeg: fc.constantFrom(0, 2, 30),
    altitudeSd: fc.constantFrom(0, 1e-6, 0.16, 10),
    declinationSd: fc.constantFrom(0, 0.002, 0.03),
    at: fc.constantFrom('rising' as const, 'setting' as const),
    june: fc.boolean(),
    isTwofold: fc.boolean(),
    axis: fc.constantFrom(null, 'a\nb'),
  })
  .map(({ altitude, altitudeSd, declinationSd, june, isTwofold, axis, ...rest }) => {
    const sight = horizonSight({
      ...rest,
      axis,
      altitudeDeg: () => altitude,
      altitudeSdDeg: () => altitudeSd,
      declinationSdDeg: () => declinationSd,
      declinationSign: june ? 1 : -1,
      declinationDeg: (year) =>
        solsticeDeclinationDeg(year, june ? 'june solstice' : 'december solstice', 'vondrak2011'),
    })
    // A second branch that is not to be seen before the year 0.
    const other = exactBranch((year) => (year < 0 ? null : 60 + year / 1000))
    return isTwofold ? { ...sight, branches: [...sight.branches, other] } : sight
  })

/** Every number in a result, however deep. */
function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value]
  if (value === null || typeof value !== 'object') return []
  return Object.values(value).flatMap(numbersIn)
}

function expectNumbers(what: string, value: unknown): void {
  for (const number of numbersIn(value)) expect(number, what).not.toBeNaN()
}

describe('no sight, however extreme, gives a result that is not a number', () => {
  test('a sweep of one line or of two', () => {
    const tolerance = fc.oneof(fc.constantFrom(0, 300), fc.double({ min: 0, max: 300, noNaN: true }))
    fc.assert(
      fc.property(fc.array(sights, { minLength: 1, maxLength: 2 }), tolerance, (lines, arcmin) => {
        const ground = prepareSweep(lines, WINDOW, ASSERTED, OTHERS)
        const step = sweepPoint(ground, arcmin)
        expectNumbers('step', step)
        expect(step.bits).toBeGreaterThanOrEqual(0)
        expect(Number.isFinite(step.bits)).toBe(true)
        for (const [from, to] of [...step.sets68, ...step.sets95]) {
          expect(from).toBeGreaterThanOrEqual(WINDOW.from)
          expect(to).toBeLessThanOrEqual(WINDOW.to)
          expect(from).toBeLessThanOrEqual(to)
        }
      }),
      { seed: 7, numRuns: 25 },
    )
  })

  test('its dates, their intervals, its budget and its draws', () => {
    fc.assert(
      fc.property(sights, (sight) => {
        const dates = impliedDates(sight, WINDOW.from, WINDOW.to)
        expectNumbers('dates', dates)
        expectNumbers('nearest approach', nearestApproach(sight, WINDOW.from, WINDOW.to))
        for (const year of [ASSERTED.from, 0, ...dates.map((date) => date.year)]) {
          expectNumbers('nearest', nearestOffset(sight, year))
          for (const branch of sight.branches) {
            expectNumbers('comparison', compare(sight, branch, year))
            expectNumbers('offset', [offsetDeg(sight, branch, year), offsetSdDeg(sight, branch, year)])
            expectNumbers('drift', [driftDegPerYear(sight, branch, year), dateSdYears(sight, branch, year)])
            expectNumbers('budget', dateBudget(sight, branch, year))
          }
        }
        expectNumbers('fit', [bestFit([sight], ASSERTED), bestFit([sight, sight], { from: 0, to: 0 })])
        for (const branch of sight.branches)
          expectNumbers('draws', sampleDate(sight, branch, ASSERTED.from, -10_000, -8000))
      }),
      { seed: 8, numRuns: 25 },
    )
  })

  test('the limits', () => {
    fc.assert(
      fc.property(sights, (sight) => {
        const ground = prepareSweep([sight], WINDOW, ASSERTED, OTHERS)
        expectNumbers('limits', [
          ...OTHERS.flatMap((_, i) => [ratio3Limit(ground, i), otherIn95Limit(ground, i)]),
          halfBitLimit(ground),
        ])
      }),
      { seed: 9, numRuns: 5 },
    )
  })
})
