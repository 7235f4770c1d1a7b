import type { Element } from 'hast'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { PALETTE } from './palette.ts'
import { line, shape, text } from './shape.ts'

/** The tallest Sun that is drawn round; a bigger one is a bar, one that would fill the plot only a text. */
const LARGEST_DISC = 44
const LINE = 8.6

export interface SunToScale {
  height: number
  /** Draws it hanging from `top`. */
  draw: (left: number, top: number) => Element[]
}

/** The Sun's width on a plot's own scale of directions, `diameter` in points. */
export function sunToScale(widthArcmin: number, diameter: number, tallest: number): SunToScale {
  const words = ['the Sun,', `${formatArcmin(widthArcmin)} wide,`, 'to scale']
  if (diameter > tallest) {
    const lines = ['The Sun, as wide as', `${formatArcmin(widthArcmin)}, is taller`, 'than this plot.']
    return { height: lines.length * LINE, draw: (left, top) => textLines(lines, left, top) }
  }
  const textHeight = words.length * LINE
  const height = Math.max(diameter, textHeight)
  const draw = (left: number, top: number) => {
    const middle = top + height / 2
    const mark = diameter > LARGEST_DISC ? bar(left, middle, diameter) : disc(left, middle, diameter)
    const textLeft = left + (diameter > LARGEST_DISC ? 8 : diameter) + 5
    return [...mark, ...textLines(words, textLeft, middle - textHeight / 2)]
  }
  return { height, draw }
}

function disc(left: number, middle: number, diameter: number): Element[] {
  const radius = diameter / 2
  return [
    shape('circle', {
      cx: left + radius,
      cy: middle,
      r: radius,
      fill: PALETTE.outside,
      stroke: PALETTE.ink,
      strokeWidth: 0.6,
    }),
  ]
}

function bar(left: number, middle: number, length: number): Element[] {
  const stroke = { stroke: PALETTE.ink, strokeWidth: 0.8 }
  const [top, bottom] = [middle - length / 2, middle + length / 2]
  return [
    line([left + 4, top], [left + 4, bottom], stroke),
    line([left, top], [left + 8, top], stroke),
    line([left, bottom], [left + 8, bottom], stroke),
  ]
}

function textLines(lines: readonly string[], left: number, top: number): Element[] {
  return lines.map((content, row) => text(left, top + (row + 0.78) * LINE, content, { fill: PALETTE.muted }))
}
