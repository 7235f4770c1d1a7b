import { formatYear, formatYearRange } from '../../quantity/format-year.ts'
import { yearStep } from './year-step.ts'

type Stretch = readonly [from: number, to: number]

/** Stands beside an end of a set that the window cuts off. */
export const EDGE = '(edge)'

/** Prints a set of dates, `9700 to 9500 BCE; 300 BCE to 420 CE`, marking ends cut off by the window. */
export function dateSets(sets: readonly Stretch[], window: { from: number; to: number }): string {
  if (sets.length === 0) return 'no date'
  return sets.map((stretch) => dateSet(stretch, window)).join('; ')
}

function dateSet([from, to]: Stretch, window: { from: number; to: number }): string {
  const step = yearStep(from, to)
  const opensLow = from <= window.from
  const opensHigh = to >= window.to
  if (!opensLow && !opensHigh) return formatYearRange(from, to, step)
  const start = opensLow ? `${formatYear(window.from)} ${EDGE}` : formatYear(from, step)
  const end = opensHigh ? `${formatYear(window.to)} ${EDGE}` : formatYear(to, step)
  return `${start} to ${end}`
}
