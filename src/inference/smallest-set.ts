import type { Posterior } from './posterior.ts'

export type Interval = readonly [from: number, to: number]

/**
 * The smallest set of dates that holds a share of the probability: the union of intervals in which the density,
 * straight between its nodes, is above the threshold that leaves just that share.
 */
export function smallestSet(posterior: Posterior, share: number): Interval[] {
  return intervalsAbove(posterior, thresholdOf(posterior, share))
}

/** Closeness of the mass to the share at which the search for the threshold ends. */
const MASS_PRECISION = 1e-9

/** By the Illinois variant of the false position (Dowell & Jarratt 1971): the mass falls as the threshold rises. */
function thresholdOf(posterior: Posterior, share: number): number {
  let low = 0
  let high = posterior.density.reduce((a, b) => Math.max(a, b), 0)
  let excessLow = massAbove(posterior, low) - share
  let excessHigh = -share
  let side = 0
  for (let i = 0; i < 60; i++) {
    const threshold = low + ((high - low) * excessLow) / (excessLow - excessHigh)
    const excess = massAbove(posterior, threshold) - share
    if (Math.abs(excess) < MASS_PRECISION) return threshold
    if (excess > 0) {
      low = threshold
      excessLow = excess
      // Twice on one side: lean towards the other, or that end would never move.
      if (side === 1) excessHigh /= 2
      side = 1
    } else {
      high = threshold
      excessHigh = excess
      if (side === -1) excessLow /= 2
      side = -1
    }
  }
  return low
}

/** Whether a set holds a whole stretch of dates in one of its intervals. */
export function holds(set: readonly Interval[], from: number, to: number): boolean {
  return set.some(([low, high]) => low <= from && to <= high)
}

function massAbove({ years, density }: Posterior, threshold: number): number {
  let mass = 0
  for (let i = 1; i < years.length; i++) {
    const width = years[i]! - years[i - 1]!
    const upper = Math.max(density[i]!, density[i - 1]!)
    const lower = Math.min(density[i]!, density[i - 1]!)
    if (lower >= threshold) mass += (width * (lower + upper)) / 2
    else if (upper > threshold) {
      const part = (upper - threshold) / (upper - lower)
      mass += (part * width * (upper + threshold)) / 2
    }
  }
  return mass
}

function intervalsAbove({ years, density }: Posterior, threshold: number): Interval[] {
  const intervals: Interval[] = []
  let start: number | null = density[0]! >= threshold ? years[0]! : null
  for (let i = 1; i < years.length; i++) {
    const before = density[i - 1]! - threshold
    const after = density[i]! - threshold
    if (before >= 0 === after >= 0) continue
    const crossing = years[i - 1]! + ((years[i]! - years[i - 1]!) * before) / (before - after)
    if (start === null) start = crossing
    else {
      intervals.push([start, crossing])
      start = null
    }
  }
  if (start !== null) intervals.push([start, years.at(-1)!])
  return intervals
}
