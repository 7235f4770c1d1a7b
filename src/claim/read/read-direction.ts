import { isMap } from 'yaml'
import { AZIMUTH } from '../../quantity/angle-kind.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Direction, Target } from '../claim.ts'
import type { KEYS } from '../keys.ts'
import { isOnMeridian } from '../on-meridian.ts'
import { type Context, type Field, reportError } from './field.ts'
import { ALTITUDE_UNCERTAINTY, APPARENT_ALTITUDE, DIRECTION_UNCERTAINTY } from './kinds.ts'
import { measuredAngle } from './measured-angle.ts'
import { readEndpoints } from './read-endpoints.ts'
import { type Fields, reportMissingKey, reportOutOfPlace } from './read-mapping.ts'
import type { ReadPoints } from './read-points.ts'
import { isUnknown, readQuantity } from './read-quantity.ts'
import { plainText } from './read-text.ts'

type LineFields = Fields<keyof typeof KEYS.sightline>
type Points = { points: ReadPoints | null; hasPoints: boolean }

/** What a sightline on the meridian does without. */
const NEEDLESS = [
  { keys: ['azimuth'], why: 'the direction is that of the meridian' },
  { keys: ['from', 'to'], why: 'the direction is that of the meridian' },
  { keys: ['horizon'], why: 'the horizon plays no part' },
] as const
/** Where an altitude belongs that does not stand in the sightline. */
const WHERE: Readonly<Record<Target['body'], string>> = {
  sun: 'the altitude of the skyline as horizon',
  moon: 'the altitude of the skyline as horizon',
  star: 'altitude in the target of the star',
  'two stars': 'no altitude: the direction is enough',
}
const AN_ALTITUDE = 'altitude: 31°12′ ± 10′'
const A_DIRECTION = 'azimuth, or from and to'

/**
 * Reads what a sightline measures: an altitude for a target on the meridian, else a direction. Where the target could
 * not be read, whichever is there.
 */
export function readDirection(
  line: Field,
  fields: LineFields,
  target: Target | null,
  around: Points,
  context: Context,
): Direction | null {
  const hasDirection = fields.has('azimuth') || fields.has('from') || fields.has('to')
  if (target === null && fields.has('altitude') && !hasDirection) return readAltitude(fields, context)
  if (target !== null && isOnMeridian(target)) return readOnMeridian(line, fields, context)
  if (target !== null) refuseAltitude(fields, target, hasDirection, context)
  if (!hasDirection && !fields.has('altitude')) reportNoDirection(line, context)
  return hasDirection ? readHorizontal(line, fields, around, context) : null
}

function readOnMeridian(line: Field, fields: LineFields, context: Context): Direction | null {
  const needless = NEEDLESS.filter(({ keys }) => keys.some((key) => fields.has(key)))
  const isAltitude = needless.length === 1 && !fields.has('altitude') && isMisnamed(fields.get('horizon'))
  for (const { keys, why } of needless) {
    const entries = keys.map((key) => fields.get(key)).filter((entry) => entry !== undefined)
    const [entry] = entries
    if (entry === undefined) continue
    const names = entries.map(({ name }) => quoted(name)).join(' and ')
    const have = entries.length === 1 ? 'has' : 'have'
    const message = `${names} ${have} no place here: at noon and at a culmination ${why}`
    const suggestion = isAltitude ? 'altitude' : null
    reportOutOfPlace(entry, { message, expected: `${AN_ALTITUDE} alone`, suggestion }, context)
  }
  if (needless.length === 0 && !fields.has('altitude'))
    reportMissingKey(line, 'altitude', AN_ALTITUDE, context)
  return readAltitude(fields, context)
}

/** A horizon that states an altitude, and alone, is most likely the altitude asked for under another name. */
function isMisnamed(horizon: Field | undefined): boolean {
  const text = horizon === undefined ? null : plainText(horizon)
  return text !== null && !isUnknown(text)
}

function readAltitude(fields: LineFields, context: Context): Direction | null {
  const read = measuredAngle(APPARENT_ALTITUDE, ALTITUDE_UNCERTAINTY)
  const altitudeDeg = readQuantity(fields.get('altitude'), read, 'an altitude such as 31°12′ ± 10′', context)
  return altitudeDeg === null ? null : { by: 'altitude', altitudeDeg }
}

function refuseAltitude(fields: LineFields, target: Target, hasDirection: boolean, context: Context): void {
  const entry = fields.get('altitude')
  if (entry === undefined) return
  const message = '`altitude` has no place here: it is for a target at noon or at a culmination'
  const isSkyline = hasDirection && !fields.has('horizon') && 'disc' in target
  const expected = hasDirection ? WHERE[target.body] : `${A_DIRECTION}; ${WHERE[target.body]}`
  reportOutOfPlace(entry, { message, expected, suggestion: isSkyline ? 'horizon' : null }, context)
}

function readHorizontal(line: Field, fields: LineFields, around: Points, context: Context): Direction | null {
  const hasEndpoints = fields.has('from') || fields.has('to')
  if (!fields.has('azimuth')) return readEndpoints(line, fields, around, context)
  const read = measuredAngle(AZIMUTH, DIRECTION_UNCERTAINTY)
  const azimuthDeg = readQuantity(fields.get('azimuth'), read, 'an azimuth such as 49°34′18″ ± 1′', context)
  if (!hasEndpoints) return azimuthDeg === null ? null : { by: 'azimuth', azimuthDeg }
  reportError(context, line, 'direction-twice', `${quoted(line.name)} has both an azimuth and points`, {
    expected: `either ${A_DIRECTION}`,
    at: line.keyAt,
  })
  return null
}

/** A line described by a key of another version has been told so already. */
function reportNoDirection(line: Field, context: Context): void {
  const { node } = line
  if (isMap(node) && ['angle', 'span'].some((key) => node.has(key))) return
  reportError(context, line, 'missing-key', `${quoted(line.name)} has no direction`, {
    expected: A_DIRECTION,
    at: line.keyAt,
  })
}
