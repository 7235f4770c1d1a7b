import type { Skyline } from '../../audit/audit.ts'

type Node = readonly [azimuthDeg: number, altitudeDeg: number]

const TURNS = [-360, 0, 360]
/** Two azimuths nearer than this are one, degrees. */
const SAME = 1e-9

/**
 * The parts of a skyline between two azimuths, straight between its nodes. One that is known by its altitude alone is
 * level; of a profile there is nothing beyond its ends. Azimuths may run through north.
 */
export function skylineParts({ nodes }: Skyline, fromDeg: number, toDeg: number): Node[][] {
  if (nodes.length === 1) {
    const altitude = nodes[0]![1]
    return [
      [
        [fromDeg, altitude],
        [toDeg, altitude],
      ],
    ]
  }
  return TURNS.map((turn) => partOf(turned(nodes, turn), fromDeg, toDeg)).filter((part) => part.length > 1)
}

/** The ends of a profile that lie between two azimuths, each with the side on which there is nothing. */
export function skylineEnds(
  { nodes }: Skyline,
  fromDeg: number,
  toDeg: number,
): { node: Node; beyond: 'left' | 'right' }[] {
  const [first, last] = [nodes[0], nodes.at(-1)]
  const isClosed = first === undefined || last === undefined || last[0] - first[0] >= 360 - SAME
  if (nodes.length < 2 || isClosed) return []
  return TURNS.flatMap((turn) => [
    { node: [first[0] + turn, first[1]] as const, beyond: 'left' as const },
    { node: [last[0] + turn, last[1]] as const, beyond: 'right' as const },
  ]).filter(({ node }) => node[0] > fromDeg && node[0] < toDeg)
}

/** The altitude of a skyline at an azimuth; beyond a profile's ends that of the nearer end. */
export function altitudeOfSkyline({ nodes }: Skyline, azimuthDeg: number): number {
  const all = TURNS.map((turn) => turned(nodes, turn))
  const found = all.flatMap((each) =>
    each.flatMap((to, index) => {
      const from = each[index - 1]
      if (from === undefined || azimuthDeg < from[0] || azimuthDeg > to[0]) return []
      return [between(from, to, azimuthDeg)]
    }),
  )
  if (found[0] !== undefined) return found[0]
  const ends = all.flatMap((each) => [each[0]!, each.at(-1)!])
  const distance = ([azimuth]: Node) => Math.abs(azimuth - azimuthDeg)
  return ends.reduce((best, end) => (distance(end) < distance(best) ? end : best))[1]
}

function turned(nodes: readonly Node[], turn: number): Node[] {
  return nodes.map(([azimuth, altitude]) => [azimuth + turn, altitude])
}

function partOf(nodes: readonly Node[], fromDeg: number, toDeg: number): Node[] {
  const [first, last] = [nodes[0]!, nodes.at(-1)!]
  const [from, to] = [Math.max(fromDeg, first[0]), Math.min(toDeg, last[0])]
  if (from >= to) return []
  const cut = (azimuth: number): Node => {
    const next = Math.max(
      1,
      nodes.findIndex((node) => node[0] >= azimuth),
    )
    return [azimuth, between(nodes[next - 1]!, nodes[next]!, azimuth)]
  }
  return [cut(from), ...nodes.filter(([azimuth]) => azimuth > from && azimuth < to), cut(to)]
}

function between(from: Node, to: Node, azimuthDeg: number): number {
  const width = to[0] - from[0]
  return width < SAME ? to[1] : from[1] + ((to[1] - from[1]) * (azimuthDeg - from[0])) / width
}
