import { nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { NamedStar, StarPairTarget } from '../claim.ts'
import { KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { outOfPlaceInTarget } from './out-of-place-in-target.ts'
import { readList } from './read-list.ts'
import { readMapping } from './read-mapping.ts'
import { isUnknown } from './read-quantity.ts'
import { readStar, starNamed } from './read-star.ts'
import { scalarText } from './read-text.ts'
import { readWord } from './read-word.ts'

export const PAIR_EVENT = 'one above the other'
const EVENTS = {
  words: [PAIR_EVENT],
  hints: {
    'one above another': PAIR_EVENT,
    'above one another': PAIR_EVENT,
    'one over the other': PAIR_EVENT,
    vertical: PAIR_EVENT,
    'vertical alignment': PAIR_EVENT,
    'simultaneous transit': PAIR_EVENT,
  },
} as const
const TWO_STARS = 'a list of two stars such as [Kochab, Mizar]'

type Pair = StarPairTarget['stars']

/** Reads a target of two stars that stand one above the other. */
export function readStarPairTarget(field: Field, context: Context): StarPairTarget | null {
  const outOfPlace = outOfPlaceInTarget(field, 'two stars')
  const examples = { event: `event: ${PAIR_EVENT}` }
  const fields = readMapping(field, KEYS.starPairTarget, context, { outOfPlace, examples })
  if (fields === null) return null
  const stars = readPair(fields.get('bodies'), context)
  const event = readWord(fields.get('event'), EVENTS, context)
  const above = readAbove(fields.get('above'), stars, context)
  return stars === null || event === null ? null : { body: 'two stars', stars, above }
}

function readPair(field: Field | undefined, context: Context): Pair | null {
  const entries = readList(field, context, TWO_STARS)
  if (field === undefined || entries === null) return null
  const stars = entries.map((entry) => readStar(entry, context))
  if (entries.length !== 2) {
    const count = `${entries.length} ${entries.length === 1 ? 'star' : 'stars'}`
    reportError(context, field, 'not-two-stars', `${quoted(field.name)} lists ${count}`, {
      expected: TWO_STARS,
    })
    return null
  }
  const [first, second] = stars
  if (first == null || second == null) return null
  if (first.hr !== second.hr) return [first, second]
  reportSameStar(entries[1] ?? field, first, second, context)
  return null
}

function reportSameStar(field: Field, first: NamedStar, second: NamedStar, context: Context): void {
  const message =
    first.text === second.text
      ? `${quoted(second.text)} is named twice`
      : `${quoted(second.text)} is the same star as ${quoted(first.text)}`
  reportError(context, field, 'not-two-stars', message, { expected: 'two different stars' })
}

function readAbove(field: Field | undefined, stars: Pair | null, context: Context): 0 | 1 | Unstated {
  if (field === undefined) return 'omitted'
  const text = scalarText(field, context, 'one of the two stars, or unknown')
  if (text === null || stars === null) return 'omitted'
  if (isUnknown(text)) return 'unknown'
  const hr = starNamed(text, context)?.hr
  const index = stars.findIndex((star) => star.hr === hr)
  if (index === 0 || index === 1) return index
  const names = stars.map((star) => star.text)
  reportError(context, field, 'unknown-word', `${quoted(text)} is neither of the two stars`, {
    expected: `${names.join(', ')} or unknown`,
    suggestion: nearMiss(text, names),
  })
  return 'omitted'
}
