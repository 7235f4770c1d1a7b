import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { trimZeros } from '../../quantity/format-number.ts'
import { textWidth } from './text-width.ts'
import type { Tick } from './year-ticks.ts'

/** People read 1′ 2′ 5′ 10′ 20′ 30′ and then degrees. */
const ARCMINUTES = [
  0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 30, 60, 120, 300, 600, 1200, 2700, 5400, 10_800,
]

export function toleranceTicks(from: number, to: number): Tick[] {
  return inside(ARCMINUTES, from, to).map((at) => ({ at, label: formatArcmin(at) }))
}

export function lengthTicks(fromCm: number, toCm: number): Tick[] {
  return oneTwoFive(fromCm, toCm).map((at) => ({ at, label: formatCm(at) }))
}

/** A plain number: `0.05`, `2`. */
export function ratioTicks(from: number, to: number): Tick[] {
  return oneTwoFive(from, to).map((at) => ({ at, label: trimZeros(at, 1) }))
}

/** Leaves out, from the left, ticks whose labels come too near to one already kept, or reach beyond `until`. */
export function keepLegible(
  ticks: readonly Tick[],
  position: (at: number) => number,
  size: number,
  until = Number.POSITIVE_INFINITY,
): Tick[] {
  const kept: Tick[] = []
  let edge = Number.NEGATIVE_INFINITY
  for (const tick of ticks) {
    const half = textWidth(tick.label, size) / 2
    const middle = position(tick.at)
    if (middle - half < edge + 4 || middle + half > until) continue
    kept.push(tick)
    edge = middle + half
  }
  return kept
}

function oneTwoFive(from: number, to: number): number[] {
  if (!(from > 0 && to > from)) return []
  const decades: number[] = []
  for (let power = Math.floor(Math.log10(from)); power <= Math.ceil(Math.log10(to)); power++)
    decades.push(power)
  return inside(
    // Through the decimal text, so that 2e-1 is 0.2 itself.
    decades.flatMap((power) => [1, 2, 5].map((digit) => Number(`${digit}e${power}`))),
    from,
    to,
  )
}

function inside(values: readonly number[], from: number, to: number): number[] {
  return values.filter((value) => value >= from * (1 - 1e-9) && value <= to * (1 + 1e-9))
}
