/**
 * Natural cubic spline through points with ascending abscissae: smooth to the second derivative, which is zero
 * at both ends. Outside the points it is not defined; callers keep to the range.
 *
 * @param points Pairs of abscissa and ordinate, at least three.
 * Source: the textbook tridiagonal system for the second derivatives.
 */
export function cubicSpline(points: readonly (readonly [number, number])[]): (x: number) => number {
  const xs = Float64Array.from(points, (p) => p[0])
  const ys = Float64Array.from(points, (p) => p[1])
  const curvatures = secondDerivatives(xs, ys)
  const segmentOf = segmentFinder(xs)
  return (x) => {
    const i = segmentOf(x)
    const width = xs[i + 1]! - xs[i]!
    const right = (x - xs[i]!) / width
    const left = 1 - right
    const bend = (left * left - 1) * left * curvatures[i]! + (right * right - 1) * right * curvatures[i + 1]!
    return left * ys[i]! + right * ys[i + 1]! + (width * width * bend) / 6
  }
}

/** Second derivatives at the points, by the Thomas algorithm. */
function secondDerivatives(xs: Float64Array, ys: Float64Array): Float64Array {
  const last = xs.length - 1
  const result = new Float64Array(xs.length)
  const upper = new Float64Array(xs.length)
  for (let i = 1; i < last; i++) {
    const before = xs[i]! - xs[i - 1]!
    const after = xs[i + 1]! - xs[i]!
    const slopes = (ys[i + 1]! - ys[i]!) / after - (ys[i]! - ys[i - 1]!) / before
    const pivot = 2 * (before + after) - before * upper[i - 1]!
    upper[i] = after / pivot
    result[i] = (6 * slopes - before * result[i - 1]!) / pivot
  }
  for (let i = last - 1; i > 0; i--) result[i] = result[i]! - upper[i]! * result[i + 1]!
  return result
}

/** Finds the segment that holds x; the outer segments reach on. Tables in equal steps need no search. */
function segmentFinder(xs: Float64Array): (x: number) => number {
  const first = xs[0]!
  const step = xs[1]! - first
  const last = xs.length - 2
  if (xs.every((x, i) => x === first + i * step)) {
    return (x) => Math.min(last, Math.max(0, Math.floor((x - first) / step)))
  }
  return (x) => bisected(xs, x)
}

function bisected(xs: Float64Array, x: number): number {
  let low = 0
  let high = xs.length - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (xs[middle]! <= x) low = middle
    else high = middle
  }
  return low
}
