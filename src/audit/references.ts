import type { Claim } from '../claim/claim.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { modelsToTry } from './audit-reproduction.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** Works that every audit rests on. */
const ALWAYS = ['vondrak2011', 'kullback1951', 'jcgm100']

/** Keys of the works that an audit rests on, in the order of the alphabet. */
export function referencesOf(claim: Claim, lines: readonly SightlineInputs[]): string[] {
  const { refractionArcmin, refractionUncertaintyArcmin } = claim.atmosphere
  const needsAir = lines.some(({ target }) => target.body !== 'two stars')
  return [
    ...new Set([
      ...ALWAYS,
      ...lines.flatMap((line) => modelsToTry(claim, line)),
      ...lines.flatMap(worksOf),
      ...(claim.otherDates.length > 0 ? ['kass1995'] : []),
      ...(needsAir && isUnstated(refractionArcmin) ? ['auer2000', 'hohenkerk1985', 'bennett1982'] : []),
      ...(needsAir && isUnstated(refractionUncertaintyArcmin) ? ['sampson2003', 'schaefer1990'] : []),
      ...(isUnstated(claim.plausiblePrecision) ? ['petrie1883', 'ruggles1984'] : []),
    ]),
  ].sort()
}

/** Works that one kind of target rests on. */
function worksOf({ target }: SightlineInputs): string[] {
  switch (target.body) {
    case 'sun':
      return ['laskar2004']
    case 'moon':
      return ['laskar2004']
    case 'star':
      return ['hoffleit1991', ...(target.sighted.by === 'rule' ? ['rozenberg1966'] : [])]
    case 'two stars':
      return ['hoffleit1991']
  }
}
