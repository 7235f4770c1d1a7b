import { type Node, visit } from 'yaml'
import type { Stretch } from '../../quantity/misread.ts'
import type { Problem } from '../../quantity/problem.ts'
import type { ProblemCode } from '../problem-codes.ts'

const NOT_UTF8 = /[\ufffd\p{Cs}]+/gu
const CONTROL = /(?:(?![\t\n\r\u0085])[\p{Cc}\u202a-\u202e\u2066-\u2069])+/gu

/** Finds damaged UTF-8 and control characters, NUL and changes of the writing direction included. */
export function checkCharacters(text: string): readonly Problem[] {
  return [
    ...firstOf(text, NOT_UTF8, 'not-utf8', 'this is not UTF-8 text', 'the file saved as UTF-8'),
    ...firstOf(
      text,
      CONTROL,
      'control-character',
      'an invisible control character stands here',
      'the text without it',
    ),
  ]
}

/** Finds the same where an escape in double quotes makes it, as in `"\\0"`. */
export function checkEscapes(root: Node | null, text: string): readonly Problem[] {
  const problems: Problem[] = []
  visit(root, {
    Scalar(_, { value, range }) {
      const [start, end] = range ?? [0, 0]
      const made = `${value}`.match(CONTROL)?.[0] ?? `${value}`.match(NOT_UTF8)?.[0]
      if (made === undefined || text.slice(start, end).includes(made)) return
      const message = `an escape makes an invisible control character (${namesOf(made)})`
      const at = { offset: start, length: end - start }
      problems.push(characterProblem('control-character', message, 'the text without it', at))
    },
  })
  return problems
}

/** One problem for all places of a kind, at the first: a file that is no text would have thousands. */
function firstOf(
  text: string,
  pattern: RegExp,
  code: ProblemCode,
  what: string,
  expected: string,
): Problem[] {
  const [first, ...others] = text.matchAll(pattern)
  if (first === undefined) return []
  const more =
    others.length === 0 ? '' : `, and at ${others.length} more ${others.length === 1 ? 'place' : 'places'}`
  const message = `${what} (${namesOf(first[0])})${more}`
  return [characterProblem(code, message, expected, { offset: first.index, length: first[0].length })]
}

function characterProblem(code: ProblemCode, message: string, expected: string, at: Stretch): Problem {
  return { severity: 'error', code, message, expected, suggestion: null, path: null, ...at }
}

function namesOf(characters: string): string {
  const points = [...characters].slice(0, 4).map((character) => character.codePointAt(0) ?? 0)
  return points.map((point) => `U+${point.toString(16).toUpperCase().padStart(4, '0')}`).join(' ')
}
