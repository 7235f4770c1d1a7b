import { formatCm } from '../../quantity/format-length.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Point } from '../claim.ts'
import { distanceBetween } from './distance-between.ts'
import { type Context, type Field, reportWarning } from './field.ts'
import type { ReadPoints } from './read-points.ts'

/**
 * Warns, at a field that names one of them, of two points of one kind that are nearer to each other than their stated
 * uncertainties together: the line between them could run anywhere.
 */
export function warnNear(
  field: Field,
  from: string,
  to: string,
  { byName }: ReadPoints,
  context: Context,
): void {
  const [a, b] = [byName.get(from)?.point, byName.get(to)?.point]
  if (a == null || b == null) return
  const apartM = distanceBetween(a, b)
  const sdM = Math.hypot(statedM(a), statedM(b))
  if (apartM === null || apartM === 0 || apartM >= sdM) return
  const message = `${quoted(from)} and ${quoted(to)} are ${formatCm(apartM * 100)} apart, and uncertain by ${formatCm(sdM * 100)}`
  reportWarning(context, field, 'nearer-than-known', message, {
    expected: 'points farther apart; a unit of their places or of an uncertainty may have slipped',
  })
}

function statedM({ uncertaintyM }: Point): number {
  return typeof uncertaintyM === 'number' ? uncertaintyM : 0
}
