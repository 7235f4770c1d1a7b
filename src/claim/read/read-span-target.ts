import type { SolsticeSpanTarget } from '../claim.ts'
import { KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { outOfPlaceInTarget } from './out-of-place-in-target.ts'
import { DISC_EXPECTED, readDisc } from './read-disc.ts'
import { readMapping } from './read-mapping.ts'
import { readStatable } from './read-quantity.ts'
import { SUN_WORDS } from './read-sun-target.ts'
import { readWord } from './read-word.ts'

export const SPAN_MOMENTS = ['rising', 'setting'] as const

/** Reads a target of the Sun at both solstices, whose event has been told from the others already. */
export function readSpanTarget(field: Field, context: Context): SolsticeSpanTarget | null {
  const outOfPlace = outOfPlaceInTarget(field, 'sun at both solstices')
  const fields = readMapping(field, KEYS.spanTarget, context, { outOfPlace })
  if (fields === null) return null
  const at = readWord(fields.get('at'), SUN_WORDS, context)
  const disc = readStatable(fields.get('disc'), readDisc, DISC_EXPECTED, context)
  if (at !== 'noon') return at === null ? null : { body: 'sun at both solstices', at, disc }
  const message = '`noon` has no place here: a span lies along the horizon'
  reportError(context, fields.get('at') ?? field, 'out-of-place', message, {
    expected: SPAN_MOMENTS.join(' or '),
  })
  return null
}
