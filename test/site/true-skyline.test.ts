import { describe, expect, test } from 'vitest'
import { bennettRefractionArcmin } from '../../src/site/bennett.ts'
import { skylineOf } from '../../src/site/skyline.ts'
import { trueSkyline } from '../../src/site/true-skyline.ts'
import { expectWithin } from '../published/expect-within.ts'

const node = (azimuthDeg: number, altitudeDeg: number) => ({ azimuthDeg, altitudeDeg, sdDeg: 0 })
const bennett = (altitude: number) => bennettRefractionArcmin(Math.max(0, altitude), 10, 1010)

describe('trueSkyline', () => {
  test('keeps a line’s own nodes, and lowers each by the refraction there', () => {
    const { nodes } = trueSkyline(skylineOf([node(80, 0), node(81.1, 2), node(82, 2)]), bennett)
    for (const [azimuth, altitude] of [
      [80, 0],
      [81.1, 2],
      [82, 2],
    ] as const) {
      const found = nodes.find(({ azimuthDeg }) => azimuthDeg === azimuth)!
      // Bennett's formula has no meaning below the horizontal; held level there, it has a kink at 0°.
      expectWithin(found.altitudeDeg, altitude - bennett(altitude) / 60, 1e-6, 'degrees', azimuth)
    }
  })

  // What is straight to the eye is not without air: half way up a 2° slope refraction is not half way between.
  test('follows the bend of refraction to 1″ between its nodes', () => {
    const { nodes } = trueSkyline(skylineOf([node(80, 0.2), node(81, 2.2)]), bennett)
    for (let i = 0; i <= 500; i++) {
      const azimuth = 80 + i / 500
      const next = Math.max(
        1,
        nodes.findIndex(({ azimuthDeg }) => azimuthDeg >= azimuth),
      )
      const [from, to] = [nodes[next - 1], nodes[next]]
      const share = (azimuth - from.azimuthDeg) / (to.azimuthDeg - from.azimuthDeg)
      const got = from.altitudeDeg + share * (to.altitudeDeg - from.altitudeDeg)
      const apparent = 0.2 + i / 250
      expectWithin(got * 3600, (apparent - bennett(apparent) / 60) * 3600, 1, 'arcsec', azimuth)
    }
  })

  test('carries a closed skyline on at both ends', () => {
    const given = [node(0, 1), node(119, 3), node(241, 2), node(360, 1)]
    const { nodes, isClosed } = trueSkyline(skylineOf(given), () => 0)
    expect(isClosed).toBe(true)
    expectWithin(nodes[0].azimuthDeg, -4, 0.3, 'degrees')
    expectWithin(nodes.at(-1)!.azimuthDeg, 364, 0.3, 'degrees')
    const azimuths = nodes.map(({ azimuthDeg }) => azimuthDeg)
    expect(azimuths).toEqual([...azimuths].sort((a, b) => a - b))
    expect(new Set(azimuths).size).toBe(azimuths.length)
    const before = nodes[1]
    expectWithin(before.altitudeDeg, 1 - before.azimuthDeg / 119, 1e-9, 'degrees')
  })
})
