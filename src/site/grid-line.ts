import { DEG, wrap360 } from '../quantity/degrees.ts'
import { geodesicLine } from './geodesic-line.ts'
import { type GridPoint, geographicOf, type TransverseMercatorGrid } from './transverse-mercator.ts'

/** A line between two places of a map grid, on the plane of the grid and on the Earth. */
export interface GridLine {
  /** From grid north through east on the plane, degrees, 0 to 360. */
  planeBearingDeg: number
  planeLengthM: number
  /** From true north through east where the line starts, degrees, 0 to 360. */
  azimuthDeg: number
}

/**
 * The line from one place of a known map grid to another, with its length on the ellipsoid besides. Convergence,
 * scale and the curvature that a straight line has on the grid are all in it: both ends are taken to the ellipsoid.
 * Throws a RangeError where both are the same place, and as `geographicOf` does.
 */
export function gridLine(
  from: GridPoint,
  to: GridPoint,
  grid: TransverseMercatorGrid,
): GridLine & { lengthM: number } {
  const plane = planeLine(from, to)
  return { ...plane, ...geodesicLine(geographicOf(from, grid), geographicOf(to, grid), grid.ellipsoid) }
}

/**
 * The line from one place to another of a map grid of which only the convergence is known: azimuth = bearing +
 * convergence.
 *
 * @param convergenceDeg From true north to grid north where the line starts, positive where grid north lies east.
 * Leaves out the curvature of the line on the grid: 0.5″ for 1 km due north, 200 km from the central meridian
 *   (E ΔN / 2R²: Snyder 1987, USGS Paper 1395, and any manual of surveying).
 * Throws a RangeError where both are the same place or the convergence is not finite.
 */
export function gridLineByConvergence(from: GridPoint, to: GridPoint, convergenceDeg: number): GridLine {
  if (!Number.isFinite(convergenceDeg))
    throw new RangeError(`the convergence is ${convergenceDeg}; write degrees, positive with grid north east`)
  const plane = planeLine(from, to)
  return { ...plane, azimuthDeg: wrap360(plane.planeBearingDeg + convergenceDeg) }
}

function planeLine(from: GridPoint, to: GridPoint): { planeBearingDeg: number; planeLengthM: number } {
  const east = to.eastingM - from.eastingM
  const north = to.northingM - from.northingM
  const planeLengthM = Math.hypot(east, north)
  if (!(planeLengthM > 0 && Number.isFinite(planeLengthM)))
    throw new RangeError(
      `the line runs from ${from.eastingM} m east, ${from.northingM} m north to ${to.eastingM} m east, ${to.northingM} m north; write two places`,
    )
  return { planeBearingDeg: wrap360(Math.atan2(east, north) / DEG), planeLengthM }
}
