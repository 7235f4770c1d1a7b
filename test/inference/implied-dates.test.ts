import { describe, expect, test } from 'vitest'
import {
  crossingYears,
  dateSdYears as dateSdOf,
  driftDegPerYear as driftOf,
  impliedDates,
  nearestApproach,
} from '../../src/inference/implied-dates.ts'
import type { Sight } from '../../src/inference/sight.ts'
import { declinationDeg } from '../../src/site/horizontal.ts'
import { expectWithin } from '../published/expect-within.ts'
import {
  artificialLine,
  artificialSight,
  branchedSight,
  directionDeg,
  exactBranch,
  type HorizonLine,
  horizonSight,
  onlyBranch,
  WORKED,
} from './sights.ts'

const dateSdYears = (sight: Sight, year: number) => dateSdOf(sight, onlyBranch(sight), year)
const driftDegPerYear = (sight: Sight, year: number) => driftOf(sight, onlyBranch(sight), year)

/** 60° in the year 0, and on by 0.001° a year. */
const straightTrack = (year: number) => 60 + year / 1000
/** Down to 60° in the year 0 and up again: 60.25° in −500 and 500. */
const valley = (year: number) => 60 + (year / 1000) ** 2

describe('the dates of a line', () => {
  test('on a straight track are the one crossing', () => {
    const dates = impliedDates(artificialSight(straightTrack, { azimuthDeg: 60.3141 }), -2000, 2000)
    expect(dates).toHaveLength(1)
    expectWithin(dates[0]!.year, 314.1, 1e-3, 'years')
  })

  test('on a track that turns round are both crossings, ascending', () => {
    const dates = impliedDates(artificialSight(valley, { azimuthDeg: 60.25 }), -2000, 2000)
    expect(dates).toHaveLength(2)
    expectWithin(dates[0]!.year, -500, 1e-3, 'years')
    expectWithin(dates[1]!.year, 500, 1e-3, 'years')
  })

  test('are found once where they fall on a step of the search, and at the ends of the stretch', () => {
    const sight = artificialSight(straightTrack)
    // The very number that the year 0 gives, so that its offset is nothing at all.
    const exact = { ...sight, measuredDeg: directionDeg(sight, 0)! }
    const years = (from: number, to: number) => crossingYears(exact, from, to, 10)
    expect(years(-1000, 1000)).toEqual([0])
    expect(years(0, 1000)).toEqual([0])
    expect(years(-1000, 0)).toEqual([0])
    expect(years(5, 1000)).toEqual([])
  })

  test('are none where the line lies beyond the turn', () => {
    expect(impliedDates(artificialSight(valley, { azimuthDeg: 59.9 }), -2000, 2000)).toEqual([])
  })

  // From 100° to 175° the target passes the direction opposite to a line of 350° at 170°: the offset jumps from one
  // side of 180° to the other.
  test('are none where the target passes behind the back of the line', () => {
    const sight = artificialSight((year) => 100 + (75 * year) / 1000, { azimuthDeg: 350 })
    expect(crossingYears(sight, 0, 1000, 10)).toEqual([])
  })

  // Method notes of this project, section 8: the line was measured at exactly the azimuth that −9600 gives, printed to
  // 0.0001°. Near the flat top a ten-thousandth of a degree is 3 years.
  test('of the worked case hold −9600', () => {
    const [first, ...others] = impliedDates(WORKED, -20_000, 2026)
    expectWithin(first!.year, -9600, 3, 'years')
    expect(others).toHaveLength(1)
  })
})

describe('the dates of a line with several branches', () => {
  const branches = [
    exactBranch(straightTrack),
    exactBranch((year) => 60.5 - year / 500),
    exactBranch(() => null),
  ]

  test('are those of all of them, ascending, each with the interval of its own branch', () => {
    // 60.1° at 100 on the one, 200 on the other; 0.01° are 10 years on the one and 5 on the other.
    const dates = impliedDates(
      branchedSight(branches, { measuredDeg: 60.1, measuredSdDeg: 0.01 }),
      -1000,
      1000,
    )
    expect(dates).toHaveLength(2)
    for (const [i, [year, sd]] of [
      [100, 10],
      [200, 5],
    ].entries()) {
      expectWithin(dates[i]!.year, year!, 1e-3, 'years')
      expectWithin(dates[i]!.interval95![0], year! - 1.96 * sd!, 0.02 * sd!, 'years', `from ${year}`)
      expectWithin(dates[i]!.interval95![1], year! + 1.96 * sd!, 0.02 * sd!, 'years', `to ${year}`)
    }
    expect(crossingYears(branchedSight(branches, { measuredDeg: 60.1 }), -1000, 1000, 10)).toHaveLength(2)
  })

  test('have the nearest approach of the branch that comes nearest', () => {
    const { year, offsetDeg } = nearestApproach(branchedSight(branches, { measuredDeg: 66 }), -1000, 1000)
    expect(year).toBe(-1000)
    expectWithin(offsetDeg!, 66 - 62.5, 1e-9, 'degrees')
  })
})

describe('where the target is not always to be seen', () => {
  /** A body at latitude 66°, moving north until it no longer sets through −0.3°. */
  const moving: HorizonLine = {
    ...artificialLine(straightTrack),
    latitudeDeg: 66,
    altitudeDeg: () => -0.3,
    declinationDeg: (year) => 23.5 + 1.3e-4 * year,
  }
  const lastYear = (90 - 66 - 0.3 - 23.5) / 1.3e-4

  // The declination that a line has follows from its azimuth; the body has it in one year. Half a degree from north
  // that year is the last step of the search before the body stays up.
  test.each([20, 5, 1, 0.3, 0.05])('a line %s° from north has its date', (azimuthDeg) => {
    const declination = declinationDeg(azimuthDeg, -0.3, 66)
    const years = crossingYears(horizonSight({ ...moving, azimuthDeg }), -40_000, 4000, 10)
    expect(years).toHaveLength(1)
    expectWithin(years[0]!, (declination - 23.5) / 1.3e-4, 1e-3, 'years')
  })

  test('nothing is found in the years without it', () => {
    for (const azimuthDeg of [5, 180, 359.9])
      expect(crossingYears(horizonSight({ ...moving, azimuthDeg }), lastYear + 1, 8000, 10)).toEqual([])
  })

  test('the nearest approach is in the last year that has it, or nowhere', () => {
    const nearest = nearestApproach(horizonSight({ ...moving, azimuthDeg: 359 }), -3000, 4000)
    expectWithin(nearest.year, lastYear, 0.01, 'years')
    // A hundredth of a second of arc from the meridian at the most: the body turns north fast there.
    expectWithin(nearest.offsetDeg!, -1, 0.01, 'degrees')
  })

  // The body goes on north: the sooner after its last year, the less it misses the altitude.
  test('where it is never to be seen the nearest approach is in the year that misses its altitude by least', () => {
    const sight = horizonSight({ ...moving, azimuthDeg: 359 })
    expect(nearestApproach(sight, 2000, 4000)).toEqual({ year: 2000, offsetDeg: null })
    const back = horizonSight({
      ...moving,
      azimuthDeg: 359,
      declinationDeg: (year) => 24 + Math.abs(year - 2570) / 1e4,
    })
    // Looked for in steps of 20 years.
    const { year, offsetDeg } = nearestApproach(back, 2000, 4000)
    expectWithin(year, 2570, 10, 'years')
    expect(offsetDeg).toBeNull()
  })
})

describe('the nearest approach', () => {
  test('to a line beyond the turn is the turn', () => {
    const { year, offsetDeg } = nearestApproach(artificialSight(valley, { azimuthDeg: 59.9 }), -2000, 2000)
    expectWithin(year, 0, 5, 'years')
    expectWithin(offsetDeg!, -0.1, 1e-4, 'degrees')
  })
})

describe('the 95 % interval of a date', () => {
  // 1.959964 standard deviations of the normal distribution; 0.1° at 0.001° a year are 100 years. A hundredth of a
  // standard deviation is the step it is looked for in.
  test('on a straight track is ± 1.96 standard deviations', () => {
    const [date] = impliedDates(artificialSight(straightTrack, { azimuthSdDeg: 0.1 }), -5000, 5000)
    expectWithin(date!.interval95![0], -195.9964, 0.1, 'years')
    expectWithin(date!.interval95![1], 195.9964, 0.1, 'years')
  })

  test('is there where the turn is far, and null where the interval runs into it', () => {
    const at = (azimuthDeg: number) =>
      impliedDates(artificialSight(valley, { azimuthDeg, azimuthSdDeg: 0.02 }), -3000, 3000)
    // At 61° the track runs at 0.002° a year: 10 years of standard deviation, a turn 1,000 years off.
    for (const { year, interval95 } of at(61)) {
      expectWithin((interval95![1] - interval95![0]) / 2, 19.6, 0.2, 'years', year)
      expectWithin((interval95![0] + interval95![1]) / 2, year, 1, 'years', year)
    }
    expect(at(60.02).map(({ interval95 }) => interval95)).toEqual([null, null])
  })

  test('is null where it runs past the end of the search', () => {
    const [date] = impliedDates(artificialSight(straightTrack, { azimuthSdDeg: 0.1 }), -5000, 150)
    expect(date!.interval95).toBeNull()
  })

  test('of a line without any error is the date', () => {
    const [date] = impliedDates(artificialSight(straightTrack), -5000, 5000)
    expectWithin(date!.interval95![0], 0, 1e-3, 'years')
    expectWithin(date!.interval95![1], 0, 1e-3, 'years')
  })
})

describe('drift and standard deviation', () => {
  test('are those of the track: 0.001° a year, and 0.1° over that', () => {
    const sight = artificialSight(straightTrack, { azimuthSdDeg: 0.06, northSdDeg: 0.08 })
    expectWithin(driftDegPerYear(sight, 300)!, 0.001, 1e-12, 'degrees a year')
    expectWithin(dateSdYears(sight, 300)!, 100, 1e-6, 'years')
    expectWithin(
      driftDegPerYear(
        artificialSight((year) => 60 - year / 500),
        0,
      )!,
      -0.002,
      1e-12,
      'degrees a year',
    )
  })

  test('are null at the turn and where there is no target', () => {
    expect(
      dateSdYears(
        artificialSight(() => 60, { azimuthSdDeg: 0.1 }),
        0,
      ),
    ).toBeNull()
    const unseen = artificialSight(straightTrack, { altitudeDeg: () => 80 })
    expect(driftDegPerYear(unseen, 0)).toBeNull()
    expect(dateSdYears(unseen, 0)).toBeNull()
  })
})

describe('a direction that leaps past the line', () => {
  /** The first gleam of a body that leaves one summit for the next in the year 500. */
  const leaping = (before: number, after: number): Sight => ({
    name: 'between two summits',
    measures: 'azimuth',
    measuredDeg: 60,
    axis: null,
    measuredSdDeg: 0.01,
    northSdDeg: 0,
    toleranceScale: 1,
    northOf: null,
    branches: [
      { predict: (year) => ({ directionDeg: (year < 500 ? before : after) + year * 1e-5, errors: [] }) },
    ],
  })

  test('has no date: it never stands on it', () => {
    expect(crossingYears(leaping(59.7, 60.3), -2000, 2000, 20)).toEqual([])
    expect(impliedDates(leaping(59.7, 60.3), -2000, 2000)).toEqual([])
  })

  test('has the date at which it moves onto it between leaps', () => {
    const years = crossingYears(leaping(60.01, 60.3), -2000, 2000, 20)
    expect(years).toHaveLength(1)
    expectWithin(years[0]!, -1000, 0.01, 'years', 'the meeting')
  })
})
