import type { BlockContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { bullets, emphasis, strong } from '../nodes.ts'

/** Each question of the audit, its answer, and what the answer rests on. */
export function findingsPart(audit: Audit): BlockContent[] {
  if (audit.findings.length === 0) return []
  return [
    bullets(
      audit.findings.map(({ question, answer, because }) => [
        ...[emphasis(question), ' ', strong(answer)],
        because === '' ? '' : ` ${because}`,
      ]),
    ),
  ]
}
