import type { Comparison, Curved, Straight } from './comparison.ts'
import { normalBetween } from './normal.ts'

/** A direction given without any error still has one of 0.01″: keeps divisions finite, covariances regular. */
const SMALLEST_SD_DEG = 0.01 / 3600

/**
 * Logarithm of the weight of one year, up to a constant: how well the target of that year explains the lines when
 * each was built with a standard deviation of `toleranceDeg` about it.
 *
 * For one line ln[(1/s) exp(−d²/2s²)] with s² = τ² + the comparison's variances. For several the multivariate normal
 * density with the errors they share (north, obliquity) as its correlation. A curved comparison counts as
 * independent of the others. −∞ where one of the targets is not to be seen at that altitude at all.
 */
export function lnWeight(comparisons: readonly (Comparison | null)[], toleranceDeg: number): number {
  const first = comparisons[0]
  if (comparisons.length === 1 && first?.kind === 'straight') return lnOfOne(first, toleranceDeg)
  const straight: Straight[] = []
  let sum = 0
  for (const comparison of comparisons) {
    if (comparison === null || comparison === undefined) return -Infinity
    if (comparison.kind === 'straight') straight.push(comparison)
    else sum += lnOfCurved(comparison, toleranceDeg)
  }
  return straight.length === 0 ? sum : sum + lnOfSeveral(straight, toleranceDeg)
}

/** Variance of one line's own errors together with its build tolerance, degrees². */
function ownVariance(variance: number, toleranceDeg: number): number {
  return Math.max(SMALLEST_SD_DEG ** 2, variance + toleranceDeg ** 2)
}

function lnOfOne({ offsetDeg, variance, shared }: Straight, toleranceDeg: number): number {
  const total = ownVariance(variance, toleranceDeg) + shared[0] ** 2 + shared[1] ** 2
  return -(Math.log(total) + (offsetDeg * offsetDeg) / total) / 2
}

/** ln of the normal density by Cholesky's factors L Lᵀ of the covariance: −½(ln det + |L⁻¹ d|²). */
function lnOfSeveral(lines: readonly Straight[], toleranceDeg: number): number {
  const factor: number[][] = []
  const scaled: number[] = []
  let sum = 0
  lines.forEach((line, i) => {
    const row: number[] = []
    let diagonal = ownVariance(line.variance, toleranceDeg) + line.shared[0] ** 2 + line.shared[1] ** 2
    let rest = line.offsetDeg
    for (let j = 0; j < i; j++) {
      const other = lines[j]!
      let entry = line.shared[0] * other.shared[0] + line.shared[1] * other.shared[1]
      for (let k = 0; k < j; k++) entry -= row[k]! * factor[j]![k]!
      entry /= factor[j]![j]!
      row.push(entry)
      diagonal -= entry * entry
      rest -= entry * scaled[j]!
    }
    row.push(Math.sqrt(diagonal))
    factor.push(row)
    scaled.push(rest / row[i]!)
    sum -= (Math.log(diagonal) + scaled[i]! ** 2) / 2
  })
  return sum
}

/** ln of the density averaged over the pieces, azimuth running straight inside each. */
function lnOfCurved({ pieces, variance }: Curved, toleranceDeg: number): number {
  const sd = Math.sqrt(ownVariance(variance, toleranceDeg))
  let density = 0
  let nearest = Infinity
  for (const { probability, fromDeg, toDeg } of pieces) {
    const a = fromDeg / sd
    const b = toDeg / sd
    const width = Math.abs(b - a)
    // Over a narrow piece the difference of two tails loses its digits, and the middle stands for the whole.
    const mean =
      width > 1e-3 ? (normalBetween(a, b) * Math.sqrt(2 * Math.PI)) / width : Math.exp(-((a + b) ** 2) / 8)
    density += probability * mean
    nearest = Math.min(nearest, Math.abs(a), Math.abs(b))
  }
  // Far out in the tail the sum runs out of digits; its nearest end says how far it is.
  return density > 1e-290 ? Math.log(density / sd) : -(nearest * nearest) / 2 - Math.log(sd)
}
