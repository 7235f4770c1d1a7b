import type { Table } from 'mdast'
import type { Audit, SecondWindow } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { table } from '../nodes.ts'
import { dateSets } from '../wording/date-sets.ts'
import { fixed } from '../wording/fixed.ts'

type Step = SecondWindow['steps'][number]

/** The same sweep in a second window, at the tolerances the first table prints. */
export function secondWindowTable(audit: Audit): Table[] {
  const { window, steps } = audit.second_window
  const printed = new Map(
    audit.sweep.steps.filter((step) => step.in_table).map((step) => [step.tolerance_arcmin, step]),
  )
  const rows = steps.filter((step) => printed.has(step.tolerance_arcmin))
  if (rows.length === 0) return []
  return [
    table<Step>(
      [`The same in a second window, ${window.printed}.`],
      [
        {
          head: 'Build tolerance',
          cell: (step) => formatArcmin(step.tolerance_arcmin),
          align: 'right',
          width: 1,
        },
        { head: '95 % dates', cell: (step) => dateSets(step.sets95, window), width: 3 },
        { head: 'Bits', cell: (step) => fixed(step.bits, 2), align: 'right', width: 0.7 },
        {
          head: 'Bits in the first window',
          cell: (step) => fixed(printed.get(step.tolerance_arcmin)!.bits, 2),
          align: 'right',
          width: 1,
        },
      ],
      rows,
    ),
  ]
}
