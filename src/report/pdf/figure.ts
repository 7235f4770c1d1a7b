import type { Figure } from '../document.ts'
import type { Column } from './column.ts'
import { drawSvg, svgSize } from './draw-svg.ts'
import { inlineRuns, plainRun } from './inline-runs.ts'
import type { Shaper } from './shaper.ts'
import { joined, keptTogether, type Painter, type Strip, strip, totalHeight, withGaps } from './strip.ts'
import { FRAME, TEXT } from './style.ts'
import type { Tag } from './tagging.ts'
import { lineStrips, linesOfRuns } from './text-lines.ts'

const GAP = 16
/** With its caption; leaves room for a heading on the same page. */
const TALLEST = FRAME.height * 0.85
const CAPTION_GAP = 7

/** A drawing with its caption below, in its own size, or scaled down to the width of the column and most of a page. */
export function figureStrip(node: Figure, column: Column, shape: Shaper): Strip {
  const group: Tag = { role: 'Div', parent: column.tag }
  const caption = captionStrips(node, column, group, shape)
  const size = svgSize(node.drawing)
  const room = TALLEST - totalHeight(caption) - CAPTION_GAP
  const scale = Math.min(1, column.width / size.width, room / size.height)
  const [width, height] = [size.width * scale, size.height * scale]

  const tag: Tag = { role: 'Figure', parent: group, alt: node.alt }
  const paint = ({ canvas, tagger }: Painter, top: number) => {
    const draw = () => drawSvg(node.drawing, canvas, shape, { left: column.left, top, scale })
    tagger.content(tag, draw, [column.left, top, column.left + width, top + height])
  }
  const drawing = withGaps([strip(height, paint)], 0, CAPTION_GAP)
  const [whole] = withGaps([joined(keptTogether([...drawing, ...caption]))], GAP, GAP)
  return { ...whole!, floats: true }
}

function captionStrips(node: Figure, column: Column, parent: Tag, shape: Shaper): Strip[] {
  const label = plainRun(`Figure ${node.number}\u00a0\u00a0`, TEXT.caption, TEXT.caption.strong)
  const runs = [label, ...inlineRuns(node.children, TEXT.caption)]
  const lines = linesOfRuns(runs, TEXT.caption, column.width, shape)
  return lineStrips(lines, TEXT.caption, column.left, { role: 'Caption', parent })
}
