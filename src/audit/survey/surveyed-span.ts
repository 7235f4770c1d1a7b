import type { Claim, Point } from '../../claim/claim.ts'
import type { SurveyedPoint } from '../../site/line-direction.ts'
import { spanAngle } from '../../site/span-angle.ts'
import { metresOnEarth } from './line-on-earth.ts'
import { pointNamed, pointSdM } from './place-of-point.ts'

/** The angle at one point between two others, degrees, with its standard deviation; no north has a part in it. */
export function surveyedSpan(
  claim: Claim,
  { from, june, december }: { from: string; june: string; december: string },
): { angleDeg: number; sdDeg: number } {
  const vertex = pointNamed(claim, from)
  const [vertexM, juneM, decemberM] = [from, june, december].map((name) =>
    about(claim, vertex, pointNamed(claim, name)),
  )
  return spanAngle(vertexM!, juneM!, decemberM!)
}

/** A point in metres on the plane about another: on its own plan or grid where both are of it, else by the geodesic. */
function about(claim: Claim, vertex: Point, point: Point): SurveyedPoint {
  const sdM = pointSdM(point)
  if (vertex.by === 'plan' && point.by === 'plan') {
    return { eastM: point.eastM - vertex.eastM, northM: point.northM - vertex.northM, sdM }
  }
  if (point === vertex) return { eastM: 0, northM: 0, sdM }
  const metres = metresOnEarth(claim, vertex, point)
  return metres === null ? onGrid(vertex, point, sdM) : { ...metres, sdM }
}

/** On a grid of which only the convergence is known. */
function onGrid(vertex: Point, point: Point, sdM: number): SurveyedPoint {
  if (vertex.by !== 'grid' || point.by !== 'grid') throw new Error('points of two kinds make no angle')
  return { eastM: point.eastingM - vertex.eastingM, northM: point.northingM - vertex.northingM, sdM }
}
