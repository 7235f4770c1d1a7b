import type { Table } from 'mdast'
import type { Audit, Limit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { table } from '../nodes.ts'

const FROM_THE_START = '0′: at every tolerance'

/** The three limits of each independent date, each with its reason where there is none. */
export function limitsTable(audit: Audit): Table[] {
  if (audit.limits.length === 0) return []
  return [
    table<Limit>(
      ['The build tolerances at which the conclusion changes.'],
      [
        { head: 'Independent date', cell: (limit) => limit.against ?? 'none named', width: 1.2 },
        { head: 'Asserted date favoured 3 to 1 up to', cell: ratio3, width: 2 },
        { head: '95 % dates hold all of the independent date from', cell: otherIn95, width: 2 },
        { head: 'Less than half a bit from', cell: halfBit, width: 2 },
      ],
      audit.limits,
    ),
  ]
}

function ratio3({ ratio_3_arcmin, ratio_3_cm, ratio_3_reason, ratio_3_steady }: Limit): string {
  const limit = limitCell(ratio_3_arcmin, ratio_3_cm, ratio_3_reason)
  return ratio_3_steady === false ? `${limit}, but not at every tolerance below that` : limit
}

function otherIn95({ other_date_in_95_arcmin, other_date_in_95_cm, other_date_in_95_reason }: Limit): string {
  if (other_date_in_95_arcmin === 0) return FROM_THE_START
  return limitCell(other_date_in_95_arcmin, other_date_in_95_cm, other_date_in_95_reason)
}

function halfBit({ half_bit_arcmin, half_bit_cm, half_bit_reason }: Limit): string {
  if (half_bit_arcmin === 0) return FROM_THE_START
  return limitCell(half_bit_arcmin, half_bit_cm, half_bit_reason)
}

function limitCell(arcmin: number | null, cm: number | null, reason: string | null): string {
  if (arcmin === null) return reason ? `none: ${reason}` : 'none'
  return cm === null ? formatArcmin(arcmin) : `${formatArcmin(arcmin)} (${formatCm(cm)})`
}
