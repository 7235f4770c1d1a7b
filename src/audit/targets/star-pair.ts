import { rememberLast } from '../../inference/remember-last.ts'
import type { Branch, Prediction, PredictionError } from '../../inference/sight.ts'
import { DEG, wrap180, wrap360 } from '../../quantity/degrees.ts'
import { azimuthOneAboveOtherDeg } from '../../sky/above-one-another.ts'
import { PRECESSION_MODELS } from '../../sky/precession-models.ts'
import { labelOfStar } from '../../sky/star-catalogue.ts'
import { starDeclinationSdDeg } from '../../sky/star-error.ts'
import { type StarPlace, starTrack } from '../../sky/star-place.ts'
import type { SettledTarget, SightlineInputs } from '../sightline-inputs.ts'
import { STAR_MODELS, starWarnings } from './star.ts'
import type { TargetModel } from './target-model.ts'

type Upper = 'first' | 'second'

/** Name of a star's own error in the budget. */
export function placeOf(star: string): string {
  return `the catalogue’s place of ${star}`
}

/** Two stars one above the other: a direction near north. */
export function starPairTarget(
  inputs: SightlineInputs,
  { stars, above }: Extract<SettledTarget, { body: 'two stars' }>,
): TargetModel {
  const names = stars.map(labelOfStar)
  const uppers: Upper[] = above === null ? ['first', 'second'] : [above === 0 ? 'first' : 'second']
  const order = above === null ? `${names[0]} and ${names[1]}` : `${names[above]} above ${names[1 - above]}`
  const event = `alignment of ${order}`
  return {
    event,
    description: event,
    branches: uppers.map((upper) => branchOf(inputs, stars, upper)),
    declinationDeg: () => null,
    altitudeDeg: () => null,
    onLine: null,
    seenAt: null,
    semidiameter: () => null,
    models: STAR_MODELS,
    notes: () => [
      'Two stars stand one above the other at most twice a day, with the one or the other above; height and air do not change the direction.',
    ],
    warnings: stars.flatMap(starWarnings),
  }
}

function branchOf(
  inputs: SightlineInputs,
  stars: Extract<SettledTarget, { body: 'two stars' }>['stars'],
  upper: Upper,
): Branch {
  const { matrix } = PRECESSION_MODELS[inputs.model === 'p03' ? 'p03' : 'vondrak2011']
  const matrixIn = rememberLast(matrix)
  const tracks = stars.map((star) => starTrack(star, matrixIn))
  const azimuth = (first: StarPlace, second: StarPlace) =>
    azimuthOneAboveOtherDeg(first, second, inputs.latitudeDeg, upper, inputs.measuredDeg)
  return {
    predict: (year): Prediction | null => {
      const places = tracks.map((track) => track(year))
      const [first, second] = [places[0]!, places[1]!]
      const direction = azimuth(first, second)
      if (direction === null) return null
      const effect = (source: string, moved: number | null): PredictionError[] =>
        moved === null ? [] : [{ source, effectDeg: wrap180(moved - direction), shared: false }]
      const errors = stars.flatMap((star, i) => {
        const sd = starDeclinationSdDeg(star, year)
        const place = places[i]!
        const acrossDeg = sd / Math.max(1e-6, Math.cos(place.decDeg * DEG))
        const moved = (by: StarPlace) => (i === 0 ? azimuth(by, second) : azimuth(first, by))
        const source = placeOf(labelOfStar(star))
        return [
          ...effect(source, moved({ ...place, decDeg: place.decDeg + sd })),
          ...effect(source, moved({ ...place, raDeg: place.raDeg + acrossDeg })),
        ]
      })
      return { directionDeg: wrap360(direction), errors }
    },
  }
}
