import { DEG, wrap180 } from '../quantity/degrees.ts'
import { lineDirection, type SurveyedPoint } from './line-direction.ts'

/**
 * Angle at a vertex between the directions to two points, degrees from 0 to 180, with its standard deviation.
 *
 * The vertex turns both directions at once. With a and b from the vertex to the points and c between these,
 * variance = (s_A/a)² + (s_B/b)² + s_V² (1/a² + 1/b² − 2 cos θ/ab), and the last bracket is (c/ab)² by the law of
 * cosines. Source: JCGM 100:2008, equation 13. North has no part in it. Within a few deviations of 0° or 180° the
 * angle, which cannot pass them, scatters to one side. Throws a RangeError where a point lies on the vertex.
 */
export function spanAngle(
  vertex: SurveyedPoint,
  first: SurveyedPoint,
  second: SurveyedPoint,
): { angleDeg: number; sdDeg: number } {
  const a = lineDirection(vertex, first)
  const b = lineDirection(vertex, second)
  if (!(a.lengthM > 0 && b.lengthM > 0))
    throw new RangeError(
      `a point lies on the vertex, ${vertex.eastM} m east and ${vertex.northM} m north; write three places`,
    )
  const between = Math.hypot(second.eastM - first.eastM, second.northM - first.northM)
  return {
    angleDeg: Math.abs(wrap180(b.azimuthDeg - a.azimuthDeg)),
    sdDeg:
      Math.hypot(
        first.sdM / a.lengthM,
        second.sdM / b.lengthM,
        (vertex.sdM * between) / (a.lengthM * b.lengthM),
      ) / DEG,
  }
}
