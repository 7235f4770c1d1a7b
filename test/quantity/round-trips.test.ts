import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { type AngleKind, AZIMUTH, LATITUDE, TOLERANCE } from '../../src/quantity/angle-kind.ts'
import { formatArcmin, formatDegrees } from '../../src/quantity/format-angle.ts'
import { formatYear, formatYearRange } from '../../src/quantity/format-year.ts'
import { readAngle } from '../../src/quantity/read-angle.ts'
import { readAngleRange } from '../../src/quantity/read-angle-range.ts'
import { readMeasured } from '../../src/quantity/read-measured.ts'
import { readUnit } from '../../src/quantity/read-unit.ts'
import { readYears } from '../../src/quantity/read-years.ts'
import type { Misread, Reading } from '../../src/quantity/reading.ts'
import { HUMIDITY, LENGTH, TEMPERATURE } from '../../src/quantity/unit-kind.ts'

const seed = 20_260_101
const numRuns = 500

function read<T>(reading: Reading<T>): T {
  if (!reading.ok) throw new Error(`${reading.misread.code}: ${reading.misread.message}`)
  return reading.value
}

describe('what is printed can be read again', () => {
  test('degrees, to half of the last printed unit', () => {
    const degrees = fc.double({ min: -90, max: 90, noNaN: true })
    const half = { second: 0.5 / 3600, minute: 0.5 / 60, decimal: 0.5e-4 } as const
    fc.assert(
      fc.property(degrees, fc.constantFrom('second', 'minute', 'decimal'), (deg, unit) => {
        const again = read(readAngle(formatDegrees(deg, unit), LATITUDE))
        expect(Math.abs(again - deg)).toBeLessThanOrEqual(half[unit] * (1 + 1e-9))
      }),
      { seed, numRuns },
    )
  })

  test('small angles, to 5 % or half a minute', () => {
    const arcmin = fc.double({ min: 0.001, max: 2700, noNaN: true })
    fc.assert(
      fc.property(arcmin, (size) => {
        const again = read(readAngle(formatArcmin(size), TOLERANCE)) * 60
        expect(Math.abs(again - size)).toBeLessThanOrEqual(Math.min(0.05 * size, 0.5 + 1e-9))
      }),
      { seed, numRuns },
    )
  })

  test('years and ranges, exactly', () => {
    const year = fc.integer({ min: -29_999, max: 12_000 })
    fc.assert(
      fc.property(year, year, (a, b) => {
        const [from, to] = [Math.min(a, b), Math.max(a, b)]
        expect(read(readYears(formatYear(a)))).toMatchObject({ from: a, to: a })
        expect(read(readYears(formatYearRange(from, to)))).toMatchObject({ from, to, circaYears: 0 })
      }),
      { seed, numRuns },
    )
  })
})

describe('no text makes a reader throw, and each refusal is marked inside the text', () => {
  const pieces = [
    '49',
    '°',
    '34',
    '′',
    '18',
    '″',
    ' ',
    '±',
    '+/-',
    'within',
    'to',
    '–',
    '-',
    '−',
    'BCE',
    'AD',
    'c.',
    'N',
    '.',
    ',',
    '1e9',
    'm',
    '%',
    'K',
    'unknown',
    '\u0000',
    '🌞',
  ]
  const mixed = fc.array(fc.constantFrom(...pieces), { maxLength: 9 }).map((parts) => parts.join(''))
  const texts = fc.oneof(
    fc.constantFrom('', ' ', ' ± ', ' - ', '49°–'),
    mixed,
    fc.string({ unit: 'grapheme', maxLength: 40 }),
    fc.string({ unit: 'binary', maxLength: 20 }),
  )
  const angle = (kind: AngleKind) => (text: string) => readAngle(text, kind)
  const readers: Readonly<Record<string, (text: string) => Reading<unknown>>> = {
    angle: angle(LATITUDE),
    range: (text) => readAngleRange(text, TOLERANCE),
    measured: (text) => readMeasured(text, angle(AZIMUTH), angle(TOLERANCE)),
    years: readYears,
    length: (text) => readUnit(text, LENGTH),
    temperature: (text) => readUnit(text, TEMPERATURE),
    humidity: (text) => readUnit(text, HUMIDITY),
  }

  test.each(Object.keys(readers))('%s', (name) => {
    fc.assert(
      fc.property(texts, (text) => {
        const reading = readers[name]!(text)
        const misreads: readonly Misread[] = reading.ok ? (reading.warnings ?? []) : [reading.misread]
        for (const { offset, length, message } of misreads) {
          expect(offset).toBeGreaterThanOrEqual(0)
          expect(length).toBeGreaterThanOrEqual(1)
          expect(offset + length).toBeLessThanOrEqual(Math.max(1, text.length))
          expect(message).not.toBe('')
        }
        if (reading.ok) expect(numbersIn(reading.value).every(Number.isFinite)).toBe(true)
      }),
      { seed, numRuns },
    )
  })
})

function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value]
  return value === null || typeof value !== 'object' ? [] : Object.values(value).flatMap(numbersIn)
}
