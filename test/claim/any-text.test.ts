import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { formatProblem } from '../../src/claim/format-problem.ts'
import { newClaim } from '../../src/claim/new-claim.ts'
import { PROBLEM_CODES } from '../../src/claim/problem-codes.ts'
import { type Files, read } from './read.ts'
import { POINTS, SKYLINE, SURVEY, SURVEY_AND_TABLE } from './survey.ts'
import { THORNMERE } from './thornmere.ts'

const seed = 20_260_102

/** What has to hold of any text whatever. */
function expectSound(text: string, files: Files = {}): void {
  const { claim, problems } = read(text, files)
  expect(claim === null).toBe(problems.some(({ severity }) => severity === 'error'))
  let last = 0
  for (const problem of problems) {
    expect(Object.hasOwn(PROBLEM_CODES, problem.code), problem.code).toBe(true)
    const place = problem.beside?.namedAt ?? problem.offset
    const { length } = problem.beside?.text ?? text
    expect(place).toBeGreaterThanOrEqual(last)
    expect(problem.offset).toBeGreaterThanOrEqual(0)
    expect(problem.length).toBeGreaterThanOrEqual(1)
    expect(problem.offset + problem.length).toBeLessThanOrEqual(Math.max(1, length))
    expect(formatProblem(problem, text, 'file')).toContain('^')
    last = place
  }
  if (claim !== null) expect(numbersIn(claim).every(Number.isFinite)).toBe(true)
}

function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value]
  if (value instanceof Map) return [...value.values()].flatMap(numbersIn)
  return value === null || typeof value !== 'object' ? [] : Object.values(value).flatMap(numbersIn)
}

describe('no text makes it throw, and each problem is marked inside the text', () => {
  test('any characters', () => {
    const unit = fc.constantFrom('grapheme' as const, 'binary' as const)
    const texts = unit.chain((kind) => fc.string({ unit: kind, maxLength: 80 }))
    fc.assert(
      fc.property(texts, (text) => expectSound(text)),
      { seed, numRuns: 500 },
    )
  })

  test('pieces of YAML', () => {
    const pieces = [
      'claim',
      'structure',
      'points',
      'a',
      '1',
      ': ',
      ':',
      '- ',
      '\n',
      '\n  ',
      '\t',
      '{',
      '}',
      '[',
      ']',
      ',',
      '"',
      "'",
      '|',
      '>',
      '#',
      ' #',
      '&a',
      '*a',
      '!t',
      '%YAML',
      '---',
      '...',
      '? ',
      '<<',
      '~',
      '\r\n',
      '\u0000',
      '\ufffd',
      '°',
    ]
    const texts = fc.array(fc.constantFrom(...pieces), { maxLength: 25 }).map((parts) => parts.join(''))
    fc.assert(
      fc.property(texts, (text) => expectSound(text)),
      { seed, numRuns: 1000 },
    )
  })

  test('a sound claim with a stretch cut out, doubled or replaced', () => {
    const slips = fc.record({
      base: fc.constantFrom(THORNMERE, SURVEY, newClaim().replace(/^( *)#(?=[^ \n])/gm, '$1')),
      at: fc.double({ min: 0, max: 1, noNaN: true }),
      length: fc.integer({ min: 0, max: 60 }),
      put: fc.oneof(
        fc.constantFrom(
          '',
          ' ',
          '\n',
          ':',
          ': ',
          '"',
          "'",
          '{',
          '}',
          '-',
          '#',
          ' #',
          '[',
          '\t',
          '1',
          '′',
          '±',
        ),
        fc.string({ maxLength: 5 }),
      ),
    })
    const changed = slips.map(({ base, at, length, put }) => {
      const start = Math.floor(at * base.length)
      return base.slice(0, start) + put + base.slice(start + length)
    })
    fc.assert(
      fc.property(changed, (text) => expectSound(text, { 'skyline.csv': SKYLINE })),
      { seed, numRuns: 500 },
    )
  })
})

test('any value in the place of a quantity is either read or refused at its key', () => {
  const lines = THORNMERE.split('\n').flatMap((line, index) =>
    /^ {0,2}[a-z_]+: \S/.test(line) ? [index] : [],
  )
  const value = fc.oneof(
    fc.string({ unit: 'grapheme', maxLength: 30 }),
    fc.double().map(String),
    fc.integer().map(String),
  )
  fc.assert(
    fc.property(fc.constantFrom(...lines), value, (index, text) => {
      const all = THORNMERE.split('\n')
      all[index] = all[index]!.replace(/: .*/, () => `: ${JSON.stringify(text)}`)
      const changed = all.join('\n')
      expectSound(changed)
      const start = all.slice(0, index).join('\n').length
      for (const { offset } of read(changed).problems.filter(({ code }) => code !== 'date-outside-window'))
        expect(offset).toBeGreaterThanOrEqual(start)
    }),
    { seed, numRuns: 400 },
  )
})

test('any value in a target, or in the line that is to meet it, is either read or refused', () => {
  const forms = [
    ['azimuth: 57° ± 1′, horizon: 1°', '{body: sun, event: @, sense: @, at: rising}'],
    ['azimuth: 57° ± 1′, horizon: 1°', '{body: sun, day: @, at: rising}'],
    ['azimuth: 57° ± 1′, horizon: 1°', '{body: moon, event: @, at: @, disc: @}'],
    ['azimuth: 57° ± 1′, horizon: 1°', '{body: @, at: @, altitude: @}'],
    ['azimuth: 57° ± 1′', '{bodies: [Kochab, @], event: @, above: @}'],
    ['altitude: @', '{body: sun, event: june solstice, at: noon}'],
  ]
  const words = [
    '30 days after june solstice',
    '-1 days before ',
    'june solstice + 3',
    'northern',
    'minor',
    'equinox',
    'noon',
    'Sirius',
    'moon',
  ]
  const value = fc.oneof(
    fc.string({ unit: 'grapheme', maxLength: 30 }),
    fc.double().map((days) => `${days} days after june solstice`),
    fc.array(fc.constantFrom(...words), { maxLength: 3 }).map((parts) => parts.join(' ')),
  )
  fc.assert(
    fc.property(
      fc.constantFrom(...forms),
      fc.array(value, { minLength: 4, maxLength: 4 }),
      (form, values) => {
        const rest = [...values]
        const [line, target] = form.map((text) => text.replace(/@/g, () => JSON.stringify(rest.pop())))
        expectSound(
          THORNMERE.replace(/midsummer: .*/, () => `midsummer: {${line}}`).replace(
            /^target: .*/m,
            () => `target: ${target}`,
          ),
        )
      },
    ),
    { seed, numRuns: 600 },
  )
})

test('any change in a table beside the claim file is either read or refused', () => {
  const pieces = [
    '',
    ',',
    ';',
    '\t',
    '"',
    '""',
    '\n',
    '\r',
    '#',
    '-',
    '1',
    '1e9',
    '360',
    '°',
    'N',
    'name',
    '\ufeff',
    '\u0000',
    '\ufffd',
  ]
  const slip = fc.record({
    file: fc.constantFrom('survey.csv', 'skyline.csv'),
    at: fc.double({ min: 0, max: 1, noNaN: true }),
    length: fc.integer({ min: 0, max: 12 }),
    put: fc.oneof(fc.constantFrom(...pieces), fc.string({ unit: 'grapheme', maxLength: 5 })),
  })
  fc.assert(
    fc.property(fc.array(slip, { minLength: 1, maxLength: 4 }), (slips) => {
      const files: Record<string, string> = { 'survey.csv': POINTS, 'skyline.csv': SKYLINE }
      for (const { file, at, length, put } of slips) {
        const text = files[file]!
        const start = Math.floor(at * text.length)
        files[file] = text.slice(0, start) + put + text.slice(start + length)
      }
      expectSound(SURVEY_AND_TABLE, files)
    }),
    { seed, numRuns: 600 },
  )
})

test('any value in a north, a grid, a point, a horizon or a span is either read or refused', () => {
  const forms = [
    ['north: {from: sun}', 'north: {from: compass, date: @, declination: @}'],
    ['north: {from: sun}', 'north: {from: @, baseline: @, accuracy: @, convergence: @}'],
    ['grid: {zone: UTM 34 N}', 'grid: {zone: @, ellipsoid: @}'],
    [
      'grid: {zone: UTM 34 N}',
      'grid: {central_meridian: @, latitude_of_origin: @, scale: @, false_easting: @}',
    ],
    ['width: 60 cm', 'width: @, form: @, elevation: @'],
    ['sighted: left edge', 'sighted: {from: @, to: @}'],
    ['{sea: 25 m}', '{distance: @, rise: @, sea: @}'],
    ['{profile: skyline.csv}', '{profile: @, point: @}'],
    ['{angle: 61° ± 5′}', '{angle: @, horizons: {june: @, december: @}}'],
    ['{angle: 61° ± 5′}', '{from: @, june: @, december: @, horizons: @}'],
  ]
  const pieces = [
    '12',
    ' June',
    '/',
    '.',
    '-',
    '1998',
    '°',
    '′',
    ' W',
    'E',
    ' m',
    ' km',
    ' ± ',
    'UTM ',
    'hearth',
    'skyline.csv',
  ]
  const value = fc.oneof(
    fc.string({ unit: 'grapheme', maxLength: 20 }),
    fc.array(fc.constantFrom(...pieces), { maxLength: 5 }).map((parts) => parts.join('')),
  )
  fc.assert(
    fc.property(
      fc.constantFrom(...forms),
      fc.array(value, { minLength: 4, maxLength: 4 }),
      ([from, to], values) => {
        const rest = [...values]
        const form = to!.replace(/@/g, () => JSON.stringify(rest.pop()))
        expectSound(
          SURVEY.replace(from!, () => form),
          { 'skyline.csv': SKYLINE },
        )
      },
    ),
    { seed, numRuns: 600 },
  )
})
