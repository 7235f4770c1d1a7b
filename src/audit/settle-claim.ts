import type { Claim } from '../claim/claim.ts'
import type { Sight } from '../inference/sight.ts'
import { formatYearRange } from '../quantity/format-year.ts'
import { isUnstated } from '../quantity/unstated.ts'
import type { Audit, Window } from './audit.ts'
import { widthAltitude } from './audit-sightline.ts'
import type { SweepDates, Yardstick } from './audit-sweep.ts'
import { datedLabel, middle } from './dated-label.ts'
import { DEFAULTS } from './defaults.ts'
import { jointLines } from './joint-lines.ts'
import { markerOf } from './measures.ts'
import { settleSightline } from './settle-sightline.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { yardstickSemidiameterArcmin } from './sun-yardstick.ts'

/** A claim with every gap filled, as all parts of the audit use it. */
export interface SettledClaim {
  lines: readonly SightlineInputs[]
  sights: readonly Sight[]
  /** Of those, the ones that are read together. */
  joint: readonly Sight[]
  dates: SweepDates
  /** Middle of the asserted date. */
  year: number
  plausible: Audit['plausible']
  /** Tolerances that the sweep includes exactly, arcminutes. */
  wantedArcmin: readonly number[]
  yardstick: Yardstick
}

export function settleClaim(claim: Claim): SettledClaim {
  const lines = claim.sightlines.map((sightline) => settleSightline(claim, sightline))
  const asserted = datedLabel('asserted date', claim.assertedDate)
  const others = claim.otherDates.map(({ label, date }) => datedLabel(label, date))
  const year = middle(asserted)
  const plausible = plausibleOf(claim)
  const joint = jointLines(lines)
  const lengths = new Set(joint.map(({ lengthM }) => lengthM))
  return {
    lines,
    sights: lines.map(sightOf),
    joint: joint.map(sightOf),
    dates: { window: windowOf(claim), asserted, others },
    year,
    plausible,
    wantedArcmin: wantedTolerances(claim, plausible),
    yardstick: yardstickOf(joint[0]!, year, lengths.size === 1 ? joint[0]!.lengthM : null),
  }
}

/** The Sun and the marker of one line as yardsticks. */
export function yardstickOf(line: SightlineInputs, year: number, lengthM: number | null): Yardstick {
  return {
    marker: markerOf(lengthM),
    semidiameterArcmin: yardstickSemidiameterArcmin(year),
    altitudeDeg: widthAltitude(line),
  }
}

function windowOf({ window }: Claim): Window {
  const stated = !isUnstated(window)
  const { from, to } = stated ? window : DEFAULTS.window
  return { from, to, printed: formatYearRange(from, to), stated }
}

function plausibleOf({ plausiblePrecision: stated }: Claim): Audit['plausible'] {
  const { lowArcmin, highArcmin } = isUnstated(stated) ? DEFAULTS.plausible : stated
  return { low_arcmin: lowArcmin, high_arcmin: highArcmin, stated: !isUnstated(stated) }
}

function wantedTolerances(claim: Claim, { low_arcmin, high_arcmin }: Audit['plausible']): number[] {
  const assumed = isUnstated(claim.assumedPrecisionArcmin) ? [] : [claim.assumedPrecisionArcmin]
  return [...new Set([low_arcmin, high_arcmin, ...assumed, ...claim.tolerancesArcmin])].sort((a, b) => a - b)
}
