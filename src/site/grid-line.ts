import { DEG, wrap360 } from '../quantity/degrees.ts'
import type { GridPoint } from './transverse-mercator.ts'

/** A line between two places of a map grid, on the plane of the grid and on the Earth. */
export interface GridLine {
  /** From grid north through east on the plane, degrees, 0 to 360. */
  planeBearingDeg: number
  planeLengthM: number
  /** From true north through east where the line starts, degrees, 0 to 360. */
  azimuthDeg: number
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
