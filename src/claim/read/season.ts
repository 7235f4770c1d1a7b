import { foldWord } from '../../quantity/near-miss.ts'
import type { Solstice } from '../claim.ts'

export const SOLSTICES = ['june solstice', 'december solstice'] as const satisfies readonly Solstice[]

/** Both solstices of a year, between which a span is measured. */
export const SPAN_EVENT = 'june to december solstice'

const SUMMER = new Set(['summersolstice', 'midsummer', 'midsummersolstice'])
const WINTER = new Set(['wintersolstice', 'midwinter', 'midwintersolstice'])

/** The solstices that a season means, in the northern and in the southern hemisphere; null for any other text. */
export function solsticesOfSeason(text: string): { north: Solstice; south: Solstice } | null {
  const word = foldWord(text)
  const [june, december] = SOLSTICES
  if (SUMMER.has(word)) return { north: june, south: december }
  return WINTER.has(word) ? { north: december, south: june } : null
}

/** Tells other words for both solstices of a year: `solstices`, `december to june solstice`. */
export function isBothSolstices(text: string): boolean {
  const words: readonly string[] = text.toLowerCase().match(/[a-z]+/g) ?? []
  const names = words.filter(
    (word) => !['both', 'the', 'to', 'and', 'of', 'year', 'solstice', 'solstices'].includes(word),
  )
  const isPair =
    names.length === 0 ? words.includes('solstices') : [...names].sort().join() === 'december,june'
  return isPair && words.some((word) => word.startsWith('solstice'))
}
