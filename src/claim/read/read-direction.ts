import { AZIMUTH } from '../../quantity/angle-kind.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Direction, SolsticeSpanTarget, Target } from '../claim.ts'
import { EXAMPLES, type KEYS, TARGET_EXAMPLES } from '../keys.ts'
import { isOnMeridian } from '../on-meridian.ts'
import { type Context, type Field, reportError } from './field.ts'
import { ALTITUDE_UNCERTAINTY, APPARENT_ALTITUDE, DIRECTION_UNCERTAINTY } from './kinds.ts'
import { measuredAngle } from './measured-angle.ts'
import { readEndpoints } from './read-endpoints.ts'
import { type Fields, reportMissingKey, reportOutOfPlace } from './read-mapping.ts'
import { isUnknown, readQuantity } from './read-quantity.ts'
import { readSpan } from './read-span.ts'
import { plainText } from './read-text.ts'
import { NEEDLESS_ON_MERIDIAN, NEEDLESS_WITH_SPAN, refuseNeedless } from './refuse-needless.ts'
import type { Surroundings } from './surroundings.ts'

type LineFields = Fields<keyof typeof KEYS.sightline>
/** Where an altitude belongs that does not stand in the sightline. */
const WHERE: Readonly<Record<Target['body'], string>> = {
  sun: 'the altitude of the skyline as horizon',
  'sun at both solstices': 'the altitudes of the skyline as horizons in the span',
  moon: 'the altitude of the skyline as horizon',
  star: 'altitude in the target of the star',
  'two stars': 'no altitude: the direction is enough',
}
const AN_ALTITUDE = 'altitude: 31°12′ ± 10′'
const A_SPAN = `${EXAMPLES.span}, or span: {from: …, june: …, december: …}, with horizons: {june: 1° ± 1′, december: 1°20′ ± 1′}`
const INSIDE_SPAN =
  'a span alone, with what belongs to it inside, such as horizons: {june: 1° ± 1′, december: 1°20′ ± 1′}'
const A_DIRECTION = 'azimuth, or from and to'

/**
 * Reads what a sightline measures: an altitude for a target on the meridian, a span for both solstices, else a
 * direction. Where the target could not be read, whichever is there.
 */
export function readDirection(
  line: Field,
  fields: LineFields,
  target: Target | null,
  around: Surroundings,
  context: Context,
): Direction | null {
  const hasDirection = fields.has('azimuth') || fields.has('from') || fields.has('to')
  if (target?.body === 'sun at both solstices' || (target === null && fields.has('span')))
    return readSpanLine(line, fields, target, around, context)
  if (target === null && fields.has('altitude') && !hasDirection) return readAltitude(fields, context)
  if (target !== null && isOnMeridian(target)) return readOnMeridian(line, fields, context)
  if (target !== null) {
    refuseSpan(fields, context)
    refuseAltitude(fields, target, hasDirection, context)
  }
  if (!hasDirection && !fields.has('altitude') && !fields.has('span')) reportNoDirection(line, context)
  return hasDirection ? readHorizontal(line, fields, around, context) : null
}

function readSpanLine(
  line: Field,
  fields: LineFields,
  target: SolsticeSpanTarget | null,
  around: Surroundings,
  context: Context,
): Direction | null {
  const needless = NEEDLESS_WITH_SPAN.filter(({ keys }) => keys.some(fields.has))
  const ask = fields.has('span') ? INSIDE_SPAN : A_SPAN
  for (const each of needless) refuseNeedless(each, fields, 'for both solstices', { expected: ask }, context)
  if (needless.length === 0 && !fields.has('span')) reportMissingKey(line, 'span', A_SPAN, context)
  const span = fields.get('span')
  return span === undefined ? null : readSpan(line, span, target, around, context)
}

function readOnMeridian(line: Field, fields: LineFields, context: Context): Direction | null {
  const needless = NEEDLESS_ON_MERIDIAN.filter(({ keys }) => keys.some(fields.has))
  const isAltitude = needless.length === 1 && !fields.has('altitude') && isMisnamed(fields.get('horizon'))
  const advice = { expected: `${AN_ALTITUDE} alone`, suggestion: isAltitude ? 'altitude' : null }
  for (const each of needless) refuseNeedless(each, fields, 'at noon and at a culmination', advice, context)
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

function refuseSpan(fields: LineFields, context: Context): void {
  const entry = fields.get('span')
  if (entry === undefined) return
  const message = '`span` has no place here: it is for a target of both solstices'
  reportOutOfPlace(
    entry,
    { message, expected: `target: ${TARGET_EXAMPLES['sun at both solstices']}` },
    context,
  )
}

function refuseAltitude(fields: LineFields, target: Target, hasDirection: boolean, context: Context): void {
  const entry = fields.get('altitude')
  if (entry === undefined) return
  const message = '`altitude` has no place here: it is for a target at noon or at a culmination'
  const isSkyline = hasDirection && !fields.has('horizon') && 'disc' in target
  const expected = hasDirection ? WHERE[target.body] : `${A_DIRECTION}; ${WHERE[target.body]}`
  reportOutOfPlace(entry, { message, expected, suggestion: isSkyline ? 'horizon' : null }, context)
}

function readHorizontal(
  line: Field,
  fields: LineFields,
  around: Surroundings,
  context: Context,
): Direction | null {
  const hasEndpoints = fields.has('from') || fields.has('to')
  if (!fields.has('azimuth')) return readEndpoints(line, fields, around, context)
  const read = measuredAngle(AZIMUTH, DIRECTION_UNCERTAINTY)
  const azimuthDeg = readQuantity(fields.get('azimuth'), read, 'an azimuth such as 49°34′18″ ± 1′', context)
  if (!hasEndpoints) refuseSighted(fields.get('sighted'), context)
  if (!hasEndpoints) return azimuthDeg === null ? null : { by: 'azimuth', azimuthDeg }
  reportError(context, line, 'direction-twice', `${quoted(line.name)} has both an azimuth and points`, {
    expected: `either ${A_DIRECTION}`,
    at: line.keyAt,
  })
  return null
}

function refuseSighted(entry: Field | undefined, context: Context): void {
  if (entry === undefined) return
  const message = '`sighted` has no place here: it tells what of two points is sighted'
  reportOutOfPlace(entry, { message, expected: 'a line with from and to' }, context)
}

function reportNoDirection(line: Field, context: Context): void {
  reportError(context, line, 'missing-key', `${quoted(line.name)} has no direction`, {
    expected: A_DIRECTION,
    at: line.keyAt,
  })
}
