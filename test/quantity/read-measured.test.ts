import { describe, expect, test } from 'vitest'
import { AZIMUTH, LONGITUDE, TOLERANCE } from '../../src/quantity/angle-kind.ts'
import { readAngle } from '../../src/quantity/read-angle.ts'
import { readMeasured } from '../../src/quantity/read-measured.ts'
import { readUncertainty } from '../../src/quantity/read-uncertainty.ts'
import { expectMisread } from './misread.ts'

const read = (text: string) =>
  readMeasured(
    text,
    (value) => readAngle(value, AZIMUTH),
    (size) => readAngle(size, TOLERANCE),
  )
const readSize = (text: string) => readUncertainty(text, (size) => readAngle(size, TOLERANCE))

describe('reads a value and its uncertainty', () => {
  test.each([
    ['49°34′18″ ± 1′', 1 / 60],
    ['49°34′18″±1′', 1 / 60],
    ['49°34′18″ +/- 1′', 1 / 60],
    ['49°34′18″ +/− 1′', 1 / 60],
    ['49°34′18″ +- 60″', 1 / 60],
    // A hard limit is rectangular: its standard deviation is a/√3 (JCGM 100:2008, 4.3.7).
    ['49°34′18″ within 1′', 1 / 60 / Math.sqrt(3)],
    ['49°34′18″, within 1′', 1 / 60 / Math.sqrt(3)],
  ])('%s', (text, sd) => {
    const reading = read(text)
    if (!reading.ok) throw new Error(reading.misread.message)
    expect(reading.value.value).toBeCloseTo(178_458 / 3600, 12)
    expect(reading.value.sd).toBeCloseTo(sd, 14)
    expect(reading.warnings).toEqual([])
  })

  test('tells an uncertainty left out from one that is unknown', () => {
    expect(read('49°')).toMatchObject({ value: { value: 49, sd: 'omitted' } })
    expect(read('49° ± unknown')).toMatchObject({ value: { value: 49, sd: 'unknown' } })
  })

  test('an uncertainty of zero is used, with a warning at its place', () => {
    const reading = read('49° ± 0′')
    expect(reading).toMatchObject({
      ok: true,
      value: { sd: 0 },
      warnings: [{ code: 'zero-uncertainty', offset: 4, length: 4 }],
    })
  })
})

describe('refuses', () => {
  test.each([
    ['49°34′18″ ± 1', 'tolerance-without-unit', '± 1', '± 1′'],
    ['1.5 ± 0.03', 'unit-missing', '1.5 ± 0.03', '1.5° ± 0.03°'],
    ['1.5 within 0.03', 'unit-missing', '1.5 within 0.03', '1.5° within 0.03°'],
    ['1.5 ± 2′', 'unit-missing', '1.5', '1.5°'],
    ['49 34 ± 1', 'unit-missing', '49 34', '49°34′'],
    ['49° within 1', 'tolerance-without-unit', 'within 1', 'within 1′'],
    ['49° ± 1′ ± 2′', 'several-tolerances', '± 2′', null],
    ['49° ± 1′ within 2′', 'several-tolerances', 'within 2′', null],
    ['49° ± -1′', 'negative-uncertainty', '± -1′', null],
    ['49° ±', 'not-readable', '±', null],
    ['± 1′', 'not-readable', '± 1′', null],
    ['49° ± 1 cm', 'not-readable', '1 cm', null],
    ['49° ± 50°', 'out-of-range', '50°', null],
    ['49 ± 1′', 'unit-missing', '49', '49°'],
  ])('%s: %s', (text, code, marked, suggestion) => {
    expectMisread(text, read(text), { code, marked, suggestion })
  })
})

describe('an uncertainty by itself', () => {
  test.each([
    ['2′', 2 / 60],
    ['± 2′', 2 / 60],
    ['within 2′', 2 / 60 / Math.sqrt(3)],
  ])('%s', (text, sd) => {
    const reading = readSize(text)
    expect(reading.ok && reading.value).toBeCloseTo(sd, 14)
  })

  test('may be unknown', () => {
    expect(readSize(' Unknown ')).toEqual({ ok: true, value: 'unknown' })
  })

  test.each([
    ['2', 'tolerance-without-unit', '2', '2′'],
    [' ± 2 ', 'tolerance-without-unit', '± 2', '± 2′'],
    ['−2′', 'negative-uncertainty', '−2′', null],
    ['within unknown', 'not-readable', 'unknown', null],
    ['', 'not-readable', '', null],
  ])('%s is refused: %s', (text, code, marked, suggestion) => {
    expectMisread(text, readSize(text), { code, marked, suggestion })
  })
})

test('a bare number that lacks its side as well is told by itself', () => {
  const kind = { ...LONGITUDE, needsLetter: true }
  const read = (text: string) => readAngle(text, kind)
  expectMisread('1.5 ± 0.1', readMeasured('1.5 ± 0.1', read, read), {
    code: 'unit-missing',
    marked: '1.5',
    suggestion: '1.5° E or 1.5° W',
  })
})
