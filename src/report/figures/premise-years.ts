import { extent } from 'd3-array'
import type { Audit } from '../../audit/audit.ts'

/** The years that the figure of the sets shows. */
export interface PremiseYears {
  shown: readonly [number, number]
  /** Whether the window goes on beyond them. */
  isPart: boolean
}

/** All that matters taking less of the window than this, only the part of the window about it is shown. */
const LEAST_SHARE = 1 / 5
/** Room about it, as a share of it, to either side. */
const ROOM = 0.3

/**
 * The window, and the asserted and the independent dates. Where these dates and every set up to the largest plausible
 * tolerance take a small part of it, as they do for stars, that part alone: the whole would show them as hairlines.
 */
export function premiseYears(audit: Audit): PremiseYears {
  const { window, steps } = audit.sweep
  const dates = [audit.asserted, ...audit.other_dates].flatMap(({ from, to }) => [from, to])
  const [from, to] = extent([...dates, window.from, window.to]) as [number, number]
  const whole: [number, number] = from < to ? [from, to] : [from - 1, to + 1]
  const sets = steps
    .filter(({ tolerance_arcmin }) => tolerance_arcmin <= audit.plausible.high_arcmin)
    .flatMap(({ sets95 }) => sets95.flat())
  const [low, high] = extent([...dates, ...sets]) as [number, number]
  const room = ROOM * Math.max(high - low, 1)
  if (sets.length === 0 || high - low + 2 * room > LEAST_SHARE * (whole[1] - whole[0])) {
    return { shown: whole, isPart: false }
  }
  const shown: [number, number] = [Math.max(whole[0], low - room), Math.min(whole[1], high + room)]
  return { shown, isPart: shown[0] > window.from || shown[1] < window.to }
}
