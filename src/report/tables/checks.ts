import type { Table } from 'mdast'
import type { Audit, Check } from '../../audit/audit.ts'
import { table } from '../nodes.ts'

/** The claimant's arithmetic, step by step. */
export function checksTable(audit: Audit): Table[] {
  if (audit.checks.length === 0) return []
  return [
    table<Check>(
      ['Each step redone from the results printed for the steps before it.'],
      [
        { head: 'Step', cell: (check) => check.step, width: 2 },
        { head: 'As printed', cell: (check) => check.printed, width: 1.5 },
        { head: 'Recomputed', cell: (check) => check.ours_printed, width: 1.5 },
        { head: 'Difference', cell: (check) => check.difference_printed, width: 1.2 },
        { head: 'Result', cell: (check) => check.verdict, width: 1.5 },
      ],
      audit.checks,
    ),
  ]
}
