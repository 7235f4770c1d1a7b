import { describe, expect, test } from 'vitest'
import { expectWithin } from '../published/expect-within.ts'
import { skylineDistance } from '../site/skyline-distance.ts'
import { claimText } from './audit-of.ts'
import { obliquityOf, semidiameterArcmin } from './by-tables.ts'
import { auditWith, profileOf } from './settled.ts'

type Nodes = readonly (readonly [number, number])[]

const SUN = (disc: string) => `{body: sun, event: june solstice, at: rising, disc: ${disc}}`
const OTHERS = '[{label: bones, date: 3500 BCE to 2500 BCE}, {label: seeds, date: 1001 CE}]'

function textOver(horizon: string, disc: string, changes: Record<string, string> = {}): string {
  return claimText({
    structure: '{name: Place, latitude: 45° N, elevation: 0 m}',
    sightlines: `{one: {azimuth: 57° ± 2′, horizon: ${horizon}}}`,
    target: SUN(disc),
    other_dates: OTHERS,
    ...changes,
  })
}

const CRAGS: Nodes = [
  [40, 2],
  [52, 1.4],
  [55, 0.6],
  [56, 2],
  [56.4, 1.2],
  [56.8, 2.1],
  [58, 0.8],
  [60, 3],
  [80, 2],
]

describe('the disc', () => {
  const skyline = {
    nodes: CRAGS.map(([azimuthDeg, altitudeDeg]) => ({ azimuthDeg, altitudeDeg })),
    isClosed: false,
  }
  const distance = skylineDistance(skyline)

  // As the eye sees it. Refraction that changes by 0.1′ in a minute of arc presses the picture flat, and the disc with it:
  // the drawing leaves the disc round, which takes it off a steep flank by 0.05′ (16′ · (1 − cos 4.5°) at 45°).
  test.each([
    ['upper limb', -1],
    ['lower limb', 1],
    ['centre', 0],
  ] as const)('of the %s stands on the skyline', (disc, side) => {
    const { placements } = auditWith(textOver('{profile: s.csv}', disc), { 's.csv': profileOf(CRAGS, 0.02) })
    expect(placements).toHaveLength(4)
    for (const { disc: seen, year } of placements) {
      const { azimuth_deg, altitude_deg, semidiameter_arcmin } = seen!
      const { distanceDeg } = distance({ azimuthDeg: azimuth_deg, altitudeDeg: altitude_deg })
      expectWithin(distanceDeg * 60, side * semidiameter_arcmin, 0.1, 'arcmin', year)
    }
  })

  test.each([
    ['upper limb', 1],
    ['centre', 0],
    ['lower limb', -1],
  ] as const)('over a level horizon is below it by what it shows, %s', (disc, above) => {
    const { placements } = auditWith(textOver('1°30′ ± 1′', disc))
    for (const { disc: seen, direction_deg } of placements) {
      expectWithin(seen!.altitude_deg, 1.5 - (above * seen!.semidiameter_arcmin) / 60, 1e-9, 'degrees')
      expect(seen!.azimuth_deg).toBe(direction_deg)
    }
  })

  test('has the size of its year', () => {
    const { placements } = auditWith(textOver('1°30′ ± 1′', 'upper limb', { asserted_date: '9001 BCE' }))
    // Orbit of 9001 BCE (Laskar 2004), printed to 1e−7 of eccentricity.
    expectWithin(placements[0]!.disc!.semidiameter_arcmin, semidiameterArcmin(-9000, 90), 1e-3, 'arcmin')
  })

  test('is none for a star, on the meridian and for an angle', () => {
    const star = claimText({
      target: '{body: Sirius, at: rising}',
      sightlines: '{one: {azimuth: 112° ± 2′, horizon: 0° ± 1′}}',
    })
    const noon = claimText({
      target: '{body: sun, event: june solstice, at: noon}',
      sightlines: '{one: {altitude: 63° ± 2′}}',
    })
    const angle = claimText({
      target: '{body: sun, event: june to december solstice, at: rising}',
      sightlines: '{one: {span: {angle: 80° ± 2′}}}',
    })
    for (const text of [star, noon, angle])
      expect(auditWith(text).placements.map(({ disc }) => disc)).toEqual([null, null])
  })
})

describe('the placements', () => {
  const audit = auditWith(textOver('1°30′ ± 1′', 'upper limb'))

  test('are of the asserted date, of each independent one, and of today', () => {
    expect(audit.placements.map(({ kind, label, year, from, to }) => [kind, label, year, from, to])).toEqual([
      ['asserted', 'asserted date', -1999, -2099, -1899],
      ['independent', 'bones', -2999, -3499, -2499],
      ['independent', 'seeds', 1001, 1001, 1001],
      ['today', 'today', 2026, 2026, 2026],
    ])
  })

  test('hold the middle of a date in its range, whose ends are the directions at its ends', () => {
    for (const { direction_deg, direction_range_deg, from, to } of audit.placements) {
      const [low, high] = direction_range_deg!
      expect(low).toBeLessThanOrEqual(direction_deg!)
      expect(high).toBeGreaterThanOrEqual(direction_deg!)
      expect(high - low > 0).toBe(to > from)
    }
    // cos A = sin ε/cos φ on a level horizon: over 1,000 years the obliquity falls, and sunrise goes south, by Δε/(cos φ
    // sin A) to first order; at 1.5° of height a tenth of that more or less.
    const bones = audit.placements[1]!
    const [low, high] = bones.direction_range_deg!
    const slope =
      Math.cos((obliquityOf(-3000) * Math.PI) / 180) /
      (Math.cos(Math.PI / 4) * Math.sin((bones.direction_deg! * Math.PI) / 180))
    const fall = (obliquityOf(-4000) - obliquityOf(-2000)) / 2
    expectWithin((high - low) / (fall * slope), 1, 0.1, 'of the turn')
  })

  test('of today have the offset that `today` has', () => {
    const today = audit.today[0]!
    const row = audit.placements.at(-1)!
    expect(row.direction_deg).toBe(today.direction_deg)
    expect(row.offset_arcmin).toBe(today.offset_arcmin)
  })

  test('have the offset of the sightline at the asserted date, with its error', () => {
    const [line] = audit.sightlines
    const [row] = audit.placements
    expectWithin(row!.offset_arcmin!, line!.offset_at_asserted_arcmin!, 1e-9, 'arcmin')
    expectWithin(row!.offset_sd_arcmin!, line!.offset_at_asserted_sd_arcmin!, 1e-9, 'arcmin')
    expectWithin(row!.offset_arcmin!, (57 - row!.direction_deg!) * 60, 1e-9, 'arcmin')
  })

  test('of a date at which the Sun never sets have no direction', () => {
    const text = textOver('0° ± 1′', 'upper limb', {
      structure: '{name: North, latitude: 72° N, elevation: 0 m}',
    })
    for (const row of auditWith(text).placements)
      expect(row).toMatchObject({
        direction_deg: null,
        direction_range_deg: null,
        offset_arcmin: null,
        offset_sd_arcmin: null,
        disc: null,
      })
  })
})
