import { DEG } from '../quantity/degrees.ts'

/** How the north of a survey or a plan was found. */
export type NorthMethod = 'compass' | 'gps' | 'sun' | 'star' | 'plan' | 'grid'

/**
 * Standard deviation of north by how it was found, degrees, where nothing better is stated: this program's own
 * choices. Between north by the sky and north of an ellipsoid lies besides the east–west tilt of the plumb line times
 * the tangent of latitude (Laplace's equation), some 0.1′ as a rule and to 0.5′ under mountains, which they include.
 */
export const NORTH_SD_DEG: Readonly<Record<NorthMethod, number>> = {
  /** A good one at its best, read to half a degree and corrected for declination: the models of that err by as much. */
  compass: 0.5,
  /** Two positions good to 2 cm each, 100 m apart, are good to 1′; longer bases are better, hand-held sets far worse. */
  gps: 1 / 60,
  /** A theodolite on the Sun: its limb is bisected to some 10″, and a second of time turns it by up to 15″ or more. */
  sun: 1 / 60,
  /** A theodolite on a star, a point without limbs; near the pole time hardly matters. */
  star: 0.5 / 60,
  /** A printed arrow may be magnetic, of the grid or drawn by eye, and seldom says which. */
  plan: 2,
  /** Grid north of control points or read off a map by its lines, with the convergence applied. */
  grid: 1 / 60,
}

/**
 * Standard deviation of north from two positions of a satellite receiver, degrees: √2 s/B across their baseline.
 *
 * @param accuracyM Standard deviation of each position in each of east and north, relative to the other, metres.
 * @param baselineM Distance of the two, metres.
 * Source: JCGM 100:2008, section 5. Throws a RangeError where either is not above zero (the accuracy may be zero).
 */
export function gpsNorthSdDeg(accuracyM: number, baselineM: number): number {
  if (!(accuracyM >= 0 && Number.isFinite(accuracyM)))
    throw new RangeError(`the accuracy is ${accuracyM} m; write metres, such as 0.02`)
  if (!(baselineM > 0 && Number.isFinite(baselineM)))
    throw new RangeError(`the baseline is ${baselineM} m; write metres above zero, such as 100`)
  return (Math.SQRT2 * accuracyM) / baselineM / DEG
}
