import type { Element } from 'hast'
import { toHtml } from 'hast-util-to-html'
import { FIGURE_FONT } from './drawing.ts'
import { PALETTE } from './figures/palette.ts'
import { shape } from './figures/shape.ts'

/** The text of a standalone SVG file: the drawing on a white ground, so that it reads on a dark page too. */
export function writeSvg(drawing: Element): string {
  const [titles, shapes] = splitTitles(drawing)
  const root: Element = {
    ...drawing,
    properties: { xmlns: 'http://www.w3.org/2000/svg', ...drawing.properties, fontFamily: FIGURE_FONT },
    children: [...titles, ground(drawing), ...shapes],
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
