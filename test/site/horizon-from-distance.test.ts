import { describe, expect, test } from 'vitest'
import { DEG } from '../../src/quantity/degrees.ts'
import { horizonFromDistance } from '../../src/site/horizon-from-distance.ts'
import { MEAN_EARTH_RADIUS_M, TERRESTRIAL_REFRACTION } from '../../src/site/terrestrial-refraction.ts'
import { expectWithin } from '../published/expect-within.ts'

const exact = (distanceM: number, heightDifferenceM: number) => ({
  distanceM,
  distanceSdM: 0,
  heightDifferenceM,
  heightDifferenceSdM: 0,
})

/** Altitude of a point above a circle on which rays are straight, by plane trigonometry; degrees. */
function onCircle(distanceM: number, eyeM: number, topM: number): number {
  const radius = MEAN_EARTH_RADIUS_M / (1 - TERRESTRIAL_REFRACTION.coefficient)
  const angle = distanceM / radius
  const up = (radius + topM) * Math.cos(angle) - (radius + eyeM)
  return Math.atan2(up, (radius + topM) * Math.sin(angle)) / DEG
}

describe('horizonFromDistance', () => {
  // The formula takes the distance along the ground for that at the skyline's height, which is longer by Δh/R′: with
  // R′ = R/(1 − k) that comes to Δh²/(d R′) radians, the tolerance but for some hundredths.
  test.each([
    [1_000, 200, 1.1],
    [10_000, 400, 0.5],
    [30_000, 1_500, 2.15],
    [60_000, 2_000, 1.9],
    [100_000, 3_000, 2.6],
    [100_000, 0, 0.2],
    [100_000, -500, 0.3],
  ])('over %s m and %s m of height is what circles give', (distance, difference, arcsec) => {
    const got = horizonFromDistance(exact(distance, difference)).deg
    expectWithin(got * 3600, onCircle(distance, 0, difference) * 3600, arcsec, 'arcsec')
  })

  // Surveyors' rule of thumb (from memory): the Earth falls away by 7.8 cm at 1 km, 0.068 m of it left by refraction.
  test('lets the Earth fall away by 6.8 m at 10 km', () => {
    const fall = -Math.tan(horizonFromDistance(exact(10_000, 0)).deg * DEG) * 10_000
    expectWithin(fall, 6.83, 0.01, 'metres')
  })

  test('has a standard deviation that small differences show', () => {
    const skyline = { distanceM: 12_000, distanceSdM: 150, heightDifferenceM: 420, heightDifferenceSdM: 6 }
    const at = (distance: number, height: number, coefficient: number) =>
      Math.atan((height - (distance ** 2 * (1 - coefficient)) / (2 * 6_371_000)) / distance) / DEG
    const { coefficient, sd } = TERRESTRIAL_REFRACTION
    const want = Math.hypot(
      (at(12_150, 420, coefficient) - at(11_850, 420, coefficient)) / 2,
      (at(12_000, 426, coefficient) - at(12_000, 414, coefficient)) / 2,
      (at(12_000, 420, coefficient + sd) - at(12_000, 420, coefficient - sd)) / 2,
    )
    // The derivative with distance bends by (150/12,000)² over a standard deviation.
    expectWithin(horizonFromDistance(skyline).sdDeg / want, 1, 2e-4, 'of it')
    expectWithin(horizonFromDistance(skyline).deg, at(12_000, 420, 0.13), 1e-12, 'degrees')
  })

  test('says what is impossible', () => {
    expect(() => horizonFromDistance(exact(0, 10))).toThrow('more than 0 m, got 0')
    expect(() => horizonFromDistance(exact(Number.NaN, 10))).toThrow(RangeError)
    expect(() => horizonFromDistance(exact(1000, Number.NaN))).toThrow('got NaN')
    expect(() => horizonFromDistance({ ...exact(1000, 10), distanceSdM: -1 })).toThrow('0 m or more, got -1')
  })
})
