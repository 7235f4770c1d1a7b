import { formatArcmin } from '../../quantity/format-angle.ts'

/** Two build tolerances in arcminutes as a range: `10′ to 1°`, `exact to 5′`, `exact`. */
export function toleranceRange(lowArcmin: number, highArcmin: number): string {
  const words = [lowArcmin, highArcmin].map((arcmin) => (arcmin > 0 ? formatArcmin(arcmin) : 'exact'))
  return [...new Set(words)].join(' to ')
}
