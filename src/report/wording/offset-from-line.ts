import { formatArcmin } from '../../quantity/format-angle.ts'
import { sideOfLine } from './side-of-line.ts'

/**
 * Where the line points as seen from its target, for a sentence: `1.8′ ± 2.5′ to the left of it`, or `at it` where
 * the two print as one. `also` stands in brackets after the figure.
 */
export function offsetFromLine(
  offsetArcmin: number,
  sdArcmin: number | null,
  also: readonly string[] = [],
): string {
  const side = sideOfLine(offsetArcmin)
  if (side === null) return 'at it'
  const sd = sdArcmin === null ? '' : ` ± ${formatArcmin(sdArcmin)}`
  const shares = also.length === 0 ? '' : ` (${also.join(', ')})`
  return `${formatArcmin(Math.abs(offsetArcmin))}${sd}${shares} to the ${side} of it`
}
