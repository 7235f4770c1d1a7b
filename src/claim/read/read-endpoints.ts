import { nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Direction, LocalPoint } from '../claim.ts'
import type { KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { type Fields, reportMissingKey } from './read-mapping.ts'
import type { ReadPoints } from './read-points.ts'
import { scalarText } from './read-text.ts'

/** Reads a line from point to point. Both have to be described, and to stand apart on the plan. */
export function readEndpoints(
  line: Field,
  fields: Fields<keyof typeof KEYS.sightline>,
  around: { points: ReadPoints | null; hasPoints: boolean },
  context: Context,
): Direction | null {
  const [from, to] = (['from', 'to'] as const).map((key) => {
    const field = fields.get(key)
    if (field !== undefined) return readPointName(field, around, context)
    if (!fields.has(key)) reportMissingKey(line, key, 'the name of a point', context)
    return null
  })
  if (from == null || to == null) return null
  const end = fields.get('to') ?? line
  if (from === to) {
    reportError(context, end, 'line-to-itself', `${quoted(line.name)} runs from ${quoted(from)} to itself`, {
      expected: 'another point than the one it begins at',
    })
    return null
  }
  if (coincide(around.points?.get(from), around.points?.get(to)))
    reportError(
      context,
      end,
      'points-coincide',
      `${quoted(from)} and ${quoted(to)} stand at the same place`,
      {
        expected: 'two points that differ in east or north',
      },
    )
  return { by: 'points', from, to }
}

function readPointName(
  field: Field,
  { points, hasPoints }: { points: ReadPoints | null; hasPoints: boolean },
  context: Context,
): string | null {
  const name = scalarText(field, context, 'the name of a point')
  const isUntold = points === null && hasPoints
  if (name === null || isUntold || points?.has(name) === true) return name
  const names = [...(points?.keys() ?? [])]
  const known = names.length === 0 ? 'a point described under points' : `one of ${names.join(', ')}`
  reportError(context, field, 'unknown-point', `there is no point ${quoted(name)}`, {
    expected: hasPoints ? known : 'the key points, which describes it',
    suggestion: nearMiss(name, names),
  })
  return null
}

function coincide(a: LocalPoint | null | undefined, b: LocalPoint | null | undefined): boolean {
  return a != null && b != null && a.eastM === b.eastM && a.northM === b.northM
}
