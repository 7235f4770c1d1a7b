import type { Element } from 'hast'
import type { Audit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { modelLabel } from '../wording/model-label.ts'
import type { Box } from './box.ts'
import { impliedYear } from './implied-year.ts'
import { PALETTE } from './palette.ts'
import { costOf, type Obstacle, placeAround } from './place-around.ts'
import { line, shape, TEXT_SIZE, text } from './shape.ts'
import { fitText, textWidth } from './text-width.ts'
import { bandAbout, trackObstacles, widestDifference } from './track-curves.ts'
import type { TrackPlot } from './track-layout.ts'
import { approachEnds, approachMark, crossingMarks } from './track-marks.ts'
import { trackNames } from './track-names.ts'
import type { TrackSource } from './track-source.ts'

interface PlotLabel {
  x: number
  y: number
  lines: readonly string[]
  weight: 400 | 600
  fill: string
}

const HEIGHT = 8.5
/** A label that covers more than this gets a plate. */
const BUSY = 10

/** The marks inside the plot with their labels: crossings, the nearest approach, the curves. */
export function trackLabels(
  audit: Audit,
  source: TrackSource,
  plot: TrackPlot,
  taken: readonly Box[],
): Element[] {
  const labels = [
    ...crossingLabels(source, plot),
    ...approachLabel(source, plot),
    ...secondLabel(source, plot),
    ...nameLabels(source, plot),
  ]
  const sized = labels.map(({ x, y, lines, weight }) => ({
    x,
    y,
    width: Math.max(...lines.map((content) => textWidth(content, TEXT_SIZE, weight))),
    height: lines.length * HEIGHT,
  }))
  const bounds = { ...plot.box, left: plot.box.left + 2, right: plot.box.right - 2 }
  const avoid = obstacles(audit, source, plot)
  const boxes = placeAround(sized, bounds, taken, avoid)
  return [
    ...boxes.filter((box) => costOf(box, avoid) > BUSY).map(plate),
    ...labels.flatMap((label, index) => labelShapes(label, boxes[index]!)),
    ...approachMark(source, plot),
    ...crossingMarks(source, plot),
  ]
}

/** Among many crossings labels stay short and near, if need be on a curve. */
const MANY_CROSSINGS = 5

function isCrowded({ implied }: TrackSource): boolean {
  return (implied?.dates.length ?? 0) >= MANY_CROSSINGS
}

function crossingLabels(source: TrackSource, plot: TrackPlot): PlotLabel[] {
  const { implied, tracks } = source
  return (implied?.dates ?? []).map((date) => ({
    x: plot.x(date.year),
    y: plot.y(tracks[0].line_deg.value),
    lines: [impliedYear(date), ...(date.future && !isCrowded(source) ? ['(to come)'] : [])],
    weight: 600,
    fill: PALETTE.ink,
  }))
}

function approachLabel(source: TrackSource, plot: TrackPlot): PlotLabel[] {
  const ends = approachEnds(source, plot)
  const nearest = source.implied?.nearest_approach ?? null
  if (ends === null || nearest === null || nearest.offset_arcmin === null) return []
  const lines = [
    'nearest in',
    `${formatYear(nearest.year, 10)},`,
    `${formatArcmin(Math.abs(nearest.offset_arcmin))} off`,
  ]
  return [{ x: ends.x, y: (ends.from + ends.to) / 2, lines, weight: 600, fill: PALETTE.accent }]
}

function secondLabel(source: TrackSource, plot: TrackPlot): PlotLabel[] {
  const widest = widestDifference(source, plot)
  if (widest === null) return []
  const lines = [fitText(modelLabel(widest.track.model), 120, TEXT_SIZE)]
  return [{ x: widest.x, y: widest.y, lines, weight: 400, fill: PALETTE.muted }]
}

/** The names of the curves that do not end in view, which the margin cannot hold. */
function nameLabels(source: TrackSource, plot: TrackPlot): PlotLabel[] {
  return trackNames(source, plot).flatMap(({ x, y, lines }) =>
    x === null ? [] : [{ x, y, lines, weight: 600, fill: PALETTE.ink }],
  )
}

function labelShapes(label: PlotLabel, box: Box): Element[] {
  const near = { x: clamp(label.x, box.left, box.right), y: clamp(label.y, box.top, box.bottom) }
  const side = facing(label.x, box)
  const isFar = Math.hypot(near.x - label.x, near.y - label.y) > 7
  return [
    ...(isFar
      ? [line([label.x, label.y], [near.x, near.y], { stroke: PALETTE.muted, strokeWidth: 0.4 })]
      : []),
    ...label.lines.map((content, row) => {
      const style = { weight: label.weight, fill: label.fill, anchor: side.anchor }
      return text(side.x, box.top + (row + 1) * HEIGHT - 2, content, style)
    }),
  ]
}

/** A label is set from the side that faces its point, since estimated widths err on the wide side. */
function facing(x: number, box: Box): { x: number; anchor: 'start' | 'middle' | 'end' } {
  if (box.left >= x) return { x: box.left, anchor: 'start' }
  if (box.right <= x) return { x: box.right, anchor: 'end' }
  return { x: (box.left + box.right) / 2, anchor: 'middle' }
}

/** Fades what lies under a label that could not be put clear of everything. */
function plate({ left, right, top, bottom }: Box): Element {
  const box = { x: left, y: top, width: right - left, height: bottom - top }
  return shape('rect', { ...box, fill: PALETTE.paper, fillOpacity: 0.75 })
}

/** What labels had better not lie on: curves first of all, then the line, the dates, the window's ends. */
function obstacles(audit: Audit, source: TrackSource, plot: TrackPlot): Obstacle[] {
  const { left, right } = plot.box
  const { value, sd } = source.tracks[0].line_deg
  const rule = plot.y(value)
  const approach = approachEnds(source, plot)
  const { window } = audit.sweep
  return [
    ...[...source.tracks, ...source.seconds].flatMap((track) =>
      trackObstacles(track, plot, isCrowded(source) ? 0.6 : 3),
    ),
    { left, right, top: rule - 1, bottom: rule + 1, weight: 2 },
    { left, right, ...bandAbout(value, sd, plot), weight: 0.05 },
    ...(source.implied?.dates ?? []).map(({ year }) => aboutMark(plot.x(year), rule)),
    ...(approach === null ? [] : [upright(approach.x, approach.x, plot, 2)]),
    ...[audit.asserted, ...audit.other_dates].map(({ from, to }) =>
      upright(plot.x(from), plot.x(to), plot, 1),
    ),
    ...[window.from, window.to].map((year) => upright(plot.x(year), plot.x(year), plot, 0.6)),
  ]
}

/** Another mark's label had better not stand right above or below this one. */
function aboutMark(x: number, y: number): Obstacle {
  return { left: x - 4, right: x + 4, top: y - 14, bottom: y + 14, weight: 0.3 }
}

function upright(from: number, to: number, { box }: TrackPlot, weight: number): Obstacle {
  return { left: from - 1.5, right: to + 1.5, top: box.top, bottom: box.bottom, weight }
}

function clamp(value: number, low: number, high: number): number {
  return Math.max(low, Math.min(high, value))
}
