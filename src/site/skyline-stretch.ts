import { wrap360 } from '../quantity/degrees.ts'
import { type Skyline, type SkylineNode, skylineAltitude } from './skyline.ts'

/**
 * The part of a skyline from one azimuth clockwise to another, degrees, or as much of it as there is.
 *
 * Nothing is known beyond its ends, so a disc is followed to its own half width from them: ask for a degree more.
 * @throws RangeError where less than two azimuths of the skyline lie in it.
 */
export function skylineStretch(skyline: Skyline, fromDeg: number, toDeg: number): Skyline {
  const start = skyline.nodes[0]!.azimuthDeg
  const end = skyline.nodes.at(-1)!.azimuthDeg
  const width = wrap360(toDeg - fromDeg)
  const from = start + wrap360(fromDeg - start)
  // A stretch that begins before the skyline does may still run into it.
  const parts = [from - 360, from]
    .map(
      (low) => [Math.max(low, start), Math.min(low + width, skyline.isClosed ? low + width : end)] as const,
    )
    .filter(([low, high]) => high > low && low < end)
  const [low, high] = parts.reduce(
    (widest, part) => (part[1] - part[0] > widest[1] - widest[0] ? part : widest),
    [0, 0] as const,
  )
  if (!(high > low)) throw new RangeError(`the skyline has nothing between ${fromDeg}° and ${toDeg}°`)
  const turns = skyline.isClosed ? [0, 360] : [0]
  const inside = turns.flatMap((turn) =>
    skyline.nodes
      .map((node) => ({ ...node, azimuthDeg: node.azimuthDeg + turn }))
      .filter(({ azimuthDeg }) => azimuthDeg > low && azimuthDeg < high),
  )
  const nodes = [endOf(skyline, low), ...inside, endOf(skyline, high)]
  return { nodes: nodes.filter(isFurther), isClosed: false }
}

function endOf(skyline: Skyline, azimuthDeg: number): SkylineNode {
  const { deg, sdDeg } = skylineAltitude(skyline, azimuthDeg)!
  return { azimuthDeg, altitudeDeg: deg, sdDeg }
}

/** The first and the last node of a closed skyline are one. */
function isFurther({ azimuthDeg }: SkylineNode, i: number, nodes: readonly SkylineNode[]): boolean {
  return i === 0 || azimuthDeg > nodes[i - 1]!.azimuthDeg
}
