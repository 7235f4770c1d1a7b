import { describe, expect, test } from 'vitest'
import { DEG, wrap180 } from '../../src/quantity/degrees.ts'
import { declinationDeg, horizonCrossing } from '../../src/site/horizontal.ts'
import { type SkylineCrossing, skylineCrossings } from '../../src/site/skyline-crossing.ts'
import type { TrueSkyline } from '../../src/site/true-skyline.ts'
import { seededRandom } from '../inference/seeded-random.ts'
import { expectWithin } from '../published/expect-within.ts'

type Found = Extract<SkylineCrossing, { kind: 'crossing' }>

/**
 * A great circle through two opposite points of the horizon is a skyline on which the whole answer is closed: a disc
 * stands on it where its centre is at a distance a from the circle, c · n = −sin a with n the circle's pole, and the
 * body is there where c · P = sin δ with P the celestial pole. So c = αn + βP ± γ(n × P), and the gleam is seen at the
 * foot of the perpendicular, c − (c · n)n.
 */
describe('on a great circle that slopes', () => {
  type Vector = readonly [north: number, east: number, up: number]
  const dot = (a: Vector, b: Vector) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2]
  const azimuthOf = ([north, east]: Vector) => Math.atan2(east, north) / DEG
  const sum = (...parts: [number, Vector][]): Vector => [
    parts.reduce((total, [by, v]) => total + by * v[0], 0),
    parts.reduce((total, [by, v]) => total + by * v[1], 0),
    parts.reduce((total, [by, v]) => total + by * v[2], 0),
  ]

  function solve(
    node: number,
    slope: number,
    above: number,
    declination: number,
    latitude: number,
    rises: boolean,
  ) {
    const [A, i, a, d, f] = [node, slope, above, declination, latitude].map((angle) => angle * DEG)
    const n: Vector = [Math.sin(A) * Math.sin(i), -Math.cos(A) * Math.sin(i), Math.cos(i)]
    const P: Vector = [Math.cos(f), 0, Math.sin(f)]
    const across: Vector = [n[1] * P[2] - n[2] * P[1], n[2] * P[0] - n[0] * P[2], n[0] * P[1] - n[1] * P[0]]
    const g = dot(n, P)
    const square = 1 - g * g
    const alpha = (-Math.sin(a) - g * Math.sin(d)) / square
    const beta = (Math.sin(d) + g * Math.sin(a)) / square
    const gamma = Math.sqrt((1 - alpha ** 2 - beta ** 2 - 2 * alpha * beta * g) / square)
    // The sky turns by P × c, of which n · (P × c) = c · (n × P) leads off the circle: upwards where γ is positive.
    const c = sum([alpha, n], [beta, P], [rises ? gamma : -gamma, across])
    // How steeply the body comes in, as the sine of the angle to the skyline.
    const steepness = (gamma * square) / Math.cos(d)
    return { centre: azimuthOf(c), gleam: azimuthOf(sum([1, c], [-dot(c, n), n])), steepness }
  }

  function circle(node: number, slope: number): TrueSkyline {
    const nodes = Array.from({ length: 1201 }, (_, i) => {
      const turn = -30 + i / 20
      return {
        azimuthDeg: node + turn,
        altitudeDeg: Math.atan(Math.tan(slope * DEG) * Math.sin(turn * DEG)) / DEG,
      }
    })
    return { nodes, isClosed: false }
  }

  test.each([
    { above: 16, at: 'rising' as const },
    { above: 0, at: 'rising' as const },
    { above: -16, at: 'rising' as const },
    { above: 15, at: 'setting' as const },
    { above: 0, at: 'setting' as const },
    { above: -15, at: 'setting' as const },
  ])('is the closed form’s, $at, skyline $above′ above the centre', ({ above, at }) => {
    const { uniform } = seededRandom(above + 100)
    let compared = 0
    for (let round = 0; round < 25; round++) {
      const latitude = -65 + 130 * uniform()
      const node = (at === 'rising' ? 60 : 240) + 60 * uniform()
      const slope = -35 + 70 * uniform()
      const sighting = { latitudeDeg: latitude, at, aboveCentreArcmin: above, parallaxArcsec: 0 }
      const { crossing } = skylineCrossings(circle(node, slope), sighting)
      const declination = declinationDeg(node + 20 * (uniform() - 0.5), 0, latitude)
      const want = solve(node, slope, above / 60, declination, latitude, at === 'rising')
      const isWithin = Math.abs(wrap180(want.centre - node)) < 29
      if (!isWithin || !(want.steepness > 0.1)) continue
      compared++
      const name = `latitude ${latitude}, slope ${slope} at ${node}, declination ${declination}`
      const got = crossing(declination) as Found
      expect(got.kind, name).toBe('crossing')
      expectWithin(wrap180(got.centreAzimuthDeg - want.centre) * 3600, 0, 1, 'arcsec', name)
      expectWithin(wrap180(got.contactAzimuthDeg - want.gleam) * 3600, 0, 1, 'arcsec', name)
      expect(got.azimuthDeg).toBe(above > 0 ? got.contactAzimuthDeg : got.centreAzimuthDeg)
    }
    expect(compared).toBeGreaterThan(12)
  })

  // A hillside that climbs to the right by 30°: the gleam shows 8′ left of the point over the disc's centre, and a level
  // horizon of the gleam's own altitude would put it some minutes of arc beside.
  test('is not a level horizon of the altitude where the line points', () => {
    const sighting = { latitudeDeg: 50, at: 'rising', aboveCentreArcmin: 16, parallaxArcsec: 0 } as const
    const got = skylineCrossings(circle(70, 30), sighting).crossing(14) as Found
    const want = solve(70, 30, 16 / 60, 14, 50, true)
    const altitude = Math.atan(Math.tan(30 * DEG) * Math.sin((want.gleam - 70) * DEG)) / DEG
    const asIfLevel = horizonCrossing(14, altitude - 16 / 60, 50, 'rising')!.azimuthDeg
    expectWithin(got.azimuthDeg, want.gleam, 1 / 3600, 'degrees')
    expectWithin(
      Math.abs(got.contactAzimuthDeg - got.centreAzimuthDeg) * 60,
      16 * Math.sin(30 * DEG),
      0.2,
      'arcmin',
    )
    expect(Math.abs(asIfLevel - got.azimuthDeg) * 60).toBeGreaterThan(4)
  })
})
