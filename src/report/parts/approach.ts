import type { BlockContent } from 'mdast'
import type { Audit, Implied, NearestApproach, SightlineAudit } from '../../audit/audit.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { paragraph } from '../nodes.ts'
import { impliedByOwnModel } from '../wording/implied-by-own-model.ts'
import { noEvent } from '../wording/no-event.ts'
import { offsetFromLine, whatPoints } from '../wording/offset-from-line.ts'
import { sunWidthShare } from '../wording/sun-width-share.ts'

/** Where no date of the window fits: how near the target came to the line, and when. */
export function approachPart(audit: Audit): BlockContent[] {
  return impliedByOwnModel(audit).flatMap((implied) => {
    const line = audit.sightlines.find(({ name }) => name === implied.sightline)
    const { nearest_approach } = implied
    if (line === undefined || nearest_approach === null) return []
    return [paragraph(missed(implied), nearest(nearest_approach, line))]
  })
}

function missed({ sightline, dates }: Implied): string {
  const reach = dates.length === 0 ? 'in the window or within 10,000 years of it' : 'in the window'
  return `No date ${reach} puts the target exactly on the line ${sightline}. `
}

function nearest(
  { year, offset_arcmin, sd_arcmin, sun_widths }: NearestApproach,
  line: SightlineAudit,
): string {
  if (offset_arcmin === null) return `At this latitude there is ${noEvent(line)} in any year of the window.`
  const { measures } = line
  const also = sun_widths === null ? [] : [sunWidthShare(sun_widths)]
  const where = offsetFromLine({ arcmin: offset_arcmin, sdArcmin: sd_arcmin, measures, also })
  return `Within the window it came nearest in ${formatYear(year, 10)}, when ${whatPoints(measures, 'then')} ${where}.`
}
