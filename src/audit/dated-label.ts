import { formatYearRange } from '../quantity/format-year.ts'
import type { YearRange } from '../quantity/year-range.ts'
import type { DatedLabel } from './audit.ts'

/** A date of the claim with its label, as the report prints both. */
export function datedLabel(label: string, { text, from, to }: YearRange): DatedLabel {
  return { label, text, printed: formatYearRange(from, to), from, to }
}

/** The middle of a stretch of years. */
export function middle({ from, to }: { from: number; to: number }): number {
  return (from + to) / 2
}

/** Of some years the one nearest to another; null where there are none. */
export function nearestYear(years: readonly number[], to: number): number | null {
  return years.reduce<number | null>(
    (best, year) => (best === null || Math.abs(year - to) < Math.abs(best - to) ? year : best),
    null,
  )
}
