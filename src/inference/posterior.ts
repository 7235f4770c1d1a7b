import { type DateSample, lnWeights } from './date-sample.ts'

/** A density over dates, per year, straight between its nodes. */
export interface Posterior {
  years: Float64Array
  cells: Float64Array
  density: Float64Array
}

/** Posterior over the sample's window for a uniform prior; null where no date has any weight. */
export function posterior(sample: DateSample, toleranceDeg: number): Posterior | null {
  const logs = lnWeights(sample, toleranceDeg)
  const top = logs.reduce((a, b) => Math.max(a, b), -Infinity)
  if (top === -Infinity) return null
  const density = logs.map((ln) => Math.exp(ln - top))
  const mass = density.reduce((sum, d, i) => sum + d * sample.cells[i]!, 0)
  return {
    years: sample.years,
    cells: sample.cells,
    density: density.map((d) => d / mass),
  }
}

/**
 * Kullback-Leibler divergence from the uniform prior to the posterior, in bits: 0 says nothing, 1 halves the window.
 * Source: Kullback & Leibler 1951, Ann. Math. Stat. 22, 79.
 */
export function bits({ density, cells }: Posterior): number {
  const window = cells.reduce((sum, c) => sum + c, 0)
  const sum = density.reduce((s, d, i) => (d > 0 ? s + d * cells[i]! * Math.log2(d * window) : s), 0)
  return Math.max(0, sum)
}
