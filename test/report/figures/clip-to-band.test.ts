import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { clipToBand } from '../../../src/report/figures/clip-to-band.ts'

fc.configureGlobal({ seed: 1977 })

describe('clipToBand', () => {
  it('cuts a line where it leaves the band and where it comes back', () => {
    const line: [number, number][] = [
      [0, 5],
      [1, 15],
      [2, 5],
      [3, -5],
    ]
    expect(clipToBand(line, 0, 10)).toEqual([
      [
        [0, 5],
        [0.5, 10],
      ],
      [
        [1.5, 10],
        [2, 5],
        [2.5, 0],
      ],
    ])
  })

  it('keeps a line that passes through the whole band in one step, and one along its edge', () => {
    expect(
      clipToBand(
        [
          [0, -10],
          [3, 20],
        ],
        0,
        10,
      ),
    ).toEqual([
      [
        [1, 0],
        [2, 10],
      ],
    ])
    const edge: [number, number][] = [
      [0, 10],
      [1, 10],
    ]
    expect(clipToBand(edge, 0, 10)).toEqual([edge])
  })

  it('gives nothing outside, and everything inside as it was', () => {
    const inside: [number, number][] = [
      [0, 1],
      [1, 2],
      [2, 1],
    ]
    expect(clipToBand(inside, 0, 10)).toEqual([inside])
    expect(clipToBand(inside, 3, 10)).toEqual([])
    expect(clipToBand([], 3, 10)).toEqual([])
  })

  it('never leaves the band, and loses none of the points in it', () => {
    const heights = fc.array(fc.double({ min: -50, max: 50, noNaN: true }), { minLength: 2, maxLength: 30 })
    fc.assert(
      fc.property(heights, (ys) => {
        const parts = clipToBand(
          ys.map((y, x): [number, number] => [x, y]),
          -10,
          10,
        )
        const points = parts.flat()
        for (const [, y] of points) expect(Math.abs(y)).toBeLessThanOrEqual(10 + 1e-9)
        for (const [x, y] of ys.map((y, x) => [x, y] as const)) {
          if (Math.abs(y) < 10) expect(points.some(([px, py]) => px === x && py === y)).toBe(true)
        }
      }),
    )
  })
})
