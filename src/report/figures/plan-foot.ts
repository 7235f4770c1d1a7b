import type { Element } from 'hast'
import type { Audit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { toleranceRange } from '../wording/tolerance-range.ts'
import { PALETTE } from './palette.ts'
import type { AcrossScale } from './plan-across.ts'
import { tickStep } from './plan-board.ts'
import { measureBar } from './plan-furniture.ts'
import { centimetresAcross } from './plan-offset.ts'
import type { Spot } from './plan-rim.ts'
import { roundLength } from './plan-round.ts'
import { shape, text } from './shape.ts'

const ROW = 11
/** Three scales and the key to the wedge. */
export const FOOT_HEIGHT = 4 * ROW + 1
const LONGEST_BAR = 60
const LONGEST_SUN = 115
const EDGE = { stroke: PALETTE.rule, strokeWidth: 0.4 }

/** Under the views: the scale across them in arcminutes, in lengths at the marker, in Suns; and what the greys are. */
export function planFoot(audit: Audit, scale: AcrossScale, [left, top]: Spot): Element[] {
  const { pointsPerArcmin } = scale
  const { marker } = audit.sweep
  const arcmin = tickStep(scale)
  const cmPerPoint = centimetresAcross(1, marker.distance_m) / pointsPerArcmin
  const cm = roundLength(LONGEST_BAR * cmPerPoint)
  const where = marker.measured ? `at the marker, ${formatCm(marker.distance_m * 100)} off` : 'at 100 m'
  return [
    ...measureBar(left, top + ROW, arcmin * pointsPerArcmin, `${formatArcmin(arcmin)}, one tick`),
    ...measureBar(left, top + 2 * ROW, cm / cmPerPoint, `${formatCm(cm)} ${where}`),
    ...sunBar(audit, scale, left, top + 3 * ROW),
    ...wedgeKey(audit, left, top + 4 * ROW),
  ]
}

/** The Sun's width along the horizon as the sweep measures tolerances in it. */
function sunBar({ sweep }: Audit, { pointsPerArcmin }: AcrossScale, left: number, bottom: number): Element[] {
  const step = sweep.steps.find(({ tolerance_sun_widths }) => tolerance_sun_widths > 0)
  if (step === undefined) return []
  const arcmin = step.tolerance_arcmin / step.tolerance_sun_widths
  const words = `the Sun, ${formatArcmin(arcmin)} wide`
  const length = arcmin * pointsPerArcmin
  return length <= LONGEST_SUN
    ? measureBar(left, bottom, length, words)
    : [text(left, bottom - 0.5, `${words}, is too wide to be drawn`, { fill: PALETTE.muted })]
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
