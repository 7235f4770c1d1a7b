import { isMap, type Node } from 'yaml'
import type { Problem } from '../quantity/problem.ts'
import type { Claim } from './claim.ts'
import { KEYS } from './keys.ts'
import { checkFarGrid } from './read/check-far-grid.ts'
import { checkPoints } from './read/check-points.ts'
import { echoNode } from './read/echo.ts'
import { type Context, type Field, isEmpty, peek, reportError } from './read/field.ts'
import { limitProblems } from './read/limit-problems.ts'
import { parseYaml } from './read/parse-yaml.ts'
import { readAtmosphere } from './read/read-atmosphere.ts'
import { readClaimed } from './read/read-claimed.ts'
import { readDate, readOtherDates, readWindow, warnOutsideWindow } from './read/read-dates.ts'
import { readFormula } from './read/read-formula.ts'
import { readGrid } from './read/read-grid.ts'
import { type Fields, readMapping } from './read/read-mapping.ts'
import { readNorth } from './read/read-north.ts'
import { readPoints } from './read/read-points.ts'
import { readAssumedPrecision, readPlausiblePrecision, readTolerances } from './read/read-precision.ts'
import { readSightlines } from './read/read-sightlines.ts'
import { readStructure } from './read/read-structure.ts'
import { readTarget } from './read/read-target.ts'
import { readNotes, readText } from './read/read-text.ts'
import { restsOnGrid } from './read/rests-on-grid.ts'
import { warnUnusedGrid, warnUnusedNorth } from './read/warn-unused.ts'
import type { ReadingHelp } from './reading-help.ts'

/** What is wrong with keys is so whatever their values are. */
const OF_KEYS: ReadonlySet<string> = new Set(['unknown-key', 'duplicate-key', 'missing-key'])

type FileFields = Fields<keyof typeof KEYS.file>

/**
 * Reads a claim file. All problems of the file come at once, in the order of the text; the claim is null
 * exactly where one of them is an error. Never throws.
 */
export function readClaim(text: string, help: ReadingHelp): { claim: Claim | null; problems: Problem[] } {
  const yaml = parseYaml(text)
  const content: Problem[] = []
  const context: Context = {
    text,
    findStar: help.findStar,
    beside: {
      read: help.readBeside ?? (() => ({ trouble: 'no other files can be read here' })),
      attachments: new Map(),
      skylines: new Map(),
    },
    lineOf: yaml.lineOf,
    report: (problem) => content.push(problem),
  }
  const claim = readRoot(yaml.root, help, context, yaml.problems.length > 0)
  // Behind a break of syntax keys may have been taken for others, and some for missing.
  const isSound = (problem: Problem) => problem.code !== 'missing-key' && placeOf(problem) < yaml.soundUntil
  const told = content.filter(
    (problem) => OF_KEYS.has(problem.code) || !yaml.mendedLines.has(yaml.lineOf(placeOf(problem))),
  )
  const problems = [
    ...yaml.problems,
    ...(yaml.soundUntil === Number.POSITIVE_INFINITY ? told : told.filter(isSound)),
  ]
  const isUsable = problems.every(({ severity }) => severity === 'warning')
  const inside = problems.map((problem) => clipped(problem, problem.beside?.text ?? text)).sort(inOrder)
  return { claim: isUsable ? claim : null, problems: limitProblems(inside) }
}

/** Where in the claim file a problem belongs: one of a file beside it where that is named. */
function placeOf({ beside, offset }: Problem): number {
  return beside?.namedAt ?? offset
}

/** What is wrong in a file beside the claim file follows what is wrong with its name. */
function inOrder(a: Problem, b: Problem): number {
  if (placeOf(a) !== placeOf(b)) return placeOf(a) - placeOf(b)
  if ((a.beside === undefined) !== (b.beside === undefined)) return a.beside === undefined ? -1 : 1
  return a.offset - b.offset
}

/** Marks at least one character, inside the text: something missing at its end is told of behind the last one. */
function clipped(problem: Problem, text: string): Problem {
  const offset = Math.max(0, Math.min(problem.offset, text.length - 1))
  return { ...problem, offset, length: Math.max(1, Math.min(problem.length, text.length - offset)) }
}

function readRoot(root: Node | null, help: ReadingHelp, context: Context, isBroken: boolean): Claim | null {
  const start = root?.range?.[0] ?? 0
  const file: Field = { name: 'the file', path: '', keyAt: { offset: start, length: 1 }, node: root }
  if (isMap(root)) {
    const fields = readMapping(file, KEYS.file, context)
    return fields === null ? null : assemble(fields, root, help, context)
  }
  const expected = 'keys with values; `datestone new FILE` writes a file to fill in'
  if (!isEmpty(file))
    reportError(context, file, 'not-a-mapping', 'the file is not a mapping of keys to values', { expected })
  else if (!isBroken)
    reportError(context, file, 'empty-file', 'the file is empty', { expected, at: { offset: 0, length: 1 } })
  return null
}

function assemble(fields: FileFields, root: Node, help: ReadingHelp, context: Context): Claim | null {
  const statement = readText(fields.get('claim'), context)
  const structure = readStructure(fields.get('structure'), context)
  const survey = readSurvey(fields, structure, help, context)
  const { grid, north, points, sightlines } = survey
  const dates = readDates(fields, context)
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
  const soundPoints = [...points.byName].flatMap(([name, { point }]) =>
    point === null ? [] : [[name, point] as const],
  )
  const attachments = [...context.beside.attachments].map(([path, sha256]) => ({ path, sha256 }))
  const echo = echoNode(root) as Claim['echo']
  const { assertedDate, otherDates, window } = dates
  return {
    statement,
    structure,
    north,
    grid,
    points: new Map(soundPoints),
    sightlines,
    assertedDate,
    otherDates,
    window,
    ...others,
    attachments,
    echo,
  }
}

/** Reads the points, what they stand on, and the lines. */
function readSurvey(
  fields: FileFields,
  structure: Claim['structure'] | null,
  { magneticDates }: ReadingHelp,
  context: Context,
) {
  const grid = readGrid(fields.get('grid'), context)
  const points = readPoints(fields.get('points'), fields.has('points'), context)
  const hasGrid = fields.has('grid')
  checkPoints(points, { grid, hasGrid, structure })
  const place = fields.get('structure')
  const hasLongitude = place === undefined || structure === null || peek(place, 'longitude') !== null
  const north = readNorth(fields.get('north'), { grid, hasGrid, hasLongitude, magneticDates }, context)
  const isNeeded = restsOnGrid(north) || [...points.byName.values()].some(({ kind }) => kind === 'grid')
  const isInReach = checkFarGrid(fields.get('grid'), grid, { structure, isNeeded }, context)
  const shared = readTarget(fields.get('target'), context)
  const around = {
    points,
    grid: isInReach ? grid : null,
    hasGrid,
    shared,
    hasShared: fields.has('target'),
  }
  const sightlines = readSightlines(fields.get('sightlines'), around, context)
  const lines = fields.get('sightlines')?.node
  // A line that could not be read may be the one that uses them.
  if (isMap(lines) && lines.items.length === sightlines.length) {
    warnUnusedNorth(fields.get('north'), sightlines, points, context)
    warnUnusedGrid(fields.get('grid'), { sightlines, points, north }, context)
  }
  return { grid, points, sightlines, north }
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
