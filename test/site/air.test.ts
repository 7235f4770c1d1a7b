import { describe, test } from 'vitest'
import { standardPressureHpa, standardTemperatureC } from '../../src/site/air.ts'
import { expectWithin } from '../published/expect-within.ts'

describe('the standard atmosphere', () => {
  // ISO 2533:1975, table 1 (from memory): pressure to 0.01 hPa, temperature exact.
  test.each([
    [-500, 1074.78, 18.25],
    [0, 1013.25, 15],
    [1000, 898.75, 8.5],
    [2000, 794.95, 2],
    [5000, 540.2, -17.5],
    [9000, 307.42, -43.5],
  ])('at %s m has %s hPa and %s °C', (height, pressure, temperature) => {
    // ISO tabulates by geopotential height; the formula's printed constants carry six figures, 0.03 hPa at 9,000 m.
    expectWithin(standardPressureHpa(height), pressure, 0.03, 'hPa')
    expectWithin(standardTemperatureC(height), temperature, 1e-12, '°C')
  })

  // Method notes of this project, section 5, where the formula as printed gives 683.44 hPa; 0.1 hPa is 0.003′ of
  // refraction on the horizon.
  test('at 3,200 m has 683.5 hPa', () => {
    expectWithin(standardPressureHpa(3200), 683.5, 0.1, 'hPa')
  })
})
