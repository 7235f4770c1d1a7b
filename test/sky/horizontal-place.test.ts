import { describe, test } from 'vitest'
import { horizontalPlace } from '../../src/sky/horizontal-place.ts'
import { expectWithin } from '../published/expect-within.ts'

describe('the horizontal place of a star', () => {
  // Meeus, Astronomical Algorithms (2nd edition), example 13.b (from memory): Venus from Washington, latitude
  // 38°55′17″, hour angle 64.352133°, declination −6°43′11.61″; azimuth 68.0337° from south, altitude 15.1249°.
  test('is that of Meeus’s worked example', () => {
    const declination = -(6 + 43 / 60 + 11.61 / 3600)
    const latitude = 38 + 55 / 60 + 17 / 3600
    const got = horizontalPlace({ raDeg: 100, decDeg: declination }, 164.352133, latitude)
    expectWithin(got.azimuthDeg + 180, 68.0337, 0.0001, 'degrees')
    expectWithin(got.altitudeDeg, 15.1249, 0.0001, 'degrees')
  })
})
