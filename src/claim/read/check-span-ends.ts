import { DEG, wrap180 } from '../../quantity/degrees.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Point, SolsticeSpanTarget } from '../claim.ts'
import { distanceBetween } from './distance-between.ts'
import { type Context, type Field, reportError, reportWarning } from './field.ts'
import { SPAN } from './kinds.ts'
import type { ReadPoints } from './read-points.ts'

/** The three points of a span by name, with the fields that name the far two. */
export interface SpanEnds {
  from: string
  june: string
  december: string
  juneField: Field
  decemberField: Field
}

/**
 * Tells of a span whose two lines are one line, and of one whose ends are plainly exchanged: seen from where one stands,
 * the Sun of june rises left of that of december and sets right of it, wherever on the Earth. `at` is null where the
 * target could not be read.
 */
export function checkSpanEnds(
  ends: SpanEnds,
  at: SolsticeSpanTarget['at'] | null,
  { byName }: ReadPoints,
  context: Context,
): void {
  const [from, june, december] = [ends.from, ends.june, ends.december].map((name) => byName.get(name)?.point)
  if (from == null || june == null || december == null || distanceBetween(june, december) === 0) return
  const [toJune, toDecember] = [bearingDeg(from, june), bearingDeg(from, december)]
  if (toJune === null || toDecember === null) return
  const turnDeg = wrap180(toDecember - toJune)
  const [a, b] = [quoted(ends.june), quoted(ends.december)]
  if (Math.abs(turnDeg) < SPAN.lowDeg) {
    const message = `${a} and ${b} lie in one direction from ${quoted(ends.from)}`
    reportError(context, ends.decemberField, 'in-one-line', message, { expected: `a span ${SPAN.limits}` })
  } else if (Math.abs(turnDeg) > 180 - SPAN.lowDeg) {
    const message = `${a} and ${b} lie in opposite directions from ${quoted(ends.from)}`
    const expected = 'two lines from one place, which make 180° at the polar circles alone'
    reportWarning(context, ends.decemberField, 'in-one-line', message, { expected })
  } else if (at !== null && turnDeg > 0 !== (at === 'rising'))
    warnExchanged(ends, at === 'rising' ? 'rises left' : 'sets right', context)
}

function warnExchanged({ from, june, december, juneField }: SpanEnds, where: string, context: Context): void {
  const side = where === 'rises left' ? 'right' : 'left'
  const message = `seen from ${quoted(from)}, ${quoted(june)} lies ${side} of ${quoted(december)}`
  const expected = `the ends of june and december exchanged: in june the Sun ${where} of where it does in december`
  reportWarning(context, juneField, 'ends-exchanged', message, { expected })
}

/** From the north of the points' own kind through east, in a plane; null where they are of two kinds or one place. */
function bearingDeg(from: Point, to: Point): number | null {
  const [east, north] = offsetOf(from, to) ?? [0, 0]
  return east === 0 && north === 0 ? null : Math.atan2(east, north) / DEG
}

function offsetOf(from: Point, to: Point): [number, number] | null {
  if (from.by === 'plan' && to.by === 'plan') return [to.eastM - from.eastM, to.northM - from.northM]
  if (from.by === 'grid' && to.by === 'grid')
    return [to.eastingM - from.eastingM, to.northingM - from.northingM]
  if (from.by !== 'geographic' || to.by !== 'geographic') return null
  const turnDeg = wrap180(to.longitudeDeg - from.longitudeDeg)
  return [turnDeg * Math.cos(from.latitudeDeg * DEG), to.latitudeDeg - from.latitudeDeg]
}
