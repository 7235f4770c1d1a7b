import { LineCounter, type Node, parseDocument, type YAMLError } from 'yaml'
import type { Problem } from '../../quantity/problem.ts'
import { checkCharacters, checkEscapes } from './check-characters.ts'
import { explainYaml, SAME_INDENT } from './explain-yaml.ts'
import { scanYaml } from './scan-yaml.ts'

/** What came of a file's YAML. Before `soundUntil`, the line of the first break of syntax, all is as meant. */
export interface ParsedYaml {
  root: Node | null
  problems: readonly Problem[]
  soundUntil: number
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

/** Parses a claim file's YAML 1.2, strictly: its warnings are errors, and it has no aliases, tags or directives. */
export function parseYaml(text: string): ParsedYaml {
  const lines = new LineCounter()
  const lineOf = (offset: number) => lines.linePos(offset).line
  if (text.length > LONGEST) return { root: null, problems: [tooLarge(text)], soundUntil: 0, lineOf }
  const scan = scanYaml(text)
  const before = [...checkCharacters(text), ...scan.problems]
  if (scan.tooDeep) return { root: null, problems: before, soundUntil: 0, lineOf }
  const document = parseDocument(text, { ...STRICT, lineCounter: lines })
  const syntax = document.errors.map((error) => explainYaml(error, text, scan.openQuote))
  const breaks = withoutEchoes(syntax, text)
  return {
    root: document.contents,
    problems: [
      ...before,
      ...checkEscapes(document.contents, text),
      ...breaks,
      ...document.warnings.filter(isNew).map((warning) => explainYaml(warning, text, null)),
    ],
    soundUntil: Math.min(Number.POSITIVE_INFINITY, ...breaks.map(({ offset }) => lineStart(text, offset))),
    lineOf,
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
