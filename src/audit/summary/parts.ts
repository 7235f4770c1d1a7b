import { formatArcmin } from '../../quantity/format-angle.ts'
import type { Limit, SightlineAudit, SweepStep } from '../audit.ts'
import { middle } from '../dated-label.ts'
import { centimetres, sunWidths } from '../measures.ts'
import { leadsUpTo, rivalLimits } from '../outcome.ts'
import { labelled } from '../phrases.ts'
import { yardstickSemidiameterArcmin } from '../sun-yardstick.ts'
import { inThreeMeasures, widthsInWords } from '../words.ts'
import { grammarOf } from './grammar.ts'
import { shortened } from './shortened.ts'
import { sourcesOf } from './sources-of.ts'
import type { SummaryFacts } from './summary-facts.ts'

/** Beyond 45° neither hands nor Suns help to picture an angle. */
const LARGEST_PICTURED_ARCMIN = 45 * 60

/** Beyond this no standard deviation means anything: the direction turns round in it. */
const LARGEST_TOLD_SD_ARCMIN = 20 * 60

/** `, give or take 9′ (one standard deviation) for survey, horizon and air`; close to the meridian no such thing. */
export function giveOrTake(line: SightlineAudit, sdArcmin: number): string {
  if (sdArcmin > LARGEST_TOLD_SD_ARCMIN) return ', so close to the meridian that no error of it can be told'
  return `, give or take ${formatArcmin(sdArcmin)} (one standard deviation) for ${sourcesOf(line)}`
}

/** A line that points the opposite way most likely has its ends, or rising and setting, exchanged. */
export function reversedWords(offsetArcmin: number): string {
  return Math.abs(offsetArcmin) < 90 * 60 ? '' : ' Are its ends exchanged, or rising and setting?'
}

/** `24′ (71 cm at 99.9 m, 0.74 of the Sun’s width)`. */
export function threeMeasures({ sweep, sightlines, asserted }: SummaryFacts, arcmin: number): string {
  const { measures, altitude_deg } = sightlines[0]!
  const semidiameter = yardstickSemidiameterArcmin(middle(asserted))
  const widths = sunWidths(arcmin, semidiameter, measures === 'azimuth' ? (altitude_deg?.value ?? 0) : 0)
  if (arcmin > LARGEST_PICTURED_ARCMIN) return formatArcmin(arcmin)
  if (measures !== 'azimuth') return `${formatArcmin(arcmin)} (${widthsInWords(widths)})`
  return inThreeMeasures(arcmin, centimetres(arcmin, sweep.marker), sweep.marker.distance_m, widths)
}

/** What half a bit means for this claim; empty where it is told at every tolerance. */
export function halfBit({ limits, sightlines, window }: SummaryFacts): string {
  const { half_bit_arcmin } = limits[0]!
  if (half_bit_arcmin === null) return ''
  const { it, tells } = grammarOf(sightlines)
  const from = half_bit_arcmin === 0 ? 'Even built exactly' : `From ${formatArcmin(half_bit_arcmin)} on`
  return `${from} ${it} ${tells} less than half a bit about the date, of ${window.printed}.`
}

/** The independent date over which the asserted one loses its lead first. */
export function tightestLimit(limits: readonly Limit[]): Limit {
  return rivalLimits(limits).reduce((a, b) => (leadsUpTo(b) < leadsUpTo(a) ? b : a))
}

/** `800 to 500 BCE (radiocarbon)`. */
export function againstWords({ other_dates }: SummaryFacts, { against }: Limit): string {
  const other = other_dates.find(({ label }) => label === against)!
  return labelled({ ...other, label: shortened(other.label) })
}

/** The step of a tolerance that the sweep includes exactly. */
export function stepAt(steps: readonly SweepStep[], arcmin: number): SweepStep {
  const step = steps.find(({ tolerance_arcmin }) => tolerance_arcmin === arcmin)
  if (step === undefined) throw new Error(`the sweep lacks the tolerance of ${arcmin}′`)
  return step
}
