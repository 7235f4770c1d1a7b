import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { sunSemidiameter, sunSemidiameterAt, sunSpeedDegPerDay } from '../../src/sky/sun.ts'
import { expectWithin } from '../published/expect-within.ts'

describe('the semidiameter of the Sun on any day', () => {
  // Another program's distance, with the sways of Moon and planets, 8e-5 au in all, of 16′: 0.0013′.
  test.each([0, 45, 180, 200, 283, 340])('at longitude %s° is that of another program', (longitude) => {
    for (const year of [1985, 2005, 2025]) {
      const start = Astronomy.MakeTime(new Date(Date.UTC(year, 0, 1)))
      const time = Astronomy.SearchSunLongitude(longitude, start, 370)!
      const distance = Astronomy.GeoVector(Astronomy.Body.Sun, time, true).Length()
      const got = sunSemidiameterAt(2000 + time.tt / 365.25, longitude)
      expectWithin(got.arcmin, 959.63 / 60 / distance, 0.0015, 'arcmin', year)
      expect(got.sdArcmin).toBe(0)
    }
  })

  test('at a solstice is that of the solstice', () => {
    for (const year of [-9600, 2000, -30_000]) {
      expect(sunSemidiameterAt(year, 90)).toEqual(sunSemidiameter(year, 'june solstice'))
      expect(sunSemidiameterAt(year, 270)).toEqual(sunSemidiameter(year, 'december solstice'))
    }
  })
})

describe('the speed of the Sun', () => {
  // Almanacs (from memory): 57′12″ a day at the aphelion, 61′10″ at the perihelion.
  test('is what almanacs print at its extremes', () => {
    expectWithin(sunSpeedDegPerDay(2000, 102.9) * 60, 57 + 12 / 60, 0.05, 'arcmin a day')
    expectWithin(sunSpeedDegPerDay(2000, 282.9) * 60, 61 + 10 / 60, 0.05, 'arcmin a day')
  })

  test('beyond the table is the mean', () => {
    expectWithin(sunSpeedDegPerDay(-30_000, 12), 360 / 365.2422, 1e-12, 'degrees a day')
  })
})
