import type { Element } from 'hast'
import type { Audit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { toleranceRange } from '../wording/tolerance-range.ts'
import { PALETTE } from './palette.ts'
import type { AcrossScale } from './plan-across.ts'
import { tickStep } from './plan-board.ts'
import { brokenBar, measureBar } from './plan-furniture.ts'
import { centimetresAcross } from './plan-offset.ts'
import type { Spot } from './plan-rim.ts'
import { roundLength } from './plan-round.ts'
import type { PlanSource } from './plan-source.ts'
import { shape, TEXT_SIZE, text } from './shape.ts'
import { textWidth } from './text-width.ts'

const ROW = 11
/** Three scales and the key to the wedge. */
export const FOOT_HEIGHT = 4 * ROW + 1
const LONGEST_BAR = 60
const EDGE = { stroke: PALETTE.rule, strokeWidth: 0.4 }

/** Where the foot begins, and how far to the right it may reach. */
export interface FootPlace {
  at: Spot
  right: number
}

/** Under the views: the scale across them in arcminutes, in lengths at the marker, in Suns; and what the greys are. */
export function planFoot(
  audit: Audit,
  sources: readonly PlanSource[],
  scale: AcrossScale,
  { at: [left, top], right }: FootPlace,
): Element[] {
  const arcmin = tickStep(scale)
  const rows = [
    (bottom: number) =>
      measureBar(left, bottom, arcmin * scale.pointsPerArcmin, `${formatArcmin(arcmin)}, one tick`),
    ...lengthBar(sources, scale, left),
    (bottom: number) => sunBar(audit, scale, [left, bottom], right - left),
    (bottom: number) => wedgeKey(audit, left, bottom),
  ]
  return rows.flatMap((row, index) => row(top + (index + 1) * ROW))
}

/** None where the lines' markers are not equally far off: lengths beside their labels would not agree with it. */
function lengthBar(
  sources: readonly PlanSource[],
  { pointsPerArcmin }: AcrossScale,
  left: number,
): ((bottom: number) => Element[])[] {
  // An angle has no lengths beside its labels.
  const lines = sources.filter(({ sightline }) => sightline.measures !== 'angle')
  const markers = (lines.length > 0 ? lines : sources).map(({ sightline }) => sightline.length_m)
  const whereOf = (marker: number | null) =>
    marker === null ? 'at 100 m' : `at the marker, ${formatCm(marker * 100)} off`
  const wheres = new Set(markers.map(whereOf))
  if (wheres.size !== 1) return []
  const cmPerPoint = centimetresAcross(1, markers[0] ?? 100) / pointsPerArcmin
  const cm = roundLength(LONGEST_BAR * cmPerPoint)
  return [(bottom) => measureBar(left, bottom, cm / cmPerPoint, `${formatCm(cm)} ${[...wheres][0]}`)]
}

/** The Sun's width along the horizon as the sweep measures tolerances in it; its words break the bar where that is long. */
function sunBar({ sweep }: Audit, scale: AcrossScale, [left, bottom]: Spot, room: number): Element[] {
  const step = sweep.steps.find(({ tolerance_sun_widths }) => tolerance_sun_widths > 0)
  if (step === undefined) return []
  const arcmin = step.tolerance_arcmin / step.tolerance_sun_widths
  const words = `the Sun, ${formatArcmin(arcmin)} wide`
  const length = arcmin * scale.pointsPerArcmin
  if (length + 4 + textWidth(words, TEXT_SIZE) <= room) return measureBar(left, bottom, length, words)
  if (length <= room) return brokenBar(left, bottom, length, words)
  const why = length > scale.right - scale.left ? 'is wider than this view' : 'has no room here'
  return [text(left, bottom - 0.5, `${words}, ${why}`, { fill: PALETTE.muted })]
}

function wedgeKey({ plausible, sightlines }: Audit, left: number, bottom: number): Element[] {
  const { low_arcmin: low, high_arcmin: high, stated } = plausible
  const greys = [...(low > 0 ? [PALETTE.set95] : []), ...(high > 0 ? [PALETTE.outside] : [])]
  const swatches = greys.map((fill, index) =>
    shape('rect', { x: left + index * 10, y: bottom - 7, width: 10, height: 7, fill, ...EDGE }),
  )
  const ofAngle = sightlines.some(({ measures }) => measures === 'angle') ? ', √2 times for an angle' : ''
  const words = `plausible tolerance: ${toleranceRange(low, high)} (${stated ? 'stated' : 'default'})${ofAngle}`
  return [...swatches, text(left + (greys.length > 0 ? greys.length * 10 + 4 : 0), bottom - 0.5, words)]
}
