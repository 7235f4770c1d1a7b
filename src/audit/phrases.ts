import { formatArcmin } from '../quantity/format-angle.ts'
import { formatYear, formatYearRange } from '../quantity/format-year.ts'
import { listedShort } from '../quantity/listed.ts'
import type { DatedLabel, Implied, SweepStep, Window } from './audit.ts'

/** Years are told to the nearest ten: no audit of a line of sight knows them better. */
const YEAR_STEP = 10

/** So many dates are told in one sentence, and the others counted. */
const MOST_DATES = 3
const MOST_OUTSIDE = 1

/** So many parts of a set likewise. */
const MOST_PARTS = 3

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
  return inWords(
    dates.filter((date) => date.in_window),
    MOST_DATES,
  )
}

/** The dates of a line outside the window, nearest to it first, those to come named as such; null where there are none. */
export function datesOutside({ dates }: Implied, window: Window): string | null {
  const distance = (year: number) => Math.max(window.from - year, year - window.to)
  const outside = dates.filter((date) => !date.in_window)
  return inWords(
    outside.sort((a, b) => distance(a.year) - distance(b.year)),
    MOST_OUTSIDE,
  )
}

function inWords(dates: Implied['dates'], most: number): string | null {
  const years = dates.map(({ year, future }) => `${aboutYear(year)}${future ? ' (to come)' : ''}`)
  return years.length === 0 ? null : listedShort([...new Set(years)], most)
}

/** Bits below which all dates weigh alike. */
const ALL_ALIKE = 0.002

/** A set of dates in words; where the window's edge cuts it, open towards that side. */
export function setInWords(
  step: Pick<SweepStep, 'sets95' | 'open_low' | 'open_high'> & { bits?: number },
  window: Window,
): string {
  const { sets95, open_low, open_high, bits } = step
  if (sets95.length === 0) return 'none'
  // Where all dates weigh alike, which of them make up 95 % is chance.
  if (bits !== undefined && bits < ALL_ALIKE) return `any date of the window, ${window.printed}`
  if (sets95.length === 1 && open_low && open_high) return `any date of the window, ${window.printed}`
  const last = sets95.length - 1
  return listedShort(
    sets95.map(([from, to], i) => {
      if (i === 0 && open_low) return `any date up to ${formatYear(to, YEAR_STEP)}`
      if (i === last && open_high) return `any date from ${formatYear(from, YEAR_STEP)} on`
      return formatYearRange(from, to, to - from < NARROW_YEARS ? 1 : YEAR_STEP)
    }),
    MOST_PARTS,
  )
}

/** Of a narrower set round years would cut off, or add, too much. */
const NARROW_YEARS = 100

/** `10′ to 1°`, and whose they are. */
export function plausibleWords(plausible: {
  low_arcmin: number
  high_arcmin: number
  stated: boolean
}): string {
  const range = `${formatArcmin(plausible.low_arcmin)} to ${formatArcmin(plausible.high_arcmin)}`
  return `${range}, ${plausible.stated ? 'as the claim file states them' : 'this program’s default'},`
}

/** Where a target stood from its line as one faces the horizon; from what was measured for an altitude or an angle. */
export function sideOf(offsetArcmin: number, measures: 'azimuth' | 'altitude' | 'angle'): string {
  if (measures === 'altitude') return offsetArcmin > 0 ? 'below what was measured' : 'above what was measured'
  if (measures === 'angle')
    return offsetArcmin > 0 ? 'narrower than the angle measured' : 'wider than the angle measured'
  return offsetArcmin > 0 ? 'to the left of the line' : 'to the right of the line'
}
