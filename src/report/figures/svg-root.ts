import type { Element } from 'hast'
import { shape } from './shape.ts'

/** A figure: its drawing, and what it shows for a reader who cannot see it. */
export interface FigureDrawing {
  drawing: Element
  alt: string
}

/** Wraps shapes into the root of a drawing; lengths in points. */
export function svgRoot(
  size: { width: number; height: number },
  title: string,
  alt: string,
  shapes: readonly Element[],
): FigureDrawing {
  const { width, height } = size
  const drawing = shape('svg', { viewBox: `0 0 ${width} ${height}`, width, height, role: 'img' }, [
    { ...shape('title', {}), children: [{ type: 'text', value: title }] },
    { ...shape('desc', {}), children: [{ type: 'text', value: alt }] },
    ...shapes,
  ])
  return { drawing, alt }
}
