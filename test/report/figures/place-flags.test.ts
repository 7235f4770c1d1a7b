import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type Flag, placeFlags, rowCount } from '../../../src/report/figures/place-flags.ts'

fc.configureGlobal({ seed: 1977 })

const flag = fc.record({
  x: fc.double({ min: 50, max: 340, noNaN: true }),
  width: fc.double({ min: 10, max: 120, noNaN: true }),
})

describe('placeFlags', () => {
  it('puts flags with room on one row, right of their poles', () => {
    const placed = placeFlags(
      [
        { x: 60, width: 50 },
        { x: 200, width: 50 },
      ],
      50,
      440,
    )
    expect(placed.map(({ row, side }) => [row, side])).toEqual([
      [0, 'right'],
      [0, 'right'],
    ])
  })

  it('hangs a flag to the left where the right has no room', () => {
    expect(placeFlags([{ x: 400, width: 80 }], 50, 440)[0]).toMatchObject({ side: 'left', row: 0 })
  })

  it('lets no label lie on another, nor on a pole, nor reach beyond the bounds', () => {
    fc.assert(
      fc.property(fc.array(flag, { maxLength: 6 }), (flags) => {
        const placed = placeFlags(flags, 50, 440)
        flags.forEach((a, i) => {
          expect(placed[i]!.left).toBeGreaterThanOrEqual(50)
          expect(placed[i]!.left + a.width).toBeLessThanOrEqual(440)
          flags.forEach((b, j) => {
            if (i !== j) checkPair(flags, placed, i, j, a, b)
          })
        })
        expect(rowCount(placed)).toBeLessThanOrEqual(flags.length)
      }),
    )
  })

  it('gives rows of their own to more flags than it searches', () => {
    const many = Array.from({ length: 14 }, (_, index) => ({ x: 200 + index, width: 90 }))
    expect(new Set(placeFlags(many, 50, 440).map(({ row }) => row)).size).toBe(14)
  })
})

function checkPair(
  flags: readonly Flag[],
  placed: ReturnType<typeof placeFlags>,
  i: number,
  j: number,
  a: Flag,
  b: Flag,
): void {
  const [p, q] = [placed[i]!, placed[j]!]
  const meets = p.left < q.left + b.width && q.left < p.left + a.width
  if (p.row === q.row) expect(meets).toBe(false)
  // Where every label got a row of its own, poles may pass behind labels.
  if (flags.some((_, k) => placed[k]!.side === null)) return
  const isOnPole = p.left < b.x && b.x < p.left + a.width
  if (isOnPole) expect(p.row).toBeGreaterThan(q.row)
}
