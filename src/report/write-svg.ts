import type { Element } from 'hast'
import { toHtml } from 'hast-util-to-html'
import { FIGURE_FONT } from './drawing.ts'
import { PALETTE } from './figures/palette.ts'
import { round2, shape } from './figures/shape.ts'
import { isWidthKnown, textWidth } from './figures/text-width.ts'

/**
 * The text of a standalone SVG file: the drawing on a white ground, so that it reads on a dark page too, and every
 * text as wide as the drawing made room for, whatever face a reader's machine sets it in.
 */
export function writeSvg(drawing: Element): string {
  const [titles, shapes] = splitTitles(drawing)
  const root: Element = {
    ...drawing,
    properties: { xmlns: 'http://www.w3.org/2000/svg', ...drawing.properties, fontFamily: FIGURE_FONT },
    children: [...titles, ground(drawing), ...shapes.map(withWidth)],
  }
  const body = toHtml(root, { space: 'svg', closeEmptyElements: true, tightSelfClosing: true })
  return `<?xml version="1.0" encoding="UTF-8"?>\n${body.replaceAll(/></g, '>\n<')}\n`
}

function ground({ properties: { width, height } }: Element): Element {
  return shape('rect', { x: 0, y: 0, width: Number(width), height: Number(height), fill: PALETTE.paper })
}

/** Title and description have to come first. */
function splitTitles({ children }: Element): [Element['children'], Element['children']] {
  const isTitle = (child: Element['children'][number]) =>
    child.type === 'element' && (child.tagName === 'title' || child.tagName === 'desc')
  return [children.filter(isTitle), children.filter((child) => !isTitle(child))]
}

/** Texts get the width that was reckoned with; without it a wider face, such as DejaVu Sans, would run over. */
function withWidth(node: Element['children'][number]): Element['children'][number] {
  if (node.type !== 'element') return node
  if (node.tagName !== 'text') return { ...node, children: node.children.map(withWidth) }
  const content = node.children.map((child) => (child.type === 'text' ? child.value : '')).join('')
  if (!isWidthKnown(content)) return node
  const { fontSize, fontWeight } = node.properties
  const width = textWidth(content, Number(fontSize), Number(fontWeight) === 600 ? 600 : 400)
  return {
    ...node,
    properties: { ...node.properties, textLength: String(round2(width)), lengthAdjust: 'spacingAndGlyphs' },
  }
}
