import { expect, test } from 'vitest'
import { TOLERANCE } from '../../src/quantity/angle-kind.ts'
import { readAngleRange } from '../../src/quantity/read-angle-range.ts'
import { expectMisread } from './misread.ts'

test.each([
  ['10′ to 1°', 1 / 6, 1],
  ['10′–1°', 1 / 6, 1],
  ['10′ - 1°', 1 / 6, 1],
  ['0′ to 30″', 0, 1 / 120],
])('reads %s', (text, low, high) => {
  const reading = readAngleRange(text, TOLERANCE)
  if (!reading.ok) throw new Error(reading.misread.message)
  expect(reading.value.lowDeg).toBeCloseTo(low, 12)
  expect(reading.value.highDeg).toBeCloseTo(high, 12)
})

test.each([
  ['10′', 'range-missing', '10′', null],
  ['10′ –', 'range-missing', '10′ –', null],
  ['1° to 10′', 'range-backwards', '1° to 10′', '10′ to 1°'],
  ['10′ to 10′', 'range-without-width', '10′ to 10′', null],
  ['10 to 30′', 'unit-missing', '10', '10′'],
  ['10 to 30″', 'unit-missing', '10', '10″'],
  ['10′ to 60', 'unit-missing', '60', '60′'],
  ['10′ to 95°', 'out-of-range', '95°', null],
  ['exact to 1°', 'not-readable', 'exact', null],
])('refuses %s: %s', (text, code, marked, suggestion) => {
  expectMisread(text, readAngleRange(text, TOLERANCE), { code, marked, suggestion })
})
