import type { Element } from 'hast'
import type { ImpliedDate } from '../../audit/audit.ts'
import { hatch } from './hatch.ts'
import { PALETTE } from './palette.ts'
import { line, shape } from './shape.ts'
import type { TrackPlot } from './track-layout.ts'
import type { TrackSource } from './track-source.ts'

/** A crossing in the past is a full circle, one still to come an open one. */
export function crossingMarks({ implied, tracks }: TrackSource, plot: TrackPlot): Element[] {
  const mark = (date: ImpliedDate) =>
    shape('circle', {
      cx: plot.x(date.year),
      cy: plot.y(tracks[0].line_deg.value),
      r: 2.6,
      fill: date.future ? PALETTE.paper : PALETTE.ink,
      stroke: PALETTE.ink,
      strokeWidth: 0.9,
    })
  return (implied?.dates ?? []).map(mark)
}

/** Ends of the shortest distance from the target to the line within the window. */
export function approachEnds(
  { implied, tracks }: TrackSource,
  plot: TrackPlot,
): { x: number; from: number; to: number } | null {
  const nearest = implied?.nearest_approach ?? null
  if (nearest === null || nearest.offset_arcmin === null) return null
  const { value } = tracks[0].line_deg
  return {
    x: plot.x(nearest.year),
    from: plot.y(value - nearest.offset_arcmin / 60),
    to: plot.y(value),
  }
}

/** The nearest approach as a measure between track and line. */
export function approachMark(source: TrackSource, plot: TrackPlot): Element[] {
  const ends = approachEnds(source, plot)
  if (ends === null) return []
  const stroke = { stroke: PALETTE.accent, strokeWidth: 1 }
  const cap = (y: number) => line([ends.x - 3, y], [ends.x + 3, y], stroke)
  return [line([ends.x, ends.from], [ends.x, ends.to], stroke), cap(ends.from), cap(ends.to)]
}

/** Years in which the target has no direction, hatched as in the figure of the sets. */
export function reachHatch(stretches: readonly (readonly [number, number])[], plot: TrackPlot): Element[] {
  return stretches
    .map(([from, to]) => hatch({ ...plot.box, left: plot.x(from), right: plot.x(to) }, 9, true))
    .filter((d) => d !== '')
    .map((d) => shape('path', { d, fill: 'none', stroke: PALETTE.rule, strokeWidth: 0.5 }))
}
