import { offsetDeg, offsetSdDeg } from './comparison.ts'
import type { Sight } from './sight.ts'
import type { Stretch } from './sweep.ts'

/**
 * How well a line fits a stretch of dates when built exactly: the smallest distance of the target from the line in
 * it, in standard deviations of the comparison; Infinity where the target does not reach the altitude in any year.
 */
export function deviation(sight: Sight, { from, to }: Stretch): number {
  const steps = to > from ? Math.max(20, Math.ceil((to - from) / 10)) : 1
  let best = Infinity
  let before: number | null = null
  for (let i = 0; i <= steps; i++) {
    const year = from + ((to - from) * i) / steps
    const offset = offsetDeg(sight, year)
    const sd = offsetSdDeg(sight, year)
    if (offset !== null && sd !== null) {
      const crossed = before !== null && before * offset <= 0 && Math.abs(before - offset) < 90
      best = crossed || offset === 0 ? 0 : Math.min(best, Math.abs(offset) / sd)
    }
    before = offset
  }
  return best
}
