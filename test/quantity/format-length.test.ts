import { expect, test } from 'vitest'
import { formatCm } from '../../src/quantity/format-length.ts'

test.each([
  [0, '0 cm'],
  [0.4, '4 mm'],
  [0.04, '0.4 mm'],
  [0.999, '1 cm'],
  [3, '3 cm'],
  [3.44, '3.4 cm'],
  [67.2, '67 cm'],
  [99.6, '1 m'],
  [120, '1.2 m'],
  [1234, '12 m'],
  [9950, '100 m'],
  [99_940, '999 m'],
  [99_960, '1 km'],
  [340_000, '3.4 km'],
  [12_345_600, '123 km'],
  [-12, '−12 cm'],
])('%d cm is %s', (cm, printed) => {
  expect(formatCm(cm)).toBe(printed)
})

test.each([Number.NaN, Number.POSITIVE_INFINITY])('refuses %d', (cm) => {
  expect(() => formatCm(cm)).toThrow(RangeError)
})
