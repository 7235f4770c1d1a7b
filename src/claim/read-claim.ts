import { isMap, type Node } from 'yaml'
import type { Problem } from '../quantity/problem.ts'
import type { Claim } from './claim.ts'
import { KEYS } from './keys.ts'
import { echoNode } from './read/echo.ts'
import { type Context, type Field, isEmpty, reportError, reportWarning } from './read/field.ts'
import { parseYaml } from './read/parse-yaml.ts'
import { readAtmosphere } from './read/read-atmosphere.ts'
import { readClaimed } from './read/read-claimed.ts'
import { readDate, readOtherDates, readWindow, warnOutsideWindow } from './read/read-dates.ts'
import { readFormula } from './read/read-formula.ts'
import { type Fields, readMapping } from './read/read-mapping.ts'
import { readNorth } from './read/read-north.ts'
import { readPoints } from './read/read-points.ts'
import { readAssumedPrecision, readPlausiblePrecision, readTolerances } from './read/read-precision.ts'
import { readSightlines } from './read/read-sightlines.ts'
import { readStructure } from './read/read-structure.ts'
import { readTarget } from './read/read-target.ts'
import { readNotes, readText } from './read/read-text.ts'
import type { StarFinder } from './star-finder.ts'

const MOST_PROBLEMS = 100
/** What is wrong with keys is so whatever their values are. */
const OF_KEYS: ReadonlySet<string> = new Set(['unknown-key', 'duplicate-key', 'missing-key'])

type FileFields = Fields<keyof typeof KEYS.file>

/** What reading a claim needs to know of the sky. */
export interface ReadingHelp {
  findStar: StarFinder
}

/**
 * Reads a claim file. All problems of the file come at once, in the order of the text; the claim is null
 * exactly where one of them is an error. Never throws.
 */
export function readClaim(
  text: string,
  { findStar }: ReadingHelp,
): { claim: Claim | null; problems: Problem[] } {
  const yaml = parseYaml(text)
  const problems = [...yaml.problems]
  const content: Problem[] = []
  const context: Context = {
    text,
    findStar,
    lineOf: yaml.lineOf,
    report: (problem) => content.push(problem),
  }
  const claim = readRoot(yaml.root, context, problems.length > 0)
  // Behind a break of syntax keys may have been taken for others, and some for missing.
  const isSound = ({ code, offset }: Problem) => code !== 'missing-key' && offset < yaml.soundUntil
  const told = content.filter(
    ({ code, offset }) => OF_KEYS.has(code) || !yaml.mendedLines.has(yaml.lineOf(offset)),
  )
  problems.push(...(yaml.soundUntil === Number.POSITIVE_INFINITY ? told : told.filter(isSound)))
  const isUsable = problems.every(({ severity }) => severity === 'warning')
  const inside = problems.map((problem) => clipped(problem, text)).sort((a, b) => a.offset - b.offset)
  return { claim: isUsable ? claim : null, problems: limited(inside) }
}

/** Marks at least one character, inside the text: something missing at its end is told of behind the last one. */
function clipped(problem: Problem, text: string): Problem {
  const offset = Math.max(0, Math.min(problem.offset, text.length - 1))
  return { ...problem, offset, length: Math.max(1, Math.min(problem.length, text.length - offset)) }
}

/** A file that is no claim at all would have thousands. */
function limited(problems: Problem[]): Problem[] {
  const rest = problems.slice(MOST_PROBLEMS)
  const [next] = rest
  if (next === undefined) return problems
  const severity = rest.some((problem) => problem.severity === 'error') ? 'error' : 'warning'
  const message = `the file has ${rest.length} more problems from here on`
  const expected = 'a file with fewer: put the first ones right'
  const last: Problem = {
    ...next,
    severity,
    code: 'too-many-problems',
    message,
    expected,
    suggestion: null,
    path: null,
  }
  return [...problems.slice(0, MOST_PROBLEMS), last]
}

function readRoot(root: Node | null, context: Context, isBroken: boolean): Claim | null {
  const start = root?.range?.[0] ?? 0
  const file: Field = { name: 'the file', path: '', keyAt: { offset: start, length: 1 }, node: root }
  if (isMap(root)) {
    const fields = readMapping(file, KEYS.file, context)
    return fields === null ? null : assemble(fields, root, context)
  }
  const expected = 'keys with values; `datestone new FILE` writes a file to fill in'
  if (!isEmpty(file))
    reportError(context, file, 'not-a-mapping', 'the file is not a mapping of keys to values', { expected })
  else if (!isBroken)
    reportError(context, file, 'empty-file', 'the file is empty', { expected, at: { offset: 0, length: 1 } })
  return null
}

function assemble(fields: FileFields, root: Node, context: Context): Claim | null {
  const statement = readText(fields.get('claim'), context)
  const structure = readStructure(fields.get('structure'), context)
  const points = readPoints(fields.get('points'), context)
  const around = {
    points,
    hasPoints: fields.has('points'),
    shared: readTarget(fields.get('target'), context),
    hasShared: fields.has('target'),
  }
  const sightlines = readSightlines(fields.get('sightlines'), around, context)
  const dates = readDates(fields, context)
  const north = readNorth(fields.get('north'), context)
  warnUnusedNorth(fields.get('north'), sightlines, context)
  const others = {
    source: readText(fields.get('source'), context),
    assumedPrecisionArcmin: readAssumedPrecision(fields.get('assumed_precision'), context),
    plausiblePrecision: readPlausiblePrecision(fields.get('plausible_precision'), context),
    atmosphere: readAtmosphere(fields.get('atmosphere'), context),
    claimed: readClaimed(fields.get('claimed'), context),
    formula: readFormula(fields.get('formula'), context),
    tolerancesArcmin: readTolerances(fields.get('tolerances'), context),
    notes: readNotes(fields.get('notes'), context),
  }
  if (statement === null || structure === null || dates.assertedDate === null) return null
  const soundPoints = new Map(
    [...(points ?? [])].flatMap(([name, point]) => (point === null ? [] : [[name, point]])),
  )
  const echo = echoNode(root) as Claim['echo']
  const { assertedDate, otherDates, window } = dates
  return {
    statement,
    structure,
    north,
    points: soundPoints,
    sightlines,
    assertedDate,
    otherDates,
    window,
    ...others,
    echo,
  }
}

function readDates(fields: FileFields, context: Context) {
  const window = readWindow(fields.get('window'), context)
  const asserted = fields.get('asserted_date')
  const assertedDate = readDate(asserted, context)
  const others = readOtherDates(fields.get('other_dates'), context)
  const isWindowSound = window !== 'omitted' || !fields.has('window')
  if (isWindowSound) {
    if (assertedDate !== null && asserted !== undefined)
      warnOutsideWindow(assertedDate, asserted, window, context)
    for (const { date, field } of others) warnOutsideWindow(date, field, window, context)
  }
  return { window, assertedDate, otherDates: others.map(({ label, date }) => ({ label, date })) }
}

function warnUnusedNorth(field: Field | undefined, sightlines: Claim['sightlines'], context: Context): void {
  const isUsed = sightlines.some(({ direction }) => direction.by === 'points')
  if (field === undefined || isUsed || sightlines.length === 0) return
  const isDirection = sightlines.some(({ direction }) => direction.by === 'azimuth')
  reportWarning(context, field, 'unused-key', '`north` is not used: no sightline runs between points', {
    expected: isDirection ? 'the uncertainty of north as part of the ± of each azimuth' : 'a file without it',
    at: field.keyAt,
  })
}
