import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { trueObliquityDeg, utDaysOf } from '../../src/sky/present-sky.ts'
import { type SunMoment, sunMoments } from '../../src/sky/sun-moments.ts'
import { expectWithin } from '../published/expect-within.ts'
import { readTextTable } from '../published/read-text-table.ts'

const at = (utc: string) => utDaysOf(new Date(utc))
const NOW = at('2026-08-01T00:00Z')
const seasons = (longitude: string) =>
  readTextTable('seasons.csv')
    .filter((row) => row.longitude_deg === longitude && at(row.utc!) > NOW)
    .map((row) => at(row.utc!))

function expectMinutes(got: readonly number[], want: readonly number[], tolerance: number) {
  expect(got.length).toBeGreaterThanOrEqual(2)
  for (const [i, moment] of got.slice(0, 2).entries())
    expectWithin((moment - want[i]!) * 1440, 0, tolerance, 'minutes', i)
}

function declinationDeg(utDays: number): number {
  return Astronomy.EquatorFromVector(
    Astronomy.RotateVector(
      Astronomy.Rotation_EQJ_EQD(Astronomy.MakeTime(utDays)),
      Astronomy.GeoVector(Astronomy.Body.Sun, utDays, true),
    ),
  ).dec
}

describe('the moments of the Sun', () => {
  test('are the almanacs’ solstices and equinoxes', () => {
    expectMinutes(sunMoments({ name: 'june solstice' }, NOW), seasons('90'), 1)
    expectMinutes(sunMoments({ name: 'december solstice' }, NOW), seasons('270'), 1)
    const equinoxes = [...seasons('0'), ...seasons('180')].sort((a, b) => a - b)
    expectMinutes(sunMoments({ name: 'equinox', sense: 'declination zero' }, NOW), equinoxes, 1)
  })

  test('so many days from a solstice are that', () => {
    const december = seasons('270')
    for (const days of [-40, -183.5, 12, 91.3]) {
      const got = sunMoments({ name: 'day', days, after: 'december solstice' }, NOW)
      const year = got[0]! - days > december[0]! + 10 ? 1 : got[0]! - days < december[0]! - 10 ? -1 : 0
      expect(got[0]!).toBeGreaterThanOrEqual(NOW)
      expectWithin(
        (got[0]! - days - (december[0]! + year * 365.2422)) * 24,
        0,
        year === 0 ? 0.02 : 0.5,
        'hours',
        days,
      )
    }
  })

  test('midway in days lie halfway between the almanacs’ solstices', () => {
    const [june, december, next] = ['2026-06-21T08:24Z', '2026-12-21T20:50Z', '2027-06-21T14:11Z'].map(
      at,
    ) as [number, number, number]
    const got = sunMoments({ name: 'equinox', sense: 'midway in days' }, NOW)
    expectMinutes(got, [(june + december) / 2, (december + next) / 2], 1)
  })

  // Declination moves by 1′ in an hour at the equinoxes, the Sun's latitude is up to 1.2″.
  test.each([19.43, -19.43, 0.3, -23, 10])('at declination %s° the Sun has it', (declination) => {
    const got = sunMoments({ name: 'declination', declinationDeg: declination }, NOW)
    for (const moment of got) expectWithin(declinationDeg(moment) * 3600, declination * 3600, 2, 'arcsec')
    const [first, second] = got.map((moment) => declinationDeg(moment + 1) - declinationDeg(moment))
    expect(Math.sign(first!)).toBe(-Math.sign(second!))
  })

  // The obliquity itself: nutation changes that by 3″ a year at most, and it falls by 0.5″ a year besides.
  test.each([1, -1])('at the very end of its way, %s, the Sun has it about the solstice', (side) => {
    for (let year = 0; year < 19; year++) {
      const from = NOW + year * 365.25
      const declination = side * (trueObliquityDeg(from) - 1e-6)
      for (const moment of sunMoments({ name: 'declination', declinationDeg: declination }, from)) {
        expect(moment).toBeGreaterThanOrEqual(from)
        expectWithin(declinationDeg(moment) * 3600, declination * 3600, 2 + 2 * 3.5, 'arcsec', year)
      }
    }
  })

  test('there are none at a declination beyond the obliquity', () => {
    expect(sunMoments({ name: 'declination', declinationDeg: 23.5 }, NOW)).toEqual([])
    expect(sunMoments({ name: 'declination', declinationDeg: -51 }, NOW)).toEqual([])
  })

  const ALL: SunMoment[] = [
    { name: 'june solstice' },
    { name: 'equinox', sense: 'declination zero' },
    { name: 'equinox', sense: 'midway in days' },
    { name: 'day', days: 300, after: 'june solstice' },
    { name: 'declination', declinationDeg: 19.43 },
  ]
  test.each(ALL)('come in order, none before the instant given, none left out: %o', (moment) => {
    const once = moment.name === 'june solstice' || moment.name === 'day'
    for (let day = 0; day < 370; day += 9.7) {
      const got = sunMoments(moment, NOW + day)
      expect(got[0]!).toBeGreaterThanOrEqual(NOW + day)
      expect(got[0]! - NOW - day).toBeLessThan(once ? 365.3 : 300)
      for (const [i, later] of got.slice(1).entries()) expect(later).toBeGreaterThan(got[i]! + 60)
      if (once) expectWithin(got[1]! - got[0]!, 365.2422, 0.02, 'days')
    }
  })

  test('refuse what is no number', () => {
    expect(() => sunMoments({ name: 'day', days: Number.NaN, after: 'june solstice' }, NOW)).toThrow(
      RangeError,
    )
    expect(() => sunMoments({ name: 'declination', declinationDeg: Number.NaN }, NOW)).toThrow(RangeError)
  })
})
