import { DEG } from '../quantity/degrees.ts'
import { MEAN_EARTH_RADIUS_M, TERRESTRIAL_REFRACTION } from './terrestrial-refraction.ts'

/** A skyline known from a map: how far off it is along the ground, and how far above the eye; metres. */
export interface DistantSkyline {
  distanceM: number
  distanceSdM: number
  /** Height of the skyline less that of the eye; negative where it is lower. */
  heightDifferenceM: number
  heightDifferenceSdM: number
}

/**
 * Apparent altitude of a skyline at a distance d and a height difference Δh, degrees, with its standard deviation:
 * tan H = (Δh − d²(1 − k)/2R)/d, with the mean radius R and the coefficient of terrestrial refraction k.
 *
 * The standard deviation is that of d, Δh and k together (JCGM 100:2008, equation 10). The formula lets the circle
 * be a parabola, which costs Δh²/(dR): 1″ for 200 m at 1 km, 3″ for 3,000 m at 100 km.
 * @throws RangeError where the distance is not above 0, or a standard deviation is negative.
 */
export function horizonFromDistance(skyline: DistantSkyline): { deg: number; sdDeg: number } {
  const { distanceM, distanceSdM, heightDifferenceM, heightDifferenceSdM } = skyline
  if (!(distanceM > 0 && distanceM < Infinity))
    throw new RangeError(`a skyline's distance is more than 0 m, got ${distanceM}`)
  if (!Number.isFinite(heightDifferenceM))
    throw new RangeError(`a skyline's height difference is a number of metres, got ${heightDifferenceM}`)
  if (!(distanceSdM >= 0 && heightDifferenceSdM >= 0))
    throw new RangeError(`standard deviations are 0 m or more, got ${distanceSdM} and ${heightDifferenceSdM}`)
  const { coefficient, sd } = TERRESTRIAL_REFRACTION
  const curvature = (1 - coefficient) / (2 * MEAN_EARTH_RADIUS_M)
  const tangent = heightDifferenceM / distanceM - distanceM * curvature
  const error = Math.hypot(
    heightDifferenceSdM / distanceM,
    (heightDifferenceM / distanceM ** 2 + curvature) * distanceSdM,
    (distanceM / (2 * MEAN_EARTH_RADIUS_M)) * sd,
  )
  return { deg: Math.atan(tangent) / DEG, sdDeg: error / (1 + tangent ** 2) / DEG }
}
