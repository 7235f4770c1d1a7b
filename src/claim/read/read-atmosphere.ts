import type { AngleKind } from '../../quantity/angle-kind.ts'
import { mapReading } from '../../quantity/misread.ts'
import { quoted } from '../../quantity/quoted.ts'
import { readAngle } from '../../quantity/read-angle.ts'
import { readUncertainty } from '../../quantity/read-uncertainty.ts'
import { readUnit } from '../../quantity/read-unit.ts'
import { HUMIDITY, LAPSE, PRESSURE, TEMPERATURE, type UnitKind } from '../../quantity/unit-kind.ts'
import type { Atmosphere } from '../claim.ts'
import { KEYS } from '../keys.ts'
import { type Context, type Field, reportWarning } from './field.ts'
import { ALTITUDE_UNCERTAINTY, REFRACTION } from './kinds.ts'
import { toArcmin } from './read-disc.ts'
import { type Fields, readMapping } from './read-mapping.ts'
import { readStatable } from './read-quantity.ts'

const OF_THE_AIR = ['temperature', 'pressure', 'humidity', 'lapse'] as const
const NOTHING_STATED: Atmosphere = {
  temperatureC: 'omitted',
  pressureHpa: 'omitted',
  humidity: 'omitted',
  lapseKPerKm: 'omitted',
  refractionArcmin: 'omitted',
  refractionUncertaintyArcmin: 'omitted',
}

/** Reads what the claim says of the air, or of the refraction it took. */
export function readAtmosphere(field: Field | undefined, context: Context): Atmosphere {
  const fields = field === undefined ? null : readMapping(field, KEYS.atmosphere, context)
  if (fields === null) return NOTHING_STATED
  const unit = (key: (typeof OF_THE_AIR)[number], kind: UnitKind) =>
    readStatable(
      fields.get(key),
      (text) => readUnit(text, kind),
      `${kind.name} such as ${kind.example}`,
      context,
    )
  const atmosphere: Atmosphere = {
    temperatureC: unit('temperature', TEMPERATURE),
    pressureHpa: unit('pressure', PRESSURE),
    humidity: unit('humidity', HUMIDITY),
    lapseKPerKm: unit('lapse', LAPSE),
    refractionArcmin: readStatable(
      fields.get('refraction'),
      (text) => mapReading(readAngle(text, REFRACTION), toArcmin),
      'an angle such as 27′20″',
      context,
    ),
    refractionUncertaintyArcmin: readStatable(
      fields.get('refraction_uncertainty'),
      (text) => mapReading(readUncertainty(text, arcminReader(ALTITUDE_UNCERTAINTY)), (size) => size),
      'an angle such as 3′, or unknown',
      context,
    ),
  }
  if (typeof atmosphere.refractionArcmin === 'number') warnUnusedAir(fields, context)
  return atmosphere
}

function arcminReader(kind: AngleKind) {
  return (text: string) => mapReading(readAngle(text, kind), toArcmin)
}

function warnUnusedAir(fields: Fields<keyof typeof KEYS.atmosphere>, context: Context): void {
  for (const key of OF_THE_AIR) {
    const field = fields.get(key)
    if (field === undefined) continue
    reportWarning(context, field, 'unused-key', `${quoted(key)} is not used, since \`refraction\` is given`, {
      expected: 'either refraction or the state of the air',
      at: field.keyAt,
    })
  }
}
