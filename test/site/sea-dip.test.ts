import { describe, expect, test } from 'vitest'
import { seaDip } from '../../src/site/sea-dip.ts'
import { expectWithin } from '../published/expect-within.ts'

/** The navigator's figures go with the square root of the height, which is good to H/R. */
const HEIGHTS = [2, 10, 100, 400]

describe('seaDip', () => {
  // Nautical Almanac (from memory): dip = 1.76′√H with H in metres, printed to three figures.
  test.each(HEIGHTS)('at %s m and the coefficient 0.165 is the almanac’s 1.76′√H', (height) => {
    expectWithin((-seaDip(height, 0, 0.165).deg * 60) / Math.sqrt(height), 1.76, 0.005, 'arcmin')
  })

  // Method notes of this project, section 5.
  test.each(HEIGHTS)('at %s m is 1.80′√H', (height) => {
    expectWithin((-seaDip(height).deg * 60) / Math.sqrt(height), 1.8, 0.005, 'arcmin')
  })

  // Nautical Almanac's table of dip (from memory), printed to 0.1′.
  test.each([
    [2.4, 2.8],
    [10, 5.6],
    [21, 8.1],
    [47, 12.1],
  ])('at %s m is the %s′ of the printed table', (height, printed) => {
    expectWithin(-seaDip(height, 0, 0.165).deg * 60, printed, 0.1, 'arcmin')
  })

  test('is nothing at the water', () => {
    expect(seaDip(0)).toEqual({ deg: 0, sdDeg: 0 })
  })

  test('has a standard deviation that small differences show', () => {
    const byHeight = (seaDip(60.1).deg - seaDip(59.9).deg) / 0.2
    const byCoefficient = (seaDip(60, 0, 0.131).deg - seaDip(60, 0, 0.129).deg) / 0.002
    const want = Math.hypot(byHeight * 3, byCoefficient * 0.05)
    expectWithin(seaDip(60, 3).sdDeg / want, 1, 1e-4, 'of it')
    // An error as large as the height: the whole of the dip that it could be.
    expectWithin(seaDip(0, 2).sdDeg, -seaDip(2).deg, 1e-12, 'degrees')
  })

  test('says what is impossible', () => {
    expect(() => seaDip(-1)).toThrow('0 m or more above the sea, got -1')
    expect(() => seaDip(Number.NaN)).toThrow(RangeError)
    expect(() => seaDip(1, -2)).toThrow('got -2')
    expect(() => seaDip(1, 0, 1)).toThrow('less than 1, got 1')
  })
})
