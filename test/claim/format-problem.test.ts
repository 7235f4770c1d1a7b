import { describe, expect, test } from 'vitest'
import { formatProblem, positionOf } from '../../src/claim/format-problem.ts'
import type { Problem } from '../../src/quantity/problem.ts'
import { BAD_INPUT } from './bad-input.ts'
import { read } from './read.ts'
import { BESIDE, SURVEY_AND_TABLE } from './survey.ts'
import { thornmereWith } from './thornmere.ts'

function problemAt(text: string, marked: string, more: Partial<Problem> = {}): Problem {
  return {
    severity: 'error',
    code: 'out-of-range',
    message: 'wrong',
    expected: null,
    suggestion: null,
    path: null,
    offset: text.indexOf(marked),
    length: marked.length,
    ...more,
  }
}

/** What stands above the carets. */
function underCarets(printed: string): string {
  const [, line = '', carets = ''] = printed.split('\n')
  const start = carets.indexOf('^')
  return line.slice(start, carets.lastIndexOf('^') + 1)
}

test('prints place, message, excerpt, field, expectation and suggestion', () => {
  const text = thornmereWith('1°30′ ± 2′', '1°30′ ± 2')
  const [problem] = read(text).problems
  expect(formatProblem(problem!, text, 'thornmere.yaml')).toBe(
    [
      'thornmere.yaml:12:66: error: `± 2` does not say in which unit',
      '    midsummer: {from: hearthstone, to: east-pillar, horizon: 1°30′ ± 2}',
      `  ${' '.repeat(65)}^^^`,
      '  field: sightlines.midsummer.horizon',
      '  expected: the unit of the uncertainty',
      '  write: ± 2′',
    ].join('\n'),
  )
})

test('colours only when asked to', () => {
  const problem = problemAt('a: b', 'b', { severity: 'warning' })
  expect(formatProblem(problem, 'a: b', 'f')).not.toContain('\u001b')
  expect(formatProblem(problem, 'a: b', 'f', { color: true })).toContain('\u001b[33mwarning:\u001b[39m')
})

test('no character of a file reaches the terminal as a command', () => {
  const text = 'a: \u001b[31mred\u0007 \u202e\n'
  const problem = problemAt(text, 'red', {
    path: 'a\u001b',
    message: '`\u001b`',
    suggestion: '\u001b',
    expected: '\u001b',
  })
  // biome-ignore lint/suspicious/noControlCharactersInRegex: none may be there
  expect(formatProblem(problem, text, 'f\u001b')).not.toMatch(/[\u0000-\u0009\u000b-\u001f\u202e]/)
})

describe('lines and columns count from 1, columns in characters', () => {
  test.each([
    ['abc', 'c', 1, 3],
    ['a\nbc', 'c', 2, 2],
    ['a\r\nbc', 'c', 2, 2],
    ['a\rbc', 'c', 2, 2],
    ['𝔞𝔟c', 'c', 1, 3],
    ['\tc', 'c', 1, 2],
    ['\ufeffabc', 'c', 1, 3],
    ['a\n\n\nc', 'c', 4, 1],
  ])('%j', (text, marked, line, column) => {
    expect(positionOf(text, text.indexOf(marked))).toEqual({ line, column })
  })
})

describe('a problem of a file beside the claim file', () => {
  const { problems } = read(SURVEY_AND_TABLE, {
    ...BESIDE,
    'survey.csv': '\ufeffname,east,north\r\na,84.65,x\r\n',
  })
  const print = (file: string) => problems.map((problem) => formatProblem(problem, SURVEY_AND_TABLE, file))

  test('is printed with the name of that file, in the folder of the claim file, and a line of it', () => {
    expect(print('claims/ring.yaml')).toEqual([
      [
        'claims/survey.csv:2:9: error: `x` is not a place on the plan',
        '  a,84.65,x',
        '          ^',
        '  field: points.a.north',
        '  expected: a place on the plan such as 53.09',
      ].join('\n'),
    ])
  })

  test.each([
    ['ring.yaml', 'survey.csv:2:9:'],
    ['/a/b/ring.yaml', '/a/b/survey.csv:2:9:'],
    ['C:\\a\\ring.yaml', 'C:\\a\\survey.csv:2:9:'],
  ])('of %s', (file, place) => {
    expect(print(file)[0]).toMatch(new RegExp(`^${place.replaceAll('\\', '\\\\')}`))
  })
})

describe('the excerpt', () => {
  test.each(BAD_INPUT.map((bad) => [bad.what, bad] as const))('of %s fits in 80 columns', (_, bad) => {
    for (const problem of read(bad.text, bad.files).problems) {
      const [, line = '', carets = ''] = formatProblem(problem, bad.text, 'f').split('\n')
      expect([...line].length).toBeLessThanOrEqual(80)
      expect([...carets].length).toBeLessThanOrEqual(80)
      expect(carets).toMatch(/^ *\^+$/)
    }
  })

  const long = 'x'.repeat(200)

  test('of a long line is cut at its end', () => {
    const text = `MARK ${long}`
    const printed = formatProblem(problemAt(text, 'MARK'), text, 'f')
    expect(underCarets(printed)).toBe('MARK')
    expect(printed.split('\n')[1]).toMatch(/^ {2}MARK x+…$/)
  })

  test('of a long line is cut at its beginning', () => {
    const text = `${long} MARK`
    const printed = formatProblem(problemAt(text, 'MARK'), text, 'f')
    expect(underCarets(printed)).toBe('MARK')
    expect(printed.split('\n')[1]).toMatch(/^ {2}…x+ MARK$/)
    expect(printed.split('\n')[1]).toHaveLength(80)
  })

  test('of a long line is cut at both ends', () => {
    const text = `${long} MARK ${long}`
    const printed = formatProblem(problemAt(text, 'MARK'), text, 'f')
    expect(underCarets(printed)).toBe('MARK')
    expect(printed.split('\n')[1]).toMatch(/^ {2}…x+ MARK x+…$/)
    expect(printed.split('\n')[1]).toHaveLength(80)
  })

  test('of a mark longer than a line is all carets', () => {
    const printed = formatProblem(problemAt(long, long), long, 'f')
    expect(printed.split('\n')[2]).toBe(`  ${'^'.repeat(77)}`)
  })

  test('counts wide characters as two columns and combining ones as none', () => {
    const wide = '石室: MARK'
    expect(formatProblem(problemAt(wide, 'MARK'), wide, 'f').split('\n')[2]).toBe(`  ${' '.repeat(6)}^^^^`)
    const combined = 'e\u0301: MARK'
    expect(formatProblem(problemAt(combined, 'MARK'), combined, 'f').split('\n')[2]).toBe('     ^^^^')
  })

  test('shows a tab as two spaces', () => {
    expect(formatProblem(problemAt('\tMARK', 'MARK'), '\tMARK', 'f').split('\n').slice(1, 3)).toEqual([
      '    MARK',
      '    ^^^^',
    ])
  })

  test('of a mark over several lines shows the first', () => {
    const text = 'a: first\n  second\n'
    const printed = formatProblem(problemAt(text, 'first\n  second'), text, 'f')
    expect(printed.split('\n').slice(1, 3)).toEqual(['  a: first', '     ^^^^^'])
  })

  test('of a place behind the last character has one caret', () => {
    expect(formatProblem(problemAt('', ''), '', 'f').split('\n')[2]).toBe('  ^')
    expect(formatProblem(problemAt('ab\n', '\n'), 'ab\n', 'f').split('\n')[2]).toBe('    ^')
  })
})
