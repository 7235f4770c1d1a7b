import { type AngleKind, AZIMUTH, HORIZON_ALTITUDE } from '../../quantity/angle-kind.ts'
import { wrap360 } from '../../quantity/degrees.ts'
import { quoted } from '../../quantity/quoted.ts'
import { readAngle } from '../../quantity/read-angle.ts'
import { readUncertainty } from '../../quantity/read-uncertainty.ts'
import type { SkylineNode } from '../claim.ts'
import type { CsvRow } from './csv-rows.ts'
import { degreesText } from './degrees-text.ts'
import { type Context, type Field, reportError } from './field.ts'
import { ALTITUDE_UNCERTAINTY } from './kinds.ts'
import { type CsvTable, cellField, readCsvTable, reportMissingColumn } from './read-csv-table.ts'
import { readQuantity } from './read-quantity.ts'
import type { Cell } from './split-csv.ts'

const COLUMNS = ['azimuth', 'altitude', 'uncertainty'] as const
const bare = (kind: AngleKind, example: string): AngleKind => ({ ...kind, example, takesBareDegrees: true })
const KINDS = {
  azimuth: bare(AZIMUTH, '49.57'),
  altitude: bare(HORIZON_ALTITUDE, '1.5'),
  uncertainty: bare(ALTITUDE_UNCERTAINTY, '0.03'),
}
/** Between two places farther apart there is no telling which way round the skyline runs. */
const WIDEST_STEP_DEG = 180

/** Reads the table of a skyline that a field names; null, with the problem reported, where it is none. */
export function readSkyline(field: Field, context: Context): readonly SkylineNode[] | null {
  const table = readCsvTable(field, COLUMNS, context)
  if (table === null) return null
  const inTable: Field = { ...field, keyAt: table.headingAt, node: null }
  const missing = COLUMNS.filter((column) => column !== 'uncertainty' && !table.heading.has(column))
  for (const column of missing)
    reportMissingColumn(table, inTable, column, 'the columns azimuth and altitude, in degrees')
  const isReadable = COLUMNS.every((column) => table.heading.get(column) !== null)
  if (missing.length > 0 || !isReadable) return null
  const nodes = table.rows.map((row) => readNode(row, inTable, table.context))
  const isComplete = table.isWhole && nodes.every((node) => node !== null)
  if (isComplete && nodes.length < 2) {
    reportError(table.context, inTable, 'too-few-rows', `${quoted(table.path)} has fewer than two rows`, {
      expected: 'two places of the skyline or more',
      at: table.headingAt,
    })
    return null
  }
  const isSkyline = isComplete && checkOrder(table, nodes, inTable)
  return isSkyline ? nodes.filter((node) => node !== null) : null
}

function readNode({ cells }: CsvRow, field: Field, context: Context): SkylineNode | null {
  const fieldOf = (column: (typeof COLUMNS)[number]) => {
    const cell = cells.get(column)
    const isThere = cell !== undefined && (cell.text !== '' || column !== 'uncertainty')
    return isThere ? cellField(cell, column, field.path) : undefined
  }
  const angle = (column: 'azimuth' | 'altitude') =>
    readQuantity(
      fieldOf(column),
      (text) => readAngle(text, KINDS[column]),
      `degrees such as ${KINDS[column].example}`,
      context,
    )
  const [azimuthDeg, altitudeDeg] = [angle('azimuth'), angle('altitude')]
  const sdDeg = readQuantity(
    fieldOf('uncertainty'),
    (text) => readUncertainty(text, (size) => readAngle(size, KINDS.uncertainty)),
    'degrees such as 0.03, or unknown',
    context,
  )
  if (azimuthDeg === null || altitudeDeg === null) return null
  return { azimuthDeg, altitudeDeg, sdDeg: sdDeg ?? 'omitted' }
}

/** Whether the places follow each other to the right, at most once round, and end as they began where they close. */
function checkOrder(table: CsvTable, nodes: readonly (SkylineNode | null)[], field: Field): boolean {
  const tell = (row: number, column: 'azimuth' | 'altitude', what: string, expected: string) => {
    const cell: Cell | undefined = table.rows[row]?.cells.get(column)
    if (cell === undefined) return
    const message = `${quoted(cell.text)} ${what}`
    reportError(table.context, cellField(cell, column, field.path), 'not-a-skyline', message, { expected })
  }
  let turnedDeg = 0
  for (const [row, node] of nodes.entries()) {
    const before = nodes[row - 1]
    if (node === null || before == null) continue
    const step = wrap360(node.azimuthDeg - before.azimuthDeg)
    turnedDeg += step
    const expected = 'the skyline from left to right, azimuths growing and passing north at most once'
    if (step === 0 || step >= WIDEST_STEP_DEG) {
      tell(
        row,
        'azimuth',
        `does not lie to the right of ${degreesText(before.azimuthDeg)}, within ${WIDEST_STEP_DEG}°`,
        expected,
      )
      return false
    }
    if (turnedDeg > 360 + 1e-9) {
      tell(row, 'azimuth', 'goes round a second time', expected)
      return false
    }
  }
  const [first, last] = [nodes[0], nodes.at(-1)]
  if (turnedDeg < 360 - 1e-9 || first == null || last == null || first.altitudeDeg === last.altitudeDeg)
    return true
  tell(
    nodes.length - 1,
    'altitude',
    `is not the altitude it began with, ${degreesText(first.altitudeDeg)}, though it goes all the way round`,
    'the same altitude at both ends',
  )
  return false
}
