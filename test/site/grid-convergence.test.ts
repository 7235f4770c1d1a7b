import { describe, expect, test } from 'vitest'
import { DEG } from '../../src/quantity/degrees.ts'
import { gridConvergenceDeg } from '../../src/site/grid-convergence.ts'
import { expectWithin } from '../published/expect-within.ts'
import { FLINDERS_PEAK, MGA_55, sexagesimal } from './published-places.ts'
import { utmGrid } from './utm-grid.ts'

const at = (latitudeDeg: number, longitudeDeg: number) => ({ latitudeDeg, longitudeDeg })

describe('gridConvergenceDeg', () => {
  // GDA technical manual: 1°35′03.65″ in size, which it prints with a minus, for its bearing = azimuth + convergence.
  // The Peak lies west of the central meridian, in the south: going north the meridians spread, so true north lies
  // west of grid north there, and grid north east of true north.
  test('has grid north lie east of true north at Flinders Peak', () => {
    const want = sexagesimal(1, 1, 35, 3.65)
    expectWithin((gridConvergenceDeg(FLINDERS_PEAK, MGA_55) - want) * 3600, 0, 0.005, 'arcsec')
  })

  test.each([
    [50, 5, 1],
    [50, 1, -1],
    [-50, 5, -1],
    [-50, 1, 1],
  ])('at latitude %s°, longitude %s° has the sign %s about 3° east', (latitude, longitude, sign) => {
    expect(Math.sign(gridConvergenceDeg(at(latitude, longitude), utmGrid(31, 'N')))).toBe(sign)
  })

  // On a sphere tan γ = tan Δλ sin φ (Snyder 1987, USGS Paper 1395, section 8); at the poles γ = Δλ.
  test.each([
    [0, 3],
    [52, 2],
    [52, -30],
    [-75, 60],
    [90, 20],
    [-90, 20],
  ])(
    'at latitude %s°, %s° from the central meridian, is that of the sphere on a sphere',
    (latitude, eastward) => {
      const ellipsoid = { name: 'all but a sphere', equatorialRadiusM: 6_371_000, inverseFlattening: 1e12 }
      const want = Math.atan(Math.tan(eastward * DEG) * Math.sin(latitude * DEG)) / DEG
      const got = gridConvergenceDeg(at(latitude, 3 + eastward), utmGrid(31, 'N', ellipsoid))
      expectWithin((got - want) * 3600, 0, 2e-5, 'arcsec')
    },
  )

  test('is zero on the central meridian', () => {
    expectWithin(gridConvergenceDeg(at(61, 3), utmGrid(31, 'N')) * 3600, 0, 1e-6, 'arcsec')
  })

  test('refuses a place off the grid', () => {
    expect(() => gridConvergenceDeg(at(50, 120), utmGrid(31, 'N'))).toThrow(RangeError)
  })
})
