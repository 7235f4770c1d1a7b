import { describe, expect, test } from 'vitest'
import { formatDay } from '../../src/quantity/format-day.ts'

describe('a day for people', () => {
  test.each([
    ['2027-06-21', '21 June 2027'],
    ['2026-12-01', '1 December 2026'],
    ['2043-01-31', '31 January 2043'],
  ])('%s', (iso, words) => expect(formatDay(iso)).toBe(words))

  test.each(['2027-13-01', '2027-00-10', '21 June 2027', ''])('`%s` is none', (text) => {
    expect(() => formatDay(text)).toThrow(RangeError)
  })
})
