import { foldWord } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Target } from '../claim.ts'
import { TARGET_EXAMPLES } from '../keys.ts'
import { type Field, peek } from './field.ts'
import type { OutOfPlace } from './read-mapping.ts'
import { plainText } from './read-text.ts'
import { STAR_MOMENTS } from './star-moments.ts'

interface Reason {
  why: string
  expected: string
  suggestion?: string
}

export const ALTITUDE_IN_SIGHTLINE = 'altitude: 31°12′ ± 10′ in the sightline'

const SKYLINE: Reason = {
  why: 'what counts at a rising or setting is the altitude of the skyline',
  expected: 'horizon: 1°30′ ± 2′ in the sightline',
}
const AT_NOON: Reason = {
  why: 'at noon it is what the sightline states',
  expected: ALTITUDE_IN_SIGHTLINE,
}
const ABOVE: Reason = {
  why: 'it tells which of two stars is the upper one',
  expected: `above in a target such as ${TARGET_EXAMPLES['two stars']}`,
}
const SENSE: Reason = {
  why: 'it tells which kind of equinox is meant',
  expected: 'sense beside body: sun and event: equinox',
}
const DAY: Reason = {
  why: 'days are counted from a solstice of the Sun',
  expected: 'day in a target of the Sun',
}
const BOTH_DAYS: Reason = {
  why: 'the span is that between the two solstices',
  expected: 'either day or event: june to december solstice',
}
const NO_DISC: Reason = { why: 'a star has no disc', expected: 'the target without it' }

const REASONS: Readonly<
  Record<Target['body'], Readonly<Record<string, Reason | ((target: Field, entry: Field) => Reason)>>>
> = {
  sun: { altitude: (target) => (textOf(target, 'at') === 'noon' ? AT_NOON : SKYLINE), above: ABOVE },
  'sun at both solstices': { altitude: SKYLINE, above: ABOVE, sense: SENSE, day: BOTH_DAYS },
  moon: { altitude: SKYLINE, above: ABOVE, sense: SENSE, day: DAY },
  star: { disc: NO_DISC, event: eventOfStar, above: ABOVE, sense: SENSE, day: DAY },
  'two stars': {
    body: { why: '`bodies` names both stars', expected: 'either body or bodies' },
    at: { why: 'the moment is when the one stands above the other', expected: 'the target without it' },
    altitude: {
      why: 'what is measured is the direction in which both stand',
      expected: 'a sightline with azimuth, or from and to',
    },
    disc: NO_DISC,
    sense: SENSE,
    day: DAY,
  },
}

/** Tells the keys that another kind of target has. */
export function outOfPlaceInTarget(target: Field, body: Target['body']): (entry: Field) => OutOfPlace | null {
  const reasons = REASONS[body]
  return (entry) => {
    const reason = Object.hasOwn(reasons, entry.name) ? reasons[entry.name] : undefined
    if (reason === undefined) return null
    const { why, ...advice } = typeof reason === 'function' ? reason(target, entry) : reason
    return { message: `${quoted(entry.name)} has no place here: ${why}`, ...advice }
  }
}

function eventOfStar(target: Field, entry: Field): Reason {
  const event = foldWord(plainText(entry) ?? '')
  const why = 'a star takes no event'
  if (event === 'oneabovetheother')
    return { why: 'it takes two stars', expected: `a target such as ${TARGET_EXAMPLES['two stars']}` }
  const isMoment = STAR_MOMENTS.some((moment) => foldWord(moment) === event)
  const expected = `at, with one of ${STAR_MOMENTS.join(', ')}`
  return isMoment && peek(target, 'at') === null ? { why, expected, suggestion: 'at' } : { why, expected }
}

function textOf(target: Field, key: string): string {
  return foldWord(plainText({ ...target, node: peek(target, key) }) ?? '')
}
