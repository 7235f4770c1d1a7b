import { compare } from './comparison.ts'
import type { Sight } from './sight.ts'
import type { Stretch } from './sweep.ts'
import { squaredDeviation } from './weight.ts'

/** How well lines built exactly fit a stretch of dates: at the year in which they fit best. */
export interface Fit {
  year: number
  /** Squared deviation, with the χ² distribution of as many degrees of freedom as there are lines. */
  squared: number
}

/** Steps in which a stretch is looked through, years. */
const STEP = 5

/** How closely the best year is found, years: a star that moves 1′ a year is then off by 0.6″. */
const PRECISION = 0.01

/** The year of a stretch in which lines fit their targets best, all together. */
export function bestFit(sights: readonly Sight[], { from, to }: Stretch, step = STEP): Fit {
  const fitIn = (year: number): Fit => ({
    year,
    squared: squaredDeviation(
      sights.map((sight) => sight.branches.map((branch) => compare(sight, branch, year))),
    ),
  })
  const better = (a: Fit, b: Fit) => (b.squared < a.squared ? b : a)
  const steps = to > from ? Math.max(20, Math.ceil((to - from) / step)) : 0
  let best: Fit = { year: (from + to) / 2, squared: Infinity }
  for (let i = 0; i <= steps; i++) {
    best = better(best, fitIn(steps === 0 ? from : from + ((to - from) * i) / steps))
  }
  if (steps === 0 || best.squared === Infinity) return best
  // Between two steps a fast star may stand on the line and be well off it at both.
  for (let width = (to - from) / steps / 2; width > PRECISION; width /= 2) {
    const { year } = best
    if (year - width >= from) best = better(best, fitIn(year - width))
    if (year + width <= to) best = better(best, fitIn(year + width))
  }
  return best
}

/**
 * Whether a fit is within what 95 % of true ones show: the quantile of χ² by Wilson & Hilferty 1931 (good to 1 % from
 * two degrees of freedom on; 3.84 for one).
 */
export function isFit({ squared }: Fit, lines: number): boolean {
  const share = 2 / (9 * lines)
  const quantile = lines === 1 ? 3.841 : lines * (1 - share + 1.6449 * Math.sqrt(share)) ** 3
  return squared <= quantile
}
