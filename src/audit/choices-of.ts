import type { Sightline, Target } from '../claim/claim.ts'
import { sightedChoice } from './readings-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** Something that a line and its target leave to be chosen. */
export interface Choice {
  /** As `readingsOf` names it. */
  choice: string
  said: unknown
  basis: string
}

/** Everything that the readings of a line can differ in, and what the claim says of it. */
export function choicesOf({ target, direction }: Sightline, line: SightlineInputs): Choice[] {
  const { ends } = line
  if (direction.by !== 'points' || ends === null) return choicesOfTarget(target)
  const ofEnds = (['from', 'to'] as const)
    .filter((side) => ends[side].form !== null)
    .map((side) => ({
      choice: sightedChoice(ends[side]),
      said: direction.sighted[side],
      basis: 'the claim does not say what was sighted of it; our choice',
    }))
  return [...choicesOfTarget(target), ...ofEnds]
}

function choicesOfTarget(target: Target): Choice[] {
  switch (target.body) {
    case 'sun':
      return [
        ...(target.event.name === 'equinox'
          ? [
              {
                choice: 'sense of equinox',
                said: target.event.sense,
                basis: 'the astronomers’ sense, though no builder could see it; our choice',
              },
            ]
          : []),
        { choice: 'part of the disc', said: target.disc, basis: discBasis(target.at === 'noon') },
      ]
    case 'sun at both solstices':
    case 'moon':
      return [{ choice: 'part of the disc', said: target.disc, basis: discBasis(false) }]
    case 'star':
      return [
        {
          choice: 'where the star is seen',
          said: target.altitudeDeg,
          basis: 'a loss of 0.25 magnitudes per air mass and a limit of 6; our choice',
        },
      ]
    case 'two stars':
      return [
        { choice: 'which star is above', said: target.above, basis: 'both happen once a day; both count' },
      ]
  }
}

function discBasis(atNoon: boolean): string {
  return atNoon
    ? 'the middle of the light that falls through an opening; our choice'
    : 'the first or last gleam, the moment easiest to see; our choice'
}
