/**
 * A zero of a function between two places at which its signs differ, by bisection to `tolerance`. The function may
 * jump; then the place of the jump is returned.
 */
export function findRoot(f: (x: number) => number, from: number, to: number, tolerance: number): number {
  let low = from
  let high = to
  const rising = f(low) < 0 || f(high) > 0
  while (high - low > tolerance) {
    const middle = (low + high) / 2
    if (f(middle) < 0 === rising) low = middle
    else high = middle
  }
  return (low + high) / 2
}
