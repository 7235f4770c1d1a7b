import { isMap } from 'yaml'
import { quoted } from '../../quantity/quoted.ts'
import type { SightedPart } from '../claim.ts'
import { KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { readMapping } from './read-mapping.ts'
import type { ReadPoints } from './read-points.ts'
import { readWord } from './read-word.ts'

type Ends<T> = { from: T; to: T }

const PARTS = {
  axis: 'middle',
  middle: 'middle',
  'left edge': 'left',
  'right edge': 'right',
  'left side': 'left',
  'right side': 'right',
  unknown: 'unknown',
} as const
type Word = keyof typeof PARTS

/** The words for what of a post or a gap is sighted. */
export const SIGHTED_WORDS = Object.keys(PARTS) as Word[]
const WORDS = {
  words: SIGHTED_WORDS,
  hints: {
    centre: 'middle',
    center: 'middle',
    centreline: 'axis',
    left: 'left edge',
    right: 'right edge',
    'left hand edge': 'left edge',
    'right hand edge': 'right edge',
    'left jamb': 'left side',
    'right jamb': 'right side',
  },
} as const satisfies { words: readonly Word[]; hints: Readonly<Record<string, Word>> }

/** Reads what of the two ends of a line is sighted; a plain word is of the far one. */
export function readSighted(
  field: Field | undefined,
  ends: Ends<string | null>,
  points: ReadPoints,
  context: Context,
): Ends<SightedPart> {
  const nothing: Ends<SightedPart> = { from: 'omitted', to: 'omitted' }
  if (field === undefined) return nothing
  if (!isMap(field.node)) return { ...nothing, to: readPart(field, ends.to, points, context) }
  const fields = readMapping(field, KEYS.sighted, context)
  if (fields === null) return nothing
  return {
    from: readPart(fields.get('from'), ends.from, points, context),
    to: readPart(fields.get('to'), ends.to, points, context),
  }
}

function readPart(
  field: Field | undefined,
  name: string | null,
  points: ReadPoints,
  context: Context,
): SightedPart {
  if (field === undefined) return 'omitted'
  const word = readWord<Word>(field, WORDS, context)
  const end = name === null ? undefined : points.byName.get(name)
  if (word === null) return 'omitted'
  if (end === undefined || end.fields === null || end.fields.has('width')) return PARTS[word]
  // Of what has no width there is nothing to know.
  if (PARTS[word] !== 'unknown') reportWithoutWidth(field, end.field.name, PARTS[word], context)
  return 'omitted'
}

function reportWithoutWidth(
  field: Field,
  name: string,
  part: 'middle' | 'left' | 'right',
  context: Context,
): void {
  const isMiddle = part === 'middle'
  const why = isMiddle
    ? ': it is sighted itself, and nothing need be said'
    : ', so that nothing of it is left or right'
  reportError(context, field, 'out-of-place', `${quoted(name)} has no width${why}`, {
    expected: `${isMiddle ? 'the line without sighted' : 'the line without it'}, or width: 60 cm in the point`,
  })
}
