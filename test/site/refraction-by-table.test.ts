import { describe, expect, test } from 'vitest'
import { refractionArcmin } from '../../src/site/refraction.ts'
import { refractionByTable } from '../../src/site/refraction-by-table.ts'
import { expectWithin } from '../published/expect-within.ts'

const air = { temperatureC: 10, pressureHpa: 1010, humidity: 0.5, lapseKPerKm: 6.5, heightM: 0 }

describe('refractionByTable', () => {
  test.each([
    [0, 5, 0.001],
    [5, 80, 0.001],
    // The modelled index goes on at one gradient below −500 m, a kink that no cubic follows.
    [-1.5, 0, 0.03],
  ])('from %s° to %s° is the refraction it was given', (from, to, arcmin) => {
    const direct = (altitude: number) => refractionArcmin(altitude, air, 51)
    const quick = refractionByTable(direct)
    for (let i = 0; i <= 150; i++) {
      const altitude = from + ((to - from) * i) / 150
      expectWithin(quick(altitude), direct(altitude), arcmin, 'arcmin', altitude)
    }
  })

  test('asks seldom, and no lower than skylines go', () => {
    const asked: number[] = []
    const quick = refractionByTable((altitude) => {
      asked.push(altitude)
      return altitude
    })
    for (let i = 0; i <= 1000; i++) expectWithin(quick(-5 + i / 1000), -5 + i / 1000, 1e-12, 'arcmin')
    expect(asked.length).toBeLessThan(15)
    expect(Math.min(...asked)).toBeGreaterThanOrEqual(-5)
  })
})
