import type { Branch } from '../inference/sight.ts'
import { wrap180 } from '../quantity/degrees.ts'
import { formatYear } from '../quantity/format-year.ts'
import { horizonAboveCentreArcmin } from '../site/centre-altitude.ts'
import type { DatedLabel, Placement } from './audit.ts'
import { middle } from './dated-label.ts'
import { centimetres, markerOf } from './measures.ts'
import { nearestBranch } from './nearest-branch.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { targetModel } from './targets/target-model.ts'

/** Years of a date in which the direction is looked at for its least and greatest. */
const LOOKS = 24

/** Where one line's target stood at the asserted date, at each independent one, and stands this year. */
export function auditPlacements(
  line: SightlineInputs,
  asserted: DatedLabel,
  others: readonly DatedLabel[],
  present: number,
): Placement[] {
  const today = { label: 'today', printed: formatYear(present), from: present, to: present }
  return [
    placementOf(line, 'asserted', asserted),
    ...others.map((date) => placementOf(line, 'independent', date)),
    placementOf(line, 'today', today),
  ]
}

function placementOf(
  line: SightlineInputs,
  kind: Placement['kind'],
  { label, printed, from, to }: Pick<DatedLabel, 'label' | 'printed' | 'from' | 'to'>,
): Placement {
  const year = middle({ from, to })
  const row = { sightline: line.name, kind, label, printed, year, from, to }
  const sight = sightOf(line)
  const branch = nearestBranch(sight, year)
  const prediction = branch.predict(year)
  if (prediction === null) {
    const none = {
      direction_deg: null,
      direction_range_deg: null,
      offset_arcmin: null,
      offset_sd_arcmin: null,
      offset_cm: null,
    }
    return { ...row, ...none, disc: null }
  }
  const offsetArcmin = wrap180(line.measuredDeg - prediction.directionDeg) * 60
  const own = [line.measuredSdDeg, line.northSdDeg]
  const sdDeg = Math.hypot(...own, ...prediction.errors.map(({ effectDeg }) => effectDeg))
  return {
    ...row,
    direction_deg: prediction.directionDeg,
    direction_range_deg: rangeOver(branch, from, to, prediction.directionDeg),
    offset_arcmin: offsetArcmin,
    offset_sd_arcmin: sdDeg * 60,
    offset_cm:
      line.measures === 'azimuth' ? centimetres(Math.abs(offsetArcmin), markerOf(line.lengthM)) : null,
    disc: discOf(line, branch, year),
  }
}

/** Least and greatest direction over a date, not folded at north, so that the least is the smaller number. */
function rangeOver(branch: Branch, from: number, to: number, middleDeg: number): readonly [number, number] {
  const turns = Array.from({ length: LOOKS + 1 }, (_, i) => {
    const direction = branch.predict(from + ((to - from) * i) / LOOKS)?.directionDeg
    return direction === undefined ? 0 : wrap180(direction - middleDeg)
  })
  return [middleDeg + Math.min(0, ...turns), middleDeg + Math.max(0, ...turns)]
}

/** The disc as it is seen on the horizon; null for what has none there. */
function discOf(line: SightlineInputs, branch: Branch, year: number): Placement['disc'] {
  const { target, measures, horizonDeg } = line
  const semidiameter = targetModel(line).semidiameter(year)
  const prediction = branch.predict(year)
  if (measures !== 'azimuth' || semidiameter === null || prediction === null || !('disc' in target))
    return null
  const level = {
    azimuthDeg: prediction.directionDeg,
    altitudeDeg: horizonDeg - horizonAboveCentreArcmin(target.disc, semidiameter.arcmin) / 60,
  }
  const { azimuthDeg, altitudeDeg } = prediction.discCentre ?? level
  return { azimuth_deg: azimuthDeg, altitude_deg: altitudeDeg, semidiameter_arcmin: semidiameter.arcmin }
}
