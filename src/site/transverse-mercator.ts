import extendedTransverseMercator from 'proj4/lib/projections/etmerc.js'
import { DEG, wrap180 } from '../quantity/degrees.ts'
import type { Ellipsoid } from './ellipsoid.ts'
import { checkedPoint, type GeographicPoint } from './geographic-point.ts'

/** A map grid: the transverse Mercator projection of an ellipsoid. */
export interface TransverseMercatorGrid {
  ellipsoid: Ellipsoid
  centralMeridianDeg: number
  latitudeOfOriginDeg: number
  /** On the central meridian. */
  scale: number
  falseEastingM: number
  falseNorthingM: number
}

/** A place on a map grid. */
export interface GridPoint {
  eastingM: number
  northingM: number
}

/** How far from the central meridian the series hold to nanometres, metres (Karney 2011). */
const REACH_M = 3_900_000

/**
 * Where a place of a map grid lies on the grid's ellipsoid; longitude from −180° to 180°.
 *
 * Source: Krüger's series to the sixth order, Karney 2011, Journal of Geodesy 85, 475, as `proj4` has them.
 * Throws a RangeError where the place lies more than 3900 km from the central meridian or beyond a pole, or
 * the grid has no origin or scale.
 */
export function geographicOf(point: GridPoint, grid: TransverseMercatorGrid): GeographicPoint {
  const { eastingM, northingM } = withinReach(point, grid)
  const { x, y } = projectionOf(grid).inverse({ x: eastingM, y: northingM })
  const place = { latitudeDeg: y / DEG, longitudeDeg: x / DEG }
  if (!facesGrid(place, grid))
    throw new RangeError(`the northing is ${northingM} m, beyond a pole; write one of this grid`)
  return place
}

/** Where a place of the grid's ellipsoid lies on a map grid: the reverse of `geographicOf`, with the same errors. */
export function gridOf(point: GeographicPoint, grid: TransverseMercatorGrid): GridPoint {
  const { latitudeDeg, longitudeDeg } = checkedPoint(point)
  if (!facesGrid(point, grid))
    throw new RangeError(
      `the longitude is ${longitudeDeg}°; write one within 90° of the central meridian, ${grid.centralMeridianDeg}°`,
    )
  const { x, y } = projectionOf(grid).forward({ x: longitudeDeg * DEG, y: latitudeDeg * DEG })
  return withinReach({ eastingM: x, northingM: y }, grid)
}

/** `proj4` keeps a projection's methods and parameters in one object. */
function projectionOf({ ellipsoid, ...grid }: TransverseMercatorGrid) {
  checkedPoint({ latitudeDeg: grid.latitudeOfOriginDeg, longitudeDeg: grid.centralMeridianDeg })
  if (!(grid.scale > 0))
    throw new RangeError(`the scale of the grid is ${grid.scale}; write one such as 0.9996`)
  const flattening = 1 / ellipsoid.inverseFlattening
  const projection = {
    ...extendedTransverseMercator,
    a: ellipsoid.equatorialRadiusM,
    es: flattening * (2 - flattening),
    long0: grid.centralMeridianDeg * DEG,
    lat0: grid.latitudeOfOriginDeg * DEG,
    k0: grid.scale,
    x0: grid.falseEastingM,
    y0: grid.falseNorthingM,
  }
  projection.init()
  return projection
}

function withinReach(point: GridPoint, grid: TransverseMercatorGrid): GridPoint {
  const { eastingM, northingM } = point
  if (!(Math.abs(eastingM - grid.falseEastingM) <= REACH_M))
    throw new RangeError(
      `the easting is ${eastingM} m, over 3900 km from the central meridian at ${grid.falseEastingM} m; write one of this grid`,
    )
  if (!Number.isFinite(northingM)) throw new RangeError(`the northing is ${northingM}; write metres`)
  return point
}

function facesGrid({ longitudeDeg }: GeographicPoint, grid: TransverseMercatorGrid): boolean {
  return Math.abs(wrap180(longitudeDeg - grid.centralMeridianDeg)) <= 90
}
