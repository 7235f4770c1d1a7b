import proj4 from 'proj4'
import { describe, expect, test } from 'vitest'
import {
  AIRY_1830,
  BESSEL_1841,
  CLARKE_1866,
  CLARKE_1880_IGN,
  GRS80,
  INTERNATIONAL_1924,
  KRASSOVSKY_1940,
  WGS84,
} from '../../src/site/ellipsoid.ts'
import { expectWithin } from '../published/expect-within.ts'

/**
 * The library proj4's own table of ellipsoids: its name for each, from which it makes both axes, and how close the
 * polar radius comes, metres: it prints Airy's to the centimetre, and the flattening of the IGN's to 1e−7 (2 µm).
 */
const IN_PROJ4 = [
  { ...WGS84, key: 'WGS84', toleranceM: 1e-8 },
  { ...GRS80, key: 'GRS80', toleranceM: 1e-8 },
  { ...AIRY_1830, key: 'airy', toleranceM: 0.0011 },
  { ...BESSEL_1841, key: 'bessel', toleranceM: 1e-8 },
  { ...CLARKE_1866, key: 'clrk66', toleranceM: 1e-8 },
  { ...CLARKE_1880_IGN, key: 'clrk80ign', toleranceM: 5e-6 },
  { ...INTERNATIONAL_1924, key: 'intl', toleranceM: 1e-8 },
  { ...KRASSOVSKY_1940, key: 'krass', toleranceM: 1e-8 },
]

describe('the ellipsoids', () => {
  test.each(IN_PROJ4)(
    '$name has the axes that proj4 gives it',
    ({ key, toleranceM, equatorialRadiusM, inverseFlattening }) => {
      const { a, b } = new proj4.Proj(`+proj=longlat +ellps=${key} +no_defs`) as unknown as Axes
      expectWithin(equatorialRadiusM, a, 1e-9, 'metres')
      expectWithin(equatorialRadiusM * (1 - 1 / inverseFlattening), b, toleranceM, 'metres')
    },
  )

  test('have names of their own', () => {
    expect(new Set(IN_PROJ4.map(({ name }) => name)).size).toBe(IN_PROJ4.length)
  })
})

interface Axes {
  a: number
  b: number
}
