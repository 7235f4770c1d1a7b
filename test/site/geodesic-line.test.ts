import { describe, expect, test } from 'vitest'
import { wrap180 } from '../../src/quantity/degrees.ts'
import { GRS80, WGS84 } from '../../src/site/ellipsoid.ts'
import { geodesicDestination, geodesicLine } from '../../src/site/geodesic-line.ts'
import { expectWithin } from '../published/expect-within.ts'
import { readTable } from '../published/read-table.ts'
import { BUNINYONG, FLINDERS_PEAK, FLINDERS_TO_BUNINYONG } from './published-places.ts'

const at = (latitudeDeg: number, longitudeDeg: number) => ({ latitudeDeg, longitudeDeg })

const GEODESICS = readTable('geodesics.csv').map((row) => ({
  from: at(row.latitude_deg!, row.longitude_deg!),
  to: at(row.to_latitude_deg!, row.to_longitude_deg!),
  azimuthDeg: row.azimuth_deg!,
  lengthM: row.length_m!,
}))

describe('geodesicLine', () => {
  // GDA technical manual; printed to a millimetre and 0.01″.
  test('goes from Flinders Peak to Buninyong', () => {
    const line = geodesicLine(FLINDERS_PEAK, BUNINYONG, GRS80)
    expectWithin(line.lengthM, FLINDERS_TO_BUNINYONG.lengthM, 0.0005, 'metres')
    expectWithin((line.azimuthDeg - FLINDERS_TO_BUNINYONG.azimuthDeg) * 3600, 0, 0.005, 'arcsec')
  })

  test.each(GEODESICS)('goes $lengthM m at $azimuthDeg°', ({ from, to, azimuthDeg, lengthM }) => {
    const line = geodesicLine(from, to)
    expectWithin(line.lengthM, lengthM, 1e-7, 'metres')
    expectWithin(wrap180(line.azimuthDeg - azimuthDeg), 0, 1e-12, 'degrees')
    expect(line.azimuthDeg).toBeGreaterThanOrEqual(0)
  })

  // The equator is a circle of the equatorial radius, and of the shortest lines while the arc is short.
  test('goes along the equator, and across the meridian of 180°', () => {
    const line = geodesicLine(at(0, 179.5), at(0, -179.5))
    expectWithin(line.azimuthDeg, 90, 1e-12, 'degrees')
    expectWithin(line.lengthM, (WGS84.equatorialRadiusM * Math.PI) / 180, 1e-8, 'metres')
  })

  test('refuses what has no direction, and what is no place', () => {
    expect(() => geodesicLine(at(51, -2), at(51, 358))).toThrow(
      new RangeError('both ends of the line are at latitude 51°, longitude -2°; write two places'),
    )
    expect(() => geodesicLine(at(51, -2), at(91, -2))).toThrow(RangeError)
    expect(() => geodesicLine(at(Number.NaN, -2), at(51, -2))).toThrow(RangeError)
  })
})

describe('geodesicDestination', () => {
  test.each(GEODESICS)('ends where the table does, $lengthM m on', ({ from, to, azimuthDeg, lengthM }) => {
    const end = geodesicDestination(from, azimuthDeg, lengthM)
    // 1e−12° are 0.1 µm on the ground.
    expectWithin(end.latitudeDeg, to.latitudeDeg, 2e-12, 'degrees')
    expectWithin(wrap180(end.longitudeDeg - to.longitudeDeg), 0, 2e-12, 'degrees')
    expect(Math.abs(end.longitudeDeg)).toBeLessThanOrEqual(180)
  })

  test('stays where it is after no length', () => {
    expect(geodesicDestination(at(51, 358), 12, 0)).toEqual(at(51, -2))
  })

  test('refuses a length below zero and an azimuth that is none', () => {
    const start = at(51, -2)
    expect(() => geodesicDestination(start, 0, -1)).toThrow(
      new RangeError('the length is -1; write metres, zero or more'),
    )
    expect(() => geodesicDestination(start, Number.NaN, 1)).toThrow(RangeError)
    expect(() => geodesicDestination(at(95, 0), 0, 1)).toThrow(RangeError)
  })
})
