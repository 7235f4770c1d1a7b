import { misread, trimmedStretch } from '../../quantity/misread.ts'
import { plainCharacters } from '../../quantity/plain-characters.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Reading } from '../../quantity/reading.ts'

export const ZONE_EXPECTED = 'a zone of UTM such as UTM 55 S: its number, and N or S of the equator'

/** Reads a zone of the Universal Transverse Mercator system: `UTM 55 S`, `33N`; S is south of the equator. */
export function readUtmZone(text: string): Reading<{ number: number; hemisphere: 'N' | 'S' }> {
  const plain = plainCharacters(text).trim()
  const match = /^(?:utm\s*)?(?:zone\s*)?(\d{1,2})\s*([a-z]*)$/i.exec(plain)
  const number = Number(match?.[1])
  const letter = match?.[2]?.toUpperCase() ?? ''
  const name = quoted(text.trim())
  const at = trimmedStretch(text)
  if (match === null)
    return misread('not-readable', `${name} is not a zone of UTM`, at, {
      expected: ZONE_EXPECTED,
      suggestion: zoneOfEpsg(plain),
    })
  if (number < 1 || number > 60)
    return misread('out-of-range', `${name} cannot be a zone of UTM`, at, {
      expected: 'a number from 1 to 60',
    })
  const hemisphere = { N: 'N', NORTH: 'N', S: 'S', SOUTH: 'S' } as const
  if (letter === 'N' || letter === 'S' || letter === 'NORTH' || letter === 'SOUTH')
    return { ok: true, value: { number, hemisphere: hemisphere[letter] } }
  if (letter === '')
    return misread('not-readable', `${name} does not say on which side of the equator`, at, {
      expected: ZONE_EXPECTED,
      suggestion: `UTM ${number} N or UTM ${number} S`,
    })
  return misread('not-readable', `${name} is not a zone of UTM`, at, {
    expected: ZONE_EXPECTED,
    suggestion: zoneOfBand(number, letter),
  })
}

/** Bands of latitude run from C, at 80° S, to X; those before N are south. */
function zoneOfBand(number: number, letter: string): string | null {
  if (!/^[C-HJ-NP-X]$/.test(letter)) return null
  return `UTM ${number} ${letter < 'N' ? 'S' : 'N'}`
}

/** EPSG 32601 to 32660 are the northern zones on WGS 84, 32701 to 32760 the southern ones. */
function zoneOfEpsg(text: string): string | null {
  const [, side, digits] = /^(?:epsg\s*:?\s*)?32([67])(\d\d)$/i.exec(text) ?? []
  const number = Number(digits)
  return number >= 1 && number <= 60 ? `UTM ${number} ${side === '6' ? 'N' : 'S'}` : null
}
