import { formatArcmin } from '../quantity/format-angle.ts'
import { formatYear, formatYearRange } from '../quantity/format-year.ts'
import type { DatedLabel, Implied, SweepStep, Window } from './audit.ts'
import { listed } from './words.ts'

/** Years are told to the nearest ten: no audit of a line of sight knows them better. */
const YEAR_STEP = 10

/** `about 9600 BCE`. */
export function aboutYear(year: number): string {
  return `about ${formatYear(year, YEAR_STEP)}`
}

/** `9700 to 9500 BCE`, and the label where the date is an independent one: `800 to 500 BCE (radiocarbon)`. */
export function labelled({ printed, label }: DatedLabel): string {
  return `${printed} (${label})`
}

/** The dates of a line that lie in the window, in words; null where there are none. */
export function datesInWindow({ dates }: Implied): string | null {
  const years = dates.filter((date) => date.in_window).map(({ year }) => aboutYear(year))
  return years.length === 0 ? null : listed(years)
}

/** A set of dates in words; where the window's edge cuts it, open towards that side. */
export function setInWords(
  step: Pick<SweepStep, 'sets95' | 'open_low' | 'open_high'>,
  window: Window,
): string {
  const { sets95, open_low, open_high } = step
  if (sets95.length === 0) return 'none'
  if (sets95.length === 1 && open_low && open_high) return `any date of the window, ${window.printed}`
  const last = sets95.length - 1
  return listed(
    sets95.map(([from, to], i) => {
      if (i === 0 && open_low) return `any up to ${formatYear(to, YEAR_STEP)}`
      if (i === last && open_high) return `any from ${formatYear(from, YEAR_STEP)} on`
      return formatYearRange(from, to, YEAR_STEP)
    }),
  )
}

/** `10′ to 1°`, and whose they are. */
export function plausibleWords(plausible: {
  low_arcmin: number
  high_arcmin: number
  stated: boolean
}): string {
  const range = `${formatArcmin(plausible.low_arcmin)} to ${formatArcmin(plausible.high_arcmin)}`
  return `${range}, ${plausible.stated ? 'as the claim file states them' : 'this program’s default'},`
}

/** The side of the line on which its target stood, as one faces the horizon. */
export function sideOf(offsetArcmin: number): string {
  return offsetArcmin > 0 ? 'to the left of the line' : 'to the right of the line'
}
