import type { Table } from 'mdast'
import type { Audit, Reproduction } from '../../audit/audit.ts'
import { groupThousands } from '../../quantity/format-number.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { type Column, table } from '../nodes.ts'
import { bodiesOf } from '../wording/bodies.ts'

/** The date that each model of obliquity or precession gives, and where that leaves its author's stated range. */
export function reproductionTable(audit: Audit): Table[] {
  if (audit.reproduction.length === 0) return []
  const isMixed = new Set(audit.reproduction.map((row) => `${row.from} ${row.sightline}`)).size > 1
  const origin = isMixed ? '' : ` from the ${audit.reproduction[0]!.from},`
  const from: Column<Reproduction> = { head: 'From', cell: (row) => printOrigin(row, audit), width: 1.5 }
  return [
    table<Reproduction>(
      [
        `The date nearest the asserted one (${audit.asserted.printed}),${origin} by each model${ofWhat(audit)}.`,
      ],
      [
        ...(isMixed ? [from] : []),
        { head: modelHead(audit), cell: (row) => row.label, width: 1.2 },
        { head: 'Date', cell: ({ year }) => (year === null ? 'none' : formatYear(year)), width: 1 },
        {
          head: 'Against the asserted date',
          cell: (row) => printDifference(row.difference_years),
          width: 1.2,
        },
        {
          head: 'Against this audit’s model',
          cell: (row) => printDifference(row.model_error_years),
          width: 1.2,
        },
        { head: 'Range of the model', cell: printRange, width: 2.8 },
      ],
      audit.reproduction,
    ),
  ]
}

function ofWhat(audit: Audit): string {
  const { tilt, stars } = bodiesOf(audit)
  return [tilt ? ' of the Earth’s tilt' : '', stars ? ' of precession' : ''].filter(Boolean).join(' or')
}

function modelHead(audit: Audit): string {
  const { tilt, stars } = bodiesOf(audit)
  if (tilt && stars) return 'Model'
  return stars ? 'Precession after' : 'Obliquity after'
}

function printOrigin({ from, sightline }: Reproduction, { sightlines }: Audit): string {
  if (sightlines.length === 1) return from
  return from === 'sightline' ? sightline : `${sightline}, ${from}`
}

function printDifference(years: number | null): string {
  if (years === null) return '–'
  const whole = Math.round(Math.abs(years))
  if (whole === 0) return 'none'
  const count = `${groupThousands(String(whole))} ${whole === 1 ? 'year' : 'years'}`
  return `${count} ${years > 0 ? 'later' : 'earlier'}`
}

function printRange({ model_range, within_model_range, reason }: Reproduction): string {
  if (reason !== null) return `${model_range}; ${reason}`
  return within_model_range === false ? `${model_range}; the date lies outside` : model_range
}
