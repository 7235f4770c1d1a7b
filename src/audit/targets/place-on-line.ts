import type { SightlineInputs } from '../sightline-inputs.ts'
import { type CentreOnSkyline, knownSkyline } from './known-skyline.ts'
import type { SkylineTarget } from './skyline-branch.ts'

/**
 * Where the centre of a body stands in a year when it is sighted on the line itself, over a skyline that is known to
 * both sides; null where the disc never touches the skyline there, as behind a summit's shoulder.
 */
export function placeOnLine(
  inputs: SightlineInputs,
  target: Pick<SkylineTarget, 'at' | 'parallaxArcsec' | 'seenFrom' | 'aboveCentreArcmin'>,
): (year: number) => CentreOnSkyline | null {
  return (year) => knownSkyline(inputs, target).placeAt(inputs.measuredDeg, target.aboveCentreArcmin(year))
}
