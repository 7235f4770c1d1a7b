import { expect, test } from 'vitest'
import { KEYS } from '../../src/claim/keys.ts'
import { newClaim } from '../../src/claim/new-claim.ts'
import { read } from './read.ts'

/** The template with every optional key in use, as its first lines tell people to do it. */
const FULL = newClaim().replace(/^( *)#(?=[^ \n])/gm, '$1')

test('the claim file to fill in is sound as it stands', () => {
  const { claim, problems } = read(newClaim())
  expect(problems).toEqual([])
  expect(claim?.structure.name).toBe('Oskendale round house')
})

test('with every optional key in use it is sound too, but for the air that a refraction replaces', () => {
  const { claim, problems } = read(FULL)
  expect(problems.map(({ path }) => path)).toEqual([
    'atmosphere.temperature',
    'atmosphere.pressure',
    'atmosphere.humidity',
    'atmosphere.lapse',
  ])
  expect(new Set(problems.map(({ code }) => code))).toEqual(new Set(['unused-key']))
  expect(claim?.points.size).toBe(7)
  expect(claim?.sightlines).toHaveLength(14)
  const kinds = claim?.sightlines.map(({ target }) => ('event' in target ? target.event.name : target.body))
  expect(new Set(kinds)).toEqual(
    new Set(['december solstice', 'sun at both solstices', 'equinox', 'day', 'moon', 'star', 'two stars']),
  )
})

test('it shows every key that is read', () => {
  const shown = new Set([...FULL.matchAll(/(?:^ *(?:- )?|[{,] *)([a-z_]+):/gm)].map(([, key]) => key))
  const read = Object.values(KEYS)
    .flatMap((table) => Object.entries(table))
    .filter(([, use]) => use === 'required' || use === 'optional')
    .map(([key]) => key)
  expect(read.filter((key) => !shown.has(key))).toEqual([])
})

test('no line is longer than 110 columns, and none holds a tab', () => {
  for (const line of newClaim().split('\n')) {
    expect([...line].length).toBeLessThanOrEqual(110)
    expect(line).not.toContain('\t')
  }
})

test('it says which Markdown the notes may hold', () => {
  for (const word of ['paragraphs', 'emphasis', 'lists', 'links', 'code', 'quotations'])
    expect(newClaim()).toMatch(new RegExp(`Markdown:.*\\b${word}\\b`))
})
