import { readAngle } from '../../quantity/read-angle.ts'
import { readUncertainty } from '../../quantity/read-uncertainty.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { North } from '../claim.ts'
import { KEYS } from '../keys.ts'
import type { Context, Field } from './field.ts'
import { DIRECTION_UNCERTAINTY } from './kinds.ts'
import { readMapping } from './read-mapping.ts'
import { isUnknown, readQuantity } from './read-quantity.ts'
import { plainText } from './read-text.ts'
import { readWord } from './read-word.ts'

const WAYS = { words: ['compass', 'gps', 'sun', 'plan'], hints: { map: 'plan', gnss: 'gps' } } as const

/** Reads how the plan's north was found, or `unknown`. */
export function readNorth(field: Field | undefined, context: Context): North | Unstated {
  if (field === undefined) return 'omitted'
  if (isUnknown(plainText(field) ?? '')) return 'unknown'
  const fields = readMapping(field, KEYS.north, context)
  if (fields === null) return 'omitted'
  const from = readWord(fields.get('from'), WAYS, context)
  const read = (text: string) => readUncertainty(text, (size) => readAngle(size, DIRECTION_UNCERTAINTY))
  const uncertaintyDeg = readQuantity(
    fields.get('uncertainty'),
    read,
    'an angle such as 0.5°, or unknown',
    context,
  )
  return from === null ? 'omitted' : { from, uncertaintyDeg: uncertaintyDeg ?? 'omitted' }
}
