import fc from 'fast-check'
import { expect, test } from 'vitest'
import { monotoneRuns } from '../../src/site/monotone-runs.ts'
import { seededRandom } from '../inference/seeded-random.ts'
import { expectWithin } from '../published/expect-within.ts'

test('finds every passing of a level that a look at each step finds', () => {
  const values = fc.array(fc.integer({ min: -5, max: 5 }), { minLength: 2, maxLength: 40 })
  fc.assert(
    fc.property(values, fc.integer({ min: -6, max: 5 }), (list, below) => {
      const level = below + 0.3
      const got: unknown[] = []
      monotoneRuns(Float64Array.from(list)).passings(level, (index, share, falls) => {
        expectWithin(list[index] + share * (list[index + 1] - list[index]), level, 1e-12, 'units')
        got.push([index, falls])
      })
      const want = list.slice(1).flatMap((to, i) => {
        const from = list[i]
        return from < level !== to < level ? [[i, to < from]] : []
      })
      expect(got).toEqual(want)
    }),
    { seed: 6 },
  )
})

test('finds among thousands of runs what a look at every step finds', () => {
  const { uniform, normal } = seededRandom(8)
  // Up and down by noise about a wave, so that the runs that hold a level are few and lie far apart.
  const jags = Float64Array.from({ length: 20_001 }, (_, i) => 10 * Math.sin(i / 900) + normal())
  const runs = monotoneRuns(jags)
  const turns = jags.filter((value, i) => (value - jags[i - 1]!) * (value - jags[i + 1]!) > 0)
  expect(turns.length).toBeGreaterThan(10_000)
  // Levels of the turns themselves besides, one of which is passed at a turn or not at all.
  const levels = [...Array.from({ length: 200 }, () => 26 * uniform() - 13), ...turns.slice(0, 50), -20, 20]
  let passed = 0
  for (const level of levels) {
    const got: number[][] = []
    runs.passings(level, (index, share, falls) => got.push([index, share, Number(falls)]))
    passed += got.length
    expect(got, `${level}`).toEqual(passingsByScan(jags, level))
  }
  expect(passed).toBeGreaterThan(1000)
})

/** Of a level that is reached exactly, the step counts that leaves it upwards or comes down to it from above. */
function passingsByScan(values: Float64Array, level: number): number[][] {
  const passings: number[][] = []
  for (let i = 1; i < values.length; i++) {
    const [from, to] = [values[i - 1]!, values[i]!]
    if (level >= Math.min(from, to) && level < Math.max(from, to))
      passings.push([i - 1, (level - from) / (to - from), Number(to < from)])
  }
  return passings
}
