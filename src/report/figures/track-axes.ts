import type { Element } from 'hast'
import type { Audit, SightlineAudit } from '../../audit/audit.ts'
import { directionTicks } from './direction-ticks.ts'
import { keepLegible } from './log-ticks.ts'
import { PALETTE } from './palette.ts'
import { line, shape, TEXT_SIZE, text } from './shape.ts'
import type { TrackPlot } from './track-layout.ts'
import { minorYears, yearTicks } from './year-ticks.ts'

const RULE = { stroke: PALETTE.ink, strokeWidth: 0.6 }
const FINE = { stroke: PALETTE.ink, strokeWidth: 0.35 }
const MOST_YEARS = 7
const MOST_DIRECTIONS = 8

export function trackAxes(
  plot: TrackPlot,
  measures: SightlineAudit['measures'],
  captionRight: number,
): Element[] {
  const { left, right, top, bottom } = plot.box
  const [from, to] = plot.years
  const years = keepLegible(yearTicks(from, to, MOST_YEARS), plot.x, TEXT_SIZE)
  return [
    line([left, top], [left, bottom], RULE),
    line([left, bottom], [right, bottom], RULE),
    ...directionTicks(measures, ...plot.range.shown, MOST_DIRECTIONS).flatMap(({ at, label }) => [
      line([left - 4, plot.y(at)], [left, plot.y(at)], RULE),
      text(left - 6, plot.y(at) + 2.6, label, { anchor: 'end' }),
    ]),
    ...minorYears(from, to, MOST_YEARS).map((year) =>
      line([plot.x(year), bottom], [plot.x(year), bottom + 2], FINE),
    ),
    ...years.flatMap(({ at, label }) => [
      line([plot.x(at), bottom], [plot.x(at), bottom + 4], RULE),
      text(plot.x(at), bottom + 12, label, { anchor: 'middle' }),
    ]),
    text(1, top - 5.5, measures, { fill: PALETTE.muted }),
    text(captionRight, bottom + 12, 'date, later →', { anchor: 'end', fill: PALETTE.muted }),
  ]
}

/** The stretches of shown years that lie outside the window. */
export function outsideWindow({ sweep: { window } }: Audit, plot: TrackPlot): [number, number][] {
  const stretches: [number, number][] = [
    [plot.years[0], window.from],
    [window.to, plot.years[1]],
  ]
  return stretches.filter(([from, to]) => to > from)
}

export function outsideGrounds(
  stretches: readonly (readonly [number, number])[],
  plot: TrackPlot,
): Element[] {
  const { top, bottom } = plot.box
  return stretches.map(([from, to]) =>
    shape('rect', {
      x: plot.x(from),
      y: top,
      width: plot.x(to) - plot.x(from),
      height: bottom - top,
      fill: PALETTE.outside,
    }),
  )
}

export function windowEnds({ sweep: { window } }: Audit, plot: TrackPlot): Element[] {
  const { top, bottom } = plot.box
  const stroke = { stroke: PALETTE.ink, strokeWidth: 0.5, strokeDasharray: '4 2' }
  return [window.from, window.to].map((year) => line([plot.x(year), top], [plot.x(year), bottom], stroke))
}
