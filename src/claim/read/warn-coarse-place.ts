import { DEG } from '../../quantity/degrees.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { PrintedAngle } from '../../quantity/read-angle.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import { type Context, reportWarning } from './field.ts'
import type { PointKey } from './point-kinds.ts'
import type { Fields } from './read-mapping.ts'
import { plainText } from './read-text.ts'

/** Of a meridian, metres: 10,001.966 km from the equator to a pole on WGS 84. */
const METRES_PER_DEGREE = 10_001_966 / 90

/** Warns where half a unit of the last digit of a latitude or longitude is more than the stated uncertainty. */
export function warnCoarsePlace(
  printed: readonly [PrintedAngle, PrintedAngle] | null,
  fields: Fields<PointKey>,
  uncertaintyM: number | Unstated,
  context: Context,
): void {
  if (printed === null || typeof uncertaintyM === 'string') return
  const [latitude, longitude] = printed
  const halves = [
    { field: fields.get('latitude'), halfM: latitude.halfDeg * METRES_PER_DEGREE },
    {
      field: fields.get('longitude'),
      halfM: longitude.halfDeg * METRES_PER_DEGREE * Math.cos(latitude.deg * DEG),
    },
  ]
  const { field, halfM } = halves.sort((a, b) => b.halfM - a.halfM)[0]!
  if (field === undefined || halfM <= uncertaintyM) return
  const text = quoted(plainText(field) ?? '')
  const message = `${text} leaves open ${formatCm(halfM * 100)} either way, more than its uncertainty, ${formatCm(uncertaintyM * 100)}`
  reportWarning(context, field, 'coarser-than-stated', message, {
    expected: 'more digits, or an uncertainty that allows for the rounding',
  })
}
