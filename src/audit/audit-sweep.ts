import { isReached } from '../inference/comparison.ts'
import type { Sight } from '../inference/sight.ts'
import type { Interval } from '../inference/smallest-set.ts'
import { prepareSweep, type SweepGround, sweepPoint } from '../inference/sweep.ts'
import type { DatedLabel, Ratio, Sweep, SweepStep, Window } from './audit.ts'
import { centimetres, type Marker, sunWidths } from './measures.ts'
import { ratioWords } from './ratio-words.ts'

/** The Sun as a yardstick: its semidiameter at the asserted date, and how high it stands. */
export interface Yardstick {
  marker: Marker
  semidiameterArcmin: number
  altitudeDeg: number
}

/** Dates that a sweep holds against each other. */
export interface SweepDates {
  window: Window
  asserted: DatedLabel
  others: readonly DatedLabel[]
}

/** Tolerances that every table prints, and the run that the figure draws between them, arcminutes. */
const TABLE_ARCMIN = [0, 1, 2, 5, 10, 20, 30, 60, 120]
const DRAWN_ARCMIN = Array.from({ length: 60 }, (_, i) => 0.5 * 600 ** (i / 59))

export function groundOf(sights: readonly Sight[], { window, asserted, others }: SweepDates): SweepGround {
  return prepareSweep(sights, window, asserted, others)
}

/** The sweep of a prepared ground over the tables' tolerances, the drawn ones and those the claim asks for. */
export function auditSweep(
  ground: SweepGround,
  dates: SweepDates,
  yardstick: Yardstick,
  wantedArcmin: readonly number[],
): Sweep {
  const inTable = new Set([...TABLE_ARCMIN, ...wantedArcmin])
  const tolerances = [...new Set([...inTable, ...DRAWN_ARCMIN])].sort((a, b) => a - b)
  return {
    window: dates.window,
    marker: yardstick.marker,
    steps: tolerances.map((tolerance) => ({
      ...sweepStep(ground, dates, yardstick, tolerance),
      in_table: inTable.has(tolerance),
    })),
    no_target: unreachedYears(ground),
  }
}

/** One step of the sweep at a tolerance in arcminutes. */
export function sweepStep(
  ground: SweepGround,
  dates: SweepDates,
  yardstick: Yardstick,
  toleranceArcmin: number,
): SweepStep {
  const { sets68, sets95, bits, lnRatios } = sweepPoint(ground, toleranceArcmin)
  const edges = sets95.flat()
  return {
    tolerance_arcmin: toleranceArcmin,
    tolerance_cm: centimetres(toleranceArcmin, yardstick.marker),
    tolerance_sun_widths: sunWidths(toleranceArcmin, yardstick.semidiameterArcmin, yardstick.altitudeDeg),
    in_table: false,
    sets68,
    sets95,
    open_low: edges[0] === dates.window.from,
    open_high: edges.at(-1) === dates.window.to,
    bits,
    ratios: lnRatios.map((ln, i) => ratioOf(ln, dates.others[i]!.label)),
  }
}

function ratioOf(ln: number | null, against: string): Ratio {
  const value = ln === null ? null : Math.exp(ln)
  return {
    against,
    value: value !== null && Number.isFinite(value) ? value : null,
    ln: ln !== null && Number.isFinite(ln) ? ln : null,
    words: ratioWords(ln, against),
  }
}

/** Runs of the window in which one of the targets is not to be seen at its altitude at all. */
function unreachedYears({ window }: SweepGround): Interval[] {
  const runs: [number, number][] = []
  let open = false
  window.comparisons.forEach((comparisons, i) => {
    const year = window.years[i]!
    const missing = !comparisons.every((branches) => branches.some(isReached))
    if (missing && open) runs.at(-1)![1] = year
    else if (missing) runs.push([year, year])
    open = missing
  })
  return runs
}
