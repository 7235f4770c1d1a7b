import type { Audit, PlanPoint } from '../../audit/audit.ts'
import { DEG } from '../../quantity/degrees.ts'
import { nearPoints } from './plan-near.ts'
import { along, onRim, type Rim, type Spot } from './plan-rim.ts'
import type { PlanSource } from './plan-source.ts'

/** A point in its place on the drawing. */
export interface ScenePoint {
  index: number
  point: PlanPoint
  at: Spot
}

/** One line of sight on the drawing. */
export interface SceneRay {
  source: PlanSource
  /** Of an angle, its first line carries no wedge: the angle is laid off from it. */
  part: 'line' | 'first' | 'second'
  from: Spot
  /** Drawn from this share of the way to the rim: a direction without a place is drawn at the rim only. */
  startShare: number
  azimuthDeg: number
  rim: Spot
  /** Where it ends beyond the plan. */
  far: { name: string; distanceM: number | null } | null
}

export interface PlanScene {
  rim: Rim
  /** Points of the drawing to a metre; null where the plan holds no distance. */
  scale: number | null
  points: readonly ScenePoint[]
  rays: readonly SceneRay[]
}

/** How much of the rim's radius the points take. */
const FILL = 0.72
/** A bare direction beside points that have places. */
const STUB = 0.74

/** Puts the points and the lines of a plan inside a rim, true north up. */
export function planScene({ plan }: Audit, sources: readonly PlanSource[], rim: Rim): PlanScene {
  const stands = sources.flatMap(({ line }) => line.from ?? [])
  const near = nearPoints(plan.points, stands)
  const [middle, radiusM] = circleAbout(near.map((index) => plan.points[index]!))
  const scale = radiusM > 0 ? (FILL * rim.radius) / radiusM : null
  const points = near.map((index) => ({ index, point: plan.points[index]!, at: spotOf(plan.points[index]!) }))
  function spotOf({ east_m, north_m }: PlanPoint): Spot {
    const [x, y] = rim.centre
    return [x + (east_m - middle.east) * (scale ?? 0), y - (north_m - middle.north) * (scale ?? 0)]
  }
  return { rim, scale, points, rays: sources.flatMap((source) => raysOf(source, plan.points, points, rim)) }
}

function raysOf(
  source: PlanSource,
  all: readonly PlanPoint[],
  points: readonly ScenePoint[],
  rim: Rim,
): SceneRay[] {
  const { line } = source
  const stand = points.find(({ index }) => index === line.from)
  const azimuth = azimuthOf(stand, line.to, points) ?? line.azimuth_deg
  if (azimuth === null) return []
  const from = stand?.at ?? rim.centre
  const startShare = stand === undefined && points.length > 0 ? STUB : 0
  const ray = (part: SceneRay['part'], azimuthDeg: number, to: number | null, distanceM: number | null) => ({
    ...{ source, part, from, startShare, azimuthDeg },
    rim: onRim(rim, from, azimuthDeg),
    far: to === null || points.some(({ index }) => index === to) ? null : { name: all[to]!.name, distanceM },
  })
  if (line.span === null) return [ray('line', azimuth, line.to, line.length_m)]
  const second = azimuthOf(stand, line.span.to, points) ?? azimuth + line.span.angle_deg
  return [ray('first', azimuth, line.to, null), ray('second', second, line.span.to, null)]
}

/** From one point to another where both are on the drawing and apart. */
function azimuthOf(
  stand: ScenePoint | undefined,
  to: number | null,
  points: readonly ScenePoint[],
): number | null {
  const aim = points.find(({ index }) => index === to)
  if (stand === undefined || aim === undefined) return null
  const [east, north] = [aim.at[0] - stand.at[0], stand.at[1] - aim.at[1]]
  return Math.hypot(east, north) < 1e-6 ? null : Math.atan2(east, north) / DEG
}

/** Middle of the points, and the distance from it within which they all lie with their widths, metres. */
function circleAbout(points: readonly PlanPoint[]): [{ east: number; north: number }, number] {
  if (points.length === 0) return [{ east: 0, north: 0 }, 0]
  const middleOf = (values: readonly number[]) => (Math.min(...values) + Math.max(...values)) / 2
  const east = middleOf(points.map(({ east_m }) => east_m))
  const north = middleOf(points.map(({ north_m }) => north_m))
  const reaches = points.map(
    ({ east_m, north_m, width_m }) => Math.hypot(east_m - east, north_m - north) + (width_m ?? 0) / 2,
  )
  return [{ east, north }, Math.max(...reaches)]
}

/** The spot at which a ray begins to be drawn. */
export function startOf({ from, startShare, rim, azimuthDeg }: SceneRay): Spot {
  return along(from, azimuthDeg, startShare * Math.hypot(rim[0] - from[0], rim[1] - from[1]))
}
