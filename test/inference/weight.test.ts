import { describe, expect, test } from 'vitest'
import { type Comparison, type Curved, runOf, type Straight } from '../../src/inference/comparison.ts'
import { lnWeight as lnWeightOf, squaredDeviation } from '../../src/inference/weight.ts'
import { expectWithin } from '../published/expect-within.ts'
import { straightAt } from './sights.ts'

const straight = (offsetDeg: number, sd: number, north = 0, obliquity = 0): Straight => ({
  ...straightAt(offsetDeg, sd * sd),
  shared: [north, obliquity],
})

/** Of lines whose targets have one branch each. */
const lnWeight = (lines: readonly (Comparison | null)[], toleranceDeg: number) =>
  lnWeightOf(
    lines.map((line) => [line]),
    toleranceDeg,
  )

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
  /** Offsets that run straight from one end to the other while the errors run through a stretch of theirs. */
  const pieces = (fromSd: number, toSd: number, fromDeg: number, toDeg: number, n: number): Curved => {
    const cut = (from: number, to: number, i: number) => from + ((to - from) * i) / n
    const runs = Array.from({ length: n }, (_, i) => ({
      fromSd: cut(fromSd, toSd, i),
      toSd: cut(fromSd, toSd, i + 1),
      fromDeg: cut(fromDeg, toDeg, i),
      toDeg: cut(fromDeg, toDeg, i + 1),
    }))
    return {
      kind: 'curved',
      reached: true,
      variance: 0.02,
      measuredVariance: 0.02,
      axis: null,
      toleranceScale: 1,
      northOf: null,
      shared: [0, 0],
      pieces: runs,
      run: runOf(runs),
    }
  }

  /** The mean over the errors of (1/s) exp(−d²/2s²), in small steps; the highest term taken out. */
  function averaged({ pieces: given, variance }: Curved, tolerance: number): number {
    const s = Math.hypot(Math.sqrt(variance), tolerance)
    const steps = 200_000
    const [from, to] = [given[0]!.fromSd, given.at(-1)!.toSd]
    const logs = Array.from({ length: steps }, (_, i) => {
      const z = from + ((to - from) * (i + 0.5)) / steps
      const { fromSd, toSd, fromDeg, toDeg } = given.find((piece) => z <= piece.toSd)!
      const d = fromDeg + ((toDeg - fromDeg) * (z - fromSd)) / (toSd - fromSd)
      return -(z * z) / 2 - (d / s) ** 2 / 2
    })
    const top = logs.reduce((a, b) => Math.max(a, b), -Infinity)
    const sum = logs.reduce((total, ln) => total + Math.exp(ln - top), 0)
    return top + Math.log((sum * (to - from)) / steps / Math.sqrt(2 * Math.PI)) - Math.log(s)
  }

  // Straight all the way it is the straight weight with the error's effect, here 0.1° for one standard deviation.
  test.each([1, 7, 500])('that is straight all the way is a straight one, in %s pieces', (n) => {
    for (const [d, tolerance] of [
      [0.2, 0],
      [-0.7, 0.1],
      [3, 0.02],
    ] as const) {
      const got = lnWeight([pieces(-60, 60, d - 6, d + 6, n)], tolerance)
      const want = lnOfOne(d, Math.hypot(Math.sqrt(0.02), tolerance, 0.1))
      expectWithin(got, want, 2e-6, 'nepers', `${d}° at ${tolerance}°`)
    }
  })

  test('of a bent run is the average over the errors', () => {
    const [low, high] = [pieces(-3, 0.5, 0.4, 0.1, 3), pieces(0.5, 6, 0.1, -4, 5)]
    const bent: Curved = { ...low, pieces: [...low.pieces, ...high.pieces] }
    for (const tolerance of [0, 0.1, 1])
      expectWithin(lnWeight([bent], tolerance), averaged(bent, tolerance), 1e-6, 'nepers', tolerance)
  })

  // Errors of 8 standard deviations and more, or offsets of hundreds, alone take the target to the line.
  test.each([
    { name: 'rare errors', run: pieces(8, 15, 0.3, -0.3, 20) },
    { name: 'a far line', run: pieces(-15, 15, 25, 8, 64) },
    { name: 'both', run: pieces(9, 14, 45, 40, 20) },
  ])('keeps its digits in the far tail: $name', ({ run }) => {
    for (const tolerance of [0, 0.1, 1]) {
      const want = averaged(run, tolerance)
      expectWithin(lnWeight([run], tolerance), want, 1e-3, 'nepers', tolerance)
    }
    expect(averaged(run, 0)).toBeLessThan(-30)
  })

  test('of a direction that no error moves is the weight of a straight one', () => {
    const got = lnWeight([pieces(-40, 40, 0.3, 0.3, 4)], 0.1)
    expectWithin(got, lnOfOne(0.3, Math.hypot(Math.sqrt(0.02), 0.1)), 1e-6, 'nepers')
  })

  test('of a run that errors seldom reach is less by their probability', () => {
    // Φ(−1) = 0.1586553 (tables).
    const got = lnWeight([pieces(1, 40, 0.3, 0.3, 4)], 0.1)
    const want = lnOfOne(0.3, Math.hypot(Math.sqrt(0.02), 0.1)) + Math.log(0.1586553)
    expectWithin(got, want, 1e-6, 'nepers')
  })

  test('of one narrow piece keeps its digits', () => {
    // The normal density at 1 is 0.2419707 (tables).
    const got = lnWeight([pieces(1, 1 + 1e-8, -1e-9, 1e-9, 1)], 0.1)
    const want = lnOfOne(0, Math.hypot(Math.sqrt(0.02), 0.1)) + Math.log(0.2419707e-8)
    expectWithin(got, want, 1e-6, 'nepers')
  })

  test('counts beside a straight line as independent of it', () => {
    const curved = pieces(-15, 15, -0.2, 0.5, 7)
    const want = lnWeight([curved], 0.1) + lnWeight([straight(0.1, 0.1, 0.2)], 0.1)
    expectWithin(lnWeight([straight(0.1, 0.1, 0.2), curved], 0.1), want, 1e-12, 'nepers')
    expectWithin(lnWeight([curved, straight(0.1, 0.1, 0.2)], 0.1), want, 1e-12, 'nepers')
  })

  test('goes on falling where its density is beyond the reach of a number', () => {
    const at = (offset: number) => lnWeight([pieces(-15, 15, offset, offset + 0.1, 4)], 0)
    expect(at(20)).toBeGreaterThan(-Infinity)
    for (const offset of [1, 2, 4, 5, 6, 10]) expect(at(offset + 1)).toBeLessThan(at(offset))
  })
})

describe('the weight of a target of several branches', () => {
  // Method notes of this project, section 8: the mean over the branches of (1/s) exp(−d²/2s²).
  test('is the mean over them', () => {
    const [near, far] = [straight(0.1, 0.1), straight(-0.3, 0.2)]
    for (const tolerance of [0, 0.05, 1]) {
      const s = [Math.hypot(0.1, tolerance), Math.hypot(0.2, tolerance)]
      const want = (Math.exp(lnOfOne(0.1, s[0]!)) + Math.exp(lnOfOne(-0.3, s[1]!))) / 2
      expectWithin(Math.exp(lnWeightOf([[near, far]], tolerance)), want, 1e-12 * want, '', tolerance)
    }
  })

  test('of one that is not to be seen is half of the other’s', () => {
    const want = lnOfOne(0.1, 0.1) - Math.LN2
    expectWithin(lnWeightOf([[straight(0.1, 0.1), null]], 0), want, 1e-12, 'nepers')
    expectWithin(lnWeightOf([[null, straight(0.1, 0.1)]], 0), want, 1e-12, 'nepers')
    expect(lnWeightOf([[null, null]], 0.1)).toBe(-Infinity)
  })

  test('of two alike is that of one', () => {
    const line = straight(0.2, 0.1, 0.3, 0.1)
    expectWithin(lnWeightOf([[line, line]], 0.1), lnWeight([line], 0.1), 1e-12, 'nepers')
  })

  test('keeps its digits where both are far off', () => {
    // The nearer has all the weight: exp(−5000) of 0.1° at 10°, against exp(−5100.5) at 10.1°.
    const got = lnWeightOf([[straight(10, 0.1), straight(10.1, 0.1)]], 0)
    expectWithin(got, lnOfOne(10, 0.1) - Math.LN2, 1e-9, 'nepers')
  })

  test('shares north with the other lines in each of its branches', () => {
    const branches = [straight(0.1, 0.1, 0.3), straight(-0.3, 0.2, 0.3)]
    const others = [straight(0.2, 0.1, 0.3), straight(0.25, 0.1, 0.3)]
    const each = branches.map((branch) => lnWeight([...others, branch], 0.1))
    const want = Math.log((Math.exp(each[0]!) + Math.exp(each[1]!)) / 2)
    const got = lnWeightOf([[others[0]!], branches, [others[1]!]], 0.1)
    expectWithin(got, want, 1e-9, 'nepers')
  })
})

describe('a north that lines share', () => {
  const [a, b] = [straight(0.5, 0.1, 0.4), straight(0.55, 0.1, 0.4)]

  test('is one error in lines of one north, and two in lines of two', () => {
    const together = lnWeight([a, b], 0)
    const apart = lnWeight([a, { ...b, northOf: 'grid' }], 0)
    expectWithin(
      apart,
      lnOfOne(0.5, Math.hypot(0.1, 0.4)) + lnOfOne(0.55, Math.hypot(0.1, 0.4)),
      1e-9,
      'nepers',
    )
    expect(together).toBeGreaterThan(apart + 0.5)
  })

  /** A straight line written as a curved one: offsets that run evenly through its likely errors. */
  const asCurved = (line: Straight, sd: number): Curved => {
    const pieces = [-8, -1, 0.5, 8].flatMap((toSd, i, cuts) => {
      const fromSd = cuts[i - 1]
      if (fromSd === undefined) return []
      return [{ fromSd, toSd, fromDeg: line.offsetDeg + fromSd * sd, toDeg: line.offsetDeg + toSd * sd }]
    })
    return {
      kind: 'curved',
      reached: true,
      variance: line.variance - sd ** 2,
      measuredVariance: line.variance - sd ** 2,
      axis: line.axis,
      toleranceScale: 1,
      northOf: line.northOf,
      shared: [line.shared[0], 0],
      pieces,
      run: runOf(pieces),
    }
  }

  test.each([0, 0.1, 0.5])('is shared with a curved line as with a straight one: τ = %s°', (tolerance) => {
    const curved = asCurved(b, 0.08)
    expectWithin(lnWeight([a, curved], tolerance), lnWeight([a, b], tolerance), 1e-6, 'nepers')
    const twice = lnWeight([asCurved(a, 0.08), curved], tolerance)
    expectWithin(twice, lnWeight([a, b], tolerance), 1e-6, 'nepers')
  })

  test('is shared with a curved line in the squared deviation', () => {
    const want = squaredDeviation([[a], [b]])
    expectWithin(squaredDeviation([[a], [asCurved(b, 0.001)]]), want, 0.02, 'of a squared deviation')
  })

  test('counts in lines on one axis, curved or not', () => {
    const [one, other] = [a, b].map((line) => ({ ...line, axis: 'p\nq', measuredVariance: 0.002 }))
    const curved = { ...asCurved(other!, 0.08), measuredVariance: 0.002 }
    expectWithin(lnWeight([one!, curved], 0.5), lnWeight([one!, other!], 0.5), 1e-6, 'nepers')
  })
})

describe('lines between the same two points', () => {
  /** All of the line's own error is the survey's; or a part of it is the target's, which the other line has not. */
  const onAxis = (offsetDeg: number, surveySd: number, targetSd = 0, axis = 'p\nq'): Straight => ({
    ...straightAt(offsetDeg, surveySd ** 2 + targetSd ** 2),
    measuredVariance: surveySd ** 2,
    axis,
  })
  /** ln of the ratio of the weights of two years, for which constants cancel. */
  const lnRatio = (here: readonly Straight[], there: readonly Straight[], tolerance: number) =>
    lnWeight(here, tolerance) - lnWeight(there, tolerance)

  test('that are alike tell as much as one', () => {
    for (const tolerance of [0, 0.1, 1]) {
      const [near, far] = [onAxis(0.1, 0.05), onAxis(0.4, 0.05)]
      const want = lnRatio([near], [far], tolerance)
      // Their joint error is regular only by the 0.01″ that no line does without: 1e-4 of a standard deviation.
      expectWithin(lnRatio([near, near], [far, far], tolerance), want, 1e-3 * want, 'nepers', tolerance)
    }
  })

  test('on two axes, or between no points, tell twice as much', () => {
    const pairs = [
      [onAxis(0.1, 0.05), onAxis(0.1, 0.05, 0, 'p\nr')],
      [straight(0.1, 0.05), straight(0.1, 0.05)],
    ]
    for (const pair of pairs) {
      const far = pair.map((line) => ({ ...line, offsetDeg: 0.4 }))
      const want = 2 * lnRatio([pair[0]!], [far[0]!], 0.1)
      expectWithin(lnRatio(pair, far, 0.1), want, 1e-9, 'nepers')
    }
  })

  // With the survey and the build error in common and the targets' errors their own, the mean of the two offsets has
  // the variance τ² + s² + t²/2, and their difference 2t².
  test.each([0, 0.1, 1])('share survey and build error, and not their targets’: τ = %s°', (tolerance) => {
    const [survey, target] = [0.05, 0.08]
    const [a, b] = [0.12, 0.21]
    const mean = tolerance ** 2 + survey ** 2 + target ** 2 / 2
    const difference = 2 * target ** 2
    const want =
      -(Math.log(mean) + Math.log(difference) + ((a + b) / 2) ** 2 / mean + (a - b) ** 2 / difference) / 2
    const got = lnWeight([onAxis(a, survey, target), onAxis(b, survey, target)], tolerance)
    expectWithin(got, want, 1e-9, 'nepers')
  })

  test('at a large tolerance tell no more than one, however well their targets are known', () => {
    const pair = (offset: number) => [onAxis(offset, 0.05, 0.02), onAxis(offset + 0.01, 0.05, 0.02)]
    const one = lnRatio([onAxis(0, 0.05, 0.02)], [onAxis(2, 0.05, 0.02)], 2)
    // A hundredth of a degree more or less of 2°.
    expectWithin(lnRatio(pair(0), pair(2), 2), one, 0.01, 'nepers')
  })
})

describe('the squared deviation', () => {
  /** dᵀ Σ⁻¹ d of two lines, by the inverse of a 2 × 2 matrix. */
  function mahalanobis(a: Straight, b: Straight, shared: number): number {
    const of = ({ variance, shared: [north, obliquity] }: Straight) => variance + north ** 2 + obliquity ** 2
    const [aa, bb] = [of(a), of(b)]
    const ab = a.shared[0] * b.shared[0] + a.shared[1] * b.shared[1] + shared
    const squares = bb * a.offsetDeg ** 2 - 2 * ab * a.offsetDeg * b.offsetDeg + aa * b.offsetDeg ** 2
    return squares / (aa * bb - ab ** 2)
  }

  test('of one line is the square of its offset in standard deviations', () => {
    expectWithin(squaredDeviation([[straight(0.3, 0.06, 0.08)]]), 9, 1e-9, '')
    expect(squaredDeviation([[null]])).toBe(Infinity)
    expect(squaredDeviation([[straight(0.3, 0.1)], [null]])).toBe(Infinity)
  })

  test('of two lines is that of Mahalanobis', () => {
    const north = [straight(0.4, 0.1, 0.5), straight(0.45, 0.12, 0.5)] as const
    const opposite = [straight(0.2, 0.1, 0.1, 0.3), straight(-0.25, 0.1, 0, -0.28)] as const
    for (const [a, b] of [north, opposite])
      expectWithin(squaredDeviation([[a], [b]]), mahalanobis(a, b, 0), 1e-9, '')
    const [a, b] = north.map((line) => ({ ...line, axis: 'p\nq', measuredVariance: 0.004 }))
    expectWithin(squaredDeviation([[a!], [b!]]), mahalanobis(a!, b!, 0.004), 1e-9, '')
  })

  test('of several branches is that of the nearest, in its own errors', () => {
    const [wide, narrow] = [straight(0.3, 0.1), straight(0.2, 0.05)]
    expectWithin(squaredDeviation([[narrow, null, wide]]), 9, 1e-9, '')
    expectWithin(squaredDeviation([[narrow, wide], [straight(0.1, 0.05)]]), 13, 1e-9, '')
    expect(squaredDeviation([[null, null]])).toBe(Infinity)
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

describe('an angle between two built lines', () => {
  const line = { ...straight(0.3, 0.1, 0, 0.02), measuredVariance: 0.004 }
  const angle = { ...line, axis: 'a\nb\nc', toleranceScale: Math.SQRT2 }

  test.each([0, 0.1, 0.5, 2])('has √2 times the build tolerance: τ = %s°', (tolerance) => {
    const want = lnOfOne(0.3, Math.hypot(0.1, 0.02, Math.SQRT2 * tolerance))
    expectWithin(lnWeight([angle], tolerance), want, 1e-12, 'nepers')
  })

  test('of three points that are named twice has one build error in both', () => {
    const tolerance = 0.5
    const own = 0.1 ** 2 + 0.02 ** 2 + 2 * tolerance ** 2
    const common = 0.004 + 0.02 ** 2 + 2 * tolerance ** 2
    // Of the normal density of two offsets d, d with variances v and covariance c: det v² − c², square 2d²/(v + c).
    const want = -(Math.log(own ** 2 - common ** 2) + (2 * 0.3 ** 2) / (own + common)) / 2
    expectWithin(lnWeight([angle, angle], tolerance), want, 1e-9, 'nepers')
  })
})
