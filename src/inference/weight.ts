import type { Comparison, Curved, Straight } from './comparison.ts'
import { lnNormalBetween } from './normal.ts'
import type { CurvePiece } from './sight.ts'

/** A direction given without any error still has one of 0.01″: keeps divisions finite, covariances regular. */
const SMALLEST_SD_DEG = 0.01 / 3600

/**
 * Logarithm of the weight of one year, up to a constant: how well the targets of that year explain the lines when
 * each was built with a standard deviation of `toleranceDeg` about its target.
 *
 * For one line and branch ln[(1/s) exp(−d²/2s²)] with s² = τ² + the comparison's variances; for several branches of a
 * target the mean over them. For several lines the multivariate normal density with the errors they share (north,
 * obliquity) as its correlation; a curved comparison, and a target of several branches, counts as independent of the
 * others. −∞ where one of the targets is not to be seen so at all.
 *
 * @param comparisons One list for each line, with one entry for each branch of its target.
 */
export function lnWeight(
  comparisons: readonly (readonly (Comparison | null)[])[],
  toleranceDeg: number,
): number {
  const straight: Straight[] = []
  let sum = 0
  for (const branches of comparisons) {
    const only = branches.length === 1 ? branches[0]! : null
    if (only?.kind === 'straight') straight.push(only)
    else sum += lnMeanOf(branches, toleranceDeg)
  }
  if (straight.length === 0) return sum
  return (
    sum + (straight.length === 1 ? lnOfOne(straight[0]!, toleranceDeg) : lnOfSeveral(straight, toleranceDeg))
  )
}

/** ln of the mean weight over the branches of one target; a branch that is not to be seen weighs nothing. */
function lnMeanOf(branches: readonly (Comparison | null)[], toleranceDeg: number): number {
  const logs = branches.map((branch) => {
    if (branch === null) return -Infinity
    return branch.kind === 'straight' ? lnOfOne(branch, toleranceDeg) : lnOfCurved(branch, toleranceDeg)
  })
  const top = Math.max(...logs)
  if (top === -Infinity) return -Infinity
  return top + Math.log(logs.reduce((sum, ln) => sum + Math.exp(ln - top), 0) / logs.length)
}

/** Variance of one line's own errors together with its build tolerance, degrees². */
function ownVariance(
  { variance, toleranceScale }: Pick<Comparison, 'variance' | 'toleranceScale'>,
  toleranceDeg: number,
): number {
  return Math.max(SMALLEST_SD_DEG ** 2, variance + (toleranceScale * toleranceDeg) ** 2)
}

function lnOfOne(line: Straight, toleranceDeg: number): number {
  const { offsetDeg, shared } = line
  const total = ownVariance(line, toleranceDeg) + shared[0] ** 2 + shared[1] ** 2
  return -(Math.log(total) + (offsetDeg * offsetDeg) / total) / 2
}

/** ln of the normal density: −½(ln det + dᵀ Σ⁻¹ d). */
function lnOfSeveral(lines: readonly Straight[], toleranceDeg: number): number {
  const { lnDeterminant, squared } = whitened(lines, toleranceDeg)
  return -(lnDeterminant + squared) / 2
}

/**
 * Squared distance of several lines from their targets in units of their joint errors, dᵀ Σ⁻¹ d, and the logarithm of
 * the determinant of Σ, by Cholesky's factors L Lᵀ of the covariance. Lines share the errors of north and of the
 * obliquity; lines on one axis share their build error and their survey.
 */
function whitened(
  lines: readonly Straight[],
  toleranceDeg: number,
): { lnDeterminant: number; squared: number } {
  const factor: number[][] = []
  const scaled: number[] = []
  let lnDeterminant = 0
  lines.forEach((line, i) => {
    const row: number[] = []
    let diagonal = ownVariance(line, toleranceDeg) + line.shared[0] ** 2 + line.shared[1] ** 2
    let rest = line.offsetDeg
    for (let j = 0; j < i; j++) {
      let entry = covariance(line, lines[j]!, toleranceDeg)
      for (let k = 0; k < j; k++) entry -= row[k]! * factor[j]![k]!
      entry /= factor[j]![j]!
      row.push(entry)
      diagonal -= entry * entry
      rest -= entry * scaled[j]!
    }
    row.push(Math.sqrt(Math.max(diagonal, SMALLEST_SD_DEG ** 2)))
    factor.push(row)
    scaled.push(rest / row[i]!)
    lnDeterminant += 2 * Math.log(row[i]!)
  })
  return { lnDeterminant, squared: scaled.reduce((sum, value) => sum + value * value, 0) }
}

function covariance(a: Straight, b: Straight, toleranceDeg: number): number {
  return a.shared[0] * b.shared[0] + a.shared[1] * b.shared[1] + axisCovariance(a, b, toleranceDeg)
}

function axisCovariance(a: Straight, b: Straight, toleranceDeg: number): number {
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
  const straight: Straight[] = []
  let sum = 0
  for (const branches of comparisons) {
    const only = branches.length === 1 ? branches[0]! : null
    if (only?.kind === 'straight') straight.push(only)
    else sum += Math.min(...branches.map(squaredOfBranch))
  }
  return straight.length === 0 ? sum : sum + whitened(straight, 0).squared
}

function squaredOfBranch(branch: Comparison | null): number {
  if (branch === null) return Infinity
  if (branch.kind === 'straight') return whitened([branch], 0).squared
  const best = Math.max(...likelyTurns(branch.pieces).map((turn) => lnOfCurved(branch, 0, turn)))
  return leastError(branch.pieces) ** 2 + Math.max(0, 2 * (best - lnOfCurved(branch, 0)))
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
function lnOfCurved(
  curved: Pick<Curved, 'pieces' | 'variance' | 'toleranceScale'>,
  toleranceDeg: number,
  turnedBackDeg = 0,
): number {
  const { pieces } = curved
  const sd = Math.sqrt(ownVariance(curved, toleranceDeg))
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
