import type { Element } from 'hast'
import type { Box } from './box.ts'
import { PALETTE } from './palette.ts'
import { type AcrossScale, isBeyondView } from './plan-across.ts'
import { boardEdges, boardMark } from './plan-board.ts'
import { pathOf } from './plan-map.ts'
import { type PlanMark, planMarks } from './plan-mark.ts'
import type { Spot } from './plan-rim.ts'
import { type PlanSource, rightOfLineDeg } from './plan-source.ts'
import type { PlanView } from './plan-views.ts'
import { line, shape } from './shape.ts'

const RULE = { stroke: PALETTE.ink, strokeWidth: 0.6 }

/**
 * One line seen along itself: below, the fan of sight from the spot one stands at, the line upright; above it a board
 * at the marker's distance, with the dates where their target stood before it.
 */
export function planFan(view: PlanView, scale: AcrossScale): Element[] {
  const { source, boardTop, board, depth } = view
  const [least, greatest] = source.builtArcmin
  const box = { left: scale.left, right: scale.right, top: boardTop, bottom: boardTop + board }
  const eye = [scale.x(0), box.bottom + depth] as const
  const marks = planMarks(source.placements)
  return [
    ...wedge(greatest, { fill: PALETTE.outside, edge: PALETTE.rule }, eye, scale, box),
    ...wedge(least, { fill: PALETTE.set95, edge: PALETTE.set95 }, eye, scale, box),
    ...marks.flatMap((mark) => sightOf(source, mark, eye, scale, box)),
    line(eye, [eye[0], box.top], { stroke: PALETTE.ink, strokeWidth: 1.4 }),
    ...boardEdges(scale, box),
    ...marks.flatMap((mark) => boardMark(source, mark, scale, box)),
    ...measuredError(source, scale, box.bottom + 4.5),
    shape('circle', { cx: eye[0], cy: eye[1], r: 1.9, fill: PALETTE.ink }),
  ]
}

/** From the eye to the board and up it; cut where the view ends. */
function wedge(
  arcmin: number,
  { fill, edge }: { fill: string; edge: string },
  eye: Spot,
  scale: AcrossScale,
  box: Box,
): Element[] {
  if (arcmin <= 0) return []
  const [left, right] = [-1, 1].map((side): [Spot, Spot] => {
    const x = scale.x(side * arcmin)
    const end = Math.max(box.left, Math.min(box.right, x))
    // The height at which the wedge's side leaves the view.
    const share = x === eye[0] ? 1 : (end - eye[0]) / (x - eye[0])
    return [
      [end, eye[1] - share * (eye[1] - box.bottom)],
      [end, box.top],
    ]
  }) as [[Spot, Spot], [Spot, Spot]]
  const d = pathOf([eye, ...left, ...right.toReversed()], true)
  return [shape('path', { d, fill, stroke: edge, strokeWidth: 0.4 })]
}

/** The sight towards the target at one date. */
function sightOf(
  source: PlanSource,
  { placement, stroke }: PlanMark,
  eye: Spot,
  scale: AcrossScale,
  { bottom }: Box,
): Element[] {
  const right = rightOfLineDeg(source, placement)
  return right === null || isBeyondView(right * 60, scale)
    ? []
    : [line(eye, [scale.x(right * 60), bottom], stroke)]
}

/** Whether one standard deviation of the line as measured is wide enough to be drawn. */
export function hasWhisker({ measured }: Pick<PlanSource, 'measured'>, scale: AcrossScale): boolean {
  return measured.sd * 60 * scale.pointsPerArcmin >= 2
}

/** That standard deviation, where it shows. */
function measuredError({ measured }: PlanSource, scale: AcrossScale, y: number): Element[] {
  const arcmin = measured.sd * 60
  if (!hasWhisker({ measured }, scale)) return []
  const ends = [-1, 1].map((side) => side * arcmin)
  const xs = ends.map((end) => Math.max(scale.left, Math.min(scale.right, scale.x(end)))) as [number, number]
  return [
    line([xs[0], y], [xs[1], y], RULE),
    ...ends.flatMap((end, index) =>
      isBeyondView(end, scale) ? [] : [line([xs[index]!, y - 2], [xs[index]!, y + 2], RULE)],
    ),
  ]
}
