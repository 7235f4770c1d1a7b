import { describe, expect, test } from 'vitest'
import { skylineAltitude, skylineOf } from '../../src/site/skyline.ts'
import { expectWithin } from '../published/expect-within.ts'

const nodes = (...rows: [number, number, number?][]) =>
  rows.map(([azimuthDeg, altitudeDeg, sdDeg = 0]) => ({ azimuthDeg, altitudeDeg, sdDeg }))

const east = skylineOf(nodes([60, 1, 0.1], [70, 3, 0.3], [72, 2, 0.3]))
const north = skylineOf(nodes([350, 4], [356, 1], [4, 5], [10, 2]))
const round = skylineOf(nodes([30, 2], [150, 4], [270, 1], [30, 2]))

function altitude(skyline: typeof east, azimuthDeg: number): number {
  return skylineAltitude(skyline, azimuthDeg)!.deg
}

describe('skylineAltitude', () => {
  test.each([
    [60, 1, 0.1],
    [65, 2, 0.2],
    [70, 3, 0.3],
    [71.5, 2.25, 0.3],
    [72, 2, 0.3],
    [425, 2, 0.2],
  ])('is straight between nodes, at %s° too', (azimuth, deg, sdDeg) => {
    const got = skylineAltitude(east, azimuth)!
    expectWithin(got.deg, deg, 1e-9, 'degrees', 'altitude')
    expectWithin(got.sdDeg, sdDeg, 1e-9, 'degrees', 'standard deviation')
  })

  test('is not known outside', () => {
    for (const azimuth of [59.99, 72.01, 0, 180, 359]) expect(skylineAltitude(east, azimuth)).toBeNull()
    for (const azimuth of [349.9, 10.1, 180]) expect(skylineAltitude(north, azimuth)).toBeNull()
  })

  test('runs through north', () => {
    expectWithin(altitude(north, 353), 2.5, 1e-9, 'degrees')
    expectWithin(altitude(north, 0), 3, 1e-9, 'degrees')
    expectWithin(altitude(north, 360), 3, 1e-9, 'degrees')
    expectWithin(altitude(north, 7), 3.5, 1e-9, 'degrees')
    expectWithin(altitude(north, 10), 2, 1e-9, 'degrees')
  })

  test('is known everywhere on a skyline that goes round', () => {
    expect(round.isClosed).toBe(true)
    expect(north.isClosed).toBe(false)
    expectWithin(altitude(round, 330), 1.5, 1e-9, 'degrees')
    expectWithin(altitude(round, 29.999999), 2, 1e-6, 'degrees')
    expectWithin(altitude(round, 30), 2, 1e-6, 'degrees')
    for (let azimuth = 0; azimuth < 360; azimuth++) expect(altitude(round, azimuth)).toBeGreaterThanOrEqual(1)
  })

  // Sums such as 342.7 + 20.4 − 342.7 do not give back 20.4.
  test('is known at its own ends, whatever their digits', () => {
    for (let i = 0; i < 500; i++) {
      const start = (i * 0.731) % 360
      const end = (start + 20.4 + i / 700) % 360
      const skyline = skylineOf(nodes([start, 1], [end, 2]))
      expectWithin(altitude(skyline, start), 1, 1e-9, 'degrees', start)
      expectWithin(altitude(skyline, end), 2, 1e-9, 'degrees', end)
    }
  })
})

describe('skylineOf', () => {
  test.each([
    ['a single node', nodes([10, 1]), 'two nodes or more, got 1'],
    ['an azimuth beyond the circle', nodes([10, 1], [361, 1]), '0° to 360°, got 361'],
    ['an azimuth that is none', nodes([10, 1], [Number.NaN, 1]), 'got NaN'],
    ['an altitude that is none', nodes([10, 1], [20, Number.NaN]), 'got NaN'],
    ['a skyline overhead', nodes([10, 1], [20, 85]), '-5° to 80°, got 85'],
    ['a negative standard deviation', nodes([10, 1], [20, 1, -1]), '0° or more, got -1'],
    ['the same azimuth twice', nodes([10, 1], [10, 2]), '10° cannot follow 10°'],
    ['nodes from right to left', nodes([10, 1], [9, 2]), '9° cannot follow 10°'],
    ['a profile through north sorted by number', nodes([4, 1], [10, 1], [350, 2]), '350° cannot follow 10°'],
    ['more than one turn', nodes([0, 1], [120, 1], [240, 1], [20, 1]), 'once at most, got 380'],
    ['ends that disagree', nodes([0, 1], [120, 1], [240, 1], [360, 2]), 'ends as it began, got 1° and 2°'],
  ])('refuses %s', (_, given, message) => {
    expect(() => skylineOf(given)).toThrow(RangeError)
    expect(() => skylineOf(given)).toThrow(message)
  })
})
