import type { BlockContent } from 'mdast'
import type { Audit, NextChance, SightlineAudit, Today } from '../../audit/audit.ts'
import { formatDegrees } from '../../quantity/format-angle.ts'
import { formatDay } from '../../quantity/format-day.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { paragraph, strong } from '../nodes.ts'
import { noEvent } from '../wording/no-event.ts'
import { offsetFromLine, whatPoints } from '../wording/offset-from-line.ts'
import { sunWidthShare } from '../wording/sun-width-share.ts'

/** Where each line's target stands in the year of the audit, and when and where to stand to see it for oneself. */
export function todayPart(audit: Audit): BlockContent[] {
  return audit.today.flatMap((today) => {
    const line = audit.sightlines.find(({ name }) => name === today.sightline)
    return line === undefined
      ? []
      : [paragraph(strong(`${line.name}.`), ` ${sentence(today, line)}${chance(today, line)}`)]
  })
}

function sentence(
  { year, direction_deg, offset_arcmin, sun_widths, offset_cm }: Today,
  line: SightlineAudit,
): string {
  const when = `Today (${formatYear(Math.floor(year))})`
  if (direction_deg === null || offset_arcmin === null) {
    return `${when} the target is not to be seen: there is ${noEvent(line)}.`
  }
  const { measures, body } = line
  const also = [
    ...(sun_widths === null ? [] : [sunWidthShare(sun_widths)]),
    ...(offset_cm === null || measures !== 'azimuth'
      ? []
      : [`${formatCm(Math.abs(offset_cm))} ${line.length_m === null ? 'at 100 m' : 'at the marker'}`]),
  ]
  const where = offsetFromLine({ arcmin: offset_arcmin, sdArcmin: null, measures, also })
  // The years of a standstill come and go: the audit's own need not be one.
  const then = body === 'moon' ? `${when}, in a year of such a standstill,` : when
  const placed = measures === 'angle' ? 'an angle of' : measures
  return `${then} the target stands at ${placed} ${formatDegrees(direction_deg, 'minute')}; ${whatPoints(measures, 'now')} ${where}.`
}

function chance({ next, next_reason, offset_arcmin }: Today, line: SightlineAudit): string {
  if (next === null)
    return next_reason === null ? '' : ` There is no chance to look for oneself: ${next_reason}.`
  const { notes, days, date } = next
  const alsoGood = days === null ? '' : others(days, date)
  const where = standing(next, line, offset_arcmin)
  const more = notes.map((note) => ` ${note}`).join('')
  return ` The next chance to look for oneself is on ${dayAndHour(next)}.${alsoGood}${where}${more}`
}

/** The place's own day, and universal time with its day where that is another. */
function dayAndHour({ date, utc }: NextChance): string {
  if (utc === null)
    return `${formatDay(date)}; at what hour depends on the longitude, which the claim does not give`
  const utcDay = utc.slice(0, 10)
  const hour = `at ${utc.slice(11, 16)} UTC`
  return utcDay === date
    ? `${formatDay(date)}, ${hour}`
    : `${formatDay(date)} by the place’s own time, ${hour} on ${formatDay(utcDay)}`
}

function others([from, to]: readonly [string, string], date: string): string {
  if (from === to) return ''
  return ` From ${formatDay(from)} to ${formatDay(to)} the Sun stands within 1′ of its declination of that day, and any of these${from === date ? ' days' : ''} does as well.`
}

/** From further to the side than this the foresight and the skyline are no longer what they were, metres. */
const NEAR_M = 5

function standing(
  { stand_right_m, stand_sd_m }: NextChance,
  { measures, length_m }: SightlineAudit,
  offsetArcmin: number | null,
): string {
  if (measures !== 'azimuth' || offsetArcmin === null) return ''
  if (stand_right_m === null) {
    return length_m === null
      ? ' Where to stand follows from the length of the line, which is not known here.'
      : ' It is too far off the line for any place beside the backsight.'
  }
  const size = formatCm(Math.abs(stand_right_m) * 100)
  const sd = stand_sd_m === null ? '' : ` ± ${formatCm(stand_sd_m * 100)}`
  const side = stand_right_m > 0 ? 'right' : 'left'
  const far =
    Math.abs(stand_right_m) > NEAR_M ? ' From there the skyline can be another than from the backsight.' : ''
  return ` The place from which it stands over the foresight is ${size}${sd} to the ${side} of the backsight, as one looks along the line.${far}`
}
