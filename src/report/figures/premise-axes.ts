import { scaleLog } from 'd3-scale'
import type { Element } from 'hast'
import type { Audit, SweepStep } from '../../audit/audit.ts'
import { keepLegible, lengthTicks, ratioTicks, toleranceTicks } from './log-ticks.ts'
import { PALETTE } from './palette.ts'
import type { PremisePlot, PremiseScales } from './premise-layout.ts'
import { line, TEXT_SIZE, text } from './shape.ts'
import { minorYears, type Tick, yearTicks } from './year-ticks.ts'

const RULE = { stroke: PALETTE.ink, strokeWidth: 0.6 }
const FINE = { stroke: PALETTE.ink, strokeWidth: 0.35 }
const MOST_YEARS = 7

/** Scale of years on the left. */
export function yearAxis(plot: PremisePlot): Element[] {
  const { left, top, bottom } = plot.box
  const minor = minorYears(plot.years[0], plot.years[1], MOST_YEARS)
  return [
    line([left, top], [left, bottom], RULE),
    ...minor.map((year) => line([left - 2, plot.y(year)], [left, plot.y(year)], FINE)),
    ...yearTicks(plot.years[0], plot.years[1], MOST_YEARS).flatMap(({ at, label }) => [
      line([left - 4, plot.y(at)], [left, plot.y(at)], RULE),
      text(left - 6, plot.y(at) + 2.6, label, { anchor: 'end' }),
    ]),
    text(1, top - 5.5, 'date, later up', { fill: PALETTE.muted }),
  ]
}

/** Heights the rows of scales take below the plot; `plausible` is the row of the bracket between them. */
export const SCALE_ROWS = { tolerance: 11, plausible: 22.5, length: 37.5, widths: 50.5, height: 54 }

/** The scale of tolerances below the plot, and the same as lengths at the marker and as widths of the Sun. */
export function toleranceAxes(audit: Audit, scales: PremiseScales, plot: PremisePlot): Element[] {
  const { bottom } = plot.box
  const { strip, logLeft, right } = scales
  const ticks = keepLegible(toleranceTicks(...scales.tolerances), scales.x, TEXT_SIZE, scales.margin.left - 2)
  return [
    line([strip.left, bottom], [strip.right, bottom], RULE),
    line([logLeft, bottom], [right, bottom], RULE),
    line([scales.x(0), bottom], [scales.x(0), bottom + 3], RULE),
    text(scales.x(0), bottom + SCALE_ROWS.tolerance, 'exact', { anchor: 'middle' }),
    ...tickRow(ticks, scales.x, bottom, SCALE_ROWS.tolerance),
    caption('build tolerance', scales, bottom + SCALE_ROWS.tolerance, true),
    text(1, bottom + SCALE_ROWS.tolerance, 'earlier down', { fill: PALETTE.muted }),
    ...secondScale(
      audit.sweep.steps,
      (step) => step.tolerance_cm,
      lengthTicks,
      scales,
      bottom + SCALE_ROWS.length,
    ),
    caption(lengthCaption(audit), scales, bottom + SCALE_ROWS.length),
    ...secondScale(
      audit.sweep.steps,
      (step) => step.tolerance_sun_widths,
      ratioTicks,
      scales,
      bottom + SCALE_ROWS.widths,
    ),
    caption('in Sun’s widths', scales, bottom + SCALE_ROWS.widths),
  ]
}

/** Ticks in another measure of the same tolerances, found between the steps of the sweep. */
function secondScale(
  steps: readonly SweepStep[],
  measure: (step: SweepStep) => number,
  ticksBetween: (from: number, to: number) => Tick[],
  scales: PremiseScales,
  baseline: number,
): Element[] {
  const swept = steps.filter((step) => step.tolerance_arcmin > 0 && measure(step) > 0)
  const first = swept[0]
  const last = swept.at(-1)
  if (first === undefined || last === undefined || measure(last) <= measure(first)) return []
  const position = scaleLog(
    swept.map(measure),
    swept.map((step) => scales.x(step.tolerance_arcmin)),
  )
  const ticks = keepLegible(
    ticksBetween(measure(first), measure(last)),
    position,
    TEXT_SIZE,
    scales.margin.left - 2,
  )
  return ticks.flatMap(({ at, label }) => [
    line([position(at), baseline - 9.5], [position(at), baseline - 7], FINE),
    text(position(at), baseline, label, { anchor: 'middle', fill: PALETTE.muted }),
  ])
}

function tickRow(
  ticks: readonly Tick[],
  position: (at: number) => number,
  top: number,
  row: number,
): Element[] {
  return ticks.flatMap(({ at, label }) => [
    line([position(at), top], [position(at), top + 3], RULE),
    text(position(at), top + row, label, { anchor: 'middle' }),
  ])
}

function caption(content: string, scales: PremiseScales, baseline: number, strong = false): Element {
  return text(scales.margin.left, baseline, content, {
    weight: strong ? 600 : 400,
    fill: strong ? PALETTE.ink : PALETTE.muted,
  })
}

/** The sweep's centimetres are at the marker, or at 100 m where the claim has no distance. */
function lengthCaption(audit: Audit): string {
  return audit.sweep.marker.measured ? 'at the marker' : 'at 100 m'
}

/** Lines where the window ends. */
export function windowEnds(
  { sweep: { window } }: Audit,
  scales: PremiseScales,
  plot: PremisePlot,
): Element[] {
  const stroke = { stroke: PALETTE.ink, strokeWidth: 0.5, strokeDasharray: '4 2' }
  return [window.from, window.to]
    .filter((year) => plot.years[0] <= year && year <= plot.years[1])
    .map((year) => line([scales.left, plot.y(year)], [scales.right, plot.y(year)], stroke))
}
