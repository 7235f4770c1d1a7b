import type { SightlineInputs } from './sightline-inputs.ts'

/** A line turned by an angle to either side; where it gives an altitude or an angle, that much more and less. */
export function turnedLine(deg: number): (line: SightlineInputs) => SightlineInputs[] {
  return (line) => [
    { ...line, measuredDeg: line.measuredDeg + deg },
    { ...line, measuredDeg: line.measuredDeg - deg },
  ]
}
