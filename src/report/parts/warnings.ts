import type { BlockContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { bullets } from '../nodes.ts'

/** What was doubtful but used. */
export function warningsPart(audit: Audit): BlockContent[] {
  return audit.warnings.length === 0 ? [] : [bullets(audit.warnings)]
}
