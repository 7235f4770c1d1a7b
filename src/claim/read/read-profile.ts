import { wrap360 } from '../../quantity/degrees.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Horizon, SkylineNode } from '../claim.ts'
import { degreesText } from './degrees-text.ts'
import { type Context, type Field, reportError } from './field.ts'
import { readFileName } from './read-file-name.ts'
import type { LineOfSight } from './read-horizon.ts'
import { reportOutOfPlace } from './read-mapping.ts'
import { readSkyline } from './read-skyline.ts'

/** Reads a skyline profile, each file once. The line needs a direction, and where that is measured the profile has to reach it. */
export function readProfile(field: Field, line: LineOfSight, context: Context): Horizon | null {
  if (line.isOfAngle) return refuseWithoutDirection(field, line.name, context)
  const { skylines } = context.beside
  const file = readFileName(field, context)
  if (file === null) return null
  const nodes = skylines.has(file) ? (skylines.get(file) ?? null) : readSkyline(field, context)
  skylines.set(file, nodes)
  if (nodes === null) return null
  if (line.azimuthDeg !== undefined) checkReach(field, file, nodes, line.azimuthDeg, line.name, context)
  return { by: 'profile', file, nodes }
}

function checkReach(
  field: Field,
  file: string,
  nodes: readonly SkylineNode[],
  azimuthDeg: number,
  line: string,
  context: Context,
): void {
  const [first, last] = [nodes[0], nodes.at(-1)]
  if (first === undefined || last === undefined) return
  const steps = nodes
    .slice(1)
    .map((node, index) => wrap360(node.azimuthDeg - (nodes[index]?.azimuthDeg ?? 0)))
  const reach = steps.reduce((sum, step) => sum + step, 0)
  if (wrap360(azimuthDeg - first.azimuthDeg) <= reach) return
  const stretch = `from ${degreesText(first.azimuthDeg)} to ${degreesText(last.azimuthDeg)}`
  const message = `${quoted(file)} runs ${stretch}, and ${quoted(line)} looks to ${degreesText(azimuthDeg)}`
  reportError(context, field, 'outside-profile', message, { expected: 'a profile that reaches the line' })
}

function refuseWithoutDirection(field: Field, line: string, context: Context): null {
  const message = `${quoted(field.name)} has no place here: ${quoted(line)} is an angle alone, without the direction by which a profile is read`
  const expected =
    'the altitude, such as 1°30′ ± 2′; or the span by its three points, from, june and december'
  reportOutOfPlace(field, { message, expected }, context)
  return null
}
