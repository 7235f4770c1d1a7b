import { type Context, type Field, reportError } from './field.ts'
import type { Cell, CsvLine, Separator } from './split-csv.ts'

const MOST_ROWS = 20_000

/** A line that could be taken apart. */
export type SoundLine = Extract<CsvLine, { cells: readonly Cell[] }>

/** A column with its heading: null where it is not read, or where a misspelt heading is most likely meant for it. */
export interface CsvHeading {
  column: string | null
  cell: Cell | null
}

/** A row of a table: its number of line in the file, and its cells by their columns. */
export interface CsvRow {
  line: number
  cells: ReadonlyMap<string, Cell>
}

/**
 * The rows under a heading; those that cannot be taken apart are told and left out, and `isWhole` is false. They count
 * towards the most that are read, so that a table without a sound row comes to an end as well.
 */
export function csvRows(
  lines: Iterable<CsvLine>,
  names: readonly CsvHeading[],
  separator: Separator,
  field: Field,
  context: Context,
): { rows: readonly CsvRow[]; isWhole: boolean } {
  const rows: CsvRow[] = []
  let broken = 0
  for (const line of lines) {
    const row = rowOf(line, names, separator, field, context)
    if (row === null) broken += 1
    else if (row.cells.size > 0) rows.push(row)
    if (rows.length + broken <= MOST_ROWS) continue
    reportError(context, field, 'file-too-large', `the table has more than ${MOST_ROWS} rows`, {
      expected: `a table of at most ${MOST_ROWS} rows`,
      at: 'at' in line ? line.at : line.brokenAt,
    })
    return { rows, isWhole: false }
  }
  return { rows, isWhole: broken === 0 }
}

/** A row without cells is one that holds nothing; null where it cannot be taken apart. */
function rowOf(
  line: CsvLine,
  names: readonly CsvHeading[],
  separator: Separator,
  field: Field,
  context: Context,
): CsvRow | null {
  if (!('cells' in line)) return reportBroken(line, field, context)
  const used = withoutEmptyEnd(line.cells)
  if (used.length === 0) return { line: line.line, cells: new Map() }
  if (used.length > names.length || line.cells.length < names.length)
    return reportWrongNumber(line, names.length, separator, field, context)
  const cells = names.flatMap(({ column }, index) => {
    const cell = line.cells[index]
    return column === null || cell === undefined ? [] : [[column, cell] as const]
  })
  return { line: line.line, cells: new Map(cells) }
}

function reportWrongNumber(
  { cells, at }: SoundLine,
  columns: number,
  separator: Separator,
  field: Field,
  context: Context,
): null {
  const message = `the row has ${count(cells.length, 'cell')}, and the heading ${count(columns, 'column')}`
  const cured = separator === ',' ? withDecimalPoints(cells, columns) : null
  const hint = cured === null ? '' : '; a decimal comma parts two cells, write a point'
  const expected = `a cell for each column${hint}`
  reportError(context, field, 'wrong-number-of-cells', message, { expected, suggestion: cured, at })
  return null
}

/** `a,84,65,53,09` under three columns is a name and two numbers with decimal commas. */
function withDecimalPoints(cells: readonly Cell[], columns: number): string | null {
  const [name, ...digits] = cells.map(({ text }) => text)
  if (name === undefined || digits.length !== 2 * (columns - 1)) return null
  if (!digits.every((text, index) => (index % 2 === 0 ? /^[-−+]?\d+$/ : /^\d+$/).test(text))) return null
  const numbers = Array.from(
    { length: columns - 1 },
    (_, pair) => `${digits[2 * pair]}.${digits[2 * pair + 1]}`,
  )
  return [name, ...numbers].join(',')
}

/** Reports a line with a quote out of place. */
export function reportBroken(line: Exclude<CsvLine, SoundLine>, field: Field, context: Context): null {
  reportError(context, field, 'unclosed-quote', 'the quote opened here does not close the cell', {
    expected: 'a cell without quotes, or with one at its beginning and one at its end, on one line',
    at: line.brokenAt,
  })
  return null
}

/** Cells without the empty ones at their end, which spreadsheets like to add. */
export function withoutEmptyEnd(cells: readonly Cell[]): readonly Cell[] {
  const last = cells.findLastIndex(({ text }) => text !== '')
  return cells.slice(0, last + 1)
}

function count(number: number, what: string): string {
  return `${number} ${what}${number === 1 ? '' : 's'}`
}
