import { readFileSync } from 'node:fs'

/** One row of a table: its cells as written, by the names in the table's heading. */
export type TextRow = Readonly<Record<string, string>>

/**
 * Rows of a comma-separated table beside this file. Lines that begin with `#` name its source; the first other line
 * is the heading. Throws where a row has another number of cells.
 */
export function readTextTable(name: string): readonly TextRow[] {
  const text = readFileSync(new URL(name, import.meta.url), 'utf8')
  const [heading, ...lines] = text.split('\n').filter((line) => line !== '' && !line.startsWith('#'))
  const names = heading!.split(',')
  return lines.map((line) => {
    const cells = line.split(',')
    if (cells.length !== names.length) throw new Error(`${name}: not a row of ${names.length} cells: ${line}`)
    return Object.fromEntries(names.map((key, i) => [key, cells[i]!]))
  })
}

/** The number in a cell; null where the cell is blank. Throws where it is no number. */
export function numberIn(cell: string | undefined): number | null {
  if (cell === '') return null
  const value = Number(cell)
  if (!Number.isFinite(value)) throw new Error(`not a number: ${cell}`)
  return value
}
