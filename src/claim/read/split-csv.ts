import { parse } from 'csv-parse/sync'
import type { Stretch } from '../../quantity/misread.ts'

/** A cell of a table: its text without quotes and the space around it, and where it stands in the file. */
export interface Cell {
  text: string
  at: Stretch
  isQuoted: boolean
}

/** A line of a table. A quote that is not closed, or closed before the end of its cell, breaks the line. */
export type CsvLine = { line: number; at: Stretch; cells: readonly Cell[] } | { brokenAt: Stretch }

export type Separator = ',' | ';' | '\t'
const SEPARATORS: readonly Separator[] = [';', '\t', ',']

/** Whatever separates the cells of a heading; a comma where nothing does. */
export function separatorOf(text: string): Separator {
  const heading =
    linesOf(text)
      .next()
      .value?.text.replace(/"(?:[^"]|"")*"/g, '') ?? ''
  return SEPARATORS.find((separator) => heading.includes(separator)) ?? ','
}

const IN_QUOTES = /^\s*"[^"]*(?:""[^"]*)*"\s*$/

/**
 * The lines of a table with their cells, one after the other as they are asked for; empty lines and those that begin
 * with # are left out. A cell ends on its line: so a quote that nothing closes is told where it stands and does not
 * swallow what follows.
 */
export function* splitCsv(text: string, separator: Separator): Generator<CsvLine, undefined> {
  for (const { text: line, offset, number } of linesOf(text)) {
    const cells = line.includes('"') ? quotedCells(line, separator) : plainCells(line, separator)
    if (cells === null) {
      const quote = brokenQuote(line, separator)
      yield { brokenAt: { offset: offset + quote, length: line.length - quote } }
      continue
    }
    const moved = cells.map((cell) => ({ ...cell, at: { ...cell.at, offset: cell.at.offset + offset } }))
    yield { line: number, at: { offset, length: line.length }, cells: moved }
  }
}

function* linesOf(text: string): Generator<{ text: string; offset: number; number: number }, undefined> {
  let number = 0
  for (const match of text.matchAll(/([^\r\n]*)(?:\r\n|\r|\n|$)/g)) {
    number += 1
    const mark = match.index === 0 && text.startsWith('\ufeff') ? 1 : 0
    const line = (match[1] ?? '').slice(mark)
    if (/^\s*(?:#|$)/.test(line)) continue
    yield { text: line, offset: match.index + mark, number }
  }
}

function plainCells(line: string, separator: Separator): readonly Cell[] {
  let start = 0
  return line.split(separator).map((raw) => {
    const cell = cellAt(raw, raw.trim(), start, false)
    start += raw.length + separator.length
    return cell
  })
}

/** Null where a quote is out of place. The library counts in bytes where a cell ends. */
function quotedCells(line: string, separator: Separator): readonly Cell[] | null {
  const bytes = Buffer.from(line)
  const cells: Cell[] = []
  let start = 0
  let offset = 0
  let isSound = true
  const take = (value: string, { bytes: end, quoting }: { bytes: number; quoting: boolean }) => {
    const raw = bytes.subarray(start, end).toString()
    if (quoting && !IN_QUOTES.test(raw)) isSound = false
    cells.push(cellAt(raw, value, offset, quoting))
    start = end + separator.length
    offset += raw.length + separator.length
    return value
  }
  try {
    parse(line, {
      delimiter: separator,
      record_delimiter: ['\n'],
      // Plain quotes stand for seconds of arc as well: 41°16'12" N.
      relax_quotes: true,
      trim: true,
      cast: take,
    })
  } catch {
    return null
  }
  return isSound ? cells : null
}

function cellAt(raw: string, text: string, start: number, isQuoted: boolean): Cell {
  const { length } = raw.trim()
  const at = { offset: start + (length === 0 ? 0 : raw.search(/\S/)), length: Math.max(1, length) }
  return { text, at, isQuoted }
}

/** Where the first cell begins whose quotes do not close it. */
function brokenQuote(line: string, separator: Separator): number {
  const cell = new RegExp(
    String.raw`\s*(?:"(?:[^"]|"")*"\s*(?=${separator}|$)|[^"${separator}\s][^${separator}]*|(?=${separator}|$))${separator}?`,
    'y',
  )
  let offset = 0
  while (offset < line.length) {
    cell.lastIndex = offset
    const [matched = ''] = cell.exec(line) ?? []
    if (matched === '') break
    offset += matched.length
  }
  return offset + (/\S/.exec(line.slice(offset))?.index ?? 0)
}
