import { halfBitLimit } from '../inference/limits.ts'
import type { Sight } from '../inference/sight.ts'
import { sweepPoint } from '../inference/sweep.ts'
import { formatYearRange } from '../quantity/format-year.ts'
import type { SecondWindow, Window } from './audit.ts'
import { groundOf, type SweepDates } from './audit-sweep.ts'
import { DEFAULTS } from './defaults.ts'

/** The oldest year that a claim's window may hold. */
const WIDEST_FROM = -29_999

/** Bits and sets over another window: the default one where the claim gives its own, else a narrower one. */
export function auditSecondWindow(
  sights: readonly Sight[],
  dates: SweepDates,
  tolerancesArcmin: readonly number[],
): SecondWindow {
  const window = windowOf(isDefault(dates.window) ? another(dates) : DEFAULTS.window)
  const ground = groundOf(sights, { ...dates, window })
  const limit = halfBitLimit(ground)
  return {
    window,
    half_bit_arcmin: 'arcmin' in limit ? limit.arcmin : null,
    steps: tolerancesArcmin.map((tolerance) => {
      const { bits, sets95 } = sweepPoint(ground, tolerance)
      return { tolerance_arcmin: tolerance, bits, sets95 }
    }),
  }
}

function isDefault({ from, to }: Window): boolean {
  return from === DEFAULTS.window.from && to === DEFAULTS.window.to
}

/** A narrower window, or where the claim's dates leave no room for one a wider. */
function another(dates: SweepDates): { from: number; to: number } {
  const narrow = narrower(dates)
  return narrow.from > dates.window.from ? narrow : { from: WIDEST_FROM, to: dates.window.to }
}

/** Every date the claim names, with a fifth of their span to the window's end to spare, in whole thousands. */
function narrower({ window, asserted, others }: SweepDates): { from: number; to: number } {
  const oldest = Math.min(asserted.from, ...others.map(({ from }) => from))
  const from = Math.round((oldest - (window.to - oldest) / 5) / 1000) * 1000
  return { from: Math.max(window.from, Math.min(from, oldest)), to: window.to }
}

function windowOf({ from, to }: { from: number; to: number }): Window {
  return { from, to, printed: formatYearRange(from, to), stated: false }
}
