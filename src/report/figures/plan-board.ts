import type { Element } from 'hast'
import type { Box } from './box.ts'
import { assertedBand, independentBand } from './date-band.ts'
import { PALETTE } from './palette.ts'
import { type AcrossScale, isBeyondView } from './plan-across.ts'
import { pathOf } from './plan-map.ts'
import type { PlanMark } from './plan-mark.ts'
import { roundArcmin } from './plan-round.ts'
import { type PlanSource, rangeRightOfLineDeg, rightOfLineDeg } from './plan-source.ts'
import { line, shape } from './shape.ts'

const RULE = { stroke: PALETTE.ink, strokeWidth: 0.6 }
const FINE = { stroke: PALETTE.rule, strokeWidth: 0.4 }

/** The board at the marker's distance: its edges and ticks. */
export function boardEdges(scale: AcrossScale, box: Box): Element[] {
  return [
    ...ticks(scale, box),
    line([box.left, box.bottom], [box.right, box.bottom], RULE),
    line([box.left, box.top], [box.right, box.top], FINE),
  ]
}

/** The date on the board, from its first year to its last; an arrow at the edge where that lies beyond. */
export function boardMark(source: PlanSource, mark: PlanMark, scale: AcrossScale, box: Box): Element[] {
  const { placement, hatching, stroke } = mark
  const right = rightOfLineDeg(source, placement)
  const range = rangeRightOfLineDeg(source, placement)
  if (right === null || range === null) return []
  const beyond = isBeyondView(right * 60, scale) ? [arrow(right > 0, mark, box)] : []
  if (range[0] * 60 > scale.shown[1] || range[1] * 60 < scale.shown[0]) return beyond
  const [left, end] = range.map((deg) => Math.max(box.left, Math.min(box.right, scale.x(deg * 60)))) as [
    number,
    number,
  ]
  const band = { ...box, left, right: end }
  if (placement.kind === 'asserted') return [...assertedBand(band, 'horizontal'), ...beyond]
  if (placement.kind === 'independent') return [...independentBand(band, 'horizontal', hatching), ...beyond]
  return [line([left, box.top], [left, box.bottom], stroke)]
}

function arrow(isRight: boolean, { colour }: PlanMark, { left, right, top, bottom }: Box): Element {
  const middle = (top + bottom) / 2
  const tip = isRight ? right : left
  const back = isRight ? right - 6 : left + 6
  const d = pathOf(
    [
      [tip, middle],
      [back, middle - 3.2],
      [back, middle + 3.2],
    ],
    true,
  )
  return shape('path', { d, fill: colour })
}

function ticks(scale: AcrossScale, { bottom }: Box): Element[] {
  const step = tickStep(scale)
  const [from, to] = scale.shown
  const counts = Array.from({ length: Math.floor(to / step) - Math.ceil(from / step) + 1 }, (_, i) =>
    Math.round(Math.ceil(from / step) + i),
  )
  return counts.map((count) =>
    line([scale.x(count * step), bottom], [scale.x(count * step), bottom - 2.5], FINE),
  )
}

/** The angle from one tick to the next, arcminutes. */
export function tickStep({ pointsPerArcmin }: AcrossScale): number {
  return roundArcmin(45 / pointsPerArcmin)
}
