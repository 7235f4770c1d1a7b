import { CST, Lexer, Parser } from 'yaml'
import type { Stretch } from '../../quantity/misread.ts'
import type { Problem } from '../../quantity/problem.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { ProblemCode } from '../problem-codes.ts'

const DEEPEST = 40
const FEATURES: ReadonlyMap<string | null, { name: string; expected: string }> = new Map([
  ['anchor', { name: 'an anchor', expected: 'the value alone; in quotes if it begins with &' }],
  ['alias', { name: 'an alias', expected: 'the value itself; in quotes if it begins with *' }],
  ['tag', { name: 'a tag', expected: 'the value alone; in quotes if it begins with !' }],
  ['directive-line', { name: 'a directive', expected: 'a file without it: claim files are YAML 1.2' }],
])

/** What the first pass finds. `openQuote`: where a quote is opened that nothing closes. */
export interface ScannedYaml {
  tooDeep: boolean
  openQuote: number | null
  problems: readonly Problem[]
}

/**
 * A first pass over the words of the file, before anything is built from them. Finds nesting so deep that
 * building the tree would exhaust memory (`tooDeep`), and the features of YAML that claims do not use.
 */
export function scanYaml(text: string): ScannedYaml {
  const parser = new Parser()
  const problems: Problem[] = []
  let isScalarNext = false
  let openQuote: number | null = null
  for (const lexeme of new Lexer().lex(text)) {
    const offset = parser.offset
    for (const _ of parser.next(lexeme));
    if (parser.stack.length > DEEPEST)
      return { tooDeep: true, openQuote, problems: [tooDeep({ offset, length: lexeme.length })] }
    const type: string | null = isScalarNext ? null : CST.tokenType(lexeme)
    if (isUnclosed(type, lexeme)) openQuote = offset
    isScalarNext = type === 'scalar'
    const feature = FEATURES.get(type)
    if (feature === undefined) continue
    const word = lexeme.trimEnd()
    const message = `${quoted(word)} is ${feature.name} of YAML, which claim files do not use`
    problems.push(structural('yaml-feature', message, feature.expected, { offset, length: word.length }))
  }
  return { tooDeep: false, openQuote, problems }
}

function tooDeep(at: Stretch): Problem {
  const message = `brackets or indentation are nested more than ${DEEPEST} deep here`
  return structural('nested-too-deep', message, 'a claim file, which needs four levels', at)
}

function isUnclosed(type: string | null, lexeme: string): boolean {
  const quote = type === 'double-quoted-scalar' ? '"' : type === 'single-quoted-scalar' ? "'" : null
  return quote !== null && (lexeme.length === 1 || !lexeme.endsWith(quote))
}

function structural(code: ProblemCode, message: string, expected: string, at: Stretch): Problem {
  return { severity: 'error', code, message, expected, suggestion: null, path: null, ...at }
}
