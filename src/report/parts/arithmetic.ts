import type { BlockContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { paragraph } from '../nodes.ts'
import { bodiesOf } from '../wording/bodies.ts'

/** Says what of the claim's arithmetic could be redone. */
export function arithmeticPart(audit: Audit): BlockContent[] {
  const checks =
    audit.checks.length === 0
      ? 'The claim file quotes no intermediate results, so there are no steps to redo one by one.'
      : 'Each result that the source prints is recomputed from the results printed before it, so that one slip does not hide the next.'
  return [paragraph([checks, ...(audit.reproduction.length === 0 ? [] : lastStep(audit))].join(' '))]
}

function lastStep(audit: Audit): string[] {
  const { tilt, stars } = bodiesOf(audit)
  const ofTilt =
    'The last step, from a declination to a date, depends on a model of the Earth’s tilt; older models part from today’s the further back one goes.'
  const ofStars = `${tilt ? 'For stars that step' : 'The last step, from where a star stood to a date,'} depends on a model of precession; the short polynomials in common use part from the long-term one the further one goes from our time.`
  return [...(tilt ? [ofTilt] : []), ...(stars ? [ofStars] : [])]
}
