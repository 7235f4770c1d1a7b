import fc from 'fast-check'
import { expect, test } from 'vitest'
import { monotoneRuns } from '../../src/site/monotone-runs.ts'
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

test('knows the values at which passings come or go', () => {
  expect(monotoneRuns(Float64Array.of(1, 4, 4, 2, 3, 8)).turns).toEqual([1, 2, 4, 8])
  expect(monotoneRuns(Float64Array.of(4, 3, 3, 1)).turns).toEqual([1, 4])
})
