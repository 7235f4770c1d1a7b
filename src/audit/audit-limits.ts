import { halfBitLimit, type LimitValue, otherIn95Limit, ratio3Limit } from '../inference/limits.ts'
import type { Stretch, SweepGround } from '../inference/sweep.ts'
import type { Limit } from './audit.ts'
import type { SweepDates } from './audit-sweep.ts'
import {
  ALWAYS_TELLS,
  LEADS_ALWAYS,
  LEADS_NEVER,
  NEVER_HELD,
  NO_OTHER,
  OUTSIDE,
  OVERLAPS,
} from './limit-reasons.ts'
import { centimetres, type Marker } from './measures.ts'
import { leadsAt } from './outcome.ts'

/** The three limits, one row for each independent date; one row without a date where the claim names none. */
export function auditLimits(ground: SweepGround, { asserted, others }: SweepDates, marker: Marker): Limit[] {
  const halfBit = halfBitLimit(ground)
  const row = (against: string | null, overlapping: boolean, ratio3: Told, otherIn95: Told): Limit => ({
    against,
    overlaps: overlapping,
    ratio_3_arcmin: ratio3.arcmin,
    ratio_3_steady: ratio3.steady ?? null,
    other_date_in_95_arcmin: otherIn95.arcmin,
    half_bit_arcmin: arcminOf(halfBit),
    ratio_3_cm: cmOf(ratio3.arcmin, marker),
    other_date_in_95_cm: cmOf(otherIn95.arcmin, marker),
    half_bit_cm: cmOf(arcminOf(halfBit), marker),
    ratio_3_reason: ratio3.reason,
    other_date_in_95_reason: otherIn95.reason,
    half_bit_reason: 'arcmin' in halfBit ? null : ALWAYS_TELLS,
  })
  const missing = { arcmin: null, reason: NO_OTHER }
  if (others.length === 0) return [row(null, false, missing, missing)]
  return others.map((other, i) => {
    const same = isSameDate(asserted, other)
    const ratio3 = ratio3Of(ground, i)
    const told = same && ratio3.arcmin === null ? { ...ratio3, reason: OVERLAPS } : ratio3
    return row(other.label, same, told, otherIn95Of(ground, i))
  })
}

/** A limit's value, or why it has none. */
interface Told {
  arcmin: number | null
  reason: string | null
  steady?: boolean
}

function ratio3Of(ground: SweepGround, other: number): Told {
  const limit = ratio3Limit(ground, other)
  if ('arcmin' in limit) {
    return { arcmin: limit.arcmin, reason: null, steady: leadsThroughout(ground, other, limit.arcmin) }
  }
  return { arcmin: null, reason: limit.reason === 'always' ? LEADS_ALWAYS : LEADS_NEVER }
}

/** Tolerances below a limit at which the lead is looked at again, as shares of it. */
const SHARES = [0, 0.02, 0.05, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9]

/** The ratio may rise before it falls: then the lead below the limit is not one at every tolerance. */
function leadsThroughout(ground: SweepGround, other: number, limitArcmin: number): boolean {
  return SHARES.every((share) => leadsAt(ground, other, share * limitArcmin))
}

function otherIn95Of(ground: SweepGround, other: number): Told {
  const limit = otherIn95Limit(ground, other)
  if ('arcmin' in limit) return { arcmin: limit.arcmin, reason: null }
  return { arcmin: null, reason: limit.reason === 'outside' ? OUTSIDE : NEVER_HELD }
}

/** Whether half or more of the shorter of two dates lies in the other. */
function isSameDate(a: Stretch, b: Stretch): boolean {
  const common = Math.min(a.to, b.to) - Math.max(a.from, b.from)
  if (common < 0) return false
  const shorter = Math.min(a.to - a.from, b.to - b.from)
  return shorter === 0 || common >= shorter / 2
}

function arcminOf(limit: LimitValue): number | null {
  return 'arcmin' in limit ? limit.arcmin : null
}

function cmOf(arcmin: number | null, marker: Marker): number | null {
  return arcmin === null ? null : centimetres(arcmin, marker)
}
