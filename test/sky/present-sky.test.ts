import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { DEG } from '../../src/quantity/degrees.ts'
import {
  moonDeclinationDeg,
  moonLitShare,
  seenBody,
  siderealDegAtGreenwich,
  sunAtLongitude,
  trueObliquityDeg,
  utDaysOf,
  withoutBareStrings,
} from '../../src/sky/present-sky.ts'
import { expectWithin } from '../published/expect-within.ts'
import { numberIn, readTextTable } from '../published/read-text-table.ts'

const at = (utc: string) => utDaysOf(new Date(utc))
const degrees = (whole: number, minutes: number, seconds: number) => whole + minutes / 60 + seconds / 3600

// Meeus, Astronomical Algorithms (2nd edition), worked examples, from memory. Times in TD are 59 s ahead of UT in 1992.
describe('the present sky is that of Meeus’s worked examples', () => {
  test('12.a: sidereal time at Greenwich, 1987 April 10, 0h UT', () => {
    const want = 15 * degrees(13, 10, 46.1351)
    expectWithin(siderealDegAtGreenwich(at('1987-04-10T00:00:00Z')) * 3600, want * 3600, 0.5, 'arcsec')
  })

  test('22.a: true obliquity, 1987 April 10', () => {
    const want = degrees(23, 26, 36.85)
    expectWithin(trueObliquityDeg(at('1987-04-10T00:00:00Z')) * 3600, want * 3600, 0.5, 'arcsec')
  })

  test('47.a: declination of the Moon, 1992 April 12, 0h TD', () => {
    expectWithin(moonDeclinationDeg(at('1992-04-11T23:59:01Z')) * 3600, 13.768368 * 3600, 10, 'arcsec')
  })

  test('48.a: lit part of the Moon at the same time', () => {
    expectWithin(moonLitShare(at('1992-04-11T23:59:01Z')), 0.6786, 0.0005, 'of the disc')
  })

  test('25.b: declination of the Sun, 1992 October 13, 0h TD', () => {
    const place = { latitudeDeg: 0, longitudeDeg: 0, heightM: 0 }
    const got = seenBody('sun', place, at('1992-10-12T23:59:01Z')).declinationDeg
    // The example is seen from the middle of the Earth, this from its surface on the equator: no parallax northward
    // but for δ itself, whose share of 8.8″ is 1.2″.
    expectWithin(got * 3600, -degrees(7, 47, 1.74) * 3600, 3, 'arcsec')
  })
})

describe('the Sun at a longitude', () => {
  // Printed to the minute: 0.5 minutes. Besides, the library's shortened theory is 1.5″ off in places, which takes the
  // Sun 0.6 minutes, and its ΔT of these years is 6 s too long.
  test.each(readTextTable('seasons.csv').map((row) => [row.utc!, numberIn(row.longitude_deg)!] as const))(
    '%s',
    (utc, longitude) => {
      for (const daysBefore of [0.1, 3, 180, 364]) {
        const got = sunAtLongitude(longitude, at(utc) - daysBefore)
        expectWithin((got - at(utc)) * 1440, 0, 1.2, 'minutes', daysBefore)
      }
    },
  )

  test('is never before the instant given', () => {
    for (let day = 0; day < 366; day += 7) {
      const from = at('2026-01-01T00:00Z') + day
      const got = sunAtLongitude(90, from)
      expect(got).toBeGreaterThanOrEqual(from)
      expect(got).toBeLessThan(from + 365.3)
    }
  })
})

describe('a body as seen', () => {
  // On the equator the middle of the Earth lies straight below, so that parallax moves the Moon in altitude alone: by p
  // with sin p = sin π cos h; and sin δ = cos h cos A for what the middle sees.
  test('the Moon is lowered by its parallax', () => {
    const place = { latitudeDeg: 0, longitudeDeg: 0, heightM: 0 }
    for (let hour = 0; hour < 24; hour += 1.7) {
      const utDays = at('2026-08-01T00:00Z') + hour / 24
      const { altitudeDeg, azimuthDeg } = seenBody('moon', place, utDays)
      const distanceKm = Astronomy.GeoMoon(Astronomy.MakeTime(utDays)).Length() * Astronomy.KM_PER_AU
      const parallax = Math.asin((6378.14 / distanceKm) * Math.cos(altitudeDeg * DEG))
      const sine = Math.cos(altitudeDeg * DEG + parallax) * Math.cos(azimuthDeg * DEG)
      expectWithin(Math.asin(sine) / DEG, moonDeclinationDeg(utDays), 0.0005, 'degrees', hour)
    }
  })
})

test('what is thrown as a bare string comes out as an error', () => {
  expect(() =>
    withoutBareStrings(() => {
      throw 'Excessive iteration in Search()'
    }),
  ).toThrow(new Error('astronomy-engine: Excessive iteration in Search()'))
  expect(() =>
    withoutBareStrings(() => {
      throw new RangeError('as it is')
    }),
  ).toThrow(new RangeError('as it is'))
  expect(() => sunAtLongitude(90, Number.NaN)).toThrow(Error)
  expect(() => moonDeclinationDeg(Number.NaN)).toThrow(Error)
})
