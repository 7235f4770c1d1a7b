import { formatDegrees } from '../../quantity/format-angle.ts'
import { readAngle } from '../../quantity/read-angle.ts'
import { readUnit } from '../../quantity/read-unit.ts'
import type { UnitKind } from '../../quantity/unit-kind.ts'
import type { Grid } from '../claim.ts'
import { EXAMPLES, type KEYS } from '../keys.ts'
import type { Context, Field } from './field.ts'
import { CENTRAL_MERIDIAN, EASTING, LATITUDE_OF_ORIGIN, NORTHING, SCALE } from './kinds.ts'
import { readEllipsoid } from './read-ellipsoid.ts'
import { type Fields, reportMissingKey } from './read-mapping.ts'
import { readQuantity } from './read-quantity.ts'

type GridKey = keyof typeof KEYS.grid

/** What a transverse Mercator projection takes, all of it. */
export const PROJECTION = [
  'central_meridian',
  'latitude_of_origin',
  'scale',
  'false_easting',
  'false_northing',
  'ellipsoid',
] as const satisfies readonly GridKey[]
/** Reads a transverse Mercator projection; null, with the problem reported, where a part of it is missing. */
export function readProjection(field: Field, fields: Fields<GridKey>, context: Context): Grid | null {
  for (const key of PROJECTION) if (!fields.has(key)) reportMissingKey(field, key, exampleOf(key), context)
  const unit = (key: GridKey, kind: UnitKind) =>
    readQuantity(
      fields.get(key),
      (text) => readUnit(text, kind),
      `${kind.name} such as ${kind.example}`,
      context,
    )
  const angle = (key: GridKey, kind: typeof CENTRAL_MERIDIAN) =>
    readQuantity(
      fields.get(key),
      (text) => readAngle(text, kind),
      `${kind.name} such as ${kind.example}`,
      context,
    )
  const centralMeridianDeg = angle('central_meridian', CENTRAL_MERIDIAN)
  const latitudeOfOriginDeg = angle('latitude_of_origin', LATITUDE_OF_ORIGIN)
  const scale = unit('scale', SCALE)
  const falseEastingM = unit('false_easting', { ...EASTING, name: 'a false easting', example: '400 km' })
  const falseNorthingM = unit('false_northing', { ...NORTHING, name: 'a false northing', example: '-100 km' })
  const ellipsoid = readEllipsoid(fields.get('ellipsoid'), context)
  if (centralMeridianDeg === null || latitudeOfOriginDeg === null || scale === null) return null
  if (falseEastingM === null || falseNorthingM === null || ellipsoid === null) return null
  const meridian = meridianText(centralMeridianDeg)
  return {
    by: 'projection',
    projection: { ellipsoid, centralMeridianDeg, latitudeOfOriginDeg, scale, falseEastingM, falseNorthingM },
    name: `transverse Mercator about ${meridian} on ${ellipsoid}`,
  }
}

/** `2° W`, `9°30′ E`. */
function meridianText(deg: number): string {
  const size = formatDegrees(Math.abs(deg)).replace(/(?:00′)?00″$/, '')
  return deg === 0 ? '0°' : `${size} ${deg < 0 ? 'W' : 'E'}`
}

function exampleOf(key: (typeof PROJECTION)[number]): string {
  return EXAMPLES[key] ?? key
}
