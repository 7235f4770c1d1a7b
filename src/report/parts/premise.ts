import type { BlockContent } from 'mdast'
import type { Audit, SightlineAudit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { paragraph } from '../nodes.ts'
import { lineOrLines } from '../wording/line-or-lines.ts'

/** Where the line as measured does not fit, what the weights still mean. */
const CAVEATS: Partial<Record<Audit['outcome'], string>> = {
  none: ' Here no date fits; sets, ratios and limits then only say how the formula weighs misses against each other.',
  missed:
    ' Here the asserted date does not fit at small tolerances; a ratio in its favour there only says that another date misses by more.',
}

/** What the date rests on besides the line: how closely the builders hit the direction they meant. */
export function premisePart(audit: Audit): BlockContent[] {
  return [
    paragraph(
      'A line gives a date only together with a premise: how closely the builders hit the direction they ',
      `meant. ${claimsPremise(audit)} The build tolerance below is the standard deviation of the built `,
      `direction about the intended one, ${asAngle(audit)}. ${plausible(audit)}`,
    ),
    paragraph(weighing(audit)),
  ]
}

/** In which plane the tolerance is counted. */
function asAngle({ sightlines }: Audit): string {
  const has = (measures: SightlineAudit['measures']) => sightlines.some((line) => line.measures === measures)
  const ofAngle = has('angle') ? '; an angle between two built lines has √2 times that' : ''
  if (!has('altitude')) return `as an angle along the horizon${ofAngle}`
  if (!has('azimuth') && !has('angle')) return 'as an angle up or down'
  return `as an angle along the horizon or, for a measured altitude, up or down${ofAngle}`
}

function claimsPremise({ assumed_precision_arcmin }: Audit): string {
  if (assumed_precision_arcmin === null) return 'The claim does not say how closely.'
  if (assumed_precision_arcmin === 0) return 'The claim takes their work as exact.'
  return `The claim gives them ${formatArcmin(assumed_precision_arcmin)}.`
}

function plausible({ plausible: { low_arcmin, high_arcmin, stated } }: Audit): string {
  const range = `${formatArcmin(low_arcmin)} to ${formatArcmin(high_arcmin)}`
  return stated
    ? `The claim file states ${range} as plausible.`
    : `The claim file states no plausible range; ${range} stands in for it.`
}

function weighing(audit: Audit): string {
  const { window } = audit.sweep
  const whose = window.stated
    ? 'as the claim file has it'
    : 'this program’s own, as the claim file names none'
  const several = audit.sightlines.length > 1 ? ' All sightlines are taken together.' : ''
  const none = CAVEATS[audit.outcome] ?? ''
  return [
    `For each tolerance, every date in the window (${window.printed}, ${whose}) is weighed by how well the sky of `,
    `that date fits ${lineOrLines(audit, 'the line', 'the lines')}; before that, all count alike.${several}${none} `,
    'The table gives the smallest sets of dates that hold 95 % and 68 % of the weight. Bits say how much ',
    `${lineOrLines(audit, 'the line tells about its', 'the lines tell about their')} own date at all: 0 is nothing, `,
    '1 is as much as halving the window, 2 as much as quartering it.',
  ].join('')
}
