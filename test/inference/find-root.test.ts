import { describe, expect, test } from 'vitest'
import { findRoot } from '../../src/inference/find-root.ts'
import { expectWithin } from '../published/expect-within.ts'

describe('findRoot', () => {
  test('finds √2, whichever way the function runs', () => {
    expectWithin(
      findRoot((x) => x * x - 2, 0, 2, 1e-10),
      Math.SQRT2,
      1e-10,
      'units',
    )
    expectWithin(
      findRoot((x) => 2 - x * x, 0, 2, 1e-10),
      Math.SQRT2,
      1e-10,
      'units',
    )
  })

  test('finds a zero at either end', () => {
    expectWithin(
      findRoot((x) => x - 1, 0, 1, 1e-6),
      1,
      1e-6,
      'units',
    )
    expectWithin(
      findRoot((x) => x, 0, 1, 1e-6),
      0,
      1e-6,
      'units',
    )
  })

  test('finds the place of a jump', () => {
    expectWithin(
      findRoot((x) => (x < 0.3 ? -5 : 7), 0, 1, 1e-6),
      0.3,
      1e-6,
      'units',
    )
  })

  test('stops at the tolerance it was given', () => {
    let calls = 0
    findRoot(
      (x) => {
        calls++
        return x - 0.3
      },
      0,
      1,
      0.01,
    )
    // Seven halvings bring 1 below 0.01, after a look at one end or at both.
    expect(calls).toBeGreaterThanOrEqual(8)
    expect(calls).toBeLessThanOrEqual(9)
  })
})
