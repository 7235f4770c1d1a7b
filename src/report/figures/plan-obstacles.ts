import type { Obstacle } from './place-around.ts'
import { along, outwards, type Spot } from './plan-rim.ts'
import { type PlanScene, startOf } from './plan-scene.ts'

/** What labels of a plan had better not lie on: the lines above all, the points, the rim. */
export function obstaclesOf({ rim, rays, points, scale }: PlanScene): Obstacle[] {
  const circle = Array.from({ length: 120 }, (_, i) => along(rim.centre, i * 3, rim.radius))
  return [
    ...circle.map((spot) => about(spot, 1.6, 2.5)),
    ...rays.flatMap((ray) => stretchObstacles(startOf(ray), outwards(rim, ray.rim, 8))),
    ...points.map(({ at, point }) => about(at, 3 + ((point.width_m ?? 0) * (scale ?? 0)) / 2, 4)),
  ]
}

/** A stroke from one spot to another. */
export function stretchObstacles(from: Spot, to: Spot): Obstacle[] {
  const parts = Math.max(1, Math.ceil(Math.hypot(to[0] - from[0], to[1] - from[1]) / 2.5))
  return Array.from({ length: parts + 1 }, (_, i) => {
    const share = i / parts
    return about([from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share], 1.6, 4)
  })
}

/** A square about a spot. */
export function about([x, y]: Spot, half: number, weight: number): Obstacle {
  return { left: x - half, right: x + half, top: y - half, bottom: y + half, weight }
}
