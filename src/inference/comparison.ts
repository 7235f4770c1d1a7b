import { wrap180 } from '../quantity/degrees.ts'
import { lnNormalBetween } from './normal.ts'
import type { Branch, CurvePiece, Prediction, Sight } from './sight.ts'

/**
 * The line held against one branch of its target in one year, before any build tolerance. `straight`: the direction
 * answers the errors in proportion. `curved`: it does not, near the meridian; then the directions over a run of
 * errors stand in for the derivative.
 */
export type Comparison = Straight | Curved

export interface Straight {
  kind: 'straight'
  /** The line less the target's direction, degrees. */
  offsetDeg: number
  /** Variance of the errors of this line and its target alone, degrees². */
  variance: number
  /** The part of it that is the measurement's, which lines on one axis share. */
  measuredVariance: number
  axis: string | null
  toleranceScale: number
  /** Names the north that lines share the error of. */
  northOf: string | null
  /** Effects of one standard deviation of the errors that lines share: north and obliquity, degrees. */
  shared: readonly [north: number, obliquity: number]
}

export interface Curved {
  kind: 'curved'
  /** Whether the target gets there as it is, and not only by some of its likely errors. */
  reached: boolean
  /** Of the measurement of this line alone, degrees². */
  variance: number
  measuredVariance: number
  axis: string | null
  toleranceScale: number
  northOf: string | null
  /** As of a straight one; the error of the obliquity is in the pieces. */
  shared: readonly [north: number, obliquity: 0]
  /** Runs of likely errors, with offsets in place of directions. */
  pieces: readonly CurvePiece[]
  /** What the pieces come to all in all. */
  run: RunOfErrors
}

/** The offset over all likely errors of a curved comparison. */
export interface RunOfErrors {
  meanDeg: number
  /** Of the offset about its mean, degrees². */
  variance: number
  /** Of that the part which no straight line through the errors explains: how far it is from a straight comparison. */
  bend: number
}

/** Sums up the pieces of a curved comparison. */
export function runOf(pieces: readonly CurvePiece[]): RunOfErrors {
  let [total, z, zz, d, dd, zd] = [0, 0, 0, 0, 0, 0]
  for (const { fromSd, toSd, fromDeg, toDeg } of pieces) {
    const mass = Math.exp(lnNormalBetween(fromSd, toSd))
    if (mass === 0) continue
    // Moments of a normal error cut to the piece, in which the offset is start + slope · error.
    const first = density(fromSd) - density(toSd)
    const second = mass + fromSd * density(fromSd) - toSd * density(toSd)
    const slope = (toDeg - fromDeg) / (toSd - fromSd)
    const start = fromDeg - slope * fromSd
    total += mass
    z += first
    zz += second
    d += start * mass + slope * first
    dd += start * start * mass + 2 * start * slope * first + slope * slope * second
    zd += start * first + slope * second
  }
  if (total === 0) return { meanDeg: 0, variance: 0, bend: 0 }
  const [meanZ, meanDeg] = [z / total, d / total]
  const variance = Math.max(0, dd / total - meanDeg ** 2)
  const [spreadZ, together] = [zz / total - meanZ ** 2, zd / total - meanZ * meanDeg]
  const explained = spreadZ > 0 ? together ** 2 / spreadZ : 0
  return { meanDeg, variance, bend: Math.max(0, variance - explained) }
}

function density(sd: number): number {
  return Math.exp(-(sd * sd) / 2) / Math.sqrt(2 * Math.PI)
}

/** Whether the target gets there as it is. */
export function isReached(comparison: Comparison | null): boolean {
  return comparison !== null && (comparison.kind === 'straight' || comparison.reached)
}

/** Null where the target is not to be seen so, by any of its likely errors either. */
export function compare(sight: Sight, branch: Branch, year: number): Comparison | null {
  const prediction = branch.predict(year)
  const pieces = branch.curve?.(year) ?? null
  if (pieces !== null) return pieces.length === 0 ? null : curved(sight, pieces, prediction !== null)
  return prediction === null ? null : straight(sight, prediction)
}

function straight(sight: Sight, { directionDeg, errors }: Prediction): Straight {
  let variance = sight.measuredSdDeg ** 2
  let obliquity = 0
  for (const { effectDeg, shared } of errors) {
    if (shared) obliquity = Math.hypot(obliquity, effectDeg) * Math.sign(effectDeg || 1)
    else variance += effectDeg ** 2
  }
  return {
    kind: 'straight',
    offsetDeg: wrap180(sight.measuredDeg - directionDeg),
    variance,
    measuredVariance: sight.measuredSdDeg ** 2,
    axis: sight.axis,
    toleranceScale: sight.toleranceScale,
    northOf: sight.northOf,
    shared: [sight.northSdDeg, obliquity],
  }
}

function curved(sight: Sight, pieces: readonly CurvePiece[], reached: boolean): Curved {
  const offsets = pieces.map(({ fromSd, toSd, fromDeg, toDeg }) => {
    const offset = wrap180(sight.measuredDeg - fromDeg)
    return { fromSd, toSd, fromDeg: offset, toDeg: offset - (toDeg - fromDeg) }
  })
  return {
    kind: 'curved',
    reached,
    variance: sight.measuredSdDeg ** 2,
    measuredVariance: sight.measuredSdDeg ** 2,
    axis: sight.axis,
    toleranceScale: sight.toleranceScale,
    northOf: sight.northOf,
    shared: [sight.northSdDeg, 0],
    pieces: offsets,
    run: runOf(offsets),
  }
}

/** The line less the target's direction, degrees; null where the target does not get there. */
export function offsetDeg(sight: Sight, branch: Branch, year: number): number | null {
  const prediction = branch.predict(year)
  return prediction === null ? null : wrap180(sight.measuredDeg - prediction.directionDeg)
}

/** Standard deviation of the offset in a year without any build tolerance, degrees; null likewise. */
export function offsetSdDeg(sight: Sight, branch: Branch, year: number): number | null {
  const prediction = branch.predict(year)
  if (prediction === null) return null
  const effects = prediction.errors.map(({ effectDeg }) => effectDeg)
  return Math.hypot(sight.measuredSdDeg, sight.northSdDeg, ...effects)
}

/** Of a sight's branches in one year, the offset nearest to the line with its standard deviation; degrees. */
export function nearestOffset(
  sight: Sight,
  year: number,
): { offsetDeg: number; sdDeg: number; directionDeg: number } | null {
  const offsets = sight.branches.flatMap((branch) => {
    const offset = offsetDeg(sight, branch, year)
    const sd = offsetSdDeg(sight, branch, year)
    return offset === null || sd === null
      ? []
      : [{ offsetDeg: offset, sdDeg: sd, directionDeg: branch.predict(year)!.directionDeg }]
  })
  return offsets.sort((a, b) => Math.abs(a.offsetDeg) - Math.abs(b.offsetDeg))[0] ?? null
}
