import type { BlockContent } from 'mdast'
import type { Audit, Today } from '../../audit/audit.ts'
import { formatDegrees } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { paragraph } from '../nodes.ts'
import { offsetFromLine } from '../wording/offset-from-line.ts'
import { sunWidthShare } from '../wording/sun-width-share.ts'

/** Where each line's target stands in the year of the audit. */
export function todayPart(audit: Audit): BlockContent[] {
  return audit.today.map((today) => {
    const line = audit.sightlines.find(({ name }) => name === today.sightline)
    return paragraph(sentence(today, line?.length_m == null ? 'at 100 m' : 'at the marker'))
  })
}

function sentence(
  { sightline, year, azimuth_deg, offset_arcmin, sun_widths, offset_cm }: Today,
  place: string,
): string {
  const when = `Today (${formatYear(Math.floor(year))})`
  if (azimuth_deg === null || offset_arcmin === null) {
    return `${when} the target of ${sightline} does not reach that altitude.`
  }
  const shares = [
    ...(sun_widths === null ? [] : [sunWidthShare(sun_widths)]),
    ...(offset_cm === null ? [] : [`${formatCm(Math.abs(offset_cm))} ${place}`]),
  ]
  const where = offsetFromLine(offset_arcmin, null, shares)
  return `${when} the target of ${sightline} stands at azimuth ${formatDegrees(azimuth_deg, 'minute')}; the line points ${where}.`
}
