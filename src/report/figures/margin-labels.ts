import type { Element } from 'hast'
import { PALETTE } from './palette.ts'
import { placeAlong } from './place-along.ts'
import { round2, shape, text } from './shape.ts'
import { fitText } from './text-width.ts'

/** A label in the margin right of a plot, for something that meets the plot's right edge at the height `y`. */
export interface MarginLabel {
  y: number
  lines: readonly string[]
  fill?: string
  /** The first line in semibold. */
  strong?: boolean
}

/** Anything else that takes room in the margin; it has no leader. */
export interface MarginGuest {
  y: number
  height: number
  draw: (left: number, top: number) => Element[]
}

export interface Margin {
  /** The plot's right edge, where leaders begin. */
  edge: number
  /** Left edge of the texts. */
  left: number
  right: number
  top: number
  bottom: number
}

const LINE = 8.6
const GAP = 3.4
const SIZE = 7.5

/** The height that labels take when they are packed. */
export function marginHeight(labels: readonly Pick<MarginLabel, 'lines'>[]): number {
  return labels.reduce((sum, label) => sum + labelHeight(label), 0)
}

/** Draws labels as near as may be to the heights they belong to, each with a leader to the plot's edge. */
export function marginLabels(
  labels: readonly MarginLabel[],
  margin: Margin,
  guests: readonly MarginGuest[] = [],
): Element[] {
  const wanted = [
    ...labels.map((label) => ({ at: label.y, size: labelHeight(label) })),
    ...guests.map((guest) => ({ at: guest.y, size: guest.height + 2 * GAP })),
  ]
  const middles = placeAlong(wanted, margin.top, margin.bottom)
  return [
    ...labels.flatMap((label, index) => labelShapes(label, middles[index]!, margin)),
    ...guests.flatMap((guest, index) =>
      guest.draw(margin.left, middles[labels.length + index]! - guest.height / 2),
    ),
  ]
}

function labelHeight({ lines }: Pick<MarginLabel, 'lines'>): number {
  return lines.length * LINE + GAP
}

function labelShapes(label: MarginLabel, middle: number, margin: Margin): Element[] {
  const first = middle - ((label.lines.length - 1) * LINE) / 2 + SIZE * 0.34
  const width = margin.right - margin.left
  const lines = label.lines.map((content, row) => {
    const weight = label.strong && row === 0 ? 600 : 400
    const style = { weight, size: SIZE, fill: label.fill ?? PALETTE.ink } as const
    return text(margin.left, first + row * LINE, fitText(content, width, SIZE, weight), style)
  })
  return [leader(label.y, middle, margin), ...lines]
}

function leader(from: number, to: number, margin: Margin): Element {
  const bend = margin.edge + 3
  const end = margin.left - 2
  const d = `M${round2(margin.edge)} ${round2(from)}L${round2(bend)} ${round2(from)}L${round2(end)} ${round2(to)}`
  return shape('path', { d, fill: 'none', stroke: PALETTE.muted, strokeWidth: 0.5 })
}
