import { foldWord, nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import { type Context, type Field, reportError } from './field.ts'
import { scalarText } from './read-text.ts'

/**
 * The words a key takes. `aliases` are other words for them; `hints` say what words mean that are not taken, and
 * `guess` what is meant by a text that is none of them: a word, or `a or b`.
 */
export interface Vocabulary<W extends string> {
  words: readonly W[]
  aliases?: Readonly<Record<string, W>>
  hints?: Readonly<Record<string, W>>
  guess?: (text: string) => string | null
}

/** Reads one of a few words, whatever its case and spacing; null, with the problem reported, where it is none. */
export function readWord<W extends string>(
  field: Field | undefined,
  { words, aliases = {}, hints = {}, guess = () => null }: Vocabulary<W>,
  context: Context,
): W | null {
  if (field === undefined) return null
  const expected = words.length > 2 ? `one of ${words.join(', ')}` : words.join(' or ')
  const text = scalarText(field, context, expected)
  if (text === null) return null
  const known = (table: Readonly<Record<string, W>>) =>
    Object.entries(table).find(([other]) => foldWord(other) === foldWord(text))?.[1]
  const word = words.find((candidate) => foldWord(candidate) === foldWord(text)) ?? known(aliases)
  if (word !== undefined) return word
  const suggestion = known(hints) ?? guess(text) ?? nearMiss(text, words)
  const message = `${quoted(text)} is not a word that ${quoted(field.name)} takes`
  reportError(context, field, 'unknown-word', message, { expected, suggestion })
  return null
}
