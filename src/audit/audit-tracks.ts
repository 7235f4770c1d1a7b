import { offsetSdDeg, targetAzimuthDeg } from '../inference/comparison.ts'
import type { ObliquityModelName } from '../sky/obliquity-models.ts'
import type { Track } from './audit.ts'
import { computableStretch, type SightlineInputs, sightOf } from './sightline-inputs.ts'

/** Step of the tracks that the figures draw, years: the curve bends too little between two points to be seen. */
const STEP = 50

/** The target's azimuth over a stretch of years by each model. */
export function auditTracks(
  inputs: SightlineInputs,
  models: readonly ObliquityModelName[],
  from: number,
  to: number,
): Track[] {
  return models.map((model) => trackOf({ ...inputs, model }, computableStretch(model, from, to)))
}

function trackOf(inputs: SightlineInputs, { from, to }: { from: number; to: number }): Track {
  const sight = sightOf(inputs)
  const steps = Math.ceil((to - from) / STEP)
  const years = Array.from({ length: steps + 1 }, (_, i) => from + ((to - from) * i) / steps)
  return {
    sightline: inputs.name,
    model: inputs.model,
    years,
    azimuth_deg: years.map((year) => targetAzimuthDeg(sight, year)),
    sd_arcmin: years.map((year) => {
      const sd = offsetSdDeg(sight, year)
      return sd === null ? null : sd * 60
    }),
    line_deg: { value: inputs.azimuthDeg, sd: Math.hypot(inputs.azimuthSdDeg, inputs.northSdDeg) },
  }
}
