import type { Audit } from '../../audit/audit.ts'

/** How `Plan.north` begins where the claim does not say where the north of its plan points. */
const NOT_TOLD = /^(?:not said|unknown)/

/**
 * Whether the figure's north is true north: not where the claim says nothing of its plan's north, nor where all lines
 * are angles between points, for which no north plays a part.
 */
export function isNorthTold({ plan: { north, points, lines } }: Audit): boolean {
  if (north !== null) return !NOT_TOLD.test(north.words)
  return points.length === 0 || lines.some(({ span }) => span === null)
}
