import { dateBudget } from '../inference/budget.ts'
import { sampleDate } from '../inference/sampled-date.ts'
import type { Branch } from '../inference/sight.ts'
import { wrap180 } from '../quantity/degrees.ts'
import type { BudgetCheck, BudgetRow } from './audit.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** Where the uncertainty of a date comes from when the line was built exactly, largest first. */
export function auditBudget(inputs: SightlineInputs, year: number): BudgetRow[] {
  return dateBudget(sightOf(inputs), branchAt(inputs, year), year)
}

/** The sum of a budget, and the same by draws over a stretch of years. */
export function auditBudgetCheck(
  inputs: SightlineInputs,
  year: number,
  rows: readonly BudgetRow[],
  { from, to }: { from: number; to: number },
): BudgetCheck {
  const linear = Math.hypot(...rows.map((row) => row.sd))
  const { sd, noDateShare } = sampleDate(sightOf(inputs), branchAt(inputs, year), year, from, to)
  return {
    year,
    linear_sd: linear,
    sampled_sd: sd,
    no_date_share: noDateShare,
    agree: sd !== null && noDateShare === 0 && Math.abs(sd / linear - 1) < 0.1,
  }
}

/** The branch of the target that stands on the line in a year. */
function branchAt(inputs: SightlineInputs, year: number): Branch {
  const { branches, measuredDeg } = sightOf(inputs)
  const distance = (branch: Branch) => {
    const prediction = branch.predict(year)
    return prediction === null ? Infinity : Math.abs(wrap180(measuredDeg - prediction.directionDeg))
  }
  return branches.reduce((best, branch) => (distance(branch) < distance(best) ? branch : best))
}
