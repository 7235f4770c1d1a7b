import type { Claim } from '../claim/claim.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { formatYearRange } from '../quantity/format-year.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { bennettRefractionArcmin } from '../site/bennett.ts'
import { OBLIQUITY_MODELS } from '../sky/obliquity-models.ts'
import { ORBIT_SPAN } from '../sky/orbit.ts'
import type { DatedLabel } from './audit.ts'
import type { SettledClaim } from './settle-claim.ts'
import { refractionAtHorizon, type SightlineInputs } from './sightline-inputs.ts'

/** What is doubtful about an audit but was computed all the same; shown in the report. */
export function listWarnings(
  claim: Claim,
  settled: SettledClaim,
  readingWarnings: readonly string[],
): string[] {
  const { dates, lines } = settled
  return [
    ...readingWarnings,
    ...beyondOrbit(dates.asserted),
    ...beyondFormula(claim, dates.asserted),
    ...lines.flatMap(refractionParts),
    ...(lines.length > 1 ? [SEVERAL] : []),
  ]
}

const SEVERAL =
  'Several lines are read together: they share the errors of north and of the obliquity, but each is taken to have been built with an error of its own.'

function beyondOrbit({ printed, from, to }: DatedLabel) {
  if (ORBIT_SPAN.from <= from && to <= ORBIT_SPAN.to) return []
  const span = formatYearRange(ORBIT_SPAN.from, ORBIT_SPAN.to)
  return [
    `The table of the Earth’s orbit covers ${span}; for ${printed} a mean size of the Sun is used, 15.99′ ± 0.27′.`,
  ]
}

/** A formula carried past the range it is good for. */
function beyondFormula({ formula }: Claim, { printed, from, to }: DatedLabel) {
  if (isUnstated(formula) || !('model' in formula)) return []
  const { label, range } = OBLIQUITY_MODELS[formula.model]
  if (range.from <= from && to <= range.to) return []
  return [
    `The claim’s formula, ${label}, is used for ${printed}, outside ${formatYearRange(range.from, range.to)} (${range.basis}).`,
  ]
}

/** The ray trace and Bennett’s formula part by about 1′ on the horizon; more than that wants a word. */
function refractionParts(line: SightlineInputs) {
  const { refraction, horizonDeg } = line
  if (refraction.by === 'claim' || horizonDeg < 0) return []
  const { temperatureC, pressureHpa } = refraction.air
  const difference =
    refractionAtHorizon(line).arcmin - bennettRefractionArcmin(horizonDeg, temperatureC, pressureHpa)
  if (Math.abs(difference) <= 2) return []
  return [
    `Line ${line.name}: the ray-traced refraction and Bennett’s formula part by ${formatArcmin(Math.abs(difference))} in this air.`,
  ]
}
