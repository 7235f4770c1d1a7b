import type { Placement } from '../../audit/audit.ts'
import { ARCMIN } from '../../quantity/degrees.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { sideOfLine } from '../wording/side-of-line.ts'
import { type PlanSource, rightOfLineDeg } from './plan-source.ts'

/**
 * How far beside the line the target stood, as an angle and as a length at the marker: `36′ ± 5′ right` and `1.1 m`;
 * `on the line` where they print as one; nothing where it stood nowhere.
 */
export function offsetLines(source: PlanSource, placement: Placement): string[] {
  const { offset_arcmin: offset, offset_sd_arcmin: sd } = placement
  if (offset === null) return []
  const side = sideOf(source, placement)
  if (side === null) return ['on the line']
  const error = sd === null ? '' : ` ± ${formatArcmin(sd)}`
  return [`${formatArcmin(Math.abs(offset))}${error} ${side}`, ...lengthOf(placement)]
}

/** The same in short, without the error: `36′ right` and `1.1 m`. */
export function shortOffset(source: PlanSource, placement: Placement): string[] {
  const { offset_arcmin: offset } = placement
  if (offset === null) return []
  const side = sideOf(source, placement)
  if (side === null) return ['on the line']
  return [`${formatArcmin(Math.abs(offset))} ${side}`, ...lengthOf(placement)]
}

/** What an angle spans at a distance as the crow flies, centimetres. */
export function centimetresAcross(arcmin: number, distanceM: number): number {
  return 200 * distanceM * Math.sin((arcmin * ARCMIN) / 2)
}

/** An angle between two lines has none. */
function lengthOf({ offset_cm }: Placement): string[] {
  return offset_cm === null ? [] : [formatCm(offset_cm)]
}

/** Of the line; an angle is wider or narrower than the one measured. Null where they print as one. */
function sideOf(source: PlanSource, placement: Placement): string | null {
  const offset = placement.offset_arcmin
  if (offset === null || sideOfLine(offset, source.sightline.measures) === null) return null
  if (source.sightline.measures === 'angle') return offset < 0 ? 'wider' : 'narrower'
  return (rightOfLineDeg(source, placement) ?? 0) > 0 ? 'right' : 'left'
}
