import { describe, expect, test } from 'vitest'
import { wrap180 } from '../../../src/quantity/degrees.ts'
import { geodesicDestination, geodesicLine } from '../../../src/site/geodesic-line.ts'
import { expectWithin } from '../../published/expect-within.ts'
import { readTable } from '../../published/read-table.ts'
import {
  BUNINYONG_ON_GRID,
  FLINDERS_PEAK_ON_GRID,
  FLINDERS_TO_BUNINYONG,
  sexagesimal,
} from '../../site/published-places.ts'
import { claimText } from '../audit-of.ts'
import { auditWith, claimOf, settledLine } from '../settled.ts'

const LINE = '{one: {from: a, to: b, horizon: 30′ ± 1′}}'
const onGrid = ({ eastingM, northingM }: typeof FLINDERS_PEAK_ON_GRID) =>
  `{easting: ${eastingM} m, northing: ${northingM} m, uncertainty: 1 mm}`
const VICTORIA = '{name: Flinders Peak, latitude: 37°57′03.7203″ S, longitude: 144°25′29.5244″ E}'

// GDA technical manual; the azimuth is printed to 0.01″, the length to a millimetre. Ends on the grid are good to 1 mm,
// which turns 55 km by 0.005″; WGS84 in place of GRS 80 (geographic points) is 0.1 mm in the radius of the pole.
describe('from Flinders Peak to Buninyong', () => {
  test.each([
    [
      'by latitude and longitude',
      {
        points:
          '{a: {latitude: 37°57′03.7203″ S, longitude: 144°25′29.5244″ E, uncertainty: 1 mm}, b: {latitude: 37°39′10.1561″ S, longitude: 143°55′35.3839″ E, uncertainty: 1 mm}}',
      },
    ],
    [
      'by the Map Grid of Australia',
      {
        grid: '{zone: UTM 55 S, ellipsoid: GRS80}',
        points: `{a: ${onGrid(FLINDERS_PEAK_ON_GRID)}, b: ${onGrid(BUNINYONG_ON_GRID)}}`,
      },
    ],
    [
      'by a projection written out',
      {
        grid: '{central_meridian: 147° E, latitude_of_origin: 0°, scale: 0.9996, false_easting: 500 km, false_northing: 10000 km, ellipsoid: GRS80}',
        points: `{a: ${onGrid(FLINDERS_PEAK_ON_GRID)}, b: ${onGrid(BUNINYONG_ON_GRID)}}`,
      },
    ],
  ])('%s', (_, changes) => {
    const line = settledLine(claimText({ ...changes, structure: VICTORIA, sightlines: LINE }))
    expectWithin((line.measuredDeg - FLINDERS_TO_BUNINYONG.azimuthDeg) * 3600, 0, 0.01, 'arcsec')
    expectWithin(line.lengthM!, FLINDERS_TO_BUNINYONG.lengthM, 0.0015, 'metres')
    expect(line.northSdDeg).toBe(0)
  })

  // The manual's bearing on the plane is 305°17′21.19″ (chord, from memory); its convergence −1°35′03.65″ (azimuth less
  // the bearing of the projected geodesic, 305°17′01.72″, sign of clockwise). Adding it leaves the 19.47″ of curvature.
  test('by nothing but the convergence, all but the curvature of the line on the grid', () => {
    const text = claimText({
      structure: VICTORIA,
      grid: '{convergence: 1°35′03.65″ E ± 30″}',
      points: `{a: ${onGrid(FLINDERS_PEAK_ON_GRID)}, b: ${onGrid(BUNINYONG_ON_GRID)}}`,
      sightlines: LINE,
    })
    const line = settledLine(text)
    const want = FLINDERS_TO_BUNINYONG.azimuthDeg + 19.47 / 3600
    expectWithin((line.measuredDeg - want) * 3600, 0, 0.015, 'arcsec')
    expectWithin(line.northSdDeg * 3600, 30, 1e-9, 'arcsec')
  })
})

/** A plan whose line runs due plan north, so that its azimuth is what its north is turned by. */
function turnOfPlan(north: string, structure: string, changes: Record<string, string> = {}): number {
  const points =
    '{a: {east: 0 m, north: 0 m, uncertainty: 1 mm}, b: {east: 0 m, north: 100 m, uncertainty: 1 mm}}'
  const { measuredDeg } = settledLine(claimText({ north, structure, points, sightlines: LINE, ...changes }))
  return measuredDeg > 180 ? measuredDeg - 360 : measuredDeg
}

const ROWS = readTable('magnetic-declination.csv')

describe('a plan by compass', () => {
  // World Magnetic Model test values, printed to 0.01°; they are for the first moment of a year, or for its middle, which
  // is 2 July 12:00 or, where the year has 366 days, 2 July 0:00: a day is worth 0.001° at most but near a pole.
  const rows = ROWS.filter(({ latitude_deg, height_km }) => Math.abs(latitude_deg!) < 85 && height_km! < 9)
  test.each(rows)('is turned by the declination of $date at $latitude_deg°, $longitude_deg°', (row) => {
    const year = Math.floor(row.date!)
    const day = row.date === year ? `1 January ${year}` : `2 July ${year}`
    const side = (deg: number, [positive, negative]: string) =>
      `${Math.abs(deg)}° ${deg < 0 ? negative : positive}`
    const place = `latitude: ${side(row.latitude_deg!, 'NS')}, longitude: ${side(wrap180(row.longitude_deg!), 'EW')}`
    const structure = `{name: Place, ${place}, elevation: ${row.height_km! * 1000} m}`
    expectWithin(
      turnOfPlan(`{from: compass, date: ${day}}`, structure),
      row.declination_deg!,
      0.0062,
      'degrees',
    )
  })

  const PLACE = '{name: Place, latitude: 50° N, longitude: 10° E}'
  test('is turned east by a stated declination east, and west by one west', () => {
    expectWithin(turnOfPlan('{from: compass, declination: 3°20′ E ± 10′}', PLACE), 10 / 3, 1e-9, 'degrees')
    expectWithin(turnOfPlan('{from: compass, declination: 3°20′ W ± 10′}', PLACE), -10 / 3, 1e-9, 'degrees')
  })

  test('is not turned again where the declination has been applied, or nothing is said of it', () => {
    expect(turnOfPlan('{from: compass, declination: applied}', PLACE)).toBe(0)
    expect(turnOfPlan('{from: compass, date: 12 June 2021, declination: applied}', PLACE)).toBe(0)
    expect(turnOfPlan('{from: compass}', PLACE)).toBe(0)
  })
})

describe('a plan by grid north', () => {
  // GDA technical manual, at Flinders Peak: azimuth 306°52′05.37″ less the bearing of the projected geodesic.
  const want = FLINDERS_TO_BUNINYONG.azimuthDeg - sexagesimal(1, 305, 17, 1.72)
  test('is turned by the convergence of the grid at the place', () => {
    const turn = turnOfPlan('{from: grid}', VICTORIA, { grid: '{zone: UTM 55 S, ellipsoid: GRS80}' })
    expectWithin((turn - want) * 3600, 0, 0.01, 'arcsec')
  })

  test('is turned by a stated one', () => {
    const turn = turnOfPlan('{from: grid, convergence: 1°35′03.65″ E}', VICTORIA)
    expectWithin((turn - want) * 3600, 0, 0.01, 'arcsec')
  })
})

const TIE = { latitudeDeg: 46.5, longitudeDeg: 8 }
const PEAK = { latitudeDeg: 46.55, longitudeDeg: 8.09 }
const TIED = (north: string) =>
  claimText({
    structure: '{name: Tied, latitude: 46.5° N, longitude: 8° E}',
    north,
    points:
      '{tie: {east: 10 m, north: 20 m, latitude: 46.500000° N, longitude: 8.000000° E, uncertainty: 1 cm}, stone: {east: 130 m, north: 370 m, uncertainty: 1 cm}, peak: {latitude: 46.550000° N, longitude: 8.090000° E, uncertainty: 5 m}}',
    sightlines: '{one: {from: stone, to: peak, horizon: 3° ± 1′}}',
  })

/** By hand: the stone 120 m east and 350 m north of the tie, by the plan's north turned clockwise so far. */
function byHand(turnDeg: number): { azimuthDeg: number; lengthM: number } {
  const bearing = (Math.atan2(120, 350) * 180) / Math.PI + turnDeg
  return geodesicLine(geodesicDestination(TIE, bearing, Math.hypot(120, 350)), PEAK)
}

describe('a plan that is tied to the Earth', () => {
  test.each([
    ['true', '{from: sun, uncertainty: 6′}', 0],
    ['by compass', '{from: compass, declination: 4° E, uncertainty: 6′}', 4],
  ])('%s: a line from one of its stones to a far peak is what it is by hand', (_, north, turn) => {
    const line = settledLine(TIED(north))
    const want = byHand(turn)
    expectWithin((line.measuredDeg - want.azimuthDeg) * 3600, 0, 1e-4, 'arcsec')
    expectWithin(line.lengthM!, want.lengthM, 1e-5, 'metres')
  })

  // A turn of the plan by its 6′ turns the line by so much less; over 400 m at 9 km it is straight to a part in a thousand.
  test('has of the error of north what a turn of the plan does to the line, with its sign', () => {
    const line = settledLine(TIED('{from: sun, uncertainty: 6′}'))
    const turned = (byHand(0.1).azimuthDeg - byHand(-0.1).azimuthDeg) / 2
    expectWithin(line.northSdDeg / turned, 1, 2e-3, 'of the deviation')
  })

  test('and the other way round, from the peak to the stone', () => {
    const text = TIED('{from: sun, uncertainty: 6′}').replace(
      'from: stone, to: peak',
      'from: peak, to: stone',
    )
    const line = settledLine(text)
    const stone = (turn: number) =>
      geodesicDestination(TIE, (Math.atan2(120, 350) * 180) / Math.PI + turn, Math.hypot(120, 350))
    const want = (turn: number) => geodesicLine(PEAK, stone(turn)).azimuthDeg
    expectWithin((line.measuredDeg - want(0)) * 3600, 0, 1e-4, 'arcsec')
    expectWithin(line.northSdDeg / ((want(0.1) - want(-0.1)) / 2), 1, 2e-3, 'of the deviation')
  })

  test('draws the peak where it stands from the stone', () => {
    const { plan } = auditWith(TIED('{from: compass, declination: 4° E, uncertainty: 6′}'))
    const [stone, peak] = plan.points
    const { azimuthDeg, lengthM } = byHand(4)
    const [east, north] = [peak!.east_m - stone!.east_m, peak!.north_m - stone!.north_m]
    expectWithin(Math.hypot(east, north), lengthM, 1e-5, 'metres')
    expectWithin((Math.atan2(east, north) * 180) / Math.PI, azimuthDeg, 1e-8, 'degrees')
    expect(plan.lines[0]).toMatchObject({ from: 0, to: 1, span: null })
  })
})

test('a plan with a turned north is drawn with true north up', () => {
  const { plan } = auditWith(
    claimText({
      north: '{from: compass, declination: 10° E, uncertainty: 6′}',
      points:
        '{a: {east: 0 m, north: 0 m, uncertainty: 1 cm}, b: {east: 60 m, north: 80 m, uncertainty: 1 cm}}',
      sightlines: LINE,
    }),
  )
  const rad = Math.PI / 180
  const bearing = Math.atan2(60, 80) + 10 * rad
  expectWithin(plan.points[1]!.east_m, 100 * Math.sin(bearing), 1e-9, 'metres')
  expectWithin(plan.points[1]!.north_m, 100 * Math.cos(bearing), 1e-9, 'metres')
  expectWithin(plan.lines[0]!.azimuth_deg!, bearing / rad, 1e-9, 'degrees')
  expectWithin(plan.north!.sd_deg, 0.1, 1e-12, 'degrees')
})

test('a claim keeps the points that its lines do not use off the drawing', () => {
  const text = claimText({
    points: '{a: {east: 0 m, north: 0 m}, b: {east: 60 m, north: 80 m}, c: {east: 1 m, north: 1 m}}',
    sightlines: LINE,
  })
  expect([...claimOf(text).points.keys()]).toEqual(['a', 'b', 'c'])
  expect(auditWith(text).plan.points.map(({ name }) => name)).toEqual(['a', 'b'])
})
