import type { YAMLError } from 'yaml'
import type { Advice, Stretch } from '../../quantity/misread.ts'
import type { Problem } from '../../quantity/problem.ts'

interface Explanation extends Advice {
  message: string
  at?: Stretch
}

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
      return rest.includes(': ')
        ? { message: 'a colon and a space inside a plain text begin a new key', ...inQuotes(rest, at) }
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
      return { message: 'a key has to be a plain word', expected: 'a key such as `claim`' }
    case 'BAD_DQ_ESCAPE': {
      const typed = rest.slice(0, 2)
      const message = `\`${typed}\` means nothing inside double quotes`
      return { message, expected: 'single quotes', at: { offset: at.offset, length: typed.length } }
    }
    default:
      return missingEnd(error, openQuote) ?? { message: `this is not YAML: ${summaryOf(error)}` }
  }
}

/** What a wrongly indented line needs; the lines after it are told the same without being wrong. */
export const SAME_INDENT = 'the same number of spaces before each key of a group, and one key a line'

function inQuotes(rest: string, at: Stretch): Advice & { at: Stretch } {
  const quote = rest.includes("'") ? '"' : "'"
  const isQuotable = !rest.includes(quote) && !(quote === '"' && rest.includes('\\'))
  return { expected: 'the text in quotes', suggestion: isQuotable ? quote + rest + quote : null, at }
}

function keyWithoutSpace(at: Stretch, rest: string): Explanation {
  const parts = /^([\w-]+):(\S.*)$/.exec(rest)
  const message = 'this line is neither a key with its value nor the continuation of a text'
  const expected = 'a key, a colon, a space and the value'
  return { message, expected, suggestion: parts === null ? null : `${parts[1]}: ${parts[2]}`, at }
}

function missingEnd(error: YAMLError, openQuote: number | null): Explanation | null {
  if (error.code !== 'MISSING_CHAR') return null
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
      expected: 'a key, a colon, a space and the value',
    }
  return null
}

function restOfLine(text: string, from: number): Stretch {
  const offset = Math.max(0, Math.min(from, text.length - 1))
  const length = /^[^\r\n]*/.exec(text.slice(offset))?.[0].trimEnd().length ?? 1
  return { offset, length: Math.max(1, length) }
}

/** The library's message without what it quotes from the file. */
function summaryOf({ message }: YAMLError): string {
  return message.charAt(0).toLowerCase() + message.slice(1).replace(/: .*$/s, '')
}
