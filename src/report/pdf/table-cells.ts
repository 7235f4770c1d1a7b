import type { AlignType, Table, TableRow } from 'mdast'
import type { Column } from './column.ts'
import type { Line } from './line-breaking.ts'
import type { Shaper } from './shaper.ts'
import { type Painter, type Strip, strip } from './strip.ts'
import { baselineOf, type TextStyle } from './style.ts'
import type { Tag } from './tagging.ts'
import { linesOf, paintLine } from './text-lines.ts'

const GUTTER = 12

interface CellPlace {
  readonly left: number
  readonly width: number
  readonly align: AlignType
}

export interface Cell {
  readonly place: CellPlace
  readonly lines: readonly (Line | undefined)[]
  /** Null in a head that is set again. */
  readonly tag: Tag | null
}

/** Shares out the column by the table's relative widths. Throws where there are more or fewer of them than cells. */
export function cellPlaces(node: Table, count: number, column: Column): CellPlace[] {
  const shares = node.data?.widths ?? Array.from({ length: count }, () => 1)
  if (shares.length !== count) {
    throw new Error(`A table of ${count} columns has ${shares.length} relative widths.`)
  }
  const sum = shares.reduce((total, share) => total + share, 0)
  const available = column.width - GUTTER * (count - 1)
  let left = column.left
  return shares.map((share, index) => {
    const place = { left, width: (available * share) / sum, align: node.align?.[index] ?? null }
    left += place.width + GUTTER
    return place
  })
}

/** The cells of a row, each with a tag like the one given; what a short row lacks is empty. */
export function cellsOf(
  row: TableRow,
  places: readonly CellPlace[],
  style: TextStyle,
  tag: Tag,
  shape: Shaper,
): Cell[] {
  return places.map((place, index) => {
    const lines = linesOf(row.children[index]?.children ?? [], style, place.width, shape)
    return { place, lines, tag: { ...tag } }
  })
}

/** A row as its lines, with some space above and below. */
export function cellStrips(cells: readonly Cell[], style: TextStyle, padding: number): Strip[] {
  const count = Math.max(...cells.map((cell) => cell.lines.length))
  const lines = Array.from({ length: count }, (_, index) =>
    strip(style.leading, (painter, top) => paintCellLines(painter, cells, index, top + baselineOf(style))),
  )
  // An empty cell counts as a cell too, and the columns keep their order.
  const openCells = ({ tagger }: Painter) => {
    for (const { tag } of cells) if (tag) tagger.open(tag)
  }
  return [strip(padding, openCells), ...lines, strip(padding, () => {})]
}

function paintCellLines(painter: Painter, cells: readonly Cell[], index: number, baseline: number): void {
  for (const { place, lines, tag } of cells) {
    const line = lines[index]
    if (!line) continue
    const spare = place.width - line.width
    const indent = place.align === 'right' ? spare : place.align === 'center' ? spare / 2 : 0
    paintLine(painter, line, place.left + indent, baseline, tag)
  }
}

/** Cells whose lines end at the bottom. */
export function sunk(cells: readonly Cell[]): Cell[] {
  const count = Math.max(...cells.map((cell) => cell.lines.length))
  return cells.map((cell) => ({ ...cell, lines: [...Array(count - cell.lines.length), ...cell.lines] }))
}
