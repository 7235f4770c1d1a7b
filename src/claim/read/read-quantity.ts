import { misread } from '../../quantity/misread.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Misread, Reading } from '../../quantity/reading.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { ProblemCode } from '../problem-codes.ts'
import { type Context, type Field, reportError, reportWarning, stretchInValue } from './field.ts'
import { scalarText } from './read-text.ts'

/** No quantity is longer; the readers' patterns are made for short texts. */
const LONGEST = 200

/** Reads a field's text as a quantity, each problem at its place; null where it is missing or cannot be read. */
export function readQuantity<T>(
  field: Field | undefined,
  read: (text: string) => Reading<T>,
  expected: string,
  context: Context,
): T | null {
  if (field === undefined) return null
  const text = scalarText(field, context, expected)
  if (text === null) return null
  const reading = text.length > LONGEST ? tooLong(text) : read(text)
  if (!reading.ok) {
    tell(reportError, field, text, reading.misread, context)
    return null
  }
  for (const warning of reading.warnings ?? []) tell(reportWarning, field, text, warning, context)
  return reading.value
}

/** Like `readQuantity`; `omitted` where the key is missing or cannot be read, `unknown` where the file says so. */
export function readStatable<T>(
  field: Field | undefined,
  read: (text: string) => Reading<T>,
  expected: string,
  context: Context,
): T | Unstated {
  const orUnknown = (text: string): Reading<T | Unstated> =>
    isUnknown(text) ? { ok: true, value: 'unknown' } : read(text)
  return readQuantity(field, orUnknown, expected, context) ?? 'omitted'
}

/** Whether a text is the word `unknown`. */
export function isUnknown(text: string): boolean {
  return text.trim().toLowerCase() === 'unknown'
}

function tooLong(text: string) {
  const at = { offset: 0, length: text.length }
  return misread('not-readable', `${quoted(text)} is too long`, at, { expected: 'one quantity' })
}

function tell(
  report: typeof reportError,
  field: Field,
  text: string,
  { code, message, expected, suggestion, offset, length }: Misread,
  context: Context,
): void {
  // The readers of quantities use only codes of MISREAD_CODES, which are problem codes.
  const problemCode = code as ProblemCode
  const at = stretchInValue(field, context.text, text, { offset, length })
  report(context, field, problemCode, message, { expected, suggestion, at })
}
