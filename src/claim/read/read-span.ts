import { isMap } from 'yaml'
import { quoted } from '../../quantity/quoted.ts'
import type { Direction, SolsticeSpanTarget, Span } from '../claim.ts'
import { EXAMPLES, KEYS } from '../keys.ts'
import { checkSpanEnds } from './check-span-ends.ts'
import { type Context, type Field, reportError } from './field.ts'
import { checkJoin } from './join-points.ts'
import { DIRECTION_UNCERTAINTY, SPAN } from './kinds.ts'
import { measuredAngle } from './measured-angle.ts'
import { PLACES } from './point-kinds.ts'
import { type LineOfSight, readHorizon } from './read-horizon.ts'
import { type Fields, readMapping, reportMissingKey } from './read-mapping.ts'
import { readPointName } from './read-point-name.ts'
import { isUnknown, readQuantity } from './read-quantity.ts'
import { plainText } from './read-text.ts'
import type { Surroundings } from './surroundings.ts'
import { warnNear } from './warn-near.ts'

type SpanFields = Fields<keyof typeof KEYS.span>
type SpanDirection = Extract<Direction, { by: 'span' }>

const ENDS = ['from', 'june', 'december'] as const
const EXPECTED = `${SPAN.name} such as ${SPAN.example}`
const readAngle = measuredAngle(SPAN, DIRECTION_UNCERTAINTY)

/**
 * Reads the span between two lines from one place: an angle, or three points, and the horizon at either end. `target` is
 * null where it could not be read.
 */
export function readSpan(
  line: Field,
  field: Field,
  target: SolsticeSpanTarget | null,
  around: Surroundings,
  context: Context,
): SpanDirection | null {
  const text = plainText(field)
  if (text !== null && readAngle(text).ok) return refuseBareAngle(field, text, context)
  const fields = readMapping(field, KEYS.span, context)
  if (fields === null) return null
  const hasPoints = ENDS.some((key) => fields.has(key))
  if (hasPoints && fields.has('angle'))
    reportError(context, field, 'direction-twice', `${quoted(line.name)} has both an angle and points`, {
      expected: 'either angle, or from, june and december',
      at: field.keyAt,
    })
  if (!hasPoints && !fields.has('angle')) reportMissingKey(field, 'angle', 'angle: 50°31′ ± 2′', context)
  const span = hasPoints ? readPoints(field, fields, target, around, context) : readMeasured(fields, context)
  const from = hasPoints ? { from: span?.by === 'points' ? span.from : null } : {}
  const side = { name: line.name, ...from, isOfAngle: !hasPoints && fields.has('angle') }
  const horizons = readHorizons(fields.get('horizons'), side, around, context)
  return span === null ? null : { by: 'span', span, horizons }
}

function readMeasured(fields: SpanFields, context: Context): Span | null {
  const angleDeg = readQuantity(fields.get('angle'), readAngle, EXPECTED, context)
  return angleDeg === null ? null : { by: 'angle', angleDeg }
}

function readPoints(
  field: Field,
  fields: SpanFields,
  target: SolsticeSpanTarget | null,
  around: Surroundings,
  context: Context,
): Span | null {
  const [from, june, december] = ENDS.map((key) => {
    const entry = fields.get(key)
    if (entry !== undefined) return readPointName(entry, around.points, context)
    const expected = key === 'from' ? 'from: the point one stands at' : (EXAMPLES[key] ?? null)
    if (!fields.has(key)) reportMissingKey(field, key, expected, context)
    return null
  })
  if (from == null || june == null || december == null) return null
  const isSound = checkEnds(fields, [from, june, december], around, context)
  if (!isSound) return null
  const ends = { from, june, december }
  const [juneField, decemberField] = [fields.get('june') ?? field, fields.get('december') ?? field]
  checkSpanEnds({ ...ends, juneField, decemberField }, target?.at ?? null, around.points, context)
  return { by: 'points', ...ends }
}

/** Three different points, of one kind, at three places. */
function checkEnds(
  fields: SpanFields,
  names: readonly [string, string, string],
  around: Surroundings,
  context: Context,
): boolean {
  const kindOf = (name: string) => around.points.byName.get(name)?.kind ?? null
  for (const [index, key] of ENDS.entries()) {
    const field = fields.get(key)
    const name = names[index]
    const earlier = names.slice(0, index)
    if (field === undefined || name === undefined) continue
    if (earlier.includes(name)) {
      const message = `${quoted(name)} stands for two ends of the span`
      reportError(context, field, 'line-to-itself', message, { expected: 'three different points' })
      return false
    }
    const [kind, other] = [kindOf(name), kindOf(names[0])]
    if (kind !== null && other !== null && kind !== other) {
      const message = `${quoted(name)} is ${PLACES[kind].called} and ${quoted(names[0])} ${PLACES[other].called}`
      reportError(context, field, 'cannot-join', message, { expected: 'three points of one kind' })
      return false
    }
    for (const before of earlier) checkJoin(field, before, name, around, context)
    if (key !== 'from') warnNear(field, names[0], name, around.points, context)
  }
  return true
}

function readHorizons(
  field: Field | undefined,
  line: LineOfSight,
  around: Surroundings,
  context: Context,
): SpanDirection['horizons'] {
  const nothing = { june: 'omitted', december: 'omitted' } as const
  if (field === undefined) return nothing
  if (!isMap(field.node) && isUnknown(plainText(field) ?? '')) return { june: 'unknown', december: 'unknown' }
  const fields = readMapping(field, KEYS.spanHorizons, context)
  if (fields === null) return nothing
  const at = (key: 'june' | 'december') => readHorizon(fields.get(key), line, around, context)
  return { june: at('june'), december: at('december') }
}

function refuseBareAngle(field: Field, text: string, context: Context): null {
  reportError(context, field, 'not-a-mapping', `${quoted(text)} is not a mapping of keys to values`, {
    expected: EXAMPLES.span ?? null,
    suggestion: `{angle: ${text.trim()}}`,
  })
  return null
}
