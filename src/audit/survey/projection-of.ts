import type { EllipsoidName, GridProjection } from '../../claim/claim.ts'
import {
  AIRY_1830,
  BESSEL_1841,
  CLARKE_1866,
  CLARKE_1880_IGN,
  type Ellipsoid,
  GRS80,
  INTERNATIONAL_1924,
  KRASSOVSKY_1940,
  WGS84,
} from '../../site/ellipsoid.ts'
import type { TransverseMercatorGrid } from '../../site/transverse-mercator.ts'

/** Every ellipsoid that a claim may name. */
const ELLIPSOID_OF: Readonly<Record<EllipsoidName, Ellipsoid>> = {
  WGS84,
  GRS80,
  'Airy 1830': AIRY_1830,
  'Bessel 1841': BESSEL_1841,
  'Clarke 1866': CLARKE_1866,
  'Clarke 1880 (IGN)': CLARKE_1880_IGN,
  'International 1924': INTERNATIONAL_1924,
  'Krassovsky 1940': KRASSOVSKY_1940,
}

/** A claim's projection with its ellipsoid's figures. */
export function projectionOf({ ellipsoid, ...grid }: GridProjection): TransverseMercatorGrid {
  return { ...grid, ellipsoid: ELLIPSOID_OF[ellipsoid] }
}
