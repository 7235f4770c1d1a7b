import type { BlockContent } from 'mdast'
import type { Audit, SightlineAudit, Today } from '../../audit/audit.ts'
import { formatDegrees } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { paragraph } from '../nodes.ts'
import { noEvent } from '../wording/no-event.ts'
import { offsetFromLine, whatPoints } from '../wording/offset-from-line.ts'
import { sunWidthShare } from '../wording/sun-width-share.ts'

/** Where each line's target stands in the year of the audit. */
export function todayPart(audit: Audit): BlockContent[] {
  return audit.today.flatMap((today) => {
    const line = audit.sightlines.find(({ name }) => name === today.sightline)
    return line === undefined ? [] : [paragraph(sentence(today, line))]
  })
}

function sentence(
  { sightline, year, direction_deg, offset_arcmin, sun_widths, offset_cm }: Today,
  line: SightlineAudit,
): string {
  const when = `Today (${formatYear(Math.floor(year))})`
  if (direction_deg === null || offset_arcmin === null) {
    return `${when} the target of ${sightline} is not to be seen: there is ${noEvent(line)}.`
  }
  const also = [
    ...(sun_widths === null ? [] : [sunWidthShare(sun_widths)]),
    ...(offset_cm === null
      ? []
      : [`${formatCm(Math.abs(offset_cm))} ${line.length_m === null ? 'at 100 m' : 'at the marker'}`]),
  ]
  const { measures, body } = line
  const where = offsetFromLine({ arcmin: offset_arcmin, sdArcmin: null, measures, also })
  // The years of a standstill come and go: the audit's own need not be one.
  const then = body === 'moon' ? `${when}, in a year of such a standstill,` : when
  return `${then} the target of ${sightline} stands at ${measures} ${formatDegrees(direction_deg, 'minute')}; ${whatPoints(measures, 'now')} ${where}.`
}
