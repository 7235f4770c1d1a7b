import type { Comparison, Straight } from './comparison.ts'
import { lnNormalBetween } from './normal.ts'
import type { CurvePiece } from './sight.ts'

/** A direction given without any error still has one of 0.01″: keeps divisions finite, covariances regular. */
const SMALLEST_SD_DEG = 0.01 / 3600

/**
 * Logarithm of the weight of one year, up to a constant: how well the targets of that year explain the lines when
 * each was built with a standard deviation of `toleranceDeg` about its target.
 *
 * For one line and branch ln[(1/s) exp(−d²/2s²)] with s² = τ² + the comparison's variances; for several branches of a
 * target the mean over them. Several lines are taken one after the other, each given those before it, by the errors
 * that they share: their north, their build error and survey where they stand on one axis, and the obliquity. For
 * straight comparisons that is the multivariate normal density. Curved ones come after them, the less bent first, and
 * last those of several branches; the last one is exact, to those after it each other one counts as normal about its
 * mean.
 * The obliquity is in the pieces of a curved one, and so not shared. −∞ where a target is not to be seen so at all.
 *
 * @param comparisons One list for each line, with one entry for each branch of its target.
 */
export function lnWeight(
  comparisons: readonly (readonly (Comparison | null)[])[],
  toleranceDeg: number,
): number {
  const { straight, others } = sorted(comparisons)
  const factor: Factor = []
  let sum = 0
  for (const line of straight) {
    const given = givenThe(factor, line, toleranceDeg)
    sum += lnOfStraight(line, given)
    if (straight.length + others.length > 1) append(factor, line, given, line.offsetDeg, 0)
  }
  for (const [i, branches] of others.entries()) {
    const logs = branches.map((branch) =>
      branch === null ? -Infinity : lnOfBranch(branch, givenThe(factor, branch, toleranceDeg)),
    )
    const top = Math.max(...logs)
    if (top === -Infinity) return -Infinity
    sum += top + Math.log(logs.reduce((total, ln) => total + Math.exp(ln - top), 0) / logs.length)
    if (i < others.length - 1) appendBranch(factor, branches[logs.indexOf(top)]!, toleranceDeg)
  }
  return sum
}

/** Lines of one straight course, and the rest. */
function sorted(comparisons: readonly (readonly (Comparison | null)[])[]): {
  straight: Straight[]
  others: (readonly (Comparison | null)[])[]
} {
  const straight: Straight[] = []
  const others: (readonly (Comparison | null)[])[] = []
  for (const branches of comparisons) {
    const only = branches.length === 1 ? branches[0]! : null
    if (only?.kind === 'straight') straight.push(only)
    else others.push(branches)
  }
  // The more a line bends, the less it counts as normal to those after it: the most bent one comes last.
  return { straight, others: others.sort((a, b) => bendOf(a) - bendOf(b)) }
}

function bendOf(branches: readonly (Comparison | null)[]): number {
  const only = branches.length === 1 ? branches[0]! : null
  return only?.kind === 'curved' ? only.run.bend : Infinity
}

/**
 * Lines taken so far: the rows of Cholesky's factor L of their covariance Σ = L Lᵀ, and their offsets in it, L⁻¹ d.
 */
type Factor = { line: Comparison; row: readonly number[]; scaled: number }[]

/** What a line's offset is to be expected as, given the lines before it. */
interface Given {
  row: readonly number[]
  meanDeg: number
  /** Of the offset about that mean, degrees². */
  variance: number
}

function givenThe(factor: Factor, line: Comparison, toleranceDeg: number): Given {
  const row: number[] = []
  let meanDeg = 0
  let variance = ownVariance(line, toleranceDeg) + line.shared[0] ** 2 + line.shared[1] ** 2
  factor.forEach((before, j) => {
    let entry = covariance(line, before.line, toleranceDeg)
    for (let k = 0; k < j; k++) entry -= row[k]! * before.row[k]!
    entry /= before.row[j]!
    row.push(entry)
    meanDeg += entry * before.scaled
    variance -= entry * entry
  })
  return { row, meanDeg, variance: Math.max(variance, SMALLEST_SD_DEG ** 2) }
}

/** @param spread Variance that the line has besides what it is given to have, degrees². */
function append(
  factor: Factor,
  line: Comparison,
  { row, meanDeg, variance }: Given,
  offsetDeg: number,
  spread: number,
): void {
  const sd = Math.sqrt(variance + spread)
  factor.push({ line, row: [...row, sd], scaled: (offsetDeg - meanDeg) / sd })
}

function appendBranch(factor: Factor, branch: Comparison, toleranceDeg: number): void {
  const given = givenThe(factor, branch, toleranceDeg)
  if (branch.kind === 'straight') append(factor, branch, given, branch.offsetDeg, 0)
  else append(factor, branch, given, branch.run.meanDeg, branch.run.variance)
}

/** Variance of one line's own errors together with its build tolerance, degrees². */
function ownVariance(
  { variance, toleranceScale }: Pick<Comparison, 'variance' | 'toleranceScale'>,
  toleranceDeg: number,
): number {
  return Math.max(SMALLEST_SD_DEG ** 2, variance + (toleranceScale * toleranceDeg) ** 2)
}

function lnOfBranch(branch: Comparison, given: Given): number {
  return branch.kind === 'straight'
    ? lnOfStraight(branch, given)
    : lnOfCurved(branch.pieces, given.variance, given.meanDeg)
}

function lnOfStraight({ offsetDeg }: Straight, { meanDeg, variance }: Given): number {
  return -(Math.log(variance) + (offsetDeg - meanDeg) ** 2 / variance) / 2
}

function covariance(a: Comparison, b: Comparison, toleranceDeg: number): number {
  const ofNorth = a.northOf === b.northOf ? a.shared[0] * b.shared[0] : 0
  return ofNorth + a.shared[1] * b.shared[1] + axisCovariance(a, b, toleranceDeg)
}

function axisCovariance(a: Comparison, b: Comparison, toleranceDeg: number): number {
  if (a.axis === null || a.axis !== b.axis) return 0
  const built = a.toleranceScale * b.toleranceScale * toleranceDeg ** 2
  return built + Math.min(a.measuredVariance, b.measuredVariance)
}

/**
 * Squared deviation of the lines from their targets in one year when each was built exactly: of normal errors it has
 * the χ² distribution with as many degrees of freedom as there are lines. Of a target of several branches the nearest
 * counts; a curved comparison gives −2 ln of its density over the highest it could have, and the square of the error
 * that it takes for the target to be seen at all. Infinity where a target is not to be seen so, by any of its likely
 * errors either.
 */
export function squaredDeviation(comparisons: readonly (readonly (Comparison | null)[])[]): number {
  const { straight, others } = sorted(comparisons)
  const factor: Factor = []
  let sum = 0
  for (const line of straight) {
    const given = givenThe(factor, line, 0)
    sum += squaredOf(line, given)
    append(factor, line, given, line.offsetDeg, 0)
  }
  for (const branches of others) {
    const squares = branches.map((branch) =>
      branch === null ? Infinity : squaredOf(branch, givenThe(factor, branch, 0)),
    )
    const least = Math.min(...squares)
    if (least === Infinity) return Infinity
    sum += least
    appendBranch(factor, branches[squares.indexOf(least)]!, 0)
  }
  return sum
}

function squaredOf(branch: Comparison, { meanDeg, variance }: Given): number {
  if (branch.kind === 'straight') return (branch.offsetDeg - meanDeg) ** 2 / variance
  const { pieces } = branch
  const best = Math.max(...likelyTurns(pieces).map((turn) => lnOfCurved(pieces, variance, turn)))
  return leastError(pieces) ** 2 + Math.max(0, 2 * (best - lnOfCurved(pieces, variance, meanDeg)))
}

/** The error that it takes for the target to be seen at all, in standard deviations. */
function leastError(pieces: readonly CurvePiece[]): number {
  return Math.min(...pieces.map(({ fromSd, toSd }) => nearestToZero(fromSd, toSd)))
}

/** Errors within so many standard deviations of the likeliest are tried for the highest density. */
const LIKELY_SD = 3

/** By how much the line would have to turn back, degrees, to stand where each of the likelier errors take its target. */
function likelyTurns(pieces: readonly CurvePiece[]): number[] {
  const least = leastError(pieces)
  return pieces
    .filter(({ fromSd, toSd }, i) => i % 2 === 0 && nearestToZero(fromSd, toSd) < least + LIKELY_SD)
    .map(({ fromDeg, toDeg }) => (fromDeg + toDeg) / 2)
}

/** Beside a piece that is likelier by so many nepers another adds nothing. */
const NEGLIGIBLE = 20

/** ln of the density averaged over the errors, exact where direction runs straight inside each piece. */
function lnOfCurved(pieces: readonly CurvePiece[], variance: number, turnedBackDeg: number): number {
  const sd = Math.sqrt(variance)
  let [highest, likeliest] = [-Infinity, pieces[0]!]
  for (const piece of pieces) {
    const bound = boundOf(piece, turnedBackDeg, sd)
    if (bound > highest) [highest, likeliest] = [bound, piece]
  }
  const reference = lnOfPiece(likeliest, turnedBackDeg, sd)
  let sum = 0
  for (const piece of pieces) {
    if (boundOf(piece, turnedBackDeg, sd) < reference - NEGLIGIBLE) continue
    sum += Math.exp(lnOfPiece(piece, turnedBackDeg, sd) - reference)
  }
  return reference + Math.log(sum) - Math.log(sd)
}

/** No error of the piece together with the offset it leaves is likelier than this, in nepers. */
function boundOf({ fromSd, toSd, fromDeg, toDeg }: CurvePiece, turnedBackDeg: number, sd: number): number {
  const error = nearestToZero(fromSd, toSd)
  const offset = nearestToZero((fromDeg - turnedBackDeg) / sd, (toDeg - turnedBackDeg) / sd)
  return -(error * error + offset * offset) / 2
}

function nearestToZero(a: number, b: number): number {
  return a * b <= 0 ? 0 : Math.min(Math.abs(a), Math.abs(b))
}

/**
 * ln of the integral over a run of normal errors z of their density times exp(−x²/2), x being the offset over its
 * standard deviation: with x = b + kz the product is a normal density once more, of variance 1/(1 + k²).
 */
function lnOfPiece({ fromSd, toSd, fromDeg, toDeg }: CurvePiece, turnedBackDeg: number, sd: number): number {
  const from = (fromDeg - turnedBackDeg) / sd
  const k = (toDeg - fromDeg) / sd / (toSd - fromSd)
  const b = from - k * fromSd
  const scale = Math.sqrt(1 + k * k)
  const standard = (z: number) => scale * z + (b * k) / scale
  return -((b / scale) ** 2) / 2 - Math.log(scale) + lnNormalBetween(standard(fromSd), standard(toSd))
}
