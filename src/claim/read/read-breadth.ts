import { quoted } from '../../quantity/quoted.ts'
import { readUnit } from '../../quantity/read-unit.ts'
import type { Point } from '../claim.ts'
import type { Context } from './field.ts'
import type { PointKey, PointKinds } from './point-kinds.ts'
import { type Fields, reportOutOfPlace } from './read-mapping.ts'
import { readQuantity } from './read-quantity.ts'
import { readWord } from './read-word.ts'

export const POINT_FORMS = ['post', 'gap'] as const
const FORMS = {
  words: POINT_FORMS,
  hints: {
    pillar: 'post',
    stone: 'post',
    column: 'post',
    tower: 'post',
    door: 'gap',
    doorway: 'gap',
    gate: 'gap',
    opening: 'gap',
    window: 'gap',
    notch: 'gap',
  },
} as const

/** Reads how broad a thing is across the line, and whether it is a post or a gap between two; null for a point. */
export function readBreadth(fields: Fields<PointKey>, kinds: PointKinds, context: Context): Point['breadth'] {
  const form = fields.get('form')
  const word = readWord(form, FORMS, context)
  if (form !== undefined && !fields.has('width')) {
    const message = `${quoted(form.name)} has no place here: it tells what has a \`width\``
    reportOutOfPlace(form, { message, expected: `width: ${kinds.width.example} beside it` }, context)
  }
  const read = (text: string) => readUnit(text, kinds.width)
  const widthM = readQuantity(fields.get('width'), read, `a length such as ${kinds.width.example}`, context)
  return widthM === null ? null : { form: word ?? 'post', widthM }
}
