import { type Ellipsoid, WGS84 } from '../../src/site/ellipsoid.ts'
import type { TransverseMercatorGrid } from '../../src/site/transverse-mercator.ts'

/**
 * The grid of a zone of the Universal Transverse Mercator system, north (`N`) or south (`S`) of the equator, on
 * WGS 84 unless another ellipsoid is given (GRS 80 for ETRS89 or GDA, for example).
 *
 * @param zone 1 to 60; zone 31 is the first east of Greenwich, centred on 3° E.
 * Source: NGA.SIG.0012 (2014), The universal grids; scale 0.9996, false easting 500 km, northing 10,000 km in the south.
 * Throws a RangeError where there is no such zone.
 */
export function utmGrid(
  zone: number,
  hemisphere: 'N' | 'S',
  ellipsoid: Ellipsoid = WGS84,
): TransverseMercatorGrid {
  if (!Number.isInteger(zone) || zone < 1 || zone > 60)
    throw new RangeError(`the UTM zone is ${zone}; write a whole number from 1 to 60`)
  return {
    ellipsoid,
    centralMeridianDeg: 6 * zone - 183,
    latitudeOfOriginDeg: 0,
    scale: 0.9996,
    falseEastingM: 500_000,
    falseNorthingM: hemisphere === 'N' ? 0 : 10_000_000,
  }
}
