import { crossingYears } from '../inference/implied-dates.ts'
import type { Alternative } from './audit.ts'
import { nearestYear } from './dated-label.ts'
import { YEARS_BEYOND_WINDOW } from './defaults.ts'
import { readingsOf } from './readings-of.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

const STEP = 20
/** The dates of the line for each thing that its builders may have meant, the claim's own first. */
export function auditAlternatives(
  inputs: SightlineInputs,
  window: { from: number; to: number },
  near: number,
): Alternative[] {
  return readingsOf(inputs).map(({ choice, value, isOwn, line }) => {
    const from = window.from - YEARS_BEYOND_WINDOW
    const to = window.to + YEARS_BEYOND_WINDOW
    const years = crossingYears(sightOf(line), from, to, STEP)
    return {
      sightline: inputs.name,
      choice,
      value,
      is_claims: isOwn,
      years,
      nearest_year: nearestYear(years, near),
    }
  })
}
