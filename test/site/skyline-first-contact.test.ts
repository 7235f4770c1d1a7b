import { describe, expect, test } from 'vitest'
import { wrap180 } from '../../src/quantity/degrees.ts'
import { type SkylineCrossing, skylineCrossings } from '../../src/site/skyline-crossing.ts'
import type { TrueSkyline } from '../../src/site/true-skyline.ts'
import { seededRandom } from '../inference/seeded-random.ts'
import { expectWithin } from '../published/expect-within.ts'
import { firstContact } from './first-contact.ts'

type Found = Extract<SkylineCrossing, { kind: 'crossing' }>

/** Jags of a seeded random height at random distances, from an azimuth on for 20°. */
function jagged(seed: number, startDeg: number, meanStepDeg: number, roughnessDeg: number): TrueSkyline {
  const { uniform, normal } = seededRandom(seed)
  const nodes: { azimuthDeg: number; altitudeDeg: number }[] = []
  for (let turn = 0; turn < 20; turn += meanStepDeg * (0.3 + 1.4 * uniform()))
    nodes.push({ azimuthDeg: startDeg + turn, altitudeDeg: 1.5 + roughnessDeg * normal() })
  return { nodes, isClosed: false }
}

const CASES = [
  { name: 'hills', start: 55, step: 1.5, roughness: 0.3, latitude: 51, at: 'rising', above: 16 },
  { name: 'hills, lower limb', start: 55, step: 1.5, roughness: 0.3, latitude: 51, at: 'rising', above: -16 },
  { name: 'hills, centre', start: 55, step: 1.5, roughness: 0.3, latitude: 51, at: 'rising', above: 0 },
  { name: 'crags', start: 60, step: 0.5, roughness: 0.4, latitude: 40, at: 'rising', above: 15.7 },
  {
    name: 'crags, set full',
    start: 280,
    step: 0.5,
    roughness: 0.4,
    latitude: 40,
    at: 'setting',
    above: -15.7,
  },
  {
    name: 'teeth finer than the disc',
    start: 285,
    step: 0.1,
    roughness: 0.2,
    latitude: 30,
    at: 'setting',
    above: 16,
  },
  { name: 'teeth, lower limb', start: 60, step: 0.1, roughness: 0.2, latitude: 30, at: 'rising', above: -16 },
  { name: 'the south', start: 100, step: 0.7, roughness: 0.4, latitude: -35, at: 'rising', above: 16 },
  {
    name: 'the south, a little showing',
    start: 240,
    step: 0.7,
    roughness: 0.4,
    latitude: -35,
    at: 'setting',
    above: 14,
  },
  { name: 'the tropics', start: 60, step: 0.7, roughness: 0.4, latitude: 8, at: 'rising', above: 16 },
  { name: 'through north', start: 350, step: 0.7, roughness: 0.4, latitude: 62, at: 'rising', above: 16 },
] as const

/** The last declination to one side of another that crosses within the profile, less than a step off. */
function endOf(crossing: (declination: number) => SkylineCrossing, from: number, side: 1 | -1): number {
  let [inside, outside] = [from, from + side * 0.01]
  while (Math.abs(outside - inside) > 1e-9) {
    const middle = (inside + outside) / 2
    if (crossing(middle).kind === 'crossing') inside = middle
    else outside = middle
  }
  return inside
}

const DECLINATIONS = Array.from({ length: 18_001 }, (_, i) => i / 100 - 90)

describe('skylineCrossings finds what following the body through the sky finds', () => {
  test.each(CASES)('$name', ({ start, step, roughness, latitude, at, above }) => {
    const { uniform } = seededRandom(77)
    let [compared, jumps, outside] = [0, 0, 0]
    for (let seed = 1; seed <= 2; seed++) {
      const skyline = jagged(seed, start, step, roughness)
      const sighting = { latitudeDeg: latitude, at, aboveCentreArcmin: above, parallaxArcsec: 0 }
      const { crossing } = skylineCrossings(skyline, sighting)
      const within = DECLINATIONS.filter((declination) => crossing(declination).kind === 'crossing')
      const low = endOf(crossing, within[0]!, -1) - 0.5
      const high = endOf(crossing, within.at(-1)!, 1) + 0.5
      let before: number | null = null
      for (let i = 0; i < 14; i++) {
        const declination = low + ((i + uniform()) / 14) * (high - low)
        const got = crossing(declination)
        const want = firstContact(skyline, latitude, declination, above / 60, at)
        const name = `skyline ${seed}, declination ${declination}`
        expect(got.kind, name).toBe(want === null ? 'outside profile' : 'crossing')
        if (want === null) outside++
        else {
          compared++
          const { centreAzimuthDeg, contactAzimuthDeg, azimuthDeg } = got as Found
          const apart = (a: number, b: number) => wrap180(a - b) * 3600
          // Places on an arc are straight in between to 0.15″, which a body that comes in at 10° makes six times that.
          expectWithin(apart(centreAzimuthDeg, want.centreAzimuthDeg), 0, 1, 'arcsec', name)
          expectWithin(apart(contactAzimuthDeg, want.contactAzimuthDeg), 0, 1, 'arcsec', name)
          expect(azimuthDeg).toBe(above > 0 ? contactAzimuthDeg : centreAzimuthDeg)
          if (before !== null && Math.abs(wrap180(azimuthDeg - before)) > 1) jumps++
          before = azimuthDeg
        }
      }
    }
    expect(compared).toBeGreaterThan(10)
    expect(outside).toBeGreaterThan(0)
    // The declinations are a degree apart and less: without a jump the azimuth goes on by little more than that.
    expect(jumps).toBeGreaterThan(0)
  })
})

describe('on a ridge with two notches', () => {
  // A ridge at 3° with two notches. A body that gleams in the first, if it stands a little farther south, passes just
  // under its edge and comes out on the far slope of the ridge between the two.
  const skyline: TrueSkyline = {
    nodes: [
      [70, 5],
      [79.5, 3],
      [80, 1.5],
      [80.5, 3],
      [83.5, 3],
      [84, 1],
      [84.5, 3],
      [95, 3],
    ].map(([azimuthDeg, altitudeDeg]) => ({ azimuthDeg, altitudeDeg })),
    isClosed: false,
  }
  const sighting = { latitudeDeg: 45, at: 'rising', aboveCentreArcmin: 16, parallaxArcsec: 0 } as const
  const { crossing } = skylineCrossings(skyline, sighting)
  const gleam = (declination: number) => (crossing(declination) as Found).azimuthDeg

  test('the gleam jumps out of the first', () => {
    let [before, after] = [9, 7]
    while (before - after > 1e-7) {
      const middle = (before + after) / 2
      if (gleam(middle) < 81) before = middle
      else after = middle
    }
    expect(gleam(after) - gleam(before)).toBeGreaterThan(1)
    // The two routes agree to 0.1″ on which body still gleams in the notch: 0.4″ to each side of that there is no doubt.
    for (const declination of [before + 1e-4, after - 1e-4]) {
      const want = firstContact(skyline, 45, declination, 16 / 60, 'rising')!
      expectWithin(gleam(declination) * 3600, want.contactAzimuthDeg * 3600, 1, 'arcsec', declination)
    }
  })
})
