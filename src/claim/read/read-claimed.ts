import { type AngleKind, AZIMUTH } from '../../quantity/angle-kind.ts'
import { readPrintedAngle } from '../../quantity/read-angle.ts'
import type { Claimed, Printed } from '../claim.ts'
import { KEYS } from '../keys.ts'
import type { Context, Field } from './field.ts'
import { DECLINATION, OBLIQUITY, REFRACTION, SEMIDIAMETER, TRUE_ALTITUDE } from './kinds.ts'
import { toArcmin } from './read-disc.ts'
import { readMapping } from './read-mapping.ts'
import { readQuantity } from './read-quantity.ts'

const NOTHING_CLAIMED: Claimed = {
  azimuthDeg: null,
  altitudeDeg: null,
  refractionArcmin: null,
  semidiameterArcmin: null,
  declinationDeg: null,
  obliquityDeg: null,
}

/** Reads the intermediate results that the source prints. */
export function readClaimed(field: Field | undefined, context: Context): Claimed {
  const fields = field === undefined ? null : readMapping(field, KEYS.claimed, context)
  if (fields === null) return NOTHING_CLAIMED
  const inDegrees = (key: keyof typeof KEYS.claimed, kind: AngleKind) =>
    readPrinted(fields.get(key), kind, (deg) => deg, context)
  const inArcmin = (key: keyof typeof KEYS.claimed, kind: AngleKind) =>
    readPrinted(fields.get(key), kind, toArcmin, context)
  return {
    azimuthDeg: inDegrees('azimuth', AZIMUTH),
    altitudeDeg: inDegrees('altitude', TRUE_ALTITUDE),
    refractionArcmin: inArcmin('refraction', REFRACTION),
    semidiameterArcmin: inArcmin('semidiameter', SEMIDIAMETER),
    declinationDeg: inDegrees('declination', DECLINATION),
    obliquityDeg: inDegrees('obliquity', OBLIQUITY),
  }
}

function readPrinted(
  field: Field | undefined,
  kind: AngleKind,
  toUnit: (deg: number) => number,
  context: Context,
): Printed | null {
  let text = ''
  const read = (printed: string) => {
    text = printed.trim()
    return readPrintedAngle(printed, kind)
  }
  const angle = readQuantity(field, read, `${kind.name} such as ${kind.example}`, context)
  return angle === null ? null : { value: toUnit(angle.deg), text, half: toUnit(angle.halfDeg) }
}
