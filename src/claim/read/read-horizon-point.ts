import { quoted } from '../../quantity/quoted.ts'
import type { Horizon } from '../claim.ts'
import { checkSlope } from './check-slope.ts'
import { distanceBetween } from './distance-between.ts'
import { type Context, type Field, reportError } from './field.ts'
import { checkJoin } from './join-points.ts'
import { PLACES } from './point-kinds.ts'
import type { LineOfSight } from './read-horizon.ts'
import { reportOutOfPlace } from './read-mapping.ts'
import { readPointName } from './read-point-name.ts'
import type { ReadPoint } from './read-points.ts'
import type { Surroundings } from './surroundings.ts'

/** Reads a point that is the horizon of a line. It and the first point of the line need heights on one scale. */
export function readHorizonPoint(
  field: Field,
  line: LineOfSight,
  around: Surroundings,
  context: Context,
): Horizon | null {
  const name = readPointName(field, around.points, context)
  if (line.from === undefined) {
    const message = `${quoted(field.name)} has no place here: ${quoted(line.name)} begins at no point to see it from`
    reportOutOfPlace(
      field,
      { message, expected: 'a line from a point, or another way to tell the horizon' },
      context,
    )
    return null
  }
  if (name === null) return null
  if (line.from !== null) checkSeen(field, line.from, name, around, context)
  return { by: 'point', point: name }
}

function checkSeen(field: Field, from: string, name: string, around: Surroundings, context: Context): void {
  if (from === name) {
    const message = `${quoted(name)} is where one stands, and no horizon`
    reportError(context, field, 'line-to-itself', message, {
      expected: 'another point than the one the line begins at',
    })
    return
  }
  if (!checkJoin(field, from, name, around, context)) return
  const [eye, seen] = [around.points.byName.get(from), around.points.byName.get(name)]
  if (eye === undefined || seen === undefined || eye.kind === null || seen.kind === null) return
  const without = [eye, seen].find((each) => !hasHeight(each))
  if (without !== undefined) {
    const key = without.kind === null ? 'up' : PLACES[without.kind].height
    const message = `${quoted(without.field.name)} has no height, from which the altitude of the horizon follows`
    reportError(context, field, 'no-height', message, {
      expected: `${key}: ${key === 'up' ? '1.2' : '640'} m in the point`,
    })
  } else if (PLACES[eye.kind].height !== PLACES[seen.kind].height) {
    const message = `${heightOf(eye)} and ${heightOf(seen)}, which count from two zeros`
    reportError(context, field, 'no-height', message, {
      expected: 'two points whose heights count from one zero',
    })
  } else checkSteepness(field, eye, seen, context)
}

/** Between points of two kinds the distance is not reckoned here. */
function checkSteepness(field: Field, eye: ReadPoint, seen: ReadPoint, context: Context): void {
  if (eye.point === null || seen.point === null) return
  const distanceM = distanceBetween(eye.point, seen.point)
  if (distanceM === null || eye.point.upM === null || seen.point.upM === null) return
  const what = `${quoted(seen.field.name)} seen from ${quoted(eye.field.name)}`
  checkSlope(field, { distanceM, riseM: seen.point.upM - eye.point.upM, what }, context)
}

function hasHeight({ fields }: ReadPoint): boolean {
  return fields === null || fields.has('up') || fields.has('elevation')
}

function heightOf({ field, kind }: ReadPoint): string {
  return `${quoted(field.name)} has its height as ${quoted(kind === null ? '' : PLACES[kind].height)}`
}
