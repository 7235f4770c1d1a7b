import type { Sight } from '../inference/sight.ts'
import { OBLIQUITY_MODELS, type ObliquityModelName } from '../sky/obliquity-models.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { targetModel } from './targets/target-model.ts'

/** The sightline as the inference sees it. */
export function sightOf(inputs: SightlineInputs): Sight {
  return {
    name: inputs.name,
    measures: inputs.measures,
    measuredDeg: inputs.measuredDeg,
    axis: inputs.axis,
    measuredSdDeg: inputs.measuredSdDeg,
    northSdDeg: inputs.northSdDeg,
    northOf: inputs.northOf,
    toleranceScale: inputs.measures === 'angle' ? Math.SQRT2 : 1,
    branches: targetModel(inputs).branches,
  }
}

/** The part of a stretch of years for which a model gives numbers. */
export function computableStretch(
  model: ObliquityModelName,
  from: number,
  to: number,
): { from: number; to: number } {
  const { computable } = OBLIQUITY_MODELS[model]
  return { from: Math.max(from, computable.from), to: Math.min(to, computable.to) }
}
