import type { BlockContent } from 'mdast'
import type { Audit, Implied, NearestApproach } from '../../audit/audit.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { paragraph } from '../nodes.ts'
import { impliedByOwnModel } from '../wording/implied-by-own-model.ts'
import { offsetFromLine } from '../wording/offset-from-line.ts'
import { sunWidthShare } from '../wording/sun-width-share.ts'

/** Where no date of the window fits: how near the target came to the line, and when. */
export function approachPart(audit: Audit): BlockContent[] {
  return impliedByOwnModel(audit).flatMap((implied) =>
    implied.nearest_approach === null ? [] : [paragraph(missed(implied), nearest(implied.nearest_approach))],
  )
}

function missed({ sightline, dates }: Implied): string {
  const reach = dates.length === 0 ? 'in the window or within 10,000 years of it' : 'in the window'
  return `No date ${reach} puts the target on the line ${sightline}. `
}

function nearest({ year, offset_arcmin, sd_arcmin, sun_widths }: NearestApproach): string {
  const when = formatYear(year, 10)
  if (offset_arcmin === null) {
    return `Within the window it never stands at that altitude; it came nearest to it in ${when}.`
  }
  const share = sun_widths === null ? [] : [sunWidthShare(sun_widths)]
  const where = offsetFromLine(offset_arcmin, sd_arcmin, share)
  return `Within the window it came nearest in ${when}, when the line pointed ${where}.`
}
