import { isMap, isScalar, type Node, type Pair, type YAMLMap } from 'yaml'
import { quoted } from '../../quantity/quoted.ts'
import { type Context, type Field, isEmpty, reportError } from './field.ts'

/** Reads the entries of a mapping, each name once; null, with the problem reported, where it is none. */
export function readEntries(field: Field, context: Context, expected: string): readonly Field[] | null {
  const { node } = field
  if (!isMap(node)) {
    const [code, complaint] = isEmpty(field)
      ? (['empty-value', 'has no value'] as const)
      : (['not-a-mapping', 'is not a mapping of keys to values'] as const)
    reportError(context, field, code, `${quoted(field.name)} ${complaint}`, {
      expected,
      at: field.keyAt,
    })
    return null
  }
  const seen = new Map<string, Field>()
  for (const pair of node.items) {
    const entry = entryOf(pair, field, node)
    const earlier = seen.get(entry.name)
    if (earlier === undefined) seen.set(entry.name, entry)
    else reportDuplicate(entry, earlier, context)
  }
  return [...seen.values()]
}

function entryOf(pair: Pair, parent: Field, map: YAMLMap): Field {
  const key = pair.key as Node | null
  const name = isScalar(key) ? (key.source ?? String(key.value ?? '')) : ''
  const [start, end] = key?.range ?? map.range ?? [0, 1]
  const path = parent.path === '' ? name : `${parent.path}.${name}`
  return {
    name,
    path,
    keyAt: { offset: start, length: Math.max(1, end - start) },
    node: pair.value as Node | null,
  }
}

function reportDuplicate(entry: Field, earlier: Field, context: Context): void {
  reportError(context, entry, 'duplicate-key', `${quoted(entry.name)} stands here a second time`, {
    expected: `each name once; the first is on line ${context.lineOf(earlier.keyAt.offset)}`,
    at: entry.keyAt,
  })
}
