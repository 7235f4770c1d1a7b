import type { Table } from 'mdast'
import type { Audit, BudgetRow } from '../../audit/audit.ts'
import { formatNumber } from '../../quantity/format-number.ts'
import { table } from '../nodes.ts'
import { fixed } from '../wording/fixed.ts'

/** What makes the date uncertain at no build tolerance, source by source. */
export function budgetTable(audit: Audit): Table[] {
  if (audit.budget.length === 0) return []
  const ofWhich = audit.sightlines.length > 1 ? ` on ${audit.sightlines[0]!.name}` : ''
  return [
    table<BudgetRow>(
      [
        `Standard deviations of the implied date nearest the asserted one${ofWhich}, the builders’ work taken as exact.`,
      ],
      [
        { head: 'Source', cell: (row) => row.source, width: 4 },
        { head: 'Years', cell: (row) => printYears(row.sd), align: 'right', width: 1 },
        {
          head: 'Share of the variance',
          cell: (row) => printShare(row.share),
          align: 'right',
          width: 1,
        },
      ],
      audit.budget,
    ),
  ]
}

function printYears(sd: number): string {
  return sd < 0.5 ? 'under 1' : formatNumber(sd, 2)
}

function printShare(share: number): string {
  return share < 0.005 ? 'under 1 %' : `${fixed(share * 100, 0)} %`
}
