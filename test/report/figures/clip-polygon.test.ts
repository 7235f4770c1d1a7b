import { describe, expect, it } from 'vitest'
import { clipPolygon } from '../../../src/report/figures/clip-polygon.ts'

const SQUARE = [
  [0, 0],
  [10, 0],
  [10, 10],
  [0, 10],
] as const

describe('clipPolygon', () => {
  it('leaves alone what lies inside, and nothing of what lies outside', () => {
    expect(new Set(clipPolygon(SQUARE, -1, 11))).toEqual(new Set(SQUARE))
    expect(clipPolygon(SQUARE, 20, 30)).toEqual([])
  })

  it('cuts at both heights', () => {
    const points = clipPolygon(SQUARE, 2, 7)
    expect(points.length).toBe(4)
    expect(points).toEqual(
      expect.arrayContaining([
        [0, 2],
        [10, 2],
        [10, 7],
        [0, 7],
      ]),
    )
  })

  it('cuts a sloping edge where it crosses', () => {
    const triangle = [
      [0, 0],
      [10, 0],
      [0, 20],
    ] as const
    expect(clipPolygon(triangle, -1, 10)).toContainEqual([5, 10])
  })
})
