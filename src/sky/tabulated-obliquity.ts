import { cubicSpline } from './cubic-spline.ts'
import { meanObliquityDeg } from './mean-obliquity.ts'
import { OBLIQUITY_MODELS, type ObliquityModelName } from './obliquity-models.ts'

/** Years that the table covers: all that an audit of a window in the orbit's span can ask for, and a margin. */
const FROM = -45_000
const TO = 30_000
const STEP = 100

/** At both ends the natural spline is bent straight: its outermost stretches are not used. */
const MARGIN = 1000

const table = cubicSpline(
  Array.from({ length: (TO - FROM) / STEP + 1 }, (_, i) => {
    const year = FROM + i * STEP
    return [year, meanObliquityDeg(year)] as const
  }),
)

/**
 * Mean obliquity by a model, degrees: the model's own, but for Vondrák 2011, whose two poles take forty sines and
 * cosines, from a spline through every 100th year. Its shortest period is 15,787 years, so the spline is good to
 * 0.0001″ (tested).
 *
 * @param year Julian epoch.
 */
export function tabulatedObliquityDeg(model: ObliquityModelName, year: number): number {
  const isTabulated = model === 'vondrak2011' && year > FROM + MARGIN && year < TO - MARGIN
  return isTabulated ? table(year) : OBLIQUITY_MODELS[model].obliquityDeg(year)
}
