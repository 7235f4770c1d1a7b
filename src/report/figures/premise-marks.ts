import type { Element } from 'hast'
import type { Audit, Limit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import type { FlagLabel } from './flag-row.ts'
import { PALETTE } from './palette.ts'
import { SCALE_ROWS } from './premise-axes.ts'
import type { PremisePlot, PremiseScales } from './premise-layout.ts'
import { line, shape, TEXT_SIZE, text } from './shape.ts'
import { fitText, textWidth } from './text-width.ts'

const STROKES = {
  ratio3: { stroke: PALETTE.ink, strokeWidth: 1 },
  inSet: { stroke: PALETTE.ink, strokeWidth: 0.8, strokeDasharray: '3.5 1.8' },
  halfBit: { stroke: PALETTE.ink, strokeWidth: 0.9, strokeDasharray: '0.9 1.6' },
  assumed: { stroke: PALETTE.accent, strokeWidth: 0.9 },
  plausible: { stroke: PALETTE.ink, strokeWidth: 0.35 },
} as const

const LONGEST_NAME = 84

/**
 * What is marked across the tolerances: the precision the claim assumes, and the limits that exist. With
 * several independent dates only the 3-to-1 limit of each is marked, to keep the figure legible.
 */
export function premiseFlags(audit: Audit, scales: PremiseScales): FlagLabel[] {
  const assumed = audit.assumed_precision_arcmin
  const named = audit.limits.filter((limit) => limit.against !== null)
  return [
    ...(assumed === null ? [] : [assumedFlag(assumed, scales)]),
    ...named.flatMap((limit) => ratio3Flag(limit, scales)),
    ...(named.length === 1 ? named.flatMap((limit) => inSetFlag(limit, scales)) : []),
    ...halfBitFlag(audit.limits, scales),
  ]
}

function assumedFlag(arcmin: number, scales: PremiseScales): FlagLabel {
  const label = arcmin > 0 ? `the claim assumes ${formatArcmin(arcmin)}` : 'the claim assumes exact building'
  return { x: scales.x(arcmin), label, stroke: STROKES.assumed, fill: PALETTE.accent }
}

function ratio3Flag(limit: Limit, scales: PremiseScales): FlagLabel[] {
  const { against, ratio_3_arcmin: arcmin, ratio_3_steady } = limit
  if (arcmin === null) return []
  const until = ratio_3_steady === false ? 'last at' : 'up to'
  const where = arcmin > 0 ? `${until} ${formatArcmin(arcmin)}` : 'only if exact'
  const label = `3 to 1 over ${shortName(against)} ${where}`
  return [{ x: scales.x(arcmin), label, stroke: STROKES.ratio3, weight: 600 }]
}

function inSetFlag({ against, other_date_in_95_arcmin: arcmin }: Limit, scales: PremiseScales): FlagLabel[] {
  if (arcmin === null) return []
  const label = `${shortName(against)} in the 95 % set ${fromThere(arcmin)}`
  return [{ x: scales.x(arcmin), label, stroke: STROKES.inSet }]
}

/** The half-bit limit belongs to the line, not to an independent date, so one mark stands for all rows. */
function halfBitFlag(limits: readonly Limit[], scales: PremiseScales): FlagLabel[] {
  const arcmin = limits.find((limit) => limit.half_bit_arcmin !== null)?.half_bit_arcmin ?? null
  if (arcmin === null) return []
  const label = `line tells under ½ bit ${fromThere(arcmin)}`
  return [{ x: scales.x(arcmin), label, stroke: STROKES.halfBit }]
}

function fromThere(arcmin: number): string {
  return arcmin > 0 ? `from ${formatArcmin(arcmin)}` : 'throughout'
}

function shortName(name: string | null): string {
  return fitText(name ?? '', LONGEST_NAME, TEXT_SIZE)
}

/** The lines of the flags through the plot; none through the strip of `exact`, where it would hide the sets. */
export function flagLines(flags: readonly FlagLabel[], scales: PremiseScales, plot: PremisePlot): Element[] {
  const { top, bottom } = plot.box
  return flags
    .filter(({ x }) => x > scales.strip.right)
    .map(({ x, stroke }) => line([x, top], [x, bottom], stroke))
}

/** A frame about the strip of `exact`, where that is what the claim assumes. */
export function exactFrame(audit: Audit, scales: PremiseScales, plot: PremisePlot): Element[] {
  if (audit.assumed_precision_arcmin !== 0) return []
  const { left, right } = scales.strip
  const { top, bottom } = plot.box
  const box = { x: left, y: top, width: right - left, height: bottom - top }
  return [shape('rect', { ...box, fill: 'none', ...STROKES.assumed })]
}

/** A bracket under the scale over the plausible tolerances, with fine lines through the plot at its ends. */
export function plausibleBracket(audit: Audit, scales: PremiseScales, plot: PremisePlot): Element[] {
  const { low_arcmin: low, high_arcmin: high, stated } = audit.plausible
  const from = low > 0 ? scales.x(low) : scales.strip.left
  const to = high > 0 ? scales.x(high) : scales.strip.right
  const y = plot.box.bottom + SCALE_ROWS.plausible - 2.5
  const rule = { stroke: PALETTE.ink, strokeWidth: 1.6 }
  const ends = [from, to]
  const label = `plausible: ${low > 0 ? formatArcmin(low) : 'exact'} to ${formatArcmin(high)} (${stated ? 'stated' : 'default'})`
  const width = textWidth(label, TEXT_SIZE)
  const spot = labelSpot(from, to, width, scales.width)
  return [
    ...ends.map((x) => line([x, plot.box.top], [x, plot.box.bottom], STROKES.plausible)),
    ...ends.map((x) => line([x, y - 3], [x, y + 3], { stroke: PALETTE.ink, strokeWidth: 0.8 })),
    ...(spot.inside
      ? [line([from, y], [spot.left - 3, y], rule), line([spot.left + width + 3, y], [to, y], rule)]
      : [line([from, y], [to, y], rule)]),
    text(spot.inside ? (from + to) / 2 : spot.left, y + 2.5, label, {
      anchor: spot.inside ? 'middle' : 'start',
    }),
  ]
}

/** Right of the bracket, else left of it, else in a gap in its middle. */
function labelSpot(
  from: number,
  to: number,
  width: number,
  right: number,
): { left: number; inside: boolean } {
  if (to + 4 + width <= right) return { left: to + 4, inside: false }
  if (from - 4 - width >= 0) return { left: from - 4 - width, inside: false }
  return { left: (from + to - width) / 2, inside: true }
}
