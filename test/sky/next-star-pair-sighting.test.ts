import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { nextStarPairSighting, type StarPairSight } from '../../src/sky/next-star-pair-sighting.ts'
import { expectWithin } from '../published/expect-within.ts'
import { namedStar } from './named-star.ts'

const NOW = new Date('2026-08-01T00:00Z')
const PLACE = { latitudeDeg: 51.2, longitudeDeg: -1.8, heightM: 100 }
const OBSERVER = new Astronomy.Observer(51.2, -1.8, 100)
const PAIRS = [
  ['Kochab', 'Mizar'],
  ['Dubhe', 'Merak'],
  ['Polaris', 'Kochab'],
] as const

function pairOf(names: readonly [string, string]): StarPairSight['stars'] {
  return [namedStar(names[0]), namedStar(names[1])]
}

/** Another program's horizontal place of both stars and the Sun. */
function skyAt(stars: StarPairSight['stars'], utc: string) {
  const time = new Date(utc)
  const horizontal = (body: Astronomy.Body) => {
    const { ra, dec } = Astronomy.Equator(body, time, OBSERVER, true, true)
    return Astronomy.Horizon(time, OBSERVER, ra, dec)
  }
  const seen = stars.map((star) => {
    Astronomy.DefineStar(Astronomy.Body.Star1, star.raDeg / 15, star.decDeg, 1000)
    return horizontal(Astronomy.Body.Star1)
  })
  return { stars: seen, sun: horizontal(Astronomy.Body.Sun) }
}

describe.each(PAIRS)('the next sighting of %s and %s one above the other', (...names) => {
  const stars = pairOf(names)

  test.each([0, 1, null] as const)('with %s above', (above) => {
    const { sighting } = nextStarPairSighting(PLACE, { stars, above, nearAzimuthDeg: 0 }, NOW)
    const sky = skyAt(stars, sighting!.utc!)
    const [first, second] = sky.stars as [(typeof sky.stars)[0], (typeof sky.stars)[0]]
    // Half a minute of time turns either star by 7.5′ at most about the pole; high up that is more in azimuth.
    const across = 1 / Math.cos((Math.max(first.altitude, second.altitude) * Math.PI) / 180)
    const apart = ((first.azimuth - second.azimuth + 540) % 360) - 180
    expectWithin(apart, 0, (2 * 8 * across) / 60, 'degrees')
    const upper = first.altitude > second.altitude ? 0 : 1
    expect(sighting!.note.above).toBe(upper)
    if (above !== null) expect(upper).toBe(above)
    expect(sky.sun.altitude).toBeLessThan(-12 + 8 / 60)
    expect(Math.min(first.altitude, second.altitude)).toBeGreaterThan(-8.5 / 60)
  })

  test('with either above is the earlier of the two', () => {
    const utc = ([0, 1, null] as const).map(
      (above) => nextStarPairSighting(PLACE, { stars, above, nearAzimuthDeg: 0 }, NOW).sighting!.utc!,
    )
    expect(utc[2]).toBe([utc[0]!, utc[1]!].sort()[0])
  })
})

describe('two stars that have no such sighting', () => {
  test('where one never rises', () => {
    const stars = pairOf(['Kochab', 'Canopus'])
    const got = nextStarPairSighting(PLACE, { stars, above: null, nearAzimuthDeg: 0 }, NOW)
    expect(got).toEqual({ sighting: null, because: 'never one above the other' })
  })

  test('where it is always light', () => {
    // Two stars on the hour circle of 18 h stand on the meridian, one above the other, at 18 h of sidereal time.
    const [a, b] = pairOf(['Kochab', 'Mizar'])
    const still = { properMotionRaArcsecPerYear: 0, properMotionDecArcsecPerYear: 0, raDeg: 270 }
    const stars = [
      { ...a!, ...still, decDeg: 10 },
      { ...b!, ...still, decDeg: 30 },
    ] as const
    const sight = { stars, above: 1, nearAzimuthDeg: 180 } as const
    const got = nextStarPairSighting({ ...PLACE, latitudeDeg: 65 }, sight, NOW)
    expect(got).toEqual({ sighting: null, because: 'never on a dark night' })
  })
})

test('without a longitude tells the night alone', () => {
  const sight = { stars: pairOf(['Kochab', 'Mizar']), above: null, nearAzimuthDeg: 0 }
  const { sighting } = nextStarPairSighting({ ...PLACE, longitudeDeg: null }, sight, NOW)
  expect(sighting).toMatchObject({ utc: null, note: { above: expect.any(Number) } })
})
