import { line as polyline } from 'd3-shape'
import type { Element } from 'hast'
import type { Track } from '../../audit/audit.ts'
import { PALETTE } from './palette.ts'
import type { Obstacle } from './place-around.ts'
import { type Attributes, line, shape } from './shape.ts'
import { azimuthIn, nearLine, type TrackPlot, type TrackSource } from './track-layout.ts'

/** Two curves closer than this are one to the eye, points. */
const VISIBLE = 0.8
/** A label points to no place nearer to the plot's sides than this. */
const ROOM = 20

/** The line as measured: a rule at its azimuth, one standard deviation to either side, and two paler. */
export function measuredBand({ track }: TrackSource, plot: TrackPlot): Element[] {
  const { value, sd } = track.line_deg
  const { left, right } = plot.box
  const band = (times: number, fill: string) => {
    const { top, bottom } = bandAbout(value, sd * times, plot)
    return shape('rect', { x: left, y: top, width: right - left, height: bottom - top, fill })
  }
  return [
    ...(sd > 0 ? [band(2, PALETTE.set95), band(1, PALETTE.set68)] : []),
    line([left, plot.y(value)], [right, plot.y(value)], { stroke: PALETTE.ink, strokeWidth: 0.7 }),
  ]
}

function bandAbout(value: number, halfDeg: number, plot: TrackPlot): { top: number; bottom: number } {
  return {
    top: Math.max(plot.box.top, plot.y(value + halfDeg)),
    bottom: Math.min(plot.box.bottom, plot.y(value - halfDeg)),
  }
}

/** The track, and under it the second model's, dashed, where the two can be told apart. */
export function trackCurves({ track, second }: TrackSource, plot: TrackPlot): Element[] {
  const widest = second === null ? null : widestDifference(track, second, plot)
  return [
    ...(second === null || widest === null
      ? []
      : curve(second, plot, { stroke: PALETTE.ink, strokeWidth: 0.8, strokeDasharray: '3 2' })),
    ...curve(track, plot, { stroke: PALETTE.ink, strokeWidth: 1.4 }),
  ]
}

function curve(track: Track, plot: TrackPlot, stroke: Attributes): Element[] {
  const azimuths = nearLine(track)
  const path = polyline<number>()
    .defined((index) => azimuths[index] !== null)
    .x((index) => plot.x(track.years[index]!))
    .y((index) => plot.y(azimuths[index]!))
    .digits(2)
  const d = path(thinned(track, plot)) ?? ''
  return d === '' ? [] : [shape('path', { d, fill: 'none', ...stroke })]
}

/** Every point a point's width apart will do; the ends of stretches without an azimuth are kept. */
function thinned(track: Track, plot: TrackPlot): number[] {
  const perPoint = track.years.length / Math.max(1, plot.box.right - plot.box.left)
  const stride = Math.max(1, Math.floor(perPoint))
  const isEdge = (index: number) =>
    (track.azimuth_deg[index] === null) !== (track.azimuth_deg[index + 1] === null) ||
    (track.azimuth_deg[index] === null) !== (track.azimuth_deg[index - 1] === null)
  return track.years.map((_, index) => index).filter((index) => index % stride === 0 || isEdge(index))
}

/** Where the second track lies farthest from the first, if one can see it. */
export function widestDifference(
  track: Track,
  second: Track,
  plot: TrackPlot,
): { x: number; y: number } | null {
  const stride = Math.max(1, Math.floor(second.years.length / 200))
  const azimuths = nearLine(second)
  let widest: { x: number; y: number; apart: number } | null = null
  for (let index = 0; index < second.years.length; index += stride) {
    const year = second.years[index]!
    const ours = azimuthIn(track, year)
    const theirs = azimuths[index] ?? null
    if (ours === null || theirs === null) continue
    const apart = Math.abs(plot.y(ours) - plot.y(theirs))
    const isInner = Math.min(plot.x(year) - plot.box.left, plot.box.right - plot.x(year)) > ROOM
    if (isInner && apart >= VISIBLE && (widest === null || apart > widest.apart)) {
      widest = { x: plot.x(year), y: plot.y(theirs), apart }
    }
  }
  return widest
}

/** Small boxes along the track, for labels to keep off. */
export function trackObstacles(track: Track, plot: TrackPlot, weight: number): Obstacle[] {
  const azimuths = nearLine(track)
  const stride = Math.max(1, Math.floor(track.years.length / 150))
  return track.years.flatMap((year, index) => {
    const azimuth = azimuths[index] ?? null
    if (azimuth === null || index % stride !== 0) return []
    const [x, y] = [plot.x(year), plot.y(azimuth)]
    return [{ left: x - 2, right: x + 2, top: y - 2, bottom: y + 2, weight }]
  })
}
