import type { BlockContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { paragraph } from '../nodes.ts'

/** Says what of the claim's arithmetic could be redone. */
export function arithmeticPart(audit: Audit): BlockContent[] {
  const checks =
    audit.checks.length === 0
      ? 'The claim file quotes no intermediate results, so there are no steps to redo one by one.'
      : 'Each result that the source prints is recomputed from the results printed before it, so that one slip does not hide the next.'
  const models =
    audit.reproduction.length === 0
      ? ''
      : ' The last step, from a declination to a date, depends on a model of the Earth’s tilt; older models part from today’s the further back one goes.'
  return [paragraph(checks + models)]
}
