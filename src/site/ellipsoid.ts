/** A figure of the Earth that coordinates are reckoned on. */
export interface Ellipsoid {
  name: string
  equatorialRadiusM: number
  /** Reciprocal of the flattening (a − b)/a. */
  inverseFlattening: number
}

/** The ellipsoid of satellite positions: NGA.STND.0036 (2014), World Geodetic System 1984, table 3.1. */
export const WGS84: Ellipsoid = {
  name: 'WGS 84',
  equatorialRadiusM: 6_378_137,
  inverseFlattening: 298.257223563,
}

/** Geodetic Reference System 1980: Moritz 2000, Journal of Geodesy 74, 128. Differs from WGS 84 by 0.1 mm. */
export const GRS80: Ellipsoid = {
  name: 'GRS 1980',
  equatorialRadiusM: 6_378_137,
  inverseFlattening: 298.257222101,
}

/** Great Britain: Ordnance Survey, A guide to coordinate systems in Great Britain, annex A: b = 6,356,256.909 m. */
export const AIRY_1830: Ellipsoid = fromAxes('Airy 1830', 6_377_563.396, 6_356_256.909)

/** Central Europe, Indonesia, old Japan: EPSG dataset, ellipsoid 7004. */
export const BESSEL_1841: Ellipsoid = {
  name: 'Bessel 1841',
  equatorialRadiusM: 6_377_397.155,
  inverseFlattening: 299.1528128,
}

/** North America before 1983: EPSG dataset, ellipsoid 7008, by its two axes as in Snyder 1987, USGS Paper 1395. */
export const CLARKE_1866: Ellipsoid = fromAxes('Clarke 1866', 6_378_206.4, 6_356_583.8)

/** France, North Africa, the Levant: EPSG dataset, ellipsoid 7011, by the two axes of the IGN. */
export const CLARKE_1880_IGN: Ellipsoid = fromAxes('Clarke 1880 (IGN)', 6_378_249.2, 6_356_515)

/** Hayford's figure, adopted by the IUGG at Madrid in 1924: EPSG dataset, ellipsoid 7022. */
export const INTERNATIONAL_1924: Ellipsoid = {
  name: 'International 1924',
  equatorialRadiusM: 6_378_388,
  inverseFlattening: 297,
}

/** Eastern Europe and northern Asia: EPSG dataset, ellipsoid 7024. */
export const KRASSOVSKY_1940: Ellipsoid = {
  name: 'Krassovsky 1940',
  equatorialRadiusM: 6_378_245,
  inverseFlattening: 298.3,
}

function fromAxes(name: string, equatorialRadiusM: number, polarRadiusM: number): Ellipsoid {
  return {
    name,
    equatorialRadiusM,
    inverseFlattening: equatorialRadiusM / (equatorialRadiusM - polarRadiusM),
  }
}
