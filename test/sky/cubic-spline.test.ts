import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { cubicSpline } from '../../src/sky/cubic-spline.ts'
import { expectWithin } from '../published/expect-within.ts'

/** Ascending abscissae, unevenly spaced, with any ordinates. */
const points = fc
  .array(
    fc.tuple(fc.double({ min: 0.1, max: 3, noNaN: true }), fc.double({ min: -5, max: 5, noNaN: true })),
    {
      minLength: 3,
      maxLength: 12,
    },
  )
  .map((steps) => {
    let x = -4
    return steps.map(([step, y]): [number, number] => {
      x += step
      return [x, y]
    })
  })

describe('cubicSpline', () => {
  // Worked by hand: the natural spline through (0,0), (1,1), (2,0) has the curvature −3 at its middle, so that
  // y = 3x/2 − x³/2 on the first half.
  test('of three points is the curve worked by hand', () => {
    const spline = cubicSpline([
      [0, 0],
      [1, 1],
      [2, 0],
    ])
    for (const x of [0.25, 0.5, 0.9]) {
      expectWithin(spline(x), 1.5 * x - x ** 3 / 2, 1e-14, 'units', `left half at ${x}`)
      expectWithin(spline(2 - x), 1.5 * x - x ** 3 / 2, 1e-14, 'units', `right half at ${2 - x}`)
    }
  })

  test('passes through its points and keeps straight lines straight', () => {
    fc.assert(
      fc.property(points, (given) => {
        const spline = cubicSpline(given)
        for (const [x, y] of given) expectWithin(spline(x), y, 1e-11, 'units', `at the point ${x}`)
        const line = cubicSpline(given.map(([x]) => [x, 3 - 2 * x]))
        const middle = (given[0]![0] + given[1]![0]) / 2
        expectWithin(line(middle), 3 - 2 * middle, 1e-11, 'units', `on a line at ${middle}`)
      }),
      { seed: 2 },
    )
  })

  test('is smooth to its second derivative where two pieces meet, and has none at its ends', () => {
    const uneven: [number, number][] = [
      [0, 1],
      [1, 3],
      [2.5, -1],
      [3, 0],
      [5, 2],
    ]
    const spline = cubicSpline(uneven)
    // Second differences over 2h of a cubic piece are exact up to rounding, which 1/h² makes 1e-16/1e-8.
    const h = 1e-4
    const second = (x: number) => (spline(x - h) - 2 * spline(x) + spline(x + h)) / h ** 2
    for (const [x] of uneven.slice(1, -1)) {
      const slopes = [(spline(x) - spline(x - h)) / h, (spline(x + h) - spline(x)) / h]
      // The two one-sided slopes part by the curvature times h.
      expectWithin(slopes[1]!, slopes[0]!, 50 * h, 'units', `slope at ${x}`)
      expectWithin(second(x + h), second(x - h), 300 * h, 'units', `curvature at ${x}`)
    }
    expectWithin(second(h), 0, 300 * h, 'units', 'curvature at the start')
    expectWithin(second(5 - h), 0, 300 * h, 'units', 'curvature at the end')
    expect(Math.abs(second(1))).toBeGreaterThan(1)
  })
})
