import { describe, test } from 'vitest'
import { bennettRefractionArcmin } from '../../src/site/bennett.ts'
import { expectWithin } from '../published/expect-within.ts'
import { readTable } from '../published/read-table.ts'

describe("Bennett's formula", () => {
  test.each(readTable('refraction.csv'))(
    'at $apparent_altitude_deg°, $temperature_C °C and $pressure_hPa hPa gives $bennett_arcmin′',
    ({ apparent_altitude_deg, temperature_C, pressure_hPa, bennett_arcmin }) => {
      const got = bennettRefractionArcmin(apparent_altitude_deg!, temperature_C!, pressure_hPa!)
      expectWithin(got, bennett_arcmin!, 0.0006, 'arcmin')
    },
  )

  // Bennett 1982, Journal of Navigation 35, 255: 34.5′ at the horizon for 1010 hPa and 10 °C.
  test('gives 34.5′ at the horizon', () => {
    expectWithin(bennettRefractionArcmin(0, 10, 1010), 34.5, 0.05, 'arcmin')
  })
})
