import { pairs } from 'd3-array'
import type { Element } from 'hast'
import type { Audit, DatedLabel } from '../../audit/audit.ts'
import { measuredDegrees } from '../wording/measured-angle.ts'
import type { Box } from './box.ts'
import { assertedBand, independentBand } from './date-band.ts'
import { type GroundNote, groundNoteShapes, groundNotes } from './ground-notes.ts'
import { type MarginGuest, marginLabels } from './margin-labels.ts'
import { sunToScale } from './sun-to-scale.ts'
import { type FigureDrawing, svgRoot } from './svg-root.ts'
import { trackAlt } from './track-alt.ts'
import { outsideGrounds, outsideWindow, trackAxes, windowEnds } from './track-axes.ts'
import { measuredBand, trackCurves, trackErrors } from './track-curves.ts'
import { trackLabels } from './track-labels.ts'
import { layTrack, TRACK_AXIS_HEIGHT, TRACK_MARGIN, TRACK_WIDTH, type TrackPlot } from './track-layout.ts'
import { reachHatch } from './track-marks.ts'
import { trackNames } from './track-names.ts'
import { yearsOutOfReach } from './track-reach.ts'
import { type TrackSource, trackSource } from './track-source.ts'

/**
 * Where the target of one sightline stood over time, against the line as measured: azimuth or altitude upwards, dates
 * to the right. Points; 440 wide, about 240 high. Throws a RangeError where the audit has no such sightline.
 */
export function trackFigure(audit: Audit, sightline: string): FigureDrawing {
  const source = trackSource(audit, sightline)
  const { plot, flags } = layTrack(audit, source)
  const outside = outsideWindow(audit, plot)
  const unreached = yearsOutOfReach(source)
  const notes = notesOf(source, plot, outside, unreached)
  const shapes = [
    ...outsideGrounds(outside, plot),
    ...reachHatch(unreached, plot),

    ...measuredBand(source, plot),
    ...trackErrors(source, plot),
    ...dateBands(audit, plot),
    ...windowEnds(audit, plot),
    ...trackCurves(source, plot),
    ...notes.flatMap(groundNoteShapes),
    ...trackLabels(
      audit,
      source,
      plot,
      notes.map(({ box }) => box),
    ),
    ...flags.draw(plot.box.top),
    ...trackAxes(plot, source.sightline.measures, TRACK_MARGIN.right),
    ...marginShapes(audit, source, plot),
  ]
  const size = { width: TRACK_WIDTH, height: Math.ceil(plot.box.bottom + TRACK_AXIS_HEIGHT) }
  return svgRoot(size, `Where the target of ${sightline} stood over time`, trackAlt(audit, source), shapes)
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

function notesOf(
  source: TrackSource,
  plot: TrackPlot,
  outside: readonly (readonly [number, number])[],
  unreached: readonly (readonly [number, number])[],
): GroundNote[] {
  return groundNotes(source, plot, [
    ...outside.map((years) => ({ years, names: ['outside the window', 'outside'], isHatched: false })),
    ...unreached.map((years) => ({
      years,
      names: ['target out of reach', 'out of reach'],
      isHatched: true,
    })),
  ])
}

/** Right of the plot: what the band and the curves are, and the Sun on the same scale, away from them. */
function marginShapes(audit: Audit, source: TrackSource, plot: TrackPlot): Element[] {
  const { line_deg } = source.tracks[0]
  const names = trackNames(source, plot).filter(({ x }) => x === null)
  const labels = [
    { y: plot.y(line_deg.value), lines: ['line as measured', measuredDegrees(line_deg)], strong: true },
    ...names.map(({ y, lines }) => ({ y, lines, strong: true })),
  ]
  const guests = sunGuest(audit, source, plot, labels)
  const { top, bottom } = plot.box
  return marginLabels(labels, { edge: plot.box.right, ...TRACK_MARGIN, top, bottom }, guests)
}

function sunGuest(
  audit: Audit,
  source: TrackSource,
  plot: TrackPlot,
  labels: readonly { y: number }[],
): MarginGuest[] {
  const width = sunWidthArcmin(audit, source)
  if (width === null) return []
  const { top, bottom } = plot.box
  const sun = sunToScale(width, plot.y(0) - plot.y(width / 60), (bottom - top) * 0.6)
  return [{ ...sun, y: middleOfWidestGap([top, ...labels.map((label) => label.y), bottom]) }]
}

/** The Sun's own width where it is the target; elsewhere its width as the sweep measures tolerances in it. */
function sunWidthArcmin({ sweep }: Audit, { sightline }: TrackSource): number | null {
  const { body, semidiameter_arcmin } = sightline
  if (body === 'sun' && semidiameter_arcmin !== null) return 2 * semidiameter_arcmin.value
  const step = (sightline.sweep ?? sweep).steps.find(({ tolerance_sun_widths }) => tolerance_sun_widths > 0)
  return step === undefined ? null : step.tolerance_arcmin / step.tolerance_sun_widths
}

function middleOfWidestGap(heights: readonly number[]): number {
  const [widest] = pairs([...heights].sort((a, b) => a - b)).sort(([a, b], [c, d]) => d - c - (b - a))
  return widest === undefined ? 0 : (widest[0] + widest[1]) / 2
}
