import { describe, expect, test } from 'vitest'
import { readYears } from '../../src/quantity/read-years.ts'
import { expectMisread } from './misread.ts'

// Astronomical years: 1 BCE is 0, n BCE is 1 − n.
describe('reads a date', () => {
  test.each([
    ['9600 BCE ± 100', -9699, -9499],
    ['9600 BCE +/- 100', -9699, -9499],
    ['9600 BCE ± 100 years', -9699, -9499],
    ['9600 BCE within 100', -9699, -9499],
    ['9600 ± 100 BCE', -9699, -9499],
    ['9600 BCE ± 1,000', -10599, -8599],
    ['12000 BC', -11999, -11999],
    ['11,881 BCE', -11880, -11880],
    ['12000 B.C.', -11999, -11999],
    ['12000 bce', -11999, -11999],
    ['1 BCE', 0, 0],
    ['1 CE', 1, 1],
    ['AD 600', 600, 600],
    ['A.D. 600', 600, 600],
    ['600 AD', 600, 600],
    ['600 C.E.', 600, 600],
    ['2500 to 2300 BCE', -2499, -2299],
    ['2500–2300 BCE', -2499, -2299],
    ['2500-2300 BCE', -2499, -2299],
    ['2500 — 2300\u00a0BCE', -2499, -2299],
    ['800 BCE to 500 BCE', -799, -499],
    ['800 BCE – 500 CE', -799, 500],
    ['AD 600 to 700', 600, 700],
    ['600 to 600 CE', 600, 600],
    ['3rd century BCE', -299, -200], // 300 to 201 BCE
    ['1st century BCE', -99, 0],
    ['1st century CE', 1, 100],
    ['5th century AD', 401, 500],
    ['3rd to 2nd century BCE', -299, -100],
    ['3rd–2nd centuries BCE', -299, -100],
    ['3rd millennium BCE', -2999, -2000],
    // BP counts back from 1950 CE: 3200 cal BP is 1950 − 3200 = −1250, which is 1251 BCE.
    ['3200 cal BP', -1250, -1250],
    ['3200 cal. BP', -1250, -1250],
    ['3200 ± 50 cal BP', -1300, -1200],
    ['3200 to 3000 cal BP', -1250, -1050],
    ['0 cal BP', 1950, 1950],
    ['1200 cal BC', -1199, -1199],
    ['c. 400 CE ± 30', 370, 430],
  ])('%s', (text, from, to) => {
    expect(readYears(text)).toEqual({ ok: true, value: { from, to, text, circaYears: 0 } })
  })

  test.each([
    ['c. 400 CE', 350, 450],
    ['ca. 400 CE', 350, 450],
    ['circa AD 400', 350, 450],
    ['c400 CE', 350, 450],
    ['about 400 CE', 350, 450],
    ['~400 CE', 350, 450],
    ['c. 2500 to c. 2300 BCE', -2549, -2249],
    ['c. 2500 to 2300 BCE', -2549, -2299],
  ])('%s is given ± 50 years', (text, from, to) => {
    expect(readYears(text)).toEqual({ ok: true, value: { from, to, text, circaYears: 50 } })
  })

  test('a bare BP is read as cal BP, with a warning', () => {
    expect(readYears(' 3200 BP ')).toMatchObject({
      ok: true,
      value: { from: -1250, to: -1250, text: '3200 BP' },
      warnings: [{ code: 'radiocarbon-age', offset: 1, length: 7 }],
    })
  })
})

describe('refuses', () => {
  test.each([
    ['-9600', 'year-negative', '-9600', '9601 BCE or 9600 BCE'],
    ['−9600 ± 100', 'year-negative', '−9600', '9601 BCE or 9600 BCE'],
    ['–9600', 'year-negative', '–9600', '9601 BCE or 9600 BCE'],
    ['-9600 to -9500', 'year-negative', '-9600', '9601 BCE or 9600 BCE'],
    ['c. -9600', 'year-negative', '-9600', '9601 BCE or 9600 BCE'],
    ['-9600 BCE', 'year-negative', '-9600', '9600'],
    ['+600', 'year-without-era', '+600', '600 CE'],
    ['600', 'year-without-era', '600', '600 CE or 600 BCE'],
    ['600 ± 50', 'year-without-era', '600 ± 50', '600 ± 50 CE or 600 ± 50 BCE'],
    ['600 to 700', 'year-without-era', '600 to 700', '600 to 700 CE'],
    ['2500 to 2300', 'year-without-era', '2500 to 2300', '2500 to 2300 BCE'],
    ['50 BCE to 100', 'year-without-era', '50 BCE to 100', '50 BCE to 100 CE'],
    ['0', 'year-zero', '0', null],
    ['0 CE', 'year-zero', '0 CE', null],
    ['0 BCE ± 100', 'year-zero', '0 BCE ± 100', null],
    ['0th century CE', 'year-zero', '0th century CE', null],
    ['9600.5 BCE', 'year-fraction', '9600.5 BCE', null],
    ['2300 to 2500 BCE', 'range-backwards', '2300 to 2500 BCE', '2500 to 2300 BCE'],
    ['500 BCE to 800 BCE', 'range-backwards', '500 BCE to 800 BCE', '800 BCE to 500 BCE'],
    ['AD 700 to 600', 'range-backwards', 'AD 700 to 600', 'AD 600 to 700'],
    ['3000 to 3200 cal BP', 'range-backwards', '3000 to 3200 cal BP', '3200 to 3000 cal BP'],
    ['600 CE to 500 BCE', 'range-backwards', '600 CE to 500 BCE', '500 BCE to 600 CE'],
    ['9600 BCE ± -5', 'negative-uncertainty', '-5', '5'],
    ['9600 BCE ± unknown', 'not-readable', 'unknown', null],
    ['9600 BCE ± 5′', 'not-readable', '5′', null],
    ['2500 to 2300 BCE ± 50', 'unexpected-tolerance', '2500 to 2300 BCE ± 50', null],
    ['AD 600 BC', 'not-readable', 'AD 600 BC', null],
    ['9600 BCE –', 'not-readable', '9600 BCE –', null],
    ['1 to 2 to 3 CE', 'not-readable', '1 to 2 to 3 CE', null],
    ['3rd', 'not-readable', '3rd', null],
    ['3rd century BP', 'not-readable', '3rd century BP', null],
    ['1e4 BCE', 'not-readable', '1e4 BCE', null],
    [`${'9'.repeat(400)} BCE`, 'not-readable', `${'9'.repeat(400)} BCE`, null],
    ['Neolithic', 'not-readable', 'Neolithic', null],
  ])('%s: %s', (text, code, marked, suggestion) => {
    expectMisread(text, readYears(text), { code, marked, suggestion })
  })

  test.each(['12,000 years ago', '12 kya', '12 ka', '3 thousand yrs ago'])(
    '%s, with how to say it',
    (text) => {
      expectMisread(text, readYears(text), { code: 'not-readable', marked: text, suggestion: null })
      expect(readYears(text)).toMatchObject({ misread: { expected: expect.stringMatching(/cal BP.*BCE/) } })
    },
  )

  test('a negative year with both readings in words', () => {
    expect(readYears('-9600')).toMatchObject({
      misread: {
        message: '`-9600` can mean two years, one apart',
        expected:
          '9601 BCE if it is an astronomical year number (0 is 1 BCE), 9600 BCE if the minus stands for BCE',
      },
    })
  })
})
