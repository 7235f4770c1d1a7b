import type { Claim } from '../claim/claim.ts'
import { isUnstated } from '../quantity/unstated.ts'
import type { ObliquityModelName } from '../sky/obliquity-models.ts'

/** Works that every audit rests on. */
const ALWAYS = ['vondrak2011', 'laskar2004', 'kullback1951', 'jcgm100']

/** Keys of the works that an audit rests on, in the order of the alphabet. */
export function referencesOf(claim: Claim, models: readonly ObliquityModelName[]): string[] {
  const { refractionArcmin, refractionUncertaintyArcmin } = claim.atmosphere
  return [
    ...new Set([
      ...ALWAYS,
      ...models,
      ...(claim.otherDates.length > 0 ? ['kass1995'] : []),
      ...(isUnstated(refractionArcmin) ? ['auer2000', 'hohenkerk1985', 'bennett1982'] : []),
      ...(isUnstated(refractionUncertaintyArcmin) ? ['sampson2003', 'schaefer1990'] : []),
      ...(isUnstated(claim.plausiblePrecision) ? ['petrie1883', 'ruggles1984'] : []),
    ]),
  ].sort()
}
