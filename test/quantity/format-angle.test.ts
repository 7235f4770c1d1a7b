import { describe, expect, test } from 'vitest'
import { formatArcmin, formatDegrees } from '../../src/quantity/format-angle.ts'

describe('formatDegrees', () => {
  test.each([
    [57.9077, '57°54′28″'], // 0.9077 × 60 = 54.462, 0.462 × 60 = 27.72
    [-0.2, '−0°12′00″'],
    [12 + 59 / 60 + 59.99 / 3600, '13°00′00″'],
    [0.9999999, '1°00′00″'],
    [-0.0001, '0°00′00″'],
    [359.99999, '360°00′00″'],
    [41 + 5 / 60 + 7 / 3600, '41°05′07″'],
  ])('%d to the second is %s', (deg, printed) => {
    expect(formatDegrees(deg)).toBe(printed)
  })

  test('to the minute it carries as well', () => {
    expect(formatDegrees(57.9077, 'minute')).toBe('57°54′')
    expect(formatDegrees(57.999, 'minute')).toBe('58°00′')
    expect(formatDegrees(-0.5, 'minute')).toBe('−0°30′')
  })

  test('in decimals it has four of them', () => {
    expect(formatDegrees(57.90766, 'decimal')).toBe('57.9077°')
    expect(formatDegrees(-1, 'decimal')).toBe('−1.0000°')
    expect(formatDegrees(-0.00001, 'decimal')).toBe('0.0000°')
  })

  test('refuses what is no number', () => {
    expect(() => formatDegrees(Number.NaN)).toThrow(RangeError)
    expect(() => formatArcmin(Number.POSITIVE_INFINITY)).toThrow(RangeError)
  })
})

describe('formatArcmin', () => {
  test.each([
    [0, '0′'],
    [1 / 3, '20″'],
    [0.02, '1.2″'],
    [0.99, '59″'],
    [0.9999, '1′'],
    [2.34, '2.3′'],
    [2, '2′'],
    [9.97, '10′'],
    [23.2, '23′'],
    [59.6, '1°'],
    [60, '1°'],
    [63, '1°03′'],
    [90, '1°30′'],
    [119.7, '2°'],
    [-90, '−1°30′'],
    [-0.5, '−30″'],
  ])('%d′ is %s', (arcmin, printed) => {
    expect(formatArcmin(arcmin)).toBe(printed)
  })
})
