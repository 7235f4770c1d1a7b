import { Scalar } from 'yaml'
import { foldWord } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import {
  type CsvHeading,
  type CsvRow,
  csvRows,
  reportBroken,
  type SoundLine,
  withoutEmptyEnd,
} from './csv-rows.ts'
import { type Context, type Field, reportError } from './field.ts'
import { nearestKey } from './nearest-key.ts'
import { type BesideFile, readBesideFile } from './read-beside-file.ts'
import { type Cell, separatorOf, splitCsv } from './split-csv.ts'

/** Far more than any table has that is meant for this program. */
const MOST_COLUMNS = 100

/** A table beside the claim file. `isWhole` is false where a row could not be taken apart, which has been told. */
export interface CsvTable extends BesideFile {
  /** Each column with its heading; null where a misspelt heading is most likely meant for it. */
  heading: ReadonlyMap<string, Cell | null>
  headingAt: { offset: number; length: number }
  rows: readonly CsvRow[]
  isWhole: boolean
}

/**
 * Reads the table that a field names. Its heading may have the given columns in any order; the separator is a comma, a
 * semicolon or a tab. Null, with the problem reported, where there is none to read.
 */
export function readCsvTable(field: Field, columns: readonly string[], context: Context): CsvTable | null {
  const file = readBesideFile(field, context)
  if (file === null) return null
  const separator = separatorOf(file.text)
  const lines = splitCsv(file.text, separator)
  const first = lines.next().value
  if (first === undefined) {
    reportError(context, field, 'empty-file', `${quoted(file.path)} is empty`, {
      expected: `a table with the columns ${columns.slice(0, 3).join(', ')}`,
    })
    return null
  }
  const inFile: Field = { ...field, keyAt: { offset: 0, length: 1 }, node: null }
  if (!('cells' in first)) {
    reportBroken(first, inFile, file.context)
    return null
  }
  if (withoutEmptyEnd(first.cells).length > MOST_COLUMNS) {
    reportError(file.context, inFile, 'file-too-large', `the table has more than ${MOST_COLUMNS} columns`, {
      expected: `the columns ${columns.join(', ')}`,
      at: first.at,
    })
    return null
  }
  const names = headingOf(first, columns, inFile, file.context)
  const { rows, isWhole } = csvRows(lines, names, separator, inFile, file.context)
  const heading = new Map(names.flatMap(({ column, cell }) => (column === null ? [] : [[column, cell]])))
  return { ...file, heading, headingAt: first.at, rows, isWhole }
}

/** A cell as a field of a name and a path, for the readers of values. */
export function cellField(cell: Cell, name: string, path: string): Field {
  return { name, path, keyAt: cell.at, node: cell.text === '' ? null : scalarOf(cell) }
}

function scalarOf({ text, at, isQuoted }: Cell): Scalar {
  const scalar = new Scalar(text)
  const end = at.offset + at.length
  scalar.range = [at.offset, end, end]
  scalar.type = isQuoted ? 'QUOTE_DOUBLE' : 'PLAIN'
  return scalar
}

/** Reports that a table lacks a column, at its heading. */
export function reportMissingColumn(
  { path, headingAt, context }: CsvTable,
  field: Field,
  column: string,
  expected: string,
): void {
  const message = `${quoted(path)} has no column ${quoted(column)}`
  reportError(context, field, 'missing-column', message, { expected, at: headingAt })
}

function headingOf(
  line: SoundLine,
  columns: readonly string[],
  field: Field,
  context: Context,
): readonly CsvHeading[] {
  const cells = withoutEmptyEnd(line.cells)
  const known = (cell: Cell) => columns.find((column) => foldWord(column) === foldWord(cell.text)) ?? null
  const free = columns.filter((column) => !cells.some((cell) => known(cell) === column))
  const taken = new Set<string>()
  return cells.map((cell) => {
    const column = known(cell)
    if (column === null)
      return { column: reportUnknownColumn(cell, columns, free, field, context), cell: null }
    if (taken.has(column))
      reportError(context, field, 'duplicate-column', `the column ${quoted(cell.text)} is there twice`, {
        expected: 'each column once',
        at: cell.at,
      })
    const isFirst = !taken.has(column)
    taken.add(column)
    return { column: isFirst ? column : null, cell }
  })
}

/** The column that is most likely meant, or null. */
function reportUnknownColumn(
  { text, at }: Cell,
  columns: readonly string[],
  free: readonly string[],
  field: Field,
  context: Context,
): string | null {
  const suggestion = nearestKey(text, free)
  const message = text === '' ? 'a column has no heading' : `there is no column ${quoted(text)} here`
  const expected = `a heading of ${columns.join(', ')}`
  reportError(context, field, 'unknown-column', message, { expected, suggestion, at })
  return suggestion
}
