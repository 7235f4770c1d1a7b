/**
 * On which side of the target the line points, for a viewer who looks along it: azimuth grows to the right.
 * `offsetArcmin` is the line less the target; null where they print as one.
 */
export function sideOfLine(offsetArcmin: number): 'left' | 'right' | null {
  if (Math.abs(offsetArcmin) < 1 / 120) return null
  return offsetArcmin > 0 ? 'right' : 'left'
}
