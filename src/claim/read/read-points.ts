import { isMap } from 'yaml'
import { quoted } from '../../quantity/quoted.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { Point } from '../claim.ts'
import { KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { type PlaceKind, type PointKey, WITH_UNITS } from './point-kinds.ts'
import { type Fields, readMapping } from './read-mapping.ts'
import { readNames } from './read-names.ts'
import { readPlaceKind, readPoint, readPointUncertainty } from './read-point.ts'
import { readPointTable } from './read-point-table.ts'
import { plainText } from './read-text.ts'

/** A point with where it stands; `kind` or `point` is null where it cannot be told, so that lines may still name it. */
export interface ReadPoint {
  kind: PlaceKind | null
  point: Point | null
  field: Field
  fields: Fields<PointKey> | null
  /** Tells its problems in the file it stands in. */
  context: Context
}

/** The points of the survey. */
export interface ReadPoints {
  byName: ReadonlyMap<string, ReadPoint>
  /** False where some could not be told at all: a line may then name one that is not here. */
  isWhole: boolean
  /** Whether the file has the key. */
  isStated: boolean
}

const EXPECTED =
  'a name for each point, such as hearthstone: {east: 0 m, north: 0 m}, or a table beside this file, such as survey.csv'
const SETTINGS: ReadonlySet<string> = new Set(Object.keys(KEYS.pointSettings))

/** Reads the points, those of a table beside the claim file after its own; `isStated` also where the key is misspelt. */
export function readPoints(field: Field | undefined, isStated: boolean, context: Context): ReadPoints {
  if (field === undefined) return { byName: new Map(), isWhole: !isStated, isStated }
  const byName = new Map<string, ReadPoint>()
  if (plainText(field) !== null) {
    const isWhole = readPointTable(field, field, byName, 'omitted', context)
    return { byName, isWhole, isStated }
  }
  const entries = readNames(field, context, EXPECTED)
  if (entries === null) return { byName, isWhole: false, isStated }
  const settings = entries.filter(isSetting)
  const shared = readShared(settings, context)
  for (const entry of entries.filter((each) => !isSetting(each)))
    byName.set(entry.name, readStatedPoint(entry, shared, context))
  const file = settings.find(({ name }) => name === 'file')
  const isWhole = file === undefined || readPointTable(file, field, byName, shared, context)
  if (isMap(field.node) && field.node.items.length === 0)
    reportError(context, field, 'empty-value', `${quoted(field.name)} names no point`, {
      expected: EXPECTED,
      at: field.keyAt,
    })
  return { byName, isWhole, isStated }
}

/** A point may be called `file`, and is then told by its keys. */
function isSetting({ name, node }: Field): boolean {
  return SETTINGS.has(name) && !isMap(node)
}

function readShared(settings: readonly Field[], context: Context): number | Unstated {
  const field = settings.find(({ name }) => name === 'uncertainty')
  return readPointUncertainty(field, WITH_UNITS, context) ?? 'omitted'
}

function readStatedPoint(field: Field, shared: number | Unstated, context: Context): ReadPoint {
  const fields = readMapping(field, KEYS.point, context)
  if (fields === null) return { kind: null, point: null, field, fields, context }
  const kind = readPlaceKind(field, fields, context)
  const point = kind === null ? null : readPoint(kind, fields, WITH_UNITS, shared, context)
  return { kind, point, field, fields, context }
}
