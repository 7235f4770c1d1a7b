import type { Table } from 'mdast'
import type { Audit, ImpliedDate } from '../../audit/audit.ts'
import { formatYear, formatYearRange } from '../../quantity/format-year.ts'
import { type Column, table } from '../nodes.ts'
import { impliedByOwnModel } from '../wording/implied-by-own-model.ts'
import { yearStep } from '../wording/year-step.ts'

interface Row {
  sightline: string
  date: ImpliedDate
}

/** Every date at which the target stood on the line, outside the window and in the future too. */
export function datesTable(audit: Audit): Table[] {
  const rows = impliedByOwnModel(audit).flatMap(({ sightline, dates }) =>
    dates.map((date): Row => ({ sightline, date })),
  )
  if (rows.length === 0) return []
  const sightline: Column<Row> = { head: 'Sightline', cell: (row) => row.sightline, width: 1.5 }
  return [
    table<Row>(
      [
        'Every date at which the target stands on the line, in the window and 10,000 years to either side. The ',
        '95 % dates take the builders’ work as exact and allow for the measurement and the sky alone.',
      ],
      [
        ...(audit.sightlines.length > 1 ? [sightline] : []),
        { head: 'Date', cell: ({ date }) => printDate(date), width: 1 },
        { head: '95 % dates', cell: ({ date }) => printInterval(date), width: 2 },
        { head: 'Where it falls', cell: ({ date }) => placeInTime(date), width: 2 },
      ],
      rows,
    ),
  ]
}

function printDate({ year, low95, high95 }: ImpliedDate): string {
  const isWide = low95 === null || high95 === null
  return formatYear(year, isWide ? 10 : yearStep(low95, high95))
}

function printInterval({ low95, high95 }: ImpliedDate): string {
  if (low95 === null || high95 === null) return 'runs into that of a neighbouring date'
  return formatYearRange(low95, high95, yearStep(low95, high95))
}

function placeInTime({ in_window, future }: ImpliedDate): string {
  const place = in_window ? 'in the window' : 'outside the window'
  return future ? `${place}, still to come` : place
}
