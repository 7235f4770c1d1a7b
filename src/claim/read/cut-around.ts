import { visibleControls } from '../../quantity/quoted.ts'

const COLUMNS = 78
const WIDE =
  /^[\p{Script=Han}\p{Script=Hiragana}\p{Script=Katakana}\p{Script=Hangul}\uff01-\uff60\uffe0-\uffe6\p{Emoji_Presentation}]/u
const WITHOUT_WIDTH = /^[\p{Mn}\p{Me}\p{Cf}]/u

interface Cell {
  shown: string
  width: number
  isMarked: boolean
}

/**
 * A line of text as a terminal shows it, with carets under the stretch from `from` to `to` (UTF-16 units). A line
 * over 78 columns is cut at one or both ends, with … in place of what is left out; tabs show as two spaces.
 */
export function cutAround(line: string, from: number, to: number): { shown: string; carets: string } {
  const cells = cellsOf(line, from, to)
  const firstMarked = cells.findIndex(({ isMarked }) => isMarked)
  const mark = firstMarked === -1 ? cells.length : firstMarked
  const start = widthOf(cells) <= COLUMNS ? 0 : startOfCut(cells, mark)
  const end = endOfCut(cells, start)
  const kept = cells.slice(start, end)
  const head = start > 0 ? '…' : ''
  const tail = end < cells.length ? '…' : ''
  const marks = kept.map(({ isMarked, width }) => (isMarked ? '^' : ' ').repeat(width)).join('')
  const carets = (head === '' ? '' : ' ') + marks.trimEnd()
  return {
    shown: (head + kept.map(({ shown }) => shown).join('') + tail).trimEnd(),
    carets: marks.includes('^') ? carets : `${' '.repeat(head.length + widthOf(kept))}^`,
  }
}

function cellsOf(line: string, from: number, to: number): Cell[] {
  const cells: Cell[] = []
  let offset = 0
  for (const character of line) {
    const shown = character === '\t' ? '  ' : visibleControls(character)
    cells.push({ shown, width: columnsOf(shown), isMarked: offset >= from && offset < to })
    offset += character.length
  }
  return cells
}

function columnsOf(shown: string): number {
  if (WITHOUT_WIDTH.test(shown)) return 0
  return WIDE.test(shown) ? 2 : [...shown].length
}

/** Leaves a third of the room to what stands before the mark, and more where little follows it. */
function startOfCut(cells: readonly Cell[], mark: number): number {
  const after = widthOf(cells.slice(mark))
  const twoThirds = Math.floor((COLUMNS * 2) / 3)
  let room = after <= twoThirds ? COLUMNS - 1 - after : COLUMNS - 2 - twoThirds
  let start = mark
  while (start > 0 && room >= (cells[start - 1]?.width ?? 0)) {
    start -= 1
    room -= cells[start]?.width ?? 0
  }
  return start
}

function endOfCut(cells: readonly Cell[], start: number): number {
  const head = start > 0 ? 1 : 0
  if (head + widthOf(cells.slice(start)) <= COLUMNS) return cells.length
  let room = COLUMNS - 1 - head
  let end = start
  while (end < cells.length && room >= (cells[end]?.width ?? 0)) {
    room -= cells[end]?.width ?? 0
    end += 1
  }
  return end
}

function widthOf(cells: readonly Cell[]): number {
  return cells.reduce((sum, { width }) => sum + width, 0)
}
