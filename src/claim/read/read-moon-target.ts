import { foldWord, nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { MoonTarget } from '../claim.ts'
import { KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { outOfPlaceInTarget } from './out-of-place-in-target.ts'
import { DISC_EXPECTED, readDisc } from './read-disc.ts'
import { readMapping } from './read-mapping.ts'
import { readStatable } from './read-quantity.ts'
import { SUN_EVENTS } from './read-sun-event.ts'
import { plainText } from './read-text.ts'
import { readWord } from './read-word.ts'
import { solsticesOfSeason } from './season.ts'

type Standstill = MoonTarget['standstill']

const SIDES = ['northern', 'southern'] as const
const SIZES = ['major', 'minor'] as const
export const STANDSTILLS = SIDES.flatMap((side) => SIZES.map((size) => `${side} ${size} standstill` as const))
export const MOON_MOMENTS = ['rising', 'setting'] as const

const EVENTS = { words: STANDSTILLS, guess: likelyStandstills }
const MOMENTS = {
  words: MOON_MOMENTS,
  hints: {
    rise: 'rising',
    rises: 'rising',
    moonrise: 'rising',
    set: 'setting',
    sets: 'setting',
    moonset: 'setting',
  },
} as const

/** Reads a target of the Moon: one of the four standstills, rising or setting. */
export function readMoonTarget(field: Field, context: Context): MoonTarget | null {
  const outOfPlace = outOfPlaceInTarget(field, 'moon')
  const examples = { event: `event: ${STANDSTILLS[0]}` }
  const fields = readMapping(field, KEYS.moonTarget, context, { outOfPlace, examples })
  if (fields === null) return null
  const standstill = readStandstill(fields.get('event'), context)
  const at = readWord(fields.get('at'), MOMENTS, context)
  const disc = readStatable(fields.get('disc'), readDisc, DISC_EXPECTED, context)
  return standstill === null || at === null ? null : { body: 'moon', standstill, at, disc }
}

function readStandstill(field: Field | undefined, context: Context): Standstill | null {
  const text = field === undefined ? null : plainText(field)
  if (field !== undefined && text !== null && isOfTheSun(text)) {
    reportError(context, field, 'unknown-word', `${quoted(text)} is an event of the Sun, not of the Moon`, {
      expected: `body: sun, or one of ${STANDSTILLS.join(', ')}`,
    })
    return null
  }
  const word = readWord(field, EVENTS, context)
  if (word === null) return null
  const [side, size] = word.split(' ') as [Standstill['side'], Standstill['size'], 'standstill']
  return { side, size }
}

function isOfTheSun(text: string): boolean {
  return SUN_EVENTS.some((event) => foldWord(event) === foldWord(text)) || solsticesOfSeason(text) !== null
}

/** `major northern standstill`, or `north minor`, with its words put right; two where one word is lacking. */
function likelyStandstills(text: string): string | null {
  const words = text.split(/[\s_-]+/).map((word) => nearMiss(word, [...SIDES, 'north', 'south', ...SIZES], 2))
  const side = SIDES.find((name) => words.includes(name) || words.includes(name.slice(0, 5)))
  const size = SIZES.find((name) => words.includes(name))
  if (side === undefined && size === undefined) return null
  return STANDSTILLS.filter((word) => word.includes(side ?? '') && word.includes(size ?? '')).join(' or ')
}
