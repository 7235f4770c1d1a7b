import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { hatch } from '../../../src/report/figures/hatch.ts'
import { polygonsOf } from './read-drawing.ts'

fc.configureGlobal({ seed: 1977 })

describe('hatch', () => {
  it('keeps every line within its box, at 45°', () => {
    const length = fc.double({ min: 0.1, max: 60, noNaN: true })
    fc.assert(
      fc.property(length, length, fc.boolean(), (width, height, rising) => {
        for (const [[x1, y1], [x2, y2]] of polygonsOf(
          hatch({ left: 5, right: 5 + width, top: 7, bottom: 7 + height }, 4, rising),
        ) as [number, number][][]) {
          for (const x of [x1, x2]) expect(x! >= 4.99 && x! <= 5.01 + width).toBe(true)
          for (const y of [y1, y2]) expect(y! >= 6.99 && y! <= 7.01 + height).toBe(true)
          expect(Math.abs(x2! - x1! - (rising ? y1! - y2! : y2! - y1!))).toBeLessThan(0.03)
        }
      }),
    )
  })

  it('draws as many lines as the spacing asks for, and none in an empty box', () => {
    expect(polygonsOf(hatch({ left: 0, right: 40, top: 0, bottom: 20 }, 4, true)).length).toBe(15)
    expect(hatch({ left: 0, right: 40, top: 5, bottom: 5 }, 4, true)).toBe('')
  })
})
