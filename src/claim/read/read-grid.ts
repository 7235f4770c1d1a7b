import { quoted } from '../../quantity/quoted.ts'
import type { Grid } from '../claim.ts'
import { KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { CONVERGENCE, DIRECTION_UNCERTAINTY } from './kinds.ts'
import { measuredAngle } from './measured-angle.ts'
import { readEllipsoid } from './read-ellipsoid.ts'
import { type Fields, readMapping, reportMissingKey, reportOutOfPlace } from './read-mapping.ts'
import { PROJECTION, readProjection } from './read-projection.ts'
import { readQuantity } from './read-quantity.ts'
import { plainText } from './read-text.ts'
import { readUtmZone, ZONE_EXPECTED } from './read-utm-zone.ts'

type GridKey = keyof typeof KEYS.grid
type GridFields = Fields<GridKey>

/** The key that each form of a grid has, with those that may stand beside it. */
const FORMS = [
  { keys: ['zone', 'ellipsoid'], why: '`zone` names the whole projection' },
  { keys: PROJECTION, why: 'the projection gives the convergence of each place' },
  { keys: ['convergence'], why: '`convergence` is all that is known of the grid' },
] as const satisfies readonly { keys: readonly GridKey[]; why: string }[]

/** Reads the projected grid of the points, or what is known of its north; null where there is none to read. */
export function readGrid(field: Field | undefined, context: Context): Grid | null {
  if (field === undefined) return null
  if (isZone(field)) return refuseBareZone(field, context)
  const fields = readMapping(field, KEYS.grid, context)
  if (fields === null) return null
  const form =
    FORMS.find(({ keys }) => fields.has(keys[0])) ?? FORMS.find(({ keys }) => keys.some(fields.has))
  if (form === undefined) {
    const expected = 'zone: UTM 55 S, or a projection, or convergence: 1°35′ W ± 1′'
    reportError(context, field, 'missing-key', `${quoted(field.name)} says nothing`, {
      expected,
      at: field.keyAt,
    })
    return null
  }
  const keys: readonly GridKey[] = form.keys
  for (const key of Object.keys(KEYS.grid) as GridKey[]) {
    const entry = fields.get(key)
    if (entry === undefined || keys.includes(key)) continue
    const message = `${quoted(key)} has no place here: ${form.why}`
    reportOutOfPlace(entry, { message, expected: 'one way to tell the grid' }, context)
  }
  if (form === FORMS[2]) return readConvergence(fields, context)
  return form === FORMS[0] ? readZone(field, fields, context) : readProjection(field, fields, context)
}

function readZone(field: Field, fields: GridFields, context: Context): Grid | null {
  if (!fields.has('zone')) reportMissingKey(field, 'zone', 'zone: UTM 55 S, or all of a projection', context)
  const zone = readQuantity(fields.get('zone'), readUtmZone, ZONE_EXPECTED, context)
  const stated = readEllipsoid(fields.get('ellipsoid'), context)
  if (zone === null || (stated === null && fields.has('ellipsoid'))) return null
  const { number, hemisphere } = zone
  const ellipsoid = stated ?? 'WGS84'
  // NGA.SIG.0012 (2014), The universal grids.
  const projection = {
    ellipsoid,
    centralMeridianDeg: 6 * number - 183,
    latitudeOfOriginDeg: 0,
    scale: 0.9996,
    falseEastingM: 500_000,
    falseNorthingM: hemisphere === 'N' ? 0 : 10_000_000,
  }
  return { by: 'projection', projection, name: `UTM zone ${number} ${hemisphere} on ${ellipsoid}` }
}

function readConvergence(fields: GridFields, context: Context): Grid | null {
  const read = measuredAngle(CONVERGENCE, DIRECTION_UNCERTAINTY)
  const expected = `${CONVERGENCE.name} such as ${CONVERGENCE.example}`
  const convergenceDeg = readQuantity(fields.get('convergence'), read, expected, context)
  return convergenceDeg === null ? null : { by: 'convergence', convergenceDeg }
}

function isZone(field: Field): boolean {
  const text = plainText(field)
  return text !== null && readUtmZone(text).ok
}

function refuseBareZone(field: Field, context: Context): null {
  const text = plainText(field)?.trim() ?? ''
  reportError(context, field, 'not-a-mapping', `${quoted(text)} is not a mapping of keys to values`, {
    expected: 'the key that it belongs to',
    suggestion: `{zone: ${text}}`,
  })
  return null
}
