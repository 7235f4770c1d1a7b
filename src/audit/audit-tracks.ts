import type { Branch } from '../inference/sight.ts'
import type { Track } from './audit.ts'
import { computableStretch } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { branchWords } from './targets/branch-words.ts'
import { targetModel } from './targets/target-model.ts'

/** Step of the tracks that the figures draw, years: the curve bends too little between two points to be seen. */
const STEP = 50

/** Years about a model's range in which a track by the second model is still drawn, so that one sees it part. */
const BEYOND_RANGE = 14_000

/** The target's direction over a stretch of years, by the default model and by a second one, for each branch. */
export function auditTracks(inputs: SightlineInputs, from: number, to: number): Track[] {
  const second = targetModel(inputs).models[1]!
  const ours = computableStretch(inputs.model, from, to)
  const theirs = computableStretch(second, from, to)
  const held =
    second === 'p03' ? { from: Math.max(from, -BEYOND_RANGE), to: Math.min(to, BEYOND_RANGE) } : theirs
  return [...tracksBy(inputs, ours), ...tracksBy({ ...inputs, model: second }, held)]
}

function tracksBy(inputs: SightlineInputs, { from, to }: { from: number; to: number }): Track[] {
  const steps = Math.ceil((to - from) / STEP)
  const years = Array.from({ length: steps + 1 }, (_, i) => from + ((to - from) * i) / steps)
  return targetModel(inputs).branches.map((branch, i) => trackOf(inputs, branch, i, years))
}

function trackOf(inputs: SightlineInputs, branch: Branch, index: number, years: readonly number[]): Track {
  const predictions = years.map((year) => branch.predict(year))
  const own = Math.hypot(inputs.measuredSdDeg, inputs.northSdDeg)
  return {
    sightline: inputs.name,
    model: inputs.model,
    branch: index,
    branch_words: branchWords(inputs.target)[index] ?? null,
    years,
    direction_deg: predictions.map((prediction) => prediction?.directionDeg ?? null),
    sd_arcmin: predictions.map((prediction) =>
      prediction === null
        ? null
        : Math.hypot(own, ...prediction.errors.map(({ effectDeg }) => effectDeg)) * 60,
    ),
    line_deg: { value: inputs.measuredDeg, sd: own },
  }
}
