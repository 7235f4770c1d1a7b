import { describe, expect, test } from 'vitest'
import { dayInWords } from '../../src/quantity/calendar.ts'
import { readCalendarDate } from '../../src/quantity/read-calendar-date.ts'
import { expectMisread, readOrReason } from './misread.ts'

describe('reads a day', () => {
  test.each([
    ['12 June 1998', 1998, 6, 12],
    ['12 jun 1998', 1998, 6, 12],
    [' 1 JANUARY 2000 ', 2000, 1, 1],
    ['1998-06-12', 1998, 6, 12],
    ['1998-6-2', 1998, 6, 2],
    ['29 February 2000', 2000, 2, 29], // a leap year of the Gregorian calendar, as every four hundredth is
    ['31 Dec 1999', 1999, 12, 31],
  ])('%s', (text, year, month, day) => {
    expect(readOrReason(readCalendarDate(text))).toEqual({ year, month, day, text: text.trim() })
  })
})

describe('refuses', () => {
  test.each<[string, string, string | null]>([
    ['06/12/1998', 'date-ambiguous', '6 December 1998 or 12 June 1998'],
    ['12/06/1998', 'date-ambiguous', '12 June 1998 or 6 December 1998'],
    ['6.6.1998', 'date-ambiguous', '6 June 1998'],
    ['25-12-1998', 'date-ambiguous', '25 December 1998'],
    ['1998/06/12', 'date-ambiguous', '12 June 1998'],
    ['45/45/1998', 'date-ambiguous', null],
    ['06/12/98', 'date-ambiguous', null],
    ['1998', 'date-incomplete', '1 July 1998'],
    ['June 1998', 'date-incomplete', '15 June 1998'],
    ['1998-06', 'date-incomplete', '15 June 1998'],
    ['12 June 98', 'date-incomplete', '12 June 1998 or 12 June 2098'],
    ['June 12, 1998', 'not-readable', '12 June 1998'],
    ['12th of June 1998', 'not-readable', '12 June 1998'],
    ['12. June 1998', 'not-readable', '12 June 1998'],
    ['12 Juni 1998', 'not-readable', null],
    ['soon', 'not-readable', null],
    ['', 'not-readable', null],
    ['31 June 1998', 'out-of-range', null],
    ['29 February 1900', 'out-of-range', null], // no leap year of the Gregorian calendar
    ['1998-13-01', 'out-of-range', null],
    ['12 June 0998', 'out-of-range', null],
    ['12 June 2998', 'out-of-range', null],
  ])('%s', (text, code, suggestion) => {
    const marked = text
    expectMisread(text, readCalendarDate(text), { code, marked, suggestion })
    for (const day of suggestion?.split(' or ') ?? []) expect(readCalendarDate(day).ok).toBe(true)
  })
})

test('a day is printed as it is read', () => {
  expect(dayInWords({ year: 1998, month: 6, day: 12 })).toBe('12 June 1998')
})
