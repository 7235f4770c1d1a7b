import { dayInWords } from '../../quantity/calendar.ts'
import { quoted } from '../../quantity/quoted.ts'
import { readCalendarDate } from '../../quantity/read-calendar-date.ts'
import type { Reading } from '../../quantity/reading.ts'
import type { CalendarDate, North } from '../claim.ts'
import type { KEYS } from '../keys.ts'
import type { ReadingHelp } from '../reading-help.ts'
import { type Context, type Field, reportError } from './field.ts'
import { DIRECTION_UNCERTAINTY, MAGNETIC_DECLINATION } from './kinds.ts'
import { measuredAngle } from './measured-angle.ts'
import type { Fields } from './read-mapping.ts'
import { readQuantity } from './read-quantity.ts'

/** What the declination of a date needs: the span of the model of the Earth's magnetism, and where the structure is. */
export interface CompassHelp {
  magneticDates: ReadingHelp['magneticDates']
  hasLongitude: boolean
}

const STATED = 'declination: 3°20′ W ± 10′'
const readStated = measuredAngle(MAGNETIC_DECLINATION, DIRECTION_UNCERTAINTY)

/**
 * Reads the day of a survey by compass and the declination of its needle. Where only the day is told, the declination
 * is `of the date`, and the model has to reach it. `help` is null where north was not found by compass.
 */
export function readCompass(
  fields: Fields<keyof typeof KEYS.north>,
  help: CompassHelp | null,
  context: Context,
): Pick<North, 'date' | 'declination'> {
  const date = readQuantity(fields.get('date'), readCalendarDate, 'a day such as 12 June 1998', context)
  const expected = `${MAGNETIC_DECLINATION.name} such as ${MAGNETIC_DECLINATION.example}, or applied`
  const declination = readQuantity(fields.get('declination'), readDeclination, expected, context)
  const field = fields.get('date')
  if (fields.has('declination') || date === null || field === undefined || help === null)
    return { date, declination }
  checkOfTheDate(field, date, help, context)
  return { date, declination: 'of the date' }
}

function readDeclination(text: string): Reading<NonNullable<North['declination']>> {
  return text.trim().toLowerCase() === 'applied' ? { ok: true, value: 'applied' } : readStated(text)
}

function checkOfTheDate(
  field: Field,
  date: CalendarDate,
  { magneticDates, hasLongitude }: CompassHelp,
  context: Context,
): void {
  if (!hasLongitude) {
    const message = `the declination of ${quoted(date.text)} depends on the longitude, and \`structure\` has no \`longitude\``
    const missing = { ...field, path: 'structure.longitude' }
    const expected = `longitude: 23°05′ E under structure, or ${STATED} here`
    reportError(context, missing, 'missing-key', message, { expected })
  }
  if (magneticDates === undefined) {
    const message = 'nothing here computes the declination of a compass on a date'
    reportError(context, field, 'no-model', message, { expected: `${STATED} beside it` })
    return
  }
  const day = Date.UTC(date.year, date.month - 1, date.day)
  const [from, to] = [new Date(magneticDates.from), new Date(magneticDates.to)]
  if (day >= from.getTime() && day <= to.getTime()) return
  const message = `${quoted(date.text)} is outside the dates of the model of the Earth’s magnetism, ${dayOf(from, 1)} to ${dayOf(to, 0)}`
  reportError(context, field, 'out-of-range', message, {
    expected: `${STATED} beside it, from the survey’s sheet or an older model`,
  })
}

/** The day of a moment; the next one where a day that has begun does not count. */
function dayOf(moment: Date, daysOn: 0 | 1): string {
  const isMidnight = moment.getTime() % 86_400_000 === 0
  const day = new Date(moment.getTime() + (isMidnight ? 0 : daysOn * 86_400_000))
  return dayInWords({ year: day.getUTCFullYear(), month: day.getUTCMonth() + 1, day: day.getUTCDate() })
}
