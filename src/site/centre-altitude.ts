import { DEG } from '../quantity/degrees.ts'

/**
 * Geocentric true altitude of the Sun's centre, degrees, when a part of its disc stands on the horizon.
 *
 * h = apparent altitude − refraction ∓ semidiameter + parallax · cos h, parallax in altitude after the rest.
 * `refractionArcmin` is that at the horizon's apparent altitude, where the eye sees the limb.
 *
 * @param aboveCentre How far the sighted level stands above the disc's centre, in arcminutes: the semidiameter
 *   for the upper limb, 0 for the centre, minus the semidiameter for the lower limb.
 * @param parallaxArcsec Horizontal parallax; 0 where the refraction given has it taken off already.
 */
export function centreAltitudeDeg(
  apparentAltitudeDeg: number,
  refractionArcmin: number,
  aboveCentre: number,
  parallaxArcsec: number,
): number {
  const topocentric = apparentAltitudeDeg - (refractionArcmin + aboveCentre) / 60
  return topocentric + (parallaxArcsec / 3600) * Math.cos(topocentric * DEG)
}

/**
 * How far the horizon stands above the centre of a disc of a semidiameter, arcminutes, when a part of the disc
 * stands on it, or when so much of it shows above.
 */
export function horizonAboveCentreArcmin(
  disc: { part: 'upper limb' | 'centre' | 'lower limb' } | { part: 'showing'; showingArcmin: number },
  semidiameterArcmin: number,
): number {
  switch (disc.part) {
    case 'upper limb':
      return semidiameterArcmin
    case 'centre':
      return 0
    case 'lower limb':
      return -semidiameterArcmin
    case 'showing':
      return semidiameterArcmin - disc.showingArcmin
  }
}
