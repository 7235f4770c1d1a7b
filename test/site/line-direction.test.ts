import { describe, expect, test } from 'vitest'
import { wrap180 } from '../../src/quantity/degrees.ts'
import { lineDirection } from '../../src/site/line-direction.ts'
import { seededRandom } from '../inference/seeded-random.ts'
import { expectWithin } from '../published/expect-within.ts'

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

  // 20,000 surveys: the standard deviation found has a sampling error of 1/√(2·20,000) = 0.5 %.
  test.each([
    [point(3, 4, 0.1), point(40, 61, 0.2)],
    [point(0, 0, 0.05), point(-1, 200, 0.02)],
  ])('has the scatter of a survey made again and again', (from, to) => {
    const { azimuthDeg, sdDeg } = lineDirection(from, to)
    const { normal } = seededRandom(11)
    const measured = ({ eastM, northM, sdM }: ReturnType<typeof point>) =>
      point(eastM + sdM * normal(), northM + sdM * normal())
    const errors = Array.from({ length: 20_000 }, () =>
      wrap180(lineDirection(measured(from), measured(to)).azimuthDeg - azimuthDeg),
    )
    expectWithin(Math.hypot(...errors) / Math.sqrt(errors.length) / sdDeg, 1, 4 * 0.005, 'of the deviation')
  })
})
