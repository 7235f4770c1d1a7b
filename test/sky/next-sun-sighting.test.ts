import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { horizonCrossing } from '../../src/site/horizontal.ts'
import { nextSunSighting, type SunSight } from '../../src/sky/next-sun-sighting.ts'
import { utDaysOf } from '../../src/sky/present-sky.ts'
import { type SunMoment, sunMoments } from '../../src/sky/sun-moments.ts'
import { expectWithin } from '../published/expect-within.ts'

const NOW = new Date('2026-08-01T00:00Z')
const PLAIN = { latitudeDeg: 51.2, longitudeDeg: -1.8, heightM: 100 }
/** In the south of the Pacific, a day ahead of UTC at sunrise. */
const AHEAD = { latitudeDeg: -40, longitudeDeg: 175, heightM: 0 }
const JUNE = { name: 'june solstice' } as const

function seen(place: typeof PLAIN, sight: SunSight, now = NOW) {
  const { sighting, because } = nextSunSighting(place, sight, now)
  expect(because).toBeNull()
  return sighting!
}

/** Another program's Sun, topocentric and without air. */
function sunAt(place: typeof PLAIN, utc: string) {
  const observer = new Astronomy.Observer(place.latitudeDeg, place.longitudeDeg, place.heightM)
  const { ra, dec } = Astronomy.Equator(Astronomy.Body.Sun, new Date(utc), observer, true, true)
  return { ...Astronomy.Horizon(new Date(utc), observer, ra, dec), dec }
}

describe('the next sighting of the Sun', () => {
  test.each([
    [{ moment: JUNE, at: 'rising', centreAltitudeDeg: -0.83 }, '2027-06-21', '2027-06-21T14:11Z'],
    [{ moment: JUNE, at: 'setting', centreAltitudeDeg: 1.2 }, '2027-06-21', '2027-06-21T14:11Z'],
    [{ moment: { name: 'december solstice' }, at: 'noon' }, '2026-12-21', '2026-12-21T20:50Z'],
    [
      { moment: { name: 'december solstice' }, at: 'setting', centreAltitudeDeg: 0 },
      '2026-12-21',
      '2026-12-21T20:50Z',
    ],
  ] as const)(
    'is on the day of the solstice’s nearest rising, setting or noon: %o',
    (sight, date, moment) => {
      const sighting = seen(PLAIN, sight)
      expect(sighting.date).toBe(date)
      const offDays = (Date.parse(sighting.utc!) - Date.parse(moment)) / 86_400_000
      // The day from one rising to the next is a few minutes longer or shorter than 24 h.
      expectWithin(offDays, 0, 0.503, 'days')
    },
  )

  test.each([PLAIN, AHEAD])(
    'has the Sun where another program and spherical trigonometry have it',
    (place) => {
      for (const at of ['rising', 'setting'] as const)
        for (const altitude of [-0.83, 0, 3.5]) {
          const sighting = seen(place, { moment: JUNE, at, centreAltitudeDeg: altitude })
          const sun = sunAt(place, sighting.utc!)
          // The instant is told to the minute, in which the Sun moves by 15′: by 8′ at most in half of one.
          expectWithin(sun.altitude, altitude, 8 / 60, 'degrees')
          const crossing = horizonCrossing(sun.dec, altitude, place.latitudeDeg, at)!
          expectWithin(sun.azimuth, crossing.azimuthDeg, 8 / 60, 'degrees')
          expectWithin(sun.dec, 23.436, 0.004, 'degrees')
        }
    },
  )

  test('is dated by the mean time of the place', () => {
    const sighting = seen(AHEAD, { moment: JUNE, at: 'rising', centreAltitudeDeg: -0.83 })
    // 14:11 UT is past 2 in the morning of the 22nd at 175° east; the Sun rises there between 7 and 8.
    expect(sighting.date).toBe('2027-06-22')
    expect(sighting.utc).toMatch(/^2027-06-21T19:/)
  })

  test('is half a day at most from the moment, and never past', () => {
    const moments: SunMoment[] = [
      JUNE,
      { name: 'equinox', sense: 'midway in days' },
      { name: 'equinox', sense: 'declination zero' },
      { name: 'day', days: 45, after: 'december solstice' },
      { name: 'declination', declinationDeg: -1.3 },
    ]
    for (const moment of moments)
      for (const at of ['rising', 'setting', 'noon'] as const)
        for (const longitudeDeg of [-150, -50, 60, 179]) {
          const place = { ...PLAIN, longitudeDeg }
          const sight: SunSight = at === 'noon' ? { moment, at } : { moment, at, centreAltitudeDeg: 0.5 }
          const first = seen(place, sight)
          const fromMoments = sunMoments(moment, utDaysOf(NOW) - 1).map((utDays) =>
            Math.abs(utDaysOf(new Date(first.utc!)) - utDays),
          )
          // The day from one rising to the next is a few minutes longer or shorter than 24 h.
          expectWithin(Math.min(...fromMoments), 0, 0.503, 'days')
          expect(Date.parse(first.utc!)).toBeGreaterThanOrEqual(NOW.getTime())
          const later = seen(place, sight, new Date(Date.parse(first.utc!) + 60_000))
          const afterDays = (Date.parse(later.utc!) - Date.parse(first.utc!)) / 86_400_000
          expect(afterDays).toBeGreaterThan(80)
          expect(afterDays).toBeLessThan(370)
          const again = seen(place, sight, new Date(Date.parse(first.utc!) - 60_000))
          expect(again.utc).toBe(first.utc)
        }
  })

  // Mexico City's two zenith passages fall on 16 to 18 May and 25 to 27 July, as print has it (from memory).
  test('in the zenith at 19.43° N is in mid May and late July', () => {
    const place = { latitudeDeg: 19.43, longitudeDeg: -99.13, heightM: 2240 }
    const sight = { moment: { name: 'zenith passage' }, at: 'noon' } as const
    const may = seen(place, sight)
    expect(['2027-05-16', '2027-05-17', '2027-05-18']).toContain(may.date)
    const july = seen(place, sight, new Date('2027-06-01T00:00Z'))
    expect(['2027-07-25', '2027-07-26', '2027-07-27']).toContain(july.date)
    // In half a day the declination changes by 7′, in half a minute the Sun moves by 8′.
    for (const { utc } of [may, july]) expect(sunAt(place, utc!).altitude).toBeGreaterThan(90 - 15 / 60)
  })

  test('at noon stands on the meridian at 90° less latitude and declination apart', () => {
    const sun = sunAt(PLAIN, seen(PLAIN, { moment: JUNE, at: 'noon' }).utc!)
    // In half a minute the hour angle changes by 7.5′, the azimuth of the Sun at 62° by twice that and the altitude by 1″.
    expectWithin(sun.azimuth, 180, 16 / 60, 'degrees')
    expectWithin(sun.altitude, 90 - Math.abs(51.2 - sun.dec), 0.0005, 'degrees')
    expectWithin(sun.dec, 23.436, 0.003, 'degrees')
  })

  test('at a solstice tells the days on which the declination is within 1′ of its extreme', () => {
    for (const [name, instant, sign] of [
      ['june solstice', '2027-06-21T14:11Z', 1],
      ['december solstice', '2026-12-21T20:50Z', -1],
    ] as const) {
      const sighting = seen(PLAIN, { moment: { name }, at: 'rising', centreAltitudeDeg: -0.83 })
      const { from, to } = sighting.note.steady!
      const declination = (date: string, days: number) => {
        const time = sighting.utc!.slice(10)
        return sign * sunAt(PLAIN, new Date(Date.parse(date + time) + days * 86_400_000).toISOString()).dec
      }
      const extreme = sign * sunAt(PLAIN, instant).dec
      const shortfall = (date: string, days: number) => 60 * (extreme - declination(date, days))
      // The Sun's latitude and parallax add some seconds of arc.
      for (const date of [from, to]) expect(shortfall(date, 0)).toBeLessThan(1.05)
      expect(shortfall(from, -1)).toBeGreaterThan(0.95)
      expect(shortfall(to, 1)).toBeGreaterThan(0.95)
    }
    expect(
      seen(PLAIN, { moment: { name: 'equinox', sense: 'declination zero' }, at: 'noon' }).note.steady,
    ).toBeNull()
  })

  test('has no instant where the longitude is not known', () => {
    const { sighting } = nextSunSighting(
      { ...PLAIN, longitudeDeg: null },
      { moment: JUNE, at: 'rising', centreAltitudeDeg: -0.83 },
      NOW,
    )
    expect(sighting).toMatchObject({ date: '2027-06-21', utc: null })
  })

  test.each([
    [70, { moment: JUNE, at: 'rising', centreAltitudeDeg: -0.83 }, 'stays above that altitude'],
    [-70, { moment: JUNE, at: 'setting', centreAltitudeDeg: -0.83 }, 'stays below that altitude'],
    [-70, { moment: JUNE, at: 'noon' }, 'stays below that altitude'],
    [51.2, { moment: { name: 'zenith passage' }, at: 'noon' }, 'never at that declination'],
  ] as const)('at latitude %s° there is none: %o', (latitudeDeg, sight, because) => {
    expect(nextSunSighting({ ...PLAIN, latitudeDeg }, sight, NOW)).toEqual({ sighting: null, because })
  })

  test('refuses an impossible altitude', () => {
    const sight = { moment: JUNE, at: 'rising', centreAltitudeDeg: Number.NaN } as const
    expect(() => nextSunSighting(PLAIN, sight, NOW)).toThrow(RangeError)
  })
})
