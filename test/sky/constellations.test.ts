import * as Astronomy from 'astronomy-engine'
import { expect, test } from 'vitest'
import { CONSTELLATIONS } from '../../src/sky/constellations.ts'

/** Every constellation that another program finds on a grid of the sky, as `symbol name`. */
function foundOnTheSky(): string[] {
  const found = new Set<string>()
  for (let dec = -89; dec <= 89; dec += 2)
    for (let ra = 0; ra < 24; ra += 0.1) {
      const { symbol, name } = Astronomy.Constellation(ra, dec)
      found.add(`${symbol} ${name}`)
    }
  return [...found].sort()
}

/** Three names that that program misspells; the IAU's own list has Antlia, Camelopardalis and Piscis Austrinus. */
const MISSPELT: Readonly<Record<string, string>> = {
  'Ant Antlia': 'Ant Antila',
  'Cam Camelopardalis': 'Cam Camelopardis',
  'PsA Piscis Austrinus': 'PsA Pisces Austrinus',
}

const withoutAccents = (text: string) => text.normalize('NFD').replace(/\p{M}/gu, '')

test('the constellations are those of another program', () => {
  const ours = CONSTELLATIONS.map(({ abbreviation, name }) => `${abbreviation} ${withoutAccents(name)}`)
  expect(ours.map((row) => MISSPELT[row] ?? row).sort()).toEqual(foundOnTheSky())
  expect(ours).toHaveLength(88)
})

test('a genitive begins as its name does, and no word names two constellations', () => {
  const words = new Map<string, string>()
  for (const { abbreviation, name, genitive } of CONSTELLATIONS) {
    expect(genitive.slice(0, 2)).toBe(name.slice(0, 2))
    for (const word of [abbreviation, name, genitive].map((held) => held.toLowerCase())) {
      expect(words.get(word) ?? abbreviation, word).toBe(abbreviation)
      words.set(word, abbreviation)
    }
  }
})
