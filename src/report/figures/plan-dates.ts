import type { Audit } from '../../audit/audit.ts'
import { TEXT_SIZE } from './shape.ts'
import { fitText, textWidth } from './text-width.ts'

const LONGEST_NAME = 90

/** The asserted date and the independent ones, in as many lines of a width as they take. */
export function dateLines({ asserted, other_dates }: Audit, width: number): string[] {
  const words = [
    `asserted ${asserted.printed}`,
    ...other_dates.map(({ label, printed }) => `${fitText(label, LONGEST_NAME, TEXT_SIZE)} ${printed}`),
  ]
  const lines: string[] = []
  for (const word of words) {
    const longer = lines.length === 0 ? word : `${lines.at(-1)} · ${word}`
    if (lines.length > 0 && textWidth(longer, TEXT_SIZE) <= width) lines[lines.length - 1] = longer
    else lines.push(fitText(word, width, TEXT_SIZE))
  }
  return lines
}
