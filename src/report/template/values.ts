import type { Audit } from '../../audit/audit.ts'
import { formatArcmin, formatDegrees } from '../../quantity/format-angle.ts'
import { listed } from '../../quantity/listed.ts'

/** What `:value{of="…"}` may name: a few words for the middle of a sentence. To add one, add a row. */
export const VALUES: Readonly<Record<string, (audit: Audit) => string>> = {
  asserted_date: (audit) => audit.asserted.printed,
  datestone: (audit) => audit.datestone,
  file: (audit) => audit.file,
  input_sha256: (audit) => audit.input_sha256,
  made_on: (audit) => audit.made_on.slice(0, 10),
  plausible_precision: ({ plausible }) =>
    `${formatArcmin(plausible.low_arcmin)} to ${formatArcmin(plausible.high_arcmin)}`,
  second_window: (audit) => audit.second_window.window.printed,
  sightlines: (audit) => listed(audit.sightlines.map((line) => line.name)),
  source: (audit) => audit.source ?? 'no source named',
  statement: (audit) => audit.statement,
  'structure.latitude': ({ structure }) => latitude(structure.latitude_deg),
  'structure.name': (audit) => audit.structure.name,
  window: (audit) => audit.window.printed,
}

function latitude(deg: number): string {
  return `${formatDegrees(Math.abs(deg))} ${deg < 0 ? 'S' : 'N'}`
}
