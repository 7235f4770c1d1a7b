import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type Column, regionPath } from '../../../src/report/figures/region-path.ts'
import type { Span } from '../../../src/report/figures/region-slabs.ts'
import { isInside, polygonsOf } from './read-drawing.ts'

fc.configureGlobal({ seed: 1977 })

/** Up to four separate spans between 0 and 100. */
const spans = fc
  .uniqueArray(fc.integer({ min: 0, max: 50 }), { maxLength: 8 })
  .map((ends) => [...ends].sort((a, b) => a - b).map((end) => end * 2))
  .map((ends) =>
    Array.from({ length: Math.floor(ends.length / 2) }, (_, i): Span => [ends[2 * i]!, ends[2 * i + 1]!]),
  )
const columns = fc
  .array(spans, { minLength: 2, maxLength: 6 })
  .map((list) => list.map((each, index): Column => ({ x: index * 10, spans: each })))

describe('regionPath', () => {
  it('joins one span to one by a slab', () => {
    expect(
      regionPath(
        [
          { x: 0, spans: [[10, 20]] },
          { x: 5, spans: [[8, 24]] },
        ],
        0,
      ),
    ).toBe('M0,10L5,8L5,24L0,20Z')
  })

  it('closes a gap in a point at its middle where two spans become one', () => {
    const d = regionPath(
      [
        {
          x: 0,
          spans: [
            [0, 10],
            [20, 30],
          ],
        },
        { x: 5, spans: [[0, 30]] },
      ],
      0,
    )
    const polygons = polygonsOf(d)
    expect(polygons).toContainEqual([
      [0, 0],
      [5, 0],
      [5, 15],
      [0, 10],
    ])
    expect(polygons).toContainEqual([
      [0, 20],
      [5, 15],
      [5, 30],
      [0, 30],
    ])
  })

  it('ends a span without a counterpart in a point', () => {
    const d = regionPath(
      [
        {
          x: 0,
          spans: [
            [0, 10],
            [40, 50],
          ],
        },
        { x: 5, spans: [[0, 10]] },
      ],
      0,
    )
    expect(polygonsOf(d)).toContainEqual([
      [0, 40],
      [5, 45],
      [5, 45],
      [0, 50],
    ])
  })

  it('draws the thinnest span as thick as asked', () => {
    expect(
      regionPath(
        [
          { x: 0, spans: [[10, 10]] },
          { x: 5, spans: [[10, 10]] },
        ],
        2,
      ),
    ).toBe('M0,9L5,9L5,11L0,11Z')
  })

  it('is empty where there is nothing to draw', () => {
    expect(regionPath([], 1)).toBe('')
    expect(
      regionPath(
        [
          { x: 0, spans: [] },
          { x: 5, spans: [] },
        ],
        1,
      ),
    ).toBe('')
  })

  it('covers just the spans beside every column', () => {
    fc.assert(
      fc.property(columns, fc.integer({ min: 0, max: 99 }), (list, at) => {
        const polygons = polygonsOf(regionPath(list, 0))
        // Ends of spans are even and middles whole, so halves are 0.5 off; edges move at most 100 in a column's 10.
        const y = at + 0.5
        list.forEach((column, index) => {
          const isInSpan = column.spans.some(([from, to]) => from < y && y < to)
          const sides = [index > 0 ? -0.03 : 0.03, index < list.length - 1 ? 0.03 : -0.03]
          for (const side of sides) expect(isInside(polygons, column.x + side, y)).toBe(isInSpan)
        })
      }),
    )
  })
})
