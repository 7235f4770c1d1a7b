import { quoted } from '../../quantity/quoted.ts'
import type { Direction } from '../claim.ts'
import type { KEYS } from '../keys.ts'
import { checkBreadth } from './check-breadth.ts'
import { type Context, type Field, reportError } from './field.ts'
import { checkJoin } from './join-points.ts'
import { type Fields, reportMissingKey } from './read-mapping.ts'
import { readPointName } from './read-point-name.ts'
import { readSighted } from './read-sighted.ts'
import type { Surroundings } from './surroundings.ts'
import { warnNear } from './warn-near.ts'

/** Reads a line from point to point. Both have to be described, of kinds that can be joined, and to stand apart. */
export function readEndpoints(
  line: Field,
  fields: Fields<keyof typeof KEYS.sightline>,
  around: Surroundings,
  context: Context,
): Direction | null {
  const [from, to] = (['from', 'to'] as const).map((key) => {
    const field = fields.get(key)
    if (field !== undefined) return readPointName(field, around.points, context)
    if (!fields.has(key)) reportMissingKey(line, key, 'the name of a point', context)
    return null
  })
  const ends = { from: from ?? null, to: to ?? null }
  const sighted = readSighted(fields.get('sighted'), ends, around.points, context)
  if (from == null || to == null) return null
  const end = fields.get('to') ?? line
  if (from !== to) {
    checkJoin(end, from, to, around, context)
    warnNear(end, from, to, around.points, context)
    const direction = { by: 'points', from, to, sighted } as const
    checkBreadth(direction, { from: fields.get('from') ?? line, to: end }, around.points, context)
    return direction
  }
  reportError(context, end, 'line-to-itself', `${quoted(line.name)} runs from ${quoted(from)} to itself`, {
    expected: 'another point than the one it begins at',
  })
  return null
}
