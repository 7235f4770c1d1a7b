import { isMap } from 'yaml'
import { AZIMUTH, HORIZON_ALTITUDE } from '../../quantity/angle-kind.ts'
import type { Measured } from '../../quantity/measured.ts'
import { quoted } from '../../quantity/quoted.ts'
import { readAngle } from '../../quantity/read-angle.ts'
import { readMeasured } from '../../quantity/read-measured.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { Sightline, Target } from '../claim.ts'
import { INSTEAD, KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { ALTITUDE_UNCERTAINTY, DIRECTION_UNCERTAINTY } from './kinds.ts'
import { readEndpoints } from './read-endpoints.ts'
import { type Fields, readMapping } from './read-mapping.ts'
import { readNames } from './read-names.ts'
import type { ReadPoints } from './read-points.ts'
import { readQuantity, readStatable } from './read-quantity.ts'
import { readTarget } from './read-target.ts'

const ONE_LINE = 'a name for each line, such as midsummer: {azimuth: 57°54′28″ ± 1′, horizon: 1°30′ ± 2′}'

type LineFields = Fields<keyof typeof KEYS.sightline>

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
  const fields = readMapping(field, KEYS.sightline, context, INSTEAD.sightline)
  if (fields === null) return null
  const direction = readDirection(field, fields, around, context)
  const horizonDeg = readHorizon(fields.get('horizon'), context)
  const target = fields.has('target') ? readTarget(fields.get('target'), context) : around.shared
  if (!fields.has('target') && !around.hasShared) reportNoTarget(field, context)
  return direction === null || target === null ? null : { name: field.name, direction, horizonDeg, target }
}

function reportNoTarget(field: Field, context: Context): void {
  const message = `${quoted(field.name)} has no \`target\`, and neither has the file`
  const expected = `a target, such as ${INSTEAD.target}`
  reportError(context, field, 'missing-key', message, { expected, at: field.keyAt })
}

function readDirection(
  field: Field,
  fields: LineFields,
  around: Surroundings,
  context: Context,
): Sightline['direction'] | null {
  const hasEndpoints = fields.has('from') || fields.has('to')
  if (!fields.has('azimuth'))
    return hasEndpoints ? readEndpoints(field, fields, around, context) : noDirection(field, context)
  const azimuthDeg = readQuantity(
    fields.get('azimuth'),
    readAzimuth,
    'an azimuth such as 49°34′18″ ± 1′',
    context,
  )
  if (!hasEndpoints) return azimuthDeg === null ? null : { by: 'azimuth', azimuthDeg }
  reportError(context, field, 'direction-twice', `${quoted(field.name)} has both an azimuth and points`, {
    expected: 'either azimuth, or from and to',
    at: field.keyAt,
  })
  return null
}

/** A line described by a key of another version has been told so already. */
function noDirection(field: Field, context: Context): null {
  const { node } = field
  const isTold = isMap(node) && ['altitude', 'angle', 'span'].some((key) => node.has(key))
  if (!isTold)
    reportError(context, field, 'missing-key', `${quoted(field.name)} has no direction`, {
      expected: 'azimuth, or from and to',
      at: field.keyAt,
    })
  return null
}

function readHorizon(field: Field | undefined, context: Context): Measured | Unstated {
  const expected = 'an altitude such as 1°30′ ± 2′, or unknown'
  if (field === undefined || !isMap(field.node)) return readStatable(field, readAltitude, expected, context)
  const message = 'this version does not read a horizon of this form'
  reportError(context, field, 'not-in-this-version', message, { expected, at: field.keyAt })
  return 'omitted'
}

function readAzimuth(text: string) {
  return readMeasured(
    text,
    (value) => readAngle(value, AZIMUTH),
    (size) => readAngle(size, DIRECTION_UNCERTAINTY),
  )
}

function readAltitude(text: string) {
  return readMeasured(
    text,
    (value) => readAngle(value, HORIZON_ALTITUDE),
    (size) => readAngle(size, ALTITUDE_UNCERTAINTY),
  )
}
