import type { Element } from 'hast'
import type { Audit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import type { Box } from './box.ts'
import { PALETTE } from './palette.ts'
import { pathOf } from './plan-map.ts'
import { roundLength } from './plan-round.ts'
import { line, shape, TEXT_SIZE, text } from './shape.ts'
import { textWidth } from './text-width.ts'

const ARROW = 22

/** Where the north arrow takes room, and its drawing; the arrow's foot is at the box's bottom. */
export function northArrow(
  { plan: { north } }: Audit,
  left: number,
  top: number,
): { box: Box; draw: Element[] } {
  const words = north === null || north.sd_deg === 0 ? null : `± ${formatArcmin(north.sd_deg * 60)}`
  const x = left + 4
  const foot = top + 9 + ARROW
  const width = 10 + (words === null ? 0 : textWidth(words, TEXT_SIZE) + 2)
  const draw = [
    text(x, top + 6.5, 'N', { anchor: 'middle', weight: 600 }),
    line([x, foot], [x, top + 12], { stroke: PALETTE.ink, strokeWidth: 0.8 }),
    shape('path', {
      d: pathOf(
        [
          [x, top + 9],
          [x + 2.6, top + 16],
          [x - 2.6, top + 16],
        ],
        true,
      ),
      fill: PALETTE.ink,
    }),
    ...(words === null ? [] : [text(x + 6, foot - 1, words, { fill: PALETTE.muted })]),
  ]
  return { box: { left, right: left + width, top, bottom: foot }, draw }
}

/** A bar of round metres or kilometres, at most `most` long, its bottom at `bottom`. */
export function scaleBar(pointsPerMetre: number, left: number, bottom: number, most: number): Element[] {
  const metres = roundLength(most / pointsPerMetre)
  return measureBar(left, bottom, metres * pointsPerMetre, formatCm(metres * 100))
}

/** A bar with ends, and after it what it measures. */
export function measureBar(left: number, bottom: number, length: number, words: string): Element[] {
  const stroke = { stroke: PALETTE.ink, strokeWidth: 0.8 }
  const y = bottom - 3
  return [
    line([left, y], [left + length, y], stroke),
    line([left, y - 2.5], [left, y + 2.5], stroke),
    line([left + length, y - 2.5], [left + length, y + 2.5], stroke),
    text(left + length + 4, bottom - 0.5, words, { fill: PALETTE.ink }),
  ]
}
