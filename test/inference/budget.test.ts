import { describe, expect, test } from 'vitest'
import { dateBudget } from '../../src/inference/budget.ts'
import { crossingYears, dateSdYears, impliedDates } from '../../src/inference/implied-dates.ts'
import type { Sight } from '../../src/inference/sight.ts'
import { expectWithin } from '../published/expect-within.ts'
import { seededRandom } from './seeded-random.ts'
import {
  artificialSight,
  directionDeg,
  exactBranch,
  type HorizonLine,
  horizonSight,
  onlyBranch,
  WORKED_LINE_WITH_MODELS,
  WORKED_WITH_MODELS,
} from './sights.ts'

const budgetOf = (sight: Sight, year: number) => dateBudget(sight, onlyBranch(sight), year)
const variance = (rows: readonly { sd: number }[]) => rows.reduce((sum, { sd }) => sum + sd * sd, 0)

describe('the linear budget', () => {
  // At the equator over a level horizon the azimuth answers the declination one to one and the altitude not at all.
  const track = (year: number) => 60 + year / 1000
  const errors = { azimuthSdDeg: 0.03, declinationSdDeg: () => 0.04, altitudeSdDeg: () => 0.5 }

  test('is each error over the drift, largest first, with its share of the variance', () => {
    // What does not move the date, here the altitude, is no part of it.
    const [obliquity, line, ...others] = budgetOf(artificialSight(track, errors), 0)
    expect(others).toEqual([])
    expect([obliquity!.source, line!.source]).toEqual(['declination', 'direction of the line'])
    expectWithin(obliquity!.sd, 40, 1e-6, 'years')
    expectWithin(line!.sd, 30, 1e-6, 'years')
    expectWithin(obliquity!.share, 0.64, 1e-9, 'of the variance')
    expectWithin(line!.share, 0.36, 1e-9, 'of the variance')
  })

  test('names the plan’s north apart, and an altitude measured as what it is', () => {
    const [north, line] = budgetOf(artificialSight(track, { azimuthSdDeg: 0.03, northSdDeg: 0.04 }), 0)
    expect([north!.source, line!.source]).toEqual(['the plan’s north', 'direction of the line'])
    expectWithin(north!.sd, 40, 1e-6, 'years')
    const shaft: Sight = {
      ...artificialSight(track, { azimuthSdDeg: 0.03 }),
      measures: 'altitude',
      branches: [exactBranch(track)],
    }
    expect(budgetOf(shaft, 0).map(({ source }) => source)).toEqual(['altitude measured'])
  })

  test('is that of the branch asked for', () => {
    const sight: Sight = {
      ...artificialSight(track, { azimuthSdDeg: 0.03 }),
      branches: [exactBranch(track), exactBranch((year) => 60 - year / 500)],
    }
    const sds = sight.branches.map((branch) => dateBudget(sight, branch, 0)[0]!.sd)
    expectWithin(sds[0]!, 30, 1e-6, 'years')
    expectWithin(sds[1]!, 15, 1e-6, 'years')
  })

  test('is none where the target is level or not to be seen', () => {
    expect(
      budgetOf(
        artificialSight(() => 60, errors),
        0,
      ),
    ).toEqual([])
    expect(budgetOf(artificialSight(track, { ...errors, altitudeDeg: () => 80 }), 0)).toEqual([])
  })

  test('has no rows where there is no error', () => {
    expect(budgetOf(artificialSight(track), 0)).toEqual([])
  })

  test('adds up to the standard deviation of the date', () => {
    const year = impliedDates(WORKED_WITH_MODELS, -20_000, 2026)[0]!.year
    const rows = budgetOf(WORKED_WITH_MODELS, year)
    const sd = dateSdYears(WORKED_WITH_MODELS, onlyBranch(WORKED_WITH_MODELS), year)!
    expectWithin(Math.sqrt(variance(rows)), sd, 1e-6, 'years')
    expectWithin(
      rows.reduce((sum, { share }) => sum + share, 0),
      1,
      1e-12,
      'of the variance',
    )
  })
})

/**
 * The sampled budget (JCGM 101:2008): errors are drawn, the line and its target moved by them, and the date nearest to
 * the year is found anew. Null stands for a draw that has no date.
 */
function sampledDates(
  line: HorizonLine,
  near: number,
  from: number,
  to: number,
  draws: number,
): (number | null)[] {
  const { normal } = seededRandom(41)
  return Array.from({ length: draws }, () => {
    const [inAzimuth, inAltitude, inDeclination] = [normal(), normal(), normal()]
    const moved = horizonSight({
      ...line,
      azimuthDeg: line.azimuthDeg + inAzimuth * line.azimuthSdDeg,
      altitudeDeg: (year) => line.altitudeDeg(year) + inAltitude * line.altitudeSdDeg(year),
      declinationDeg: (year) => line.declinationDeg(year) + inDeclination * line.declinationSdDeg(year),
    })
    const years = crossingYears(moved, from, to, 100)
    return years.reduce<number | null>(
      (best, year) => (best === null || Math.abs(year - near) < Math.abs(best - near) ? year : best),
      null,
    )
  })
}

function spread(dates: readonly (number | null)[]): { sd: number; without: number } {
  const found = dates.filter((date) => date !== null)
  const mean = found.reduce((sum, date) => sum + date, 0) / found.length
  const squares = found.reduce((sum, date) => sum + (date - mean) ** 2, 0)
  return { sd: Math.sqrt(squares / found.length), without: 1 - found.length / dates.length }
}

describe('the linear budget and the sampled one', () => {
  // The worked case, its line turned to where the Sun of the year 0 rose, on the straight part of the track; 1,500 draws
  // give a standard deviation to 1/√3000 = 1.8 %.
  const DRAWS = 1500
  const sampling = 1 / Math.sqrt(2 * DRAWS)

  test('agree where the track is straight', () => {
    const year = 0
    const line = { ...WORKED_LINE_WITH_MODELS, azimuthDeg: directionDeg(WORKED_WITH_MODELS, year)! }
    const linear = Math.sqrt(variance(budgetOf(horizonSight(line), year)))
    const { sd, without } = spread(sampledDates(line, year, year - 3000, year + 3000, DRAWS))
    expect(without).toBe(0)
    // Over ± 250 years the drift itself changes by a tenth on either side, which cancels to first order.
    expectWithin(sd / linear, 1, 3 * sampling + 0.01, 'of the standard deviation')
  })

  test('part where the track is flat: the linear one knows of no turn', () => {
    const year = -8000
    const line = { ...WORKED_LINE_WITH_MODELS, azimuthDeg: directionDeg(WORKED_WITH_MODELS, year)! }
    const linear = Math.sqrt(variance(budgetOf(horizonSight(line), year)))
    const { sd, without } = spread(sampledDates(line, year, -14_000, -1000, DRAWS))
    // Draws beyond the top have no date at all, and those short of it crowd against it.
    expect(without).toBeGreaterThan(0.1)
    expect(Math.abs(sd / linear - 1)).toBeGreaterThan(0.3)
  })
})
