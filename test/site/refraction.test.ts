import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { DEG } from '../../src/quantity/degrees.ts'
import { type Air, standardPressureHpa, standardTemperatureC } from '../../src/site/air.ts'
import { refractionArcmin } from '../../src/site/refraction.ts'
import { saturatedVapourPressureHpa } from '../../src/site/vapour-pressure.ts'
import { expectWithin } from '../published/expect-within.ts'
import { readTable } from '../published/read-table.ts'
import { traceRay } from './trace-ray.ts'

const dry = (temperatureC: number, pressureHpa: number, heightM = 0): Air => ({
  temperatureC,
  pressureHpa,
  humidity: 0,
  lapseKPerKm: 6.5,
  heightM,
})

describe('refraction by ray tracing', () => {
  test.each(readTable('refraction.csv'))(
    'at $apparent_altitude_deg°, $temperature_C °C and $pressure_hPa hPa is the published $raytrace_arcmin′',
    ({ apparent_altitude_deg, temperature_C, pressure_hPa, height_m, raytrace_arcmin }) => {
      const got = refractionArcmin(apparent_altitude_deg!, dry(temperature_C!, pressure_hPa!, height_m!), 45)
      expectWithin(got, raytrace_arcmin!, 0.05, 'arcmin')
    },
  )

  // Allen, Astrophysical Quantities, 1976, for 10 °C and 1013 hPa; printed to 0.1′.
  test.each([
    [10, 5.3, 0.1],
    [5, 9.9, 0.1],
    // From here down the atmospheres differ: this one gives 18.2′ and 33.9′ (method notes, section 5). On the horizon
    // the model of the air is worth 1.5′.
    [2, 18.4, 0.3],
    [0, 35.4, 1.6],
  ])("at %s° is near a handbook's %s′", (altitude, handbook, tolerance) => {
    expectWithin(refractionArcmin(altitude, dry(10, 1013), 45), handbook, tolerance, 'arcmin')
  })

  test.each([
    [2, 18.2],
    [0, 33.9],
  ])('at %s° is the %s′ of the method notes', (altitude, printed) => {
    expectWithin(refractionArcmin(altitude, dry(10, 1013), 45), printed, 0.05, 'arcmin')
  })

  // Method notes, section 5: 22.9′, not 34′.
  test('at 3,200 m is 22.9′ on the horizon', () => {
    expectWithin(refractionArcmin(0, dry(5, standardPressureHpa(3200), 3200), 45), 22.9, 0.05, 'arcmin')
  })

  // The header of refraction.csv: 0.06′ lower at the equator than at latitude 45°.
  test('at the equator is 0.06′ lower on the horizon than at 45°', () => {
    const difference = refractionArcmin(0, dry(10, 1010), 45) - refractionArcmin(0, dry(10, 1010), 0)
    expectWithin(difference, 0.06, 0.01, 'arcmin')
  })
})

describe('the same ray walked step by step', () => {
  // The walk's step crosses the tropopause somewhere inside, which costs up to 0.001′ near the horizon.
  test.each([
    { name: 'dry, level', altitude: 0, air: dry(10, 1010) },
    { name: 'dry, hot, half a degree up', altitude: 0.5, air: dry(35, 1000) },
    { name: 'cold', altitude: 0, air: dry(-30, 1020) },
    { name: 'from a summit, looking down', altitude: -1.5, air: dry(-5, 600, 4200) },
    { name: 'from a height, steeply down', altitude: -2.5, air: dry(-40, 320, 8800) },
    { name: 'from below the sea', altitude: 0, air: dry(30, 1060, -430) },
    { name: 'humid', altitude: 0, air: { ...dry(30, 1010), humidity: 1 } },
    { name: 'humid, two degrees up', altitude: 2, air: { ...dry(20, 1010), humidity: 0.6 } },
    { name: 'small lapse', altitude: 0, air: { ...dry(10, 1010), lapseKPerKm: 2 } },
    { name: 'large lapse', altitude: 0, air: { ...dry(10, 1010), lapseKPerKm: 9.8 } },
    { name: 'high up', altitude: 30, air: dry(10, 1010) },
  ])('$name', ({ altitude, air }) => {
    expectWithin(refractionArcmin(altitude, air, 40), traceRay(altitude, air, 40), 0.002, 'arcmin')
  })
})

// ERFA's eraRefco (from memory), after Stone 1996 and Green 1985: A tan z + B tan³ z for a flat atmosphere.
describe('a constant of refraction by another program', () => {
  function flat(altitudeDeg: number, { temperatureC: t, pressureHpa: p, humidity }: Air): number {
    const saturated = 10 ** ((0.7859 + 0.03477 * t) / (1 + 0.00412 * t)) * (1 + p * (4.5e-6 + 6e-10 * t * t))
    const vapour = (humidity * saturated) / (1 - ((1 - humidity) * saturated) / p)
    const square = 0.574 ** 2
    const kelvin = t + 273.15
    const perPressure = 77.53484e-6 + (4.39108e-7 + 3.666e-9 / square) / square
    const gamma = (perPressure * p - 11.2684e-6 * vapour) / kelvin
    const beta = 4.4474e-6 * kelvin
    const tan = Math.tan((90 - altitudeDeg) * DEG)
    return ((gamma * (1 - beta) * tan - gamma * (beta - gamma / 2) * tan ** 3) / DEG) * 60
  }

  // Its height of the atmosphere is a fit; at 45° the two part by less than 0.001′.
  test.each([
    [45, dry(10, 1010)],
    [60, dry(-20, 1030)],
    [45, { ...dry(30, 1010), humidity: 1 }],
  ])('agrees at %s°', (altitude, air) => {
    expectWithin(refractionArcmin(altitude, air, 45), flat(altitude, air), 0.001, 'arcmin')
  })

  test('has the same effect of humidity at 45°', () => {
    const effect = (f: (air: Air) => number) => f({ ...dry(30, 1010), humidity: 1 }) - f(dry(30, 1010))
    const want = effect((air) => flat(45, air))
    expectWithin(
      effect((air) => refractionArcmin(45, air, 45)),
      want,
      0.05 * Math.abs(want),
      'arcmin',
    )
  })
})

// Birch & Downs 1994, Metrologia 31, 315 (from memory), for air at 20 °C: σ = 1/λ in 1/µm, f the vapour pressure in Pa.
describe('the refractive index by a national laboratory', () => {
  const square = 1 / 0.574 ** 2
  const humid = { ...dry(20, 1013.25), humidity: 1 }
  /** n − 1 as two degrees from the zenith show it: R = (n − 1)(1 − β) tan z, with β = 0.00125 for the curved Earth. */
  const refractivity = (air: Air) =>
    ((refractionArcmin(88, air, 45) / 60) * DEG) / Math.tan(2 * DEG) / (1 - 0.00125)

  test('is that of dry air', () => {
    const at15 = (8342.54 + 2406147 / (130 - square) + 15998 / (38.9 - square)) * 1e-8
    // Printed for air at 15 °C and 101,325 Pa; the program's constants are some 0.015 % higher.
    expectWithin(refractivity(dry(15, 1013.25)) / at15, 1, 2e-4, 'of it')
  })

  test('is that of humid air, but for the difference of two sources', () => {
    const pascal = 100 * saturatedVapourPressureHpa(20, 1013.25)
    const effect = refractivity(dry(20, 1013.25)) - refractivity(humid)
    const measured = pascal * (3.7345 - 0.0401 * square) * 1e-10
    // Hohenkerk & Sinclair take the 5.5e−8 per torr at 0 °C of the IUGG's resolution of 1963 (from memory), whatever
    // the colour. That is 6.4 % more at 20 °C; the shape of the humid air adds 0.1 % to what the rays show.
    const resolved = ((5.5e-8 * pascal) / 133.322) * (273.15 / 293.15)
    expectWithin(effect / resolved, 1, 0.003, 'of it')
    expectWithin(effect / measured, 1.064, 0.003, 'of it')
    // On the whole index that comes to 0.02 %.
    expectWithin((effect - measured) / refractivity(humid), 0, 2.1e-4, 'of the index')
  })

  test('leaves the horizon within 0.03′', () => {
    const effect = refractionArcmin(0, humid, 45) - refractionArcmin(0, dry(20, 1013.25), 45)
    expectWithin(effect, traceRay(0, humid, 45) - traceRay(0, dry(20, 1013.25), 45), 0.002, 'arcmin')
    // All of the vapour takes 0.37′ off, since it thins out faster than the air; 6.4 % of that is 0.024′.
    expect(effect).toBeLessThan(0)
    expectWithin(0.064 * effect, 0, 0.03, 'arcmin')
  })
})

describe('through the horizon and to the zenith', () => {
  const standard = (heightM: number) =>
    dry(standardTemperatureC(heightM), standardPressureHpa(heightM), heightM)

  test.each([0, 640, 3200, 8000])('from %s m it falls without a break from −5° up', (heightM) => {
    let before = refractionArcmin(-5, standard(heightM), 45)
    for (let i = -99; i <= 100; i++) {
      const here = refractionArcmin(i / 20, standard(heightM), 45)
      expect(here, `${i / 20}°`).toBeLessThan(before)
      // At −5° from sea level a twentieth of a degree changes it by some 7 %; a break would show as more.
      expect(here, `${i / 20}°`).toBeGreaterThan(0.9 * before)
      before = here
    }
  })

  test('has one slope on both sides of the horizontal', () => {
    const at = (altitude: number) => refractionArcmin(altitude, standard(3200), 45)
    expectWithin((at(0) - at(-0.001)) / (at(0.001) - at(0)), 1, 0.002, 'of the slope')
  })

  test('is nothing in the zenith, and a second of arc for each degree beside it', () => {
    expect(refractionArcmin(90, standard(0), 45)).toBe(0)
    // (n − 1) tan z with n − 1 = 2.77e-4 for 15 °C and 1013.25 hPa (handbooks, from memory).
    expectWithin(
      refractionArcmin(89, standard(0), 45),
      (2.77e-4 * Math.tan(DEG) * 60) / DEG,
      0.0002,
      'arcmin',
    )
  })

  test('is a number wherever the pressure is within a tenth of what its height allows', () => {
    const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
    const air = fc
      .record({
        temperatureC: between(-90, 60),
        pressureShare: between(0.9, 1.1),
        humidity: between(0, 1),
        lapseKPerKm: between(1, 12),
        heightM: between(-500, 9000),
      })
      .map(({ pressureShare, ...rest }) => ({
        ...rest,
        pressureHpa: pressureShare * standardPressureHpa(rest.heightM),
      }))
    fc.assert(
      fc.property(between(-5, 90), air, between(-90, 90), (altitude, given, latitude) => {
        const got = refractionArcmin(altitude, given, latitude)
        expect(got).toBeGreaterThanOrEqual(0)
        expect(got).toBeLessThan(600)
      }),
      { seed: 4, numRuns: 300 },
    )
  })
})
