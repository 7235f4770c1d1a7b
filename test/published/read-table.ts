import { readFileSync } from 'node:fs'

/** One row of a table: its numbers by the names in the table's heading. */
export type Row = Readonly<Record<string, number>>

/**
 * Rows of a comma-separated table beside this file. Lines that begin with `#` name its source; the first other line
 * is the heading. Throws where a cell is no number, so that no test compares against NaN.
 */
export function readTable(name: string): readonly Row[] {
  const text = readFileSync(new URL(name, import.meta.url), 'utf8')
  const [heading, ...lines] = text.split('\n').filter((line) => line !== '' && !line.startsWith('#'))
  const names = heading!.split(',')
  return lines.map((line) => {
    const cells = line.split(',').map(Number)
    if (cells.length !== names.length || cells.some((cell) => !Number.isFinite(cell)))
      throw new Error(`${name}: not a row of ${names.length} numbers: ${line}`)
    return Object.fromEntries(names.map((key, i) => [key, cells[i]!]))
  })
}
