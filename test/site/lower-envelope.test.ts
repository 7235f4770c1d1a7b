import { expect, test } from 'vitest'
import { lowerEnvelope } from '../../src/site/lower-envelope.ts'
import { seededRandom } from '../inference/seeded-random.ts'
import { expectWithin } from '../published/expect-within.ts'

type Line = { x: number; y: number; along: number }[]

function heightAt(line: Line, x: number): number {
  for (let i = 1; i < line.length; i++) {
    const [from, to] = [line[i - 1], line[i]]
    if (x >= from.x && x < to.x) return from.y + ((x - from.x) / (to.x - from.x)) * (to.y - from.y)
  }
  return Infinity
}

test('is the lowest of the lines wherever any of them is', () => {
  const { uniform } = seededRandom(12)
  for (let round = 0; round < 50; round++) {
    const lines: Line[] = Array.from({ length: 8 }, (_, n) => {
      let x = n - uniform()
      return Array.from({ length: 6 }, () => {
        x += 0.5 * uniform()
        return { x, y: uniform(), along: n }
      })
    })
    // Each begins where those before it have come to, or earlier.
    for (const [n, line] of lines.entries())
      if (n > 0) line[0].x = Math.min(line[0].x, lines[n - 1].at(-1)!.x)
    const envelope = lowerEnvelope(lines)
    const xs = envelope.map(({ x }) => x)
    expect(xs).toEqual([...xs].sort((a, b) => a - b))
    for (let i = 0; i < 200; i++) {
      const x = 9 * uniform() - 1
      const lowest = Math.min(...lines.map((line) => heightAt(line, x)))
      const got = heightAt(envelope, x)
      if (lowest === Infinity) expect(got).toBe(Infinity)
      else expectWithin(got, lowest, 1e-9, 'units', x)
    }
  }
})

test('has a crossing twice, once for each line', () => {
  const rising = [
    { x: 0, y: 0, along: 1 },
    { x: 2, y: 2, along: 1 },
  ]
  const falling = [
    { x: 0, y: 2, along: 5 },
    { x: 2, y: 0, along: 5 },
  ]
  expect(lowerEnvelope([rising, falling])).toEqual([
    { x: 0, y: 0, along: 1 },
    { x: 1, y: 1, along: 1 },
    { x: 1, y: 1, along: 5 },
    { x: 2, y: 0, along: 5 },
  ])
})

test('has no points of a line where that lies above another', () => {
  const level = [
    { x: 0, y: 0, along: 0 },
    { x: 10, y: 0, along: 10 },
  ]
  const above = Array.from({ length: 9 }, (_, i) => ({ x: i + 1, y: 1 + (i % 2), along: i }))
  expect(lowerEnvelope([level, above])).toEqual(level)
})
