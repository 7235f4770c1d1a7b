import type { Table } from 'mdast'
import type { Assumption, Audit } from '../../audit/audit.ts'
import { formatNumber } from '../../quantity/format-number.ts'
import { type Phrase, table } from '../nodes.ts'

/** What the claim file leaves open and the program filled in, in the audit's order: largest effect first. */
export function assumptionsTable(audit: Audit): Table[] {
  if (audit.assumptions.length === 0) return []
  return [
    table<Assumption>(
      [
        'What the claim leaves open, what was used in its place, and what that is worth in years; largest first.',
      ],
      [
        { head: 'Left open', cell: printWhat, width: 1.5 },
        { head: 'Used', cell: (row) => row.used, width: 1.4 },
        { head: 'Why', cell: (row) => row.basis, width: 2.2 },
        { head: 'Effect on the date', cell: printEffect, width: 2.4 },
      ],
      audit.assumptions,
    ),
  ]
}

function printWhat({ what, said }: Assumption): Phrase[] {
  return said === 'unknown' ? [what, ' (said to be unknown)'] : [what]
}

function printEffect({ effect_years, effect_of }: Assumption): string {
  if (effect_years === null) return effect_of
  const years = Math.abs(effect_years)
  return years < 1 ? `under 1 year: ${effect_of}` : `${formatNumber(years, 2)} years: ${effect_of}`
}
