import type { Table } from 'mdast'
import type { Alternative, Audit } from '../../audit/audit.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { type Column, type Phrase, table } from '../nodes.ts'

/** The claim with one open choice at a time made otherwise. */
export function alternativesTable(audit: Audit): Table[] {
  if (audit.alternatives.length === 0) return []
  const sightline: Column<Alternative> = { head: 'Sightline', cell: (row) => row.sightline, width: 1.2 }
  return [
    table<Alternative>(
      ['The claim read otherwise, one choice at a time, the builders’ work taken as exact.'],
      [
        ...(audit.sightlines.length > 1 ? [sightline] : []),
        { head: 'Choice', cell: (row) => row.choice, width: 1.5 },
        { head: 'Taken as', cell: printValue, width: 2 },
        { head: 'Nearest the asserted date', cell: (row) => printYear(row.nearest_year), width: 1.4 },
        { head: 'Other dates', cell: (row) => printOthers(row), width: 2 },
      ],
      audit.alternatives,
    ),
  ]
}

function printValue({ value, is_claims }: Alternative): Phrase[] {
  return is_claims ? [value, ' (as in this audit)'] : [value]
}

function printYear(year: number | null): string {
  return year === null ? 'no date' : formatYear(year, 10)
}

function printOthers({ years, nearest_year }: Alternative): string {
  const others = years.filter((year) => year !== nearest_year)
  return others.length === 0 ? '–' : others.map((year) => formatYear(year, 10)).join('; ')
}
