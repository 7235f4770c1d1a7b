import type { Audit } from '../../audit/audit.ts'
import { flagRows } from './flag-row.ts'
import { marginHeight, marginLabels } from './margin-labels.ts'
import { PALETTE } from './palette.ts'
import { premiseAlt } from './premise-alt.ts'
import { SCALE_ROWS, toleranceAxes, windowEnds, yearAxis } from './premise-axes.ts'
import { outOfReach, outsideGrounds, premiseDates, premiseMarginLabels } from './premise-dates.ts'
import { type PremisePlot, type PremiseScales, premisePlot, premiseScales } from './premise-layout.ts'
import { exactFrame, flagLines, plausibleBracket, premiseFlags } from './premise-marks.ts'
import { premiseSets } from './premise-sets.ts'
import { text } from './shape.ts'
import { type FigureDrawing, svgRoot } from './svg-root.ts'

const TARGET_HEIGHT = 252
const LEAST_PLOT = 150
const NOTE = 11

/**
 * The figure of the audit: which dates fit the line, against the tolerance one is willing to give the builders.
 * Dates run upwards, the oldest at the bottom; tolerances to the right on a logarithmic scale, after a strip for
 * `exact`. Points; 440 wide, about 250 high.
 */
export function premiseFigure(audit: Audit): FigureDrawing {
  const scales = premiseScales(audit)
  const flags = premiseFlags(audit, scales)
  const rows = flagRows(flags, scales.left - 2, scales.width - 2)
  const labels = premiseMarginLabels(audit)
  const note = audit.outcome === 'none' ? NOTE : 0
  const top = note + Math.max(rows.height, 11) + 1
  const plotHeight = Math.max(TARGET_HEIGHT - top - SCALE_ROWS.height, LEAST_PLOT, marginHeight(labels))
  const plot = premisePlot(audit, scales, top, plotHeight)
  const height = top + plotHeight + SCALE_ROWS.height
  const placed = labels.map((label) => ({ ...label, y: plot.y(label.year) }))
  const shapes = [
    ...outsideGrounds(audit, plot),
    ...premiseSets(audit.sweep.steps, scales, plot),
    ...outOfReach(audit, plot),
    ...premiseDates(audit, plot),
    ...windowEnds(audit, scales, plot),
    ...plausibleBracket(audit, scales, plot),
    ...rows.draw(plot.box.top),
    ...yearAxis(plot),
    ...flagLines(flags, scales, plot),
    ...exactFrame(audit, scales, plot),
    ...toleranceAxes(audit, scales, plot),
    ...marginLabels(placed, marginOf(scales, plot)),
    ...(note > 0 ? [noteOfNone(audit, scales)] : []),
  ]
  return svgRoot({ width: scales.width, height: Math.ceil(height) }, title(audit), premiseAlt(audit), shapes)
}

function title(audit: Audit): string {
  return `How the date depends on the build tolerance: ${audit.structure.name}`
}

function marginOf(scales: PremiseScales, plot: PremisePlot) {
  const { left, right } = scales.margin
  return { edge: scales.right, left, right, top: plot.box.top, bottom: plot.box.bottom }
}

function noteOfNone({ sightlines }: Audit, scales: PremiseScales) {
  const which = sightlines.length === 1 ? 'this line' : 'these lines together'
  const content = `No date in reach fits ${which}: the sets only weigh misses against each other.`
  return text(scales.left, NOTE - 3, content, { weight: 600, fill: PALETTE.ink })
}
