import { LineCounter, type Node, parseDocument, type YAMLError } from 'yaml'
import type { Problem } from '../../quantity/problem.ts'
import { checkCharacters, checkEscapes } from './check-characters.ts'
import { explainYaml, SAME_INDENT } from './explain-yaml.ts'
import { findLoneReturn, withLineFeeds } from './line-ends.ts'
import { isMendable, mendYaml } from './mend-yaml.ts'
import { scanYaml } from './scan-yaml.ts'

/** What came of a file's YAML. Before `soundUntil`, the line of the first break of syntax, all is as meant. */
export interface ParsedYaml {
  root: Node | null
  problems: readonly Problem[]
  soundUntil: number
  /** Lines, from 1, whose text was made harmless to read the others; what they seem to hold is not meant. */
  mendedLines: ReadonlySet<number>
  /** The line of an offset, from 1. */
  lineOf: (offset: number) => number
}

const LONGEST = 100_000
const STRICT = {
  version: '1.2',
  schema: 'core',
  strict: true,
  uniqueKeys: false, // told better, and faster, where the mapping is read
  stringKeys: true,
  resolveKnownTags: false,
  merge: false,
  prettyErrors: false,
} as const

/** Each round mends all it finds; more rounds are for breaks that hide others. */
const MOST_ROUNDS = 5
const NOTHING = { root: null, soundUntil: 0, mendedLines: new Set<number>() }

/** Parses a claim file's YAML 1.2, strictly: its warnings are errors, and it has no aliases, tags or directives. */
export function parseYaml(written: string): ParsedYaml {
  if (written.length > LONGEST) return { ...NOTHING, problems: [tooLarge(written)], lineOf: () => 1 }
  const text = withLineFeeds(written)
  const scan = scanYaml(text)
  const before = [...checkLineEnds(written), ...checkCharacters(text), ...scan.problems]
  if (scan.tooDeep) return { ...NOTHING, problems: before, lineOf: () => 1 }
  const { document, lineOf, breaks, mended } = parseMended(text, scan.openQuote)
  return {
    root: document.contents,
    problems: [
      ...before,
      ...checkEscapes(document.contents, text),
      ...mended,
      ...breaks,
      ...document.warnings.filter(isNew).map((warning) => explainYaml(warning, text, null)),
    ],
    soundUntil: Math.min(Number.POSITIVE_INFINITY, ...breaks.map(({ offset }) => lineStart(text, offset))),
    mendedLines: new Set(mended.map(({ offset }) => lineOf(offset))),
    lineOf,
  }
}

/** Parses again with each text that breaks the syntax made harmless, to find what else is wrong. */
function parseMended(text: string, openQuote: number | null) {
  const mended: Problem[] = []
  let harmless = text
  for (let round = 1; ; round++) {
    const lines = new LineCounter()
    const lineOf = (offset: number) => lines.linePos(offset).line
    const document = parseDocument(harmless, { ...STRICT, lineCounter: lines })
    const syntax = document.errors.map((error) => explainYaml(error, text, openQuote))
    const mendedStarts = new Set(mended.map(({ offset }) => lineStart(text, offset)))
    const found = withoutEchoes(syntax, text).filter(
      ({ offset }) => !mendedStarts.has(lineStart(text, offset)),
    )
    const mendable = round < MOST_ROUNDS ? found.filter(isMendable) : []
    if (mendable.length === 0) return { document, lineOf, breaks: found, mended }
    mended.push(...mendable)
    harmless = mendable.reduce(mendYaml, harmless)
  }
}

/** Tags and directives are told by the scan. */
function isNew({ code }: YAMLError): boolean {
  return code !== 'TAG_RESOLVE_FAILED' && code !== 'BAD_DIRECTIVE'
}

/**
 * One break of syntax makes the library tell several on its line, and a slip of the indentation is told again of
 * lines after it.
 */
function withoutEchoes(problems: readonly Problem[], text: string): readonly Problem[] {
  const lines = new Set<number>()
  return problems.filter(({ offset, expected }, index) => {
    const line = lineStart(text, offset)
    const isEcho = lines.has(line) || (index > 0 && expected === SAME_INDENT)
    lines.add(line)
    return !isEcho
  })
}

function lineStart(text: string, offset: number): number {
  return text.slice(0, offset).lastIndexOf('\n') + 1
}

function tooLarge(text: string): Problem {
  const message = `the file is ${text.length} characters long`
  const expected = `a claim of at most ${LONGEST} characters`
  return {
    severity: 'error',
    code: 'file-too-large',
    message,
    expected,
    suggestion: null,
    path: null,
    offset: 0,
    length: 1,
  }
}

function checkLineEnds(text: string): readonly Problem[] {
  const offset = findLoneReturn(text)
  if (offset === -1) return []
  const message = 'this line ends with a lone carriage return (U+000D), which does not end a line here'
  const expected = 'the file saved with the line ends LF or CRLF'
  const code = 'line-ends'
  return [{ severity: 'error', code, message, expected, suggestion: null, path: null, offset, length: 1 }]
}
