import type { Element } from 'hast'
import type { Audit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import type { Box } from './box.ts'
import { PALETTE } from './palette.ts'
import { pathOf } from './plan-map.ts'
import { isNorthTold } from './plan-north.ts'
import { roundLength } from './plan-round.ts'
import { line, shape, TEXT_SIZE, text } from './shape.ts'
import { textWidth } from './text-width.ts'

const ARROW = 22
const STROKE = { stroke: PALETTE.ink, strokeWidth: 0.8 }

/** Where the north arrow takes room, and its drawing with what north it is; the arrow's foot is at the box's bottom. */
export function northArrow(audit: Audit, left: number, top: number): { box: Box; draw: Element[] } {
  const sdDeg = audit.plan.north?.sd_deg ?? 0
  const name = isNorthTold(audit) ? 'true north' : 'as the plan has it'
  const words = `${name}${sdDeg === 0 ? '' : ` ± ${formatArcmin(sdDeg * 60)}`}`
  const x = left + 4
  const foot = top + 9 + ARROW
  const width = 12 + textWidth(words, TEXT_SIZE)
  const draw = [
    text(x, top + 6.5, 'N', { anchor: 'middle', weight: 600 }),
    line([x, foot], [x, top + 12], STROKE),
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
    text(x + 6, foot - 1, words, { fill: PALETTE.muted }),
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
  const y = bottom - 3
  return [
    line([left, y], [left + length, y], STROKE),
    ...barEnds(left, left + length, y),
    text(left + length + 4, bottom - 0.5, words, { fill: PALETTE.ink }),
  ]
}

/** The same with the words in a gap in its middle, for one that is longer than they are. */
export function brokenBar(left: number, bottom: number, length: number, words: string): Element[] {
  const y = bottom - 3
  const middle = left + length / 2
  const half = textWidth(words, TEXT_SIZE) / 2 + 3
  return [
    line([left, y], [middle - half, y], STROKE),
    line([middle + half, y], [left + length, y], STROKE),
    ...barEnds(left, left + length, y),
    text(middle, bottom - 0.5, words, { anchor: 'middle' }),
  ]
}

function barEnds(left: number, right: number, y: number): Element[] {
  return [left, right].map((x) => line([x, y - 2.5], [x, y + 2.5], STROKE))
}
