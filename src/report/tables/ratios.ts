import type { Table } from 'mdast'
import type { Audit, Ratio, SweepStep } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { type Column, table } from '../nodes.ts'
import { lineOrLines } from '../wording/line-or-lines.ts'
import { ratioFigure } from '../wording/ratio-figure.ts'

/** How the asserted date fares against each independent one, by build tolerance. */
export function ratiosTable(audit: Audit): Table[] {
  const rows = audit.sweep.steps.filter((step) => step.in_table)
  if (audit.other_dates.length === 0 || rows.length === 0) return []
  const against = audit.other_dates.map(
    (date): Column<SweepStep> => ({
      head: `Against ${date.label}`,
      cell: (step) => ratioCell(step.ratios.find((ratio) => ratio.against === date.label)),
      width: 5,
    }),
  )
  return [
    table<SweepStep>(
      [
        `How many times better the asserted date (${audit.asserted.printed}) fits ${lineOrLines(audit, 'the line', 'the lines')} `,
        'than each independent date does; a figure below 1 favours the independent date. The words are those of Kass & Raftery (1995).',
        audit.outcome === 'none' || audit.outcome === 'missed'
          ? ' Where neither date fits, the figure only compares misses.'
          : '',
      ],
      [
        {
          head: 'Build tolerance',
          cell: (step) => formatArcmin(step.tolerance_arcmin),
          align: 'right',
          width: audit.other_dates.length > 2 ? 3 : 1,
        },
        ...against,
      ],
      rows,
    ),
  ]
}

function ratioCell(ratio: Ratio | undefined): string {
  if (!ratio) return 'not computed'
  const figure = ratioFigure(ratio)
  return figure === null ? ratio.words : `${figure}: ${ratio.words}`
}
