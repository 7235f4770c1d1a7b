import { describe, expect, test } from 'vitest'
import type { Sightline, Target } from '../../src/claim/claim.ts'
import { CLAIM_SCHEMA, type Schema } from '../../src/claim/claim-schema.ts'
import { TARGET_EXAMPLES } from '../../src/claim/keys.ts'
import { isOnMeridian } from '../../src/claim/on-meridian.ts'
import { readClaim } from '../../src/claim/read-claim.ts'
import { read } from './read.ts'
import { THORNMERE, thornmereWith } from './thornmere.ts'

const TARGET = '{body: sun, event: june solstice, at: rising, disc: upper limb}'
const DIRECTION = '{azimuth: 57°54′ ± 1′, horizon: 1°30′ ± 2′}'
const SPAN = '{span: {angle: 50°31′ ± 2′}}'
const ALTITUDE = '{altitude: 31°12′ ± 10′}'

/** The only line of a file in which nothing is wrong or doubtful. */
function lineOf(target: string, line = DIRECTION): Sightline {
  const text = thornmereWith('{from: hearthstone, to: east-pillar, horizon: 1°30′ ± 2′}', line)
  const { claim, problems } = read(text.replace(TARGET, () => target))
  expect(problems).toEqual([])
  return claim!.sightlines[0]!
}

function targetOf(target: string, line = DIRECTION): Target {
  return lineOf(target, line).target
}

describe('the Sun', () => {
  const sun = { body: 'sun', at: 'rising', disc: 'omitted' }

  test.each([
    ['event: june solstice', { name: 'june solstice' }],
    ['event: December Solstice', { name: 'december solstice' }],
    ['event: zenith passage', { name: 'zenith passage' }],
    ['event: equinox', { name: 'equinox', sense: 'omitted' }],
    ['event: equinox, sense: unknown', { name: 'equinox', sense: 'unknown' }],
    ['event: equinox, sense: declination zero', { name: 'equinox', sense: 'declination zero' }],
    ['event: equinox, sense: Midway in Days', { name: 'equinox', sense: 'midway in days' }],
    ['event: equinox, sense: midway in direction', { name: 'equinox', sense: 'midway in direction' }],
    ['day: 30 days after june solstice', { name: 'day', days: 30, after: 'june solstice' }],
    ['day: 1 day before december solstice', { name: 'day', days: -1, after: 'december solstice' }],
    ['day: 183 days before the June solstice', { name: 'day', days: -183, after: 'june solstice' }],
    ['day: +60 Days After December Solstice', { name: 'day', days: 60, after: 'december solstice' }],
    ['day: 0 days before june solstice', { name: 'day', days: 0, after: 'june solstice' }],
  ])('%s', (words, event) => {
    expect(targetOf(`{body: sun, ${words}, at: rising}`)).toEqual({ ...sun, event })
  })

  test('at noon the line is an altitude, and the disc may be left out or told', () => {
    expect(lineOf('{body: sun, event: june solstice, at: noon}', ALTITUDE)).toEqual({
      name: 'midsummer',
      direction: { by: 'altitude', altitudeDeg: { value: 31.2, sd: 10 / 60 } },
      horizon: 'omitted',
      target: { body: 'sun', event: { name: 'june solstice' }, at: 'noon', disc: 'omitted' },
    })
    expect(targetOf('{body: sun, event: equinox, at: noon, disc: centre}', '{altitude: -2°}')).toMatchObject({
      disc: { part: 'centre' },
    })
  })

  test('an altitude without an uncertainty has none, and the zenith is one', () => {
    const at = (altitude: string) =>
      lineOf('{body: sun, event: june solstice, at: noon}', `{altitude: ${altitude}}`).direction
    expect(at('90°')).toEqual({ by: 'altitude', altitudeDeg: { value: 90, sd: 'omitted' } })
    expect(at('−5° ± unknown')).toEqual({ by: 'altitude', altitudeDeg: { value: -5, sd: 'unknown' } })
  })
})

describe('the Moon', () => {
  test.each([
    ['northern major standstill', { side: 'northern', size: 'major' }],
    ['Northern minor Standstill', { side: 'northern', size: 'minor' }],
    ['southern-major-standstill', { side: 'southern', size: 'major' }],
    ['southern minor standstill', { side: 'southern', size: 'minor' }],
  ])('%s', (event, standstill) => {
    expect(targetOf(`{body: Moon, event: ${event}, at: setting, disc: lower limb}`)).toEqual({
      body: 'moon',
      standstill,
      at: 'setting',
      disc: { part: 'lower limb' },
    })
  })
})

describe('a star', () => {
  test.each([
    ['Sirius', 'Sirius'],
    ['alpha CMa', 'alpha CMa'],
    ['HR 2491', 'HR 2491'],
    ['2491', '2491'],
    ['"  alpha   CMa "', 'alpha CMa'],
  ])('by %s', (body, text) => {
    expect(targetOf(`{body: ${body}, at: rising}`)).toEqual({
      body: 'star',
      star: { hr: 2491, text },
      at: 'rising',
      altitudeDeg: 'omitted',
    })
  })

  test.each([
    ['3° ± 0.5°', { value: 3, sd: 0.5 }],
    ['3°', { value: 3, sd: 'omitted' }],
    ['−1°30′ ± unknown', { value: -1.5, sd: 'unknown' }],
    ['unknown', 'unknown'],
  ])('sighted at %s', (altitude, altitudeDeg) => {
    expect(targetOf(`{body: Sirius, at: setting, altitude: ${altitude}}`)).toMatchObject({ altitudeDeg })
  })

  test.each(['upper culmination', 'lower culmination'])('at its %s, where the line is an altitude', (at) => {
    const line = lineOf(`{body: Thuban, at: ${at}}`, ALTITUDE)
    expect(line.target).toMatchObject({ body: 'star', star: { hr: 5291, text: 'Thuban' }, at })
    expect(line.direction).toMatchObject({ by: 'altitude' })
  })

  test('is looked up by its name alone, and a text too long for one is not', () => {
    const asked: string[] = []
    const findStar = (text: string) => {
      asked.push(text)
      return { suggestions: [] }
    }
    for (const body of [' Gienah   Corvi', 'x'.repeat(61)])
      readClaim(THORNMERE.replace(TARGET, `{body: "${body}", at: rising}`), { findStar })
    expect(new Set(asked)).toEqual(new Set(['Gienah Corvi']))
  })

  test('that is unknown is told with the likeliest name to write, and the others', () => {
    const findStar = () => ({ suggestions: ['Mizar', 'Mirzam', 'Izar'] })
    const text = THORNMERE.replace(TARGET, '{body: Mizzar, at: rising}')
    expect(readClaim(text, { findStar }).problems).toMatchObject([
      { suggestion: 'Mizar', expected: expect.stringMatching(/; perhaps Mirzam or Izar$/) },
    ])
  })
})

describe('two stars one above the other', () => {
  const stars = [
    { hr: 5563, text: 'Kochab' },
    { hr: 5054, text: 'Mizar' },
  ]

  test.each([
    ['', 'omitted'],
    [', above: unknown', 'unknown'],
    [', above: Kochab', 0],
    [', above: Mizar', 1],
    [', above: beta UMi', 0],
  ])('in a mapping that ends with "%s"', (end, above) => {
    const target = targetOf(`{bodies: [Kochab, Mizar], event: one above the other${end}}`)
    expect(target).toEqual({ body: 'two stars', stars, above })
  })
})

test('a file with a target of each kind, over several lines', () => {
  const text = THORNMERE.replace(
    /sightlines:\n.*\ntarget: .*\n/,
    `sightlines:
  shaft:
    altitude: 31°12′ ± 10′
    target:
      body: Thuban
      at: upper culmination
  axis:
    azimuth: 1° ± 2′
    target:
      bodies:
        - Kochab
        - Mizar
      event: one above the other
  marker: {azimuth: 57° ± 1′}
target:
  body: sun
  day: 30 days after june solstice
  at: setting
`,
  )
  const { claim, problems } = read(text)
  expect(problems).toEqual([])
  expect(claim?.sightlines.map(({ name, target }) => [name, target.body])).toEqual([
    ['shaft', 'star'],
    ['axis', 'two stars'],
    ['marker', 'sun'],
  ])
})

describe('every combination of words that the schema allows is read', () => {
  const kinds = ((CLAIM_SCHEMA.properties as Record<string, Schema>).target!.anyOf as Schema[]).map(
    ({ properties }) => properties as Record<string, { enum?: readonly string[] }>,
  )
  const combinations = kinds.flatMap(({ body, bodies, event, at }) => {
    const who = bodies === undefined ? `body: ${body?.enum?.[0] ?? 'Sirius'}` : 'bodies: [Kochab, Mizar]'
    const events = event?.enum?.map((word) => `, event: ${word}`) ?? ['']
    const places = at?.enum?.map((word) => `, at: ${word}`) ?? ['']
    return events.flatMap((what) => places.map((where) => `{${who}${what}${where}}`))
  })

  test('there are 27 of them', () => {
    // 4 events of the Sun at 3 places, both solstices at 2, 4 of the Moon at 2, a star at 4, two stars in 1 way.
    expect(combinations).toHaveLength(12 + 2 + 8 + 4 + 1)
  })

  test.each(combinations)('%s', (target) => {
    const isHigh = /noon|culmination/.test(target)
    const line = /to december/.test(target) ? SPAN : isHigh ? ALTITUDE : DIRECTION
    expect(isOnMeridian(targetOf(target, line))).toBe(isHigh)
  })
})

test.each(Object.entries(TARGET_EXAMPLES))('the example that messages give is right: %s', (body, target) => {
  expect(targetOf(target, body === 'sun at both solstices' ? SPAN : DIRECTION).body).toBe(body)
})

test('without a target that can be read a line is not told what it should measure', () => {
  for (const line of [DIRECTION, ALTITUDE, '{altitude: 31°, horizon: 2°}']) {
    const text = thornmereWith('{from: hearthstone, to: east-pillar, horizon: 1°30′ ± 2′}', line)
    const { problems } = read(text.replace(TARGET, '{body: Nibelheim, at: upper culmination}'))
    expect(problems.map(({ code }) => code)).toEqual(['unknown-body'])
  }
})

test('north is of no use where only altitudes are measured', () => {
  const text = thornmereWith('{from: hearthstone, to: east-pillar, horizon: 1°30′ ± 2′}', ALTITUDE)
  const { problems } = read(`${text.replace('at: rising', 'at: noon')}north: unknown\n`)
  expect(problems).toMatchObject([{ code: 'unused-key', path: 'north', expected: 'a file without it' }])
})
