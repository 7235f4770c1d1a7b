import { bisectLeft } from 'd3-array'
import type { Audit, Implied, SightlineAudit, Track } from '../../audit/audit.ts'

/** What the track figure of one sightline is drawn from. */
export interface TrackSource {
  sightline: SightlineAudit
  /** By the model the audit computes with: one track, or one for each branch of the target. */
  tracks: readonly [Track, ...Track[]]
  /** By a second model, as a check; none, or one for each branch. */
  seconds: readonly Track[]
  implied: Implied | null
}

/** The first track of a sightline is by the default model. Throws a RangeError where there is none. */
export function trackSource(audit: Audit, name: string): TrackSource {
  const sightline = audit.sightlines.find((each) => each.name === name)
  const all = audit.tracks.filter((each) => each.sightline === name)
  const [first] = all
  if (sightline === undefined || first === undefined) {
    throw new RangeError(`the audit has no track of a sightline \`${name}\``)
  }
  const [, ...others] = all.filter(({ model }) => model === first.model)
  return {
    sightline,
    tracks: [first, ...others],
    seconds: all.filter(({ model }) => model !== first.model),
    implied: audit.implied.find((each) => each.sightline === name && each.model === first.model) ?? null,
  }
}

/** The track's directions on the turn on which they lie nearest the line, so that north is no edge. */
export function nearLine(track: Track): (number | null)[] {
  return track.years.map((_, index) => directionAt(track, index))
}

/** A track's direction in a year, between its points; null outside them or where it has none. */
export function directionIn(track: Track, year: number): number | null {
  const after = bisectLeft(track.years, year)
  const next = track.years[after]
  const previous = track.years[after - 1]
  if (next === undefined) return null
  if (next === year) return directionAt(track, after)
  const [from, to] = [directionAt(track, after - 1), directionAt(track, after)]
  if (previous === undefined || from === null || to === null || isJump(from, to)) return null
  return from + ((to - from) * (year - previous)) / (next - previous)
}

/** Opposite the line a direction passes from one side of the figure to the other: no movement of the target. */
export function isJump(fromDeg: number, toDeg: number): boolean {
  return Math.abs(toDeg - fromDeg) > 180
}

/** A direction on the turn on which it lies nearest another. */
export function onTurnOf(nearDeg: number, deg: number): number {
  return nearDeg + ((((deg - nearDeg) % 360) + 540) % 360) - 180
}

function directionAt({ direction_deg, line_deg }: Track, index: number): number | null {
  const deg = direction_deg[index] ?? null
  return deg === null ? null : onTurnOf(line_deg.value, deg)
}
