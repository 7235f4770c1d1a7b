import { isSeq, type Node } from 'yaml'
import { quoted } from '../../quantity/quoted.ts'
import { type Context, entryField, type Field, isEmpty, reportError } from './field.ts'

/** The entries of a list; null, with the problem reported, where the value is no list. */
export function readList(
  field: Field | undefined,
  context: Context,
  expected: string,
): readonly Field[] | null {
  if (field === undefined) return null
  const { node } = field
  if (isSeq(node)) return node.items.map((item, index) => entryField(field, index, item as Node | null))
  const [code, complaint] = isEmpty(field)
    ? (['empty-value', 'has no value'] as const)
    : (['not-a-list', 'is not a list'] as const)
  reportError(context, field, code, `${quoted(field.name)} ${complaint}`, { expected, at: field.keyAt })
  return null
}
