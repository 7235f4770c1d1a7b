import { isMap } from 'yaml'
import { HORIZON_ALTITUDE } from '../../quantity/angle-kind.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { Horizon } from '../claim.ts'
import { KEYS } from '../keys.ts'
import { checkSlope } from './check-slope.ts'
import { type Context, type Field, reportError } from './field.ts'
import { ALTITUDE_UNCERTAINTY, EYE_HEIGHT, HORIZON_DISTANCE, LENGTH_UNCERTAINTY, RISE } from './kinds.ts'
import { measuredAngle } from './measured-angle.ts'
import { measuredLength } from './measured-length.ts'
import { readHorizonPoint } from './read-horizon-point.ts'
import {
  type Fields,
  type OutOfPlace,
  readMapping,
  reportMissingKey,
  reportOutOfPlace,
} from './read-mapping.ts'
import { readProfile } from './read-profile.ts'
import { readQuantity, readStatable } from './read-quantity.ts'
import type { Surroundings } from './surroundings.ts'

type HorizonFields = Fields<keyof typeof KEYS.horizon>

/**
 * The line that meets the horizon: `from` where it begins (null where that cannot be told), or none where it runs
 * between no points; its azimuth where that is measured. One side of a span of which only the angle is known has no
 * direction.
 */
export interface LineOfSight {
  name: string
  from?: string | null
  azimuthDeg?: number
  isOfAngle?: boolean
}

const EXPECTED =
  'an altitude such as 1°30′ ± 2′, {distance: 8 km ± 100 m, rise: 120 m ± 5 m}, {point: peak}, {sea: 25 m}, {profile: skyline.csv}, or unknown'
const FORMS = [['distance', 'rise'], ['point'], ['sea'], ['profile']] as const

/** Reads a horizon: its altitude, or what its altitude follows from. */
export function readHorizon(
  field: Field | undefined,
  line: LineOfSight,
  around: Surroundings,
  context: Context,
): Horizon | Unstated {
  if (field === undefined) return 'omitted'
  if (!isMap(field.node)) return readAltitude(field, context)
  const fields = readMapping(field, KEYS.horizon, context, { outOfPlace: altitudeInside })
  if (fields === null) return 'omitted'
  const [form, ...others] = FORMS.filter((keys) => keys.some(fields.has))
  if (form === undefined && field.node.items.length === 0)
    reportError(context, field, 'empty-value', `${quoted(field.name)} says nothing`, {
      expected: EXPECTED,
      at: field.keyAt,
    })
  if (form === undefined) return 'omitted'
  for (const other of others) refuseSecond(other, form, fields, context)
  const horizon = readForm(field, form, fields, line, around, context)
  return horizon ?? 'omitted'
}

function readForm(
  field: Field,
  form: (typeof FORMS)[number],
  fields: HorizonFields,
  line: LineOfSight,
  around: Surroundings,
  context: Context,
): Horizon | null {
  if (form[0] === 'distance') return readDistance(field, fields, context)
  const entry = fields.get(form[0])
  if (entry === undefined) return null
  if (form[0] === 'point') return readHorizonPoint(entry, line, around, context)
  return form[0] === 'sea' ? readSea(entry, context) : readProfile(entry, line, context)
}

function readAltitude(field: Field, context: Context): Horizon | Unstated {
  const read = measuredAngle(HORIZON_ALTITUDE, ALTITUDE_UNCERTAINTY)
  const altitudeDeg = readStatable(field, read, EXPECTED, context)
  return typeof altitudeDeg === 'string' ? altitudeDeg : { by: 'altitude', altitudeDeg }
}

function readDistance(field: Field, fields: HorizonFields, context: Context): Horizon | null {
  const [distanceM, riseM] = (['distance', 'rise'] as const).map((key) => {
    const kind = key === 'rise' ? RISE : HORIZON_DISTANCE
    if (!fields.has(key)) reportMissingKey(field, key, `${key}: ${kind.example}`, context)
    const read = measuredLength(kind, LENGTH_UNCERTAINTY)
    return readQuantity(fields.get(key), read, `a length such as ${kind.example}`, context)
  })
  const rise = fields.get('rise')
  if (distanceM == null || riseM == null || rise === undefined) return null
  const what = 'such a rise at such a distance'
  const isSound = checkSlope(rise, { distanceM: distanceM.value, riseM: riseM.value, what }, context)
  return isSound ? { by: 'distance', distanceM, riseM } : null
}

function readSea(field: Field, context: Context): Horizon | null {
  const read = measuredLength(EYE_HEIGHT, LENGTH_UNCERTAINTY)
  const eyeM = readQuantity(field, read, 'the height of the eye above the sea, such as 25 m', context)
  return eyeM === null ? null : { by: 'sea', eyeM }
}

function refuseSecond(
  other: (typeof FORMS)[number],
  form: (typeof FORMS)[number],
  fields: HorizonFields,
  context: Context,
): void {
  const entry = other.map((key) => fields.get(key)).find((found) => found !== undefined)
  if (entry === undefined) return
  const message = `${quoted(entry.name)} has no place here: ${form.map((key) => quoted(key)).join(' and ')} tell the horizon`
  reportOutOfPlace(entry, { message, expected: 'one way to tell the horizon' }, context)
}

/** An altitude stands in the place of the mapping. */
function altitudeInside(entry: Field): OutOfPlace | null {
  if (entry.name !== 'altitude') return null
  const message = '`altitude` has no place here: an altitude is written by itself'
  return { message, expected: 'horizon: 1°30′ ± 2′' }
}
