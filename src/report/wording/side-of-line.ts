/**
 * On which side of the target the line points, for a viewer who looks along it: azimuth grows to the right, altitude
 * upwards. `offsetArcmin` is the line less the target; null where they print as one.
 */
export function sideOfLine(
  offsetArcmin: number,
  measures: 'azimuth' | 'altitude',
): 'to the left of' | 'to the right of' | 'above' | 'below' | null {
  if (Math.abs(offsetArcmin) < 1 / 120) return null
  if (measures === 'altitude') return offsetArcmin > 0 ? 'above' : 'below'
  return offsetArcmin > 0 ? 'to the right of' : 'to the left of'
}
