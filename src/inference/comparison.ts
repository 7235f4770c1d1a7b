import { wrap180 } from '../quantity/degrees.ts'
import { altitudeRangeDeg, type HorizonCrossing, horizonCrossing } from '../site/horizontal.ts'
import type { Sight } from './sight.ts'

/**
 * The line held against its target in one year, before any build tolerance. `straight`: the azimuth answers
 * errors in altitude and declination in proportion. `curved`: it does not, near the meridian; then the azimuths
 * over a run of altitudes stand in for the derivative.
 */
export type Comparison = Straight | Curved

export interface Straight {
  kind: 'straight'
  /** The line less the target's azimuth, degrees. */
  offsetDeg: number
  /** Variance of the line's own errors, degrees². */
  variance: number
  /** Effects of one standard deviation of the errors that lines share: north and obliquity, degrees. */
  shared: readonly [north: number, obliquity: number]
}

export interface Curved {
  kind: 'curved'
  /** Whether the target reaches the altitude as it is, and not only by some of its likely errors. */
  reached: boolean
  variance: number
  /** Ascending runs of altitude: probability of each, and the offsets at its two ends, degrees. */
  pieces: readonly { probability: number; fromDeg: number; toDeg: number }[]
}

/** Share of the standard deviation by which the curve may part from its tangent before it counts as curved. */
const BEND_ALLOWED = 0.1
/** The run of altitudes that is integrated over, in standard deviations, and its number of pieces. */
const REACH_SD = 4
const PIECES = 64

/** Whether the target reaches the altitude as it is. */
export function isReached(comparison: Comparison | null): boolean {
  return comparison !== null && (comparison.kind === 'straight' || comparison.reached)
}

/** Null where the target does not reach the altitude, by any of its likely errors either. */
export function compare(sight: Sight, year: number): Comparison | null {
  const altitude = sight.altitudeDeg(year)
  const declination = sight.declinationDeg(year)
  const altitudeSd = sight.altitudeSdDeg(year)
  const declinationSd = sight.declinationSdDeg(year)
  const crossing = horizonCrossing(declination, altitude, sight.latitudeDeg, sight.at)
  const direction = sight.azimuthSdDeg ** 2
  // Near the meridian an error in declination does what an error in altitude does, so both go into one.
  const ratio = crossing === null ? 1 : Math.abs(crossing.perDeclination / crossing.perAltitude)
  const reach = REACH_SD * Math.hypot(altitudeSd, Math.min(ratio, 5) * declinationSd)
  if (crossing === null || isBent(sight, year, crossing, reach)) {
    const pieces = piecesOver(sight, declination, altitude, reach)
    return pieces.length === 0
      ? null
      : {
          kind: 'curved',
          reached: crossing !== null,
          variance: direction + sight.northSdDeg ** 2,
          pieces,
        }
  }
  return {
    kind: 'straight',
    offsetDeg: wrap180(sight.azimuthDeg - crossing.azimuthDeg),
    variance: direction + (crossing.perAltitude * altitudeSd) ** 2,
    shared: [sight.northSdDeg, crossing.perDeclination * sight.declinationSign * declinationSd],
  }
}

/** The line less the target's azimuth, degrees; null where the target does not reach the altitude. */
export function offsetDeg(sight: Sight, year: number): number | null {
  const azimuth = targetAzimuthDeg(sight, year)
  return azimuth === null ? null : wrap180(sight.azimuthDeg - azimuth)
}

/** Azimuth of the target in a year, degrees; null where it does not reach the altitude. */
export function targetAzimuthDeg(sight: Sight, year: number): number | null {
  const crossing = horizonCrossing(
    sight.declinationDeg(year),
    sight.altitudeDeg(year),
    sight.latitudeDeg,
    sight.at,
  )
  return crossing === null ? null : crossing.azimuthDeg
}

/** Standard deviation of the offset in a year without any build tolerance, degrees; null likewise. */
export function offsetSdDeg(sight: Sight, year: number): number | null {
  const crossing = horizonCrossing(
    sight.declinationDeg(year),
    sight.altitudeDeg(year),
    sight.latitudeDeg,
    sight.at,
  )
  if (crossing === null) return null
  return Math.hypot(
    sight.azimuthSdDeg,
    sight.northSdDeg,
    crossing.perAltitude * sight.altitudeSdDeg(year),
    crossing.perDeclination * sight.declinationSdDeg(year),
  )
}

/**
 * Whether the azimuth over the run of likely altitudes parts from a straight line by a share of the whole spread of
 * the comparison. The declination counts apart: near the equator altitude hardly moves the azimuth, it does.
 */
function isBent(
  sight: Sight,
  year: number,
  { azimuthDeg, perDeclination }: HorizonCrossing,
  reach: number,
): boolean {
  if (reach === 0) return false
  const turn = (change: number) => {
    const altitude = sight.altitudeDeg(year) + change
    const moved = horizonCrossing(sight.declinationDeg(year), altitude, sight.latitudeDeg, sight.at)
    return moved === null ? null : wrap180(moved.azimuthDeg - azimuthDeg)
  }
  const above = turn(reach / 2)
  const below = turn(-reach / 2)
  if (above === null || below === null) return true
  const byDeclination = perDeclination * sight.declinationSdDeg(year)
  const spread = Math.hypot((above - below) / REACH_SD, byDeclination, sight.azimuthSdDeg)
  return Math.abs(above + below) / 2 > BEND_ALLOWED * spread
}

/** The reachable part of the run of likely altitudes, cut so that the ends, where azimuth turns fast, get more cuts. */
function piecesOver(sight: Sight, declination: number, altitude: number, reach: number): Curved['pieces'] {
  const range = altitudeRangeDeg(declination, sight.latitudeDeg)
  const low = Math.max(altitude - reach, range.low)
  const high = Math.min(altitude + reach, range.high)
  if (!(high > low)) return []
  const sd = reach / REACH_SD
  const cuts = Array.from({ length: PIECES + 1 }, (_, i) => {
    const share = (1 - Math.cos((Math.PI * i) / PIECES)) / 2
    // The very ends graze the altitude, where the crossing is not defined: stay inside by a hair.
    return low + (high - low) * Math.min(1 - 1e-9, Math.max(1e-9, share))
  })
  return cuts.slice(1).flatMap((upper, i) => {
    const lower = cuts[i]!
    const from = horizonCrossing(declination, lower, sight.latitudeDeg, sight.at)
    const to = horizonCrossing(declination, upper, sight.latitudeDeg, sight.at)
    if (from === null || to === null) return []
    const fromDeg = wrap180(sight.azimuthDeg - from.azimuthDeg)
    const toDeg = fromDeg - wrap180(to.azimuthDeg - from.azimuthDeg)
    const middle = ((lower + upper) / 2 - altitude) / sd
    const probability = (((upper - lower) / sd) * Math.exp((-middle * middle) / 2)) / Math.sqrt(2 * Math.PI)
    return [{ probability, fromDeg, toDeg }]
  })
}
