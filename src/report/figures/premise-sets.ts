import type { Element } from 'hast'
import type { SweepStep } from '../../audit/audit.ts'
import { PALETTE } from './palette.ts'
import type { PremisePlot, PremiseScales } from './premise-layout.ts'
import { regionPath, tidySpans } from './region-path.ts'
import type { Span } from './region-slabs.ts'
import { shape } from './shape.ts'

type Pairs = readonly (readonly [number, number])[]

/** A single short interval is still drawn this thick, points. */
export const THINNEST_SET = 1.2

/** The 95 % and 68 % sets as filled regions: a slab at τ = 0, then the sweep. */
export function premiseSets(
  steps: readonly SweepStep[],
  scales: PremiseScales,
  plot: PremisePlot,
): Element[] {
  return [
    ...setShapes(steps, (step) => step.sets95, PALETTE.set95, scales, plot),
    ...setShapes(steps, (step) => step.sets68, PALETTE.set68, scales, plot),
  ]
}

function setShapes(
  steps: readonly SweepStep[],
  setsOf: (step: SweepStep) => Pairs,
  fill: string,
  scales: PremiseScales,
  plot: PremisePlot,
): Element[] {
  const spansOf = (step: SweepStep) =>
    setsOf(step)
      .filter(([from, to]) => plot.y(to) < plot.box.bottom && plot.y(from) > plot.box.top)
      .map(([from, to]): Span => [plot.yWithin(to), plot.yWithin(from)])
  const swept = steps.filter((step) => step.tolerance_arcmin > 0)
  const columns = swept.map((step) => ({ x: scales.x(step.tolerance_arcmin), spans: spansOf(step) }))
  const d = regionPath(columns, THINNEST_SET)
  return [
    ...steps
      .filter((step) => step.tolerance_arcmin === 0)
      .flatMap((step) => tidySpans(spansOf(step), THINNEST_SET))
      .map(([top, bottom]) => {
        const { left, right } = scales.strip
        return shape('rect', { x: left, y: top, width: right - left, height: bottom - top, fill })
      }),
    ...(d === '' ? [] : [shape('path', { d, fill })]),
  ]
}
