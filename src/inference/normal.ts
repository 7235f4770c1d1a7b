/**
 * Error function to 1.2e-7 by the rational Chebyshev fit of Numerical Recipes (Press et al. 1992, section 6.2), for
 * the complementary function, so that small tails keep their relative accuracy.
 */
function complementaryError(x: number): number {
  const z = Math.abs(x)
  const t = 1 / (1 + z / 2)
  let fit = 0
  for (const coefficient of FIT) fit = fit * t + coefficient
  const tail = t * Math.exp(-z * z + fit)
  return x >= 0 ? tail : 2 - tail
}

/** Highest power first. */
const FIT = [
  0.17087277, -0.82215223, 1.48851587, -1.13520398, 0.27886807, -0.18628806, 0.09678418, 0.37409196,
  1.00002368, -1.26551223,
]

/** Probability that a standard normal variable lies between a and b, in either order. */
export function normalBetween(a: number, b: number): number {
  const low = Math.min(a, b)
  const high = Math.max(a, b)
  // Work on the side of the smaller tail, where differences of tails do not cancel.
  if (low >= 0) return (complementaryError(low / Math.SQRT2) - complementaryError(high / Math.SQRT2)) / 2
  if (high <= 0) return (complementaryError(-high / Math.SQRT2) - complementaryError(-low / Math.SQRT2)) / 2
  return 1 - (complementaryError(-low / Math.SQRT2) + complementaryError(high / Math.SQRT2)) / 2
}

/** ln of the same probability, also where it is beyond the reach of a number. */
export function lnNormalBetween(a: number, b: number): number {
  const width = Math.abs(b - a)
  // Over a narrow stretch the difference of two tails loses its digits, and the middle stands for the whole.
  if (width < 1e-5) return Math.log(width) - ((a + b) / 2) ** 2 / 2 - LN_SQRT_2PI
  const probability = normalBetween(a, b)
  if (probability > 1e-290) return Math.log(probability)
  // Out there all of it is at the nearer end, falling off within 1/nearest.
  const nearest = Math.min(Math.abs(a), Math.abs(b))
  const share = -Math.expm1(-nearest * width - (width * width) / 2)
  return -(nearest * nearest) / 2 - LN_SQRT_2PI + Math.log(share / nearest)
}

const LN_SQRT_2PI = Math.log(2 * Math.PI) / 2
