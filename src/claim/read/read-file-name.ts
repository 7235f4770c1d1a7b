import { quoted } from '../../quantity/quoted.ts'
import { type Context, type Field, reportError } from './field.ts'
import { scalarText } from './read-text.ts'

const EXPECTED = 'the name of a file beside the claim file, such as survey.csv'

/** What a name may say instead of a place beside the claim file. */
const ELSEWHERE: readonly (readonly [RegExp, string])[] = [
  [/^[a-z][a-z+.-]+:\/\//i, 'is an address on the network'],
  [/^(?:[/\\~]|[a-z]:)/i, 'is not a path from the claim file'],
  [/(?:^|[/\\])\.\.(?:[/\\]|$)/, 'leads out of the folder of the claim file'],
  [/\\/, 'has a backslash between its folders'],
  [/(?:^|\/)\.?$/, 'is a folder'],
]

/** Reads the path of a file in the folder of the claim file or below it; null, with the problem reported, for others. */
export function readFileName(field: Field, context: Context): string | null {
  const text = scalarText(field, context, EXPECTED)
  if (text === null) return null
  // No file has such a name; that the character stands there has been told.
  if (text.includes('\0')) return null
  const name = text.trim()
  if (name === '') {
    reportError(context, field, 'empty-value', `${quoted(field.name)} is empty`, { expected: EXPECTED })
    return null
  }
  const complaint = ELSEWHERE.find(([pattern]) => pattern.test(name))?.[1]
  if (complaint === undefined) return name.replace(/^(?:\.\/)+/, '')
  reportError(context, field, 'file-elsewhere', `${quoted(name)} ${complaint}`, {
    expected: EXPECTED,
    suggestion: besideName(name),
  })
  return null
}

/** The last part of a path, or all of it where only its separators are wrong. */
function besideName(name: string): string | null {
  const path = name.replaceAll('\\', '/')
  const isBelow = !ELSEWHERE.some(([pattern]) => pattern.test(path))
  const last = isBelow ? path : (path.split('/').at(-1) ?? '')
  return /^[\w .-]*[\w-]\.[\w-]+$/.test(last) || isBelow ? last : null
}
