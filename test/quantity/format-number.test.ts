import { describe, expect, test } from 'vitest'
import { formatNumber, formatSigned, groupThousands, trimZeros } from '../../src/quantity/format-number.ts'

describe('formatNumber', () => {
  test.each([
    [0, 3, '0'],
    [-0, 3, '0'],
    [1, 3, '1.00'],
    [293.4, 3, '293'],
    [0.6666, 2, '0.67'],
    [0.00123, 2, '0.0012'],
    [-4.44, 2, '−4.4'],
    [9.996, 3, '10.0'],
    [9601, 4, '9601'],
    [11881, 5, '11,881'],
    [11881, 2, '12,000'],
    [1_234_567, 7, '1,234,567'],
    [999_999_999, 9, '999,999,999'],
    [999_999_999.9, 9, '1.00000000 × 10⁹'],
    [3.2e87, 2, '3.2 × 10⁸⁷'],
    [-2.5e-9, 2, '−2.5 × 10⁻⁹'],
  ])('%d to %d digits is %s', (value, significant, printed) => {
    expect(formatNumber(value, significant)).toBe(printed)
  })

  test.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])('refuses %d', (value) => {
    expect(() => formatNumber(value, 2)).toThrow(RangeError)
  })
})

test('formatSigned shows a plus', () => {
  expect([12, -12, 0].map((value) => formatSigned(value, 2))).toEqual(['+12', '−12', '0'])
})

test('trimZeros drops zeros of the fraction only', () => {
  expect([2, 2.5, 20, 100].map((value) => trimZeros(value, 3))).toEqual(['2', '2.5', '20', '100'])
  expect(trimZeros(2e-9, 2)).toBe('2 × 10⁻⁹')
})

test('groupThousands begins at five digits and leaves the fraction alone', () => {
  expect(['9601', '11881', '11881.12345', '1234567'].map(groupThousands)).toEqual([
    '9601',
    '11,881',
    '11,881.12345',
    '1,234,567',
  ])
})
