import type { BlockContent } from 'mdast'
import type { Audit, BudgetCheck } from '../../audit/audit.ts'
import { formatNumber } from '../../quantity/format-number.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { paragraph } from '../nodes.ts'
import { fixed } from '../wording/fixed.ts'

/** The budget's sum by its two routes, and where they part and why. */
export function budgetCheckPart({ budget_check }: Audit): BlockContent[] {
  return budget_check === null ? [] : [paragraph(sentences(budget_check))]
}

function sentences({ year, linear_sd, sampled_sd, no_date_share, agree }: BudgetCheck): string {
  const around = formatYear(year, 10)
  const sum = `Taken together these make ${formatNumber(linear_sd, 2)} years, one standard deviation about ${around}.`
  if (sampled_sd === null) {
    return `${sum} Drawn at random from the same errors, the line has no date at all: trust the sets of dates above.`
  }
  const sums = `${sum} Drawn at random from the same errors, again and again, the date scatters by ${formatNumber(sampled_sd, 2)} years`
  if (agree) return `${sums}: the two routes agree.`
  const lost = no_date_share > 0 ? `, and in ${share(no_date_share)} of the draws no date fits at all` : ''
  return `${sums}${lost}. The two part because the track bends there, which a sum of separate effects cannot follow: trust the sets of dates above.`
}

function share(part: number): string {
  return part < 0.005 ? 'under 1 %' : `${fixed(part * 100, 0)} %`
}
