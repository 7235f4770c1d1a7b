import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { holds, smallestSet } from '../../src/inference/smallest-set.ts'
import { expectWithin } from '../published/expect-within.ts'

/** A density over years in steps of one, made to hold the whole probability. */
function density(from: number, to: number, height: (year: number) => number) {
  const years = Float64Array.from({ length: to - from + 1 }, (_, i) => from + i)
  const cells = years.map((_, i) => (i === 0 || i === years.length - 1 ? 0.5 : 1))
  const heights = years.map(height)
  const mass = heights.reduce((sum, h, i) => sum + h * cells[i]!, 0)
  return { years, cells, density: heights.map((h) => h / mass) }
}

const bell = (year: number, middle: number, sd: number) =>
  Math.exp(-((year - middle) ** 2) / (2 * sd * sd)) / sd

describe('smallestSet', () => {
  // Two-sided points of the normal distribution: 1.959964 for 95 %, 0.994458 for 68 %. Straight pieces of a hundredth
  // of the standard deviation move an edge by about 1e-5 of it.
  test.each([
    [0.95, 1.959964],
    [0.68, 0.994458],
  ])('of a normal density holding %s reaches %s standard deviations', (share, reach) => {
    const [only, ...others] = smallestSet(
      density(-1000, 1000, (year) => bell(year, 7, 100)),
      share,
    )
    expect(others).toEqual([])
    expectWithin(only![0], 7 - 100 * reach, 0.01, 'years')
    expectWithin(only![1], 7 + 100 * reach, 0.01, 'years')
  })

  test('of two equal hills far apart is their two sets', () => {
    const sets = smallestSet(
      density(-2000, 2000, (year) => bell(year, -1000, 100) + bell(year, 1000, 100)),
      0.95,
    )
    expect(sets).toHaveLength(2)
    expectWithin(sets[0]![0], -1000 - 195.9964, 0.01, 'years')
    expectWithin(sets[0]![1], -1000 + 195.9964, 0.01, 'years')
    expectWithin(sets[1]![0], 1000 - 195.9964, 0.01, 'years')
    expectWithin(sets[1]![1], 1000 + 195.9964, 0.01, 'years')
  })

  test('of two unequal hills is cut at one height, and leaves out a hill below it', () => {
    // Masses 0.9 and 0.1, both 100 years wide. At equal height a² − b² = 2 ln 9 for edges a and b standard deviations
    // from their hills, and 0.9 P(a) + 0.1 P(b) = 0.95: a = 2.322048, b = 0.998727 (worked by bisection
    // with the error function of another program's library: P(a) = 0.979770, P(b) = 0.682073).
    const two = density(-2000, 2000, (year) => 0.9 * bell(year, -1000, 100) + 0.1 * bell(year, 1000, 100))
    const sets = smallestSet(two, 0.95)
    expect(sets).toHaveLength(2)
    const [a, b] = sets.map(([from, to]) => (to - from) / 200)
    expectWithin(a! ** 2 - b! ** 2, 2 * Math.log(9), 0.002, '', 'heights at the edges')
    expectWithin(a!, 2.322048, 0.0005, 'standard deviations')
    expect(smallestSet(two, 0.6)).toHaveLength(1)
  })

  // A triangle over [a, b] with its top at m: the corners left out are similar to the halves, so that each side loses
  // √0.05 of its length. Straight pieces have this shape exactly.
  test('of a triangle loses √0.05 of either side', () => {
    const [only] = smallestSet(
      density(0, 1000, (year) => (year < 300 ? year / 300 : (1000 - year) / 700)),
      0.95,
    )
    expectWithin(only![0], 300 * Math.sqrt(0.05), 1e-6, 'years')
    expectWithin(only![1], 1000 - 700 * Math.sqrt(0.05), 1e-6, 'years')
  })

  // Half of the mass in a spire ten years wide, half on a plain of 20,000 that slopes gently: the threshold lies near
  // a thousandth of the top. The plain loses 0.05 of the whole, a tenth of its own mass, at its lower end: with a density
  // of 1 + x for x from 0 to 1, mass 1.5, the tenth ends where x + x²/2 = 0.15, at x = √1.3 − 1.
  test.each([1, 1e-3, 1e-6])('of a spire on a plain cuts the plain, its slope being %s', (slope) => {
    const spire = (year: number) => bell(year, 5000, 10) / Math.sqrt(2 * Math.PI)
    const plain = (year: number) => (1 + (slope * year) / 20_000) / (20_000 * (1 + slope / 2))
    const sets = smallestSet(
      density(0, 20_000, (year) => (spire(year) + plain(year)) / 2),
      0.95,
    )
    const tenth = 0.1 * (1 + slope / 2)
    const end = (Math.sqrt(1 + 2 * slope * tenth) - 1) / slope
    const from = sets.at(-1)![0]
    expectWithin(from, 20_000 * end, 0.5 + 20_000 * 1e-9, 'years')
    expect(sets.at(-1)![1]).toBe(20_000)
  })

  test('of a slope ends at the very edge of the window', () => {
    const [only] = smallestSet(
      density(0, 1000, (year) => year),
      0.95,
    )
    expectWithin(only![0], 1000 * Math.sqrt(0.05), 1e-6, 'years')
    expect(only![1]).toBe(1000)
  })

  test('holds its share, and has one density at all of its edges inside the window', () => {
    const heights = fc.uniqueArray(fc.double({ min: 0.01, max: 10, noNaN: true }), {
      minLength: 3,
      maxLength: 30,
    })
    fc.assert(
      fc.property(heights, fc.double({ min: 0.1, max: 0.99, noNaN: true }), (given, share) => {
        const last = given.length - 1
        // Nearly level pieces at the threshold make the edge, not the share, ill-defined.
        fc.pre(given.slice(1).every((height, i) => Math.abs(height - given[i]!) > 0.01))
        const whole = density(0, last, (year) => given[year]!)
        const at = (year: number) => {
          const i = Math.min(Math.floor(year), last - 1)
          return whole.density[i]! + (year - i) * (whole.density[i + 1]! - whole.density[i]!)
        }
        const sets = smallestSet(whole, share)
        const mass = sets.reduce((sum, [from, to]) => sum + massBetween(at, from, to), 0)
        expectWithin(mass, share, 1e-7, 'of probability')
        const edges = sets.flat().filter((year) => year > 0 && year < last)
        for (const edge of edges) expectWithin(at(edge), at(edges[0]!), 1e-9, 'a year', `density at ${edge}`)
        const outside = whole.density.filter((_, year) => !holds(sets, year, year))
        for (const height of outside) expect(height).toBeLessThanOrEqual(at(edges[0]!) + 1e-9)
      }),
      { seed: 6 },
    )
  })
})

/** The mass under straight pieces between the whole years. */
function massBetween(at: (year: number) => number, from: number, to: number): number {
  const whole = Array.from({ length: Math.ceil(to) }, (_, year) => year).filter(
    (year) => from < year && year < to,
  )
  const years = [from, ...whole, to]
  return years
    .slice(1)
    .reduce((sum, year, i) => sum + ((year - years[i]!) * (at(year) + at(years[i]!))) / 2, 0)
}

describe('holds', () => {
  const set = [
    [0, 10],
    [20, 30],
  ] as const

  test.each([
    [0, 10, true],
    [22, 23, true],
    [5, 25, false],
    [12, 13, false],
    [9, 11, false],
  ])('%s to %s: %s', (from, to, answer) => {
    expect(holds(set, from, to)).toBe(answer)
  })
})
