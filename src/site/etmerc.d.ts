/** The one projection out of proj4 that grids need; the package types only its whole. */
declare module 'proj4/lib/projections/etmerc.js' {
  /** Longitude and latitude in radians, or easting and northing in metres. */
  interface PlanePoint {
    x: number
    y: number
  }

  /** Methods of an object that holds the ellipsoid and the parameters of the projection besides. */
  const extendedTransverseMercator: {
    init(): void
    forward(point: PlanePoint): PlanePoint
    inverse(point: PlanePoint): PlanePoint
  }
  export default extendedTransverseMercator
}
