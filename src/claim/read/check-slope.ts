import { HORIZON_ALTITUDE } from '../../quantity/angle-kind.ts'
import { DEG } from '../../quantity/degrees.ts'
import { type Context, type Field, reportError } from './field.ts'

/** Reports, of a horizon so far off and so much above the eye, metres, that no horizon is so steep; true where one is. */
export function checkSlope(
  field: Field,
  { distanceM, riseM, what }: { distanceM: number; riseM: number; what: string },
  context: Context,
): boolean {
  const slopeDeg = Math.atan2(riseM, distanceM) / DEG
  if (slopeDeg >= HORIZON_ALTITUDE.lowDeg && slopeDeg <= HORIZON_ALTITUDE.highDeg) return true
  const message = `${what} makes a horizon of ${slopeDeg.toFixed(0).replace('-', '−')}°`
  reportError(context, field, 'out-of-range', message, { expected: `a horizon ${HORIZON_ALTITUDE.limits}` })
  return false
}
