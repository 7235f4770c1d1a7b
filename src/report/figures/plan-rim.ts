import { DEG } from '../../quantity/degrees.ts'

/** East and north of a drawing: x to the right, y downwards, points. */
export type Spot = readonly [x: number, y: number]

/** The circle about a plan at which its lines end. */
export interface Rim {
  centre: Spot
  radius: number
}

/** From a spot so many points along an azimuth. */
export function along([x, y]: Spot, azimuthDeg: number, length: number): Spot {
  return [x + length * Math.sin(azimuthDeg * DEG), y - length * Math.cos(azimuthDeg * DEG)]
}

/** Where a line from a spot inside the rim meets it. */
export function onRim({ centre, radius }: Rim, from: Spot, azimuthDeg: number): Spot {
  const [east, north] = [from[0] - centre[0], centre[1] - from[1]]
  const forward = east * Math.sin(azimuthDeg * DEG) + north * Math.cos(azimuthDeg * DEG)
  const left = radius ** 2 - east ** 2 - north ** 2
  return along(from, azimuthDeg, Math.sqrt(Math.max(0, forward ** 2 + left)) - forward)
}

/** The rim between two directions from a spot, as points that run clockwise; at most 3° from one to the next. */
export function rimBetween(rim: Rim, from: Spot, fromDeg: number, toDeg: number): Spot[] {
  const parts = Math.max(1, Math.ceil((toDeg - fromDeg) / 3))
  return Array.from({ length: parts + 1 }, (_, i) =>
    onRim(rim, from, fromDeg + ((toDeg - fromDeg) * i) / parts),
  )
}

/** A spot moved straight away from the rim's centre. */
export function outwards({ centre }: Rim, [x, y]: Spot, length: number): Spot {
  const distance = Math.hypot(x - centre[0], y - centre[1])
  if (distance === 0) return [x, y - length]
  return [x + ((x - centre[0]) * length) / distance, y + ((y - centre[1]) * length) / distance]
}
