import type { Element } from 'hast'
import type { Face } from '../fonts/font-faces.ts'
import type { Canvas } from './canvas.ts'
import type { Segment, Shaper } from './shaper.ts'
import { colourOf, numberOf, property, refuse, transformOf } from './svg-values.ts'

/** Draws a `text` element in Source Sans, with other faces for what that lacks. */
export function drawText(element: Element, canvas: Canvas, shape: Shaper): void {
  const [child, ...others] = element.children
  if (child?.type !== 'text' || others.length > 0) refuse(element, 'does not hold just one text node')
  const size = numberOf(element, 'fontSize')
  const segments = shape((child as { value: string }).value, faceOf(element))
  const width = segments.reduce((sum, segment) => sum + segment.width * size, 0)
  rotate(element, canvas)
  canvas.fillColor(colourOf(element, 'fill', '#000000') ?? refuse(element, 'has no colour'))
  const left = numberOf(element, 'x', 0) - width * anchorOf(element)
  drawSegments(segments, canvas, size, left, numberOf(element, 'y', 0))
}

function drawSegments(
  segments: readonly Segment[],
  canvas: Canvas,
  size: number,
  left: number,
  y: number,
): void {
  let x = left
  for (const [index, { text, face, width }] of segments.entries()) {
    // A space after a label keeps its words apart from the next label's where the text is read out or copied.
    const ended = index === segments.length - 1 ? `${text} ` : text
    canvas.font(face, size).text(ended, x, y, { lineBreak: false, baseline: 'alphabetic' })
    x += width * size
  }
}

function anchorOf(element: Element): number {
  const anchors: Record<string, number> = { start: 0, middle: 0.5, end: 1 }
  const name = String(property(element, 'textAnchor') ?? 'start')
  return anchors[name] ?? refuse(element, `has the text anchor \`${name}\``)
}

function faceOf(element: Element): Face {
  const weight = numberOf(element, 'fontWeight', 400)
  const style = String(property(element, 'fontStyle') ?? 'normal')
  if (weight === 600 && style === 'normal') return 'sansSemibold'
  if (weight === 400 && style === 'normal') return 'sans'
  if (weight === 400 && style === 'italic') return 'sansItalic'
  return refuse(element, `asks for weight ${weight}, ${style}; there are 400, 600 and 400 italic`)
}

function rotate(element: Element, canvas: Canvas): void {
  const [angle, x = 0, y = 0] = transformOf(element, 'rotate') ?? []
  if (angle !== undefined) canvas.rotate(angle, { origin: [x, y] })
}
