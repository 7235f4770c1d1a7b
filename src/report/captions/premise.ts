import type { PhrasingContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { premiseYears } from '../figures/premise-years.ts'
import { phrasing, strong } from '../nodes.ts'

/** Tells a reader who has seen no such figure how to read it. */
export function premiseCaption(audit: Audit): PhrasingContent[] {
  const hasLimits = audit.limits.some(
    (limit) => (limit.ratio_3_arcmin ?? limit.other_date_in_95_arcmin ?? limit.half_bit_arcmin) !== null,
  )
  return phrasing([
    strong('How the date depends on how exactly the builders built.'),
    ' At the left they hit the direction they meant; further right they may have missed it by more. At each ',
    'tolerance, dark grey holds the dates with 68 % of the weight, all grey those with 95 %. The red band is the ',
    `date asserted${independent(audit)}; the bracket spans the tolerances held plausible`,
    `${hasLimits ? '; flags mark where the conclusion changes' : ''}.`,
    premiseYears(audit).isPart ? ' Only the part of the window about these dates is drawn.' : '',
    ` ${moral(audit)}`,
  ])
}

function moral({ outcome, other_dates }: Audit): string {
  if (outcome === 'none') return 'No date in reach fits; the grey only weighs misses against each other.'
  return other_dates.length > 0
    ? 'Where the grey covers both kinds of band, the dates are not told apart.'
    : 'The wider the grey, the less is told about the date.'
}

function independent({ other_dates }: Audit): string {
  if (other_dates.length === 0) return ''
  return other_dates.length === 1
    ? ', the hatched band the independent date'
    : ', the hatched bands independent dates'
}
