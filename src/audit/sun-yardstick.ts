import { sunSemidiameter } from '../sky/sun.ts'

/** Semidiameter of the Sun by which angles are pictured, whatever the target: at the June solstice of the year. */
export function yardstickSemidiameterArcmin(year: number): number {
  return sunSemidiameter(year, 'june solstice').arcmin
}
