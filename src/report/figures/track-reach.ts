import type { TrackSource } from './track-source.ts'

/** The stretches of years in which the target has no direction at all, on any of its branches. */
export function yearsOutOfReach({ tracks }: TrackSource): [number, number][] {
  const { years } = tracks[0]
  const stretches: [number, number][] = []
  let open = false
  years.forEach((year, index) => {
    const isMissing = tracks.every(({ direction_deg }) => (direction_deg[index] ?? null) === null)
    if (isMissing && open) stretches.at(-1)![1] = year
    else if (isMissing) stretches.push([year, year])
    open = isMissing
  })
  return stretches
}

export function isNeverSeen({ tracks }: TrackSource): boolean {
  return tracks.every(({ direction_deg }) => direction_deg.every((deg) => deg === null))
}
