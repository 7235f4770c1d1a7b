import type { Audit, DatedLabel } from '../../audit/audit.ts'
import type { FlagLabel } from './flag-row.ts'
import { PALETTE } from './palette.ts'
import { TEXT_SIZE } from './shape.ts'
import { fitText } from './text-width.ts'

/** The asserted date and the independent ones as flags over a plot in which years run to the right. */
export function dateFlags(audit: Audit, x: (year: number) => number): FlagLabel[] {
  const flag = (date: DatedLabel, name: string, colour: string): FlagLabel => ({
    x: x((date.from + date.to) / 2),
    label: `${fitText(name, 90, TEXT_SIZE)}: ${date.printed}`,
    stroke: { stroke: colour, strokeWidth: 0.6 },
    fill: colour,
  })
  return [
    { ...flag(audit.asserted, 'asserted', PALETTE.accent), weight: 600 },
    ...audit.other_dates.map((date) => flag(date, date.label, PALETTE.ink)),
  ]
}
