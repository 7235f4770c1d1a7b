import { dateBudget } from '../inference/budget.ts'
import { sampleDate } from '../inference/sampled-date.ts'
import type { BudgetCheck, BudgetRow } from './audit.ts'
import { nearestBranch } from './nearest-branch.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** Where the uncertainty of a date comes from when the line was built exactly, largest first. */
export function auditBudget(inputs: SightlineInputs, year: number): BudgetRow[] {
  const sight = sightOf(inputs)
  return dateBudget(sight, nearestBranch(sight, year), year)
}

/** The sum of a budget, and the same by draws over a stretch of years. */
export function auditBudgetCheck(
  inputs: SightlineInputs,
  year: number,
  rows: readonly BudgetRow[],
  { from, to }: { from: number; to: number },
): BudgetCheck {
  const linear = Math.hypot(...rows.map((row) => row.sd))
  const sight = sightOf(inputs)
  const { sd, noDateShare } = sampleDate(sight, nearestBranch(sight, year), year, from, to)
  return {
    year,
    linear_sd: linear,
    sampled_sd: sd,
    no_date_share: noDateShare,
    agree: sd !== null && noDateShare === 0 && Math.abs(sd / linear - 1) < 0.1,
  }
}
