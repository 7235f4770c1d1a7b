import proj4 from 'proj4'
import { describe, expect, test } from 'vitest'
import { ELLIPSOIDS } from '../../src/site/ellipsoid.ts'
import { expectWithin } from '../published/expect-within.ts'

/**
 * The library proj4's own table of ellipsoids: its name for each, from which it makes both axes, and how close the
 * polar radius comes, metres: it prints Airy's to the centimetre, and the flattening of the IGN's to 1e−7 (2 µm).
 */
const KEYS = [
  ['WGS84', 1e-8],
  ['GRS80', 1e-8],
  ['airy', 0.0011],
  ['bessel', 1e-8],
  ['clrk66', 1e-8],
  ['clrk80ign', 5e-6],
  ['intl', 1e-8],
  ['krass', 1e-8],
] as const

describe('the ellipsoids', () => {
  test.each(ELLIPSOIDS.map((ellipsoid, i) => ({ ...ellipsoid, key: KEYS[i]![0], toleranceM: KEYS[i]![1] })))(
    '$name has the axes that proj4 gives it',
    ({ key, toleranceM, equatorialRadiusM, inverseFlattening }) => {
      const { a, b } = new proj4.Proj(`+proj=longlat +ellps=${key} +no_defs`) as unknown as Axes
      expectWithin(equatorialRadiusM, a, 1e-9, 'metres')
      expectWithin(equatorialRadiusM * (1 - 1 / inverseFlattening), b, toleranceM, 'metres')
    },
  )

  test('have names of their own', () => {
    expect(new Set(ELLIPSOIDS.map(({ name }) => name)).size).toBe(KEYS.length)
  })
})

interface Axes {
  a: number
  b: number
}
