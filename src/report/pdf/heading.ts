import type { Heading } from 'mdast'
import type { Column, Setting } from './column.ts'
import { inlineRuns, plainRun, plainText } from './inline-runs.ts'
import { type Painter, type Strip, withGaps } from './strip.ts'
import { TEXT, type TextStyle } from './style.ts'
import type { Tag } from './tagging.ts'
import { lineStrips, linesOfRuns } from './text-lines.ts'

interface HeadingLook {
  readonly style: TextStyle
  readonly above: number
  readonly below: number
}

function headingLook(node: Heading, isTitle: boolean): HeadingLook {
  if (isTitle) return { style: TEXT.title, above: 0, below: 14 }
  if (node.depth <= 2) return { style: TEXT.section, above: 22, below: 6 }
  if (node.depth === 3) return { style: TEXT.subsection, above: 15, below: 3 }
  return { style: TEXT.minor, above: 11, below: 2 }
}

/** A heading with its number and its bookmark, kept with what follows. The title has neither. */
export function setHeading(node: Heading, column: Column, setting: Setting): Strip[] {
  const isTitle = node === setting.title
  const { style, above, below } = headingLook(node, isTitle)
  const number = setting.numberOf(node)
  const label = number === '' ? [] : [plainRun(`${number}\u00a0\u00a0`, style)]
  const runs = [...label, ...inlineRuns(node.children, style)]
  const lines = linesOfRuns(runs, style, isTitle ? column.width : column.measure, setting.shape)
  const tag: Tag = { role: `H${node.depth}`, parent: column.tag }
  const strips = lineStrips(lines, style, column.left, tag).map((each) => ({ ...each, keepWithNext: true }))
  const title = `${number} ${plainText(node)}`.trim()
  if (!isTitle) strips[0] = { ...bookmarked(strips[0]!, title, node.depth), beginsSection: node.depth <= 2 }
  return withGaps(strips, above, below)
}

function bookmarked(first: Strip, title: string, depth: number): Strip {
  const paint = (painter: Painter, top: number) => {
    painter.outline(title, depth, top - 4)
    first.paint(painter, top)
  }
  return { ...first, paint }
}
