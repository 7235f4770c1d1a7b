import { type Comparison, compare } from './comparison.ts'
import type { Sight } from './sight.ts'
import { lnWeight } from './weight.ts'

/** Dates at which lines have been held against their targets, and the stretch of years each stands for. */
export interface DateSample {
  years: Float64Array
  /** Trapezoid weights, years. */
  cells: Float64Array
  /** For each date, each line and each branch of its target. */
  comparisons: readonly (readonly (readonly (Comparison | null)[])[])[]
}

/** Samples `[from, to]` at steps of at most `step` years; one date alone where both are equal. */
export function sampleDates(sights: readonly Sight[], from: number, to: number, step: number): DateSample {
  const intervals = to > from ? Math.max(8, Math.ceil((to - from) / step)) : 0
  const width = intervals === 0 ? 1 : (to - from) / intervals
  // The last year is `to` itself: from + n·width may round to a neighbour, and a set that ends there would look closed.
  const years = Float64Array.from({ length: intervals + 1 }, (_, i) =>
    i < intervals ? from + i * width : to,
  )
  const cells = new Float64Array(intervals + 1).fill(width)
  if (intervals > 0) {
    cells[0] = width / 2
    cells[intervals] = width / 2
  }
  const comparisons = Array.from(years, (year) =>
    sights.map((sight) => sight.branches.map((branch) => compare(sight, branch, year))),
  )
  return { years, cells, comparisons }
}

/** ln of the weight at each date, up to one constant. */
export function lnWeights(sample: DateSample, toleranceDeg: number): Float64Array {
  return Float64Array.from(sample.comparisons, (comparisons) => lnWeight(comparisons, toleranceDeg))
}

/** ln of the average weight over the sample's stretch, up to the same constant; −∞ where there is none. */
export function lnAverageWeight(sample: DateSample, toleranceDeg: number): number {
  const logs = lnWeights(sample, toleranceDeg)
  const top = logs.reduce((a, b) => Math.max(a, b), -Infinity)
  if (top === -Infinity) return -Infinity
  let sum = 0
  let years = 0
  logs.forEach((ln, i) => {
    sum += Math.exp(ln - top) * sample.cells[i]!
    years += sample.cells[i]!
  })
  return top + Math.log(sum / years)
}
