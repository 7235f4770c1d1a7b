import { expect, test } from 'vitest'
import { ARCMIN, ARCSEC, DEG, wrap180, wrap360 } from '../../src/quantity/degrees.ts'

test('a turn is 360°, 21 600′ and 1 296 000″', () => {
  expect(360 * DEG).toBeCloseTo(2 * Math.PI, 14)
  expect(21_600 * ARCMIN).toBeCloseTo(2 * Math.PI, 14)
  expect(1_296_000 * ARCSEC).toBeCloseTo(2 * Math.PI, 14)
})

test.each([
  [0, 0],
  [0.1, 0.1],
  [179, 179],
  [180, -180],
  [-180, -180],
  [190, -170],
  [-190, 170],
  [359, -1],
  [725, 5],
])('wrap180 turns %d into %d', (deg, wrapped) => {
  expect(wrap180(deg)).toBe(wrapped)
})

test.each([
  [0, 0],
  [-1, 359],
  [360, 0],
  [-360, 0],
  [725, 5],
  [-1e-20, 0],
])('wrap360 turns %d into %d', (deg, wrapped) => {
  expect(wrap360(deg) + 0).toBe(wrapped)
})
