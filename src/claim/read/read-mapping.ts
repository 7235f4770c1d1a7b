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
 * Reads a mapping with fixed keys. Reports unknown, doubled and missing keys, those that this version does not
 * use or read, and values that a comma has cut in two. Null where the value is no mapping.
 */
export function readMapping<T extends KeyTable>(
  field: Field,
  table: T,
  context: Context,
  instead?: string,
): Fields<keyof T & string> | null {
  const keys = Object.keys(table).slice(0, 3).join(': …, ')
  const entries = readEntries(field, context, `keys with values, such as ${keys}: …`)
  if (entries === null) return null
  const fields = new Map<string, Field>()
  const spoilt = new Set<string>()
  const readKeys = Object.keys(table).filter((key) => table[key] !== 'later' && table[key] !== 'unused')
  const taken = new Set(entries.map(({ name }) => name))
  const freeKeys = { keys: readKeys, free: readKeys.filter((key) => !taken.has(key)) }
  let isFromLater = false
  for (const entry of joinCutValues(entries, field, table, spoilt, context)) {
    const use = Object.hasOwn(table, entry.name) ? table[entry.name] : undefined
    if (use === undefined) reportUnknown(entry, freeKeys, spoilt, context)
    else if (use === 'unused') warnUnused(entry, context)
    else if (use === 'later') isFromLater = reportLater(entry, instead, context)
    else fields.set(entry.name, entry)
  }
  const isThere = (key: string) => fields.has(key) || spoilt.has(key)
  if (!isFromLater) reportMissing(field, table, isThere, context)
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

function reportLater(entry: Field, instead: string | undefined, context: Context): true {
  reportError(
    context,
    entry,
    'not-in-this-version',
    `this version does not read ${quoted(entry.name)} here`,
    {
      expected: instead ?? null,
      at: entry.keyAt,
    },
  )
  return true
}

function reportMissing(
  field: Field,
  table: KeyTable,
  isThere: (key: string) => boolean,
  context: Context,
): void {
  for (const [key, use] of Object.entries(table)) {
    if (use !== 'required' || isThere(key)) continue
    const missing = { ...field, path: field.path === '' ? key : `${field.path}.${key}` }
    const place = field.path === '' ? 'the file' : quoted(field.name)
    reportError(context, missing, 'missing-key', `${place} has no ${quoted(key)}`, {
      expected: EXAMPLES[key] ?? null,
      at: field.keyAt,
    })
  }
}
