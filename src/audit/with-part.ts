import { wrap360 } from '../quantity/degrees.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { type End, turnByParts } from './survey/ends.ts'

/** The line with another part of one of its ends sighted. */
export function withPart(line: SightlineInputs, side: 'from' | 'to', part: End['part']): SightlineInputs {
  const { ends, lengthM, measuredDeg } = line
  if (ends === null || lengthM === null) return line
  const changed = { ...ends, [side]: { ...ends[side], part } }
  const turn = turnByParts(changed, lengthM) - turnByParts(ends, lengthM)
  return { ...line, ends: changed, measuredDeg: wrap360(measuredDeg + turn) }
}
