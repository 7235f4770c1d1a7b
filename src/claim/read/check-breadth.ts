import { formatCm } from '../../quantity/format-length.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Direction } from '../claim.ts'
import { distanceBetween } from './distance-between.ts'
import { type Context, type Field, reportError } from './field.ts'
import type { ReadPoints } from './read-points.ts'

/**
 * Reports a post or a gap of which an edge is sighted though it is wider than the line is long. Told of points of one
 * kind, at the fields that name them; a line to the middle is the same whatever the width.
 */
export function checkBreadth(
  { from, to, sighted }: Extract<Direction, { by: 'points' }>,
  fields: Record<'from' | 'to', Field>,
  { byName }: ReadPoints,
  context: Context,
): void {
  const points = { from: byName.get(from)?.point, to: byName.get(to)?.point }
  if (points.from == null || points.to == null) return
  const apartM = distanceBetween(points.from, points.to)
  if (apartM === null) return
  for (const end of ['from', 'to'] as const) {
    const widthM = points[end]?.breadth?.widthM ?? 0
    const isOfEdge = sighted[end] === 'left' || sighted[end] === 'right'
    if (!isOfEdge || widthM <= apartM) continue
    const [name, other] = end === 'from' ? [from, to] : [to, from]
    const message = `${quoted(name)} is ${formatCm(widthM * 100)} wide, and only ${formatCm(apartM * 100)} from ${quoted(other)}`
    reportError(context, fields[end], 'wider-than-far', message, {
      expected: 'a width less than the length of the line; the unit of one of them may have slipped',
    })
  }
}
