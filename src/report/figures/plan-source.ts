import type { Audit, Placement, PlanLine, SightlineAudit, Value } from '../../audit/audit.ts'

/** What the figure of the plan draws for one line. */
export interface PlanSource {
  line: PlanLine
  sightline: SightlineAudit
  /** What was measured: the azimuth, or the angle between two lines. */
  measured: Value
  placements: readonly Placement[]
  /** The least and the greatest plausible error of what was built, arcminutes: of an angle that of two lines. */
  builtArcmin: readonly [number, number]
}

/** The lines of a plan, in its order. An altitude on the meridian has no place on a plan and is left out. */
export function planSources({ plan, sightlines, placements, plausible }: Audit): PlanSource[] {
  return plan.lines.flatMap((line) => {
    const sightline = sightlines.find(({ name }) => name === line.sightline)
    const measured = sightline?.angle_deg ?? sightline?.azimuth_deg ?? null
    if (sightline === undefined || sightline.measures === 'altitude' || measured === null) return []
    const own = placements.filter((placement) => placement.sightline === line.sightline)
    const { low_arcmin, high_arcmin } = plausible
    const builtArcmin = [low_arcmin, high_arcmin].map((arcmin) => arcmin * sightline.tolerance_scale)
    return [{ line, sightline, measured, placements: own, builtArcmin: [builtArcmin[0]!, builtArcmin[1]!] }]
  })
}

/**
 * Degrees by which the target stood to the right of the line, as one looks along it; of an angle, along its second
 * line. Null where it stood nowhere.
 */
export function rightOfLineDeg({ line }: PlanSource, { offset_arcmin }: Placement): number | null {
  if (offset_arcmin === null) return null
  // A wider angle than the one measured lies to the right where the angle opens clockwise.
  const turn = line.span !== null && line.span.angle_deg < 0 ? 1 : -1
  return (turn * offset_arcmin) / 60
}

/** The least and greatest such value over the whole date; null likewise. */
export function rangeRightOfLineDeg(
  source: PlanSource,
  placement: Placement,
): readonly [number, number] | null {
  const middle = rightOfLineDeg(source, placement)
  const { direction_deg: direction, direction_range_deg: range } = placement
  if (middle === null) return null
  if (direction === null || range === null) return [middle, middle]
  const turn = source.line.span !== null && source.line.span.angle_deg < 0 ? -1 : 1
  const ends = range.map((end) => middle + turn * (end - direction))
  return [Math.min(...ends), Math.max(...ends)]
}
