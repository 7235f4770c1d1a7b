import type { Blockquote, Code, Paragraph, RootContent } from 'mdast'
import type { Panel } from '../document.ts'
import { type Column, indented, PARAGRAPH_GAP, type Setting } from './column.ts'
import { figureStrip } from './figure.ts'
import { setHeading } from './heading.ts'
import { plainRun } from './inline-runs.ts'
import { setList } from './list.ts'
import { codePanel, inPanel, panelBox } from './panel-box.ts'
import { drawRule } from './rule.ts'
import { anchored, keptTogether, type Strip, strip, totalHeight, withGaps } from './strip.ts'
import { FRAME, QUIET_INK, TEXT } from './style.ts'
import { tableStrips } from './table.ts'
import type { Tag } from './tagging.ts'
import { lineStrips, linesOf, linesOfRuns } from './text-lines.ts'

/** Blocks of the document tree as strips, one below the other. */
export function setBlocks(nodes: readonly RootContent[], column: Column, setting: Setting): Strip[] {
  const strips: Strip[] = []
  let startsPage = false
  for (const node of nodes) {
    if (node.type === 'pageBreak') {
      startsPage = true
      continue
    }
    const block = setBlock(node, column, setting)
    if (startsPage && block[0]) block[0] = { ...block[0], startsPage: true }
    startsPage = startsPage && block.length === 0
    strips.push(...block)
  }
  return strips
}

function setBlock(node: RootContent, column: Column, setting: Setting): Strip[] {
  switch (node.type) {
    case 'paragraph':
      return setParagraph(node, column, setting)
    case 'heading':
      return setHeading(node, column, setting)
    case 'list':
      return setList(node, column, setting)
    case 'blockquote':
      return setBlockquote(node, column, setting)
    case 'code':
      return setCode(node, column, setting)
    case 'thematicBreak':
      return setThematicBreak(column)
    case 'table':
      return tableStrips(node, column, setting.shape)
    case 'figure':
      return [figureStrip(node, column, setting.shape)]
    case 'panel':
      return setPanel(node, column, setting)
    default:
      throw new Error(`The PDF cannot print a block of the type \`${node.type}\`.`)
  }
}

function setParagraph(node: Paragraph, column: Column, { shape }: Setting): Strip[] {
  const lines = linesOf(node.children, TEXT.body, column.measure, shape)
  const strips = lineStrips(lines, TEXT.body, column.left, { role: 'P', parent: column.tag })
  return withGaps(strips, PARAGRAPH_GAP, PARAGRAPH_GAP)
}

function setBlockquote(node: Blockquote, column: Column, setting: Setting): Strip[] {
  const tag: Tag = { role: 'BlockQuote', parent: column.tag }
  const strips = setBlocks(node.children, { ...indented(column, 22, 22), tag }, setting)
  return withGaps(anchored(strips), 9, 9)
}

function setCode(node: Code, column: Column, { shape }: Setting): Strip[] {
  const tag: Tag = { role: 'Code', parent: { role: 'P', parent: column.tag } }
  const box = codePanel(column.left, column.width)
  const unbroken = node.value.replace(/\t/g, '    ').replace(/ /g, '\u00a0')
  const strips = unbroken.split('\n').flatMap((line) => {
    const lines = linesOfRuns([plainRun(line, TEXT.code)], TEXT.code, column.width - 20, shape)
    return lineStrips(lines, TEXT.code, column.left + 10, tag)
  })
  return withGaps(inPanel(strips, box), 8, 8)
}

function setThematicBreak({ left }: Column): Strip[] {
  const rule = { left, width: 60, weight: 0.6, colour: QUIET_INK }
  return withGaps([strip(0, (painter, top) => drawRule(painter, rule, top))], 14, 14)
}

const LONGEST_UNDIVIDED_PANEL = FRAME.height / 3

function setPanel(node: Panel, column: Column, setting: Setting): Strip[] {
  const box = panelBox(node.kind, column.left, column.width)
  const tag: Tag = { role: 'Div', parent: column.tag }
  const inset = indented({ ...column, measure: column.width }, 16, 14)
  const strips = inPanel(setBlocks(node.children, { ...inset, tag }, setting), box)
  const whole = totalHeight(strips) < LONGEST_UNDIVIDED_PANEL ? keptTogether(strips) : strips
  return withGaps(whole, 10, 10)
}
