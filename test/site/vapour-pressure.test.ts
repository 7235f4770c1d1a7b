import { describe, expect, test } from 'vitest'
import { saturatedVapourPressureHpa, vapourPressureHpa } from '../../src/site/vapour-pressure.ts'
import { expectWithin } from '../published/expect-within.ts'

describe('saturatedVapourPressureHpa', () => {
  // Over pure water, 0 °C and up: CRC Handbook of Chemistry and Physics; below, over supercooled water: Goff & Gratch,
  // Smithsonian Meteorological Tables (both from memory). Gill's short formula parts from them by up to 0.15 %.
  test.each([
    [-20, 1.254],
    [-10, 2.8627],
    [0, 6.1129],
    [10, 12.281],
    [20, 23.388],
    [30, 42.455],
    [40, 73.814],
  ])('at %s °C is the handbook’s %s hPa', (temperature, handbook) => {
    expectWithin(saturatedVapourPressureHpa(temperature, 0) / handbook, 1, 0.0015, 'of it')
  })

  // Buck 1981, J. Appl. Meteorol. 20, 1527 (from memory): 1.0007 + 3.46e−6 P.
  test.each([700, 1013.25])('in air of %s hPa is higher by as much as handbooks say', (pressure) => {
    const factor = saturatedVapourPressureHpa(15, pressure) / saturatedVapourPressureHpa(15, 0)
    // At 700 hPa the 1.0007 of a fit to sea level is the larger part of the 0.0008 between them.
    expectWithin(factor, 1.0007 + 3.46e-6 * pressure, 0.001, 'of the pressure')
  })
})

describe('vapourPressureHpa', () => {
  const air = { temperatureC: 20, pressureHpa: 1013.25, lapseKPerKm: 6.5, heightM: 0 }

  test('is nothing in dry air and saturated at 1', () => {
    expect(vapourPressureHpa({ ...air, humidity: 0 })).toBe(0)
    const saturated = saturatedVapourPressureHpa(20, 1013.25)
    expectWithin(vapourPressureHpa({ ...air, humidity: 1 }), saturated, 1e-12, 'hPa')
  })

  // Relative humidity as a ratio of masses of vapour to air: f = (e/(P − e))/(s/(P − s)).
  test('has the humidity it is given, by mass', () => {
    const saturated = saturatedVapourPressureHpa(20, 1013.25)
    const vapour = vapourPressureHpa({ ...air, humidity: 0.4 })
    const ratio = vapour / (1013.25 - vapour) / (saturated / (1013.25 - saturated))
    // e = f s/(1 − (1 − f) s/P) is that ratio exactly.
    expectWithin(ratio, 0.4, 1e-12, 'of it')
  })
})
