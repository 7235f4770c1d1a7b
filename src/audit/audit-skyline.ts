import type { Skyline } from './audit.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { usesHorizon } from './uses-horizon.ts'

/** What a line meets the sky at; null where no horizon plays a part, or where an angle has two. */
export function auditSkyline(line: SightlineInputs): Skyline | null {
  const { horizon, horizonDeg, horizonSdDeg, measuredDeg } = line
  if (!usesHorizon(line) || line.pair !== null) return null
  const nodes = horizon.nodes?.map(({ azimuthDeg, altitudeDeg }) => [azimuthDeg, altitudeDeg] as const)
  return {
    from: horizon.from,
    words: horizon.words,
    nodes: nodes ?? [[measuredDeg, horizonDeg]],
    at_line_deg: { value: horizonDeg, sd: horizonSdDeg },
  }
}
