import { formatYear, formatYearRange } from '../../quantity/format-year.ts'
import { quoted } from '../../quantity/quoted.ts'
import { readYears } from '../../quantity/read-years.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import { DATE_EXAMPLES } from '../../quantity/year-atom.ts'
import type { YearRange } from '../../quantity/year-range.ts'
import { DEFAULT_WINDOW } from '../default-window.ts'
import { KEYS } from '../keys.ts'
import { type Context, type Field, reportError, reportWarning } from './field.ts'
import { readList } from './read-list.ts'
import { readMapping } from './read-mapping.ts'
import { readQuantity, readStatable } from './read-quantity.ts'
import { readText } from './read-text.ts'

/** Where the tables of the Earth's orbit end (eccentricity and perihelion; Laskar et al. 2004), astronomical years. */
const REACH = { from: -29999, to: 12000 }
/** A window narrower than this has no dates to weigh against each other; a choice of this program. */
const NARROWEST_WINDOW = 100

/** An independent date with where it stands, for checks against others. */
export interface ReadDate {
  label: string
  date: YearRange
  field: Field
}

/** Reads a date or range of dates within reach of the tables. */
export function readDate(field: Field | undefined, context: Context): YearRange | null {
  const date = readQuantity(field, readYears, DATE_EXAMPLES, context)
  return date !== null && field !== undefined && isWithinReach(date, field, context) ? date : null
}

/** Reads the independent dates, each with a label of its own. */
export function readOtherDates(field: Field | undefined, context: Context): readonly ReadDate[] {
  const entries = readList(field, context, 'a list such as [{label: radiocarbon, date: 800 to 500 BCE}]')
  const dates = (entries ?? []).map((entry) => readOtherDate(entry, context)).filter((date) => date !== null)
  const labels = new Set<string>()
  for (const { label, field: entry } of dates) {
    if (labels.has(label))
      reportError(
        context,
        entry,
        'duplicate-label',
        `a date before this one has the label ${quoted(label)} too`,
        {
          expected: 'a label of its own for each date',
        },
      )
    labels.add(label)
  }
  return dates
}

/** Reads the dates thought possible. */
export function readWindow(field: Field | undefined, context: Context): YearRange | Unstated {
  const window = readStatable(field, readYears, `a range such as ${formatYearRange(-20000, 2026)}`, context)
  if (typeof window === 'string' || field === undefined || !isWithinReach(window, field, context))
    return typeof window === 'string' ? window : 'omitted'
  if (window.to - window.from < NARROWEST_WINDOW)
    reportError(context, field, 'window-too-narrow', `${quoted(window.text)} is too narrow a window`, {
      expected: `a range of at least ${NARROWEST_WINDOW} years`,
    })
  return window
}

/** Warns of a date that does not lie inside the window, the default one where the claim has none. */
export function warnOutsideWindow(
  date: YearRange,
  field: Field,
  window: YearRange | Unstated,
  context: Context,
): void {
  const { from, to } = typeof window === 'string' ? DEFAULT_WINDOW : window
  if (date.from >= from && date.to <= to) return
  const wide = formatYearRange(Math.min(from, date.from), Math.max(to, date.to))
  const message = `${quoted(date.text)} lies outside the window of dates, ${formatYearRange(from, to)}`
  reportWarning(context, field, 'date-outside-window', message, {
    expected: `a date inside the window, or a wider one (window: ${wide})`,
  })
}

function readOtherDate(field: Field, context: Context): ReadDate | null {
  const fields = readMapping(field, KEYS.otherDate, context)
  if (fields === null) return null
  const label = readText(fields.get('label'), context)
  const date = readDate(fields.get('date'), context)
  return label === null || date === null ? null : { label, date, field: fields.get('date') ?? field }
}

function isWithinReach(date: YearRange, field: Field, context: Context): boolean {
  if (date.from >= REACH.from && date.to <= REACH.to) return true
  const message = `${quoted(date.text)} is out of reach of the tables of the Earth's orbit`
  reportError(context, field, 'date-out-of-reach', message, {
    expected: `dates from ${formatYear(REACH.from)} to ${formatYear(REACH.to)}`,
  })
  return false
}
