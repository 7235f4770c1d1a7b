import type { PlanPoint } from '../../audit/audit.ts'

/** Nothing nearer than this is left off the plan, metres. */
const ALWAYS_NEAR_M = 100
/** A point so many times as far off as the nearer ones lie apart is left off. */
const FAR = 6
/** Points within this are one place, metres. */
const ONE_PLACE_M = 1

/**
 * The indices of the points that a plan can show on one scale: those one stands at, then the others from the nearest
 * on, until one is so far off that the rest would shrink to a dot.
 */
export function nearPoints(points: readonly PlanPoint[], stands: readonly number[]): number[] {
  const near = stands.length > 0 ? [...new Set(stands)] : points.length > 0 ? [0] : []
  const left = points.map((_, index) => index).filter((index) => !near.includes(index))
  while (left.length > 0) {
    const reach = (index: number) => Math.min(...near.map((other) => apart(points[index]!, points[other]!)))
    left.sort((a, b) => reach(a) - reach(b))
    const extent = extentOf(near.map((index) => points[index]!))
    const most = extent < ONE_PLACE_M ? Number.POSITIVE_INFINITY : Math.max(ALWAYS_NEAR_M, FAR * extent)
    if (reach(left[0]!) > most) break
    near.push(left.shift()!)
  }
  return near.sort((a, b) => a - b)
}

function extentOf(points: readonly PlanPoint[]): number {
  return Math.max(...points.flatMap((a) => points.map((b) => apart(a, b))))
}

function apart(a: PlanPoint, b: PlanPoint): number {
  return Math.hypot(a.east_m - b.east_m, a.north_m - b.north_m)
}
