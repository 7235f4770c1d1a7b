import { describe, expect, test } from 'vitest'
import { datesInWindow, datesOutside, setInWords, sideOf } from '../../src/audit/phrases.ts'
import { ratioWords } from '../../src/audit/ratio-words.ts'
import { inThreeMeasures } from '../../src/audit/words.ts'
import { listed, listedShort } from '../../src/quantity/listed.ts'
import { auditOf, claimText } from './audit-of.ts'

const WINDOW = { from: -2999, to: 1000, printed: '3000 BCE to 1000 CE', stated: true }

describe('the side of the line', () => {
  // Facing the horizon, a smaller azimuth lies to the left: the target of a line that has the greater one.
  test.each([
    [5, 'azimuth', 'to the left of the line'],
    [-5, 'azimuth', 'to the right of the line'],
    [5, 'altitude', 'below what was measured'],
    [-5, 'altitude', 'above what was measured'],
  ] as const)('an offset of %s′ in %s is %s', (offset, measures, words) => {
    expect(sideOf(offset, measures)).toBe(words)
  })
})

describe('a set of dates', () => {
  const set = (sets95: [number, number][], open_low = false, open_high = false) =>
    setInWords({ sets95, open_low, open_high }, WINDOW)

  test('says where the window cuts it', () => {
    expect(set([[-2999, -499]], true)).toBe('any date up to 500 BCE')
    expect(set([[500, 1000]], false, true)).toBe('any date from 500 CE on')
    expect(set([[-2999, 1000]], true, true)).toBe('any date of the window, 3000 BCE to 1000 CE')
    expect(set([[-1999, -999]])).toBe('2000 to 1000 BCE')
    expect(set([])).toBe('none')
  })

  test('of many parts counts the rest', () => {
    expect(
      set([
        [-2899, -2799],
        [-2499, -2399],
        [-1999, -1899],
        [-999, -899],
        [100, 200],
      ]),
    ).toBe('2900 to 2800 BCE, 2500 to 2400 BCE, 2000 to 1900 BCE and 2 more')
  })
})

describe('the dates of a line', () => {
  const date = (year: number, in_window: boolean, future = false) => ({
    year,
    low95: null,
    high95: null,
    in_window,
    future,
  })
  const implied = {
    sightline: 'one',
    model: 'vondrak2011',
    dates: [date(-8999, false), date(-1999, true), date(-999, true), date(4000, false, true)],
    nearest_approach: null,
  }

  test('in the window and outside it, the nearest first and those to come named', () => {
    expect(datesInWindow(implied)).toBe('about 2000 BCE and about 1000 BCE')
    expect(datesOutside(implied, WINDOW)).toBe('about 4000 CE (to come) and 1 more')
  })
})

describe('a ratio in words', () => {
  // Kass & Raftery 1995: 1 to 3, 3 to 20, 20 to 150, over 150.
  test.each([
    [2.9, 'barely worth a mention, for the asserted date'],
    [3.1, 'positive, for the asserted date'],
    [19.9, 'positive, for the asserted date'],
    [20.1, 'strong, for the asserted date'],
    [149, 'strong, for the asserted date'],
    [151, 'very strong, for the asserted date'],
    [1 / 25, 'strong, for bones'],
    [1.01, 'even'],
  ])('%s is %s', (ratio, words) => {
    expect(ratioWords(Math.log(ratio), 'bones')).toBe(words)
  })

  test('of two dates without any weight', () => {
    expect(ratioWords(null, 'bones')).toBe('neither date fits at all')
  })
})

test('an angle in the three measures', () => {
  expect(inThreeMeasures(24, 70, 100, 0.74)).toBe('24′ (70 cm at 100 m, 0.74 of the Sun’s width)')
  expect(inThreeMeasures(62, 180, 100, 2)).toBe('1°02′ (1.8 m at 100 m, 2.0 times the Sun’s width)')
})

test('lists', () => {
  expect(listed(['a'])).toBe('a')
  expect(listed(['a', 'b', 'c'])).toBe('a, b and c')
  expect(listedShort(['a', 'b', 'c', 'd'], 2)).toBe('a, b and 2 more')
})

describe('where the plausible tolerances lie', () => {
  const audit = (plausible: string) =>
    auditOf(claimText({ plausible_precision: plausible, other_dates: '[{label: bones, date: 500 CE}]' }))
  const limit = audit('1′ to 2′').limits[0]!.ratio_3_arcmin!

  test('the line has a limit at all', () => {
    expect(limit).toBeGreaterThan(5)
  })

  test.each([
    [`${Math.round(limit) + 10}′ to ${Math.round(limit) + 20}′`, /all lie beyond that limit/],
    [`${Math.round(limit) - 4}′ to ${Math.round(limit) + 20}′`, /lie on both sides of that limit/],
  ])('%s', (plausible, words) => {
    expect(audit(plausible).summary.join(' ')).toMatch(words)
  })

  test('all of them within it: the claim is carried, and says that it does not narrow the date', () => {
    const { outcome, summary } = audit('1′ to 2′')
    expect(outcome).toBe('carried')
    expect(summary.join(' ')).toMatch(/It does not narrow the date to the years asserted/)
  })
})

describe('today', () => {
  // The midsummer sunrise moves south, to the right, while the obliquity shrinks: an old line points to its left.
  test('an old line to midsummer sunrise points to the left of today’s', () => {
    const [today] = auditOf(claimText()).today
    expect(today!.offset_arcmin).toBeLessThan(-10)
  })
})

describe('the lines that are to blame', () => {
  const text = (good: string, bad: string) =>
    claimText({
      sightlines: `{good: {azimuth: ${good}, horizon: 30′ ± 1′}, bad: {azimuth: ${bad}, horizon: 30′ ± 1′}}`,
      atmosphere: '{refraction_uncertainty: 1′}',
    })

  test('the one furthest off in its own error, not in arcminutes', () => {
    const { outcome, summary } = auditOf(text('50°12′ ± 40′', '50°52′ ± 1′'))
    expect(outcome).toBe('missed')
    expect(summary[0]).toMatch(/the line bad misses/)
  })
})
