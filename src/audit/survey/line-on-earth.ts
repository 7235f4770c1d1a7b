import type { Claim, Point } from '../../claim/claim.ts'
import { DEG, wrap180 } from '../../quantity/degrees.ts'
import { type Ellipsoid, WGS84 } from '../../site/ellipsoid.ts'
import { geodesicLine } from '../../site/geodesic-line.ts'
import { placeOfPoint } from './place-of-point.ts'
import { projectionOf } from './projection-of.ts'

/** The geodesic from one point of a survey to another. */
export interface LineOnEarth {
  azimuthDeg: number
  lengthM: number
}

/** Closer than this two points stand at one place, whose direction means nothing. */
const SAME_PLACE_M = 1e-6

/**
 * The geodesic from one point to another, on their grid's own ellipsoid where both are of it, else on WGS84. Null where
 * the place of one is not known on the Earth; of length 0 and azimuth 0 where both stand at one place.
 */
export function lineOnEarth(claim: Claim, from: Point, to: Point): LineOnEarth | null {
  const [start, end] = [placeOfPoint(claim, from), placeOfPoint(claim, to)]
  if (start === null || end === null) return null
  const north = (start.latitudeDeg - end.latitudeDeg) * METRES_PER_DEGREE
  const east =
    wrap180(start.longitudeDeg - end.longitudeDeg) * METRES_PER_DEGREE * Math.cos(start.latitudeDeg * DEG)
  if (Math.hypot(north, east) < SAME_PLACE_M) return { azimuthDeg: 0, lengthM: 0 }
  return geodesicLine(start, end, ellipsoidOf(claim, from, to))
}

const METRES_PER_DEGREE = 111_000

function ellipsoidOf({ grid }: Claim, from: Point, to: Point): Ellipsoid {
  return grid?.by === 'projection' && from.by === 'grid' && to.by === 'grid'
    ? projectionOf(grid.projection).ellipsoid
    : WGS84
}

/** The same in metres east and north of the first point, azimuths and distances as they are from there. */
export function metresOnEarth(
  claim: Claim,
  from: Point,
  to: Point,
): { eastM: number; northM: number } | null {
  const line = lineOnEarth(claim, from, to)
  if (line === null) return null
  const { azimuthDeg, lengthM } = line
  return { eastM: lengthM * Math.sin(azimuthDeg * DEG), northM: lengthM * Math.cos(azimuthDeg * DEG) }
}
