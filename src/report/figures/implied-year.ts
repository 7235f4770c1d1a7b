import type { ImpliedDate } from '../../audit/audit.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { yearStep } from '../wording/year-step.ts'

/** An implied date to as many years as its uncertainty is worth printing. */
export function impliedYear({ year, low95, high95 }: ImpliedDate): string {
  return formatYear(year, low95 === null || high95 === null ? 10 : yearStep(low95, high95))
}
