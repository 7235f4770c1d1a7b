import type { SurveyedPoint } from '../../src/site/line-direction.ts'
import { type Random, seededRandom } from '../inference/seeded-random.ts'

/** How many surveys are drawn: a standard deviation found from them is good to 1/√(2·200,000) = 0.16 %. */
export const DRAWS = 200_000
export const SAMPLING_ERROR = 1 / Math.sqrt(2 * DRAWS)

/** Outcomes of surveys made again and again, each with errors of its own (JCGM 101:2008, section 7). */
export function drawSurveys<Outcome>(seed: number, survey: (random: Random) => Outcome): Outcome[] {
  const random = seededRandom(seed)
  return Array.from({ length: DRAWS }, () => survey(random))
}

/** A point as one survey finds it. */
export function drawPoint({ eastM, northM, sdM }: SurveyedPoint, { normal }: Random): SurveyedPoint {
  return { eastM: eastM + sdM * normal(), northM: northM + sdM * normal(), sdM }
}

/** The mean product of two series of errors about zero: a variance where both are one. */
export function meanProduct(some: readonly number[], others: readonly number[]): number {
  return some.reduce((sum, error, i) => sum + error * others[i]!, 0) / some.length
}
