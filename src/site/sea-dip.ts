import { DEG } from '../quantity/degrees.ts'
import { MEAN_EARTH_RADIUS_M, TERRESTRIAL_REFRACTION } from './terrestrial-refraction.ts'

/** The sea horizon as an eye above the water sees it. */
export interface SeaHorizon {
  /** Apparent altitude, degrees: 0 or negative. */
  deg: number
  sdDeg: number
}

/**
 * The sea horizon from an eye at a height above the water, metres: cos(dip) = R′/(R′ + H), with R′ = R/(1 − k) the
 * radius of the Earth over which a bent ray counts as straight.
 *
 * The standard deviation is that of the height and of k together: dip goes as √(H(1 − k)).
 * @param coefficient Of terrestrial refraction; 0.13 comes to 1.80′√H, the navigator's 1.76′√H is 0.165.
 * @throws RangeError where the eye is under water, its standard deviation negative, or the coefficient not below 1.
 */
export function seaDip(
  eyeHeightM: number,
  eyeHeightSdM = 0,
  coefficient: number = TERRESTRIAL_REFRACTION.coefficient,
): SeaHorizon {
  if (!(eyeHeightM >= 0 && eyeHeightM < Infinity))
    throw new RangeError(`an eye is 0 m or more above the sea, got ${eyeHeightM}`)
  if (!(eyeHeightSdM >= 0)) throw new RangeError(`a standard deviation is 0 m or more, got ${eyeHeightSdM}`)
  if (!(coefficient < 1))
    throw new RangeError(`a coefficient of refraction is less than 1, got ${coefficient}`)
  const radius = MEAN_EARTH_RADIUS_M / (1 - coefficient)
  const dip = dipOver(radius, eyeHeightM)
  // At the water's edge the root has no slope: there one standard deviation up shows the size of the error.
  const byHeight =
    eyeHeightM > eyeHeightSdM
      ? (dip * eyeHeightSdM) / (2 * eyeHeightM)
      : dipOver(radius, eyeHeightM + eyeHeightSdM) - dip
  const byRefraction = (dip * TERRESTRIAL_REFRACTION.sd) / (2 * (1 - coefficient))
  return { deg: -dip / DEG || 0, sdDeg: Math.hypot(byHeight, byRefraction) / DEG }
}

/** By the tangent, since a cosine near 1 has half of the digits; radians. */
function dipOver(radiusM: number, heightM: number): number {
  return Math.atan(Math.sqrt(heightM * (2 * radiusM + heightM)) / radiusM)
}
