import type { Table } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { alternativesTable } from '../tables/alternatives.ts'
import { assumptionsTable } from '../tables/assumptions.ts'
import { budgetTable } from '../tables/budget.ts'
import { checksTable } from '../tables/checks.ts'
import { datesTable } from '../tables/dates.ts'
import { eachLineTable } from '../tables/each-line.ts'
import { limitsTable } from '../tables/limits.ts'
import { linesTable } from '../tables/lines.ts'
import { premiseTable } from '../tables/premise.ts'
import { ratiosTable } from '../tables/ratios.ts'
import { reproductionTable } from '../tables/reproduction.ts'
import { secondWindowTable } from '../tables/second-window.ts'

/** What `::table{of="…"}` may name; a table without rows is left out. To add one, as with parts.ts. */
export const TABLES: Readonly<Record<string, (audit: Audit) => Table[]>> = {
  alternatives: alternativesTable,
  assumptions: assumptionsTable,
  budget: budgetTable,
  checks: checksTable,
  dates: datesTable,
  each_line: eachLineTable,
  limits: limitsTable,
  lines: linesTable,
  premise: premiseTable,
  ratios: ratiosTable,
  reproduction: reproductionTable,
  second_window: secondWindowTable,
}
