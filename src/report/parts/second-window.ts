import type { BlockContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { paragraph } from '../nodes.ts'
import { lineOrLines } from '../wording/line-or-lines.ts'

/** Sets and bits belong to their window: what another window makes of them. */
export function secondWindowPart(audit: Audit): BlockContent[] {
  const { window, half_bit_arcmin } = audit.second_window
  const lines = lineOrLines(audit, 'the line tells', 'the lines tell')
  const half =
    half_bit_arcmin === null
      ? `there is no tolerance from which ${lines} less than half a bit`
      : `${lines} less than half a bit from a tolerance of ${formatArcmin(half_bit_arcmin)}`
  return [
    paragraph(
      'Sets and bits belong to their window: a wider one leaves more to learn. Ratios and the limits drawn from ',
      `them do not depend on it. Within ${window.printed}, ${half}.`,
    ),
  ]
}
