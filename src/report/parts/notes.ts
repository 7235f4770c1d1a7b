import type { BlockContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { safeMarkdown } from '../safe-markdown.ts'

/** The notes of the claim file, which may use a harmless part of Markdown. */
export function notesPart(audit: Audit): BlockContent[] {
  const { notes } = audit.claim
  return typeof notes === 'string' ? safeMarkdown(notes) : []
}
