import { offsetDeg } from './comparison.ts'
import { normalSource } from './random.ts'
import type { Branch, Sight } from './sight.ts'

/** What becomes of a date when its inputs are drawn again and again from their errors. */
export interface SampledDate {
  /** Standard deviation of the dates that were found, years; null where none was. */
  sd: number | null
  /** Share of the draws for which the target never stood on the line. */
  noDateShare: number
}

const DRAWS = 1000
const STEP = 40
/** Any number does; fixed so that the same claim gives the same audit. */
const SEED = 20

/**
 * The second route to a date's uncertainty (JCGM 101:2008): draws of the errors of the measurement and of each source,
 * and for each draw the date of one branch nearest `year`. It agrees with the linear budget where the track is straight.
 */
export function sampleDate(
  sight: Sight,
  branch: Branch,
  year: number,
  from: number,
  to: number,
): SampledDate {
  const track = responses(sight, branch, from, to)
  const sources = Math.max(...track.map((response) => response?.effects.length ?? 0))
  const normal = normalSource(SEED)
  const dates: number[] = []
  for (let i = 0; i < DRAWS; i++) {
    const measured = Math.hypot(sight.measuredSdDeg, sight.northSdDeg) * normal()
    const draws = Array.from({ length: sources }, normal)
    const date = nearestCrossing(track, year, measured, draws)
    if (date !== null) dates.push(date)
  }
  const mean = dates.reduce((sum, date) => sum + date, 0) / dates.length
  const variance = dates.reduce((sum, date) => sum + (date - mean) ** 2, 0) / dates.length
  return { sd: dates.length === 0 ? null : Math.sqrt(variance), noDateShare: 1 - dates.length / DRAWS }
}

/** The offset in a year, and how far one standard deviation of each source turns the target. */
interface Response {
  year: number
  offset: number
  effects: readonly number[]
}

function responses(sight: Sight, branch: Branch, from: number, to: number): (Response | null)[] {
  const steps = Math.ceil((to - from) / STEP)
  return Array.from({ length: steps + 1 }, (_, i) => {
    const year = from + ((to - from) * i) / steps
    const offset = offsetDeg(sight, branch, year)
    const prediction = branch.predict(year)
    if (offset === null || prediction === null) return null
    return { year, offset, effects: prediction.errors.map(({ effectDeg }) => effectDeg) }
  })
}

function nearestCrossing(
  track: readonly (Response | null)[],
  year: number,
  measured: number,
  draws: readonly number[],
): number | null {
  let best: number | null = null
  let before: { year: number; offset: number } | null = null
  for (const response of track) {
    if (response === null) {
      before = null
      continue
    }
    let offset = response.offset + measured
    for (let i = 0; i < response.effects.length; i++) offset -= draws[i]! * response.effects[i]!
    if (before !== null && before.offset < 0 !== offset < 0 && Math.abs(before.offset - offset) < 90) {
      const share = before.offset / (before.offset - offset)
      const crossing = before.year + share * (response.year - before.year)
      if (best === null || Math.abs(crossing - year) < Math.abs(best - year)) best = crossing
    }
    before = { year: response.year, offset }
  }
  return best
}
