import { describe, expect, test } from 'vitest'
import { spanAngle } from '../../src/site/span-angle.ts'
import { expectWithin } from '../published/expect-within.ts'
import { drawPoint, drawSurveys, meanProduct, SAMPLING_ERROR } from './sampled-survey.ts'

const point = (eastM: number, northM: number, sdM = 0) => ({ eastM, northM, sdM })

describe('spanAngle', () => {
  test.each([
    [point(0, 4), point(3, 4), 36.869898],
    [point(3, 4), point(0, 4), 36.869898],
    [point(-1, 5), point(1, 5), 22.619865],
    [point(1, -5), point(-1, -5), 22.619865],
    [point(0, 7), point(0, -2), 180],
  ])('between %o and %o is %s°', (first, second, angle) => {
    // atan ¾, and 2 atan ⅕; tables print them to 1e−6°.
    expectWithin(spanAngle(point(0, 0), first, second).angleDeg, angle, 1e-6, 'degrees')
  })

  // At a right angle with equal arms the vertex's error enters by √2: 1 cm at 57.29578 m is 0.01°.
  test('has the errors of the vertex and of both points', () => {
    const sd = (vertexM: number, firstM: number, secondM: number) =>
      spanAngle(point(0, 0, vertexM), point(0, 57.29578, firstM), point(57.29578, 0, secondM)).sdDeg
    expectWithin(sd(0.01, 0, 0), 0.01 * Math.SQRT2, 1e-9, 'degrees')
    expectWithin(sd(0, 0.03, 0.04), 0.05, 1e-8, 'degrees')
  })

  test.each([
    [point(1, 2, 0.2), point(40, 60, 0.1), point(70, -5, 0.15)],
    [point(0, 0, 0.2), point(0, 50, 0.05), point(20, 90, 0.05)],
    [point(0, 0, 0.2), point(0, 50, 0.05), point(8, -90, 0.05)],
  ])('has the scatter of a survey made again and again', (vertex, first, second) => {
    const { angleDeg, sdDeg } = spanAngle(vertex, first, second)
    const errors = drawSurveys(23, (random) => {
      const found = [vertex, first, second].map((exact) => drawPoint(exact, random))
      return spanAngle(found[0]!, found[1]!, found[2]!).angleDeg - angleDeg
    })
    const ratio = Math.sqrt(meanProduct(errors, errors)) / sdDeg
    expectWithin(ratio, 1, 4 * SAMPLING_ERROR, 'of the deviation')
  })

  test('refuses a point on the vertex', () => {
    expect(() => spanAngle(point(1, 2), point(1, 2), point(5, 5))).toThrow(
      new RangeError('a point lies on the vertex, 1 m east and 2 m north; write three places'),
    )
  })
})
