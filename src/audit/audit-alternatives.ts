import type { Disc } from '../claim/claim.ts'
import { crossingYears } from '../inference/implied-dates.ts'
import type { Alternative } from './audit.ts'
import { nearestYear } from './dated-label.ts'
import { YEARS_BEYOND_WINDOW } from './defaults.ts'
import { type SightlineInputs, sightOf } from './sightline-inputs.ts'
import { discWords } from './words.ts'

const STEP = 20
const PARTS: readonly Disc[] = [{ part: 'upper limb' }, { part: 'centre' }, { part: 'lower limb' }]

/** The dates of the line for each part of the disc that its builders may have meant, the claim's own first. */
export function auditAlternatives(
  inputs: SightlineInputs,
  window: { from: number; to: number },
  near: number,
): Alternative[] {
  const others = PARTS.filter((disc) => discWords(disc) !== discWords(inputs.disc))
  return [inputs.disc, ...others].map((disc, i) => {
    const from = window.from - YEARS_BEYOND_WINDOW
    const to = window.to + YEARS_BEYOND_WINDOW
    const years = crossingYears(sightOf({ ...inputs, disc }), from, to, STEP)
    return {
      sightline: inputs.name,
      choice: 'part of the disc',
      value: discWords(disc),
      is_claims: i === 0,
      years,
      nearest_year: nearestYear(years, near),
    }
  })
}
