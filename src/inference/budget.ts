import { driftDegPerYear } from './implied-dates.ts'
import type { Branch, Sight } from './sight.ts'

export interface BudgetShare {
  source: string
  /** Standard deviation of the date, years. */
  sd: number
  /** Of the variance, 0 to 1. */
  share: number
}

/** What the error of the measurement is called. */
const MEASURED: Readonly<Record<Sight['measures'], string>> = {
  azimuth: 'direction of the line',
  altitude: 'altitude measured',
  angle: 'angle between the lines',
}

/**
 * The linear budget of a date (JCGM 100:2008, section 5): the effect of each source of error on the direction, over
 * the movement of the target. Largest first; empty where the target is level or not to be seen, where no linear
 * budget exists.
 */
export function dateBudget(sight: Sight, branch: Branch, year: number): BudgetShare[] {
  const prediction = branch.predict(year)
  const drift = driftDegPerYear(sight, branch, year)
  if (prediction === null || drift === null || drift === 0) return []
  const sources = [
    { source: MEASURED[sight.measures], effectDeg: sight.measuredSdDeg },
    {
      source: sight.northOf === 'grid' ? 'the grid’s north' : 'the plan’s north',
      effectDeg: sight.northSdDeg,
    },
    ...prediction.errors,
  ]
  // What one source does in several ways, as a star's place in two coordinates, is one row.
  const bySource = new Map<string, number>()
  for (const { source, effectDeg } of sources) {
    bySource.set(source, Math.hypot(bySource.get(source) ?? 0, effectDeg / drift))
  }
  const rows = [...bySource].map(([source, sd]) => ({ source, sd })).filter(({ sd }) => sd > 0)
  const variance = rows.reduce((sum, row) => sum + row.sd ** 2, 0)
  return rows.map((row) => ({ ...row, share: row.sd ** 2 / variance })).sort((a, b) => b.sd - a.sd)
}
