import type { SightlineInputs } from './sightline-inputs.ts'

/** A line whose horizon stands higher by an angle, with the skyline to both sides. */
export function raisedHorizon(line: SightlineInputs, deg: number): SightlineInputs {
  return {
    ...line,
    horizonDeg: line.horizonDeg + deg,
    horizonShiftDeg: line.horizonShiftDeg + deg,
  }
}
