import * as Astronomy from 'astronomy-engine'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { DEG, wrap180 } from '../../src/quantity/degrees.ts'
import {
  altitudeRangeDeg,
  declinationDeg,
  declinationPerAltitude,
  horizonCrossing,
} from '../../src/site/horizontal.ts'
import { expectWithin } from '../published/expect-within.ts'

const within = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const either = fc.constantFrom('rising' as const, 'setting' as const)
const SEED = { seed: 3 }

describe('declinationDeg and horizonCrossing', () => {
  // Another program's horizontal coordinates, without refraction; its own precision is that of double numbers.
  test.each([
    [51.2, -0.8, 23.4],
    [-33.9, 151.2, -12],
    [5, 30, 40],
    [68, 20, -15],
  ])('agree with another program at latitude %s°', (latitude, longitude, declination) => {
    const observer = new Astronomy.Observer(latitude, longitude, 0)
    let [risings, settings] = [0, 0]
    for (let hour = 0; hour < 24; hour++) {
      const { azimuth, altitude } = Astronomy.Horizon(
        new Date(Date.UTC(2026, 5, 21, hour)),
        observer,
        6,
        declination,
      )
      expectWithin(declinationDeg(azimuth, altitude, latitude), declination, 1e-9, 'degrees', 'declination')
      const at = azimuth < 180 ? 'rising' : 'setting'
      if (at === 'rising') risings++
      else settings++
      const crossing = horizonCrossing(declination, altitude, latitude, at)
      expectWithin(crossing!.azimuthDeg, azimuth, 1e-8, 'degrees', `azimuth at hour ${hour}`)
    }
    expect(Math.min(risings, settings)).toBeGreaterThan(5)
  })

  test('go to and fro', () => {
    fc.assert(
      fc.property(
        within(0.5, 179.5),
        within(-5, 60),
        within(-89, 89),
        either,
        (east, altitude, latitude, at) => {
          const azimuth = at === 'rising' ? east : 360 - east
          const declination = declinationDeg(azimuth, altitude, latitude)
          // Beside the celestial pole an angle comes back from its sine with half of the digits only.
          fc.pre(Math.abs(declination) < 89)
          const crossing = horizonCrossing(declination, altitude, latitude, at)
          // Half a degree from the meridian a hundredth of the digits is lost, and on a high latitude as much again.
          expectWithin(crossing!.azimuthDeg, azimuth, 1e-8, 'degrees')
        },
      ),
      SEED,
    )
  })

  // A sphere has no other rule: at latitude φ on a level horizon cos A = sin δ/cos φ.
  test('at the equator a star rises as far north of east as it stands north of the equator', () => {
    expectWithin(horizonCrossing(23.44, 0, 0, 'rising')!.azimuthDeg, 90 - 23.44, 1e-12, 'degrees')
    expectWithin(horizonCrossing(23.44, 0, 0, 'setting')!.azimuthDeg, 270 + 23.44, 1e-12, 'degrees')
    expectWithin(horizonCrossing(0, 0, 51, 'rising')!.azimuthDeg, 90, 1e-12, 'degrees')
  })

  test('have the derivatives that small differences show', () => {
    const h = 1e-4
    fc.assert(
      fc.property(
        within(-60, 60),
        within(-2, 40),
        within(-70, 70),
        either,
        (declination, altitude, latitude, at) => {
          const azimuth = (d: number, a: number) => horizonCrossing(d, a, latitude, at)?.azimuthDeg
          const crossing = horizonCrossing(declination, altitude, latitude, at)
          // Within 5° of the meridian third differences grow past the tolerance.
          fc.pre(crossing !== null && Math.abs(Math.sin(crossing.azimuthDeg * DEG)) > 0.09)
          const difference = (more: number | undefined, less: number | undefined) => (more! - less!) / (2 * h)
          const byAltitude = difference(
            azimuth(declination, altitude + h),
            azimuth(declination, altitude - h),
          )
          const byDeclination = difference(
            azimuth(declination + h, altitude),
            azimuth(declination - h, altitude),
          )
          expectWithin(crossing!.perAltitude, byAltitude, 1e-5, 'degrees per degree', 'altitude')
          expectWithin(crossing!.perDeclination, byDeclination, 1e-5, 'degrees per degree', 'declination')
        },
      ),
      SEED,
    )
  })

  // Sun at the June solstice in the northern hemisphere: a higher horizon is met later, farther south.
  test('have the signs one sees outdoors', () => {
    const rising = horizonCrossing(23.44, 1, 51, 'rising')!
    expect(rising.perAltitude).toBeGreaterThan(0)
    expect(rising.perDeclination).toBeLessThan(0)
    const setting = horizonCrossing(23.44, 1, 51, 'setting')!
    expect(setting.perAltitude).toBe(-rising.perAltitude)
    expect(setting.perDeclination).toBe(-rising.perDeclination)
    expectWithin(wrap180(setting.azimuthDeg + rising.azimuthDeg), 0, 1e-12, 'degrees')
  })
})

describe('where a body never crosses an altitude', () => {
  test.each([
    ['the midnight Sun', 23.44, 0, 70],
    ['the polar night', -23.44, 0, 70],
    ['a horizon higher than noon', 23.44, 63, 51],
    ['the pole itself', 23.44, 0, 90],
    ['an altitude a hair above the highest', 0, 45.000001, 45],
  ])('%s: there is no crossing', (_, declination, altitude, latitude) => {
    expect(horizonCrossing(declination, altitude, latitude, 'rising')).toBeNull()
    expect(horizonCrossing(declination, altitude, latitude, 'setting')).toBeNull()
  })

  test('is outside the range of altitudes of a day, and only there', () => {
    fc.assert(
      fc.property(within(-89, 89), within(-89, 89), (declination, latitude) => {
        const { low, high } = altitudeRangeDeg(declination, latitude)
        // The altitudes of a day from the hour angle: sin h = sin φ sin δ + cos φ cos δ cos H.
        const altitude = (hourAngle: number) =>
          Math.asin(
            Math.sin(latitude * DEG) * Math.sin(declination * DEG) +
              Math.cos(latitude * DEG) * Math.cos(declination * DEG) * Math.cos(hourAngle * DEG),
          ) / DEG
        // An arc sine near 90° has half of the digits.
        expectWithin(altitude(0), high, 1e-5, 'degrees', 'highest')
        expectWithin(altitude(180), low, 1e-5, 'degrees', 'lowest')
        fc.pre(high - low > 0.01)
        expect(horizonCrossing(declination, (low + high) / 2, latitude, 'rising')).not.toBeNull()
        expect(horizonCrossing(declination, low + 0.001, latitude, 'rising')).not.toBeNull()
        expect(horizonCrossing(declination, high - 0.001, latitude, 'rising')).not.toBeNull()
        if (low - 0.001 > -90)
          expect(horizonCrossing(declination, low - 0.001, latitude, 'rising')).toBeNull()
        if (high + 0.001 < 90)
          expect(horizonCrossing(declination, high + 0.001, latitude, 'rising')).toBeNull()
      }),
      SEED,
    )
  })
})

test.each([
  [51.2, 70, 3],
  [51.2, 250, 12],
  [-35, 10, 40],
  [4, 100, 0.5],
])(
  'at latitude %s°, azimuth %s°, altitude %s°, a little more altitude changes the declination so',
  (latitude, azimuth, altitude) => {
    const at = (turn: number) => declinationDeg(azimuth, altitude + turn, latitude)
    const want = (at(1e-4) - at(-1e-4)) / 2e-4
    expectWithin(declinationPerAltitude(at(0), altitude, latitude), want, 1e-7, 'degrees per degree')
  },
)
