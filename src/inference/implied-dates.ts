import { offsetDeg, offsetSdDeg } from './comparison.ts'
import { sampleDates } from './date-sample.ts'
import { findRoot } from './find-root.ts'
import { posterior } from './posterior.ts'
import type { Branch, Sight } from './sight.ts'
import { smallestSet } from './smallest-set.ts'

export interface ImpliedDate {
  year: number
  /** Smallest 95 % interval at τ = 0 on the branch between two turning points; null where it runs into one. */
  interval95: readonly [number, number] | null
}

export interface NearestApproach {
  year: number
  /** The line less the target's azimuth, degrees; null where the target does not reach the altitude in any year. */
  offsetDeg: number | null
}

/** Step of the search, years: no target of the Sun turns round and back within it. */
const STEP = 20
const YEAR_PRECISION = 1e-4
/** Far below any error: 0.004″. */
const LEVEL_DEG = 1e-6
/**
 * From one summit of a skyline to the next the first gleam leaps past the line and never stands on it. A fast star
 * moves 1000 times less than this in the precision of a root.
 */
const NOTCH_DEG = 1e-3
/** Two azimuths further apart than this in one step are a jump across north, not a crossing. */
const JUMP_DEG = 90

/** Every year of a stretch in which a target stands on the line, ascending, over all its branches. */
export function impliedDates(sight: Sight, from: number, to: number): ImpliedDate[] {
  return sight.branches
    .flatMap((branch) => datesOfBranch(sight, branch, from, to))
    .sort((a, b) => a.year - b.year)
}

function datesOfBranch(sight: Sight, branch: Branch, from: number, to: number): ImpliedDate[] {
  const track = sampleTrack(sight, branch, from, to, STEP)
  const turns = turningYears(track, from, to)
  return crossings(sight, branch, track).map((year) => {
    const low = turns.findLast((turn) => turn < year) ?? from
    const high = turns.find((turn) => turn > year) ?? to
    return { year, interval95: intervalOnBranch(sight, branch, year, low, high) }
  })
}

/** The years alone, looked for in steps of `step` years. */
export function crossingYears(sight: Sight, from: number, to: number, step: number): number[] {
  return sight.branches
    .flatMap((branch) => crossings(sight, branch, sampleTrack(sight, branch, from, to, step)))
    .sort((a, b) => a - b)
}

/** The year of a stretch in which a target came nearest to the line. */
export function nearestApproach(sight: Sight, from: number, to: number): NearestApproach {
  const reached = sight.branches
    .flatMap((branch) => sampleTrack(sight, branch, from, to, STEP))
    .filter((point) => point.offset !== null)
  const nearest = reached.reduce<TrackPoint | null>(
    (best, point) => (best === null || Math.abs(point.offset!) < Math.abs(best.offset!) ? point : best),
    null,
  )
  if (nearest !== null) return { year: nearest.year, offsetDeg: nearest.offset }
  return { year: leastShortfall(sight, from, to), offsetDeg: null }
}

/** Where a target is never to be seen: the year in which it missed its altitude by least. */
function leastShortfall(sight: Sight, from: number, to: number): number {
  let best = { year: (from + to) / 2, shortfall: Infinity }
  for (let year = from; year <= to; year += STEP) {
    for (const branch of sight.branches) {
      const shortfall = branch.shortfallDeg?.(year) ?? Infinity
      if (shortfall < best.shortfall) best = { year, shortfall }
    }
  }
  return best.year
}

interface TrackPoint {
  year: number
  offset: number | null
}

function sampleTrack(sight: Sight, branch: Branch, from: number, to: number, step: number): TrackPoint[] {
  const steps = Math.max(1, Math.ceil((to - from) / step))
  const points = Array.from({ length: steps + 1 }, (_, i) =>
    pointOf(sight, branch, from + ((to - from) * i) / steps),
  )
  // Close to north or south the azimuth turns fast just before the target ceases to reach the altitude.
  return points.flatMap((point, i) => {
    const before = points[i - 1]
    const edge = before === undefined ? null : edgeOfReach(sight, branch, before, point)
    return edge === null ? [point] : [edge, point]
  })
}

function pointOf(sight: Sight, branch: Branch, year: number): TrackPoint {
  return { year, offset: offsetDeg(sight, branch, year) }
}

/** The outermost reached year between a reached and an unreached one; null where both are alike. */
function edgeOfReach(sight: Sight, branch: Branch, before: TrackPoint, after: TrackPoint): TrackPoint | null {
  if ((before.offset === null) === (after.offset === null)) return null
  let [reached, missed] = before.offset === null ? [after, before] : [before, after]
  while (Math.abs(reached.year - missed.year) > YEAR_PRECISION) {
    const middle = pointOf(sight, branch, (reached.year + missed.year) / 2)
    if (middle.offset === null) missed = middle
    else reached = middle
  }
  return reached
}

/** A track that does not move at all crosses nothing: what there is of it is rounding. */
function isLevel(track: readonly TrackPoint[]): boolean {
  const offsets = track.flatMap(({ offset }) => (offset === null ? [] : [offset]))
  const low = offsets.reduce((a, b) => Math.min(a, b), Infinity)
  const high = offsets.reduce((a, b) => Math.max(a, b), -Infinity)
  return high - low < LEVEL_DEG
}

function crossings(sight: Sight, branch: Branch, track: readonly TrackPoint[]): number[] {
  const years: number[] = []
  if (isLevel(track)) return years
  for (let i = 1; i < track.length; i++) {
    const before = track[i - 1]!
    const after = track[i]!
    if (before.offset === 0) years.push(before.year)
    if (before.offset === null || after.offset === null) continue
    const crosses = before.offset * after.offset < 0 && Math.abs(before.offset - after.offset) < JUMP_DEG
    if (!crosses) continue
    // Between two reached years the target is reached: the altitude it needs changes smoothly.
    const offset = (year: number) => offsetDeg(sight, branch, year) ?? 0
    const root = findRoot(offset, before.year, after.year, YEAR_PRECISION)
    if (Math.abs(offset(root)) < NOTCH_DEG) years.push(root)
  }
  const last = track.at(-1)!
  if (last.offset === 0) years.push(last.year)
  return years
}

/** Years in which the target turns round, or in which it begins or ceases to reach the altitude. */
function turningYears(track: readonly TrackPoint[], from: number, to: number): number[] {
  const years: number[] = [from]
  for (let i = 1; i < track.length - 1; i++) {
    const [before, here, after] = [track[i - 1]!.offset, track[i]!.offset, track[i + 1]!.offset]
    if (here === null) continue
    if (before === null || after === null) years.push(track[i]!.year)
    else if ((here - before) * (after - here) < 0) years.push(track[i]!.year)
  }
  return [...years, to]
}

function intervalOnBranch(
  sight: Sight,
  branch: Branch,
  year: number,
  low: number,
  high: number,
): readonly [number, number] | null {
  const sdYears = dateSdYears(sight, branch, year) ?? high - low
  const from = Math.max(low, year - 8 * sdYears)
  const to = Math.min(high, year + 8 * sdYears)
  const density = posterior(sampleDates([{ ...sight, branches: [branch] }], from, to, (to - from) / 800), 0)
  const [interval, ...others] = density === null ? [] : smallestSet(density, 0.95)
  if (interval === undefined || others.length > 0) return null
  const runsIntoTurn = interval[0] <= low || interval[1] >= high
  return runsIntoTurn ? null : interval
}

/** Standard deviation of a date at τ = 0 on the straight part of the track, years; null where the track is level. */
export function dateSdYears(sight: Sight, branch: Branch, year: number): number | null {
  const rate = driftDegPerYear(sight, branch, year)
  const sd = offsetSdDeg(sight, branch, year)
  return rate === null || sd === null || rate === 0 ? null : sd / Math.abs(rate)
}

/** Movement of the target's azimuth, degrees a year, over the century about a year; null where it is not reached. */
export function driftDegPerYear(sight: Sight, branch: Branch, year: number): number | null {
  const before = offsetDeg(sight, branch, year - 50)
  const after = offsetDeg(sight, branch, year + 50)
  return before === null || after === null ? null : (before - after) / 100
}
