import type { Table } from 'mdast'
import type { Audit, SightlineAudit, Sweep, SweepStep } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { type Column, type Phrase, table } from '../nodes.ts'
import { dateSets } from '../wording/date-sets.ts'
import { fixed } from '../wording/fixed.ts'
import { impliedByOwnModel } from '../wording/implied-by-own-model.ts'
import { ratioFigure } from '../wording/ratio-figure.ts'

/** One line with its own sweep, or all of them with the joint one. */
interface Row {
  line: SightlineAudit | null
  sweep: Sweep
}

/** Of several lines each by itself, its own target, dates and weight; and all together. */
export function eachLineTable(audit: Audit): Table[] {
  const { sightlines, plausible, window } = audit
  const rows = sightlines.flatMap((line): Row[] => (line.sweep === null ? [] : [{ line, sweep: line.sweep }]))
  if (sightlines.length < 2 || rows.length === 0) return []
  const { low_arcmin: low, high_arcmin: high } = plausible
  const at = (sweep: Sweep, arcmin: number) =>
    sweep.steps.find(({ tolerance_arcmin }) => tolerance_arcmin === arcmin)
  return [
    table<Row>(
      [
        `Each line by itself, and all together, in the window ${window.printed}: the dates had it been built exactly, `,
        'and what is left at the plausible build tolerances.',
        audit.other_dates.length === 0
          ? ''
          : ' The ratio tells how many times better the asserted date fits than the independent one.',
      ],
      [
        { head: 'Sightline', cell: ({ line }) => line?.name ?? 'all together', width: 1.2 },
        { head: 'Target', cell: ({ line }) => line?.event ?? '–', width: 1.8 },
        { head: 'Built exactly', cell: (row) => exactDates(row, audit), width: 1.6 },
        {
          head: `95 % dates at ${formatArcmin(low)}`,
          cell: ({ sweep }) => sets(at(sweep, low), sweep),
          width: 2.2,
        },
        ...[low, high].map(
          (arcmin): Column<Row> => ({
            head: `Bits at ${formatArcmin(arcmin)}`,
            cell: ({ sweep }) => bits(at(sweep, arcmin)),
            align: 'right',
            width: 0.75,
          }),
        ),
        ...ratioColumns(audit, low, at),
      ],
      [...rows, { line: null, sweep: audit.sweep }],
    ),
  ]
}

function exactDates({ line, sweep }: Row, audit: Audit): Phrase {
  if (line === null) return sets(sweep.steps[0], sweep)
  const implied = impliedByOwnModel(audit).find(({ sightline }) => sightline === line.name)
  const years = (implied?.dates ?? [])
    .filter((date) => date.in_window)
    .map(({ year }) => formatYear(year, 10))
  return years.length === 0 ? 'no date' : [...new Set(years)].join('; ')
}

function ratioColumns(
  { other_dates }: Audit,
  arcmin: number,
  at: (sweep: Sweep, arcmin: number) => SweepStep | undefined,
): Column<Row>[] {
  if (other_dates.length === 0) return []
  const cell = ({ sweep }: Row) =>
    other_dates
      .map(({ label }) => {
        const ratio = at(sweep, arcmin)?.ratios.find(({ against }) => against === label)
        const figure = (ratio === undefined ? null : ratioFigure(ratio)) ?? '–'
        return other_dates.length === 1 ? figure : `${label}: ${figure}`
      })
      .join('; ')
  const head = other_dates.length === 1 ? `Ratio to ${other_dates[0]!.label}` : 'Ratio'
  return [{ head: `${head} at ${formatArcmin(arcmin)}`, cell, width: other_dates.length === 1 ? 1.5 : 2 }]
}

function sets(step: SweepStep | undefined, { window }: Sweep): string {
  return step === undefined ? '–' : dateSets(step.sets95, window)
}

function bits(step: SweepStep | undefined): string {
  return step === undefined ? '–' : fixed(step.bits, 2)
}
