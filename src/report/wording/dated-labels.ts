import type { DatedLabel } from '../../audit/audit.ts'
import { listed } from '../../quantity/listed.ts'

/** `radiocarbon (800 to 500 BCE) and charter (1150 CE)`, for a sentence. */
export function datedLabels(dates: readonly DatedLabel[]): string {
  const words = dates.map(({ label, printed }) => `${label} (${printed})`)
  return listed(words)
}
