import { quoted } from '../../quantity/quoted.ts'
import type { KEYS } from '../keys.ts'
import type { Context } from './field.ts'
import { type Fields, reportOutOfPlace } from './read-mapping.ts'

type LineKey = keyof typeof KEYS.sightline

/** Keys that some sightlines do without, told together with the reason why. */
export type Needless = readonly { keys: readonly LineKey[]; why: string }[]

/** What a line on the meridian does without. */
export const NEEDLESS_ON_MERIDIAN: Needless = [
  { keys: ['azimuth'], why: 'the direction is that of the meridian' },
  { keys: ['from', 'to', 'sighted'], why: 'the direction is that of the meridian' },
  { keys: ['span'], why: 'one altitude is measured, and no span' },
  { keys: ['horizon'], why: 'the horizon plays no part' },
]

/** What a line that is a span does without. */
export const NEEDLESS_WITH_SPAN: Needless = [
  { keys: ['azimuth'], why: 'a span is measured, and no direction' },
  { keys: ['from', 'to', 'sighted'], why: 'the points of a span stand inside it' },
  { keys: ['altitude'], why: 'an angle along the horizon is measured' },
  { keys: ['horizon'], why: 'each end of the span has a horizon of its own' },
]

/** Reports keys that a line does without, at the first of them. */
export function refuseNeedless(
  { keys, why }: Needless[number],
  fields: Fields<LineKey>,
  when: string,
  advice: { expected: string; suggestion?: string | null },
  context: Context,
): void {
  const entries = keys.map((key) => fields.get(key)).filter((entry) => entry !== undefined)
  const [entry] = entries
  if (entry === undefined) return
  const names = entries.map(({ name }) => quoted(name)).join(' and ')
  const have = entries.length === 1 ? 'has' : 'have'
  const message = `${names} ${have} no place here: ${when} ${why}`
  reportOutOfPlace(entry, { message, ...advice }, context)
}
