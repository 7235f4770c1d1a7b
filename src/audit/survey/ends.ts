import type { Claim, Direction, SightedPart } from '../../claim/claim.ts'
import { isUnstated } from '../../quantity/unstated.ts'
import { lineTurnDeg, type SightedPart as PartOfWidth } from '../../site/sighted-part.ts'
import { pointNamed } from './place-of-point.ts'

/** What stands at one end of a line, and the part of it that is sighted. */
export interface End {
  name: string
  form: 'post' | 'gap' | null
  widthM: number
  part: PartOfWidth['part']
}

/** Both ends of a line between points. */
export interface Ends {
  from: End
  to: End
}

/** The ends of a line with what is sighted of each: the middle where the claim does not say. */
export function endsOf(claim: Claim, direction: Extract<Direction, { by: 'points' }>): Ends {
  const end = (name: string, part: SightedPart): End => {
    const { breadth } = pointNamed(claim, name)
    return {
      name,
      form: breadth?.form ?? null,
      widthM: breadth?.widthM ?? 0,
      part: isUnstated(part) ? 'middle' : part,
    }
  }
  const { from, to, sighted } = direction
  return { from: end(from, sighted.from), to: end(to, sighted.to) }
}

/** By how much the sighted parts turn the line of the middles, degrees, clockwise positive. */
export function turnByParts({ from, to }: Ends, lengthM: number): number {
  return lineTurnDeg(lengthM, { from, to })
}

/** `the left edge`, `the axis`, `the middle`, `the right side`. */
export function partWords({ form, part }: Pick<End, 'form' | 'part'>): string {
  if (part === 'middle') return form === 'gap' ? 'the middle' : 'the axis'
  return `the ${part} ${form === 'gap' ? 'side' : 'edge'}`
}
