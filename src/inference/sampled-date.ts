import { horizonCrossing } from '../site/horizontal.ts'
import { offsetDeg } from './comparison.ts'
import { normalSource } from './random.ts'
import type { Sight } from './sight.ts'

/** What becomes of a date when its inputs are drawn again and again from their errors. */
export interface SampledDate {
  /** Standard deviation of the dates that were found, years. */
  sd: number
  /** Share of the draws for which the target never stood on the line. */
  noDateShare: number
}

const DRAWS = 2000
const STEP = 40
/** Any number does; fixed so that the same claim gives the same audit. */
const SEED = 20

/**
 * The second route to a date's uncertainty (JCGM 101:2008): draws of the errors in direction, altitude and
 * declination, and for each the date nearest `year`. It agrees with the linear budget where the track is straight.
 */
export function sampleDate(sight: Sight, year: number, from: number, to: number): SampledDate {
  const track = responses(sight, from, to)
  const normal = normalSource(SEED)
  const dates: number[] = []
  for (let i = 0; i < DRAWS; i++) {
    const direction = Math.hypot(sight.azimuthSdDeg, sight.northSdDeg) * normal()
    const date = nearestCrossing(track, year, direction, normal(), normal())
    if (date !== null) dates.push(date)
  }
  const mean = dates.reduce((sum, date) => sum + date, 0) / dates.length
  const variance = dates.reduce((sum, date) => sum + (date - mean) ** 2, 0) / dates.length
  return { sd: dates.length === 0 ? 0 : Math.sqrt(variance), noDateShare: 1 - dates.length / DRAWS }
}

/** The offset in a year, and how far one standard deviation of altitude and of declination turn the target. */
interface Response {
  year: number
  offset: number
  altitude: number
  declination: number
}

function responses(sight: Sight, from: number, to: number): (Response | null)[] {
  const steps = Math.ceil((to - from) / STEP)
  return Array.from({ length: steps + 1 }, (_, i) => {
    const year = from + ((to - from) * i) / steps
    const offset = offsetDeg(sight, year)
    const crossing = horizonCrossing(
      sight.declinationDeg(year),
      sight.altitudeDeg(year),
      sight.latitudeDeg,
      sight.at,
    )
    if (offset === null || crossing === null) return null
    const altitude = crossing.perAltitude * sight.altitudeSdDeg(year)
    return { year, offset, altitude, declination: crossing.perDeclination * sight.declinationSdDeg(year) }
  })
}

function nearestCrossing(
  track: readonly (Response | null)[],
  year: number,
  direction: number,
  altitude: number,
  declination: number,
): number | null {
  let best: number | null = null
  let before: { year: number; offset: number } | null = null
  for (const response of track) {
    if (response === null) {
      before = null
      continue
    }
    const offset =
      response.offset + direction - altitude * response.altitude - declination * response.declination
    if (before !== null && before.offset < 0 !== offset < 0 && Math.abs(before.offset - offset) < 90) {
      const share = before.offset / (before.offset - offset)
      const crossing = before.year + share * (response.year - before.year)
      if (best === null || Math.abs(crossing - year) < Math.abs(best - year)) best = crossing
    }
    before = { year: response.year, offset }
  }
  return best
}
