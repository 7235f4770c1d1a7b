import type { MonotoneRuns } from './monotone-runs.ts'
import { hourAngleAt, type Passing, type SkylinePath, type SkylineSighting } from './skyline-path.ts'

/**
 * The first passing in time where a body rises, the last where it sets; null where that one leads the other way. On a
 * skyline that is known all round the first one upwards counts, whatever went before.
 */
export function sightedPassing(
  path: SkylinePath,
  runs: MonotoneRuns,
  declination: number,
  { latitudeDeg, at }: SkylineSighting,
  isClosed: boolean,
): Passing | null {
  const rises = at === 'rising'
  let best: Passing | null = null
  let bestTime = Infinity
  let bestFalls = rises
  runs.passings(declination, (index, share, falls) => {
    if (isClosed && falls !== rises) return
    const passing = { index, share }
    const time = (rises ? 1 : -1) * hourAngleAt(path, passing, latitudeDeg)
    if (time >= bestTime) return
    best = passing
    bestTime = time
    bestFalls = falls
  })
  return bestFalls === rises ? best : null
}
