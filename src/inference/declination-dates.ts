import { findRoot } from './find-root.ts'

const STEP = 10

/**
 * Years of a stretch in which an obliquity model takes a value, ascending: the dates of a solstice declination.
 *
 * @param obliquityDeg The model, degrees at a Julian epoch.
 */
export function yearsOfObliquity(
  valueDeg: number,
  obliquityDeg: (year: number) => number,
  from: number,
  to: number,
): number[] {
  const excess = (year: number) => obliquityDeg(year) - valueDeg
  const steps = Math.max(1, Math.ceil((to - from) / STEP))
  const years = Array.from({ length: steps + 1 }, (_, i) => from + ((to - from) * i) / steps)
  return years.slice(1).flatMap((after, i) => {
    const before = years[i]!
    return excess(before) < 0 === excess(after) < 0 ? [] : [findRoot(excess, before, after, 1e-4)]
  })
}
