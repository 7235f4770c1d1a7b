import { deviation } from '../inference/fit.ts'
import type { Sight } from '../inference/sight.ts'
import type { DatedLabel, Implied, Limit, Outcome } from './audit.ts'
import { FITS_WITHIN_SD, YEARS_BEYOND_WINDOW } from './defaults.ts'
import { LEADS_ALWAYS, OVERLAPS } from './limit-reasons.ts'

/** Which of the kinds of result an audit has; see `Outcome`. */
export function outcomeOf(facts: {
  sights: readonly Sight[]
  asserted: DatedLabel
  window: { from: number; to: number }
  /** By the default model, one for each line. */
  implied: readonly Implied[]
  limits: readonly Limit[]
  plausibleHighArcmin: number
}): Outcome {
  const { sights, asserted, window, implied, limits, plausibleHighArcmin } = facts
  if (sights.some((sight) => deviation(sight, asserted) > FITS_WITHIN_SD)) {
    const reach = { from: window.from - YEARS_BEYOND_WINDOW, to: window.to + YEARS_BEYOND_WINDOW }
    const hopeless = sights.some(
      (sight, i) => implied[i]!.dates.length === 0 && deviation(sight, reach) > FITS_WITHIN_SD,
    )
    return hopeless ? 'none' : 'missed'
  }
  const rivals = rivalLimits(limits)
  if (rivals.length === 0) return 'open'
  return rivals.every((limit) => leadsUpTo(limit) >= plausibleHighArcmin) ? 'carried' : 'premise'
}

/** The limits against dates that the asserted one can be told apart from: those that do not overlap it. */
export function rivalLimits(limits: readonly Limit[]): Limit[] {
  return limits.filter(({ against, ratio_3_reason }) => against !== null && ratio_3_reason !== OVERLAPS)
}

/** The tolerance up to which the asserted date leads by 3 to 1; Infinity where it does at every one, −1 where never. */
export function leadsUpTo({ ratio_3_arcmin, ratio_3_reason }: Limit): number {
  if (ratio_3_arcmin !== null) return ratio_3_arcmin
  return ratio_3_reason === LEADS_ALWAYS ? Infinity : -1
}
