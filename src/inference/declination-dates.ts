import { findRoot } from './find-root.ts'

const STEP = 10

/**
 * Years of a stretch in which a target's declination takes a value, ascending.
 *
 * @param declinationDeg Of the target, degrees at a Julian epoch; null where it has none.
 */
export function yearsOfDeclination(
  valueDeg: number,
  declinationDeg: (year: number) => number | null,
  from: number,
  to: number,
): number[] {
  const excess = (year: number) => (declinationDeg(year) ?? Number.NaN) - valueDeg
  const steps = Math.max(1, Math.ceil((to - from) / STEP))
  const years = Array.from({ length: steps + 1 }, (_, i) => from + ((to - from) * i) / steps)
  return years.slice(1).flatMap((after, i) => {
    const before = years[i]!
    // Comparisons with a year that has no declination are false: no root is looked for there.
    return excess(before) * excess(after) <= 0 && excess(after) !== 0
      ? [findRoot(excess, before, after, 1e-4)]
      : []
  })
}
