import { DEG, wrap180 } from '../quantity/degrees.ts'
import { checkedPoint, type GeographicPoint } from './geographic-point.ts'
import { gridOf, type TransverseMercatorGrid } from './transverse-mercator.ts'

/** Half the stretch of meridian whose direction on the grid is taken: 111 m, where the nanometres of `gridOf` turn it by 1e−6″. */
const STEP_DEG = 0.001

/**
 * Angle from true north to grid north at a place, degrees: positive where grid north lies east of true north, so that
 * azimuth = grid bearing + convergence. Some authorities print it with the other sign.
 *
 * Taken from the projection itself: the chord of 222 m of the meridian as the grid shows it. Throws as `gridOf` does.
 */
export function gridConvergenceDeg(point: GeographicPoint, grid: TransverseMercatorGrid): number {
  const { latitudeDeg, longitudeDeg } = checkedPoint(point)
  const at = (latitude: number) => gridOf({ latitudeDeg: latitude, longitudeDeg }, grid)
  const south = at(Math.max(-90, latitudeDeg - STEP_DEG))
  const north = at(Math.min(90, latitudeDeg + STEP_DEG))
  const trueNorth = Math.atan2(north.eastingM - south.eastingM, north.northingM - south.northingM)
  return wrap180(-trueNorth / DEG)
}
