import { describe, expect, test } from 'vitest'
import { AIRY_1830, CLARKE_1866 } from '../../src/site/ellipsoid.ts'
import { geographicOf, gridOf, type TransverseMercatorGrid } from '../../src/site/transverse-mercator.ts'
import { expectWithin } from '../published/expect-within.ts'
import {
  BUNINYONG,
  BUNINYONG_ON_GRID,
  FLINDERS_PEAK,
  FLINDERS_PEAK_ON_GRID,
  MGA_55,
  sexagesimal,
} from './published-places.ts'
import { utmGrid } from './utm-grid.ts'

/** Ordnance Survey, A guide to coordinate systems in Great Britain, annex A. */
const NATIONAL_GRID: TransverseMercatorGrid = {
  ellipsoid: AIRY_1830,
  centralMeridianDeg: -2,
  latitudeOfOriginDeg: 49,
  scale: 0.9996012717,
  falseEastingM: 400_000,
  falseNorthingM: -100_000,
}

const WORKED = [
  // The same guide, annex C: Caister water tower, printed to a millimetre and 0.0001″ (3 mm, 2 mm).
  {
    name: 'Caister water tower',
    grid: NATIONAL_GRID,
    place: { latitudeDeg: sexagesimal(1, 52, 39, 27.2531), longitudeDeg: sexagesimal(1, 1, 43, 4.5177) },
    point: { eastingM: 651_409.903, northingM: 313_177.27 },
    toleranceM: 0.0015,
  },
  // GDA technical manual; latitude and longitude printed to 0.00001″ (0.3 mm).
  {
    name: 'Flinders Peak',
    grid: MGA_55,
    place: FLINDERS_PEAK,
    point: FLINDERS_PEAK_ON_GRID,
    toleranceM: 0.0006,
  },
  { name: 'Buninyong', grid: MGA_55, place: BUNINYONG, point: BUNINYONG_ON_GRID, toleranceM: 0.001 },
  // Snyder 1987, USGS Paper 1395, numerical examples of the transverse Mercator projection (from memory), to 0.1 m.
  {
    name: "Snyder's example in zone 18",
    grid: utmGrid(18, 'N', CLARKE_1866),
    place: { latitudeDeg: 40.5, longitudeDeg: -73.5 },
    point: { eastingM: 627_106.5, northingM: 4_484_124.4 },
    toleranceM: 0.05,
  },
  // EPSG Guidance Note 7-2, example of the transverse Mercator projection (from memory), to 0.01 m.
  {
    name: 'the EPSG example',
    grid: NATIONAL_GRID,
    place: { latitudeDeg: 50.5, longitudeDeg: 0.5 },
    point: { eastingM: 577_274.99, northingM: 69_740.5 },
    toleranceM: 0.01,
  },
]

describe('a transverse Mercator grid', () => {
  test.each(WORKED)('takes $name to its grid', ({ grid, place, point, toleranceM }) => {
    const got = gridOf(place, grid)
    expectWithin(got.eastingM, point.eastingM, toleranceM, 'metres')
    expectWithin(got.northingM, point.northingM, toleranceM, 'metres')
  })

  test.each(WORKED)('brings $name back from its grid', ({ grid, place, point, toleranceM }) => {
    const got = geographicOf(point, grid)
    const metresPerDegree = 111_320
    const alongParallel = metresPerDegree * Math.cos((place.latitudeDeg * Math.PI) / 180)
    expectWithin((got.latitudeDeg - place.latitudeDeg) * metresPerDegree, 0, toleranceM, 'metres')
    expectWithin((got.longitudeDeg - place.longitudeDeg) * alongParallel, 0, toleranceM, 'metres')
  })

  // Karney 2011, J. Geod. 85, 475: to 5 nm within 3900 km; both ways together, with double rounding, 20 nm.
  test('goes there and back far from the central meridian, and across 180°', () => {
    for (const [zone, longitude] of [
      [1, 178],
      [60, -170],
      [31, 33],
    ] as const)
      for (const latitude of [-80, -30, 0, 45, 89.9]) {
        const grid = utmGrid(zone, 'N')
        const got = geographicOf(gridOf({ latitudeDeg: latitude, longitudeDeg: longitude }, grid), grid)
        const at = `${latitude}, ${longitude}`
        expectWithin((got.latitudeDeg - latitude) * 111e3, 0, 2e-8, 'metres', at)
        const alongParallel = 111e3 * Math.cos((latitude * Math.PI) / 180)
        expectWithin((got.longitudeDeg - longitude) * alongParallel, 0, 2e-8, 'metres', at)
      }
  })

  test.each([
    [{ eastingM: 32_500_000, northingM: 5e6 }, /the easting is 32500000 m, over 3900 km/],
    [{ eastingM: Number.NaN, northingM: 5e6 }, /the easting is NaN m/],
    [{ eastingM: 5e5, northingM: Number.NaN }, /the northing is NaN; write metres/],
    [{ eastingM: 5e5, northingM: 15e6 }, /the northing is 15000000 m, beyond a pole/],
  ])('refuses %o', (point, message) => {
    expect(() => geographicOf(point, utmGrid(32, 'N'))).toThrow(message)
  })

  test('takes a longitude whichever way round it is counted', () => {
    const east = gridOf({ latitudeDeg: 40.5, longitudeDeg: 286.5 }, utmGrid(18, 'N', CLARKE_1866))
    expectWithin(east.eastingM, 627_106.5, 0.05, 'metres')
  })

  test('refuses a grid without an origin or a scale', () => {
    const point = { eastingM: 5e5, northingM: 5e6 }
    expect(() => geographicOf(point, { ...utmGrid(31, 'N'), scale: Number.NaN })).toThrow(
      new RangeError('the scale of the grid is NaN; write one such as 0.9996'),
    )
    expect(() => geographicOf(point, { ...utmGrid(31, 'N'), latitudeOfOriginDeg: 91 })).toThrow(
      /the latitude is 91°/,
    )
  })

  test('refuses a place on the other side of the Earth, or too far from the central meridian', () => {
    const grid = utmGrid(31, 'N')
    expect(() => gridOf({ latitudeDeg: 50, longitudeDeg: -100 }, grid)).toThrow(
      'the longitude is -100°; write one within 90° of the central meridian, 3°',
    )
    expect(() => gridOf({ latitudeDeg: 0, longitudeDeg: 60 }, grid)).toThrow(/over 3900 km/)
    expect(() => gridOf({ latitudeDeg: 100, longitudeDeg: 0 }, grid)).toThrow(/the latitude is 100°/)
  })
})
