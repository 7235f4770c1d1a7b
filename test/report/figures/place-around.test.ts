import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { sharedArea } from '../../../src/report/figures/box.ts'
import { placeAround } from '../../../src/report/figures/place-around.ts'

fc.configureGlobal({ seed: 1977 })

const BOUNDS = { left: 0, right: 300, top: 0, bottom: 160 }
const point = fc.record({
  x: fc.double({ min: 0, max: 300, noNaN: true }),
  y: fc.double({ min: 0, max: 160, noNaN: true }),
  width: fc.double({ min: 10, max: 90, noNaN: true }),
  height: fc.constant(8.5),
})

describe('placeAround', () => {
  it('puts a lone label above and to the right of its point', () => {
    const [box] = placeAround([{ x: 100, y: 80, width: 40, height: 8 }], BOUNDS, [], [])
    expect(box).toEqual({ left: 105, right: 145, top: 67, bottom: 75 })
  })

  it('keeps off an obstacle where a place nearby is free', () => {
    const obstacle = { left: 100, right: 300, top: 0, bottom: 80, weight: 3 }
    const [box] = placeAround([{ x: 100, y: 80, width: 40, height: 8 }], BOUNDS, [], [obstacle])
    expect(sharedArea(box!, obstacle)).toBe(0)
  })

  it('never puts a label on another or on what is taken', () => {
    fc.assert(
      fc.property(fc.array(point, { maxLength: 8 }), (points) => {
        const taken = [{ left: 2, right: 70, top: 150, bottom: 158 }]
        const boxes = [...taken, ...placeAround(points, BOUNDS, taken, [])]
        boxes.forEach((a, i) => {
          for (const b of boxes.slice(i + 1)) expect(sharedArea(a, b)).toBe(0)
        })
      }),
    )
  })
})
