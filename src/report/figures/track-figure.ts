import { pairs } from 'd3-array'
import type { Element } from 'hast'
import type { Audit, DatedLabel } from '../../audit/audit.ts'
import { measuredDegrees } from '../wording/measured-angle.ts'
import { modelLabel } from '../wording/model-label.ts'
import type { Box } from './box.ts'
import { assertedBand, independentBand } from './date-band.ts'
import { type FlagLabel, flagRows } from './flag-row.ts'
import { marginLabels } from './margin-labels.ts'
import { outsideNotes } from './outside-notes.ts'
import { PALETTE } from './palette.ts'
import { TEXT_SIZE, text } from './shape.ts'
import { sunToScale } from './sun-to-scale.ts'
import { type FigureDrawing, svgRoot } from './svg-root.ts'
import { fitText } from './text-width.ts'
import { trackAlt } from './track-alt.ts'
import { outsideGrounds, outsideWindow, TRACK_AXIS_HEIGHT, trackAxes, windowEnds } from './track-axes.ts'
import { measuredBand, trackCurves } from './track-curves.ts'
import { trackLabels } from './track-labels.ts'
import {
  nearLine,
  TRACK_MARGIN,
  TRACK_WIDTH,
  type TrackPlot,
  type TrackSource,
  trackPlot,
  trackSource,
  trackYears,
} from './track-layout.ts'

const TARGET_HEIGHT = 236
const LEAST_PLOT = 140

/**
 * Where the target of one sightline stood over time, against the line as measured: azimuth upwards, dates to the
 * right. Points; 440 wide, about 240 high. Throws a RangeError where the audit has no such sightline.
 */
export function trackFigure(audit: Audit, sightline: string): FigureDrawing {
  const source = trackSource(audit, sightline)
  const { x } = trackYears(audit, source)
  const rows = flagRows(dateFlags(audit, x), x(trackYears(audit, source).years[0]), TRACK_WIDTH - 2)
  const top = Math.max(rows.height, 11) + 1
  const plotHeight = Math.max(LEAST_PLOT, TARGET_HEIGHT - top - TRACK_AXIS_HEIGHT)
  const plot = trackPlot(audit, source, top, plotHeight)
  const outside = outsideWindow(audit, plot)
  const notes = outsideNotes(source, plot, outside)
  const shapes = [
    ...outsideGrounds(outside, plot),
    ...measuredBand(source, plot),
    ...dateBands(audit, plot),
    ...windowEnds(audit, plot),
    ...trackCurves(source, plot),
    ...notes.map(({ box, content }) => text(box.left, box.bottom - 2, content, { fill: PALETTE.muted })),
    ...trackLabels(
      audit,
      source,
      plot,
      notes.map(({ box }) => box),
    ),
    ...rows.draw(top),
    ...trackAxes(plot, TRACK_MARGIN.right),
    ...marginShapes(source, plot),
  ]
  const size = { width: TRACK_WIDTH, height: Math.ceil(top + plotHeight + TRACK_AXIS_HEIGHT) }
  return svgRoot(size, `Where the target of ${sightline} stood over time`, trackAlt(audit, source), shapes)
}

function dateFlags(audit: Audit, x: (year: number) => number): FlagLabel[] {
  const flag = (date: DatedLabel, name: string, colour: string): FlagLabel => ({
    x: x((date.from + date.to) / 2),
    label: `${fitText(name, 90, TEXT_SIZE)}: ${date.printed}`,
    stroke: { stroke: colour, strokeWidth: 0.6 },
    fill: colour,
  })
  return [
    { ...flag(audit.asserted, 'asserted', PALETTE.accent), weight: 600 },
    ...audit.other_dates.map((date) => flag(date, date.label, PALETTE.ink)),
  ]
}

function dateBands(audit: Audit, plot: TrackPlot): Element[] {
  return [
    ...audit.other_dates.flatMap((date, index) => independentBand(bandOf(date, plot), 'horizontal', index)),
    ...assertedBand(bandOf(audit.asserted, plot), 'horizontal'),
  ]
}

function bandOf({ from, to }: DatedLabel, plot: TrackPlot): Box {
  return { ...plot.box, left: plot.x(from), right: plot.x(to) }
}

/** Right of the plot: what the band and the curve are, and the Sun on the same scale, away from both. */
function marginShapes(source: TrackSource, plot: TrackPlot): Element[] {
  const { sightline, track } = source
  const labels = [
    {
      y: plot.y(track.line_deg.value),
      lines: ['line as measured', measuredDegrees(track.line_deg)],
      strong: true,
    },
    ...trackEnd(source, plot),
  ]
  const width = 2 * sightline.semidiameter_arcmin.value
  const diameter = plot.y(0) - plot.y(width / 60)
  const { top, bottom } = plot.box
  const sun = sunToScale(width, diameter, (bottom - top) * 0.6)
  const y = middleOfWidestGap([top, ...labels.map((label) => label.y), bottom])
  return marginLabels(labels, { edge: plot.box.right, ...TRACK_MARGIN, top, bottom }, [{ ...sun, y }])
}

function middleOfWidestGap(heights: readonly number[]): number {
  const [widest] = pairs([...heights].sort((a, b) => a - b)).sort(([a, b], [c, d]) => d - c - (b - a))
  return widest === undefined ? 0 : (widest[0] + widest[1]) / 2
}

function trackEnd(
  { track }: TrackSource,
  plot: TrackPlot,
): { y: number; lines: string[]; strong: boolean }[] {
  const azimuths = nearLine(track)
  const last = azimuths.findLast((azimuth) => azimuth !== null)
  if (last === undefined || last === null) return []
  return [{ y: plot.y(last), lines: ['azimuth of target', modelLabel(track.model)], strong: true }]
}
