import { describe, expect, test } from 'vitest'
import { wrap180, wrap360 } from '../../src/quantity/degrees.ts'
import { bennettRefractionArcmin } from '../../src/site/bennett.ts'
import { centreAltitudeDeg } from '../../src/site/centre-altitude.ts'
import { declinationDeg, declinationPerAltitude, horizonCrossing } from '../../src/site/horizontal.ts'
import { skylineOf } from '../../src/site/skyline.ts'
import { type SkylineCrossing, skylineCrossings } from '../../src/site/skyline-crossing.ts'
import { type TrueSkyline, trueSkyline } from '../../src/site/true-skyline.ts'
import { seededRandom } from '../inference/seeded-random.ts'
import { expectWithin } from '../published/expect-within.ts'

type Found = Extract<SkylineCrossing, { kind: 'crossing' }>

const refraction = (altitude: number) => bennettRefractionArcmin(Math.max(0, altitude), 10, 1010)

const level = (fromDeg: number, widthDeg: number, altitudeDeg: number) =>
  skylineOf(
    Array.from({ length: 7 }, (_, i) => ({
      azimuthDeg: wrap360(fromDeg + (i * widthDeg) / 6),
      altitudeDeg,
      sdDeg: 0,
    })),
  )

const plain = (...rows: [number, number][]): TrueSkyline => ({
  nodes: rows.map(([azimuthDeg, altitudeDeg]) => ({ azimuthDeg, altitudeDeg })),
  isClosed: false,
})

const SUN = 8.794
const MOON = 57.04 * 60

/** Change of azimuth for each degree by which the skyline is raised, which does what lowering the body by ∂δ/∂h does. */
function perAltitude(
  { perDeclination, centreAltitudeDeg: altitude }: Found,
  declination: number,
  latitudeDeg: number,
) {
  return -perDeclination * declinationPerAltitude(declination, altitude, latitudeDeg)
}

describe('on a level skyline', () => {
  const cases = [51.2, 68, 23, 4, -12, -41.3].flatMap((latitudeDeg) =>
    (['rising', 'setting'] as const).flatMap((at) =>
      [
        [16, SUN],
        [0, SUN],
        [-16, SUN],
        [15.54, MOON],
        [-15.54, MOON],
        [13, SUN],
      ].map(([aboveCentreArcmin, parallaxArcsec]) => ({
        latitudeDeg,
        at,
        aboveCentreArcmin,
        parallaxArcsec,
      })),
    ),
  )

  test.each(cases)(
    'is the level horizon’s at latitude $latitudeDeg, $at, $aboveCentreArcmin′, $parallaxArcsec″',
    (sighting) => {
      for (const [altitude, declination] of [
        [0.4, 19.5],
        [3, -14],
        [7.5, 2],
      ]) {
        const centre = centreAltitudeDeg(
          altitude,
          refraction(altitude),
          sighting.aboveCentreArcmin,
          sighting.parallaxArcsec,
        )
        const want = horizonCrossing(declination, centre, sighting.latitudeDeg, sighting.at)!
        const skyline = trueSkyline(level(wrap360(want.azimuthDeg - 6.3), 12, altitude), refraction)
        const got = skylineCrossings(skyline, sighting).crossing(declination) as Found
        const name = `altitude ${altitude}`
        expect(got.kind, name).toBe('crossing')
        expectWithin(wrap180(got.azimuthDeg - want.azimuthDeg) * 3600, 0, 1, 'arcsec', name)
        expectWithin(wrap180(got.contactAzimuthDeg - got.centreAzimuthDeg) * 3600, 0, 0.1, 'arcsec', name)
        expectWithin(got.centreAltitudeDeg * 3600, centre * 3600, 0.1, 'arcsec', name)
        // By differences over 2′ of path: an eighth of that, times how fast the derivative changes.
        expectWithin(got.perDeclination / want.perDeclination, 1, 0.002, 'of it', name)
        expectWithin(
          perAltitude(got, declination, sighting.latitudeDeg),
          want.perAltitude,
          0.002 * (1 + Math.abs(want.perAltitude)),
          'degrees per degree',
          name,
        )
      }
    },
  )
})

describe('its derivatives', () => {
  const { normal } = seededRandom(31)
  const hills = plain(
    ...Array.from({ length: 41 }, (_, i): [number, number] => [60 + i, 2 + 0.25 * normal()]),
  )
  const shifted = (by: number) => ({
    nodes: hills.nodes.map((node) => ({ ...node, altitudeDeg: node.altitudeDeg + by })),
    isClosed: false,
  })

  test.each([
    { latitudeDeg: 48, aboveCentreArcmin: 16, parallaxArcsec: SUN },
    { latitudeDeg: 48, aboveCentreArcmin: -16, parallaxArcsec: SUN },
    { latitudeDeg: 20, aboveCentreArcmin: 0, parallaxArcsec: MOON },
    { latitudeDeg: -48, aboveCentreArcmin: 16, parallaxArcsec: MOON },
  ])('are those of small differences: $latitudeDeg°, $aboveCentreArcmin′', (rest) => {
    const sighting = { ...rest, at: 'rising' as const }
    const tables = [-2e-3, 0, 2e-3].map((skylineShiftDeg) =>
      skylineCrossings(hills, { ...sighting, skylineShiftDeg }),
    )
    const [lowered, here, raised] = tables
    const again = skylineCrossings(shifted(2e-3), sighting)
    let compared = 0
    for (let declination = -12; declination < 14; declination += 0.37) {
      const azimuth = ({ crossing }: typeof here, at: number) => {
        const got = crossing(at)
        return got.kind === 'crossing' ? got.azimuthDeg : Number.NaN
      }
      const got = here.crossing(declination)
      if (got.kind !== 'crossing') continue
      const spread = [azimuth(here, declination - 5e-3), azimuth(here, declination + 5e-3)]
      // Over a jump, or a corner, two tangents that differ, there is nothing to compare.
      const [left, right] = [got.azimuthDeg - spread[0], spread[1] - got.azimuthDeg]
      if (!(Math.abs(left - right) < 0.05 * Math.abs(left + right) + 1e-6)) continue
      compared++
      const name = `declination ${declination}`
      const allowed = 0.05 * Math.abs(got.perDeclination) + 1e-3
      expectWithin(got.perDeclination, (left + right) / 1e-2, allowed, 'degrees per degree', name)
      const byAltitude = (azimuth(raised, declination) - azimuth(lowered, declination)) / 4e-3
      // The arcs are straight pieces of a few minutes of arc each, between which the tangent turns by some per cent.
      const raisedTurn = perAltitude(got, declination, rest.latitudeDeg)
      expectWithin(raisedTurn, byAltitude, allowed + 0.05 * Math.abs(raisedTurn), 'degrees per degree', name)
      expectWithin(azimuth(again, declination), azimuth(raised, declination), 1e-9, 'degrees', name)
    }
    expect(compared).toBeGreaterThan(15)
  })
})

describe('where the profile does not decide', () => {
  const sighting = { latitudeDeg: 51, at: 'rising', aboveCentreArcmin: 16, parallaxArcsec: SUN } as const
  const table = (skyline: TrueSkyline, more: object = {}) =>
    skylineCrossings(skyline, { ...sighting, ...more })

  test('a body that rises to the left of it, or to the right, is outside', () => {
    const { crossing } = table(plain([80, 1], [100, 1]))
    const edge = (azimuth: number) => declinationDeg(azimuth, centreAltitudeDeg(1, 0, 16, SUN), 51)
    // To within a disc of each end.
    for (const declination of [edge(80.27) + 0.03, edge(99.73) - 0.03])
      expect(crossing(declination)).toEqual({ kind: 'outside profile' })
    for (const declination of [edge(80.27) - 0.03, 0, edge(99.73) + 0.03])
      expect(crossing(declination).kind).toBe('crossing')
  })

  // It rises at 79°, comes in above the low left end, goes behind the peak and comes out again: that is no rising.
  test('a body that was up before it came to the profile is outside, though it comes out from behind a peak', () => {
    const declination = declinationDeg(79, 0, 51)
    const fromPeakOn = plain([91.9, 14], [92, 14], [94, 0], [110, 0])
    expect(table(fromPeakOn).crossing(declination).kind).toBe('crossing')
    const whole = plain([82, 0], [91, 0], [91.9, 14], [92, 14], [94, 0], [110, 0])
    expect(table(whole).crossing(declination)).toEqual({ kind: 'outside profile' })
  })

  test('setting, the same in the mirror', () => {
    const rises = table(plain([60, 1], [90, 3], [120, 2]))
    const sets = table(plain([240, 2], [270, 3], [300, 1]), { at: 'setting' })
    for (const declination of [-10, 0, 8]) {
      const [rising, setting] = [rises, sets].map(({ crossing }) => crossing(declination) as Found)
      expectWithin((rising.azimuthDeg + setting.azimuthDeg - 360) * 3600, 0, 0.1, 'arcsec')
      expectWithin(rising.perDeclination + setting.perDeclination, 0, 1e-3, 'degrees per degree')
    }
  })

  test('the southern hemisphere is the northern one turned over', () => {
    const north = table(plain([60, 1], [90, 3], [95, 1.5], [120, 2]))
    const south = table(plain([60, 2], [85, 1.5], [90, 3], [120, 1]), { latitudeDeg: -51 })
    for (const declination of [-10, 0, 8]) {
      const [above, below] = [north.crossing(declination) as Found, south.crossing(-declination) as Found]
      expectWithin((above.azimuthDeg + below.azimuthDeg - 180) * 3600, 0, 0.1, 'arcsec')
    }
  })

  test('a body that never comes down to it, or up to it, never rises', () => {
    const { crossing } = table(plain([340, 1], [370, 2]))
    expect(crossing(60)).toEqual({ kind: 'never' })
    expect(crossing(-60)).toEqual({ kind: 'never' })
  })

  test('through north a rising body leaves the pole side clockwise, a setting one comes to it', () => {
    const skyline = plain([345, 2], [375, 2])
    const declination = declinationDeg(8, centreAltitudeDeg(2, 0, 16, SUN), 51)
    expectWithin((table(skyline).crossing(declination) as Found).azimuthDeg, 8, 1 / 3600, 'degrees')
    const sets = table(skyline, { at: 'setting' }).crossing(declination) as Found
    expectWithin(sets.azimuthDeg, 352, 1 / 3600, 'degrees')
  })

  test('behind the azimuth of lower culmination a rising is not taken from the end of the day', () => {
    // Off to the right below the skyline at 10°; what comes out at 352° may have risen anywhere since.
    const skyline = plain([350, 6], [351.5, 6], [352.5, 0.1], [353.5, 6], [375, 6])
    const declination = declinationDeg(352.5, 2, 51)
    expect(table(skyline).crossing(declination)).toEqual({ kind: 'outside profile' })
    const south = plain([165, 6], [186.5, 6], [187.5, 0.1], [188.5, 6], [190, 6])
    expect(table(south, { latitudeDeg: -51 }).crossing(-declination)).toEqual({ kind: 'outside profile' })
  })
})

describe('on a skyline that goes round', () => {
  const node = (azimuthDeg: number, altitudeDeg: number) => ({ azimuthDeg, altitudeDeg, sdDeg: 0 })
  const round = (start: number) =>
    trueSkyline(
      skylineOf(Array.from({ length: 13 }, (_, i) => node(wrap360(start + 30 * i), 1.5))),
      refraction,
    )
  const sighting = { latitudeDeg: 51, aboveCentreArcmin: 16, parallaxArcsec: SUN }

  // The seam lies in the north, in the east, and just where the body rises.
  test.each([0, 90, 64.2, 64.5, 200])('beginning at %s°, it is the level horizon’s', (start) => {
    const centre = centreAltitudeDeg(1.5, refraction(1.5), 16, SUN)
    for (const at of ['rising', 'setting'] as const) {
      const { crossing } = skylineCrossings(round(start), { ...sighting, at })
      for (const declination of [-23, 0, 17, 37]) {
        const want = horizonCrossing(declination, centre, 51, at)!
        const got = crossing(declination) as Found
        expect(got.kind).toBe('crossing')
        expectWithin(wrap180(got.azimuthDeg - want.azimuthDeg) * 3600, 0, 1, 'arcsec', declination)
      }
      expect(crossing(50)).toEqual({ kind: 'never' })
      expect(crossing(-50)).toEqual({ kind: 'never' })
    }
  })

  // At 40° N a star of 52° passes 2° above north, within a notch there; it goes behind the ridge and rises over it.
  test('what shines through a notch at lower culmination rises afterwards', () => {
    const ridge = skylineOf([
      node(10, 6),
      node(120, 6),
      node(240, 6),
      node(350, 6),
      node(359, 0),
      node(1, 0),
      node(10, 6),
    ])
    for (const at of ['rising', 'setting'] as const) {
      const { crossing } = skylineCrossings(
        trueSkyline(ridge, () => 0),
        { ...sighting, latitudeDeg: 40, at },
      )
      const want = horizonCrossing(52, centreAltitudeDeg(6, 0, 16, SUN), 40, at)!
      expectWithin(((crossing(52) as Found).azimuthDeg - want.azimuthDeg) * 3600, 0, 1, 'arcsec', at)
    }
  })
})

describe('what is impossible', () => {
  const flat = plain([80, 1], [100, 1])
  const sighting = { latitudeDeg: 51, at: 'rising', aboveCentreArcmin: 16, parallaxArcsec: SUN } as const
  test.each([
    ['latitude', { latitudeDeg: 91 }, '−90° to 90°, got 91'],
    ['disc', { aboveCentreArcmin: Number.NaN }, 'got NaN′'],
    ['parallax', { parallaxArcsec: -1 }, 'got -1″'],
    ['shift', { skylineShiftDeg: Number.POSITIVE_INFINITY }, 'got Infinity°'],
  ])('%s', (_, more, message) => {
    expect(() => skylineCrossings(flat, { ...sighting, ...more })).toThrow(message)
  })

  test('a declination, and a skyline narrower than the disc', () => {
    expect(() => skylineCrossings(flat, sighting).crossing(Number.NaN)).toThrow('got NaN')
    expect(() => skylineCrossings(plain([80, 1], [80.4, 1]), sighting)).toThrow('no wider than the disc')
  })
})
