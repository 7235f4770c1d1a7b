import { formatYear } from '../../quantity/format-year.ts'

export interface Tick {
  at: number
  label: string
}

const STEPS = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000, 10_000, 20_000, 50_000, 100_000]

/**
 * Ticks at years that are round as people count them, in BCE before the year 1 and in CE after it (astronomical
 * −9999 is 10,000 BCE). There is no year 0, so where eras meet the tick is 1 CE. At most `most` of them.
 */
export function yearTicks(from: number, to: number, most: number): Tick[] {
  const step = STEPS.find((candidate) => (to - from) / candidate <= most - 1) ?? niceStep(from, to, most)
  return roundYears(from, to, step).map((year) => ({ at: year, label: formatYear(year) }))
}

/** Unlabelled years between: every fifth of the step from one labelled year to the next. */
export function minorYears(from: number, to: number, most: number): number[] {
  const step = STEPS.find((candidate) => (to - from) / candidate <= most - 1) ?? niceStep(from, to, most)
  return step < 5 ? [] : roundYears(from, to, step / 5)
}

function roundYears(from: number, to: number, step: number): number[] {
  const before: number[] = []
  for (let count = Math.floor((1 - from) / step); count >= 1; count--) before.push(1 - count * step)
  const after: number[] = []
  for (let count = 0; count * step <= to; count++) after.push(Math.max(1, count * step))
  const years = [...before.filter((year) => year <= 0), ...after]
  return [...new Set(years)].filter((year) => year >= from && year <= to)
}

function niceStep(from: number, to: number, most: number): number {
  return 10 ** Math.ceil(Math.log10((to - from) / Math.max(1, most - 1)))
}
