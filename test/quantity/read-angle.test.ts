import { describe, expect, test } from 'vitest'
import { AZIMUTH, HORIZON_ALTITUDE, LATITUDE, LONGITUDE, TOLERANCE } from '../../src/quantity/angle-kind.ts'
import { readAngle, readPrintedAngle } from '../../src/quantity/read-angle.ts'
import { expectMisread, readOrReason } from './misread.ts'

// 49°34′18″ = 49 + 34/60 + 18/3600 = 178 458/3600.
const DMS = 178_458 / 3600

describe('reads an angle', () => {
  test.each([
    ['49°34′18″', DMS],
    ['49 34 18', DMS],
    ['49° 34′ 18″', DMS],
    [' 49° 34\' 18" ', DMS],
    ["49°34'18''", DMS],
    ['49º34’18”', DMS],
    ['49°\u00a034′\u202f18″', DMS],
    ['49 deg 34 arcmin 18 arcsec', DMS],
    ['49.5717°', 49.5717],
    ['49.5717 degrees', 49.5717],
    ['49°34.3′', 49 + 34.3 / 60],
    ['49 34 18.5', DMS + 0.5 / 3600],
    ['10′', 1 / 6],
    ['90′', 1.5],
    ['30″', 1 / 120],
    ['0.5°', 0.5],
    ['.5°', 0.5],
    ['+12°', 12],
    ['0°', 0],
    ['360°', 360],
    ['180°', 180],
  ])('%s', (text, deg) => {
    expect(readOrReason(readAngle(text, AZIMUTH))).toBeCloseTo(deg, 12)
  })

  test.each([
    ['41°16′12″ N', 41.27],
    ['41°16′12″N', 41.27],
    ['N 41°16′12″', 41.27],
    ['41°16′12″ S', -41.27],
    ['41°16′12″ s', -41.27],
    ['−41°16′12″', -41.27],
    ['-41.27°', -41.27],
    ['‑41.27°', -41.27], // a hyphen that does not break lines, as word processors insert
    ['–41.27°', -41.27], // an en dash in place of a minus
    ['−0°12′', -0.2],
    ['0°12′ S', -0.2],
  ])('latitude %s', (text, deg) => {
    expect(readOrReason(readAngle(text, LATITUDE))).toBeCloseTo(deg, 12)
  })

  test('longitude east and west', () => {
    expect(readOrReason(readAngle('23°05′ E', LONGITUDE))).toBeCloseTo(23 + 5 / 60, 12)
    expect(readOrReason(readAngle('2°48′ W', LONGITUDE))).toBeCloseTo(-2.8, 12)
  })

  test('minus nothing is nothing', () => {
    expect(readOrReason(readAngle('−0°', LATITUDE))).toBe(0)
  })
})

describe('refuses', () => {
  test.each([
    ['49.5717', 'unit-missing', '49.5717', '49.5717°'],
    ['-41.27', 'unit-missing', '-41.27', '−41.27°'],
    ['49 34', 'unit-missing', '49 34', '49°34′'],
    ['49:34', 'unit-missing', '49:34', '49°34′'],
    ['49:34:18', 'unit-missing', '49:34:18', '49°34′18″'],
    ['49°34', 'unit-missing', '49°34', '49°34′'],
    ['49°34′18', 'unit-missing', '49°34′18', '49°34′18″'],
    ['49,5717°', 'decimal-comma', '49,5717°', '49.5717°'],
    ['49°34′ ± 1′', 'unexpected-tolerance', '49°34′ ± 1′', null],
    ['49°34′ within 1′', 'unexpected-tolerance', '49°34′ within 1′', null],
    ['49.5°30′', 'fraction-inside', '49.5', null],
    ['49°75′', 'sixty-or-more', '75', null],
    ['49°10′60″', 'sixty-or-more', '60', null],
    ['49 60 00', 'sixty-or-more', '60', null],
    ['41° E', 'wrong-hemisphere', 'E', null],
    ['N 41° N', 'wrong-hemisphere', 'N', null],
    ['−41° N', 'sign-and-letter', '−41° N', null],
    ['95°', 'out-of-range', '95°', null],
    [' 95° S ', 'out-of-range', '95° S', null],
    ['41 m', 'not-readable', '41 m', null],
    ['1e2°', 'not-readable', '1e2°', null],
    ['Infinity°', 'not-readable', 'Infinity°', null],
    [`${'9'.repeat(400)}°`, 'out-of-range', `${'9'.repeat(400)}°`, null],
    ['°', 'not-readable', '°', null],
    ['41.27 N', 'unit-missing', '41.27 N', '41.27° N'],
    ['41.27s', 'unit-missing', '41.27s', '41.27° S'],
    ['S 41 16', 'unit-missing', 'S 41 16', '41°16′ S'],
    ['41:16:12 N', 'unit-missing', '41:16:12 N', '41°16′12″ N'],
    ['41°16 N', 'unit-missing', '41°16 N', '41°16′ N'],
    ['-41.27 N', 'not-readable', '-41.27 N', null],
    ['41.27 E', 'not-readable', '41.27 E', null],
    ['N', 'not-readable', 'N', null],
    ['north', 'not-readable', 'north', null],
  ])('%s as a latitude: %s', (text, code, marked, suggestion) => {
    expectMisread(text, readAngle(text, LATITUDE), { code, marked, suggestion })
  })

  test('a compass letter on an azimuth', () => {
    expectMisread('N 49° E', readAngle('N 49° E', AZIMUTH), {
      code: 'wrong-hemisphere',
      marked: 'E',
      suggestion: null,
    })
  })

  test('a negative azimuth, tolerance, and a horizon of 95°', () => {
    for (const [text, kind] of [
      ['−5°', AZIMUTH],
      ['−5′', TOLERANCE],
      ['95°', HORIZON_ALTITUDE],
    ] as const)
      expectMisread(text, readAngle(text, kind), { code: 'out-of-range', marked: text, suggestion: null })
  })

  test('a bare tolerance suggests minutes', () => {
    expectMisread('10', readAngle('10', TOLERANCE), { code: 'unit-missing', marked: '10', suggestion: '10′' })
  })

  test('an empty text, without a mark outside it', () => {
    const reading = readAngle('', LATITUDE)
    expect(reading).toMatchObject({ ok: false, misread: { code: 'not-readable', offset: 0, length: 1 } })
  })

  test('says the value, what was expected and the limits', () => {
    expect(readAngle('95°', LATITUDE)).toMatchObject({
      misread: { message: '`95°` cannot be a latitude', expected: 'a latitude from 90° S to 90° N' },
    })
  })
})

describe('half a unit of the last printed digit, in degrees', () => {
  test.each([
    ['23°54′30″', 0.5 / 3600],
    ['23°54′30.0″', 0.05 / 3600],
    ['23°54′', 0.5 / 60],
    ['23.9°', 0.05],
    ['23°', 0.5],
    ['49 34 18', 0.5 / 3600],
  ])('%s', (text, half) => {
    const reading = readPrintedAngle(text, LATITUDE)
    expect(reading.ok && reading.value.halfDeg).toBeCloseTo(half, 15)
  })
})

describe('an angle that has to say east or west', () => {
  const kind = { ...LONGITUDE, needsLetter: true }

  test.each([
    ['1°35′ W', -(1 + 35 / 60)],
    ['W 1°35′', -(1 + 35 / 60)],
    ['1.5° E', 1.5],
    ['0°', 0],
    ['-0°', 0],
  ])('%s', (text, deg) => {
    expect(readOrReason(readAngle(text, kind))).toBeCloseTo(deg, 12)
  })

  test.each([
    ['1°35′', 'letter-missing', '1°35′ E or 1°35′ W'],
    ['−1°35′', 'letter-missing', '1°35′ E or 1°35′ W'],
    ['+ 1.5°', 'letter-missing', '1.5° E or 1.5° W'],
    ['-1.5', 'unit-missing', '1.5° E or 1.5° W'],
    ['1.5 W', 'unit-missing', '1.5° W'],
  ])('refuses %s', (text, code, suggestion) => {
    expectMisread(text, readAngle(text, kind), { code, marked: text, suggestion })
    for (const cure of suggestion.split(' or ')) expect(readAngle(cure, kind).ok).toBe(true)
  })
})

describe('where bare numbers are degrees', () => {
  const kind = { ...LATITUDE, takesBareDegrees: true }

  test.each([
    ['41.27', 41.27],
    ['-41.27', -41.27],
    ['−41.27', -41.27],
    ['41.27 S', -41.27],
    ['N 41', 41],
    ['41°16′12″ N', 41.27],
    ['.5', 0.5],
  ])('%s', (text, deg) => {
    expect(readOrReason(readAngle(text, kind))).toBeCloseTo(deg, 12)
  })

  test('other angles, commas, two signs and numbers out of range are refused all the same', () => {
    expectMisread('41,27', readAngle('41,27', kind), {
      code: 'decimal-comma',
      marked: '41,27',
      suggestion: '41.27',
    })
    expectMisread('-41.27 N', readAngle('-41.27 N', kind), {
      code: 'sign-and-letter',
      marked: '-41.27 N',
      suggestion: null,
    })
    expectMisread('91', readAngle('91', kind), { code: 'out-of-range', marked: '91', suggestion: null })
    expectMisread('41.27 E', readAngle('41.27 E', kind), {
      code: 'wrong-hemisphere',
      marked: 'E',
      suggestion: null,
    })
  })
})
