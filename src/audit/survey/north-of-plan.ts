import type { CalendarDate, Claim, North } from '../../claim/claim.ts'
import { wrap180 } from '../../quantity/degrees.ts'
import { formatDegrees } from '../../quantity/format-angle.ts'
import { isUnstated } from '../../quantity/unstated.ts'
import { gridConvergenceDeg } from '../../site/grid-convergence.ts'
import { type MagneticDeclination, magneticDeclination } from '../../site/magnetic-declination.ts'
import { gpsNorthSdDeg, NORTH_SD_DEG } from '../../site/true-north.ts'
import { DEFAULTS } from '../defaults.ts'
import { statedOr } from '../stated-or.ts'
import { projectionOf } from './projection-of.ts'

/** Where the north of the local plan points. */
export interface NorthOfPlan {
  /** The plan's north less true north, degrees, clockwise positive: what its bearings are turned by. */
  turnDeg: number
  /** One standard deviation, shared by every line of the plan. */
  sdDeg: number
  /** How it was found, such as `by compass`. */
  found: string
  /** What was done with the bearings, in sentences. */
  steps: readonly string[]
}

/** The north of a claim's plan; a claim that says nothing of it offers its plan as true. */
export function northOfPlan(claim: Claim): NorthOfPlan {
  const { north } = claim
  if (north === 'omitted') return { turnDeg: 0, sdDeg: 0, found: 'not said; taken as true', steps: [] }
  if (north === 'unknown') return { turnDeg: 0, sdDeg: NORTH_SD_DEG.compass, found: 'unknown', steps: [] }
  const turn = turnOf(claim, north)
  const sdDeg = statedOr(north.uncertaintyDeg, Math.hypot(usualSdDeg(north), turn?.sdDeg ?? 0))
  const steps = [...(turn === null ? [] : [turn.step]), ...modelForComparison(claim, north)]
  return { turnDeg: turn?.deg ?? 0, sdDeg, found: FOUND[north.from], steps }
}

/** Beside a declination that the claim states or has applied, what a magnetic model has for the day. */
function modelForComparison(claim: Claim, north: North): string[] {
  const { date, declination } = north
  if (date === null || declination === null || declination === 'of the date') return []
  const model = declinationOfDate(claim, date)
  return model === null
    ? []
    : [`The declination of ${date.text} at the place was ${eastOrWest(model.deg)} by the ${model.model}.`]
}

const FOUND: Readonly<Record<North['from'], string>> = {
  compass: 'by compass',
  gps: 'by two satellite positions',
  sun: 'by theodolite on the Sun',
  star: 'by theodolite on a star',
  plan: 'from the arrow of a printed plan',
  grid: 'from grid north',
}

/** Usual standard deviation of north found so, degrees, where the claim states none. */
function usualSdDeg({ from, baselineM, accuracyM }: North): number {
  if (from !== 'gps' || (baselineM === null && accuracyM === null)) return NORTH_SD_DEG[from]
  return gpsNorthSdDeg(accuracyM ?? DEFAULTS.gpsAccuracyM, baselineM ?? DEFAULTS.gpsBaselineM)
}

interface Turn {
  deg: number
  sdDeg: number
  step: string
}

/** By how much the plan's north is off true north where that is known; null where it is held to be true. */
function turnOf(claim: Claim, north: North): Turn | null {
  if (north.from === 'grid') return ofGrid(claim, north)
  if (north.declination === null || north.declination === 'applied') return null
  if (north.declination !== 'of the date') {
    const { value, sd } = north.declination
    const step = `The plan’s north is the needle’s: bearings were turned by the declination stated, ${eastOrWest(value)}.`
    return { deg: value, sdDeg: isUnstated(sd) ? 0 : sd, step }
  }
  const model = north.date === null ? null : declinationOfDate(claim, north.date)
  // The reader of the claim file has made sure of the longitude, and of a date that a model covers.
  if (model === null) throw new Error('a compass without a declination')
  const step = `The plan’s north is the needle’s: bearings were turned by the declination of ${north.date?.text} at the place, ${eastOrWest(model.deg)} by the ${model.model}.`
  return { deg: model.deg, sdDeg: model.sdDeg, step }
}

/** The declination that a magnetic model gives for a day and the claim's place; null where none does. */
function declinationOfDate({ structure }: Claim, date: CalendarDate): MagneticDeclination | null {
  if (structure.longitudeDeg === null) return null
  const place = {
    latitudeDeg: structure.latitudeDeg,
    longitudeDeg: structure.longitudeDeg,
    heightM: statedOr(structure.elevationM, DEFAULTS.elevationM),
  }
  return magneticDeclination(place, new Date(Date.UTC(date.year, date.month - 1, date.day)))
}

function ofGrid(claim: Claim, { convergence }: North): Turn {
  if (convergence !== null) return stated(convergence.value, convergence.sd)
  const { grid, structure } = claim
  if (grid?.by === 'convergence') return stated(grid.convergenceDeg.value, grid.convergenceDeg.sd)
  if (grid === null || structure.longitudeDeg === null)
    throw new Error('grid north without a grid or a place')
  const place = { latitudeDeg: structure.latitudeDeg, longitudeDeg: structure.longitudeDeg }
  const deg = gridConvergenceDeg(place, projectionOf(grid.projection))
  return {
    deg,
    sdDeg: 0,
    step: `The plan’s north is grid north: bearings were turned by the convergence of ${grid.name} at the place, ${eastOrWest(deg)}.`,
  }
}

function stated(deg: number, sd: number | 'omitted' | 'unknown'): Turn {
  const step = `The plan’s north is grid north: bearings were turned by the convergence stated, ${eastOrWest(deg)}.`
  return { deg, sdDeg: isUnstated(sd) ? 0 : sd, step }
}

/** `1°35′04″ west` of true north. */
export function eastOrWest(deg: number): string {
  const side = wrap180(deg) < 0 ? 'west' : 'east'
  return `${formatDegrees(Math.abs(deg))} ${side}`
}
