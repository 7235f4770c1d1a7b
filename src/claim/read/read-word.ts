import { foldWord, nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import { type Context, type Field, reportError } from './field.ts'
import { scalarText } from './read-text.ts'

/**
 * The words a key takes. `later` ones are legal but not computed by this version; `hints` say what others mean, and
 * `guess` what is meant by a text that is none of them: a word, or `a or b`.
 */
export interface Vocabulary<W extends string> {
  words: readonly W[]
  later?: readonly string[]
  hints?: Readonly<Record<string, W>>
  guess?: (text: string) => string | null
}

/** Reads one of a few words, whatever its case and spacing; null, with the problem reported, where it is none. */
export function readWord<W extends string>(
  field: Field | undefined,
  { words, later = [], hints = {}, guess = () => null }: Vocabulary<W>,
  context: Context,
): W | null {
  if (field === undefined) return null
  const expected = words.length > 2 ? `one of ${words.join(', ')}` : words.join(' or ')
  const text = scalarText(field, context, expected)
  if (text === null) return null
  const word = words.find((candidate) => foldWord(candidate) === foldWord(text))
  if (word !== undefined) return word
  if (later.some((candidate) => foldWord(candidate) === foldWord(text)))
    reportError(context, field, 'not-in-this-version', `this version does not compute ${quoted(text)}`, {
      expected,
    })
  else {
    const hint = Object.entries(hints).find(([other]) => foldWord(other) === foldWord(text))?.[1]
    const suggestion = hint ?? guess(text) ?? nearMiss(text, words)
    reportError(
      context,
      field,
      'unknown-word',
      `${quoted(text)} is not a word that ${quoted(field.name)} takes`,
      {
        expected,
        suggestion,
      },
    )
  }
  return null
}
