/**
 * Error function to 1.2e-7 by the rational Chebyshev fit of Numerical Recipes (Press et al. 1992, section 6.2), for
 * the complementary function, so that small tails keep their relative accuracy.
 */
function complementaryError(x: number): number {
  const z = Math.abs(x)
  const t = 1 / (1 + z / 2)
  const fit = [
    -1.26551223, 1.00002368, 0.37409196, 0.09678418, -0.18628806, 0.27886807, -1.13520398, 1.48851587,
    -0.82215223, 0.17087277,
  ].reduceRight((sum, c) => sum * t + c, 0)
  const tail = t * Math.exp(-z * z + fit)
  return x >= 0 ? tail : 2 - tail
}

/** Probability that a standard normal variable lies between a and b, in either order. */
export function normalBetween(a: number, b: number): number {
  const low = Math.min(a, b)
  const high = Math.max(a, b)
  // Work on the side of the smaller tail, where differences of tails do not cancel.
  if (low >= 0) return (complementaryError(low / Math.SQRT2) - complementaryError(high / Math.SQRT2)) / 2
  if (high <= 0) return (complementaryError(-high / Math.SQRT2) - complementaryError(-low / Math.SQRT2)) / 2
  return 1 - (complementaryError(-low / Math.SQRT2) + complementaryError(high / Math.SQRT2)) / 2
}
