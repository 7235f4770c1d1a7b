import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { wrap180 } from '../../src/quantity/degrees.ts'
import { daysBetweenLongitudes, sunLongitudeAfterDeg, sunLongitudeSdDeg } from '../../src/sky/sun-in-orbit.ts'
import { expectWithin } from '../published/expect-within.ts'

// Meeus, Astronomical Algorithms, chapter 27, the duration of the seasons (from memory): days of the northern spring,
// summer, autumn and winter, to 0.01 day.
const SEASONS = [
  [-4000, 93.55, 89.18, 89.07, 93.44],
  [-3500, 93.83, 89.53, 88.82, 93.07],
  [-3000, 94.04, 89.92, 88.61, 92.67],
  [-2500, 94.2, 90.33, 88.47, 92.25],
  [-2000, 94.28, 90.76, 88.38, 91.81],
  [-1500, 94.3, 91.2, 88.38, 91.37],
  [-1000, 94.25, 91.63, 88.42, 90.94],
  [-500, 94.14, 92.05, 88.53, 90.52],
  [0, 93.96, 92.45, 88.69, 90.13],
  [500, 93.73, 92.82, 88.91, 89.78],
  [1000, 93.44, 93.15, 89.18, 89.47],
  [1500, 93.12, 93.42, 89.5, 89.2],
  [2000, 92.76, 93.65, 89.84, 88.99],
  [2500, 92.37, 93.81, 90.22, 88.84],
  [3000, 91.97, 93.92, 90.61, 88.74],
] as const

describe('the Sun in its orbit', () => {
  // Two roundings, and two theories of the orbit that part by some 1e-6 in the eccentricity and 0.01° in the
  // perihelion.
  test.each(SEASONS)('in %s has seasons of the printed length', (year, ...seasons) => {
    for (const [i, days] of seasons.entries())
      expectWithin(daysBetweenLongitudes(year, 90 * i, 90 * i + 90), days, 0.015, 'days', i)
  })

  // Another program's Sun is the true one: the Moon sways it by 6.4″, Jupiter by 7″ and 3″, Venus by 5″ and 5″, Mars
  // and Saturn by 2″ each, 30″ at worst, at either end of the stretch. The elements here are smooth means.
  test.each([10, 30, 60, 90, 120, 150, 180])(
    '%s days from a solstice is where another program has it',
    (n) => {
      const strays: number[] = []
      for (let year = 1950; year < 2050; year++) {
        const { jun_solstice, dec_solstice } = Astronomy.Seasons(year)
        for (const days of [n, -n])
          for (const [time, from] of [
            [jun_solstice, 90],
            [dec_solstice, 270],
          ] as const) {
            const there = Astronomy.SunPosition(time.AddDays(days)).elon
            const here = sunLongitudeAfterDeg(2000 + time.tt / 365.25, from, days)
            strays.push(3600 * wrap180(here - there))
            expectWithin(strays.at(-1)!, 0, 60, 'arcsec', `${year} ${from}° ${days} d`)
          }
      }
      const mean = strays.reduce((sum, x) => sum + x, 0) / strays.length
      expectWithin(mean, 0, 3, 'arcsec', 'mean of the century')
    },
  )

  test.each([-27_000, -12_345, 2000, 11_000, -30_000])(
    'in %s days and longitudes lead back and forth',
    (year) => {
      for (const from of [0, 90, 200, 359])
        for (const days of [0.1, 1, 77, 180, 300, 365]) {
          const to = sunLongitudeAfterDeg(year, from, days)
          expectWithin(daysBetweenLongitudes(year, from, to), days, 1e-9, 'days', `${from}° + ${days} d`)
          expectWithin(wrap180(sunLongitudeAfterDeg(year, to, -days) - from), 0, 1e-9, 'degrees')
        }
    },
  )

  test('goes round in a tropical year', () => {
    expectWithin(wrap180(sunLongitudeAfterDeg(-5000, 123, 365.2422) - 123), 0, 1e-9, 'degrees')
  })

  test('from 1,000 years beyond the table of the orbit goes at its mean speed', () => {
    expectWithin(sunLongitudeAfterDeg(-30_000, 90, 365.2422 / 4), 180, 1e-9, 'degrees')
    expectWithin(daysBetweenLongitudes(-30_000, 270, 90), 365.2422 / 2, 1e-9, 'days')
    expectWithin(daysBetweenLongitudes(13_000, 270, 90), 365.2422 / 2, 1e-9, 'days')
  })
})

describe('the uncertainty of a longitude', () => {
  test('is none within the table', () => {
    for (const year of [-28_000, -20_000, 12_000]) expect(sunLongitudeSdDeg(year, 90, 150)).toBe(0)
  })

  test('grows from none to that of an unknown ellipse over the 1,000 years beyond it', () => {
    const beyond = sunLongitudeSdDeg(-40_000, 90, 150)
    for (const [years, share] of [
      [1e-6, 0],
      [250, 0.25],
      [1000, 1],
      [1001, 1],
    ] as const)
      expectWithin(sunLongitudeSdDeg(-28_000 - years, 90, 150), share * beyond, 1e-6, 'degrees', years)
  })

  test('beyond it is what ellipses turned every way would give', () => {
    // 21,000 years take the perihelion once round; the eccentricity goes from 0.0196 to 0.0165 on the way (mean square
    // root 0.0186), where the table's absence supposes √2 · 0.27/15.99 = 0.0239.
    for (const days of [30, 91, 180]) {
      const strays = Array.from({ length: 211 }, (_, i) => {
        const to = sunLongitudeAfterDeg(-17_000 + 100 * i, 90, days)
        return wrap180(to - 90 - (360 * days) / 365.2422)
      })
      const rms = Math.hypot(...strays) / Math.sqrt(strays.length)
      const got = sunLongitudeSdDeg(-30_000, 90, 90 + (360 * days) / 365.2422)
      expectWithin((rms / got) * 0.0239, 0.0188, 0.0008, 'of eccentricity', days)
    }
  })
})
