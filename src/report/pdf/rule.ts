import type { Painter } from './strip.ts'

export interface Rule {
  readonly left: number
  readonly width: number
  readonly weight: number
  readonly colour: string
}

/** Draws a horizontal rule, which is no part of the text. */
export function drawRule(
  { canvas, tagger }: Painter,
  { left, width, weight, colour }: Rule,
  y: number,
): void {
  tagger.artifact('Layout', () => {
    canvas.lineWidth(weight).strokeColor(colour).moveTo(left, y)
    canvas.lineTo(left + width, y).stroke()
  })
}
