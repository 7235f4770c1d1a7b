import type { Element } from 'hast'
import type { HorizonLabel } from './horizon-labels.ts'
import { stemStroke } from './horizon-strokes.ts'
import { PALETTE } from './palette.ts'
import { type PlacedFlag, rowCount } from './place-flags.ts'
import { placeInHalves } from './place-in-halves.ts'
import { line, shape, TEXT_SIZE, text } from './shape.ts'
import { textWidth } from './text-width.ts'

export interface HorizonFlags {
  height: number
  labels: readonly HorizonLabel[]
  /** Draws the labels with their lowest row just above `bottom`, and their stems down to there. */
  draw: (bottom: number) => Element[]
}

const LINE = 8.6
const GAP = 2.4

/** Lays out the labels between two edges, each like a flag on its stem; the rows they take are known before they are drawn. */
export function horizonFlags(labels: readonly HorizonLabel[], from: number, to: number): HorizonFlags {
  const lines = Math.max(1, ...labels.map((label) => label.lines.length))
  const row = lines * LINE + GAP
  const widths = labels.map(widthOf)
  const placed = placeInHalves(
    labels.map(({ x }, index) => ({ x, width: widths[index]! })),
    from,
    to,
  )
  const draw = (bottom: number) => {
    const topOf = ({ row: at }: PlacedFlag) => bottom - 2 - (at + 1) * row + GAP
    return [
      ...labels.map((label, index) =>
        line([label.x, bottom], [label.x, topOf(placed[index]!)], stemStroke(label.mark)),
      ),
      ...labels.flatMap((label, index) =>
        flagTexts(label, placed[index]!, topOf(placed[index]!), widths[index]!),
      ),
    ]
  }
  return { height: labels.length === 0 ? 0 : rowCount(placed) * row + 2, labels, draw }
}

function widthOf({ mark, lines }: HorizonLabel): number {
  return Math.max(...lines.map((content, index) => textWidth(content, TEXT_SIZE, weightOf(mark, index))))
}

/** The line with the date is strong where the date is the asserted one. */
function weightOf({ placement }: HorizonLabel['mark'], index: number): 400 | 600 {
  return placement.kind === 'asserted' && index === 0 ? 600 : 400
}

function flagTexts({ mark, lines }: HorizonLabel, placed: PlacedFlag, top: number, width: number): Element[] {
  const isLeft = placed.side === 'left'
  const fill = mark.placement.kind === 'asserted' ? PALETTE.accent : PALETTE.ink
  const plate = { x: placed.left - 1, y: top, width: width + 2, height: lines.length * LINE }
  return [
    // Only a label that found no side of its stem may lie on another's.
    ...(placed.side === null ? [shape('rect', { ...plate, fill: PALETTE.paper })] : []),
    ...lines.map((content, index) =>
      text(isLeft ? placed.left + width : placed.left, top + index * LINE + 6.4, content, {
        anchor: isLeft ? 'end' : 'start',
        weight: weightOf(mark, index),
        fill,
      }),
    ),
  ]
}
