import { refractionByTable } from './refraction-by-table.ts'
import type { Skyline, SkylineNode } from './skyline.ts'

/** A skyline as it would stand without air; degrees. */
export interface TrueSkyline {
  /** Clockwise, growing from node to node, past 360° where it runs through north. */
  nodes: readonly { azimuthDeg: number; altitudeDeg: number }[]
  /** Goes all the way round: then it is carried on beyond both ends with what is there. */
  isClosed: boolean
}

/**
 * Steps in azimuth and altitude after which refraction is asked again, degrees. Near a level horizon refraction
 * bends by 6″ in a square tenth of a degree, of which a straight line between two nodes misses an eighth.
 */
const STEP_AZIMUTH_DEG = 0.25
const STEP_ALTITUDE_DEG = 0.1

/** How far a closed skyline is carried on beyond its ends, degrees: more than the half width of a disc. */
const CARRIED_ON_DEG = 4

/**
 * A skyline turned into true altitudes, H − R(H), which discs can be held against as plain geometry.
 * @param refractionArcmin Refraction at an apparent altitude in degrees.
 */
export function trueSkyline(
  { nodes, isClosed }: Skyline,
  refractionArcmin: (apparentAltitudeDeg: number) => number,
): TrueSkyline {
  const fine = [nodes[0]!, ...nodes.slice(1).flatMap((to, i) => stepsBetween(nodes[i]!, to))]
  const refraction = refractionByTable(refractionArcmin)
  const lowered = fine.map(({ azimuthDeg, altitudeDeg }) => ({
    azimuthDeg,
    altitudeDeg: altitudeDeg - refraction(altitudeDeg) / 60,
  }))
  return { nodes: isClosed ? carriedOn(lowered) : lowered, isClosed }
}

/** Nodes after the first up to the second, straight in apparent altitude. */
function stepsBetween(from: SkylineNode, to: SkylineNode): { azimuthDeg: number; altitudeDeg: number }[] {
  const turn = to.azimuthDeg - from.azimuthDeg
  const rise = to.altitudeDeg - from.altitudeDeg
  const steps = Math.ceil(Math.max(turn / STEP_AZIMUTH_DEG, Math.abs(rise) / STEP_ALTITUDE_DEG) - 1e-9)
  return Array.from({ length: steps }, (_, i) => {
    const share = (i + 1) / steps
    return {
      azimuthDeg: share === 1 ? to.azimuthDeg : from.azimuthDeg + share * turn,
      altitudeDeg: share === 1 ? to.altitudeDeg : from.altitudeDeg + share * rise,
    }
  })
}

function carriedOn(nodes: TrueSkyline['nodes']): TrueSkyline['nodes'] {
  const start = nodes[0]!.azimuthDeg
  const end = nodes.at(-1)!.azimuthDeg
  const turned = (by: number) =>
    nodes.map(({ azimuthDeg, altitudeDeg }) => ({ azimuthDeg: azimuthDeg + by, altitudeDeg }))
  return [
    ...turned(start - end).filter(
      ({ azimuthDeg }) => azimuthDeg > start - CARRIED_ON_DEG && azimuthDeg < start,
    ),
    ...nodes,
    ...turned(end - start).filter(({ azimuthDeg }) => azimuthDeg > end && azimuthDeg < end + CARRIED_ON_DEG),
  ]
}
