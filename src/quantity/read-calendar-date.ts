import { dayInWords, daysIn, isDay, monthOf, type WrittenDay } from './calendar.ts'
import { misread, trimmedStretch } from './misread.ts'
import { plainCharacters } from './plain-characters.ts'
import { quoted } from './quoted.ts'
import type { Reading } from './reading.ts'

/** The first whole year of the Gregorian calendar, and a year no survey of today lies after. */
const YEARS = { first: 1583, last: 2100 }
const EXPECTED = 'a day such as 12 June 1998 or 1998-06-12'

/**
 * Reads a day of the calendar, `12 June 1998` or `1998-06-12`. What leaves the day open is refused: figures whose order
 * differs between countries, a month, a year.
 */
export function readCalendarDate(text: string): Reading<WrittenDay> {
  const plain = plainCharacters(text).trim()
  const iso = /^(\d{4})-(\d{1,2})-(\d{1,2})$/.exec(plain)
  if (iso !== null) return dayOf(text, Number(iso[3]), Number(iso[2]), Number(iso[1]))
  const words = /^(\d{1,2}) +([a-z]{3,9}) +(\d{4})$/i.exec(plain)
  const month = monthOf(words?.[2] ?? '')
  if (words !== null && month !== null) return dayOf(text, Number(words[1]), month, Number(words[3]))
  return inFigures(text, plain) ?? incomplete(text, plain) ?? notADay(text, plain)
}

function dayOf(text: string, day: number, month: number, year: number): Reading<WrittenDay> {
  const written = text.trim()
  if (isDay(day, month, year) && year >= YEARS.first && year <= YEARS.last)
    return { ok: true, value: { year, month, day, text: written } }
  const isYearOut = year < YEARS.first || year > YEARS.last
  const message = isYearOut
    ? `${quoted(written)} cannot be the day of a survey`
    : `there is no day ${quoted(written)}`
  const lastDay = month >= 1 && month <= 12 ? daysIn(month, year) : 31
  return misread('out-of-range', message, trimmedStretch(text), {
    expected: isYearOut
      ? `a year from ${YEARS.first} to ${YEARS.last}`
      : `a month from 1 to 12 and a day from 1 to ${lastDay}`,
  })
}

function inFigures(text: string, plain: string): Reading<never> | null {
  const match = /^(\d{1,4})([/.-])(\d{1,2})\2(\d{1,4})$/.exec(plain)
  if (match === null) return null
  const [first, second, third] = [match[1], match[3], match[4]].map(Number) as [number, number, number]
  const readings =
    match[1]?.length === 4
      ? [{ day: third, month: second, year: first }]
      : [
          { day: first, month: second, year: third },
          { day: second, month: first, year: third },
        ]
  const days = readings.filter(({ day, month, year }) => year >= YEARS.first && isDay(day, month, year))
  const suggestion = [...new Set(days.map(dayInWords))].join(' or ')
  return misread(
    'date-ambiguous',
    `${quoted(text.trim())} does not say which figure is the month`,
    trimmedStretch(text),
    { expected: EXPECTED, suggestion: suggestion === '' ? null : suggestion },
  )
}

/** A month or a year stands for its middle, which is what to write where no more is known. */
function incomplete(text: string, plain: string): Reading<never> | null {
  const year = /^\d{4}$/.exec(plain)?.[0]
  const [, name = '', ofMonth] = /^([a-z]{3,9})\.?,? +(\d{4})$/i.exec(plain) ?? []
  const [, ofIso, inIso] = /^(\d{4})-(\d{1,2})$/.exec(plain) ?? []
  const month = monthOf(name) ?? (Number(inIso) >= 1 && Number(inIso) <= 12 ? Number(inIso) : null)
  if (year === undefined && month === null) return null
  const middle =
    year === undefined
      ? { day: 15, month: month ?? 1, year: Number(ofMonth ?? ofIso) }
      : { day: 1, month: 7, year: Number(year) }
  return misread('date-incomplete', `${quoted(text.trim())} does not name a day`, trimmedStretch(text), {
    expected: `${EXPECTED}; the middle of the ${year === undefined ? 'month' : 'year'} where no more is known`,
    suggestion: isYear(middle.year) ? dayInWords(middle) : null,
  })
}

/** `June 12, 1998`, `12th of June 1998` and `12 June 98` are not misunderstood, but written otherwise. */
function notADay(text: string, plain: string): Reading<never> {
  const tidy = plain.replace(/(?<=\d)(?:st|nd|rd|th)\b|\bof\b|[.,]/gi, ' ').replace(/ +/g, ' ')
  const parts = /^(?:(\d{1,2}) ([a-z]+)|([a-z]+) (\d{1,2})) (\d{2}|\d{4})$/i.exec(tidy.trim())
  const day = Number(parts?.[1] ?? parts?.[4])
  const month = monthOf(parts?.[2] ?? parts?.[3] ?? '')
  const year = parts?.[5] ?? ''
  const years = year.length === 2 ? [1900 + Number(year), 2000 + Number(year)] : [Number(year)]
  const days = years
    .map((each) => ({ day, month: month ?? 0, year: each }))
    .filter((each) => isYear(each.year) && isDay(each.day, each.month, each.year))
  const code = days.length > 0 && year.length === 2 ? 'date-incomplete' : 'not-readable'
  return misread(code, `${quoted(text.trim())} is not a day of the calendar`, trimmedStretch(text), {
    expected: EXPECTED,
    suggestion: days.length === 0 ? null : days.map(dayInWords).join(' or '),
  })
}

function isYear(year: number): boolean {
  return year >= YEARS.first && year <= YEARS.last
}
