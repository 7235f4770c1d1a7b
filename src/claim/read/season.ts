import { foldWord } from '../../quantity/near-miss.ts'
import type { Solstice } from '../claim.ts'

export const SOLSTICES = ['june solstice', 'december solstice'] as const satisfies readonly Solstice[]

const SUMMER = new Set(['summersolstice', 'midsummer', 'midsummersolstice'])
const WINTER = new Set(['wintersolstice', 'midwinter', 'midwintersolstice'])

/** The solstices that a season means, in the northern and in the southern hemisphere; null for any other text. */
export function solsticesOfSeason(text: string): { north: Solstice; south: Solstice } | null {
  const word = foldWord(text)
  const [june, december] = SOLSTICES
  if (SUMMER.has(word)) return { north: june, south: december }
  return WINTER.has(word) ? { north: december, south: june } : null
}
