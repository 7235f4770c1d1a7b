import type { Branch, Sight } from '../inference/sight.ts'
import { wrap180 } from '../quantity/degrees.ts'

/** Of the courses of a target the one that stands nearest to the line in a year. */
export function nearestBranch({ branches, measuredDeg }: Sight, year: number): Branch {
  const distance = (branch: Branch) => {
    const prediction = branch.predict(year)
    return prediction === null ? Infinity : Math.abs(wrap180(measuredDeg - prediction.directionDeg))
  }
  return branches.reduce((best, branch) => (distance(branch) < distance(best) ? branch : best))
}
