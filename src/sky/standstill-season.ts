import type { StandstillEvent } from './moon.ts'
import { julianEpochOf, moonDeclinationDeg } from './present-sky.ts'

/** One of the Moon's monthly extremes of declination, geocentric and of date. */
export interface MonthlyExtreme {
  /** Days of UT from J2000.0. */
  utDays: number
  declinationDeg: number
}

/** The months about a standstill in which the Moon gets nearly as far as in the most extreme one of them. */
export interface StandstillSeason {
  /** Julian epoch at which the Moon's mean node is in the equinox, about which the season lies. */
  centreYear: number
  /** The most extreme monthly extreme: the widest of a major standstill, the narrowest of a minor one. */
  mostExtreme: MonthlyExtreme
  /** All that come within the margin of it, in order of time. */
  extremes: readonly MonthlyExtreme[]
}

/** Months within so much of the most extreme one are counted as the standstill: our choice. */
const STANDSTILL_MARGIN_ARCMIN = 15
/** They are looked for so long before and after the node is in the equinox. */
const STANDSTILL_REACH_YEARS = 1.5

const TROPICAL_MONTH_DAYS = 27.321_582

/** The first season of a standstill that may reach past an instant, days of UT from J2000.0. */
export function standstillSeason(event: StandstillEvent, fromUtDays: number): StandstillSeason {
  const from = julianEpochOf(fromUtDays) - STANDSTILL_REACH_YEARS
  return seasonAbout(event, firstStandstillYear(event, from))
}

/**
 * The first Julian epoch after one at which the mean node is in the equinox, ascending (major) or descending (minor):
 * Ω = 125.0445° − 1934.1363° T, T in centuries of 36,525 days.
 *
 * Source: Meeus, Astronomical Algorithms (2nd edition), equation 47.7 (from memory).
 */
function firstStandstillYear(event: StandstillEvent, from: number): number {
  const perYear = 19.341_363
  const wanted = event.endsWith('major standstill') ? 0 : 180
  const turns = Math.ceil((wanted - 125.0445 + perYear * (from - 2000)) / 360)
  return 2000 + (125.0445 - wanted + 360 * turns) / perYear
}

function seasonAbout(event: StandstillEvent, centreYear: number): StandstillSeason {
  const side = event.startsWith('northern') ? 1 : -1
  const wanted = event.endsWith('major standstill') ? 1 : -1
  const extremes = monthlyExtremes(side, centreYear)
  const reach = (extreme: MonthlyExtreme) => wanted * side * extreme.declinationDeg
  const mostExtreme = extremes.reduce((most, extreme) => (reach(extreme) > reach(most) ? extreme : most))
  const least = reach(mostExtreme) - STANDSTILL_MARGIN_ARCMIN / 60
  return { centreYear, mostExtreme, extremes: extremes.filter((extreme) => reach(extreme) >= least) }
}

function monthlyExtremes(side: 1 | -1, centreYear: number): MonthlyExtreme[] {
  const centre = (centreYear - 2000) * 365.25
  const reach = STANDSTILL_REACH_YEARS * 365.25
  // The Moon's mean longitude is 218.316° at J2000.0, and 90° or 270° about its monthly extremes (Meeus, eq. 47.1).
  const phase = ((side * 90 - 218.316) / 360) * TROPICAL_MONTH_DAYS
  const first = Math.ceil((centre - reach - phase) / TROPICAL_MONTH_DAYS)
  const last = Math.floor((centre + reach - phase) / TROPICAL_MONTH_DAYS)
  return Array.from({ length: last - first + 1 }, (_, i) =>
    extremeNear(phase + (first + i) * TROPICAL_MONTH_DAYS),
  )
}

/** Half the width of the parabolas, days; the Moon strays from its mean longitude by 0.7 days. */
const HALF_WIDTHS_DAYS = [1.5, 0.5, 0.1]

/** The top of parabolas through three declinations, narrowing. */
function extremeNear(guess: number): MonthlyExtreme {
  let top = guess
  for (const half of HALF_WIDTHS_DAYS) {
    const [a, b, c] = [-half, 0, half].map((step) => moonDeclinationDeg(top + step)) as [
      number,
      number,
      number,
    ]
    top += (half * (a - c)) / (2 * (a - 2 * b + c))
  }
  return { utDays: top, declinationDeg: moonDeclinationDeg(top) }
}
