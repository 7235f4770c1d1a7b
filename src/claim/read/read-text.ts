import { isAlias, isScalar } from 'yaml'
import { quoted } from '../../quantity/quoted.ts'
import { type Context, type Field, isEmpty, reportError, reportWarning } from './field.ts'

/** The text of a plain value as written, numbers included; null where it is no plain value. */
export function plainText({ node }: Field): string | null {
  if (!isScalar(node) || node.value === null) return null
  return typeof node.value === 'string' ? node.value : (node.source ?? String(node.value))
}

/** Like `plainText`, with the problem reported where there is none. */
export function scalarText(field: Field, context: Context, expected: string): string | null {
  const text = plainText(field)
  // An alias has been refused where the file was scanned.
  if (text !== null || isAlias(field.node)) return text
  const [code, complaint] = isEmpty(field)
    ? (['empty-value', 'has no value'] as const)
    : (['not-text', 'is not a plain value'] as const)
  reportError(context, field, code, `${quoted(field.name)} ${complaint}`, { expected, at: field.keyAt })
  return null
}

/** Reads a text for people, its white space made single spaces. */
export function readText(field: Field | undefined, context: Context): string | null {
  if (field === undefined) return null
  const text = scalarText(field, context, 'a text')
  if (text === null) return null
  warnOfComment(field, context)
  const tidy = text.replace(/\s+/g, ' ').trim()
  if (tidy !== '') return tidy
  reportError(context, field, 'empty-value', `${quoted(field.name)} is empty`, { expected: 'a text' })
  return null
}

/** Reads a longer text as it stands. */
export function readNotes(field: Field | undefined, context: Context): string | null {
  if (field === undefined) return null
  const text = scalarText(field, context, 'a text')
  if (text !== null) warnOfComment(field, context)
  return text
}

/** `source: leaflet #3` is cut at the #, mostly against its writer's intent; a real comment has a space after it. */
function warnOfComment(field: Field, context: Context): void {
  if (!isScalar(field.node) || field.node.type !== 'PLAIN') return
  const [start, end] = field.node.range ?? [0, 0]
  const comment = /^[ \t]+(#[^\s#][^\r\n]*)/.exec(context.text.slice(end))
  const lost = comment?.[1]?.trimEnd()
  if (comment === null || lost === undefined) return
  const text = context.text.slice(start, end + comment[0].length).trimEnd()
  reportWarning(
    context,
    field,
    'comment-cuts-text',
    `${quoted(lost)} is a comment and not part of the text`,
    {
      expected: 'quotes around a text with a #, or a space after the # of a comment',
      suggestion: /["\\\r\n]/.test(text) ? null : `"${text}"`,
      at: { offset: start, length: text.length },
    },
  )
}
