import type { Element, ElementContent } from 'hast'
import type { Canvas } from './canvas.ts'
import { drawText } from './draw-svg-text.ts'
import type { Shaper } from './shaper.ts'
import {
  checkAttributes,
  colourOf,
  numberOf,
  numbersOf,
  property,
  refuse,
  transformOf,
} from './svg-values.ts'

export interface SvgPlace {
  readonly left: number
  readonly top: number
  readonly scale: number
}

/** Width and height of an `svg` element in points. Throws where they are not positive numbers. */
export function svgSize(svg: Element): { width: number; height: number } {
  const size = { width: numberOf(svg, 'width'), height: numberOf(svg, 'height') }
  if (!(size.width > 0 && size.height > 0)) refuse(svg, 'has no size')
  return size
}

/** Draws the tree of drawing.ts. Throws on an element, an attribute or a value that it does not know. */
export function drawSvg(svg: Element, canvas: Canvas, shape: Shaper, place: SvgPlace): void {
  if (svg.tagName !== 'svg') refuse(svg, 'is not an `svg` element')
  checkAttributes(svg)
  const { width, height } = svgSize(svg)
  const [minX = 0, minY = 0, boxWidth = width, boxHeight = height] = numbersOf(svg, 'viewBox')
  // One factor for both axes, and the drawing in the middle, as a browser does it.
  const fit = Math.min(width / boxWidth, height / boxHeight)
  const slack = { x: (width - boxWidth * fit) / 2, y: (height - boxHeight * fit) / 2 }
  canvas.save()
  canvas.translate(place.left + slack.x * place.scale, place.top + slack.y * place.scale)
  canvas.scale(place.scale * fit).translate(-minX, -minY)
  drawChildren(svg, canvas, shape)
  canvas.restore()
}

function drawChildren(parent: Element, canvas: Canvas, shape: Shaper): void {
  for (const child of parent.children) {
    if (child.type === 'element') drawElement(child, canvas, shape)
    else if (!isBlank(child)) refuse(parent, `holds a node of the type \`${child.type}\``)
  }
}

function isBlank(node: ElementContent): boolean {
  return node.type === 'text' && node.value.trim() === ''
}

function drawElement(element: Element, canvas: Canvas, shape: Shaper): void {
  checkAttributes(element)
  canvas.save()
  switch (element.tagName) {
    case 'title':
    case 'desc':
      break
    case 'g':
      translate(element, canvas)
      drawChildren(element, canvas, shape)
      break
    case 'text':
      drawText(element, canvas, shape)
      break
    default:
      drawShape(element, canvas)
  }
  canvas.restore()
}

function drawShape(element: Element, canvas: Canvas): void {
  const fill = element.tagName === 'line' ? null : colourOf(element, 'fill', '#000000')
  const stroke = colourOf(element, 'stroke', null)
  if (!fill && !stroke) return
  if (fill) canvas.fillColor(fill).fillOpacity(numberOf(element, 'fillOpacity', 1))
  if (stroke) {
    canvas.strokeColor(stroke).lineWidth(numberOf(element, 'strokeWidth', 1))
    const dashes = numbersOf(element, 'strokeDasharray')
    if (dashes.length > 0) canvas.dash(dashes)
  }
  outline(element, canvas)
  if (fill && stroke) canvas.fillAndStroke()
  else if (fill) canvas.fill()
  else canvas.stroke()
}

function outline(element: Element, canvas: Canvas): void {
  const length = (name: string) => numberOf(element, name, 0)
  switch (element.tagName) {
    case 'rect':
      canvas.rect(length('x'), length('y'), numberOf(element, 'width'), numberOf(element, 'height'))
      break
    case 'line':
      canvas.moveTo(length('x1'), length('y1')).lineTo(length('x2'), length('y2'))
      break
    case 'circle':
      canvas.circle(length('cx'), length('cy'), numberOf(element, 'r'))
      break
    default:
      canvas.path(pathOf(element))
  }
}

const PATH_PARTS = /[MLHVCZ\s,]+|[-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?/g

/** Only the commands of drawing.ts, so that no arc or relative step is drawn in another way than meant. */
function pathOf(element: Element): string {
  const d = String(property(element, 'd') ?? '').trim()
  const isKnown = d.startsWith('M') && d.replace(PATH_PARTS, '') === ''
  return isKnown
    ? d
    : refuse(element, `has the path \`${d.slice(0, 60)}\`; only absolute M, L, H, V, C, Z are drawn`)
}

function translate(element: Element, canvas: Canvas): void {
  const [x, y = 0] = transformOf(element, 'translate') ?? []
  if (x !== undefined) canvas.translate(x, y)
}
