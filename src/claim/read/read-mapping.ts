import type { Advice, Stretch } from '../../quantity/misread.ts'
import { quoted } from '../../quantity/quoted.ts'
import { EXAMPLES, type KeyTable } from '../keys.ts'
import { type Context, type Field, reportError, reportWarning } from './field.ts'
import { joinCutValues } from './join-cut-values.ts'
import { nearestKey } from './nearest-key.ts'
import { readEntries } from './read-entries.ts'

/** The fields of a mapping by their keys; `has` is true also of a key that was there but cannot be used. */
export interface Fields<K extends string> {
  get: (key: K) => Field | undefined
  has: (key: K) => boolean
}

/**
 * Why a key that is legal elsewhere has no place in a mapping; a suggestion takes the place of the key, or of the
 * stretch `at`. `standsFor` is the key that is meant by it, where the suggestion is not that key.
 */
export interface OutOfPlace extends Advice {
  message: string
  at?: Stretch
  standsFor?: string
}

/** What to tell of keys besides that they are wrong. */
export interface KeyAdvice {
  /** Tells a key that the table lacks because it belongs elsewhere; null for one that belongs nowhere. */
  outOfPlace?: (entry: Field) => OutOfPlace | null
  /** How lines with required keys may look, where the usual example does not fit. */
  examples?: Readonly<Record<string, string>>
}

/**
 * Reads a mapping with fixed keys. Reports unknown, doubled, misplaced and missing keys, those that this version
 * does not use, and values that a comma has cut in two. Null where the value is no mapping.
 */
export function readMapping<T extends KeyTable>(
  field: Field,
  table: T,
  context: Context,
  { outOfPlace = () => null, examples = {} }: KeyAdvice = {},
): Fields<keyof T & string> | null {
  const keys = Object.keys(table).slice(0, 3).join(': …, ')
  const entries = readEntries(field, context, `keys with values, such as ${keys}: …`)
  if (entries === null) return null
  const fields = new Map<string, Field>()
  const spoilt = new Set<string>()
  const readKeys = Object.keys(table).filter((key) => table[key] !== 'unused')
  const taken = new Set(entries.map(({ name }) => name))
  const freeKeys = { keys: readKeys, free: readKeys.filter((key) => !taken.has(key)) }
  const isKey = (entry: Field) => Object.hasOwn(table, entry.name) || outOfPlace(entry) !== null
  for (const entry of joinCutValues(entries, field, isKey, spoilt, context)) {
    const use = Object.hasOwn(table, entry.name) ? table[entry.name] : undefined
    const stray = use === undefined ? outOfPlace(entry) : null
    if (stray !== null) {
      const meant = stray.standsFor ?? stray.suggestion
      if (meant != null) spoilt.add(meant)
      reportOutOfPlace(entry, stray, context)
    } else if (use === undefined) reportUnknown(entry, freeKeys, spoilt, context)
    else if (use === 'unused') warnUnused(entry, context)
    else fields.set(entry.name, entry)
  }
  const isThere = (key: string) => fields.has(key) || spoilt.has(key)
  reportMissing(field, table, isThere, { ...EXAMPLES, ...examples }, context)
  return { get: (key) => fields.get(key), has: isThere }
}

function reportUnknown(
  entry: Field,
  { keys, free }: { keys: readonly string[]; free: readonly string[] },
  spoilt: Set<string>,
  context: Context,
): void {
  const suggestion = nearestKey(entry.name, free)
  if (suggestion !== null) spoilt.add(suggestion)
  reportError(context, entry, 'unknown-key', `there is no key ${quoted(entry.name)} here`, {
    expected: `one of ${keys.join(', ')}`,
    suggestion,
    at: entry.keyAt,
  })
}

function warnUnused(entry: Field, context: Context): void {
  reportWarning(context, entry, 'unused-key', `${quoted(entry.name)} is not used by this version`, {
    at: entry.keyAt,
  })
}

function reportMissing(
  field: Field,
  table: KeyTable,
  isThere: (key: string) => boolean,
  examples: Readonly<Record<string, string>>,
  context: Context,
): void {
  for (const [key, use] of Object.entries(table))
    if (use === 'required' && !isThere(key)) reportMissingKey(field, key, examples[key] ?? null, context)
}

/** Reports that a mapping lacks a key. */
export function reportMissingKey(field: Field, key: string, expected: string | null, context: Context): void {
  const missing = { ...field, path: field.path === '' ? key : `${field.path}.${key}` }
  const place = field.path === '' ? 'the file' : quoted(field.name)
  reportError(context, missing, 'missing-key', `${place} has no ${quoted(key)}`, {
    expected,
    at: field.keyAt,
  })
}

/** Reports a key that is legal elsewhere, at the key. */
export function reportOutOfPlace(
  entry: Field,
  { message, expected = null, suggestion = null, at = entry.keyAt }: OutOfPlace,
  context: Context,
): void {
  reportError(context, entry, 'out-of-place', message, { expected, suggestion, at })
}
