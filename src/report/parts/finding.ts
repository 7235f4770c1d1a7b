import type { BlockContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { paragraph } from '../nodes.ts'

/** The finding that stands on page one. */
export function findingPart(audit: Audit): BlockContent[] {
  return audit.summary.map((text) => paragraph(text))
}
