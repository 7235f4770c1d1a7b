import fc from 'fast-check'
import { describe, test } from 'vitest'
import { DEG, wrap180 } from '../../src/quantity/degrees.ts'
import { stepOnSphere } from '../../src/site/step-on-sphere.ts'
import { expectWithin } from '../published/expect-within.ts'

const within = (min: number, max: number) => fc.double({ min, max, noNaN: true })

function vector(azimuthDeg: number, altitudeDeg: number): [number, number, number] {
  const [a, h] = [azimuthDeg * DEG, altitudeDeg * DEG]
  return [Math.cos(h) * Math.cos(a), Math.cos(h) * Math.sin(a), Math.sin(h)]
}

describe('stepOnSphere', () => {
  // The same point by vectors: p cos r + (zenithward sin-and-cos mix of the two directions across p) sin r.
  test('goes where vectors go', () => {
    fc.assert(
      fc.property(within(0, 360), within(-10, 80), within(0, 360), within(0.01, 2), (a, h, bearing, r) => {
        const { azimuthDeg, altitudeDeg } = stepOnSphere(a, h, bearing, r)
        const p = vector(a, h)
        const up = vector(a, h + 90)
        const along = vector(a + 90, 0)
        const [c, s] = [Math.cos(bearing * DEG), Math.sin(bearing * DEG)]
        const want = p.map((x, i) => x * Math.cos(r * DEG) + (up[i] * c + along[i] * s) * Math.sin(r * DEG))
        vector(azimuthDeg, altitudeDeg).forEach((x, i) => {
          expectWithin(x, want[i], 1e-12, 'of the radius')
        })
      }),
      { seed: 8 },
    )
  })

  test('straight down stays on its azimuth', () => {
    const down = stepOnSphere(350, 12, 180, 0.25)
    expectWithin(wrap180(down.azimuthDeg - 350), 0, 1e-12, 'degrees')
    expectWithin(down.altitudeDeg, 11.75, 1e-12, 'degrees')
  })
})
