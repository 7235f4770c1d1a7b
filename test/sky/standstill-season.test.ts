import { describe, expect, test } from 'vitest'
import { MOON_WOBBLE_ARCMIN, STANDSTILL_CYCLE_YEARS, standstillDeclinationDeg } from '../../src/sky/moon.ts'
import { moonDeclinationDeg, utDaysOf } from '../../src/sky/present-sky.ts'
import { standstillSeason } from '../../src/sky/standstill-season.ts'
import { expectWithin } from '../published/expect-within.ts'

const at = (utc: string) => utDaysOf(new Date(utc))

describe('a season of standstill', () => {
  // Meeus, More Mathematical Astronomy Morsels, on the extreme declinations of the Moon (from memory): +28°43′22″ on 15
  // September 2006 about 1 h, +28°43′ on 7 March 2025. The library's Moon is good to some 10″.
  test.each([
    ['2000-01-01', '2006-09-15T01:26Z', 28 + 43 / 60 + 22 / 3600, 10],
    ['2020-01-01', '2025-03-07T16:00Z', 28 + 43 / 60, 30],
  ])('from %s on has its northernmost Moon when print has it', (from, utc, declination, toleranceArcsec) => {
    const { mostExtreme } = standstillSeason('northern major standstill', at(`${from}T00:00Z`))
    expectWithin((mostExtreme.utDays - at(utc)) * 24, 0, 1, 'hours')
    expectWithin((mostExtreme.declinationDeg - declination) * 3600, 0, toleranceArcsec, 'arcsec')
  })

  // The years, and the cycle, as print has them (from memory).
  test.each([
    ['1990-01-01', 'northern minor standstill', 1997],
    ['2000-01-01', 'southern major standstill', 2006],
    ['2010-01-01', 'southern minor standstill', 2015],
    ['2026-08-01', 'northern minor standstill', 2034],
    ['2026-08-01', 'southern minor standstill', 2034],
    ['2026-06-01', 'northern major standstill', 2025],
    ['2026-08-25', 'northern major standstill', 2043],
    ['2026-08-25', 'southern major standstill', 2043],
  ] as const)('from %s on, %s, is about %s', (from, event, year) => {
    const season = standstillSeason(event, at(`${from}T00:00Z`))
    const next = standstillSeason(event, season.extremes.at(-1)!.utDays + 600)
    expectWithin(season.centreYear, year + 0.5, 1, 'years')
    expectWithin(next.centreYear - season.centreYear, STANDSTILL_CYCLE_YEARS, 0.02, 'years')
  })

  // ε ± i, and the wobble of the path, 9′. The nearest month may be 14 days off the height of the wobble (1.1′), the node
  // 87 days off the equinox then (1.1′); nutation is 0.15′.
  test.each([
    ['northern major standstill', 1],
    ['southern major standstill', -1],
    ['northern minor standstill', -1],
    ['southern minor standstill', 1],
  ] as const)('%s is as far out as obliquity, inclination and wobble make it', (event, outward) => {
    for (const from of ['1950-01-01', '1990-01-01', '2010-01-01', '2030-01-01', '2060-01-01', '2150-01-01']) {
      const season = standstillSeason(event, at(`${from}T00:00Z`))
      const { declinationDeg } = season.mostExtreme
      const mean = standstillDeclinationDeg(season.centreYear, event, 'vondrak2011')
      expectWithin((declinationDeg - mean) * 60, outward * MOON_WOBBLE_ARCMIN, 2.4, 'arcmin', from)
      for (const extreme of season.extremes)
        expectWithin(extreme.declinationDeg, declinationDeg, 15 / 60, 'degrees', from)
    }
  })

  test('consists of true extremes, a month or more apart', () => {
    for (const event of ['northern major standstill', 'southern minor standstill'] as const)
      for (const from of ['2000-01-01', '2020-01-01', '2040-01-01']) {
        const { extremes, mostExtreme } = standstillSeason(event, at(`${from}T00:00Z`))
        expect(extremes.length).toBeGreaterThan(8)
        expect(extremes).toContainEqual(mostExtreme)
        for (const [i, { utDays, declinationDeg }] of extremes.entries()) {
          const side = Math.sign(declinationDeg)
          for (const days of [-0.05, 0.05, -3, 3])
            expect(side * moonDeclinationDeg(utDays + days)).toBeLessThan(side * declinationDeg)
          if (i > 0) {
            const months = (utDays - extremes[i - 1]!.utDays) / 27.3216
            expectWithin(months, Math.round(months), 0.06, 'months')
            expect(months).toBeGreaterThan(0.9)
          }
        }
      }
  })
})
