import { describe, expect, test } from 'vitest'
import type { Curved, Straight } from '../../src/inference/comparison.ts'
import { lnWeight } from '../../src/inference/weight.ts'
import { expectWithin } from '../published/expect-within.ts'

const straight = (offsetDeg: number, sd: number, north = 0, obliquity = 0): Straight => ({
  kind: 'straight',
  offsetDeg,
  variance: sd * sd,
  shared: [north, obliquity],
})

/** The weight of one line in the method notes of this project, section 8: (1/s) exp(−d²/2s²). */
const lnOfOne = (d: number, s: number) => -Math.log(s) - d ** 2 / (2 * s ** 2)

describe('the weight of one line', () => {
  test.each([
    [0, 0.1, 0],
    [0.3, 0.1, 0],
    [-0.3, 0.1, 0.5],
    [12, 0.05, 0.01],
  ])('off by %s° with s = %s° and τ = %s° is (1/s) exp(−d²/2s²)', (d, sd, tolerance) => {
    const want = lnOfOne(d, Math.hypot(sd, tolerance))
    expectWithin(lnWeight([straight(d, sd)], tolerance), want, 1e-9 * Math.max(1, -want), 'nepers')
  })

  test('takes the errors it could share with others into its own', () => {
    const want = lnOfOne(0.2, Math.hypot(0.1, 0.3, 0.05, 0.2))
    expectWithin(lnWeight([straight(0.2, 0.1, 0.3, -0.05)], 0.2), want, 1e-12, 'nepers')
  })

  test('is nothing where there is no target', () => {
    expect(lnWeight([null], 0.5)).toBe(-Infinity)
    expect(lnWeight([straight(0, 0.1), null], 0.5)).toBe(-Infinity)
  })
})

describe('the weight of several lines', () => {
  test('is the product of their weights where nothing is shared', () => {
    const lines = [straight(0.2, 0.1), straight(-0.1, 0.3), straight(0.05, 0.02)]
    const want = lines.reduce((sum, line) => sum + lnWeight([line], 0.1), 0)
    expectWithin(lnWeight(lines, 0.1), want, 1e-12, 'nepers')
  })

  /**
   * The product of the single weights, averaged over the two shared errors: every line is off by north and by
   * obliquity at once. Trapezoids over ±8 standard deviations.
   */
  function averaged(lines: readonly Straight[], tolerance: number): number {
    const steps = 400
    let sum = 0
    let mass = 0
    for (let i = -steps; i <= steps; i++) {
      for (let j = -steps; j <= steps; j++) {
        const [north, obliquity] = [(8 * i) / steps, (8 * j) / steps]
        const probability = Math.exp(-(north ** 2 + obliquity ** 2) / 2)
        const ln = lines.reduce((total, line) => {
          const rest = line.offsetDeg - north * line.shared[0] - obliquity * line.shared[1]
          return total + lnOfOne(rest, Math.hypot(Math.sqrt(line.variance), tolerance))
        }, 0)
        sum += probability * Math.exp(ln)
        mass += probability
      }
    }
    return Math.log(sum / mass)
  }

  test.each([
    { name: 'two with one north', lines: [straight(0.4, 0.1, 0.5), straight(0.45, 0.12, 0.5)], tolerance: 0 },
    {
      name: 'two with one obliquity that turns them opposite ways',
      lines: [straight(0.2, 0.1, 0, 0.3), straight(-0.25, 0.1, 0, -0.28)],
      tolerance: 0.1,
    },
    {
      name: 'three with both, one measured apart from the plan',
      lines: [straight(0.3, 0.1, 0.4, 0.2), straight(0.1, 0.2, 0.4, -0.2), straight(-0.1, 0.15, 0, 0.1)],
      tolerance: 0.05,
    },
  ])('is the average over the errors they share: $name', ({ lines, tolerance }) => {
    expectWithin(lnWeight(lines, tolerance), averaged(lines, tolerance), 1e-6, 'nepers')
  })

  test('of lines that differ as their common error has them differ is above the product', () => {
    const lines = [straight(0.5, 0.1, 0.5), straight(0.5, 0.1, 0.5)]
    const product = 2 * lnWeight([lines[0]!], 0)
    expect(lnWeight(lines, 0)).toBeGreaterThan(product + 0.5)
    expect(lnWeight([straight(0.5, 0.1, 0.5), straight(-0.5, 0.1, 0.5)], 0)).toBeLessThan(product - 5)
  })
})

describe('the weight of a curved comparison', () => {
  const pieces = (fromDeg: number, toDeg: number, n: number): Curved => ({
    kind: 'curved',
    reached: true,
    variance: 0.02,
    pieces: Array.from({ length: n }, (_, i) => ({
      probability: 1 / n,
      fromDeg: fromDeg + ((toDeg - fromDeg) * i) / n,
      toDeg: fromDeg + ((toDeg - fromDeg) * (i + 1)) / n,
    })),
  })

  // Offsets spread evenly from a to b with a normal error of s: the mean of (1/s) exp(−d²/2s²) is
  // √(2π) (Φ(b/s) − Φ(a/s))/(b − a). With s² = 0.02 + 0.02: Φ(2.5) − Φ(−1) = 0.9937903 − 0.1586553 (tables).
  test.each([1, 7, 5000])('spread evenly over %s pieces is the integral in closed form', (n) => {
    const want = (Math.sqrt(2 * Math.PI) * (0.9937903 - 0.1586553)) / 0.7
    const got = Math.exp(lnWeight([pieces(-0.2, 0.5, n)], Math.sqrt(0.02)))
    expectWithin(got / want, 1, 1e-6, 'of the weight', `${n} pieces`)
  })

  test('of pieces without width is the weight of a straight one', () => {
    const got = lnWeight([pieces(0.3, 0.3, 4)], 0.1)
    expectWithin(got, lnOfOne(0.3, Math.hypot(Math.sqrt(0.02), 0.1)), 1e-12, 'nepers')
  })

  test('of one narrow piece on the line keeps its digits', () => {
    const got = lnWeight([pieces(-1e-6, 1e-6, 1)], 0.1)
    expectWithin(got, lnOfOne(0, Math.hypot(Math.sqrt(0.02), 0.1)), 1e-9, 'nepers')
  })

  test('counts beside a straight line as independent of it', () => {
    const curved = pieces(-0.2, 0.5, 7)
    const want = lnWeight([curved], 0.1) + lnWeight([straight(0.1, 0.1, 0.2)], 0.1)
    expectWithin(lnWeight([straight(0.1, 0.1, 0.2), curved], 0.1), want, 1e-12, 'nepers')
    expectWithin(lnWeight([curved, straight(0.1, 0.1, 0.2)], 0.1), want, 1e-12, 'nepers')
  })

  test('goes on falling where its density is beyond the reach of a number', () => {
    const at = (offset: number) => lnWeight([pieces(offset, offset + 0.1, 4)], 0)
    expect(at(20)).toBeGreaterThan(-Infinity)
    for (const offset of [1, 2, 4, 5, 6, 10]) expect(at(offset + 1)).toBeLessThan(at(offset))
  })
})

describe('lines without any error', () => {
  test('have a finite weight, that of one of 0.01″', () => {
    const ln = lnWeight([straight(0, 0)], 0)
    expectWithin(ln, -Math.log(0.01 / 3600), 1e-9, 'nepers')
    expect(lnWeight([straight(0.1, 0)], 0)).toBeLessThan(-1e6)
    expect(lnWeight([straight(0.1, 0)], 0)).toBeGreaterThan(-Infinity)
  })

  test('but those they share have one too, however many there are', () => {
    const lines = [0.1, 0.2, 0.3, 0.4].map((d) => straight(d, 0, 2, 0.1))
    expect(Number.isFinite(lnWeight(lines, 0))).toBe(true)
    expect(lnWeight(lines, 0.1)).toBeGreaterThan(lnWeight(lines, 0))
  })
})
