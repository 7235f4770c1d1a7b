import type { Element } from 'hast'
import type { ImpliedDate } from '../../audit/audit.ts'
import { PALETTE } from './palette.ts'
import { line, shape } from './shape.ts'
import { azimuthIn, type TrackPlot, type TrackSource } from './track-layout.ts'

/** A crossing in the past is a full circle, one still to come an open one. */
export function crossingMarks({ implied, track }: TrackSource, plot: TrackPlot): Element[] {
  const mark = (date: ImpliedDate) =>
    shape('circle', {
      cx: plot.x(date.year),
      cy: plot.y(track.line_deg.value),
      r: 2.6,
      fill: date.future ? PALETTE.paper : PALETTE.ink,
      stroke: PALETTE.ink,
      strokeWidth: 0.9,
    })
  return (implied?.dates ?? []).map(mark)
}

/** Ends of the shortest distance from the track to the line within the window. */
export function approachEnds(
  { implied, track }: TrackSource,
  plot: TrackPlot,
): { x: number; from: number; to: number } | null {
  const nearest = implied?.nearest_approach ?? null
  const azimuth = nearest === null ? null : azimuthIn(track, nearest.year)
  if (nearest === null || nearest.offset_arcmin === null || azimuth === null) return null
  return { x: plot.x(nearest.year), from: plot.y(azimuth), to: plot.y(track.line_deg.value) }
}

/** The nearest approach as a measure between track and line. */
export function approachMark(source: TrackSource, plot: TrackPlot): Element[] {
  const ends = approachEnds(source, plot)
  if (ends === null) return []
  const stroke = { stroke: PALETTE.accent, strokeWidth: 1 }
  const cap = (y: number) => line([ends.x - 3, y], [ends.x + 3, y], stroke)
  return [line([ends.x, ends.from], [ends.x, ends.to], stroke), cap(ends.from), cap(ends.to)]
}
