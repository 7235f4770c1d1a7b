import { distinctSights } from '../inference/distinct-sights.ts'
import { bestFit, type Fit, isFit } from '../inference/fit.ts'
import type { Sight } from '../inference/sight.ts'
import { lnRatio, type SweepGround } from '../inference/sweep.ts'
import type { Limit, Outcome } from './audit.ts'
import type { SweepDates } from './audit-sweep.ts'
import { YEARS_BEYOND_WINDOW } from './defaults.ts'
import { LEADS_ALWAYS } from './limit-reasons.ts'

/** Which kind of result an audit has, and which lines are to blame where it is no fit. */
export interface Verdict {
  outcome: Outcome
  /** Indices of the lines that by themselves do not fit the asserted date (`missed`) or any date (`none`). */
  misfits: readonly number[]
}

/** Step in which all of the reach is looked through, years. */
const REACH_STEP = 20

export function verdictOf(facts: {
  sights: readonly Sight[]
  /** Of those, the ones that are read together. */
  joint: readonly Sight[]
  dates: SweepDates
  ground: SweepGround
  limits: readonly Limit[]
  /** Tolerances at which the lead of the asserted date is looked at, arcminutes. */
  plausibleArcmin: readonly number[]
}): Verdict {
  const { sights, joint, dates, ground, limits, plausibleArcmin } = facts
  const { asserted, window } = dates
  const lines = distinctSights(joint)
  if (!isFit(bestFit(lines, asserted), lines.length)) {
    const reach = { from: window.from - YEARS_BEYOND_WINDOW, to: window.to + YEARS_BEYOND_WINDOW }
    const isNowhere = !isFit(bestFit(lines, reach, REACH_STEP), lines.length)
    const step = isNowhere ? REACH_STEP : undefined
    return {
      outcome: isNowhere ? 'none' : 'missed',
      misfits: misfitsOf(sights, (sight) => bestFit([sight], isNowhere ? reach : asserted, step)),
    }
  }
  const rivals = limits.flatMap(({ against, overlaps }, i) => (against === null || overlaps ? [] : [i]))
  if (rivals.length === 0) return { outcome: 'open', misfits: [] }
  const leads = rivals.every((i) => plausibleArcmin.every((tolerance) => leadsAt(ground, i, tolerance)))
  return { outcome: leads ? 'carried' : 'premise', misfits: [] }
}

function misfitsOf(sights: readonly Sight[], fitOf: (sight: Sight) => Fit): number[] {
  return sights.flatMap((sight, i) => (isFit(fitOf(sight), 1) ? [] : [i]))
}

/** Whether the asserted date leads over an independent one by 3 to 1 at a tolerance. */
export function leadsAt(ground: SweepGround, other: number, toleranceArcmin: number): boolean {
  return (lnRatio(ground, other, toleranceArcmin) ?? -Infinity) >= Math.log(3)
}

/** The tolerance beyond which the asserted date no longer leads by 3 to 1; Infinity where none is known, −1: never. */
export function leadsUpTo({ ratio_3_arcmin, ratio_3_reason }: Limit): number {
  if (ratio_3_arcmin !== null) return ratio_3_arcmin
  return ratio_3_reason === LEADS_ALWAYS ? Infinity : -1
}

/** The limits against dates that the asserted one can be told apart from. */
export function rivalLimits(limits: readonly Limit[]): Limit[] {
  return limits.filter(({ against, overlaps }) => against !== null && !overlaps)
}
