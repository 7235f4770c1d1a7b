import { nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { NamedStar } from '../claim.ts'
import { type Context, type Field, reportError } from './field.ts'
import { scalarText } from './read-text.ts'

/** Any longer text names no star, and to hold it against all their names would take long. */
const LONGEST_NAME = 60
// The catalogue is the caller's; that it ends at magnitude 4 is in the description of the file format.
const EXPECTED = 'a star of magnitude 4 or brighter: its name (Sirius), Bayer letter (alpha CMa) or HR number'

/** The star that a text names, or null. */
export function starNamed(text: string, context: Context): NamedStar | null {
  const name = tidied(text)
  const found = name.length > LONGEST_NAME ? null : context.findStar(name)
  return found !== null && 'hr' in found ? { hr: found.hr, text: name } : null
}

/** Reads a star by its name, Bayer letter or HR number; null, with the problem reported, where there is none. */
export function readStar(field: Field, context: Context): NamedStar | null {
  const text = scalarText(field, context, EXPECTED)
  if (text === null) return null
  const star = starNamed(text, context)
  if (star === null) reportUnknownBody(field, text, [], context)
  return star
}

/** Reports a name that is no star's and none of the other bodies that may stand in its place. */
export function reportUnknownBody(
  field: Field,
  text: string,
  otherBodies: readonly string[],
  context: Context,
): void {
  const body = nearMiss(text, otherBodies)
  const [suggestion = null, ...others] = [...(body === null ? [] : [body]), ...starsLike(text, context)]
  const perhaps = others.length === 0 ? '' : `; perhaps ${others.join(' or ')}`
  const expected = [...otherBodies, `${EXPECTED}${perhaps}`].join(', or ')
  const what = otherBodies.length === 0 ? 'is not a star' : 'is neither the Sun nor the Moon nor a star'
  reportError(context, field, 'unknown-body', `${quoted(text)} ${what} known here`, { expected, suggestion })
}

function starsLike(text: string, { findStar }: Context): readonly string[] {
  const name = tidied(text)
  const found = name.length > LONGEST_NAME ? null : findStar(name)
  return found !== null && 'suggestions' in found ? found.suggestions : []
}

function tidied(text: string): string {
  return text.replace(/\s+/g, ' ').trim()
}
