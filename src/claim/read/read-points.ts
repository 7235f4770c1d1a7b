import { readUncertainty } from '../../quantity/read-uncertainty.ts'
import { readUnit } from '../../quantity/read-unit.ts'
import type { LocalPoint } from '../claim.ts'
import { INSTEAD, KEYS } from '../keys.ts'
import type { Context, Field } from './field.ts'
import { PLAN_LENGTH, POINT_UNCERTAINTY } from './kinds.ts'
import { readMapping } from './read-mapping.ts'
import { readNames } from './read-names.ts'
import { readQuantity } from './read-quantity.ts'

/** The points of the plan; one that cannot be read is named with null, so that lines may still refer to it. */
export type ReadPoints = ReadonlyMap<string, LocalPoint | null>

/** Reads the points of the local grid; null where they cannot be told at all. */
export function readPoints(field: Field | undefined, context: Context): ReadPoints | null {
  const entries =
    field === undefined
      ? null
      : readNames(field, context, 'a name for each point, such as hearthstone: {east: 0 m, north: 0 m}')
  return entries === null ? null : new Map(entries.map((entry) => [entry.name, readPoint(entry, context)]))
}

function readPoint(field: Field, context: Context): LocalPoint | null {
  const fields = readMapping(field, KEYS.point, context, { instead: INSTEAD.point })
  if (fields === null) return null
  const length = (key: 'east' | 'north' | 'up') =>
    readQuantity(fields.get(key), (text) => readUnit(text, PLAN_LENGTH), 'a length such as 84.65 m', context)
  const [eastM, northM, upM] = [length('east'), length('north'), length('up')]
  const uncertaintyM = readQuantity(
    fields.get('uncertainty'),
    (text) => readUncertainty(text, (size) => readUnit(size, POINT_UNCERTAINTY)),
    'a length such as 5 cm, or unknown',
    context,
  )
  if (eastM === null || northM === null) return null
  return { eastM, northM, upM, uncertaintyM: uncertaintyM ?? 'omitted' }
}
