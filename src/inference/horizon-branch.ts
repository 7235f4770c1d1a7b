import { wrap180 } from '../quantity/degrees.ts'
import { altitudeRangeDeg, type HorizonCrossing, horizonCrossing } from '../site/horizontal.ts'
import { rememberLast } from './remember-last.ts'
import type { Branch, CurvePiece, Prediction } from './sight.ts'

/** A value in degrees with the standard deviations of its sources of error. */
export interface Uncertain {
  deg: number
  errors: readonly { source: string; sdDeg: number; shared?: boolean }[]
}

/** A body that rises or sets through an altitude. */
export interface HorizonTarget {
  latitudeDeg: number
  at: 'rising' | 'setting'
  /** Geocentric true altitude of the body's centre when it stands on the line's horizon; null: not to be seen. */
  altitude: (year: number) => Uncertain | null
  /** A negative standard deviation stands for an error that moves this declination southward. Null: no such day. */
  declination: (year: number) => Uncertain | null
}

/** Share of the standard deviation by which the curve may part from its tangent before it counts as curved. */
const BEND_ALLOWED = 0.1
/** How far to either side the bend is looked for, and the run of altitudes that is integrated over, in standard deviations. */
const BEND_SD = 2
const REACH_SD = 15
/** Pieces of a run: more where it ends at an altitude that the body only grazes, near which azimuth turns fast. */
const PIECES = 64
const PIECES_OF_CUT = 128

/** The azimuth at which a body crosses an altitude, year by year. */
export function horizonBranch(target: HorizonTarget): Branch {
  const stateIn = rememberLast((year) => stateOf(target, year))
  return {
    predict: (year) => {
      const state = stateIn(year)
      return state?.crossing == null ? null : predictionOf(state, state.crossing)
    },
    curve: (year) => {
      const state = stateIn(year)
      return state === null ? [] : curveOf(target, state)
    },
    shortfallDeg: (year) => {
      const state = stateIn(year)
      if (state === null) return null
      const { low, high } = altitudeRangeDeg(state.declination.deg, target.latitudeDeg)
      return Math.max(0, low - state.altitude.deg, state.altitude.deg - high)
    },
  }
}

interface State {
  altitude: Uncertain
  declination: Uncertain
  crossing: HorizonCrossing | null
}

function stateOf(target: HorizonTarget, year: number): State | null {
  const altitude = target.altitude(year)
  const declination = target.declination(year)
  if (altitude === null || declination === null) return null
  const crossing = horizonCrossing(declination.deg, altitude.deg, target.latitudeDeg, target.at)
  return { altitude, declination, crossing }
}

function predictionOf({ altitude, declination }: State, crossing: HorizonCrossing): Prediction {
  const effects = (errors: Uncertain['errors'], per: number) =>
    errors.map(({ source, sdDeg, shared }) => ({ source, effectDeg: per * sdDeg, shared: shared === true }))
  return {
    directionDeg: crossing.azimuthDeg,
    errors: [
      ...effects(altitude.errors, crossing.perAltitude),
      ...effects(declination.errors, crossing.perDeclination),
    ],
  }
}

function curveOf(target: HorizonTarget, state: State): CurvePiece[] | null {
  const { crossing } = state
  // Near the meridian an error in declination does what an error in altitude does, so both go into one.
  const ratio = crossing === null ? 1 : Math.abs(crossing.perDeclination / crossing.perAltitude)
  const sd = Math.hypot(sdOf(state.altitude), Math.min(ratio, 5) * sdOf(state.declination))
  const run = runOf(target, state, sd)
  if (crossing !== null && !run.isCut && !isBent(target, state, sd, crossing)) return null
  return piecesOver(target, state, sd, run)
}

/** The part of the run of likely altitudes that the body reaches; where that is not all, some errors have no direction. */
function runOf({ latitudeDeg }: HorizonTarget, { declination, altitude }: State, sd: number) {
  const range = altitudeRangeDeg(declination.deg, latitudeDeg)
  const low = Math.max(altitude.deg - REACH_SD * sd, range.low)
  const high = Math.min(altitude.deg + REACH_SD * sd, range.high)
  return { low, high, isCut: low === range.low || high === range.high }
}

function sdOf({ errors }: Uncertain): number {
  return Math.hypot(...errors.map(({ sdDeg }) => sdDeg))
}

/**
 * Whether the azimuth over the run of likely altitudes parts from a straight line by a share of its whole spread. The
 * declination counts apart: near the equator altitude hardly moves the azimuth, it does.
 */
function isBent(
  target: HorizonTarget,
  { declination, altitude }: State,
  sd: number,
  at: HorizonCrossing,
): boolean {
  if (sd === 0) return false
  const turn = (change: number) => {
    const moved = horizonCrossing(declination.deg, altitude.deg + change, target.latitudeDeg, target.at)
    return moved === null ? null : wrap180(moved.azimuthDeg - at.azimuthDeg)
  }
  const above = turn(BEND_SD * sd)
  const below = turn(-BEND_SD * sd)
  if (above === null || below === null) return true
  const spread = Math.hypot((above - below) / (2 * BEND_SD), at.perDeclination * sdOf(declination))
  return Math.abs(above + below) / 2 > BEND_ALLOWED * spread
}

/** The run in pieces, more of them towards its ends, where azimuth may turn fast. */
function piecesOver(
  target: HorizonTarget,
  { declination, altitude }: State,
  sd: number,
  { low, high, isCut }: { low: number; high: number; isCut: boolean },
): CurvePiece[] {
  if (!(high > low)) return []
  const pieces = isCut ? PIECES_OF_CUT : PIECES
  const cuts = Array.from({ length: pieces + 1 }, (_, i) => {
    const share = (1 - Math.cos((Math.PI * i) / pieces)) / 2
    // The very ends graze the altitude, where the crossing is not defined: stay inside by a hair.
    return low + (high - low) * Math.min(1 - 1e-9, Math.max(1e-9, share))
  })
  return cuts.slice(1).flatMap((upper, i) => {
    const lower = cuts[i]!
    const from = horizonCrossing(declination.deg, lower, target.latitudeDeg, target.at)
    const to = horizonCrossing(declination.deg, upper, target.latitudeDeg, target.at)
    if (from === null || to === null) return []
    const toDeg = from.azimuthDeg + wrap180(to.azimuthDeg - from.azimuthDeg)
    return [
      {
        fromSd: (lower - altitude.deg) / sd,
        toSd: (upper - altitude.deg) / sd,
        fromDeg: from.azimuthDeg,
        toDeg,
      },
    ]
  })
}
