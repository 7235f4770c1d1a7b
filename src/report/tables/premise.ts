import type { Table } from 'mdast'
import type { Audit, SweepStep } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { table } from '../nodes.ts'
import { dateSets, EDGE } from '../wording/date-sets.ts'
import { fixed } from '../wording/fixed.ts'
import { lineOrLines } from '../wording/line-or-lines.ts'
import { markerPlace } from '../wording/marker-place.ts'
import { sunWidths } from '../wording/sun-widths.ts'

/** What the line tells of its date, by build tolerance. */
export function premiseTable(audit: Audit): Table[] {
  const { window, steps } = audit.sweep
  const rows = steps.filter((step) => step.in_table)
  if (rows.length === 0) return []
  const isCut = rows.some((step) =>
    `${dateSets(step.sets95, window)}${dateSets(step.sets68, window)}`.includes(EDGE),
  )
  const caption = [
    `What ${lineOrLines(audit, 'the line tells', 'the lines tell')} of the date, by build tolerance, `,
    `within the window ${window.printed}.`,
    isCut ? ` ${EDGE}: the window cuts the set off here.` : '',
  ]
  return [
    table<SweepStep>(
      caption,
      [
        {
          head: 'Build tolerance',
          cell: (step) => formatArcmin(step.tolerance_arcmin),
          align: 'right',
          width: 1,
        },
        { head: markerPlace(audit), cell: (step) => formatCm(step.tolerance_cm), align: 'right', width: 1 },
        {
          head: 'Sun’s widths',
          cell: (step) => sunWidths(step.tolerance_sun_widths),
          align: 'right',
          width: 0.8,
        },
        { head: '95 % dates', cell: (step) => dateSets(step.sets95, window), width: 2.7 },
        { head: '68 % dates', cell: (step) => dateSets(step.sets68, window), width: 3.6 },
        { head: 'Bits', cell: (step) => fixed(step.bits, 2), align: 'right', width: 0.7 },
      ],
      rows,
    ),
  ]
}
