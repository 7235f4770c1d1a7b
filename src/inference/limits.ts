import { bitsAt, lnRatio, otherIn95, type SweepGround } from './sweep.ts'

/** Largest tolerance that the limits look at, arcminutes. */
export const LARGEST_TOLERANCE_ARCMIN = 300

/** A tolerance in arcminutes, or why there is none. */
export type LimitValue = { arcmin: number } | { reason: LimitReason }

/** `never`: at no tolerance from 0 to 5°; `always`: at 5° still; `outside`: the date is not wholly in the window. */
export type LimitReason = 'never' | 'always' | 'outside'

/** Tolerances at which a condition is tried before its change is narrowed down: 0, then 0.25′ to 300′. */
const SCAN = [
  0,
  ...Array.from({ length: 50 }, (_, i) => 0.25 * (LARGEST_TOLERANCE_ARCMIN / 0.25) ** (i / 49)),
]
const PRECISION_ARCMIN = 0.005

/** The largest tolerance at which the asserted date beats an independent one by 3 to 1. */
export function ratio3Limit(ground: SweepGround, other: number): LimitValue {
  return lastWhere((tolerance) => (lnRatio(ground, other, tolerance) ?? -Infinity) >= Math.log(3))
}

/** The smallest tolerance from which the 95 % set holds the whole of an independent date. */
export function otherIn95Limit(ground: SweepGround, other: number): LimitValue {
  const { from, to } = ground.otherStretches[other]!
  const years = ground.window.years
  if (from < years[0]! || to > years.at(-1)!) return { reason: 'outside' }
  return inverse(lastWhere((tolerance) => !otherIn95(ground, other, tolerance)))
}

/** The smallest tolerance from which the lines tell less than half a bit about their date. */
export function halfBitLimit(ground: SweepGround): LimitValue {
  return inverse(lastWhere((tolerance) => bitsAt(ground, tolerance) >= 0.5))
}

/** The last tolerance at which a condition holds; `always` where it still does at the end of the scan. */
function lastWhere(condition: (toleranceArcmin: number) => boolean): LimitValue {
  const index = SCAN.findLastIndex(condition)
  if (index === -1) return { reason: 'never' }
  if (index === SCAN.length - 1) return { reason: 'always' }
  let low = SCAN[index]!
  let high = SCAN[index + 1]!
  while (high - low > PRECISION_ARCMIN) {
    const middle = (low + high) / 2
    if (condition(middle)) low = middle
    else high = middle
  }
  return { arcmin: (low + high) / 2 }
}

/** From where a condition ceases, read as from where its opposite begins. */
function inverse(last: LimitValue): LimitValue {
  if ('arcmin' in last) return last
  if (last.reason === 'always') return { reason: 'never' }
  return last.reason === 'never' ? { arcmin: 0 } : last
}
