import { describe, expect, test } from 'vitest'
import { lineDirection } from '../../src/site/line-direction.ts'
import { gpsNorthSdDeg, NORTH_SD_DEG } from '../../src/site/true-north.ts'
import { expectWithin } from '../published/expect-within.ts'

describe('gpsNorthSdDeg', () => {
  // A metre at 57.29578 m is a degree: √2 × 1 cm at 57.29578 m is 0.01414°.
  test('is √2 times the accuracy over the baseline', () => {
    expectWithin(gpsNorthSdDeg(0.01, 57.29578), 0.0141421, 1e-7, 'degrees')
  })

  test('is that of a line between two points alike', () => {
    const at = (northM: number) => ({ eastM: 0, northM, sdM: 0.03 })
    expectWithin(gpsNorthSdDeg(0.03, 80), lineDirection(at(0), at(80)).sdDeg, 1e-15, 'degrees')
  })

  // The default is rounded to a whole minute.
  test('of two positions good to 2 cm, 100 m apart, is the default', () => {
    expectWithin(gpsNorthSdDeg(0.02, 100) * 60, NORTH_SD_DEG.gps * 60, 0.03, 'arcmin')
  })

  test.each([
    [-0.01, 100, 'the accuracy is -0.01 m; write metres, such as 0.02'],
    [0.02, 0, 'the baseline is 0 m; write metres above zero, such as 100'],
    [0.02, Number.NaN, 'the baseline is NaN m; write metres above zero, such as 100'],
  ])('refuses an accuracy of %s m on %s m', (accuracy, baseline, message) => {
    expect(() => gpsNorthSdDeg(accuracy, baseline)).toThrow(new RangeError(message))
  })
})
