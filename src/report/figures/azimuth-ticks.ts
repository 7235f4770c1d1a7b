import { formatDegrees } from '../../quantity/format-angle.ts'
import type { Tick } from './year-ticks.ts'

const STEPS_ARCMIN = [0.1, 0.2, 0.5, 1, 2, 5, 10, 15, 30, 60, 120, 300, 600, 900, 1800, 3600]

/** Ticks at round azimuths, printed in degrees and minutes from 0° to 360°; at most `most` of them. */
export function azimuthTicks(fromDeg: number, toDeg: number, most: number): Tick[] {
  const span = (toDeg - fromDeg) * 60
  const step = STEPS_ARCMIN.find((candidate) => span / candidate <= most - 1) ?? 3600
  const unit = step < 1 ? 'second' : 'minute'
  const ticks: Tick[] = []
  for (let count = Math.ceil((fromDeg * 60) / step); count * step <= toDeg * 60; count++) {
    const at = (count * step) / 60
    ticks.push({ at, label: step % 60 === 0 ? `${turn(at)}°` : formatDegrees(turn(at), unit) })
  }
  return ticks
}

/** Into 0° to 360°. */
function turn(deg: number): number {
  return ((deg % 360) + 360) % 360
}
