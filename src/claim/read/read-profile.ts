import { wrap360 } from '../../quantity/degrees.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Horizon, SkylineNode } from '../claim.ts'
import { type Context, type Field, reportError } from './field.ts'
import { readFileName } from './read-file-name.ts'
import type { LineOfSight } from './read-horizon.ts'
import { readSkyline } from './read-skyline.ts'

/** Reads a skyline profile, each file once. It has to reach the azimuth of a line whose azimuth is measured. */
export function readProfile(field: Field, line: LineOfSight, context: Context): Horizon | null {
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
  const stretch = `from ${first.azimuthDeg}° to ${last.azimuthDeg}°`
  const message = `${quoted(file)} runs ${stretch}, and ${quoted(line)} looks to ${Number(azimuthDeg.toFixed(4))}°`
  reportError(context, field, 'outside-profile', message, { expected: 'a profile that reaches the line' })
}
