import { wrap180 } from '../quantity/degrees.ts'
import { momentsOneAboveOther, type OneAboveOther } from './above-one-another.ts'
import { nextDarkMoment } from './next-dark-moment.ts'
import { type NextSighting, type SoughtSighting, sightingAt } from './next-sighting.ts'
import { julianEpochOf, utDaysOf } from './present-sky.ts'
import { locatedPlace, type SkyPlace } from './sky-place.ts'
import type { Star } from './star-catalogue.ts'
import { starPlace } from './star-place.ts'

/** Two stars one above the other. */
export interface StarPairSight {
  stars: readonly [Star, Star]
  /** Index in `stars` of the upper one; null: either. */
  above: 0 | 1 | null
  /** Where it happens twice a day with the same star above, the one nearer to this azimuth is meant; north is 0. */
  nearAzimuthDeg: number
}

export interface StarPairNote {
  /** Index of the star that is the upper one. */
  above: 0 | 1
}

/**
 * The next instant in the dark at which two stars above the horizon have the same azimuth.
 *
 * Throws a RangeError for an impossible place or date.
 */
export function nextStarPairSighting(
  place: SkyPlace,
  sight: StarPairSight,
  now: Date,
): SoughtSighting<NextSighting<StarPairNote>> {
  const located = locatedPlace(place, now)
  const start = utDaysOf(now)
  const moments = momentsSighted(place, sight, julianEpochOf(start))
  if (moments.length === 0) return { sighting: null, because: 'never one above the other' }
  const dark = moments.flatMap(({ siderealDeg, above }) => {
    const utDays = nextDarkMoment(located, siderealDeg, start)
    return utDays === null ? [] : [{ utDays, above }]
  })
  const [next] = dark.sort((a, b) => a.utDays - b.utDays)
  if (next === undefined) return { sighting: null, because: 'never on a dark night' }
  const note = { above: next.above === 'first' ? 0 : 1 } as const
  return { sighting: sightingAt(place, next.utDays, note), because: null }
}

/** The moments of a day that are meant: for each star that may be the upper one, at most one. */
function momentsSighted(
  { latitudeDeg }: SkyPlace,
  { stars, above, nearAzimuthDeg }: StarPairSight,
  year: number,
): OneAboveOther[] {
  const [first, second] = [starPlace(stars[0], year), starPlace(stars[1], year)]
  const distance = ({ azimuthDeg }: OneAboveOther) => Math.abs(wrap180(azimuthDeg - nearAzimuthDeg))
  const moments = momentsOneAboveOther(first, second, latitudeDeg)
    .filter(({ altitudesDeg }) => Math.min(...altitudesDeg) > 0)
    .sort((a, b) => distance(a) - distance(b))
  const uppers = above === null ? (['first', 'second'] as const) : [above === 0 ? 'first' : 'second']
  return uppers.flatMap((upper) => moments.find((moment) => moment.above === upper) ?? [])
}
