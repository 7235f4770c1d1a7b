import type { Vector } from '../../src/sky/long-term-poles.ts'
import { lengthOf, plus } from '../../src/sky/vector.ts'

const DEG = Math.PI / 180

/** Angle between two places on the sky, arcseconds; good for small ones. */
export function separationArcsec(
  a: { raDeg: number; decDeg: number },
  b: { raDeg: number; decDeg: number },
): number {
  return arcsecBetween(vectorOf(a), vectorOf(b))
}

/** Angle between two unit vectors, arcseconds; from their distance, which keeps its digits for small angles. */
export function arcsecBetween(a: Vector, b: Vector): number {
  return ((2 * Math.asin(lengthOf(plus(a, b, -1)) / 2)) / DEG) * 3600
}

function vectorOf({ raDeg, decDeg }: { raDeg: number; decDeg: number }): Vector {
  const [ra, dec] = [raDeg * DEG, decDeg * DEG]
  return [Math.cos(dec) * Math.cos(ra), Math.cos(dec) * Math.sin(ra), Math.sin(dec)]
}
