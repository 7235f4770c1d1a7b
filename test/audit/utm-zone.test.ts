import { describe, expect, test } from 'vitest'
import { findStar } from '../../src/audit/star-names.ts'
import { projectionOf } from '../../src/audit/survey/projection-of.ts'
import { readClaim } from '../../src/claim/read-claim.ts'
import { GRS80 } from '../../src/site/ellipsoid.ts'
import { gridConvergenceDeg } from '../../src/site/grid-convergence.ts'
import { geographicOf, type TransverseMercatorGrid } from '../../src/site/transverse-mercator.ts'
import { utmGrid } from '../site/utm-grid.ts'
import { claimText } from './audit-of.ts'

/** A claim whose plan has the north of a grid, about a place of which nothing but its coordinates matters. */
function readWith(grid: string, place: string) {
  const text = claimText({
    structure: `{name: Test place, ${place}}`,
    north: '{from: grid}',
    grid,
    points: '{a: {east: 0 m, north: 0 m}, b: {east: 30 m, north: 20 m}}',
    sightlines: '{one: {from: a, to: b}}',
  })
  return readClaim(text, { findStar })
}

function gridOfClaim(grid: string, place: string): TransverseMercatorGrid {
  const { claim, problems } = readWith(grid, place)
  expect(problems).toEqual([])
  if (claim?.grid?.by !== 'projection') throw new Error('the grid was not read')
  return projectionOf(claim.grid.projection)
}

describe('a zone has the same figures for the reader of claims and by the standard', () => {
  test.each([1, 33, 60])('zone %i', (zone) => {
    for (const side of ['N', 'S'] as const) {
      const place = `latitude: 41° ${side}, longitude: ${6 * zone - 183}°`
      expect(gridOfClaim(`{zone: UTM ${zone} ${side}}`, place)).toEqual(utmGrid(zone, side))
      expect(gridOfClaim(`{zone: UTM ${zone} ${side}, ellipsoid: GRS80}`, place)).toEqual(
        utmGrid(zone, side, GRS80),
      )
    }
  })
})

// NGA.SIG.0012 (from memory): zone 1 reaches from 180° W to 174° W, zone 60 ends at 180° E.
test.each([
  [1, -177],
  [30, -3],
  [31, 3],
  [60, 177],
])('zone %i is centred on %i°', (zone, meridian) => {
  const grid = gridOfClaim(`{zone: UTM ${zone} N}`, `latitude: 41° N, longitude: ${meridian}°`)
  expect(grid.centralMeridianDeg).toBe(meridian)
  expect(grid).toMatchObject({ scale: 0.9996, falseEastingM: 500_000, falseNorthingM: 0 })
})

// The reader reckons on the sphere how far the projection reaches, the computation refuses on the ellipsoid.
describe('a north that the reader lets rest on a grid has a convergence', () => {
  const ZONE = utmGrid(31, 'N')

  test.each([0, 20, 41, 53, 58, 70, 85])('at %i° N', (latitude) => {
    const isRead = (eastward: number) =>
      readWith('{zone: UTM 31 N}', `latitude: ${latitude}° N, longitude: ${3 + eastward}°`).claim !== null
    const read = Array.from({ length: 110 }, (_, index) => index + 1).filter(isRead)
    expect(read.length).toBeGreaterThanOrEqual(32)
    expect(Math.max(...read)).toBeLessThanOrEqual(90)
    const convergences = read.map((eastward) =>
      gridConvergenceDeg({ latitudeDeg: latitude, longitudeDeg: 3 + eastward }, ZONE),
    )
    expect(convergences.every(Number.isFinite)).toBe(true)
  })

  test('and one that it refuses within 90° lies over 3800 km off on the grid', () => {
    const place = geographicOf({ eastingM: 500_000 + 3_800_000, northingM: 1_000_000 }, ZONE)
    const at = `latitude: ${place.latitudeDeg}°, longitude: ${place.longitudeDeg}°`
    expect(readWith('{zone: UTM 31 N}', at).claim).not.toBeNull()
    const beyond = geographicOf({ eastingM: 500_000 + 3_899_000, northingM: 1_000_000 }, ZONE)
    const there = `latitude: ${beyond.latitudeDeg}°, longitude: ${beyond.longitudeDeg}°`
    expect(readWith('{zone: UTM 31 N}', there).problems).toMatchObject([
      { code: 'far-from-structure', severity: 'error' },
    ])
  })
})
