import { describe, expect, test } from 'vitest'
import { DEG } from '../../src/quantity/degrees.ts'
import { GRS80, INTERNATIONAL_1924 } from '../../src/site/ellipsoid.ts'
import { geodesicLine } from '../../src/site/geodesic-line.ts'
import { tiedPlace } from '../../src/site/points-tie.ts'
import { expectWithin } from '../published/expect-within.ts'
import { BUNINYONG, FLINDERS_PEAK, FLINDERS_TO_BUNINYONG } from './published-places.ts'

describe('tiedPlace', () => {
  // GDA technical manual: a millimetre along and 0.005″ across 55 km are 1.4 mm, 1.3e−8°.
  test('finds Buninyong on a plan tied at Flinders Peak', () => {
    const { azimuthDeg, lengthM } = FLINDERS_TO_BUNINYONG
    const tie = { plan: { eastM: 1000, northM: 500 }, place: FLINDERS_PEAK }
    const point = {
      eastM: 1000 + lengthM * Math.sin(azimuthDeg * DEG),
      northM: 500 + lengthM * Math.cos(azimuthDeg * DEG),
    }
    const got = tiedPlace(point, tie, GRS80)
    expectWithin(got.latitudeDeg, BUNINYONG.latitudeDeg, 2e-8, 'degrees')
    expectWithin(got.longitudeDeg, BUNINYONG.longitudeDeg, 2e-8, 'degrees')
  })

  const TIE = { plan: { eastM: 40, northM: -25 }, place: { latitudeDeg: 58.2, longitudeDeg: -6.7 } }

  test.each([
    [0, 0, 100, 100],
    [90, 100, 0, 100],
    [225, -300, -300, 300 * Math.SQRT2],
  ])('goes off at %s°: %s m east, %s m north', (azimuth, east, north, length) => {
    const point = { eastM: 40 + east, northM: -25 + north }
    const line = geodesicLine(TIE.place, tiedPlace(point, TIE))
    expectWithin(line.azimuthDeg, azimuth, 1e-8, 'degrees')
    expectWithin(line.lengthM, length, 1e-8, 'metres')
  })

  // The equator is a circle of the equatorial radius.
  test('goes by the ellipsoid that is given', () => {
    const tie = { plan: { eastM: 0, northM: 0 }, place: { latitudeDeg: 0, longitudeDeg: 10 } }
    const degreeM = INTERNATIONAL_1924.equatorialRadiusM * DEG
    const got = tiedPlace({ eastM: degreeM, northM: 0 }, tie, INTERNATIONAL_1924)
    expectWithin(got.longitudeDeg, 11, 1e-12, 'degrees')
  })

  test('leaves the tie where it is', () => {
    const { latitudeDeg, longitudeDeg } = tiedPlace(TIE.plan, TIE)
    expectWithin(latitudeDeg, TIE.place.latitudeDeg, 1e-13, 'degrees')
    expectWithin(longitudeDeg, TIE.place.longitudeDeg, 1e-13, 'degrees')
  })

  test('refuses coordinates that are none', () => {
    expect(() => tiedPlace({ eastM: Number.NaN, northM: 0 }, TIE)).toThrow(
      new RangeError('the place is NaN m east and 25 m north of the tie; write metres'),
    )
  })
})
