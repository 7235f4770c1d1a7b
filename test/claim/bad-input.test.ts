import { describe, expect, test } from 'vitest'
import { positionOf } from '../../src/claim/format-problem.ts'
import { PROBLEM_CODES } from '../../src/claim/problem-codes.ts'
import { readClaim } from '../../src/claim/read-claim.ts'
import { BAD_INPUT } from './bad-input.ts'

describe('each kind of bad input gives its problem, and no other', () => {
  test.each(BAD_INPUT.map((bad) => [bad.what, bad] as const))('%s', (_, bad) => {
    const { claim, problems } = readClaim(bad.text)
    const main = problems.find(({ code }) => code === bad.code)
    expect(problems.map(({ code }) => code).toSorted()).toEqual([bad.code, ...(bad.also ?? [])].toSorted())
    if (main === undefined) return
    const { line, column } = positionOf(bad.text, main.offset)
    expect({
      severity: main.severity,
      at: `${line}:${column}`,
      marked: bad.text.slice(main.offset, main.offset + main.length),
      message: main.message,
      path: main.path,
      suggestion: main.suggestion,
    }).toEqual({
      severity: bad.severity ?? 'error',
      at: bad.at,
      marked: bad.marked,
      message: bad.message,
      path: bad.path,
      suggestion: bad.suggestion ?? null,
    })
    expect(claim === null).toBe(bad.severity !== 'warning')
  })
})

describe('a suggestion put in the place of what is marked puts the file right', () => {
  const curable = BAD_INPUT.filter(({ suggestion }) => suggestion !== undefined)

  test.each(curable.map((bad) => [bad.what, bad] as const))('%s', (_, bad) => {
    const problem = readClaim(bad.text).problems.find(({ code }) => code === bad.code)!
    for (const cure of problem.suggestion!.split(' or ')) {
      const cured = bad.text.slice(0, problem.offset) + cure + bad.text.slice(problem.offset + problem.length)
      expect(readClaim(cured).problems).toEqual([])
    }
  })
})

test('every kind of problem is tried', () => {
  const tried = new Set<string>(BAD_INPUT.map(({ code }) => code))
  const untried = Object.keys(PROBLEM_CODES).filter((code) => !tried.has(code))
  expect(untried).toEqual(['too-many-problems'])
})

test('a file with hundreds of problems lists the first hundred and counts the others', () => {
  const text = Array.from({ length: 150 }, (_, index) => `key${index}: 1\n`).join('')
  const { claim, problems } = readClaim(text)
  expect(claim).toBeNull()
  expect(problems).toHaveLength(101)
  // 150 unknown keys and the four that are missing.
  expect(problems[100]).toMatchObject({
    code: 'too-many-problems',
    message: 'the file has 54 more problems from here on',
  })
})
