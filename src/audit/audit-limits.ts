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

/** The three limits, one row for each independent date; one row without a date where the claim names none. */
export function auditLimits(ground: SweepGround, { asserted, others }: SweepDates, marker: Marker): Limit[] {
  const halfBit = halfBitLimit(ground)
  const row = (against: string | null, ratio3: Told, otherIn95: Told): Limit => ({
    against,
    ratio_3_arcmin: ratio3.arcmin,
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
  if (others.length === 0) return [row(null, missing, missing)]
  return others.map((other, i) => {
    const ratio3 = overlaps(asserted, other) ? { arcmin: null, reason: OVERLAPS } : ratio3Of(ground, i)
    return row(other.label, ratio3, otherIn95Of(ground, i))
  })
}

/** A limit's value, or why it has none. */
interface Told {
  arcmin: number | null
  reason: string | null
}

function ratio3Of(ground: SweepGround, other: number): Told {
  const limit = ratio3Limit(ground, other)
  if ('arcmin' in limit) return { arcmin: limit.arcmin, reason: null }
  return { arcmin: null, reason: limit.reason === 'always' ? LEADS_ALWAYS : LEADS_NEVER }
}

function otherIn95Of(ground: SweepGround, other: number): Told {
  const limit = otherIn95Limit(ground, other)
  if ('arcmin' in limit) return { arcmin: limit.arcmin, reason: null }
  return { arcmin: null, reason: limit.reason === 'outside' ? OUTSIDE : NEVER_HELD }
}

function overlaps(a: Stretch, b: Stretch): boolean {
  return a.from <= b.to && b.from <= a.to
}

function arcminOf(limit: LimitValue): number | null {
  return 'arcmin' in limit ? limit.arcmin : null
}

function cmOf(arcmin: number | null, marker: Marker): number | null {
  return arcmin === null ? null : centimetres(arcmin, marker)
}
