import { isMap, isScalar, type Node, type Scalar } from 'yaml'
import type { Advice, Stretch } from '../../quantity/misread.ts'
import type { Problem } from '../../quantity/problem.ts'
import type { SkylineNode } from '../claim.ts'
import type { ProblemCode } from '../problem-codes.ts'
import type { BesideReader } from '../reading-help.ts'
import type { StarFinder } from '../star-finder.ts'

/** A value of the file with what is needed to point at it. */
export interface Field {
  /** The key or name it stands under. */
  name: string
  /** Such as `sightlines.midsummer.horizon`; empty for the file itself. */
  path: string
  keyAt: Stretch
  /** Null where nothing follows the key. */
  node: Node | null
}

/** The text being read, how stars and other files are looked up, and where its problems go. */
export interface Context {
  text: string
  findStar: StarFinder
  beside: FilesBeside
  /** The line of an offset, from 1. */
  lineOf: (offset: number) => number
  report: (problem: Problem) => void
}

/** The files beside the claim file, each read once. */
export interface FilesBeside {
  read: BesideReader
  /** Those that were read, with the SHA-256 of each. */
  attachments: Map<string, string>
  /** The skylines among them; null where one is not sound, which has been told. */
  skylines: Map<string, readonly SkylineNode[] | null>
}

/** Reports an error about a field; `at` is its value unless given. */
export function reportError(
  context: Context,
  field: Field,
  code: ProblemCode,
  message: string,
  advice: Advice & { at?: Stretch } = {},
): void {
  context.report(problemOf('error', field, code, message, advice))
}

/** Reports something doubtful about a field that is used nevertheless. */
export function reportWarning(
  context: Context,
  field: Field,
  code: ProblemCode,
  message: string,
  advice: Advice & { at?: Stretch } = {},
): void {
  context.report(problemOf('warning', field, code, message, advice))
}

/** The place of a field's value, or of its key where it has none. */
export function valueStretch({ node, keyAt }: Field): Stretch {
  const [start, end] = node?.range ?? [0, 0]
  return end > start ? { offset: start, length: end - start } : keyAt
}

/**
 * The place of a stretch of a value's text in the file; the whole value where the file writes the text
 * in another form (folded lines, escapes).
 */
export function stretchInValue(field: Field, source: string, value: string, at: Stretch): Stretch {
  if (!isScalar(field.node)) return valueStretch(field)
  const start = (field.node.range?.[0] ?? 0) + (isQuoted(field.node) ? 1 : 0)
  return source.startsWith(value, start) && at.length <= value.length
    ? { offset: start + at.offset, length: at.length }
    : valueStretch(field)
}

/** Tells a key that nothing follows, or null. */
export function isEmpty({ node }: Field): boolean {
  return node === null || (isScalar(node) && node.value === null)
}

/** The value of a mapping's key, looked up before the mapping is read; null where there is none. */
export function peek({ node }: Field, key: string): Node | null {
  return isMap(node) ? ((node.get(key, true) as Node | undefined) ?? null) : null
}

/** The field of an entry of a list. */
export function entryField(list: Field, index: number, node: Node | null): Field {
  const name = `${list.name}[${index}]`
  const keyAt = node?.range == null ? list.keyAt : { offset: node.range[0], length: 1 }
  return { name, path: `${list.path}[${index}]`, keyAt, node }
}

function isQuoted({ type }: Scalar): boolean {
  return type === 'QUOTE_DOUBLE' || type === 'QUOTE_SINGLE'
}

function problemOf(
  severity: Problem['severity'],
  field: Field,
  code: ProblemCode,
  message: string,
  { expected = null, suggestion = null, at = valueStretch(field) }: Advice & { at?: Stretch },
): Problem {
  const path = field.path === '' ? null : field.path
  return { severity, code, message, expected, suggestion, path, ...at }
}
