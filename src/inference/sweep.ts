import { type DateSample, lnAverageWeight, sampleDates } from './date-sample.ts'
import { distinctSights } from './distinct-sights.ts'
import { crossingYears, dateSdYears } from './implied-dates.ts'
import { bits, posterior } from './posterior.ts'
import type { Sight } from './sight.ts'
import { holds, type Interval, smallestSet } from './smallest-set.ts'

/** A stretch of years; one year where both are equal. */
export interface Stretch {
  from: number
  to: number
}

/** Everything a sweep needs that does not depend on the tolerance. */
export interface SweepGround {
  window: DateSample
  asserted: DateSample
  others: readonly DateSample[]
  otherStretches: readonly Stretch[]
}

export interface SweepPoint {
  toleranceArcmin: number
  sets68: readonly Interval[]
  sets95: readonly Interval[]
  bits: number
  /** ln of the average weight over the asserted date less that over each independent one; null where undefined. */
  lnRatios: readonly (number | null)[]
}

/** Coarsest and finest step of the grid of dates, years, and the steps in one standard deviation at τ = 0. */
const COARSEST = 10
const FINEST = 1
const STEPS_PER_SD = 4

/** Holds the lines against their targets over the window and over each date that the claim names; each line once. */
export function prepareSweep(
  lines: readonly Sight[],
  window: Stretch,
  asserted: Stretch,
  others: readonly Stretch[],
): SweepGround {
  const sights = distinctSights(lines)
  const step = gridStep(sights, window)
  const sample = ({ from, to }: Stretch) => sampleDates(sights, from, to, step)
  return {
    window: sample(window),
    asserted: sample(asserted),
    others: others.map(sample),
    otherStretches: others,
  }
}

/** Fine enough to draw the narrowest peak: a quarter of the date's standard deviation at τ = 0. */
function gridStep(sights: readonly Sight[], window: Stretch): number {
  const widths = sights.flatMap((sight) =>
    sight.branches.flatMap((branch) =>
      crossingYears({ ...sight, branches: [branch] }, window.from, window.to, COARSEST).map(
        (year) => dateSdYears(sight, branch, year) ?? Infinity,
      ),
    ),
  )
  const narrowest = Math.min(...widths) / Math.sqrt(sights.length)
  const span = (window.to - window.from) / 400
  return Math.min(COARSEST, Math.max(FINEST, Math.min(narrowest / STEPS_PER_SD, span)))
}

/** One step of the sweep: what the lines say of their date when each was built to a standard deviation. */
export function sweepPoint(ground: SweepGround, toleranceArcmin: number): SweepPoint {
  const density = posterior(ground.window, toleranceArcmin / 60)
  return {
    toleranceArcmin,
    sets68: density === null ? [] : smallestSet(density, 0.68),
    sets95: density === null ? [] : smallestSet(density, 0.95),
    bits: density === null ? 0 : bits(density),
    lnRatios: ground.others.map((_, i) => lnRatio(ground, i, toleranceArcmin)),
  }
}

/** ln of the Bayes factor of the asserted date against an independent one; null where neither has any weight. */
export function lnRatio(ground: SweepGround, other: number, toleranceArcmin: number): number | null {
  const asserted = lnAverageWeight(ground.asserted, toleranceArcmin / 60)
  const against = lnAverageWeight(ground.others[other]!, toleranceArcmin / 60)
  const ratio = asserted - against
  return Number.isNaN(ratio) ? null : ratio
}

/** Whether the 95 % set holds the whole of an independent date. */
export function otherIn95(ground: SweepGround, other: number, toleranceArcmin: number): boolean {
  const density = posterior(ground.window, toleranceArcmin / 60)
  const { from, to } = ground.otherStretches[other]!
  return density !== null && holds(smallestSet(density, 0.95), from, to)
}

/** Bits at a tolerance. */
export function bitsAt(ground: SweepGround, toleranceArcmin: number): number {
  const density = posterior(ground.window, toleranceArcmin / 60)
  return density === null ? 0 : bits(density)
}
