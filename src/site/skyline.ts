import { wrap360 } from '../quantity/degrees.ts'

/** One measured point of a skyline. */
export interface SkylineNode {
  /** From true north through east, degrees, 0 to 360. */
  azimuthDeg: number
  /** As the eye sees it, refraction included, degrees. */
  altitudeDeg: number
  sdDeg: number
}

/** A skyline, straight between its nodes. */
export interface Skyline {
  /** Clockwise. Azimuths grow from node to node, so that they pass 360° where the skyline runs through north. */
  nodes: readonly SkylineNode[]
  /** Whether it goes all the way round: then the last node is the first once more, 360° on. */
  isClosed: boolean
}

/** Altitudes between which skylines are: lower than any that is seen from a mountain, higher than any cliff. */
export const LOWEST_SKYLINE_DEG = -5
const HIGHEST_SKYLINE_DEG = 80

/** So that an end of a skyline lies within its reach, however its azimuth was rounded. */
const ROUNDING_DEG = 1e-9

/**
 * A skyline from its nodes, listed clockwise as one turns: 350°, 355°, 5°, 10° runs through north.
 * @throws RangeError on fewer than two nodes, an impossible number, nodes out of order, a gap of 180° or more, more
 *   than one turn, or a full turn whose two ends disagree.
 */
export function skylineOf(nodes: readonly SkylineNode[]): Skyline {
  if (nodes.length < 2) throw new RangeError(`a skyline has two nodes or more, got ${nodes.length}`)
  for (const node of nodes) checkNode(node)
  const turned: SkylineNode[] = [nodes[0]!]
  for (const node of nodes.slice(1)) {
    const before = turned.at(-1)!.azimuthDeg
    const step = wrap360(node.azimuthDeg - before)
    if (!(step > 0 && step < 180))
      throw new RangeError(
        `nodes follow each other clockwise, less than 180° apart: ${node.azimuthDeg}° cannot follow ${wrap360(before)}°; ` +
          'list the skyline from left to right',
      )
    turned.push({ ...node, azimuthDeg: before + step })
  }
  return { nodes: turned, isClosed: goesRound(turned) }
}

/**
 * Apparent altitude of a skyline at an azimuth, degrees, with its standard deviation; null outside its reach.
 * Between two nodes the standard deviation is taken in proportion, as if their errors went together.
 */
export function skylineAltitude(
  { nodes }: Skyline,
  azimuthDeg: number,
): { deg: number; sdDeg: number } | null {
  const start = nodes[0]!.azimuthDeg
  const azimuth = start + wrap360(azimuthDeg - start + ROUNDING_DEG) - ROUNDING_DEG
  const next = firstFrom(nodes, azimuth - ROUNDING_DEG)
  if (next === nodes.length) return null
  const to = nodes[next]!
  const from = nodes[Math.max(0, next - 1)]!
  const share = next === 0 ? 1 : (azimuth - from.azimuthDeg) / (to.azimuthDeg - from.azimuthDeg)
  return {
    deg: from.altitudeDeg + share * (to.altitudeDeg - from.altitudeDeg),
    sdDeg: from.sdDeg + share * (to.sdDeg - from.sdDeg),
  }
}

/** The index of the first node at an azimuth or after it, by bisection; their number where there is none. */
function firstFrom(nodes: readonly SkylineNode[], azimuthDeg: number): number {
  let [from, to] = [0, nodes.length]
  while (from < to) {
    const middle = (from + to) >> 1
    if (nodes[middle]!.azimuthDeg >= azimuthDeg) to = middle
    else from = middle + 1
  }
  return from
}

/** How far a profile runs round the horizon, degrees; 360 where it ends where it began. */
export function skylineWidthDeg(nodes: readonly Pick<SkylineNode, 'azimuthDeg'>[]): number {
  return wrap360(nodes.at(-1)!.azimuthDeg - nodes[0]!.azimuthDeg) || 360
}

function checkNode({ azimuthDeg, altitudeDeg, sdDeg }: SkylineNode): void {
  if (!(azimuthDeg >= 0 && azimuthDeg <= 360))
    throw new RangeError(`an azimuth is from 0° to 360°, got ${azimuthDeg}`)
  if (!(altitudeDeg >= LOWEST_SKYLINE_DEG && altitudeDeg <= HIGHEST_SKYLINE_DEG))
    throw new RangeError(
      `a skyline's altitude is from ${LOWEST_SKYLINE_DEG}° to ${HIGHEST_SKYLINE_DEG}°, got ${altitudeDeg}`,
    )
  if (!(sdDeg >= 0 && sdDeg < Infinity))
    throw new RangeError(`a standard deviation is 0° or more, got ${sdDeg}`)
}

function goesRound(nodes: readonly SkylineNode[]): boolean {
  const [first, last] = [nodes[0]!, nodes.at(-1)!]
  const turn = last.azimuthDeg - first.azimuthDeg
  if (turn > 360 + ROUNDING_DEG)
    throw new RangeError(`a skyline goes round once at most, got ${turn}°; end it at its first azimuth`)
  if (turn < 360 - ROUNDING_DEG) return false
  if (last.altitudeDeg !== first.altitudeDeg)
    throw new RangeError(
      `a skyline that goes all the way round ends as it began, got ${first.altitudeDeg}° and ${last.altitudeDeg}°`,
    )
  return true
}
