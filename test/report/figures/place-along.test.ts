import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { placeAlong } from '../../../src/report/figures/place-along.ts'

fc.configureGlobal({ seed: 1977 })

const label = fc.record({
  at: fc.double({ min: -50, max: 250, noNaN: true }),
  size: fc.double({ min: 1, max: 20, noNaN: true }),
})

describe('placeAlong', () => {
  it('leaves labels that do not collide where they are wanted', () => {
    expect(
      placeAlong(
        [
          { at: 20, size: 10 },
          { at: 80, size: 10 },
        ],
        0,
        100,
      ),
    ).toEqual([20, 80])
  })

  it('parts two that collide by as much to either side', () => {
    expect(
      placeAlong(
        [
          { at: 50, size: 10 },
          { at: 50, size: 10 },
        ],
        0,
        100,
      ),
    ).toEqual([45, 55])
  })

  it('keeps labels within the stretch', () => {
    expect(
      placeAlong(
        [
          { at: 0, size: 10 },
          { at: 100, size: 10 },
        ],
        0,
        100,
      ),
    ).toEqual([5, 95])
  })

  it('never lets labels overlap, keeps their order, and keeps within the stretch where there is room', () => {
    fc.assert(
      fc.property(fc.array(label, { maxLength: 9 }), (labels) => {
        const middles = placeAlong(labels, 0, 200)
        const order = labels.map((_, index) => index).sort((a, b) => labels[a]!.at - labels[b]!.at || a - b)
        order.slice(1).forEach((index, rank) => {
          const before = order[rank]!
          const apart = middles[index]! - middles[before]!
          expect(apart).toBeGreaterThanOrEqual((labels[index]!.size + labels[before]!.size) / 2 - 1e-9)
        })
        for (const [index, middle] of middles.entries()) {
          expect(middle - labels[index]!.size / 2).toBeGreaterThanOrEqual(-1e-9)
          expect(middle + labels[index]!.size / 2).toBeLessThanOrEqual(200 + 1e-9)
        }
      }),
    )
  })
})
