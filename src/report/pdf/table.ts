import type { Table } from 'mdast'
import type { Column } from './column.ts'
import { inlineRuns, plainRun } from './inline-runs.ts'
import { drawRule } from './rule.ts'
import type { Shaper } from './shaper.ts'
import { joined, type Painter, type Strip, strip, totalHeight, withGaps } from './strip.ts'
import { baselineOf, FRAME, RULE_INK, TEXT } from './style.ts'
import { type Cell, cellPlaces, cellStrips, cellsOf, sunk } from './table-cells.ts'
import type { Tag } from './tagging.ts'
import { lineStrips, linesOfRuns, paintLine } from './text-lines.ts'

const ROW_PADDING = 2.5
const THICK = 0.9
const THIN = 0.5
/** A table with a caption that is no taller than this is not divided. */
const TALLEST_UNDIVIDED = FRAME.height * 0.45
const GAP = 16
const CAPTION_GAP = 4

/** A table with its caption above: rules at top and bottom and under the head, none between rows or columns. */
export function tableStrips(node: Table, column: Column, shape: Shaper): Strip[] {
  const [headRow, ...bodyRows] = node.children
  if (!headRow) throw new Error('The PDF cannot print a table without rows.')
  const tag: Tag = { role: 'Table', parent: column.tag }
  const places = cellPlaces(node, headRow.children.length, column)

  const caption = captionStrips(node, column, tag, shape)
  const headCell: Tag = { role: 'TH', parent: row({ role: 'THead', parent: tag }), scope: 'Column' }
  const headCells = cellsOf(headRow, places, TEXT.tableHead, headCell, shape)
  const head = headStrip(headCells, column)

  const series = { head: repeatedHead(node, headCells, column, shape), foot: rule(column, THIN) }
  const body: Tag = { role: 'TBody', parent: tag }
  const rows = bodyRows.map((each) => {
    const cells = cellsOf(each, places, TEXT.table, { role: 'TD', parent: row(body) }, shape)
    return rowStrips(cells, FRAME.height - series.head.height)
  })
  const divisible = keepEnds(rows).map((each) => ({ ...each, series }))
  const all = [...[...caption, head].map(keepWithNext), ...divisible, rule(column, THICK)]
  const floats = caption.length > 0 && totalHeight(all) <= TALLEST_UNDIVIDED
  return withGaps(floats ? [{ ...joined(all), floats }] : all, GAP, GAP)
}

const row = (parent: Tag): Tag => ({ role: 'TR', parent })

const keepWithNext = (each: Strip): Strip => ({ ...each, keepWithNext: true })

/** Two rows at least on either side of a page break, and the closing rule with the last row. */
function keepEnds(rows: readonly Strip[][]): Strip[] {
  return rows.flatMap((strips, index) => {
    const isEnd = index === 0 || index >= rows.length - 2
    return isEnd ? [...strips.slice(0, -1), keepWithNext(strips.at(-1)!)] : strips
  })
}

/** A row is one strip, or one a line where it is taller than a page. */
function rowStrips(cells: readonly Cell[], tallest: number): Strip[] {
  const strips = cellStrips(cells, TEXT.table, ROW_PADDING)
  return totalHeight(strips) <= tallest ? [joined(strips)] : strips
}

function headStrip(cells: readonly Cell[], column: Column): Strip {
  const lines = cellStrips(sunk(cells), TEXT.tableHead, ROW_PADDING + 0.5)
  return joined([rule(column, THICK), ...lines, rule(column, THIN), strip(1, () => {})])
}

/** What stands above the rows on a further page: no part of the text, which has it already. */
function repeatedHead(node: Table, cells: readonly Cell[], column: Column, shape: Shaper): Strip {
  const { number } = node.data ?? {}
  const label = number === undefined ? 'Continued' : `Table ${number}, continued`
  const runs = [plainRun(label, TEXT.caption, TEXT.caption.strong)]
  const [line] = linesOfRuns(runs, TEXT.caption, column.width, shape)
  const caption = strip(TEXT.caption.leading + CAPTION_GAP, (painter, top) =>
    paintLine(painter, line!, column.left, top + baselineOf(TEXT.caption), null),
  )
  const untagged = cells.map((cell) => ({ ...cell, tag: null }))
  const whole = joined([caption, headStrip(untagged, column)])
  const paint = (painter: Painter, top: number) =>
    painter.tagger.artifact('Pagination', () => whole.paint(painter, top))
  return { ...whole, paint }
}

function captionStrips(node: Table, column: Column, table: Tag, shape: Shaper): Strip[] {
  const { number, caption } = node.data ?? {}
  if (!caption) return []
  const label =
    number === undefined ? [] : [plainRun(`Table ${number}\u00a0\u00a0`, TEXT.caption, TEXT.caption.strong)]
  const runs = [...label, ...inlineRuns(caption, TEXT.caption)]
  const lines = linesOfRuns(runs, TEXT.caption, column.width, shape)
  const strips = lineStrips(lines, TEXT.caption, column.left, { role: 'Caption', parent: table })
  return withGaps(strips, 0, CAPTION_GAP)
}

function rule({ left, width }: Column, weight: number): Strip {
  const look = { left, width, weight, colour: RULE_INK }
  return strip(0, (painter, top) => drawRule(painter, look, top))
}
