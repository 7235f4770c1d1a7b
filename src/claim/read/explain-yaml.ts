import type { YAMLError } from 'yaml'
import type { Stretch } from '../../quantity/misread.ts'
import type { Problem } from '../../quantity/problem.ts'
import {
  type Explanation,
  inQuotes,
  KEY_LINE,
  keyInsideText,
  TEXT_KEYS,
  withoutComment,
} from './key-inside-text.ts'

/** Says in plain words what is wrong with the YAML, and where it can be guessed what to write. */
export function explainYaml(error: YAMLError, text: string, openQuote: number | null): Problem {
  const [start, end] = error.pos
  const { message, expected = null, suggestion = null, at } = explain(error, text, openQuote)
  const place = at ?? { offset: start, length: end - start }
  return { severity: 'error', code: 'yaml-syntax', message, expected, suggestion, path: null, ...place }
}

function explain(error: YAMLError, text: string, openQuote: number | null): Explanation {
  const at = restOfLine(text, error.pos[0])
  const rest = text.slice(at.offset, at.offset + at.length)
  switch (error.code) {
    case 'BLOCK_AS_IMPLICIT_KEY':
      return /:\s/.test(rest)
        ? keyInsideText(text, at)
        : { message: 'the next line looks like part of this value', expected: SAME_INDENT, at }
    case 'BAD_SCALAR_START':
      return { message: `a plain text cannot begin with \`${rest[0] ?? ''}\``, ...inQuotes(rest, at) }
    case 'MULTILINE_IMPLICIT_KEY':
      return keyWithoutSpace(at, rest)
    case 'TAB_AS_INDENT':
      return { message: 'a tab is used to indent', expected: 'spaces: YAML counts no tabs' }
    case 'BAD_INDENT':
      return /Flow/.test(error.message)
        ? { message: 'a bracket is opened before this place and not closed', expected: 'a closing ] or }' }
        : { message: 'this line is not indented like the others of its group', expected: SAME_INDENT }
    case 'MULTIPLE_DOCS':
      return { message: 'a second document begins here', expected: 'one claim a file', at }
    case 'NON_STRING_KEY':
      return rest.startsWith('- ')
        ? DASH_IN_BRACKETS
        : { message: 'a key has to be a plain word', expected: 'a key such as `claim`' }
    case 'BAD_DQ_ESCAPE': {
      const typed = rest.slice(0, 2)
      const message = `\`${typed}\` means nothing inside double quotes`
      return { message, expected: 'single quotes', at: { offset: at.offset, length: typed.length } }
    }
    case 'BLOCK_IN_FLOW':
      return rest.startsWith('-')
        ? DASH_IN_BRACKETS
        : { message: 'a comma is missing between two entries inside { } or [ ]', expected: COMMA }
    case 'UNEXPECTED_TOKEN':
      return unexpected(error, text, at)
    default:
      return (
        missingEnd(error, openQuote) ?? { message: 'YAML makes no sense of this place', expected: KEY_LINE }
      )
  }
}

/** What a wrongly indented line needs; the lines after it are told the same without being wrong. */
export const SAME_INDENT = 'the same number of spaces before each key of a group, and one key a line'

const DASH_IN_BRACKETS: Explanation = {
  message: 'a list with dashes cannot stand inside { } or [ ]',
  expected: 'a list in [ ] with commas',
}
const COMMA = 'a comma between the entries'

function unexpected(error: YAMLError, text: string, at: Stretch): Explanation {
  const place = text.slice(0, at.offset).trimEnd().at(-1) ?? ''
  if (/-(?:map|seq)-end/.test(error.message))
    return { message: 'this bracket closes none', expected: 'one closing bracket for each opening one' }
  if (!/node end/.test(error.message))
    return /token$/.test(error.message)
      ? { message: 'a comma is missing before this entry', expected: COMMA }
      : { message: 'YAML makes no sense of this place', expected: KEY_LINE }
  if (/[}\]]/.test(place))
    return {
      message: 'a text follows the closing bracket',
      expected: 'nothing after the closing bracket',
      at,
    }
  return /["']/.test(place)
    ? afterQuote(text, at)
    : { message: 'this text belongs to no key', expected: KEY_LINE, at }
}

/** `source: "Hill" guide` ends at its second quote. */
function afterQuote(text: string, rest: Stretch): Explanation {
  const message = 'a text follows the closing quote'
  const lineStart = text.lastIndexOf('\n', rest.offset - 1) + 1
  const before = /^\s*(?:- )?([\w-]+):\s+(?=["'])/.exec(text.slice(lineStart, rest.offset))
  if (before === null || !TEXT_KEYS.has(before[1] ?? ''))
    return { message, expected: 'nothing after the closing quote', at: rest }
  const offset = lineStart + before[0].length
  const at = withoutComment(text, { offset, length: rest.offset + rest.length - offset })
  return { message, ...inQuotes(text.slice(at.offset, at.offset + at.length), at) }
}

function keyWithoutSpace(at: Stretch, rest: string): Explanation {
  const parts = /^([\w-]+):(\S.*)$/.exec(rest)
  const message = 'this line is neither a key with its value nor the continuation of a text'
  const expected = KEY_LINE
  return { message, expected, suggestion: parts === null ? null : `${parts[1]}: ${parts[2]}`, at }
}

function missingEnd(error: YAMLError, openQuote: number | null): Explanation | null {
  if (error.code !== 'MISSING_CHAR') return null
  if (/^Comments/.test(error.message))
    return { message: 'a comment needs a space before its #', expected: 'a space before the #' }
  if (/between flow/.test(error.message) || /Missing ,/.test(error.message))
    return { message: 'a comma is missing between two entries inside { } or [ ]', expected: COMMA }
  if (/end with/.test(error.message))
    return { message: 'a bracket is opened before this place and not closed', expected: 'a closing ] or }' }
  if (/closing/.test(error.message))
    return openQuote === null
      ? { message: 'a quote is opened before this place and not closed', expected: 'the closing quote' }
      : {
          message: 'the quote opened here is not closed',
          expected: 'the closing quote',
          at: { offset: openQuote, length: 1 },
        }
  if (/map values/.test(error.message))
    return {
      message: 'this line has no colon after its key',
      expected: KEY_LINE,
    }
  return null
}

function restOfLine(text: string, from: number): Stretch {
  const offset = Math.max(0, Math.min(from, text.length - 1))
  const length = /^[^\r\n]*/.exec(text.slice(offset))?.[0].trimEnd().length ?? 1
  return { offset, length: Math.max(1, length) }
}
