import { describe, expect, test } from 'vitest'
import { dateBudget, type ErrorSource } from '../../src/inference/budget.ts'
import { targetAzimuthDeg } from '../../src/inference/comparison.ts'
import { crossingYears, dateSdYears, impliedDates } from '../../src/inference/implied-dates.ts'
import type { Sight } from '../../src/inference/sight.ts'
import { expectWithin } from '../published/expect-within.ts'
import { seededRandom } from './seeded-random.ts'
import { artificialSight, WORKED_WITH_MODELS } from './sights.ts'

const variance = (rows: readonly { sd: number }[]) => rows.reduce((sum, { sd }) => sum + sd * sd, 0)

describe('the linear budget', () => {
  // At the equator over a level horizon the azimuth answers the declination one to one and the altitude not at all.
  const sight = artificialSight((year) => 60 + year / 1000)
  const sources: ErrorSource[] = [
    { source: 'plan', of: 'azimuth', sdDeg: 0.03 },
    { source: 'model', of: 'declination', sdDeg: 0.04 },
    { source: 'air', of: 'altitude', sdDeg: 0.5 },
  ]

  test('is each error over the drift, largest first, with its share of the variance', () => {
    const [model, plan, air] = dateBudget(sight, 0, sources)
    expect([model!.source, plan!.source, air!.source]).toEqual(['model', 'plan', 'air'])
    expectWithin(model!.sd, 40, 1e-6, 'years')
    expectWithin(plan!.sd, 30, 1e-6, 'years')
    expectWithin(air!.sd, 0, 1e-6, 'years')
    expectWithin(model!.share, 0.64, 1e-9, 'of the variance')
    expectWithin(plan!.share, 0.36, 1e-9, 'of the variance')
  })

  test('is none where the target is level or not to be seen', () => {
    expect(
      dateBudget(
        artificialSight(() => 60),
        0,
        sources,
      ),
    ).toEqual([])
    expect(dateBudget({ ...sight, altitudeDeg: () => 80 }, 0, sources)).toEqual([])
  })

  test('has no share where there is no error', () => {
    expect(dateBudget(sight, 0, [{ source: 'plan', of: 'azimuth', sdDeg: 0 }])).toEqual([
      { source: 'plan', sd: 0, share: 0 },
    ])
  })

  test('adds up to the standard deviation of the date', () => {
    const year = impliedDates(WORKED_WITH_MODELS, -20_000, 2026)[0]!.year
    const rows = dateBudget(WORKED_WITH_MODELS, year, sourcesOf(WORKED_WITH_MODELS, year))
    expectWithin(Math.sqrt(variance(rows)), dateSdYears(WORKED_WITH_MODELS, year)!, 1e-6, 'years')
    expectWithin(
      rows.reduce((sum, { share }) => sum + share, 0),
      1,
      1e-12,
      'of the variance',
    )
  })
})

/** The errors that a sight itself holds, as sources. */
function sourcesOf(sight: Sight, year: number): ErrorSource[] {
  return [
    { source: 'direction', of: 'azimuth', sdDeg: sight.azimuthSdDeg },
    { source: 'air and horizon', of: 'altitude', sdDeg: sight.altitudeSdDeg(year) },
    { source: 'obliquity', of: 'declination', sdDeg: sight.declinationSdDeg(year) },
  ]
}

/**
 * The sampled budget (JCGM 101:2008): errors are drawn, the line and its target moved by them, and the date nearest to
 * the year is found anew. Null stands for a draw that has no date.
 */
function sampledDates(
  sight: Sight,
  near: number,
  from: number,
  to: number,
  draws: number,
): (number | null)[] {
  const { normal } = seededRandom(41)
  return Array.from({ length: draws }, () => {
    const [inAzimuth, inAltitude, inDeclination] = [normal(), normal(), normal()]
    const moved: Sight = {
      ...sight,
      azimuthDeg: sight.azimuthDeg + inAzimuth * sight.azimuthSdDeg,
      altitudeDeg: (year) => sight.altitudeDeg(year) + inAltitude * sight.altitudeSdDeg(year),
      declinationDeg: (year) => sight.declinationDeg(year) + inDeclination * sight.declinationSdDeg(year),
    }
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
    const line = { ...WORKED_WITH_MODELS, azimuthDeg: targetAzimuthDeg(WORKED_WITH_MODELS, year)! }
    const linear = Math.sqrt(variance(dateBudget(line, year, sourcesOf(line, year))))
    const { sd, without } = spread(sampledDates(line, year, year - 3000, year + 3000, DRAWS))
    expect(without).toBe(0)
    // Over ± 250 years the drift itself changes by a tenth on either side, which cancels to first order.
    expectWithin(sd / linear, 1, 3 * sampling + 0.01, 'of the standard deviation')
  })

  test('part where the track is flat: the linear one knows of no turn', () => {
    const year = -8000
    const line = { ...WORKED_WITH_MODELS, azimuthDeg: targetAzimuthDeg(WORKED_WITH_MODELS, year)! }
    const linear = Math.sqrt(variance(dateBudget(line, year, sourcesOf(line, year))))
    const { sd, without } = spread(sampledDates(line, year, -14_000, -1000, DRAWS))
    // Draws beyond the top have no date at all, and those short of it crowd against it.
    expect(without).toBeGreaterThan(0.1)
    expect(Math.abs(sd / linear - 1)).toBeGreaterThan(0.3)
  })
})
