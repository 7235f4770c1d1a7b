import { area, line as polyline } from 'd3-shape'
import type { Element } from 'hast'
import type { Track } from '../../audit/audit.ts'
import { clipToBand } from './clip-to-band.ts'
import { PALETTE } from './palette.ts'
import type { Obstacle } from './place-around.ts'
import { type Attributes, line, shape } from './shape.ts'
import type { TrackPlot } from './track-layout.ts'
import { directionIn, isJump, nearLine, type TrackSource } from './track-source.ts'

/** Two curves closer than this are one to the eye, points. */
const VISIBLE = 0.8
/** A label points to no place nearer to the plot's sides than this. */
const ROOM = 20

/** The line as measured: a rule at its direction, one standard deviation to either side, and two paler. */
export function measuredBand({ tracks }: TrackSource, plot: TrackPlot): Element[] {
  const { value, sd } = tracks[0].line_deg
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

/** The heights of a band of directions, as far as the plot shows them. */
export function bandAbout(value: number, halfDeg: number, plot: TrackPlot): { top: number; bottom: number } {
  return {
    top: Math.max(plot.box.top, plot.y(value + halfDeg)),
    bottom: Math.min(plot.box.bottom, plot.y(value - halfDeg)),
  }
}

/** One standard deviation of the comparison to either side of each track. */
export function trackErrors({ tracks }: TrackSource, plot: TrackPlot): Element[] {
  const { top, bottom } = plot.box
  const within = (y: number) => Math.max(top, Math.min(bottom, y))
  return tracks.flatMap((track) => {
    const directions = nearLine(track)
    const ground = area<number>()
      .x((index) => plot.x(track.years[index]!))
      .y0((index) => within(plot.y(directions[index]! - (track.sd_arcmin[index] ?? 0) / 60)))
      .y1((index) => within(plot.y(directions[index]! + (track.sd_arcmin[index] ?? 0) / 60)))
      .digits(2)
    const d = runsOf(track, plot)
      .map((run) => ground(run) ?? '')
      .join('')
    return d === '' ? [] : [shape('path', { d, fill: PALETTE.ink, fillOpacity: 0.09 })]
  })
}

/** The tracks, and under them the second model's, dashed, where the two can be told apart. */
export function trackCurves(source: TrackSource, plot: TrackPlot): Element[] {
  const { tracks, seconds } = source
  const isApart = widestDifference(source, plot) !== null
  const dashed = { stroke: PALETTE.ink, strokeWidth: 0.8, strokeDasharray: '3 2' }
  return [
    ...(isApart ? seconds.flatMap((track) => curve(track, plot, dashed)) : []),
    ...tracks.flatMap((track) => curve(track, plot, { stroke: PALETTE.ink, strokeWidth: 1.4 })),
  ]
}

function curve(track: Track, plot: TrackPlot, stroke: Attributes): Element[] {
  const directions = nearLine(track)
  const path = polyline<readonly [number, number]>().digits(2)
  const d = runsOf(track, plot)
    .map((run) =>
      run.map((index): [number, number] => [plot.x(track.years[index]!), plot.y(directions[index]!)]),
    )
    .flatMap((points) => clipToBand(points, plot.box.top, plot.box.bottom))
    .map((part) => path(part) ?? '')
    .join('')
  return d === '' ? [] : [shape('path', { d, fill: 'none', ...stroke })]
}

/**
 * The runs of points between years without a direction, and between jumps. Every point a point's width apart will
 * do; the ends of runs are kept.
 */
function runsOf(track: Track, plot: TrackPlot): number[][] {
  const directions = nearLine(track)
  const perPoint = track.years.length / Math.max(1, plot.box.right - plot.box.left)
  const stride = Math.max(1, Math.floor(perPoint))
  const isBreak = (from: number | null | undefined, to: number | null | undefined) =>
    from == null || to == null || isJump(from, to)
  const runs: number[][] = []
  directions.forEach((direction, index) => {
    if (direction === null) return
    const starts = isBreak(directions[index - 1], direction)
    const ends = isBreak(direction, directions[index + 1])
    if (starts) runs.push([index])
    else if (ends || index % stride === 0) runs.at(-1)!.push(index)
  })
  return runs
}

/** Where a second track lies farthest from its first, if one can see it. */
export function widestDifference(
  { tracks, seconds }: TrackSource,
  plot: TrackPlot,
): { x: number; y: number; track: Track } | null {
  let widest: { x: number; y: number; track: Track; apart: number } | null = null
  for (const second of seconds) {
    const first = tracks.find(({ branch }) => branch === second.branch) ?? tracks[0]
    const stride = Math.max(1, Math.floor(second.years.length / 200))
    const directions = nearLine(second)
    for (let index = 0; index < second.years.length; index += stride) {
      const year = second.years[index]!
      const ours = directionIn(first, year)
      const theirs = directions[index] ?? null
      if (ours === null || theirs === null || isJump(ours, theirs)) continue
      const [x, y] = [plot.x(year), plot.y(theirs)]
      const apart = Math.abs(plot.y(ours) - y)
      if (!isInner(x, y, plot) || apart < VISIBLE) continue
      if (widest === null || apart > widest.apart) widest = { x, y, track: second, apart }
    }
  }
  return widest
}

function isInner(x: number, y: number, { box }: TrackPlot): boolean {
  return Math.min(x - box.left, box.right - x) > ROOM && box.top <= y && y <= box.bottom
}

/** Small boxes along the part of a track that is drawn, for labels to keep off. */
export function trackObstacles(track: Track, plot: TrackPlot, weight: number): Obstacle[] {
  const directions = nearLine(track)
  const stride = Math.max(1, Math.floor(track.years.length / 150))
  return track.years.flatMap((year, index) => {
    const direction = directions[index] ?? null
    if (direction === null || index % stride !== 0) return []
    const [x, y] = [plot.x(year), plot.y(direction)]
    if (y < plot.box.top || y > plot.box.bottom) return []
    return [{ left: x - 2, right: x + 2, top: y - 2, bottom: y + 2, weight }]
  })
}
