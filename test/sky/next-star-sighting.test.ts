import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { DEG } from '../../src/quantity/degrees.ts'
import { horizonCrossing } from '../../src/site/horizontal.ts'
import { nextStarSighting, type StarSight } from '../../src/sky/next-star-sighting.ts'
import type { Star } from '../../src/sky/star-catalogue.ts'
import { expectWithin } from '../published/expect-within.ts'
import { namedStar } from './named-star.ts'

const NOW = new Date('2026-08-01T00:00Z')
const PLACE = { latitudeDeg: 30, longitudeDeg: 31, heightM: 60 }
const OBSERVER = new Astronomy.Observer(30, 31, 60)

function seen(sight: StarSight, now = NOW) {
  const { sighting, because } = nextStarSighting(PLACE, sight, now)
  expect(because).toBeNull()
  return sighting!
}

/** Another program's place of a star, from the catalogue's J2000 coordinates, and its Sun. */
function skyAt(star: Star, utc: string) {
  const time = new Date(utc)
  Astronomy.DefineStar(Astronomy.Body.Star1, star.raDeg / 15, star.decDeg, 1000)
  const horizontal = (body: Astronomy.Body) => {
    const { ra, dec } = Astronomy.Equator(body, time, OBSERVER, true, true)
    return { ...Astronomy.Horizon(time, OBSERVER, ra, dec), dec }
  }
  return { star: horizontal(Astronomy.Body.Star1), sun: horizontal(Astronomy.Body.Sun) }
}

describe('the next sighting of a star', () => {
  test.each(['Sirius', 'Vega', 'Antares', 'Aldebaran'])('%s, through an altitude', (name) => {
    for (const at of ['rising', 'setting'] as const)
      for (const altitude of [0, 2.5, 15]) {
        const star = namedStar(name)
        const sighting = seen({ star, at, altitudeDeg: altitude })
        const sky = skyAt(star, sighting.utc!)
        // Half a minute of time is 7.5′; proper motion since 2000, aberration and nutation 1′.
        expectWithin(sky.star.altitude, altitude, 8.5 / 60, 'degrees')
        expect(sky.sun.altitude).toBeLessThan(-12 + 8 / 60)
        const crossing = horizonCrossing(sky.star.dec, altitude, PLACE.latitudeDeg, at)!
        expectWithin(sky.star.azimuth, crossing.azimuthDeg, 8.5 / 60, 'degrees')
      }
  })

  test.each([
    ['Sirius', 180],
    ['Vega', 0],
    ['Polaris', 0],
  ])('%s, at its upper culmination', (name, azimuth) => {
    const star = namedStar(name)
    const sky = skyAt(star, seen({ star, at: 'upper culmination' }).utc!)
    expectWithin(sky.star.altitude, 90 - Math.abs(30 - sky.star.dec), 1.5 / 60, 'degrees')
    // Across the meridian, in half a minute of time and with what is left out of the star's place.
    const across = Math.sin((sky.star.azimuth - azimuth) * DEG) * Math.cos(sky.star.altitude * DEG)
    expectWithin(across / DEG, 0, 8.5 / 60, 'degrees')
    expect(Math.cos((sky.star.azimuth - azimuth) * DEG)).toBeGreaterThan(0)
    expect(sky.sun.altitude).toBeLessThan(-12 + 8 / 60)
  })

  test('Kochab, at its lower culmination, stands as high as latitude and polar distance make it', () => {
    const star = namedStar('Kochab')
    const sky = skyAt(star, seen({ star, at: 'lower culmination' }).utc!)
    expectWithin(sky.star.altitude, 30 - (90 - sky.star.dec), 1.5 / 60, 'degrees')
    const across = Math.sin(sky.star.azimuth * DEG) * Math.cos(sky.star.altitude * DEG)
    expectWithin(across / DEG, 0, 8.5 / 60, 'degrees')
  })

  // Sirius comes back into the morning sky of Cairo in August: with the Sun 12° down it stands 2° up from the middle of
  // the month on (from memory: its heliacal rising there falls in the first ten days, with the Sun less far down).
  test('Sirius rises in the dark from the middle of August on', () => {
    const star = namedStar('Sirius')
    const { date, utc } = seen({ star, at: 'rising', altitudeDeg: 2 })
    expect(date >= '2026-08-05' && date <= '2026-08-20').toBe(true)
    // The first dark one of the year: the Sun is one day's motion below the limit at most.
    expect(skyAt(star, utc!).sun.altitude).toBeGreaterThan(-13.1 - 8 / 60)
  })

  test('is never past, and comes back the next night', () => {
    const sight = { star: namedStar('Vega'), at: 'setting', altitudeDeg: 5 } as const
    const first = seen(sight)
    const second = seen(sight, new Date(Date.parse(first.utc!) + 60_000))
    expectWithin((Date.parse(second.utc!) - Date.parse(first.utc!)) / 60_000, 1436, 1.1, 'minutes')
  })

  test.each([
    ['Canopus', 52, 'rising', 'stays below that altitude'],
    ['Polaris', 52, 'rising', 'stays above that altitude'],
    ['Canopus', 52, 'upper culmination', 'stays below that altitude'],
    ['Sirius', 52, 'lower culmination', 'stays below that altitude'],
    ['Sirius', 90, 'rising', 'stays below that altitude'],
  ] as const)('%s at %s° N, %s: there is none', (name, latitudeDeg, at, because) => {
    const star = namedStar(name)
    const sight = at === 'rising' ? { star, at, altitudeDeg: 0 } : { star, at }
    expect(nextStarSighting({ ...PLACE, latitudeDeg }, sight, NOW)).toEqual({ sighting: null, because })
  })

  test('a star that rises at 18 h of sidereal time does so at 65° N by day or in twilight only', () => {
    const star = { ...namedStar('Sirius'), raDeg: 359.9, decDeg: 0 }
    const sight = { star, at: 'rising', altitudeDeg: 0 } as const
    const got = nextStarSighting({ ...PLACE, latitudeDeg: 65 }, sight, NOW)
    expect(got).toEqual({ sighting: null, because: 'never on a dark night' })
  })

  test('without a longitude tells the night alone', () => {
    const sight = { star: namedStar('Vega'), at: 'setting', altitudeDeg: 5 } as const
    const { sighting } = nextStarSighting({ ...PLACE, longitudeDeg: null }, sight, NOW)
    expect(sighting).toMatchObject({ utc: null, note: null })
    // From one longitude to another the same sidereal time shifts against the Sun by a day's motion at most.
    const apartDays = (Date.parse(sighting!.date) - Date.parse(seen(sight).date)) / 86_400_000
    expectWithin(apartDays, 0, 1, 'days')
  })

  test('refuses an impossible altitude', () => {
    const sight = { star: namedStar('Vega'), at: 'setting', altitudeDeg: Number.NaN } as const
    expect(() => nextStarSighting(PLACE, sight, NOW)).toThrow(RangeError)
  })
})
