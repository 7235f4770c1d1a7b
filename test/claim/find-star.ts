import type { StarFinder } from '../../src/claim/star-finder.ts'
import { foldWord, nearMiss } from '../../src/quantity/near-miss.ts'

/** A few stars by their HR numbers, as the Bright Star Catalogue, 5th edition (Hoffleit & Warren 1991), has them. */
const STARS: ReadonlyMap<string, number> = new Map([
  ['Sirius', 2491],
  ['alpha CMa', 2491],
  ['HR 2491', 2491],
  ['2491', 2491],
  ['Thuban', 5291],
  ['Kochab', 5563],
  ['beta UMi', 5563],
  ['Mizar', 5054],
  ['Vega', 7001],
])

/** Stands in for the catalogue in tests of the reader, which is handed a finder and knows no stars. */
export const findStar: StarFinder = (text) => {
  const names = [...STARS.keys()]
  const name = names.find((known) => foldWord(known) === foldWord(text))
  const hr = name === undefined ? undefined : STARS.get(name)
  if (hr !== undefined) return { hr }
  const suggestion = nearMiss(text, names)
  return { suggestions: suggestion === null ? [] : [suggestion] }
}
