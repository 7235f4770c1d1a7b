/** The English names of the months, from January. */
export const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const

/** Prints an ISO 8601 day for people: `21 June 2027`. Throws a RangeError where it is none. */
export function formatDay(isoDay: string): string {
  const [, year, month, day] = /^(\d{4})-(\d\d)-(\d\d)$/.exec(isoDay) ?? []
  const name = MONTHS[Number(month) - 1]
  if (name === undefined) throw new RangeError(`\`${isoDay}\` is no day; write one such as 2027-06-21`)
  return `${Number(day)} ${name} ${Number(year)}`
}
