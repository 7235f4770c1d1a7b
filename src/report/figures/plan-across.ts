import { ARCMIN } from '../../quantity/degrees.ts'
import { roundFactor } from './plan-round.ts'
import { type PlanSource, rangeRightOfLineDeg, rightOfLineDeg } from './plan-source.ts'

/** The scale across the lines, the same for all of them. */
export interface AcrossScale {
  left: number
  right: number
  /** Least and greatest arcminutes to the right of a line that have room. */
  shown: readonly [number, number]
  x: (arcminRight: number) => number
  pointsPerArcmin: number
}

/** Targets further off than so many times the greatest plausible tolerance, or than this, are shown as arrows. */
const TOLERANCES_SHOWN = 3.2
const LEAST_REACH = 100
/** The asserted date is held up to this, and no wedge beyond it. */
const FARTHEST = 300
/** A view that is no wider than this would make much of nothing. */
const LEAST_SHOWN = 3
const MARGIN = 7

/** A scale on which wedge, lines and targets have room, but for targets that would shrink all else. */
export function acrossScale(sources: readonly PlanSource[], left: number, right: number): AcrossScale {
  const high = Math.min(Math.max(0, ...sources.map(({ builtArcmin }) => builtArcmin[1])), FARTHEST)
  const reach = Math.min(FARTHEST, Math.max(LEAST_REACH, TOLERANCES_SHOWN * high))
  const wanted = sources.flatMap((source) => [
    ...[-1, 1].map((side) => side * Math.min(reach, source.measured.sd * 60)),
    ...source.placements.flatMap((placement) => {
      const arcmin = 60 * (rightOfLineDeg(source, placement) ?? 0)
      if (Math.abs(arcmin) > (placement.kind === 'asserted' ? FARTHEST : reach)) return []
      const range = rangeRightOfLineDeg(source, placement) ?? [0, 0]
      return range.map((deg) => Math.max(-reach, Math.min(reach, deg * 60))).concat(arcmin)
    }),
  ])
  const low = Math.min(-LEAST_SHOWN, -high, ...wanted)
  const top = Math.max(LEAST_SHOWN, high, ...wanted)
  const pointsPerArcmin = (right - left - 2 * MARGIN) / (top - low)
  const beyond = MARGIN / pointsPerArcmin
  return {
    ...{ left, right, pointsPerArcmin },
    shown: [low - beyond, top + beyond],
    x: (arcminRight) => left + MARGIN + (arcminRight - low) * pointsPerArcmin,
  }
}

/** Whether what lies so far to the right of a line is past the edge of the view along it. */
export function isBeyondView(arcminRight: number, { shown }: AcrossScale): boolean {
  return arcminRight < shown[0] || arcminRight > shown[1]
}

/**
 * How many times widths across are drawn as large as lengths along the line, where a fan may be at most `most` high;
 * and how high it then is.
 */
export function magnified(
  { pointsPerArcmin }: AcrossScale,
  most: number,
): { factor: number; height: number } {
  const factor = roundFactor(pointsPerArcmin / (ARCMIN * most))
  return { factor, height: pointsPerArcmin / (ARCMIN * factor) }
}
