/** A place on an ellipsoid. */
export interface GeographicPoint {
  /** Positive north of the equator, −90 to 90. */
  latitudeDeg: number
  /** Positive east of the prime meridian, −360 to 360. */
  longitudeDeg: number
}

/**
 * Hands back a place that is one. Throws a RangeError where its latitude is not from −90° to 90° or its longitude
 * not from −360° to 360°.
 */
export function checkedPoint<Point extends GeographicPoint>(point: Point): Point {
  if (!(Math.abs(point.latitudeDeg) <= 90))
    throw new RangeError(`the latitude is ${point.latitudeDeg}°; write one from −90° to 90°`)
  if (!(Math.abs(point.longitudeDeg) <= 360))
    throw new RangeError(
      `the longitude is ${point.longitudeDeg}°; write one from −180° to 180°, east positive`,
    )
  return point
}
