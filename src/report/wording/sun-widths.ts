import { trimZeros } from '../../quantity/format-number.ts'

/** Prints a shift along the horizon as a share of the Sun's width: `0.14`, `2.1`, without its sign. */
export function sunWidths(count: number): string {
  const size = Math.abs(count)
  return size < 0.005 ? '0' : trimZeros(Number(size.toFixed(2)), 2)
}
