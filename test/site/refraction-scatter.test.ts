import { describe, expect, test } from 'vitest'
import { refractionScatterArcmin } from '../../src/site/refraction-scatter.ts'
import { expectWithin } from '../published/expect-within.ts'

describe('refractionScatterArcmin', () => {
  // Schaefer & Liller 1990, PASP 102, 796 (from memory).
  test('on the horizon is 0.16°', () => {
    expectWithin(refractionScatterArcmin(0) / 60, 0.16, 1e-12, 'degrees')
  })

  // Sampson et al. 2003, PASP 115, 1256: 0.184° at risings, 0.108° at settings.
  test('on the horizon lies between the scatter of risings and that of settings seen elsewhere', () => {
    expect(refractionScatterArcmin(0) / 60).toBeGreaterThan(0.108)
    expect(refractionScatterArcmin(0) / 60).toBeLessThan(0.184)
  })

  // Worked by hand from max(0.3′, 9.6′ e^(−h/1°)): e^−1 = 0.36788, e^−2 = 0.13534, and 9.6/0.3 = 32 = e^3.4657.
  test.each([
    [1, 3.5316],
    [2, 1.2992],
    [3.4657, 0.3],
    [10, 0.3],
    [60, 0.3],
  ])('at %s° is %s′', (altitude, scatter) => {
    expectWithin(refractionScatterArcmin(altitude), scatter, 0.0001, 'arcmin')
  })

  test('below the horizon is that on it', () => {
    expect(refractionScatterArcmin(-3)).toBe(refractionScatterArcmin(0))
  })
})
