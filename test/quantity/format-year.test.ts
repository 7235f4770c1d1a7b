import { describe, expect, test } from 'vitest'
import { formatYear, formatYearRange } from '../../src/quantity/format-year.ts'

describe('formatYear', () => {
  test.each([
    [-9600, 1, '9601 BCE'],
    [-11880, 1, '11,881 BCE'],
    [420, 1, '420 CE'],
    [12000, 1, '12,000 CE'],
    [1, 1, '1 CE'],
    [0, 1, '1 BCE'],
    [-1, 1, '2 BCE'],
    [0.4, 1, '1 BCE'],
    [0.6, 1, '1 CE'],
    [-9599.6, 1, '9601 BCE'],
    [-9599.4, 1, '9600 BCE'],
    [-9600, 100, '9600 BCE'],
    [-9648, 100, '9600 BCE'],
    [-9650, 100, '9700 BCE'],
    [-3, 10, '1 BCE'],
    [4, 10, '1 CE'],
    [-7, 10, '10 BCE'],
  ])('year %d in steps of %d is %s', (year, step, printed) => {
    expect(formatYear(year, step)).toBe(printed)
  })

  test('refuses what is no number', () => {
    expect(() => formatYear(Number.NaN)).toThrow(RangeError)
    expect(() => formatYearRange(Number.NEGATIVE_INFINITY, 0)).toThrow(RangeError)
  })
})

describe('formatYearRange', () => {
  test.each([
    [-9699, -9499, 1, '9700 to 9500 BCE'],
    [-2499, 420, 1, '2500 BCE to 420 CE'],
    [600, 700, 1, '600 to 700 CE'],
    [-11880, -2799, 1, '11,881 to 2800 BCE'],
    [-9604, -9598, 100, '9600 BCE'],
    [-9600.2, -9599.8, 1, '9601 BCE'],
    [0, 1, 1, '1 BCE to 1 CE'],
  ])('%d to %d in steps of %d is %s', (from, to, step, printed) => {
    expect(formatYearRange(from, to, step)).toBe(printed)
  })
})
