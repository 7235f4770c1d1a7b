import type { Claim } from '../claim/claim.ts'
import { yearsOfDeclination } from '../inference/declination-dates.ts'
import { crossingYears } from '../inference/implied-dates.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { OBLIQUITY_MODELS, type ObliquityModelName } from '../sky/obliquity-models.ts'
import type { Reproduction } from './audit.ts'
import { middle, nearestYear } from './dated-label.ts'
import { YEARS_BEYOND_WINDOW } from './defaults.ts'
import { computableStretch, sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { targetModel } from './targets/target-model.ts'

const STEP = 20

/** The models of the period check: the claimant's, then the two of today; all of them where theirs is not known. */
export function modelsToTry({ formula }: Claim, line: SightlineInputs): readonly ObliquityModelName[] {
  const { models } = targetModel(line)
  if (isUnstated(formula) || !('model' in formula) || !models.includes(formula.model)) return models
  return [...new Set([formula.model, ...models.slice(0, 2)])]
}

/** The models whose dates are told with their intervals: the claimant's, and the two of today. */
export function modelsOfDates(claim: Claim, line: SightlineInputs): readonly ObliquityModelName[] {
  const [first, second] = targetModel(line).models
  const theirs = modelsToTry(claim, line)[0]!
  return [...new Set([theirs, first!, second!])]
}

/**
 * Does the last step reproduce: the date by the claimant's formula and by today's, first from the declination and the
 * azimuth that the source prints, then from each line as recomputed here.
 */
export function auditReproduction(
  claim: Claim,
  lines: readonly SightlineInputs[],
  window: { from: number; to: number },
): Reproduction[] {
  const near = middle(claim.assertedDate)
  const span = { from: window.from - YEARS_BEYOND_WINDOW, to: window.to + YEARS_BEYOND_WINDOW }
  const printed = claim.claimed.declinationDeg
  const first = lines[0]!
  const routes: Route[] = lines.map((line) => ({
    from: 'sightline',
    sightline: line.name,
    line,
    datesBy: (model) => {
      const { from, to } = computableStretch(model, span.from, span.to)
      return crossingYears(sightOf({ ...line, model }), from, to, STEP)
    },
  }))
  const azimuth = claim.claimed.azimuthDeg
  if (azimuth !== null && first.measures === 'azimuth') {
    routes.unshift({
      from: 'claimed azimuth',
      sightline: first.name,
      line: first,
      datesBy: (model) => {
        const { from, to } = computableStretch(model, span.from, span.to)
        return crossingYears(sightOf({ ...first, measuredDeg: azimuth.value, model }), from, to, STEP)
      },
    })
  }
  if (printed !== null && targetModel(first).declinationDeg(near) !== null) {
    routes.unshift({
      from: 'claimed declination',
      sightline: first.name,
      line: first,
      datesBy: (model) => datesOfDeclination(printed.value, first, model, span),
    })
  }
  return routes.flatMap((route) => [
    ...lackingRow(claim, route),
    ...rowsOf(route, modelsOf(claim, route, first), near),
  ])
}

/** The first line is told by all models; of the others the claimant's and today's are enough. */
function modelsOf(claim: Claim, { line }: Route, first: SightlineInputs): readonly ObliquityModelName[] {
  return line === first ? modelsToTry(claim, line) : modelsOfDates(claim, line)
}

interface Route {
  from: Reproduction['from']
  sightline: string
  line: SightlineInputs
  datesBy: (model: ObliquityModelName) => number[]
}

function rowsOf(
  { from, sightline, datesBy }: Route,
  models: readonly ObliquityModelName[],
  near: number,
): Reproduction[] {
  const reference = nearestYear(datesBy('vondrak2011'), near)
  return models.map((model) => {
    const { label, range } = OBLIQUITY_MODELS[model]
    const dates = datesBy(model)
    const year = nearestYear(dates, near)
    // On the same branch as the reference, which need not be the one nearest the asserted date.
    const sameBranch = reference === null || model === 'vondrak2011' ? null : nearestYear(dates, reference)
    return {
      model,
      label,
      from,
      sightline,
      year,
      difference_years: year === null ? null : year - near,
      within_model_range: year === null ? null : range.from <= year && year <= range.to,
      model_range: range.basis,
      model_error_years: sameBranch === null ? null : sameBranch - reference!,
      reason: year === null ? 'no year in reach has that declination' : null,
    }
  })
}

/** A table that this program does not have is named, and its step left untested. */
function lackingRow({ formula }: Claim, { from, sightline }: Route): Reproduction[] {
  if (isUnstated(formula) || !('lacking' in formula)) return []
  return [
    {
      model: formula.lacking,
      label: formula.lacking,
      from,
      sightline,
      year: null,
      difference_years: null,
      within_model_range: null,
      model_range: 'not known here',
      model_error_years: null,
      reason: 'this program does not have that table, so the step could not be tested',
    },
  ]
}

/** The years in which the target's declination is the printed one by a model. */
function datesOfDeclination(
  declination: number,
  line: SightlineInputs,
  model: ObliquityModelName,
  span: { from: number; to: number },
): number[] {
  const { declinationDeg } = targetModel({ ...line, model })
  const { from, to } = computableStretch(model, span.from, span.to)
  return yearsOfDeclination(declination, declinationDeg, from, to)
}
