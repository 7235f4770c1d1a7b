import { describe, expect, test } from 'vitest'
import { readUnit } from '../../src/quantity/read-unit.ts'
import {
  ELEVATION,
  HUMIDITY,
  inMetres,
  LAPSE,
  LENGTH,
  PRESSURE,
  TEMPERATURE,
  type UnitKind,
} from '../../src/quantity/unit-kind.ts'
import { expectMisread, readOrReason } from './misread.ts'

describe('reads a number with its unit', () => {
  test.each<[string, UnitKind, number]>([
    ['84.65 m', LENGTH, 84.65],
    ['84.65m', LENGTH, 84.65],
    ['84.65\u00a0m', LENGTH, 84.65],
    ['3 cm', LENGTH, 0.03],
    ['3 mm', LENGTH, 0.003],
    ['1.2 km', LENGTH, 1200],
    ['10 ft', LENGTH, 3.048], // the international foot of 1959
    ['−7.12 m', LENGTH, -7.12],
    ['-7.12 m', LENGTH, -7.12],
    ['0 m', LENGTH, 0],
    ['-0 m', LENGTH, 0],
    ['640 m', ELEVATION, 640],
    ['-430 m', ELEVATION, -430],
    ['15 °C', TEMPERATURE, 15],
    ['15°C', TEMPERATURE, 15],
    ['15 ºC', TEMPERATURE, 15],
    ['15 ℃', TEMPERATURE, 15],
    ['59 °F', TEMPERATURE, 15],
    ['288.15 K', TEMPERATURE, 15],
    ['−5 °C', TEMPERATURE, -5],
    ['1013.25 hPa', PRESSURE, 1013.25],
    ['1013.25 mbar', PRESSURE, 1013.25],
    ['101.325 kPa', PRESSURE, 1013.25],
    ['6.5 K/km', LAPSE, 6.5],
    ['6.5 °C / km', LAPSE, 6.5],
    ['40 %', HUMIDITY, 0.4],
    ['40%', HUMIDITY, 0.4],
    ['0 %', HUMIDITY, 0],
  ])('%s', (text, kind, value) => {
    expect(readOrReason(readUnit(text, kind))).toBeCloseTo(value, 10)
  })

  test('760 mmHg is the standard atmosphere, 1013.25 hPa, to a part in a million', () => {
    expect(Math.abs(Number(readOrReason(readUnit('760 mmHg', PRESSURE))) / 1013.25 - 1)).toBeLessThan(1e-6)
  })
})

/** A length that is mostly told in centimetres, and below one in metres. */
const POINT_LIKE: UnitKind = { ...LENGTH, usualUnit: 'cm', unitBelowOne: 'm' }

describe('refuses', () => {
  test.each<[string, UnitKind, string, string, string | null]>([
    ['12', LENGTH, 'unit-missing', '12', '12 m'],
    ['-5', TEMPERATURE, 'unit-missing', '-5', '−5 °C'],
    ['40', HUMIDITY, 'unit-missing', '40', '40 %'],
    ['0.4', HUMIDITY, 'unit-missing', '0.4', '40 %'],
    ['0.07', HUMIDITY, 'unit-missing', '0.07', '7 %'],
    ['1013', PRESSURE, 'unit-missing', '1013', '1013 hPa'],
    ['101325', PRESSURE, 'unit-missing', '101325', '101325 Pa'],
    ['9500', ELEVATION, 'unit-missing', '9500', null],
    ['0.05', POINT_LIKE, 'unit-missing', '0.05', '0.05 m'],
    ['5', POINT_LIKE, 'unit-missing', '5', '5 cm'],
    ['84,65 m', LENGTH, 'decimal-comma', '84,65 m', '84.65 m'],
    ['1,234 m', LENGTH, 'decimal-comma', '1,234 m', '1.234 m or 1234 m'],
    ['1,234,567 m', LENGTH, 'decimal-comma', '1,234,567 m', '1234567 m'],
    ['12 yd', LENGTH, 'not-readable', '12 yd', null],
    ['12 m 30 cm', LENGTH, 'not-readable', '12 m 30 cm', null],
    ['1e3 m', LENGTH, 'not-readable', '1e3 m', null],
    ['m', LENGTH, 'not-readable', 'm', null],
    ['3 m ± 1 cm', LENGTH, 'unexpected-tolerance', '3 m ± 1 cm', null],
    ['3 m within 1 cm', LENGTH, 'unexpected-tolerance', '3 m within 1 cm', null],
    ['3 ± 1 cm', LENGTH, 'unexpected-tolerance', '3 ± 1 cm', null],
    ['20 km', ELEVATION, 'out-of-range', '20 km', null],
    [`${'9'.repeat(400)} m`, ELEVATION, 'out-of-range', `${'9'.repeat(400)} m`, null],
    ['400 °C', TEMPERATURE, 'out-of-range', '400 °C', null],
    ['3 hPa', PRESSURE, 'out-of-range', '3 hPa', null],
    ['−6.5 K/km', LAPSE, 'out-of-range', '−6.5 K/km', null],
    ['140 %', HUMIDITY, 'out-of-range', '140 %', null],
  ])('%s', (text, kind, code, marked, suggestion) => {
    expectMisread(text, readUnit(text, kind), { code, marked, suggestion })
  })
})

describe('where a heading says metres', () => {
  const kind = inMetres(LENGTH, '84.65')

  test.each([
    ['84.65', 84.65],
    ['−3', -3],
    ['40 cm', 0.4],
  ])('%s', (text, metres) => {
    expect(readOrReason(readUnit(text, kind))).toBeCloseTo(metres, 12)
  })

  test('a decimal comma is refused all the same', () => {
    expectMisread('84,65', readUnit('84,65', kind), {
      code: 'decimal-comma',
      marked: '84,65',
      suggestion: '84.65',
    })
  })

  test('and elsewhere a bare number still is', () => {
    expectMisread('84.65', readUnit('84.65', LENGTH), {
      code: 'unit-missing',
      marked: '84.65',
      suggestion: '84.65 m',
    })
  })
})
