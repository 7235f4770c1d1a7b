import { formatDay, MONTHS } from './format-day.ts'

/** A day of the Gregorian calendar as it was written; `month` is from 1 to 12. */
export interface WrittenDay {
  year: number
  month: number
  day: number
  text: string
}

/** A day of the calendar as people write it: `12 June 1998`. Throws a RangeError where the month is none. */
export function dayInWords({ year, month, day }: Omit<WrittenDay, 'text'>): string {
  const [monthText, dayText] = [month, day].map((number) => String(number).padStart(2, '0'))
  return formatDay(`${String(year).padStart(4, '0')}-${monthText}-${dayText}`)
}

/** The number of a month by its English name or the first three letters of it; null for other words. */
export function monthOf(name: string): number | null {
  const lower = name.toLowerCase()
  const index = MONTHS.findIndex(
    (month) => month.toLowerCase() === lower || month.slice(0, 3).toLowerCase() === lower,
  )
  return index === -1 ? null : index + 1
}

/** Whether the calendar has such a day. */
export function isDay(day: number, month: number, year: number): boolean {
  return month >= 1 && month <= 12 && day >= 1 && day <= daysIn(month, year)
}

/** How many days a month has, from 1 to 12. */
export function daysIn(month: number, year: number): number {
  return new Date(Date.UTC(year, month, 0)).getUTCDate()
}
