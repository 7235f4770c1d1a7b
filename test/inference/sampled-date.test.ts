import { describe, expect, test } from 'vitest'
import { dateSdYears } from '../../src/inference/implied-dates.ts'
import { sampleDate as sampleDateOf } from '../../src/inference/sampled-date.ts'
import type { Sight } from '../../src/inference/sight.ts'
import { expectWithin } from '../published/expect-within.ts'
import {
  artificialSight,
  branchedSight,
  directionDeg,
  exactBranch,
  horizonSight,
  onlyBranch,
  WORKED,
  WORKED_LINE,
} from './sights.ts'

const sampleDate = (sight: Sight, year: number, from: number, to: number) =>
  sampleDateOf(sight, onlyBranch(sight), year, from, to)

/** Sampling error of a standard deviation from 2,000 draws: 1/√4000. */
const SAMPLING = 0.016

describe('sampleDate', () => {
  // The azimuth is 60° + y/1000 and answers the declination one to one: 0.06°, 0.08° and 0.24° are 0.26°, 260 years.
  test('on a straight track is the linear standard deviation', () => {
    const sight = artificialSight((year) => 60 + year / 1000, {
      azimuthSdDeg: 0.06,
      northSdDeg: 0.08,
      declinationSdDeg: () => 0.24,
    })
    const { sd, noDateShare } = sampleDate(sight, 0, -5000, 5000)
    expectWithin(sd! / 260, 1, 3 * SAMPLING, 'of the standard deviation')
    expect(noDateShare).toBe(0)
    expectWithin(dateSdYears(sight, onlyBranch(sight), 0)!, 260, 1e-6, 'years')
  })

  test('takes in an altitude that turns the line', () => {
    const sight = { ...WORKED, measuredSdDeg: 0, measuredDeg: directionDeg(WORKED, 0)! }
    const { sd } = sampleDate(sight, 0, -5000, 4000)
    // Over ± 200 years the drift changes by some 3 % on either side, which cancels to first order.
    expectWithin(
      sd! / dateSdYears(sight, onlyBranch(sight), 0)!,
      1,
      3 * SAMPLING + 0.01,
      'of the standard deviation',
    )
  })

  // Method notes of this project, section 8: 41 % of directions built to 20′ have no date at all. A share of 0.41 from
  // 2,000 draws has a sampling error of 0.011.
  test('finds no date for 41 % of the directions built to 20′ about the worked case', () => {
    const built = horizonSight({ ...WORKED_LINE, azimuthSdDeg: 20 / 60, altitudeSdDeg: () => 0 })
    expectWithin(sampleDate(built, -9600, -20_000, 2026).noDateShare, 0.41, 3 * 0.011, 'of the draws')
  })

  // y² = 10⁶ z with z normal about 0.25: the nearer date is √ of it; draws below 0 have none: Φ(−2.5) = 0.0062.
  test('beside a turn loses the draws beyond it', () => {
    const sight = artificialSight((year) => 60 + (year / 1000) ** 2, { azimuthDeg: 60.25, azimuthSdDeg: 0.1 })
    expectWithin(sampleDate(sight, 500, -2000, 2000).noDateShare, 0.0062, 3 * 0.0018, 'of the draws')
    const far = artificialSight((year) => 60 + (year / 1000) ** 2, { azimuthDeg: 59, azimuthSdDeg: 0.1 })
    expect(sampleDate(far, 500, -2000, 2000)).toEqual({ sd: null, noDateShare: 1 })
  })

  test('is that of the branch asked for', () => {
    const slow = exactBranch((year) => 60 + year / 1000)
    const fast = exactBranch((year) => 60 - year / 250)
    const sight = branchedSight([slow, fast], { measuredSdDeg: 0.1 })
    // 0.1° are 100 years on the one and 25 on the other.
    expectWithin(sampleDateOf(sight, slow, 0, -5000, 5000).sd! / 100, 1, 3 * SAMPLING, '')
    expectWithin(sampleDateOf(sight, fast, 0, -5000, 5000).sd! / 25, 1, 3 * SAMPLING, '')
  })

  test('gives the same every time', () => {
    const sight = artificialSight((year) => 60 + year / 1000, { azimuthSdDeg: 0.1 })
    expect(sampleDate(sight, 0, -5000, 5000)).toEqual(sampleDate(sight, 0, -5000, 5000))
  })
})
