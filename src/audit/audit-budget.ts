import { dateBudget } from '../inference/budget.ts'
import { sampleDate } from '../inference/sampled-date.ts'
import { modelSpreadSdDeg, NUTATION_SD_DEG } from '../sky/solstice-declination.ts'
import { sunSemidiameter } from '../sky/sun.ts'
import type { BudgetCheck, BudgetRow } from './audit.ts'
import { refractionAtHorizon, type SightlineInputs, sightOf } from './sightline-inputs.ts'

/** Where the uncertainty of a date comes from when the line was built exactly, largest first. */
export function auditBudget(inputs: SightlineInputs, year: number): BudgetRow[] {
  const { perDegree } = refractionAtHorizon(inputs)
  return dateBudget(sightOf(inputs), year, [
    { source: 'direction of the line', of: 'azimuth', sdDeg: inputs.azimuthSdDeg },
    { source: 'the plan’s north', of: 'azimuth', sdDeg: inputs.northSdDeg },
    { source: 'altitude of the horizon', of: 'altitude', sdDeg: inputs.horizonSdDeg * (1 - perDegree / 60) },
    { source: 'refraction of the day', of: 'altitude', sdDeg: inputs.refractionSdArcmin / 60 },
    { source: 'the Sun’s size', of: 'altitude', sdDeg: sunSemidiameter(year, inputs.event).sdArcmin / 60 },
    { source: 'model of the obliquity', of: 'declination', sdDeg: modelSpreadSdDeg(year) },
    { source: 'nutation', of: 'declination', sdDeg: NUTATION_SD_DEG },
  ]).filter((row) => row.sd > 0)
}

/** The sum of a budget, and the same by draws over a stretch of years. */
export function auditBudgetCheck(
  inputs: SightlineInputs,
  year: number,
  rows: readonly BudgetRow[],
  { from, to }: { from: number; to: number },
): BudgetCheck {
  const linear = Math.hypot(...rows.map((row) => row.sd))
  const { sd, noDateShare } = sampleDate(sightOf(inputs), year, from, to)
  return {
    year,
    linear_sd: linear,
    sampled_sd: sd,
    no_date_share: noDateShare,
    agree: noDateShare === 0 && Math.abs(sd / linear - 1) < 0.1,
  }
}
