import { DEG, wrap360 } from '../quantity/degrees.ts'

export interface SurveyedPoint {
  eastM: number
  northM: number
  /** One standard deviation in each of east and north, metres. */
  sdM: number
}

/**
 * Azimuth of the line from one point of a local grid to another, degrees from grid north through east, with the
 * standard deviation across the line √(s₁² + s₂²)/D and the horizontal distance D in metres.
 */
export function lineDirection(
  from: SurveyedPoint,
  to: SurveyedPoint,
): { azimuthDeg: number; sdDeg: number; lengthM: number } {
  const east = to.eastM - from.eastM
  const north = to.northM - from.northM
  const lengthM = Math.hypot(east, north)
  return {
    azimuthDeg: wrap360(Math.atan2(east, north) / DEG),
    sdDeg: Math.hypot(from.sdM, to.sdM) / lengthM / DEG,
    lengthM,
  }
}
