import { quoted } from '../../quantity/quoted.ts'
import { type PrintedAngle, readPrintedAngle } from '../../quantity/read-angle.ts'
import { readUncertainty } from '../../quantity/read-uncertainty.ts'
import { readUnit } from '../../quantity/read-unit.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { GeographicPoint, GridPoint, LocalPoint, Point } from '../claim.ts'
import { EXAMPLES } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import {
  type MixedPlace,
  mixedPlace,
  PLACES,
  type PlaceKind,
  type PointKey,
  type PointKinds,
} from './point-kinds.ts'
import { readBreadth } from './read-breadth.ts'
import { type Fields, reportMissingKey, reportOutOfPlace } from './read-mapping.ts'
import { readQuantity } from './read-quantity.ts'
import { warnCoarsePlace } from './warn-coarse-place.ts'

type PointFields = Fields<PointKey>

const EXAMPLE_OF_EACH =
  '{east: 84.65 m, north: 53.09 m}, {latitude: 41°20′ N, longitude: 23°15′ E} or {easting: 273741.297 m, northing: 5796489.777 m}'

/** The kind of a point by the keys it has, with those reported that are missing or do not go together; null for none. */
export function readPlaceKind(field: Field, fields: PointFields, context: Context): PlaceKind | null {
  const hasAny = (kind: PlaceKind) => PLACES[kind].keys.some((key) => fields.has(key))
  const mixed = mixedPlace(fields.has)
  if (mixed !== null) return refuseMixed(mixed, fields, context)
  const kind = (['plan', 'grid', 'geographic'] as const).find(hasAny)
  if (kind === undefined) {
    const message = `${quoted(field.name)} has no place`
    reportError(context, field, 'missing-key', message, { expected: EXAMPLE_OF_EACH, at: field.keyAt })
    return null
  }
  if (kind === 'plan' && hasAny('grid')) refuseBeside('grid', kind, fields, context)
  if (kind === 'grid' && hasAny('geographic')) refuseBeside('geographic', kind, fields, context)
  const isTie = kind === 'plan' && hasAny('geographic')
  for (const key of [...PLACES[kind].keys, ...(isTie ? PLACES.geographic.keys : [])])
    if (!fields.has(key)) reportMissingKey(field, key, EXAMPLES[key] ?? null, context)
  refuseOtherHeight(kind, fields, context)
  return kind
}

/** Reads the values of a point of a kind; `shared` is the uncertainty of those that state none. */
export function readPoint(
  kind: PlaceKind,
  fields: PointFields,
  kinds: PointKinds,
  shared: number | Unstated,
  context: Context,
): Point | null {
  const place = readPlace(kind, fields, kinds, context)
  const upM = readLength('up', fields, kinds, context) ?? readLength('elevation', fields, kinds, context)
  const stated = readPointUncertainty(fields.get('uncertainty'), kinds, context)
  const uncertaintyM = stated === null || stated === 'omitted' ? shared : stated
  const breadth = readBreadth(fields, kinds, context)
  if (place === null) return null
  warnCoarsePlace(place.printed, fields, uncertaintyM, context)
  return { ...place.coordinates, uncertaintyM, upM, breadth }
}

/** Reads an uncertainty of a point, metres; null where there is none to read. */
export function readPointUncertainty(
  field: Field | undefined,
  { uncertainty }: Pick<PointKinds, 'uncertainty'>,
  context: Context,
): number | Unstated | null {
  const read = (text: string) => readUncertainty(text, (size) => readUnit(size, uncertainty))
  return readQuantity(field, read, `a length such as ${uncertainty.example}, or unknown`, context)
}

interface Place {
  coordinates: LocalPoint | GeographicPoint | GridPoint
  /** How finely a geographic place is typed. */
  printed: readonly [PrintedAngle, PrintedAngle] | null
}

function readPlace(kind: PlaceKind, fields: PointFields, kinds: PointKinds, context: Context): Place | null {
  if (kind === 'geographic') {
    const place = readGeographic(fields, kinds, context)
    return place === null ? null : { coordinates: { by: kind, ...place.place }, printed: place.printed }
  }
  const [eastKey, northKey] = PLACES[kind].keys
  const east = readLength(eastKey, fields, kinds, context)
  const north = readLength(northKey, fields, kinds, context)
  const isTie = kind === 'plan' && PLACES.geographic.keys.some((key) => fields.has(key))
  const tie = isTie ? readGeographic(fields, kinds, context) : null
  if (east === null || north === null || (isTie && tie === null)) return null
  const coordinates =
    kind === 'plan'
      ? ({ by: kind, eastM: east, northM: north, tie: tie?.place ?? null } as const)
      : ({ by: kind, eastingM: east, northingM: north } as const)
  return { coordinates, printed: null }
}

function readGeographic(fields: PointFields, kinds: PointKinds, context: Context) {
  const [latitude, longitude] = PLACES.geographic.keys.map((key) =>
    readQuantity(
      fields.get(key),
      (text) => readPrintedAngle(text, kinds[key]),
      `${kinds[key].name} such as ${kinds[key].example}`,
      context,
    ),
  )
  if (latitude == null || longitude == null) return null
  const place = { latitudeDeg: latitude.deg, longitudeDeg: longitude.deg }
  return { place, printed: [latitude, longitude] as const }
}

function readLength(
  key: 'east' | 'north' | 'easting' | 'northing' | 'up' | 'elevation',
  fields: PointFields,
  kinds: PointKinds,
  context: Context,
): number | null {
  const kind = kinds[key]
  const read = (text: string) => readUnit(text, kind)
  return readQuantity(fields.get(key), read, `a length such as ${kind.example}`, context)
}

/** The key that is meant takes the place of the stray one. */
function refuseMixed(
  { has, stray, meant, kind }: MixedPlace,
  fields: PointFields,
  context: Context,
): PlaceKind {
  const entry = fields.get(stray)
  const message = `${quoted(stray)} has no place here: it does not go with ${quoted(has)}`
  if (entry !== undefined) reportOutOfPlace(entry, { message, expected: meant, suggestion: meant }, context)
  return kind
}

function refuseBeside(other: PlaceKind, kind: PlaceKind, fields: PointFields, context: Context): void {
  const entry = PLACES[other].keys.map((key) => fields.get(key)).find((found) => found !== undefined)
  if (entry === undefined) return
  const beside = PLACES[kind].keys.map((key) => quoted(key)).join(' and ')
  const message = `${quoted(entry.name)} has no place here: ${beside} say already where the point is`
  reportOutOfPlace(
    entry,
    { message, expected: `a point either ${PLACES[kind].called} or ${PLACES[other].called}` },
    context,
  )
}

/** On a plan heights count from its own zero, elsewhere from the sea. */
function refuseOtherHeight(kind: PlaceKind, fields: PointFields, context: Context): void {
  const { height, called } = PLACES[kind]
  const entry = fields.get(height === 'up' ? 'elevation' : 'up')
  if (entry === undefined) return
  const message = `${quoted(entry.name)} has no place here: the height of a point ${called} is ${quoted(height)}`
  const suggestion = fields.has(height) ? null : height
  reportOutOfPlace(entry, { message, expected: height, suggestion }, context)
}
