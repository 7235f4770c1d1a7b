import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { meanObliquityDeg } from '../../src/sky/mean-obliquity.ts'
import {
  equinoxDay,
  type SunSide,
  sunDayAt,
  sunDayFromSolstice,
  sunDayOfDeclination,
} from '../../src/sky/sun-days.ts'
import { daysBetweenLongitudes } from '../../src/sky/sun-in-orbit.ts'
import { expectWithin } from '../published/expect-within.ts'

const SIDES: readonly SunSide[] = ['northward', 'southward']
const epochOf = (time: Astronomy.AstroTime) => 2000 + time.tt / 365.25

/** Another program's declination of the Sun, of date. */
function declinationThere(time: Astronomy.AstroTime): number {
  const place = Astronomy.GeoVector(Astronomy.Body.Sun, time, true)
  return Astronomy.EquatorFromVector(Astronomy.RotateVector(Astronomy.Rotation_EQJ_EQD(time), place)).dec
}

describe('the Sun on a day counted from a solstice', () => {
  // Its longitude may differ by 60″ (see the test of the orbit), times sin ε; nutation adds 9″, its latitude 1″.
  test.each([30, 60, 90, 120, 150, -30, -60, -90])('%s days has another program’s declination', (days) => {
    for (let year = 1980; year < 2036; year += 5) {
      const { jun_solstice, dec_solstice } = Astronomy.Seasons(year)
      for (const [event, time] of [
        ['june solstice', jun_solstice],
        ['december solstice', dec_solstice],
      ] as const) {
        const day = sunDayFromSolstice(epochOf(time), event, days, meanObliquityDeg(year))
        const want = declinationThere(time.AddDays(days))
        expectWithin(3600 * (day.declinationDeg - want), 0, 60 * 0.4 + 9 + 1, 'arcsec', year)
        const [before, after] = [-0.5, 0.5].map((part) => declinationThere(time.AddDays(days + part)))
        expectWithin(day.perDayDeg, after! - before!, 0.0005, 'degrees a day', year)
        expect(day.side).toBe(after! > before! ? 'northward' : 'southward')
      }
    }
  })

  test('0 days is the solstice, where half a day makes no difference', () => {
    const june = sunDayFromSolstice(-9600, 'june solstice', 0, meanObliquityDeg(-9600))
    expectWithin(june.declinationDeg, meanObliquityDeg(-9600), 1e-9, 'degrees')
    expectWithin(june.declinationSdDeg, 0, 1e-9, 'degrees')
  })

  test('has the spread of a rising anywhere within half a day', () => {
    for (const days of [20, 45, 91]) {
      const day = (shift: number) => sunDayFromSolstice(-3000, 'june solstice', days + shift, 24.02)
      const spread = Array.from({ length: 1000 }, (_, i) => day((i + 0.5) / 1000 - 0.5).declinationDeg)
      const mean = spread.reduce((sum, x) => sum + x, 0) / spread.length
      const sd = Math.sqrt(spread.reduce((sum, x) => sum + (x - mean) ** 2, 0) / spread.length)
      expectWithin(day(0).declinationSdDeg, sd, 0.002 * sd, 'degrees', days)
    }
  })

  test('beyond the table of the orbit is more uncertain', () => {
    const at = (year: number) => sunDayFromSolstice(year, 'june solstice', 60, 22.2)
    // From 1,000 years beyond on: 60 days at √2 · 0.27/15.99 for the eccentricity, 1.9° of longitude, 0.7° of
    // declination.
    expect(at(-27_900).declinationSdDeg).toBeLessThan(0.12)
    for (const year of [-29_000, 13_000]) expect(at(year).declinationSdDeg).toBeGreaterThan(0.5)
  })

  test('passes out of the table without a jump, which would be read as a crossing', () => {
    for (const end of [-28_000, -29_000, 12_000, 13_000]) {
      const [before, after] = [end - 1e-4, end + 1e-4].map((year) =>
        sunDayFromSolstice(year, 'june solstice', 60, 22.2),
      )
      expectWithin(after!.declinationDeg, before!.declinationDeg, 1e-6, 'degrees', end)
    }
  })
})

describe('the equinox', () => {
  test.each(SIDES)('of declination zero is there (%s)', (side) => {
    const day = equinoxDay(-4000, 'declination zero', side, 24.1)
    expectWithin(day.declinationDeg, 0, 1e-12, 'degrees')
    expect(day.side).toBe(side)
    // The Sun moves 0.4° a day (method notes of this project, section 3).
    expectWithin(Math.abs(day.perDayDeg), 0.4, 0.02, 'degrees a day')
    expect(Math.sign(day.perDayDeg)).toBe(side === 'northward' ? 1 : -1)
  })

  // Thom, Megalithic Sites in Britain (1967), has the Sun of his calendar's equinox at +0.5° for 1800 BCE: the
  // half-year counted in days (from memory; also Ruggles, Astronomy in Prehistoric Britain and Ireland, 1999).
  test.each(SIDES)('midway in days was at +0.5° in 1800 BCE (%s)', (side) => {
    expectWithin(equinoxDay(-1799, 'midway in days', side, 23.9).declinationDeg, 0.5, 0.05, 'degrees')
  })

  // Another program's solstices and its Sun at the instant between them: 60″ of longitude and the nutation as above.
  test.each(SIDES)('midway in days is where another program has it (%s)', (side) => {
    for (let year = 1980; year < 2036; year += 3) {
      const december = (y: number) => Astronomy.Seasons(y).dec_solstice
      const june = Astronomy.Seasons(year).jun_solstice
      const [from, to] = side === 'northward' ? [december(year - 1), june] : [june, december(year)]
      const middle = from.AddDays((to.tt - from.tt) / 2)
      const day = equinoxDay(epochOf(middle), 'midway in days', side, meanObliquityDeg(year))
      expectWithin(3600 * (day.declinationDeg - declinationThere(middle)), 0, 60 * 0.4 + 10, 'arcsec', year)
      expect(day.side).toBe(side)
    }
  })

  test('in its senses differs by up to 0.9° (method notes of this project, section 3)', () => {
    const years = Array.from({ length: 220 }, (_, i) => -20_000 + 100 * i)
    const sizes = years.flatMap((year) =>
      SIDES.map((side) =>
        Math.abs(equinoxDay(year, 'midway in days', side, meanObliquityDeg(year)).declinationDeg),
      ),
    )
    expectWithin(Math.max(...sizes), 0.9, 0.05, 'degrees')
  })
})

describe('the day of a declination', () => {
  // Honolulu, 21°18′ N: the Sun overhead on 26 or 27 May and 15 or 16 July (from memory: the Bishop Museum's dates).
  test('has the Sun overhead at Honolulu on the printed days', () => {
    const [may, july] = SIDES.map((side) => sunDayOfDeclination(2020, 21.3, side, meanObliquityDeg(2020))!)
    // From the solstice of 20 June 2020, 11:44 there: noons of 26 May and 15 July are 24.97 days before and 25.03
    // after; either of the two days printed.
    expectWithin(daysBetweenLongitudes(2020, may!.longitudeDeg, 90), 24.97, 1, 'days')
    expectWithin(daysBetweenLongitudes(2020, 90, july!.longitudeDeg), 25.03, 1, 'days')
    for (const day of [may!, july!]) expectWithin(day.declinationDeg, 21.3, 1e-9, 'degrees')
  })

  test('comes twice a year, on either side of the solstice', () => {
    for (const [i, side] of SIDES.entries()) {
      const day = sunDayOfDeclination(-500, -12, side, 23.75)!
      expect(day.side).toBe(side)
      expect(Math.sign(day.perDayDeg)).toBe(i === 0 ? 1 : -1)
      expectWithin(day.declinationDeg, -12, 1e-9, 'degrees')
    }
  })

  test('is the solstice where the declination is the obliquity, and none beyond', () => {
    expectWithin(sunDayOfDeclination(0, 23.4, 'northward', 23.4)!.longitudeDeg, 90, 1e-5, 'degrees')
    expect(sunDayOfDeclination(0, 23.41, 'northward', 23.4)).toBeNull()
    expect(sunDayOfDeclination(0, -23.41, 'southward', 23.4)).toBeNull()
    expect(sunDayOfDeclination(0, Number.NaN, 'southward', 23.4)).toBeNull()
  })
})

test('longitudes come back within one turn, each on its side', () => {
  expect(sunDayAt(0, -10, 23.4)).toMatchObject({ longitudeDeg: 350, side: 'northward' })
  expect(sunDayAt(0, 460, 23.4)).toMatchObject({ longitudeDeg: 100, side: 'southward' })
})
