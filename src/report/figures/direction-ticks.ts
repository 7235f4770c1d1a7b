import type { SightlineAudit } from '../../audit/audit.ts'
import { formatDegrees } from '../../quantity/format-angle.ts'
import type { Tick } from './year-ticks.ts'

const STEPS_ARCMIN = [0.1, 0.2, 0.5, 1, 2, 5, 10, 15, 30, 60, 120, 300, 600, 900, 1800, 3600]

/**
 * Ticks at round directions, printed in degrees and minutes; at most `most` of them. Azimuths go from 0° to 360° and
 * begin again; altitudes end at 90° to either side.
 */
export function directionTicks(
  measures: SightlineAudit['measures'],
  fromDeg: number,
  toDeg: number,
  most: number,
): Tick[] {
  const [from, to] =
    measures === 'altitude' ? [Math.max(-90, fromDeg), Math.min(90, toDeg)] : [fromDeg, toDeg]
  const span = (to - from) * 60
  const step = STEPS_ARCMIN.find((candidate) => span / candidate <= most - 1) ?? 3600
  const unit = step < 1 ? 'second' : 'minute'
  const ticks: Tick[] = []
  for (let count = Math.ceil((from * 60) / step); count * step <= to * 60; count++) {
    const at = (count * step) / 60
    const printed = measures === 'azimuth' ? turn(at) : at
    ticks.push({ at, label: step % 60 === 0 ? wholeDegrees(printed) : formatDegrees(printed, unit) })
  }
  return ticks
}

/** Into 0° to 360°. */
function turn(deg: number): number {
  return ((deg % 360) + 360) % 360
}

function wholeDegrees(deg: number): string {
  return `${deg < 0 ? '−' : ''}${Math.abs(deg)}°`
}
