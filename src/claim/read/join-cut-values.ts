import { isMap, isScalar } from 'yaml'
import type { Stretch } from '../../quantity/misread.ts'
import { quoted } from '../../quantity/quoted.ts'
import { type Context, type Field, reportError, valueStretch } from './field.ts'

/** Keys whose values are lists: there a comma parts two values, and what is missing are the brackets. */
const LISTS: ReadonlySet<string> = new Set(['bodies', 'tolerances'])

/** A year may keep its commas, in quotes; a length may not. */
const LENGTH_IN_THOUSANDS = /^[-−+]?\d{1,3}(?:,\d{3})+(?:\.\d+)?\s*(?:[ckm]?m|met(?:re|er)s?|ft)$/i

/**
 * In `{date: 11,881 BCE}` the comma ends the value, and `881 BCE` comes out as a key without one. Such values are
 * reported, added to `spoilt` and left out.
 */
export function joinCutValues(
  entries: readonly Field[],
  parent: Field,
  isKey: (entry: Field) => boolean,
  spoilt: Set<string>,
  context: Context,
): readonly Field[] {
  if (!isMap(parent.node) || parent.node.flow !== true) return entries
  const whole: { head: Field; tail: Field | null }[] = []
  for (const entry of entries) {
    const last = whole.at(-1)
    const isCutOff = entry.node === null && !isKey(entry)
    if (isCutOff && last !== undefined && last.head.node !== null) last.tail = entry
    else whole.push({ head: entry, tail: null })
  }
  for (const { head, tail } of whole) {
    if (tail === null) continue
    spoilt.add(head.name)
    reportCut(head, tail, context)
  }
  return whole.filter(({ tail }) => tail === null).map(({ head }) => head)
}

function reportCut(before: Field, after: Field, context: Context): void {
  const { offset } = valueStretch(before)
  const at: Stretch = { offset, length: after.keyAt.offset + after.keyAt.length - offset }
  const whole = context.text.slice(at.offset, at.offset + at.length)
  const isList = LISTS.has(before.name) && isScalar(before.node)
  reportError(context, before, 'comma-in-braces', `the comma in ${quoted(whole)} ends the value inside { }`, {
    expected: isList ? 'a list in brackets' : 'a value with a comma in quotes',
    suggestion: /["\n\\]/.test(whole) ? null : isList ? `[${whole}]` : asOneValue(whole),
    at,
  })
}

function asOneValue(whole: string): string {
  if (LENGTH_IN_THOUSANDS.test(whole)) return whole.replaceAll(',', '')
  return isDecimalComma(whole) ? whole.replace(',', '.') : `"${whole}"`
}

function isDecimalComma(value: string): boolean {
  return /^\D*\d+,\d/.test(value) && !/^\D*\d{1,3}(?:,\d{3})+(?!\d)/.test(value)
}
