import type { BlockContent } from 'mdast'
import type { Audit, DatedLabel } from '../../audit/audit.ts'
import { paragraph } from '../nodes.ts'
import { datedLabels } from '../wording/dated-labels.ts'

/** The claim in its own words, where it was printed, and the dates it is held against. */
export function claimPart(audit: Audit): BlockContent[] {
  const source = audit.source === null ? 'The claim names no source.' : `Source: ${sentence(audit.source)}`
  const others =
    audit.other_dates.length === 0
      ? 'No independent date is named.'
      : `Independent of the line: ${datedLabels(audit.other_dates)}.`
  return [
    paragraph(`“${audit.statement}”`),
    paragraph(`${source} Date asserted: ${asserted(audit.asserted)}. ${others}`),
  ]
}

/** As the claim file writes it, and as the stretch of years it stands for. */
function asserted({ text, printed }: DatedLabel): string {
  return text === printed ? printed : `${text} (${printed})`
}

function sentence(text: string): string {
  return /[.!?…]$/.test(text) ? text : `${text}.`
}
