import { LATITUDE, LONGITUDE } from '../../quantity/angle-kind.ts'
import { readAngle } from '../../quantity/read-angle.ts'
import { readUnit } from '../../quantity/read-unit.ts'
import { ELEVATION } from '../../quantity/unit-kind.ts'
import type { Structure } from '../claim.ts'
import { KEYS } from '../keys.ts'
import type { Context, Field } from './field.ts'
import { readMapping } from './read-mapping.ts'
import { readQuantity, readStatable } from './read-quantity.ts'
import { readText } from './read-text.ts'

/** Reads where the building is. */
export function readStructure(field: Field | undefined, context: Context): Structure | null {
  const fields = field === undefined ? null : readMapping(field, KEYS.structure, context)
  if (fields === null) return null
  const name = readText(fields.get('name'), context)
  const latitudeDeg = readQuantity(
    fields.get('latitude'),
    (text) => readAngle(text, LATITUDE),
    'a latitude',
    context,
  )
  const longitudeDeg = readQuantity(
    fields.get('longitude'),
    (text) => readAngle(text, LONGITUDE),
    'a longitude',
    context,
  )
  const elevationM = readStatable(
    fields.get('elevation'),
    (text) => readUnit(text, ELEVATION),
    'an elevation, or unknown',
    context,
  )
  return name === null || latitudeDeg === null ? null : { name, latitudeDeg, longitudeDeg, elevationM }
}
