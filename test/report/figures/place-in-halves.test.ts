import { describe, expect, it } from 'vitest'
import { placeFlags } from '../../../src/report/figures/place-flags.ts'
import { placeInHalves } from '../../../src/report/figures/place-in-halves.ts'

describe('placeInHalves', () => {
  it('does as placeFlags does where that finds a place for all', () => {
    const flags = [100, 110, 300].map((x) => ({ x, width: 90 }))
    expect(placeInHalves(flags, 0, 440)).toEqual(placeFlags(flags, 0, 440))
  })

  it('hangs too many for that search to either side, so that none lies on another or on a pole', () => {
    const flags = Array.from({ length: 12 }, (_, index) => ({ x: 200 + 4 * index, width: 150 }))
    expect(placeFlags(flags, 0, 440).every(({ side }) => side === null)).toBe(true)
    const placed = placeInHalves(flags, 0, 440)
    expect(placed.map(({ side }) => side).every((side) => side !== null)).toBe(true)
    placed.forEach((label, index) => {
      const right = label.left + 150
      expect(label.left).toBeGreaterThanOrEqual(0)
      expect(right).toBeLessThanOrEqual(440)
      flags.forEach(({ x }, other) => {
        if (other === index) return
        // A pole reaches up to its own label's row.
        if (x > label.left && x < right) expect(placed[other]!.row).toBeLessThan(label.row)
        const apart = placed[other]!.left + 150 <= label.left || placed[other]!.left >= right
        expect(apart || placed[other]!.row !== label.row).toBe(true)
      })
    })
  })
})
