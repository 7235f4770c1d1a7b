import type { SightlineAudit } from '../../audit/audit.ts'

/**
 * On which side of the target the line points, for a viewer who looks along it: azimuth grows to the right, altitude
 * upwards, an angle outwards. `offsetArcmin` is the line less the target; null where they print as one.
 */
export function sideOfLine(
  offsetArcmin: number,
  measures: SightlineAudit['measures'],
): 'to the left of' | 'to the right of' | 'above' | 'below' | 'beyond' | 'short of' | null {
  if (Math.abs(offsetArcmin) < 1 / 120) return null
  if (measures === 'altitude') return offsetArcmin > 0 ? 'above' : 'below'
  if (measures === 'angle') return offsetArcmin > 0 ? 'beyond' : 'short of'
  return offsetArcmin > 0 ? 'to the right of' : 'to the left of'
}
