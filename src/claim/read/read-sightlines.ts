import { isMap } from 'yaml'
import { HORIZON_ALTITUDE } from '../../quantity/angle-kind.ts'
import type { Measured } from '../../quantity/measured.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { Sightline, Target } from '../claim.ts'
import { INSTEAD, KEYS, TARGET_EXAMPLES } from '../keys.ts'
import { isOnMeridian } from '../on-meridian.ts'
import { type Context, type Field, reportError } from './field.ts'
import { ALTITUDE_UNCERTAINTY } from './kinds.ts'
import { measuredAngle } from './measured-angle.ts'
import { readDirection } from './read-direction.ts'
import { readMapping } from './read-mapping.ts'
import { readNames } from './read-names.ts'
import type { ReadPoints } from './read-points.ts'
import { readStatable } from './read-quantity.ts'
import { readTarget } from './read-target.ts'

const ONE_LINE = 'a name for each line, such as midsummer: {azimuth: 57°54′28″ ± 1′, horizon: 1°30′ ± 2′}'

/**
 * What the sightlines refer to. `points` is null where none can be told, `hasPoints` whether the file has the key;
 * `shared` is the top-level target, `hasShared` is true also where it cannot be read.
 */
export interface Surroundings {
  points: ReadPoints | null
  hasPoints: boolean
  shared: Target | null
  hasShared: boolean
}

/** Reads the sightlines, in the order of the file. */
export function readSightlines(
  field: Field | undefined,
  around: Surroundings,
  context: Context,
): readonly Sightline[] {
  if (field === undefined) return []
  const entries = readNames(field, context, ONE_LINE)
  if (isMap(field.node) && field.node.items.length === 0)
    reportError(context, field, 'empty-value', `${quoted(field.name)} names no line`, {
      expected: ONE_LINE,
      at: field.keyAt,
    })
  return (entries ?? []).map((entry) => readSightline(entry, around, context)).filter((line) => line !== null)
}

function readSightline(field: Field, around: Surroundings, context: Context): Sightline | null {
  const fields = readMapping(field, KEYS.sightline, context, { instead: INSTEAD.sightline })
  if (fields === null) return null
  const target = fields.has('target') ? readTarget(fields.get('target'), context) : around.shared
  if (!fields.has('target') && !around.hasShared) reportNoTarget(field, context)
  const direction = readDirection(field, fields, target, around, context)
  const meetsHorizon = target === null || !isOnMeridian(target)
  const horizonDeg = meetsHorizon ? readHorizon(fields.get('horizon'), context) : 'omitted'
  return direction === null || target === null ? null : { name: field.name, direction, horizonDeg, target }
}

function reportNoTarget(field: Field, context: Context): void {
  const message = `${quoted(field.name)} has no \`target\`, and neither has the file`
  const expected = `a target, such as ${TARGET_EXAMPLES.sun}`
  reportError(context, field, 'missing-key', message, { expected, at: field.keyAt })
}

function readHorizon(field: Field | undefined, context: Context): Measured | Unstated {
  const expected = 'an altitude such as 1°30′ ± 2′, or unknown'
  const read = measuredAngle(HORIZON_ALTITUDE, ALTITUDE_UNCERTAINTY)
  if (field === undefined || !isMap(field.node)) return readStatable(field, read, expected, context)
  const message = 'this version does not read a horizon of this form'
  reportError(context, field, 'not-in-this-version', message, { expected, at: field.keyAt })
  return 'omitted'
}
