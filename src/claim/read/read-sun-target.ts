import { quoted } from '../../quantity/quoted.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { Disc, SunTarget } from '../claim.ts'
import { KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { outOfPlaceInTarget } from './out-of-place-in-target.ts'
import { DISC_EXPECTED, DISC_PARTS, readDisc } from './read-disc.ts'
import { readMapping } from './read-mapping.ts'
import { readStatable } from './read-quantity.ts'
import { readSunEvent } from './read-sun-event.ts'
import { plainText } from './read-text.ts'
import { readWord } from './read-word.ts'

export const SUN_MOMENTS = ['rising', 'setting', 'noon'] as const
/** Words for where the Sun stands. */
export const SUN_WORDS = {
  words: SUN_MOMENTS,
  hints: {
    rise: 'rising',
    rises: 'rising',
    sunrise: 'rising',
    set: 'setting',
    sets: 'setting',
    sunset: 'setting',
    midday: 'noon',
    meridian: 'noon',
    transit: 'noon',
    culmination: 'noon',
    'upper culmination': 'noon',
  },
} as const

/** Reads a target of the Sun: a day of the year, and where the Sun stands on it. */
export function readSunTarget(field: Field, context: Context): SunTarget | null {
  const outOfPlace = outOfPlaceInTarget(field, 'sun')
  const fields = readMapping(field, KEYS.sunTarget, context, { outOfPlace })
  if (fields === null) return null
  const event = readSunEvent(field, fields, context)
  const at = readWord(fields.get('at'), SUN_WORDS, context)
  const disc = readStatable(fields.get('disc'), readDisc, DISC_EXPECTED, context)
  if (at === 'noon') refuseShowing(disc, fields.get('disc'), context)
  return event === null || at === null ? null : { body: 'sun', event, at, disc }
}

/** At noon nothing hides a part of the disc. */
function refuseShowing(disc: Disc | Unstated, field: Field | undefined, context: Context): void {
  if (field === undefined || typeof disc === 'string' || disc.part !== 'showing') return
  const message = `${quoted(plainText(field) ?? '')} needs a horizon, which plays no part at noon`
  reportError(context, field, 'out-of-place', message, {
    expected: `${DISC_PARTS.join(', ')}, or unknown: the part whose altitude was measured`,
  })
}
