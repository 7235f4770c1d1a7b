import { readdirSync, readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { PROBLEM_CODES } from '../../src/claim/problem-codes.ts'

/** The sources that may give problems with a claim file, without the rows themselves. */
function sources(): string {
  const folders = ['../../src/quantity/', '../../src/claim/', '../../src/claim/read/'].map(
    (path) => new URL(path, import.meta.url),
  )
  return folders
    .flatMap((folder) => readdirSync(folder).map((name) => new URL(name, folder)))
    .filter(({ pathname }) => pathname.endsWith('.ts') && !pathname.endsWith('-codes.ts'))
    .map((file) => readFileSync(file, 'utf8'))
    .join('\n')
}

test('every row is of a code that is used', () => {
  const text = sources()
  expect(Object.keys(PROBLEM_CODES).filter((code) => !text.includes(`'${code}'`))).toEqual([])
})

test('every code that is used has a row', () => {
  const used = [
    ...sources().matchAll(
      /(?:misread|describeMisread|characterProblem|structural)\(\s*'([\w-]+)'|code: '([\w-]+)'|Error\(\s*\w+,\s*\w+,\s*'([\w-]+)'/g,
    ),
  ]
  const codes = new Set(used.map(([, first, second, third]) => first ?? second ?? third ?? ''))
  expect(codes.size).toBeGreaterThan(30)
  expect([...codes].filter((code) => !Object.hasOwn(PROBLEM_CODES, code))).toEqual([])
})

test('codes are kebab-case and rows are sentences', () => {
  for (const [code, row] of Object.entries(PROBLEM_CODES)) {
    expect(code).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/)
    expect(row).toMatch(/^[A-Z].*\.$/)
  }
})
