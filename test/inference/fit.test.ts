import { describe, expect, test } from 'vitest'
import { targetAzimuthDeg } from '../../src/inference/comparison.ts'
import { deviation } from '../../src/inference/fit.ts'
import { expectWithin } from '../published/expect-within.ts'
import { artificialSight } from './sights.ts'

const sight = (azimuthDeg: number, azimuthSdDeg = 0.1) =>
  artificialSight((year) => 60 + year / 1000, { azimuthDeg, azimuthSdDeg })

describe('deviation', () => {
  test('is the distance of the nearest year of the stretch in standard deviations', () => {
    // The track passes 60.5° to 60.7° in the years 500 to 700; the line is 0.2° beyond, or short of it.
    expectWithin(deviation(sight(60.9), { from: 500, to: 700 }), 2, 1e-9, 'standard deviations')
    expectWithin(deviation(sight(60.3), { from: 500, to: 700 }), 2, 1e-9, 'standard deviations')
    expectWithin(deviation(sight(60.9), { from: 700, to: 700 }), 2, 1e-9, 'standard deviations')
  })

  test('is nothing where the target crosses the line inside the stretch', () => {
    expect(deviation(sight(60.6037), { from: 500, to: 700 })).toBe(0)
    expect(deviation(sight(60.5), { from: 500, to: 700 })).toBeLessThan(1e-9)
  })

  test('is infinite where the target is never to be seen', () => {
    const unseen = { ...sight(60), altitudeDeg: () => 80 }
    expect(deviation(unseen, { from: 500, to: 700 })).toBe(Infinity)
  })

  test('of a line without any error is nothing on the target, infinite beside it', () => {
    expect(
      deviation(
        artificialSight(() => 60, { azimuthDeg: 61 }),
        { from: 0, to: 0 },
      ),
    ).toBe(Infinity)
    const on = artificialSight(() => 60)
    const exact = { ...on, azimuthDeg: targetAzimuthDeg(on, 0)! }
    expect(deviation(exact, { from: 0, to: 0 })).toBe(0)
    const soonGone = { ...exact, altitudeDeg: (year: number) => (year > 0 ? 80 : 0) }
    expect(deviation(soonGone, { from: 0, to: 100 })).toBe(0)
  })

  test('does not take the way past the back of the line for a crossing', () => {
    const turning = artificialSight((year) => 100 + (75 * year) / 1000, { azimuthDeg: 350, azimuthSdDeg: 1 })
    expect(deviation(turning, { from: 0, to: 1000 })).toBeGreaterThan(100)
  })
})
