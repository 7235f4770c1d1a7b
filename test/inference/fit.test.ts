import { describe, expect, test } from 'vitest'
import { bestFit, isFit } from '../../src/inference/fit.ts'
import type { Branch, Sight } from '../../src/inference/sight.ts'
import { expectWithin } from '../published/expect-within.ts'
import { seededRandom } from './seeded-random.ts'
import {
  artificialLine,
  artificialSight,
  branchedSight,
  directionDeg,
  exactBranch,
  horizonSight,
} from './sights.ts'

const line = (azimuthDeg: number, azimuthSdDeg = 0.1) =>
  artificialLine((year) => 60 + year / 1000, { azimuthDeg, azimuthSdDeg })
const sight = (azimuthDeg: number, azimuthSdDeg = 0.1) => horizonSight(line(azimuthDeg, azimuthSdDeg))

/** Distance in standard deviations of the nearest year of a stretch. */
const deviation = (given: Sight, stretch: { from: number; to: number }) =>
  Math.sqrt(bestFit([given], stretch).squared)

describe('the best fit of one line', () => {
  test('is in the nearest year of the stretch, by its standard deviations squared', () => {
    // The track passes 60.5° to 60.7° in the years 500 to 700; the line is 0.2° beyond, or short of it.
    expectWithin(deviation(sight(60.9), { from: 500, to: 700 }), 2, 1e-9, 'standard deviations')
    expectWithin(deviation(sight(60.3), { from: 500, to: 700 }), 2, 1e-9, 'standard deviations')
    expectWithin(deviation(sight(60.9), { from: 700, to: 700 }), 2, 1e-9, 'standard deviations')
    expectWithin(bestFit([sight(60.9)], { from: 500, to: 700 }).year, 700, 1e-9, 'years')
    expectWithin(bestFit([sight(60.3)], { from: 500, to: 700 }).year, 500, 1e-9, 'years')
  })

  test('is nothing where the target crosses the line inside the stretch', () => {
    // The year is found to 0.01, which is 1e-5° or 1e-4 standard deviations.
    expectWithin(deviation(sight(60.6037), { from: 500, to: 700 }), 0, 1e-4, 'standard deviations')
    expectWithin(bestFit([sight(60.6037)], { from: 500, to: 700 }).year, 603.7, 0.01, 'years')
    expect(deviation(sight(60.5), { from: 500, to: 700 })).toBeLessThan(1e-9)
  })

  // A star that moves 1′ a year and a line good to 10″ miss each other at every step of 5 years; 0.01 years are 0.6″.
  test('finds the crossing of a fast target between two steps', () => {
    const fast = artificialSight((year) => 60 + year / 60, { azimuthDeg: 70, azimuthSdDeg: 10 / 3600 })
    for (const shift of [0.4, 1.3, 2.5]) {
      const stretch = { from: 600 - 500 - shift, to: 600 + 500 - shift }
      expectWithin(deviation(fast, stretch), 0, 0.06, 'standard deviations', shift)
    }
  })

  test('is infinite where the target is never to be seen', () => {
    const unseen = horizonSight({ ...line(60), altitudeDeg: () => 80 })
    expect(bestFit([unseen], { from: 500, to: 700 })).toEqual({ year: 600, squared: Infinity })
  })

  test('of a line without any error is nothing on the target, and no fit beside it', () => {
    const beside = artificialSight(() => 60, { azimuthDeg: 61 })
    // 1° in units of 0.01″, the least error that a line is given.
    expectWithin(deviation(beside, { from: 0, to: 0 }) / 360_000, 1, 1e-9, '')
    const on = artificialSight(() => 60)
    const exact = { ...artificialLine(() => 60), azimuthDeg: directionDeg(on, 0)! }
    expect(deviation(horizonSight(exact), { from: 0, to: 0 })).toBe(0)
    const soonGone = { ...exact, altitudeDeg: (year: number) => (year > 0 ? 80 : 0) }
    expect(deviation(horizonSight(soonGone), { from: 0, to: 100 })).toBe(0)
  })

  test('does not take the way past the back of the line for a crossing', () => {
    const turning = artificialSight((year) => 100 + (75 * year) / 1000, { azimuthDeg: 350, azimuthSdDeg: 1 })
    expect(deviation(turning, { from: 0, to: 1000 })).toBeGreaterThan(100)
  })

  test('of a target of two branches is that of the nearer', () => {
    const branches = [exactBranch((year) => 59 + year / 1000), exactBranch((year) => 60.2 - year / 1000)]
    const twofold = branchedSight(branches, { measuredSdDeg: 0.1 })
    expectWithin(deviation(twofold, { from: 0, to: 0 }), 2, 1e-9, 'standard deviations')
    expectWithin(bestFit([twofold], { from: 0, to: 1000 }).year, 200, 0.01, 'years')
  })
})

describe('the best fit of several lines', () => {
  // One line is right in 500, the other in 700, both to 100 years: together they are best in the middle, each one
  // standard deviation off.
  test('is in one year for all of them', () => {
    const { year, squared } = bestFit([sight(60.5), sight(60.7)], { from: 0, to: 1000 })
    expectWithin(year, 600, 0.01, 'years')
    expectWithin(squared, 2, 1e-6, '')
  })

  test('is none where one of them has no target', () => {
    const unseen = horizonSight({ ...line(60), altitudeDeg: () => 80 })
    expect(bestFit([sight(60.5), unseen], { from: 0, to: 1000 }).squared).toBe(Infinity)
  })
})

describe('isFit', () => {
  // Quantiles of χ² at 95 %: 3.841, 5.991, 7.815, 9.488, 18.307 for 1, 2, 3, 4 and 10 degrees of freedom (tables).
  test.each([
    [1, 3.841],
    [2, 5.991],
    [3, 7.815],
    [4, 9.488],
    [10, 18.307],
  ])('of %s lines draws the line at %s, to 1 %', (lines, quantile) => {
    expect(isFit({ year: 0, squared: 0.99 * quantile }, lines)).toBe(true)
    expect(isFit({ year: 0, squared: 1.01 * quantile }, lines)).toBe(false)
    expect(isFit({ year: 0, squared: Infinity }, lines)).toBe(false)
  })

  /** Share of 4,000 surveys of lines built exactly on a date that fit it. */
  function shareThatFits(surveyed: (normal: () => number) => Sight[]): number {
    const { normal } = seededRandom(95)
    let fitting = 0
    for (let i = 0; i < 4000; i++) {
      const sights = surveyed(normal)
      if (isFit(bestFit(sights, { from: 0, to: 0 }), sights.length)) fitting++
    }
    return fitting / 4000
  }

  // 4,000 draws of a share of 0.95 have a sampling error of 0.0034.
  const SAMPLING = 0.0034

  test('holds for 95 % of true lines: one, and three with one north and one obliquity', () => {
    const one = shareThatFits((normal) => [sight(60 + 0.1 * normal())])
    expectWithin(one, 0.95, 3 * SAMPLING, 'of the surveys', 'one line')
    const three = shareThatFits((normal) => {
      const [north, obliquity] = [0.2 * normal(), 0.1 * normal()]
      return [1, -1, 1].map((sign, i) =>
        artificialSight(() => 60 + 10 * i, {
          azimuthDeg: 60 + 10 * i + north - sign * obliquity + 0.05 * normal(),
          azimuthSdDeg: 0.05,
          northSdDeg: 0.2,
          declinationSdDeg: () => 0.1,
          declinationSign: sign as 1 | -1,
        }),
      )
    })
    expectWithin(three, 0.95, 3 * SAMPLING, 'of the surveys', 'three lines')
  })

  test('holds for 95 % of true pairs between the same points', () => {
    // Each target has an error of its own besides the survey's, which they share.
    const own = { source: 'own', effectDeg: 0.05, shared: false }
    const branch: Branch = { predict: () => ({ directionDeg: 60, errors: [own] }) }
    const pair = shareThatFits((normal) => {
      const survey = 0.1 * normal()
      return [0, 1].map(() =>
        branchedSight([branch], {
          measuredDeg: 60 + survey - 0.05 * normal(),
          measuredSdDeg: 0.1,
          axis: 'p\nq',
        }),
      )
    })
    expectWithin(pair, 0.95, 3 * SAMPLING, 'of the surveys')
  })
})
