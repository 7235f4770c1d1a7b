import { extent } from 'd3-array'
import { scaleLinear, scaleLog } from 'd3-scale'
import type { Audit } from '../../audit/audit.ts'
import type { Box } from './box.ts'
import { premiseYears } from './premise-years.ts'

/** Where things stand in the premise figure, points. */
export interface PremiseScales {
  width: number
  /** The whole plot, the strip of `exact` included. */
  left: number
  right: number
  /** The strip of tolerance 0. */
  strip: { left: number; right: number }
  /** Left edge of the logarithmic part, and the tolerances at its two ends, arcminutes. */
  logLeft: number
  tolerances: readonly [number, number]
  /** Arcminutes to points; 0 and less is the middle of the strip. */
  x: (toleranceArcmin: number) => number
  /** Left and right edge of the texts in the margin. */
  margin: { left: number; right: number }
}

export const PREMISE_WIDTH = 440
const LEFT = 52
const STRIP = 21
const BREAK = 8
const RIGHT = 338

export function premiseScales(audit: Audit): PremiseScales {
  const tolerances = toleranceDomain(audit)
  const logLeft = LEFT + STRIP + BREAK
  const log = scaleLog(tolerances, [logLeft, RIGHT]).clamp(true)
  return {
    width: PREMISE_WIDTH,
    left: LEFT,
    right: RIGHT,
    strip: { left: LEFT, right: LEFT + STRIP },
    logLeft,
    tolerances,
    x: (toleranceArcmin) => (toleranceArcmin > 0 ? log(toleranceArcmin) : LEFT + STRIP / 2),
    margin: { left: RIGHT + 11, right: PREMISE_WIDTH - 1 },
  }
}

/** Every tolerance of the sweep, and what is marked beside it. */
function toleranceDomain(audit: Audit): [number, number] {
  const shown = [
    ...audit.sweep.steps.map((step) => step.tolerance_arcmin),
    audit.assumed_precision_arcmin ?? 0,
    audit.plausible.low_arcmin,
    audit.plausible.high_arcmin,
  ].filter((arcmin) => arcmin > 0)
  const [low, high] = extent(shown)
  if (low === undefined || high === undefined) return [0.5, 300]
  return low < high ? [low, high] : [low / 2, high * 2]
}

/** The plot's box and its scale of years, the oldest at the bottom, with room beyond either end. */
export interface PremisePlot {
  box: Box
  y: (year: number) => number
  years: readonly [number, number]
  /** Heights in the plot only: what lies beyond the years shown is at its edge. */
  yWithin: (year: number) => number
}

const BEYOND = 5

export function premisePlot(audit: Audit, scales: PremiseScales, top: number, height: number): PremisePlot {
  const box = { left: scales.left, right: scales.right, top, bottom: top + height }
  const { shown } = premiseYears(audit)
  const scale = scaleLinear(shown, [box.bottom - BEYOND, box.top + BEYOND])
  const yWithin = (year: number) => Math.max(box.top, Math.min(box.bottom, scale(year)))
  return { box, y: (year) => scale(year), years: shown, yWithin }
}
