import { DEG } from '../quantity/degrees.ts'
import { type EnvelopePoint, lowerEnvelope } from './lower-envelope.ts'
import { stepOnSphere } from './step-on-sphere.ts'
import type { TrueSkyline } from './true-skyline.ts'

/** A place of a disc's centre at which the disc stands on the skyline, and where the two touch; degrees. */
export interface DiscPlace {
  azimuthDeg: number
  altitudeDeg: number
  contactAzimuthDeg: number
}

/** Steps along the skyline, degrees: the path between two of them is straight to 0.01″. */
const STEP_DEG = 2 / 60
/** How far an arc may part from its chord, degrees. */
const SAG_DEG = 0.15 / 3600
/** A turn of the skyline that is none, degrees. */
const STRAIGHT_DEG = 1e-7

/**
 * The path of the centre of a disc that is rolled along under a skyline, or above it, without air: its curve parallel
 * to the skyline at a distance a, which no body's declination has a part in.
 *
 * It is the skyline moved sideways by a, with arcs about the points that stand out towards the disc, less what lies
 * nearer than a to some other part. To every azimuth belongs one altitude; places follow each other clockwise. Where
 * a disc touches in two points at once, its place is there twice, once with each.
 *
 * @param aboveCentreDeg How far the skyline stands from the centre: above it where positive, below where negative.
 * @returns Places to within the disc's half width of the skyline's ends: what stands beyond them could touch it first.
 */
export function discPath(skyline: TrueSkyline, aboveCentreDeg: number): DiscPlace[] {
  if (!(Math.abs(aboveCentreDeg) <= 1))
    throw new RangeError(`a disc's half width is 1° at most, got ${aboveCentreDeg}°`)
  // Rolled along below, the lowest of the moved lines counts; above, the highest, which is the lowest upside down.
  const side = aboveCentreDeg > 0 ? 1 : -1
  const distance = Math.abs(aboveCentreDeg)
  const path = lowerEnvelope(movedLines(skyline.nodes, side, distance)).map(({ x, y, along }) => ({
    azimuthDeg: x,
    altitudeDeg: side * y,
    contactAzimuthDeg: along,
  }))
  const start = skyline.nodes[0]!.azimuthDeg
  const end = skyline.nodes.at(-1)!.azimuthDeg
  return path.filter(({ azimuthDeg, altitudeDeg }) => {
    const halfWidth = Math.asin(Math.min(1, Math.sin(distance * DEG) / Math.cos(altitudeDeg * DEG))) / DEG
    // The moved line of a level skyline begins where the skyline does, to the last digit.
    return azimuthDeg >= start + halfWidth - 1e-9 && azimuthDeg <= end - halfWidth + 1e-9
  })
}

/** The skyline moved sideways; a new line begins wherever the moved parts cut across each other. */
function movedLines(nodes: TrueSkyline['nodes'], side: number, distance: number): EnvelopePoint[][] {
  const lines: EnvelopePoint[][] = [[]]
  let before: number | null = null
  for (let i = 1; i < nodes.length; i++) {
    const [from, to] = [nodes[i - 1]!, nodes[i]!]
    const bearing = bearingAt(from, to, from.altitudeDeg)
    // Turning upwards opens a gap below, which an arc fills; turning downwards does so above.
    const opening = before === null ? 0 : side * (before - bearing)
    if (opening > STRAIGHT_DEG && distance > 0)
      lines.at(-1)!.push(...arc(from, before!, bearing, side, distance))
    else if (opening < -STRAIGHT_DEG && distance > 0) lines.push([])
    lines.at(-1)!.push(...movedEdge(from, to, side, distance))
    before = bearingAt(from, to, to.altitudeDeg)
  }
  return lines
}

type Node = TrueSkyline['nodes'][number]

/** Bearing from the zenith of an edge, where it passes an altitude: 90° where it is level, less where it climbs. */
function bearingAt(from: Node, to: Node, altitudeDeg: number): number {
  const across = (to.azimuthDeg - from.azimuthDeg) * Math.cos(altitudeDeg * DEG)
  return Math.atan2(across, to.altitudeDeg - from.altitudeDeg) / DEG
}

function movedEdge(from: Node, to: Node, side: number, distance: number): EnvelopePoint[] {
  const turn = to.azimuthDeg - from.azimuthDeg
  const rise = to.altitudeDeg - from.altitudeDeg
  const length = Math.hypot(turn * Math.cos(from.altitudeDeg * DEG), rise)
  const steps = Math.max(1, Math.ceil(length / STEP_DEG))
  return Array.from({ length: steps + 1 }, (_, i) => {
    const azimuthDeg = from.azimuthDeg + (i / steps) * turn
    const altitudeDeg = from.altitudeDeg + (i / steps) * rise
    return moved({ azimuthDeg, altitudeDeg }, bearingAt(from, to, altitudeDeg), side, distance)
  })
}

/** The places of a disc that turns about a point, between its ends. */
function arc(about: Node, before: number, after: number, side: number, distance: number): EnvelopePoint[] {
  const widest = Math.sqrt((8 * SAG_DEG * DEG) / (distance * DEG)) / DEG
  const steps = Math.ceil(Math.abs(after - before) / widest)
  return Array.from({ length: Math.max(0, steps - 1) }, (_, i) =>
    moved(about, before + ((i + 1) / steps) * (after - before), side, distance),
  )
}

function moved(node: Node, bearing: number, side: number, distance: number): EnvelopePoint {
  const along = node.azimuthDeg
  if (distance === 0) return { x: node.azimuthDeg, y: side * node.altitudeDeg, along }
  const { azimuthDeg, altitudeDeg } = stepOnSphere(
    node.azimuthDeg,
    node.altitudeDeg,
    bearing + side * 90,
    distance,
  )
  return { x: azimuthDeg, y: side * altitudeDeg, along }
}
