import { quoted } from '../../quantity/quoted.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { CsvRow } from './csv-rows.ts'
import { type Context, type Field, reportError } from './field.ts'
import { BARE, type MixedPlace, mixedPlace, PLACES, type PlaceKind, type PointKey } from './point-kinds.ts'
import { type CsvTable, cellField, readCsvTable, reportMissingColumn } from './read-csv-table.ts'
import { type Fields, reportOutOfPlace } from './read-mapping.ts'
import { readPoint } from './read-point.ts'
import type { ReadPoint } from './read-points.ts'
import { scalarText } from './read-text.ts'

const COLUMNS = [
  'name',
  'east',
  'north',
  'up',
  'latitude',
  'longitude',
  'easting',
  'northing',
  'elevation',
  'uncertainty',
  'width',
  'form',
] as const satisfies readonly ('name' | PointKey)[]
const EXPECTED = 'a column name, and east and north, or latitude and longitude, or easting and northing'

/**
 * Adds the points of the table that `file` names to those of the claim file, `points` being the key of all of them.
 * False, with the problem reported, where the points of the table cannot all be told.
 */
export function readPointTable(
  file: Field,
  points: Field,
  byName: Map<string, ReadPoint>,
  shared: number | Unstated,
  context: Context,
): boolean {
  const table = readCsvTable(file, COLUMNS, context)
  if (table === null) return false
  const inTable: Field = { ...file, keyAt: table.headingAt, node: null }
  const kind = kindOfTable(table, inTable)
  if (kind === null) return false
  if (table.rows.length === 0 && table.isWhole) {
    reportError(table.context, inTable, 'too-few-rows', `${quoted(table.path)} has a heading and no rows`, {
      expected: 'a row for each point under it',
      at: table.headingAt,
    })
    return false
  }
  const lines = new Map<string, number>()
  const isEveryRowNamed = table.rows
    .map((row) => addRow(row, kind, table, { points, byName, lines, shared }, context))
    .every(Boolean)
  return table.isWhole && isEveryRowNamed
}

/** The kind of all points of the table; null, with the problem reported, where its columns leave it open. */
function kindOfTable(table: CsvTable, field: Field): PlaceKind | null {
  const { heading, context } = table
  const has = (column: string) => heading.has(column)
  const kinds = (['plan', 'grid', 'geographic'] as const).filter((kind) => PLACES[kind].keys.some(has))
  const [kind, ...others] = kinds
  if (!has('name')) reportMissingColumn(table, field, 'name', EXPECTED)
  const mixed = mixedPlace(has)
  if (mixed !== null) return refuseMixed(mixed, table, field)
  if (kind === undefined) {
    reportMissingColumn(table, field, 'east', EXPECTED)
    return null
  }
  for (const column of PLACES[kind].keys)
    if (!has(column)) reportMissingColumn(table, field, column, EXPECTED)
  const { height, called } = PLACES[kind]
  const refuse = (column: string, why: string, expected: string, suggestion: string | null = null) => {
    const cell = heading.get(column)
    if (cell == null) return
    const message = `${quoted(column)} has no place here: ${why}`
    reportOutOfPlace(cellField(cell, column, field.path), { message, expected, suggestion }, context)
  }
  const beside = PLACES[kind].keys.map((key) => quoted(key)).join(' and ')
  for (const other of others)
    for (const column of PLACES[other].keys.filter(has).slice(0, 1))
      refuse(
        column,
        `${beside} say already where the points are`,
        'the points of each kind in a place of their own',
      )
  refuse(
    height === 'up' ? 'elevation' : 'up',
    `the height of a point ${called} is ${quoted(height)}`,
    height,
    has(height) ? null : height,
  )
  const isComplete = has('name') && PLACES[kind].keys.every((key) => heading.get(key) != null)
  return isComplete && heading.get('name') != null && others.length === 0 ? kind : null
}

/** The column that is meant takes the place of the stray one. */
function refuseMixed({ has, stray, meant }: MixedPlace, { heading, context }: CsvTable, field: Field): null {
  const cell = heading.get(stray)
  if (cell == null) return null
  const message = `${quoted(stray)} has no place here: it does not go with ${quoted(has)}`
  const entry = cellField(cell, stray, field.path)
  reportOutOfPlace(entry, { message, expected: meant, suggestion: meant }, context)
  return null
}

interface Collected {
  points: Field
  byName: Map<string, ReadPoint>
  /** The line of each name of the table. */
  lines: Map<string, number>
  shared: number | Unstated
}

/** Whether the row has a name. */
function addRow(
  row: CsvRow,
  kind: PlaceKind,
  { path, context }: CsvTable,
  { points, byName, lines, shared }: Collected,
  outer: Context,
): boolean {
  const cell = row.cells.get('name')
  if (cell === undefined) return false
  const nameField = cellField(cell, 'name', points.path)
  const name = scalarText(nameField, context, 'a name for the point')
  if (name === null) return false
  const field: Field = { name, path: `${points.path}.${name}`, keyAt: cell.at, node: null }
  const fields = fieldsOf(row, field)
  const point = readPoint(kind, fields, BARE, shared, context)
  const earlier = byName.get(name)
  if (earlier === undefined) {
    byName.set(name, { kind, point, field, fields, context })
    lines.set(name, row.line)
    return true
  }
  const line = lines.get(name) ?? outer.lineOf(earlier.field.keyAt.offset)
  const where = lines.has(name) ? path : 'the claim file'
  reportError(context, field, 'duplicate-key', `${quoted(name)} stands here a second time`, {
    expected: `each name once; the first is on line ${line} of ${where}`,
    at: cell.at,
  })
  return true
}

/** The cells of a row by their columns; what is empty and may be left out is not there. */
function fieldsOf({ cells }: CsvRow, { path }: Field): Fields<PointKey> {
  const isNeeded = (key: string) =>
    Object.values(PLACES).some(({ keys }) => keys.some((each) => each === key))
  const get = (key: PointKey) => {
    const cell = cells.get(key)
    const isThere = cell !== undefined && (cell.text !== '' || isNeeded(key))
    return isThere ? cellField(cell, key, `${path}.${key}`) : undefined
  }
  return { get, has: (key) => get(key) !== undefined }
}
