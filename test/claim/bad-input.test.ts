import { describe, expect, test } from 'vitest'
import { positionOf } from '../../src/claim/format-problem.ts'
import { PROBLEM_CODES } from '../../src/claim/problem-codes.ts'
import { readClaim } from '../../src/claim/read-claim.ts'
import { BAD_INPUT, type BadInput } from './bad-input.ts'
import { findStar } from './find-star.ts'
import { read } from './read.ts'
import { BESIDE, SURVEY, SURVEY_AND_TABLE } from './survey.ts'
import { THORNMERE, thornmereWith } from './thornmere.ts'

/** The text that a problem stands in. */
function textOf({ text, files, inFile }: BadInput): string {
  return inFile === undefined ? text : (files?.[inFile] ?? '')
}

describe('each kind of bad input gives its problem, and no other', () => {
  test.each(BAD_INPUT.map((bad) => [bad.what, bad] as const))('%s', (_, bad) => {
    const { claim, problems } = read(bad.text, bad.files)
    const main = problems.find(({ code }) => code === bad.code)
    expect(problems.map(({ code }) => code).toSorted()).toEqual([bad.code, ...(bad.also ?? [])].toSorted())
    if (main === undefined) return
    const text = textOf(bad)
    const { line, column } = positionOf(text, main.offset)
    expect({
      severity: main.severity,
      at: `${line}:${column}`,
      marked: text.slice(main.offset, main.offset + main.length),
      message: main.message,
      path: main.path,
      inFile: main.beside?.path,
      suggestion: main.suggestion,
    }).toEqual({
      severity: bad.severity ?? 'error',
      at: bad.at,
      marked: bad.marked,
      message: bad.message,
      path: bad.path,
      inFile: bad.inFile,
      suggestion: bad.suggestion ?? null,
    })
    expect(claim === null).toBe(bad.severity !== 'warning')
  })
})

describe('a suggestion put in the place of what is marked puts the file right', () => {
  const curable = BAD_INPUT.filter(({ suggestion }) => suggestion !== undefined)

  test.each(curable.map((bad) => [bad.what, bad] as const))('%s', (_, bad) => {
    const problem = read(bad.text, bad.files).problems.find(({ code }) => code === bad.code)!
    const text = textOf(bad)
    for (const cure of problem.suggestion!.split(' or ')) {
      const cured = text.slice(0, problem.offset) + cure + text.slice(problem.offset + problem.length)
      const { inFile } = bad
      const again =
        inFile === undefined ? read(cured, bad.files) : read(bad.text, { ...bad.files, [inFile]: cured })
      // `UTM 34 N or UTM 34 S`: the one that is meant is on the side of the structure, the other gives a warning.
      expect(again.problems.filter(({ code }) => code !== 'far-from-structure')).toEqual([])
    }
  })
})

test('a precision that is no angle is told of exact and unknown', () => {
  const [problem] = read(thornmereWith('assumed_precision: exact', 'assumed_precision: good')).problems
  expect(problem?.expected).toBe('exact, an angle such as 10′, or unknown')
})

test('breaks of syntax are told in plain words, not in those of the library', () => {
  const texts = [
    thornmereWith('body: sun, event', 'body: "sun" event'),
    thornmereWith('500 BCE}', '500 BCE}}'),
    thornmereWith('41°16′12″ N', '"41" 16 N'),
    thornmereWith('upper limb}', 'upper limb]'),
    thornmereWith('body: sun,', 'body: sun,#x\n'),
    thornmereWith('640 m', '[640 m'),
    thornmereWith('640 m', '|x\n   640 m'),
    thornmereWith('640 m', '"640 m"#x'),
  ]
  for (const text of texts) {
    const syntax = read(text).problems.filter(({ code }) => code === 'yaml-syntax')
    expect(syntax).not.toEqual([])
    for (const { message, expected } of syntax) {
      expect(message).not.toMatch(/scalar|token|node|collection|flow|block|stream|implicit/i)
      expect(expected).not.toBeNull()
    }
  }
})

test('every kind of problem is tried', () => {
  const tried = new Set<string>(BAD_INPUT.map(({ code }) => code))
  const untried = Object.keys(PROBLEM_CODES).filter((code) => !tried.has(code))
  // Both are tried below.
  expect(untried.toSorted()).toEqual(['no-model', 'too-many-problems'])
})

test('a file with hundreds of problems lists the first hundred and counts the others', () => {
  const text = Array.from({ length: 150 }, (_, index) => `key${index}: 1\n`).join('')
  const { claim, problems } = read(text)
  expect(claim).toBeNull()
  expect(problems).toHaveLength(101)
  // 150 unknown keys and the four that are missing.
  expect(problems[100]).toMatchObject({
    code: 'too-many-problems',
    message: 'the file has 54 more problems from here on',
  })
})

test('a table with hundreds of problems lists the first twenty and counts the others, and hides nothing else', () => {
  const rows = Array.from({ length: 150 }, (_, row) => `p${row},far,${row}\n`).join('')
  const text = SURVEY_AND_TABLE.replace('at: rising}\nasserted', 'at: risng}\nasserted')
  const { problems } = read(text, { ...BESIDE, 'survey.csv': `name,east,north\n${rows}` })
  expect(problems).toHaveLength(22)
  expect(problems[20]).toMatchObject({
    code: 'too-many-problems',
    message: '`survey.csv` has 130 more problems from here on',
    beside: { path: 'survey.csv' },
  })
  expect(positionOf(problems[20]!.beside!.text, problems[20]!.offset).line).toBe(22)
  expect(problems[21]).toMatchObject({ code: 'unknown-word', path: 'target.at' })
})

test('a table without a sound row comes to an end, however long it is', () => {
  const rows = 'a,1\n'.repeat(400_000)
  const { claim, problems } = read(SURVEY_AND_TABLE, { ...BESIDE, 'survey.csv': `name,east,north\n${rows}` })
  expect(claim).toBeNull()
  expect(problems).toHaveLength(21)
  // 20,001 broken rows and that there are too many, of which the first twenty are told.
  expect(problems[20]?.message).toBe('`survey.csv` has 19982 more problems from here on')
})

test('so many problems are no trouble that they would not fit on the stack as arguments', () => {
  const rows = Array.from({ length: 20_000 }, (_, row) => `p${row},a,b,c,d,e,f,g\n`).join('')
  const table = `name,latitude,longitude,elevation,uncertainty,width,form,up\n${rows}`
  const { problems } = read(SURVEY_AND_TABLE, { ...BESIDE, 'survey.csv': table })
  // Seven bad cells in each row, and the column that has no place, of which the first twenty are told.
  expect(problems[20]?.message).toBe('`survey.csv` has 139981 more problems from here on')
})

// Where each cell is counted from the beginning of its line this takes minutes, and the test runs out of time.
test('a line of a million characters with quotes is taken apart as a short one is', () => {
  const line = '"é",'.repeat(250_000)
  const { problems } = read(SURVEY_AND_TABLE, { ...BESIDE, 'survey.csv': `name,east,north\n${line}\n` })
  expect(problems).toMatchObject([{ code: 'wrong-number-of-cells', length: 1_000_000 }])
})

test('a declination with a sign and a letter is told of a letter alone, since a sign alone is refused', () => {
  const text = SURVEY.replace('{from: sun}', '{from: compass, declination: -3° W}')
  expect(read(text, BESIDE).problems[0]?.expected).toBe('E or W without a sign')
})

test('problems of a table stand where the claim file names it', () => {
  const text = SURVEY_AND_TABLE.replace('{from: sun}', '{from: son}').replace('width: 60 cm', 'width: 60')
  const { problems } = read(text, { ...BESIDE, 'survey.csv': 'name,east,north,hue\na,1,x,2\n' })
  expect(problems.map(({ code, beside }) => [code, beside?.path])).toEqual([
    ['unknown-word', undefined],
    ['unknown-column', 'survey.csv'],
    ['not-readable', 'survey.csv'],
    ['unit-missing', undefined],
  ])
})

test('a reader that is handed no files and no model of the Earth’s magnetism says so', () => {
  const text = SURVEY.replace('{from: sun}', '{from: compass, date: 12 June 2019}')
  const { claim, problems } = readClaim(text, { findStar })
  expect(claim).toBeNull()
  expect(problems).toMatchObject([
    {
      code: 'no-model',
      path: 'north.date',
      message: 'nothing here computes the declination of a compass on a date',
      expected: 'declination: 3°20′ W ± 10′ beside it',
    },
    { code: 'file-not-read', message: '`skyline.csv` cannot be read: no other files can be read here' },
  ])
})

describe('a colon in a text hides nothing else that is wrong', () => {
  const codesOf = (text: string) => read(text).problems.map(({ code }) => code)

  test('before it and after it', () => {
    const text = thornmereWith('source: Thornmere', 'source: A: Thornmere')
      .replace('claim:', 'clam:')
      .replace('at: rising', 'at: risng')
    expect(codesOf(text)).toEqual(['unknown-key', 'yaml-syntax', 'unknown-word'])
  })

  test('not even in the first line, where missing keys are told, or a second colon', () => {
    const text = thornmereWith('claim: The', 'claim: Inside: the')
      .replace('source: ', 'source: A: ')
      .replace('asserted_date: 9600 BCE ± 100\n', '')
    expect(codesOf(text).toSorted()).toEqual(['missing-key', 'yaml-syntax', 'yaml-syntax'])
  })

  test('and what is made harmless for this is told as a break of syntax only', () => {
    const text = THORNMERE.replace(/target: \{(.*)\}/, 'target: $1').replace('41°16′12″ N', '41: N')
    expect(codesOf(text)).toEqual(['yaml-syntax', 'yaml-syntax'])
  })

  test('nor is a suggestion made where the text goes on in the next line', () => {
    const [problem] = read(thornmereWith('source: Thornmere', 'source: A: Thornmere\n  old')).problems
    expect(problem).toMatchObject({ expected: 'the text in quotes', suggestion: null })
  })
})
