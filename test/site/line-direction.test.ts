import { describe, expect, test } from 'vitest'
import { wrap180 } from '../../src/quantity/degrees.ts'
import { lineDirection, type SurveyedPoint } from '../../src/site/line-direction.ts'
import { expectWithin } from '../published/expect-within.ts'
import { DRAWS, drawPoint, drawSurveys, meanProduct, SAMPLING_ERROR } from './sampled-survey.ts'

const point = (eastM: number, northM: number, sdM = 0) => ({ eastM, northM, sdM })

describe('lineDirection', () => {
  test.each([
    [0, 5, 0],
    [5, 5, 45],
    [5, 0, 90],
    [0, -5, 180],
    [-5, 0, 270],
    [-5, 5, 315],
  ])('to %s m east and %s m north is %s°', (east, north, azimuth) => {
    const line = lineDirection(point(100, 200), point(100 + east, 200 + north))
    expectWithin(line.azimuthDeg, azimuth, 1e-12, 'degrees')
    expectWithin(line.lengthM, Math.hypot(east, north), 1e-12, 'metres')
  })

  test('stays below 360° a hair west of north', () => {
    const { azimuthDeg } = lineDirection(point(0, 0), point(-1e-20, 1))
    expect(azimuthDeg).toBeGreaterThanOrEqual(0)
    expect(azimuthDeg).toBeLessThan(360)
  })

  // JCGM 100:2008, section 5: only the part of each error across the line turns it; √(s₁² + s₂²)/D.
  test('has the uncertainty of its ends across the line: 5 cm at 57.3 m is 3′', () => {
    const { sdDeg } = lineDirection(point(0, 0, 0.03), point(0, 57.29578, 0.04))
    expectWithin(sdDeg * 60, 3, 1e-6, 'arcmin')
  })

  test.each([
    [point(3, 4, 0.1), point(40, 61, 0.2)],
    [point(0, 0, 0.05), point(-1, 200, 0.02)],
  ])('has the scatter of a survey made again and again', (from, to) => {
    const { azimuthDeg, sdDeg } = lineDirection(from, to)
    const errors = drawSurveys(11, (random) =>
      wrap180(lineDirection(drawPoint(from, random), drawPoint(to, random)).azimuthDeg - azimuthDeg),
    )
    const ratio = Math.sqrt(meanProduct(errors, errors)) / sdDeg
    expectWithin(ratio, 1, 4 * SAMPLING_ERROR, 'of the deviation')
  })

  // Two lines without a point in common share only the error of north: ρ = s_n²/√((s_n² + s₁²)(s_n² + s₂²)), which is
  // s_n²/(s_n² + s²) where both are alike. A correlation found from N draws is good to (1 − ρ²)/√N.
  test.each([
    [point(0, 0, 0.05), point(0, 100, 0.05), point(30, 0, 0.05), point(130, 0, 0.05), 0.04],
    [point(0, 0, 0.05), point(30, 40, 0.1), point(5, 5, 0.02), point(-80, 60, 0.02), 0.1],
  ])(
    'correlates with another line by the error of their north',
    (from, to, otherFrom, otherTo, northSdDeg) => {
      const [one, other] = [lineDirection(from, to), lineDirection(otherFrom, otherTo)]
      const errors = drawSurveys(12, (random) => {
        const north = northSdDeg * random.normal()
        const error = (start: SurveyedPoint, end: SurveyedPoint, exactDeg: number) =>
          wrap180(
            lineDirection(drawPoint(start, random), drawPoint(end, random)).azimuthDeg + north - exactDeg,
          )
        return [error(from, to, one.azimuthDeg), error(otherFrom, otherTo, other.azimuthDeg)] as const
      })
      const [first, second] = [errors.map(([error]) => error), errors.map(([, error]) => error)]
      const found =
        meanProduct(first, second) / Math.sqrt(meanProduct(first, first) * meanProduct(second, second))
      const want = northSdDeg ** 2 / (Math.hypot(northSdDeg, one.sdDeg) * Math.hypot(northSdDeg, other.sdDeg))
      expectWithin(found, want, (4 * (1 - want ** 2)) / Math.sqrt(DRAWS), 'of correlation')
    },
  )
})
