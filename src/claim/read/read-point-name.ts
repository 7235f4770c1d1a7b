import { nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import { type Context, type Field, reportError } from './field.ts'
import type { ReadPoints } from './read-points.ts'
import { scalarText } from './read-text.ts'

const SHOWN = 8

/** Reads the name of a point of the survey; null, with the problem reported, where there is no such point. */
export function readPointName(field: Field, points: ReadPoints, context: Context): string | null {
  const name = scalarText(field, context, 'the name of a point')
  if (name === null || !points.isWhole || points.byName.has(name)) return name
  const names = [...points.byName.keys()]
  const more = names.length > SHOWN ? ` and ${names.length - SHOWN} more` : ''
  const known =
    names.length === 0
      ? 'a point described under points'
      : `one of ${names.slice(0, SHOWN).join(', ')}${more}`
  reportError(context, field, 'unknown-point', `there is no point ${quoted(name)}`, {
    expected: points.isStated ? known : 'the key points, which describes it',
    suggestion: nearMiss(name, names),
  })
  return null
}
