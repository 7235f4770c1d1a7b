import { describe, expect, test } from 'vitest'
import { DEG } from '../../src/quantity/degrees.ts'
import { discPath } from '../../src/site/disc-path.ts'
import type { TrueSkyline } from '../../src/site/true-skyline.ts'
import { seededRandom } from '../inference/seeded-random.ts'
import { expectWithin } from '../published/expect-within.ts'
import { skylineDistance } from './skyline-distance.ts'

const plain = (...rows: [number, number][]): TrueSkyline => ({
  nodes: rows.map(([azimuthDeg, altitudeDeg]) => ({ azimuthDeg, altitudeDeg })),
  isClosed: false,
})

function jagged(seed: number, stepDeg: number, roughnessDeg: number): TrueSkyline {
  const { normal } = seededRandom(seed)
  return plain(
    ...Array.from({ length: Math.ceil(8 / stepDeg) }, (_, i): [number, number] => [
      356 + i * stepDeg,
      4 + roughnessDeg * normal(),
    ]),
  )
}

describe('discPath', () => {
  test.each([
    { above: 16, step: 1, roughness: 0.5 },
    { above: -16, step: 1, roughness: 0.5 },
    { above: 15, step: 0.1, roughness: 0.2 },
    { above: -15, step: 0.1, roughness: 0.2 },
    { above: 2, step: 0.3, roughness: 0.5 },
  ])('keeps a disc of $above′ on a skyline with nodes $step° apart', ({ above, step, roughness }) => {
    const skyline = jagged(9, step, roughness)
    const distance = skylineDistance(skyline)
    const path = discPath(skyline, above / 60)
    expect(path.length).toBeGreaterThan(150)
    for (const { azimuthDeg, altitudeDeg, contactAzimuthDeg } of path) {
      const { distanceDeg } = distance({ azimuthDeg, altitudeDeg })
      // An arc may part from its chord by 0.15″, and the corner of two arcs from that of their chords by twice as much.
      expectWithin(distanceDeg * 3600, -above * 60, 0.35, 'arcsec', azimuthDeg)
      expect(Math.abs(contactAzimuthDeg - azimuthDeg)).toBeLessThan(0.28)
    }
    for (let i = 1; i < path.length; i++)
      expect(path[i].azimuthDeg).toBeGreaterThanOrEqual(path[i - 1].azimuthDeg)
  })

  test('is the skyline itself where the centre stands on it', () => {
    const skyline = jagged(3, 0.5, 0.5)
    for (const { nodes } of [skyline])
      for (const node of nodes)
        expect(discPath(skyline, 0)).toContainEqual({ ...node, contactAzimuthDeg: node.azimuthDeg })
  })

  test('hangs from a notch by one point', () => {
    const notch = plain([80, 3], [84.5, 3], [85, 1], [85.5, 3], [90, 3])
    const under = discPath(notch, 16 / 60).filter((place) => place.contactAzimuthDeg === 85)
    const lowest = under.reduce((low, place) => (place.altitudeDeg < low.altitudeDeg ? place : low))
    expectWithin(lowest.altitudeDeg * 60, 60 - 16, 0.003, 'arcmin')
    // It turns about the point from being square to one flank to being square to the other.
    const flank = Math.atan2(2, 0.5 * Math.cos(DEG)) / DEG
    const reach = (Math.asin(Math.sin((16 / 60) * DEG) * Math.sin(flank * DEG)) / DEG) * 60
    const widest = Math.max(...under.map((place) => (place.azimuthDeg - 85) * 60))
    expectWithin(widest, reach, 0.02, 'arcmin')
  })

  test('touches both flanks under a peak', () => {
    const peak = plain([80, 1], [84, 1], [85, 3], [86, 1], [90, 1])
    const path = discPath(peak, 16 / 60)
    const top = path.filter(({ azimuthDeg }) => Math.abs(azimuthDeg - 85) < 1e-6)
    expect(top.length).toBe(2)
    const [left, right] = top.map(({ contactAzimuthDeg }) => contactAzimuthDeg)
    expectWithin(85 - left, right - 85, 1e-6, 'degrees')
    // In the plane: a/sin(half of the top's angle) below it, a cos of that half away on each side.
    const half = Math.atan2(Math.cos(2.5 * DEG), 2)
    expectWithin(right - 85, (16 / 60) * Math.cos(half), 0.001, 'degrees')
    expectWithin(3 - top[0].altitudeDeg, 16 / 60 / Math.sin(half), 0.001, 'degrees')
  })

  test('keeps its half width from the ends', () => {
    const path = discPath(plain([80, 20], [90, 20]), 15 / 60)
    const halfWidth = Math.asin(Math.sin(0.25 * DEG) / Math.cos(19.75 * DEG)) / DEG
    for (const short of [path[0].azimuthDeg - 80 - halfWidth, 90 - halfWidth - path.at(-1)!.azimuthDeg]) {
      expect(short).toBeGreaterThan(-1e-6)
      expect(short).toBeLessThan(2.2 / 60)
    }
  })

  test('says what is no disc', () => {
    expect(() => discPath(plain([80, 1], [90, 1]), 2)).toThrow('1° at most, got 2°')
    expect(() => discPath(plain([80, 1], [90, 1]), Number.NaN)).toThrow(RangeError)
  })
})
