import { foldWord, nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { EquinoxSense, SunEvent, SunTarget } from '../claim.ts'
import { EXAMPLES, type KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { type Fields, reportMissingKey, reportOutOfPlace } from './read-mapping.ts'
import { readQuantity } from './read-quantity.ts'
import { DAY_EXPECTED, readSunDay } from './read-sun-day.ts'
import { plainText } from './read-text.ts'
import { readWord } from './read-word.ts'
import { isBothSolstices, SOLSTICES, SPAN_EVENT, solsticesOfSeason } from './season.ts'

export const SUN_EVENTS = [...SOLSTICES, 'equinox', 'zenith passage'] as const
const EVENTS = {
  words: SUN_EVENTS,
  guess: (text: string) => (isBothSolstices(text) ? SPAN_EVENT : nearMiss(text, [...SUN_EVENTS, SPAN_EVENT])),
  hints: {
    'northern solstice': 'june solstice',
    'southern solstice': 'december solstice',
    equinoxes: 'equinox',
    'march equinox': 'equinox',
    'september equinox': 'equinox',
    'spring equinox': 'equinox',
    'vernal equinox': 'equinox',
    'autumn equinox': 'equinox',
    'autumnal equinox': 'equinox',
    zenith: 'zenith passage',
    'zenith transit': 'zenith passage',
  },
} as const

/** The words of `sense`, for the schema. */
export const EQUINOX_SENSES = ['declination zero', 'midway in days', 'midway in direction'] as const
const SENSES = {
  words: [...EQUINOX_SENSES, 'unknown'],
  hints: {
    declination: 'declination zero',
    'zero declination': 'declination zero',
    days: 'midway in days',
    'midway in time': 'midway in days',
    direction: 'midway in direction',
    'midway in azimuth': 'midway in direction',
  },
} as const

/** Reads the day of the year that the Sun marks: an event, or so many days from a solstice. */
export function readSunEvent(
  target: Field,
  fields: Fields<keyof typeof KEYS.sunTarget>,
  context: Context,
): SunTarget['event'] | null {
  if (fields.has('day')) return readDay(target, fields, context)
  if (!fields.has('event')) reportMissingKey(target, 'event', `${EXAMPLES.event}, or a day`, context)
  const name = readName(fields.get('event'), context)
  const sense = fields.get('sense')
  if (name === 'equinox') return { name, sense: readSense(sense, context) }
  if (sense !== undefined && name !== null) reportSense(sense, context)
  return name === null ? null : { name }
}

function readDay(
  target: Field,
  fields: Fields<keyof typeof KEYS.sunTarget>,
  context: Context,
): SunEvent | null {
  const day = readQuantity(fields.get('day'), readSunDay, DAY_EXPECTED, context)
  const sense = fields.get('sense')
  if (fields.has('event'))
    reportError(context, target, 'event-twice', `${quoted(target.name)} has both an event and a day`, {
      expected: 'either event or day',
      at: target.keyAt,
    })
  else if (sense !== undefined) reportSense(sense, context)
  return day
}

/** Summer and winter depend on the hemisphere, which a claim should not leave to its reader. */
function readName(field: Field | undefined, context: Context): (typeof SUN_EVENTS)[number] | null {
  const text = field === undefined ? null : plainText(field)
  if (field === undefined || text === null) return readWord(field, EVENTS, context)
  const season = solsticesOfSeason(text)
  if (season !== null) {
    const { north, south } = season
    const message = `${quoted(text)} falls in another month south of the equator`
    reportError(context, field, 'unknown-word', message, {
      expected: `${north} (in the north) or ${south} (in the south)`,
      suggestion: `${north} or ${south}`,
    })
    return null
  }
  if (foldWord(text) === 'solstice') {
    const message = `${quoted(text)} does not say which of the two`
    reportError(context, field, 'unknown-word', message, {
      expected: SOLSTICES.join(' or '),
      suggestion: SOLSTICES.join(' or '),
    })
    return null
  }
  if (!/standstill|lunistice/i.test(text)) return readWord(field, EVENTS, context)
  reportError(context, field, 'unknown-word', `${quoted(text)} is an event of the Moon, not of the Sun`, {
    expected: `body: moon, or one of ${SUN_EVENTS.join(', ')}`,
  })
  return null
}

/** In which sense an equinox is meant; null, with the problem reported, becomes `omitted`. */
function readSense(field: Field | undefined, context: Context): EquinoxSense | 'unknown' | 'omitted' {
  return readWord(field, SENSES, context) ?? 'omitted'
}

function reportSense(field: Field, context: Context): void {
  const message = '`sense` has no place here: it tells which kind of equinox is meant'
  reportOutOfPlace(field, { message, expected: 'sense beside event: equinox only' }, context)
}
