import { labelOfStar } from '../../sky/star-catalogue.ts'
import type { SettledTarget } from '../sightline-inputs.ts'

/** What tells the branches of a target from each other, in their order; empty where it has one only. */
export function branchWords(target: SettledTarget): readonly string[] {
  if (target.body === 'two stars') {
    return target.above === null ? target.stars.map((star) => `${labelOfStar(star)} above`) : []
  }
  const isTwofold =
    target.body === 'sun' && target.event.name === 'equinox' && target.event.sense === 'midway in days'
  return isTwofold ? ['March equinox', 'September equinox'] : []
}
