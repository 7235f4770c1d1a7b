import { describe, expect, test } from 'vitest'
import { lineDirection } from '../../src/site/line-direction.ts'
import { lineTurnDeg, type SightedPart } from '../../src/site/sighted-part.ts'
import { expectWithin } from '../published/expect-within.ts'

const part = (widthM: number, which: SightedPart['part']): SightedPart => ({ widthM, part: which })

describe('lineTurnDeg', () => {
  // A metre at 57.29578 m is 1°, less a third of its square: 0.9999° by atan.
  test('to the right edge of a thing 2 m wide at 57.29578 m is a degree clockwise', () => {
    const got = lineTurnDeg(57.29578, { from: part(3, 'middle'), to: part(2, 'right') })
    expectWithin(got, 1 - 1 / 57.29578 ** 2 / 3, 1e-7, 'degrees')
  })

  const PARTS = ['left', 'middle', 'right'] as const

  // Second route: the edges set out on a plane, where one who looks north has right to the east.
  test.each(PARTS.flatMap((from) => PARTS.map((to) => [from, to] as const)))(
    'from %s to %s is the turn of the line between those points of a plane',
    (from, to) => {
      const east = { left: -1, middle: 0, right: 1 }
      const eye = { eastM: 0.7 * east[from], northM: 0, sdM: 0 }
      const far = { eastM: 4 * east[to], northM: 30, sdM: 0 }
      const got = lineTurnDeg(30, { from: part(1.4, from), to: part(8, to) })
      const { azimuthDeg } = lineDirection(eye, far)
      expectWithin((got + 360) % 360, azimuthDeg, 1e-12, 'degrees')
    },
  )

  test('refuses a distance of nothing and a width below zero', () => {
    const parts = { from: part(1, 'left'), to: part(-1, 'right') }
    expect(() => lineTurnDeg(0, parts)).toThrow(
      new RangeError('the distance is 0 m; write metres above zero'),
    )
    expect(() => lineTurnDeg(10, parts)).toThrow(
      new RangeError('the width is -1 m; write metres, zero or more'),
    )
  })
})
