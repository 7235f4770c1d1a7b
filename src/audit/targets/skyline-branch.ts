import type { Uncertain } from '../../inference/horizon-branch.ts'
import { rememberLast } from '../../inference/remember-last.ts'
import type { Branch, CurvePiece, Prediction } from '../../inference/sight.ts'
import { DEG, wrap180, wrap360 } from '../../quantity/degrees.ts'
import { declinationPerAltitude } from '../../site/horizontal.ts'
import { refractionScatterArcmin } from '../../site/refraction-scatter.ts'
import { skylineAltitude } from '../../site/skyline.ts'
import type { SkylineCrossing } from '../../site/skyline-crossing.ts'
import type { SightlineInputs } from '../sightline-inputs.ts'
import { type KnownSkyline, knownSkyline } from './known-skyline.ts'

/** A body that rises or sets over a skyline that is known to both sides of the line. */
export interface SkylineTarget {
  at: 'rising' | 'setting'
  /** How far the skyline stands above the centre of its disc where the two touch, arcminutes. */
  aboveCentreArcmin: (year: number) => number
  parallaxArcsec: number
  declination: (year: number) => Uncertain | null
  /** Errors of the altitude besides those of the skyline and of the day's refraction. */
  altitudeErrors: (year: number) => Uncertain['errors']
  /** Apparent altitude below which it is not seen though it has risen, with its error; null for one that is. */
  seenFrom: { deg: number; sdDeg: number } | null
}

/** Within so many arcminutes of size, a disc's place on a skyline answers its size in proportion. */
const SIZE_STEP_ARCMIN = 0.25
/** Two sizes that clear the skyline at places further apart than this do so in two different notches. */
const OTHER_NOTCH_DEG = 0.2

type Crossing = Extract<SkylineCrossing, { kind: 'crossing' }>

/** Where a body really clears a skyline, year by year: on a slope not where the line meets it. */
export function skylineBranch(inputs: SightlineInputs, target: SkylineTarget): Branch {
  const skyline = knownSkyline(inputs, target)
  const stateIn = rememberLast((year) => stateOf(inputs, skyline, target, year))
  return {
    predict: (year) => {
      const state = stateIn(year)
      return state?.crossing == null ? null : predictionOf(skyline, target, state, state.crossing)
    },
    curve: (year) => {
      const state = stateIn(year)
      return state === null ? [] : curveOf(state)
    },
  }
}

/** What one year has: the crossing, and how likely errors move it. */
interface State {
  crossing: Crossing | null
  /** Of the altitude and of the declination, the former as what it does to the latter. */
  altitudeErrors: Uncertain['errors']
  declinationErrors: Uncertain['errors']
  /** Declination that does what a degree of altitude does. */
  perAltitude: number
  /** One standard deviation of all, as declination, degrees. */
  sdDeg: number
  /** Direction with the declination so many standard deviations further north; null where there is none. */
  at: (sds: number) => number | null
}

function stateOf(
  inputs: SightlineInputs,
  skyline: KnownSkyline,
  target: SkylineTarget,
  year: number,
): State | null {
  const declination = target.declination(year)
  // A formula that is carried far beyond its range ends in declinations that are none.
  if (declination === null || Math.abs(declination.deg) > 90) return null
  const size = target.aboveCentreArcmin(year)
  const crossing = crossingAt(skyline, declination.deg, size)
  const altitudeErrors = errorsOfAltitude(inputs, skyline, target, year, crossing)
  // Where there is no crossing a degree of altitude counts as one of declination, which is its most.
  const perAltitude =
    crossing === null
      ? 1
      : declinationPerAltitude(declination.deg, crossing.centreAltitudeDeg, inputs.latitudeDeg)
  const sdDeg = Math.hypot(sdOf(declination.errors), perAltitude * sdOf(altitudeErrors))
  const step = Math.round(size / SIZE_STEP_ARCMIN) * SIZE_STEP_ARCMIN
  const table = skyline.crossings(step)
  const turn = turnOfSize(crossing, table.crossing(declination.deg))
  return {
    crossing,
    altitudeErrors,
    declinationErrors: declination.errors,
    perAltitude,
    sdDeg,
    at: (sds) => {
      const moved = Math.max(-90, Math.min(90, declination.deg + sds * sdDeg))
      const found = table.crossing(moved)
      return found.kind === 'crossing' ? found.azimuthDeg + turn : null
    },
  }
}

/** From where a disc of the nearest tabulated size is seen to where the target's own is, degrees. */
function turnOfSize(own: Crossing | null, tabulated: SkylineCrossing): number {
  if (own === null || tabulated.kind !== 'crossing') return 0
  const turn = wrap180(own.azimuthDeg - tabulated.azimuthDeg)
  return Math.abs(turn) > OTHER_NOTCH_DEG ? 0 : turn
}

/** Between the two steps of size that the disc's own lies between. */
function crossingAt(
  skyline: KnownSkyline,
  declinationDeg: number,
  aboveCentreArcmin: number,
): Crossing | null {
  const step = Math.floor(aboveCentreArcmin / SIZE_STEP_ARCMIN)
  const share = aboveCentreArcmin / SIZE_STEP_ARCMIN - step
  const by = (steps: number) => {
    const crossing = skyline.crossings(steps * SIZE_STEP_ARCMIN).crossing(declinationDeg)
    return crossing.kind === 'crossing' ? crossing : null
  }
  const smaller = by(step)
  const larger = share === 0 ? smaller : by(step + 1)
  const nearer = share < 0.5 ? smaller : larger
  if (smaller === null || larger === null) return nearer
  if (Math.abs(wrap180(larger.azimuthDeg - smaller.azimuthDeg)) > OTHER_NOTCH_DEG) return nearer
  const between = (from: number, to: number) => from + share * wrap180(to - from)
  return {
    ...smaller,
    azimuthDeg: wrap360(between(smaller.azimuthDeg, larger.azimuthDeg)),
    centreAzimuthDeg: wrap360(between(smaller.centreAzimuthDeg, larger.centreAzimuthDeg)),
    contactAzimuthDeg: wrap360(between(smaller.contactAzimuthDeg, larger.contactAzimuthDeg)),
    centreAltitudeDeg: between(smaller.centreAltitudeDeg, larger.centreAltitudeDeg),
  }
}

function errorsOfAltitude(
  inputs: SightlineInputs,
  { apparent, refractionArcmin }: KnownSkyline,
  { seenFrom, altitudeErrors }: SkylineTarget,
  year: number,
  crossing: Crossing | null,
): Uncertain['errors'] {
  const contact = crossing === null ? null : skylineAltitude(apparent, crossing.contactAzimuthDeg)
  const contactDeg = contact?.deg ?? inputs.horizonDeg
  const steps = [contactDeg - SLOPE_STEP_DEG, contactDeg + SLOPE_STEP_DEG].map(refractionArcmin)
  const refractionPerDegree = (steps[1]! - steps[0]!) / (2 * SLOPE_STEP_DEG)
  const isHeld = seenFrom !== null && contactDeg <= seenFrom.deg
  return [
    {
      source: isHeld ? 'altitude at which the star is seen' : 'altitude of the horizon',
      sdDeg: (contact?.sdDeg ?? inputs.horizonSdDeg) * (1 - refractionPerDegree / 60),
    },
    {
      source: 'refraction of the day',
      sdDeg:
        (inputs.isRefractionSdStated ? inputs.refractionSdArcmin : refractionScatterArcmin(contactDeg)) / 60,
    },
    ...altitudeErrors(year),
  ]
}

/** Half the stretch of altitude over which the slope of refraction is taken, degrees. */
const SLOPE_STEP_DEG = 0.05

function sdOf(errors: Uncertain['errors']): number {
  return Math.hypot(...errors.map(({ sdDeg }) => sdDeg))
}

/**
 * The errors' effects by the slope of the chord over one standard deviation to either side: at a summit of the
 * skyline the tangent says that nothing moves the gleam.
 */
function predictionOf(
  skyline: KnownSkyline,
  target: SkylineTarget,
  state: State,
  crossing: Crossing,
): Prediction {
  const [below, above] = [state.at(-1), state.at(1)]
  const perDeclination =
    state.sdDeg === 0 || below === null || above === null
      ? crossing.perDeclination
      : wrap180(above - below) / (2 * state.sdDeg)
  const effects = (errors: Uncertain['errors'], per: number) =>
    errors.map(({ source, sdDeg, shared }) => ({ source, effectDeg: per * sdDeg, shared: shared === true }))
  return {
    directionDeg: crossing.azimuthDeg,
    errors: [
      ...effects(state.altitudeErrors, -perDeclination * state.perAltitude),
      ...effects(state.declinationErrors, perDeclination),
    ],
    discCentre: {
      azimuthDeg: crossing.centreAzimuthDeg,
      altitudeDeg: apparentAltitude(skyline, target, crossing),
    },
  }
}

/** Of the disc's centre as it is seen: parallax put back, refraction as where it touches the skyline. */
function apparentAltitude(
  { apparent, refractionArcmin, isLessParallax }: KnownSkyline,
  { parallaxArcsec }: SkylineTarget,
  { centreAltitudeDeg, contactAzimuthDeg }: Crossing,
): number {
  const parallax = isLessParallax ? 0 : (parallaxArcsec / 3600) * Math.cos(centreAltitudeDeg * DEG)
  const contactDeg = skylineAltitude(apparent, contactAzimuthDeg)?.deg ?? centreAltitudeDeg
  return centreAltitudeDeg - parallax + refractionArcmin(contactDeg) / 60
}

/** Run of likely errors that is looked at, standard deviations, and into how many pieces it is cut. */
const REACH_SD = 6
const PIECES = 40
/** Where the bend is looked for, standard deviations, and the share of one that it may come to. */
const PROBES_SD = [-2, -1, -0.5, 0.5, 1, 2]
const BEND_ALLOWED = 0.1

/** Null where direction answers the errors in proportion, as along a smooth slope. */
function curveOf(state: State): CurvePiece[] | null {
  if (state.sdDeg === 0) return null
  if (state.crossing !== null && isStraight(state, state.crossing)) return null
  const runs: CurvePiece[] = []
  for (let i = 0; i < PIECES; i++) {
    const [fromSd, toSd] = [i, i + 1].map((step) => REACH_SD * ((2 * step) / PIECES - 1)) as [number, number]
    addRun(runs, state, placeOf(state, fromSd), placeOf(state, toSd), HALVINGS)
  }
  return runs
}

/** Where an error of so many standard deviations takes the target; null where it is not to be seen. */
interface Place {
  sds: number
  deg: number | null
}

function placeOf(state: State, sds: number): Place {
  return { sds, deg: state.at(sds) }
}

/** How often a piece is halved to close in on a leap, and the bend inside a piece, degrees, that passes for none. */
const HALVINGS = 6
const BEND_INSIDE_DEG = 0.005

/** One piece where direction runs straight in it; where the target leaps in it, or is lost, the parts before and after. */
function addRun(runs: CurvePiece[], state: State, from: Place, to: Place, halvings: number): void {
  if (from.deg === null && to.deg === null) return
  const middle = placeOf(state, (from.sds + to.sds) / 2)
  if (runsStraight(from, middle, to)) addPiece(runs, from, to)
  else if (halvings > 0) {
    addRun(runs, state, from, middle, halvings - 1)
    addRun(runs, state, middle, to, halvings - 1)
  } else {
    if (from.deg !== null) addPiece(runs, from, { sds: middle.sds, deg: from.deg })
    if (to.deg !== null) addPiece(runs, { sds: middle.sds, deg: to.deg }, to)
  }
}

function runsStraight(from: Place, middle: Place, to: Place): boolean {
  if (from.deg === null || middle.deg === null || to.deg === null) return false
  return Math.abs(wrap180(middle.deg - from.deg) - wrap180(to.deg - from.deg) / 2) < BEND_INSIDE_DEG
}

/** Pieces that run on in one line are one piece: along a straight slope there are few. */
function addPiece(runs: CurvePiece[], from: Place, to: Place): void {
  const last = runs.at(-1)
  const before = last?.toSd === from.sds ? last.toDeg : from.deg!
  const fromDeg = before + wrap180(from.deg! - before)
  const piece = { fromSd: from.sds, toSd: to.sds, fromDeg, toDeg: fromDeg + wrap180(to.deg! - fromDeg) }
  if (last === undefined || last.toSd !== piece.fromSd || !runsOn(last, piece)) runs.push(piece)
  else runs[runs.length - 1] = { ...last, toSd: piece.toSd, toDeg: piece.toDeg }
}

function runsOn(last: CurvePiece, { fromSd, toSd, toDeg }: CurvePiece): boolean {
  const share = (fromSd - last.fromSd) / (toSd - last.fromSd)
  const between = last.fromDeg + share * (toDeg - last.fromDeg)
  return Math.abs(between - last.toDeg) < IN_LINE_DEG
}

/** 0.7″: far below any error of a skyline. */
const IN_LINE_DEG = 2e-4

function isStraight(state: State, { azimuthDeg }: Crossing): boolean {
  const turns = PROBES_SD.map((sds) => {
    const direction = state.at(sds)
    return direction === null ? Number.NaN : wrap180(direction - azimuthDeg)
  })
  const perSd = (turns[4]! - turns[1]!) / 2
  const allowed = BEND_ALLOWED * Math.max(Math.abs(perSd), LEAST_TURN_DEG)
  return turns.every((turn, i) => Math.abs(turn - perSd * PROBES_SD[i]!) <= allowed * Math.abs(PROBES_SD[i]!))
}

/** Bends that turn the direction by less than this, 0.6″ times the share allowed, are none. */
const LEAST_TURN_DEG = 1e-3
