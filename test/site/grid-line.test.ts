import { describe, expect, test } from 'vitest'
import { ARCSEC } from '../../src/quantity/degrees.ts'
import { INTERNATIONAL_1924 } from '../../src/site/ellipsoid.ts'
import { geodesicLine } from '../../src/site/geodesic-line.ts'
import { gridConvergenceDeg } from '../../src/site/grid-convergence.ts'
import { gridLineByConvergence } from '../../src/site/grid-line.ts'
import {
  type GridPoint,
  geographicOf,
  type TransverseMercatorGrid,
} from '../../src/site/transverse-mercator.ts'
import { expectWithin } from '../published/expect-within.ts'
import {
  BUNINYONG_ON_GRID,
  FLINDERS_PEAK_ON_GRID,
  FLINDERS_TO_BUNINYONG,
  MGA_55,
  sexagesimal,
} from './published-places.ts'
import { utmGrid } from './utm-grid.ts'

/** A line of a known grid with both its ends taken to the ellipsoid, so that nothing is left out. */
function lineOnEarth(from: GridPoint, to: GridPoint, grid: TransverseMercatorGrid) {
  return geodesicLine(geographicOf(from, grid), geographicOf(to, grid), grid.ellipsoid)
}

describe('a line of a known grid', () => {
  // GDA technical manual. Ends to 1 mm across 55 km turn the line by 0.005″; the printed azimuth is rounded to 0.01″.
  test('goes from Flinders Peak to Buninyong', () => {
    const line = lineOnEarth(FLINDERS_PEAK_ON_GRID, BUNINYONG_ON_GRID, MGA_55)
    expectWithin((line.azimuthDeg - FLINDERS_TO_BUNINYONG.azimuthDeg) * 3600, 0, 0.01, 'arcsec')
    expectWithin(line.lengthM, FLINDERS_TO_BUNINYONG.lengthM, 0.0015, 'metres')
  })

  // The same manual: azimuth less convergence is 305°17′01.72″; the chord on the plane turns 19.47″ (from memory) from
  // that, clockwise here, and is 54,992.279 m long (from memory). Each angle is rounded to 0.01″.
  test('has the bearing and the length of the plane besides', () => {
    const line = gridLineByConvergence(FLINDERS_PEAK_ON_GRID, BUNINYONG_ON_GRID, 0)
    const want = sexagesimal(1, 305, 17, 1.72 + 19.47)
    expectWithin((line.planeBearingDeg - want) * 3600, 0, 0.01, 'arcsec')
    expectWithin(line.planeLengthM, 54_992.279, 0.0015, 'metres')
  })

  // The central meridian is true to scale whatever the ellipsoid (Snyder 1987, USGS Paper 1395, section 8).
  test('is as long as on the plane, over the scale, along the central meridian', () => {
    const north = { eastingM: 500_000, northingM: 5_100_000 }
    const grid = utmGrid(33, 'N', INTERNATIONAL_1924)
    const line = lineOnEarth({ eastingM: 500_000, northingM: 5_000_000 }, north, grid)
    expectWithin(line.lengthM, 100_000 / 0.9996, 1e-7, 'metres')
    expectWithin(line.azimuthDeg, 0, 1e-10, 'degrees')
  })
})

/**
 * How far the chord of a line on the grid is turned from its start, arcsec: ΔN (2E₁ + E₂)/6r², less 1 part in 27 of
 * (2E₁ + E₂)²/r² (GDA technical manual, arc-to-chord correction, from memory), with E from the central meridian and
 * r² = ρ ν k₀² = 4.0580e13 m² on GRS 80 at 37.8°.
 */
function arcToChordArcsec(from: GridPoint, to: GridPoint): number {
  const east = 2 * from.eastingM + to.eastingM - 3 * MGA_55.falseEastingM
  const square = 4.058e13
  const turn = ((to.northingM - from.northingM) * east) / (6 * square)
  return (turn * (1 - east ** 2 / (27 * square))) / ARCSEC
}

describe('gridLineByConvergence', () => {
  test.each([
    [0, 10, 1.5, 1.5],
    [10, 0, -2, 88],
    [0, 10, -2, 358],
    [-10, 0.0, 91, 1],
  ])('%s m east, %s m north, convergence %s°: azimuth %s°', (east, north, convergence, azimuth) => {
    const from = { eastingM: 400_000, northingM: 100_000 }
    const to = { eastingM: 400_000 + east, northingM: 100_000 + north }
    expectWithin(gridLineByConvergence(from, to, convergence).azimuthDeg, azimuth, 1e-12, 'degrees')
  })

  // The formula lacks what grows with the third power of the length: at 55 km it gives 19.467″ where the manual's printed
  // coordinates, azimuth and convergence together leave 19.46″ ± 0.01″; at 1 km nothing is left of that.
  test.each([
    [BUNINYONG_ON_GRID, 0.01],
    [{ eastingM: 273_741.297, northingM: 5_797_489.777 }, 0.001],
    [{ eastingM: 274_741.297, northingM: 5_796_489.777 }, 0.001],
  ])('to %o leaves out only the curvature of the line', (to, toleranceArcsec) => {
    const convergence = gridConvergenceDeg(geographicOf(FLINDERS_PEAK_ON_GRID, MGA_55), MGA_55)
    const short = gridLineByConvergence(FLINDERS_PEAK_ON_GRID, to, convergence)
    const whole = lineOnEarth(FLINDERS_PEAK_ON_GRID, to, MGA_55)
    const leftOut = (whole.azimuthDeg - short.azimuthDeg) * 3600
    expectWithin(leftOut, arcToChordArcsec(FLINDERS_PEAK_ON_GRID, to), toleranceArcsec, 'arcsec')
  })

  test('refuses one place twice, and a convergence that is none', () => {
    const place = { eastingM: 1, northingM: 2 }
    expect(() => gridLineByConvergence(place, place, 1)).toThrow(
      new RangeError('the line runs from 1 m east, 2 m north to 1 m east, 2 m north; write two places'),
    )
    expect(() => gridLineByConvergence(place, { eastingM: 2, northingM: 2 }, Number.NaN)).toThrow(RangeError)
    expect(() => gridLineByConvergence(place, { eastingM: Number.NaN, northingM: 2 }, 1)).toThrow(RangeError)
  })
})
