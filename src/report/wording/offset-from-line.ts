import type { SightlineAudit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { sideOfLine } from './side-of-line.ts'

/** The line less its target, and what else is known of that. */
export interface Offset {
  arcmin: number
  sdArcmin: number | null
  measures: SightlineAudit['measures']
  /** Stands in brackets after the figure. */
  also?: readonly string[]
}

/**
 * Where the line points as seen from its target, for a sentence: `1.8′ ± 2.5′ to the left of it`, `5′ above it`,
 * `12′ beyond it` for an angle, or `at it` where the two print as one.
 */
export function offsetFromLine({ arcmin, sdArcmin, measures, also = [] }: Offset): string {
  const side = sideOfLine(arcmin, measures)
  if (side === null) return 'at it'
  const sd = sdArcmin === null ? '' : ` ± ${formatArcmin(sdArcmin)}`
  const shares = also.length === 0 ? '' : ` (${also.join(', ')})`
  return `${formatArcmin(Math.abs(arcmin))}${sd}${shares} ${side} it`
}

/** What is held against the target, with its verb: `the line points`, `the altitude measured lies`. */
export function whatPoints(measures: SightlineAudit['measures'], when: 'now' | 'then'): string {
  if (measures !== 'azimuth') return `the ${measures} measured ${when === 'now' ? 'lies' : 'lay'}`
  return `the line ${when === 'now' ? 'points' : 'pointed'}`
}
