import type { List, ListItem } from 'mdast'
import { type Column, indented, PARAGRAPH_GAP, type Setting } from './column.ts'
import { setBlocks } from './flow.ts'
import { plainRun } from './inline-runs.ts'
import type { Line } from './line-breaking.ts'
import { anchored, type Painter, type Strip, strip, withGaps } from './strip.ts'
import { baselineOf, FRAME, TEXT } from './style.ts'
import type { Tag } from './tagging.ts'
import { linesOfRuns, paintLine } from './text-lines.ts'

const LIST_INDENT = 17
const LABEL_GAP = 6

/** A list with bullets or numbers; a tight one has little space between its items. */
export function setList(node: List, column: Column, setting: Setting): Strip[] {
  const tag: Tag = { role: 'L', parent: column.tag, numbering: node.ordered ? 'Decimal' : 'Disc' }
  const labels = listLabels(node, setting)
  const indent = Math.max(LIST_INDENT, ...labels.map((label) => label.width + LABEL_GAP))
  const gap = node.spread || node.children.some((item) => item.spread) ? PARAGRAPH_GAP : 3
  const items = node.children.map((item, index) => {
    const strips = listItem(item, labels[index]!, indent, { ...column, tag }, setting)
    return strips.map((each, row) => ({
      ...each,
      gapAbove: row === 0 ? gap : Math.min(each.gapAbove, gap),
      gapBelow: Math.min(each.gapBelow, gap),
    }))
  })
  return withGaps(anchored(items.flat()), PARAGRAPH_GAP, PARAGRAPH_GAP)
}

function listLabels(node: List, { shape }: Setting): Line[] {
  const start = node.start ?? 1
  const labels = node.children.map((_, index) => (node.ordered ? `${start + index}.` : '•'))
  return labels.map((label) => linesOfRuns([plainRun(label, TEXT.body)], TEXT.body, FRAME.measure, shape)[0]!)
}

/** The label stands in the first line of what the item holds, its right end level with the other labels. */
function listItem(item: ListItem, label: Line, indent: number, column: Column, setting: Setting): Strip[] {
  const itemTag: Tag = { role: 'LI', parent: column.tag }
  const labelTag: Tag = { role: 'Lbl', parent: itemTag }
  const tag: Tag = { role: 'LBody', parent: itemTag }
  const content = setBlocks(item.children, { ...indented(column, indent, 0), tag }, setting)
  const [first = strip(TEXT.body.leading, () => {}), ...rest] = content
  const left = column.left + indent - LABEL_GAP - label.width
  const paint = (painter: Painter, top: number) => {
    paintLine(painter, label, left, top + baselineOf(TEXT.body), labelTag)
    first.paint(painter, top)
  }
  return [{ ...first, paint }, ...rest]
}
