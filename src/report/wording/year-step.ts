/** To how many years the ends of a stretch of dates are printed: finer than a hundredth of it says nothing. */
export function yearStep(from: number, to: number): number {
  const length = Math.abs(to - from)
  if (length > 200) return 10
  return length > 40 ? 5 : 1
}
