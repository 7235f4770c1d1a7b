import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { nextDarkMoment } from '../../src/sky/next-dark-moment.ts'
import { utDaysOf } from '../../src/sky/present-sky.ts'
import { expectWithin } from '../published/expect-within.ts'

const NOW = utDaysOf(new Date('2026-08-01T00:00Z'))
const place = (latitudeDeg: number, longitudeDeg: number) => ({ latitudeDeg, longitudeDeg, heightM: 0 })

/** Another program's altitude of the Sun. */
function sunAltitudeDeg(latitudeDeg: number, longitudeDeg: number, utDays: number): number {
  const observer = new Astronomy.Observer(latitudeDeg, longitudeDeg, 0)
  const { ra, dec } = Astronomy.Equator(Astronomy.Body.Sun, utDays, observer, true, true)
  return Astronomy.Horizon(utDays, observer, ra, dec).altitude
}

describe('the next dark moment of a sidereal time', () => {
  test.each([
    [51.2, -1.8],
    [-40, 175],
    [0, 60],
    [62, 25],
  ])('at %s°, %s° is that sidereal time, in the dark, and the first such', (latitude, longitude) => {
    for (let sidereal = 0; sidereal < 360; sidereal += 15) {
      const moment = nextDarkMoment(place(latitude, longitude), sidereal, NOW)
      let days = 0
      const start = moment ?? NOW + 366
      // Each earlier day at that sidereal time, back to now, must not have been dark.
      const firstOfAll = start - Math.floor((start - NOW) / 0.99726957) * 0.99726957
      for (; firstOfAll + days * 0.99726957 < start - 0.5; days++)
        if (moment !== null)
          expect(sunAltitudeDeg(latitude, longitude, firstOfAll + days * 0.99726957)).toBeGreaterThan(-12)
      if (moment === null) continue
      expect(moment).toBeGreaterThanOrEqual(NOW)
      expect(sunAltitudeDeg(latitude, longitude, moment)).toBeLessThanOrEqual(-12)
      const local = 15 * Astronomy.SiderealTime(Astronomy.MakeTime(moment)) + longitude
      const off = (((local - sidereal) % 360) + 540) % 360
      // Nutation moves the apparent sidereal time by a second in half a year.
      expectWithin(off, 180, 0.005, 'degrees', sidereal)
    }
  })

  test('is found all the year round in the tropics', () => {
    for (let sidereal = 0; sidereal < 360; sidereal += 15)
      expect(nextDarkMoment(place(10, 0), sidereal, NOW)).not.toBeNull()
  })

  // At 18 h of sidereal time it is midnight in June, noon in December, six o'clock at the equinoxes: at 65° N the Sun is
  // nowhere near 12° down at any of these, nor between.
  test('is none in the north where that time of the stars belongs to the summer nights', () => {
    expect(nextDarkMoment(place(65, 20), 270, NOW)).toBeNull()
    for (let day = 0; day < 366; day++)
      expect(sunAltitudeDeg(65, 20, firstAt(270, 20) + day * 0.99726957)).toBeGreaterThan(-12)
    expect(nextDarkMoment(place(65, 20), 90, NOW)).not.toBeNull()
  })
})

function firstAt(sidereal: number, longitude: number): number {
  const local = 15 * Astronomy.SiderealTime(Astronomy.MakeTime(NOW)) + longitude
  return NOW + (((((sidereal - local) % 360) + 360) % 360) / 360) * 0.99726957
}
