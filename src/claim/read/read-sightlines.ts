import { isMap, isScalar } from 'yaml'
import { quoted } from '../../quantity/quoted.ts'
import type { Direction, Sightline } from '../claim.ts'
import { EXAMPLES, KEYS, TARGET_EXAMPLES } from '../keys.ts'
import { isOnMeridian } from '../on-meridian.ts'
import { type Context, type Field, reportError } from './field.ts'
import { readDirection } from './read-direction.ts'
import { type LineOfSight, readHorizon } from './read-horizon.ts'
import { type Fields, type OutOfPlace, readMapping } from './read-mapping.ts'
import { readNames } from './read-names.ts'
import { readTarget } from './read-target.ts'
import { plainText } from './read-text.ts'
import type { Surroundings } from './surroundings.ts'

const ONE_LINE = 'a name for each line, such as midsummer: {azimuth: 57°54′28″ ± 1′, horizon: 1°30′ ± 2′}'

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
  const fields = readMapping(field, KEYS.sightline, context, { outOfPlace: angleOfSpan })
  if (fields === null) return null
  const target = fields.has('target') ? readTarget(fields.get('target'), context) : around.shared
  if (!fields.has('target') && !around.hasShared) reportNoTarget(field, context)
  const direction = readDirection(field, fields, target, around, context)
  const isSpan = target?.body === 'sun at both solstices' || (target === null && fields.has('span'))
  const meetsHorizon = !isSpan && (target === null || !isOnMeridian(target))
  const line = lineOfSight(field.name, fields, direction)
  const horizon = meetsHorizon ? readHorizon(fields.get('horizon'), line, around, context) : 'omitted'
  return direction === null || target === null ? null : { name: field.name, direction, horizon, target }
}

function lineOfSight(
  name: string,
  fields: Fields<keyof typeof KEYS.sightline>,
  direction: Direction | null,
): LineOfSight {
  if (direction?.by === 'azimuth') return { name, azimuthDeg: direction.azimuthDeg.value }
  if (direction?.by === 'points') return { name, from: direction.from }
  return fields.has('from') || fields.has('to') ? { name, from: null } : { name }
}

function reportNoTarget(field: Field, context: Context): void {
  const message = `${quoted(field.name)} has no \`target\`, and neither has the file`
  const expected = `a target, such as ${TARGET_EXAMPLES.sun}`
  reportError(context, field, 'missing-key', message, { expected, at: field.keyAt })
}

/** `angle: 50°31′ ± 2′` is most likely a span. */
function angleOfSpan(entry: Field): OutOfPlace | null {
  if (entry.name !== 'angle') return null
  const message = '`angle` has no place here: an angle between two lines is a span'
  const text = plainText(entry)
  const [, end = 0] = isScalar(entry.node) ? (entry.node.range ?? []) : []
  const isPlain = text !== null && isScalar(entry.node) && entry.node.type === 'PLAIN'
  return {
    message,
    expected: EXAMPLES.span ?? null,
    standsFor: 'span',
    ...(isPlain && {
      suggestion: `span: {angle: ${text}}`,
      at: { offset: entry.keyAt.offset, length: end - entry.keyAt.offset },
    }),
  }
}
