import type { Advice, Stretch } from '../../quantity/misread.ts'
import { KEYS } from '../keys.ts'

/** What is wrong with the YAML of a place; `at` is given where that is not the place the library marks. */
export interface Explanation extends Advice {
  message: string
  at?: Stretch
}

/** What a plain text needs that YAML takes for more than a text. */
export const IN_QUOTES = 'the text in quotes'

/** What keys and values need that stand behind another key on its line. */
export const IN_BRACES = 'keys and values of one line inside { }'

/** What a line of a mapping looks like. */
export const KEY_LINE = 'a key, a colon, a space and the value'

/** The keys whose values are texts for people. */
export const TEXT_KEYS: ReadonlySet<string> = new Set([
  'claim',
  'source',
  'name',
  'notes',
  'label',
  'formula',
])
const KNOWN_KEYS: ReadonlySet<string> = new Set(Object.values(KEYS).flatMap((table) => Object.keys(table)))

/** `source: Hill: a guide` lacks quotes, `door: from: a, to: b` braces, and `target {body: sun}` a colon. */
export function keyInsideText(text: string, rest: Stretch): Explanation {
  const at = withoutComment(text, rest)
  const value = text.slice(at.offset, at.offset + at.length)
  const lineStart = text.lastIndexOf('\n', at.offset - 1) + 1
  const before = text.slice(lineStart, at.offset)
  const key = /^(\s*)([\w-]+)\s*[{[]\s*[\w-]+:\s+$/.exec(before)
  if (key !== null) return colonBeforeBracket(text, lineStart + (key[1]?.length ?? 0), at)
  const message = 'a colon and a space inside a plain text begin a new key'
  const goesOn = continues(text, lineStart, at)
  const parent = /(?<![\w-])([\w-]+):\s+$/.exec(before)?.[1] ?? ''
  const pieces = value.split(/,\s+(?=\w+:\s)/).map((piece) => /^(\w+):\s+\S/.exec(piece)?.[1] ?? '')
  if (!TEXT_KEYS.has(parent) && pieces.every((piece) => KNOWN_KEYS.has(piece)))
    return goesOn
      ? { message, expected: 'each key on a line of its own', at }
      : { message, expected: IN_BRACES, suggestion: `{${value}}`, at }
  const advice = inQuotes(value, at)
  return { message, ...advice, suggestion: goesOn ? null : (advice.suggestion ?? null) }
}

function colonBeforeBracket(text: string, from: number, value: Stretch): Explanation {
  const at = { offset: from, length: value.offset + value.length - from }
  const whole = text.slice(at.offset, at.offset + at.length)
  const suggestion = whole.replace(/^([\w-]+)\s*/, '$1: ')
  return {
    message: 'the colon is missing between this key and its bracket',
    expected: KEY_LINE,
    suggestion,
    at,
  }
}

/** Whether the line after a value is indented deeper than the value's own line, and so belongs to it. */
function continues(text: string, lineStart: number, { offset, length }: Stretch): boolean {
  const indent = /^ */.exec(text.slice(lineStart))?.[0].length ?? 0
  const next = /^[^\n]*\n(?:[ \t\r]*\n)*( *)[^\s#]/.exec(text.slice(offset + length))
  return next !== null && (next[1]?.length ?? 0) > indent
}

/** A # with a space on either side begins a remark; one without a space after it is more likely meant. */
export function withoutComment(text: string, { offset, length }: Stretch): Stretch {
  const value = text.slice(offset, offset + length).replace(/(?<!\s)\s+#(?:\s.*)?$/, '')
  return { offset, length: value.length }
}

/** The advice to quote a text, with the quotes where it can be had by them alone. */
export function inQuotes(rest: string, at: Stretch): Advice & { at: Stretch } {
  const quote = rest.includes("'") ? '"' : "'"
  const isQuotable = !rest.includes(quote) && !(quote === '"' && rest.includes('\\'))
  return { expected: IN_QUOTES, suggestion: isQuotable ? quote + rest + quote : null, at }
}
