import { bisectLeft, extent } from 'd3-array'
import { scaleLinear } from 'd3-scale'
import type { Audit, Implied, SightlineAudit, Track } from '../../audit/audit.ts'
import type { Box } from './box.ts'

/** What the track figure of one sightline is drawn from. */
export interface TrackSource {
  sightline: SightlineAudit
  /** By the model the audit computes with. */
  track: Track
  /** By a second model, as a check. */
  second: Track | null
  implied: Implied | null
}

/** The first track of a sightline is by the default model. Throws a RangeError where there is none. */
export function trackSource(audit: Audit, name: string): TrackSource {
  const sightline = audit.sightlines.find((each) => each.name === name)
  const [track, second] = audit.tracks.filter((each) => each.sightline === name)
  if (sightline === undefined || track === undefined) {
    throw new RangeError(`the audit has no track of a sightline \`${name}\``)
  }
  const implied = audit.implied.find((each) => each.sightline === name && each.model === track.model)
  return { sightline, track, second: second ?? null, implied: implied ?? null }
}

export interface TrackPlot {
  box: Box
  years: readonly [number, number]
  /** Degrees, about the line's azimuth; may pass 0 or 360. */
  azimuths: readonly [number, number]
  x: (year: number) => number
  y: (azimuthDeg: number) => number
}

export const TRACK_WIDTH = 440
const LEFT = 40
const RIGHT = 338
export const TRACK_MARGIN = { left: RIGHT + 11, right: TRACK_WIDTH - 1 }

/** The part of the layout that does not depend on its height. */
export function trackYears(
  audit: Audit,
  { track, second }: TrackSource,
): { years: [number, number]; x: (year: number) => number } {
  const dates = [audit.sweep.window, audit.asserted, ...audit.other_dates].flatMap(({ from, to }) => [
    from,
    to,
  ])
  const [from, to] = extent([...track.years, ...(second?.years ?? []), ...dates]) as [number, number]
  const years: [number, number] = from < to ? [from, to] : [from - 1, to + 1]
  const scale = scaleLinear(years, [LEFT, RIGHT])
  return { years, x: (year) => scale(year) }
}

export function trackPlot(audit: Audit, source: TrackSource, top: number, height: number): TrackPlot {
  const box = { left: LEFT, right: RIGHT, top, bottom: top + height }
  const azimuths = azimuthDomain(source)
  const scale = scaleLinear(azimuths, [box.bottom, box.top])
  return { box, ...trackYears(audit, source), azimuths, y: (azimuthDeg) => scale(azimuthDeg) }
}

/**
 * All of the track and the measured line. Of the band, as much as does not press the track into less than half
 * of the height.
 */
function azimuthDomain({ track, second }: TrackSource): [number, number] {
  const { value, sd } = track.line_deg
  const curve = [...nearLine(track), ...(second === null ? [] : nearLine(second))].filter(
    (deg) => deg !== null,
  )
  const [low, high] = extent([...curve, value]) as [number, number]
  const span = Math.max(high - low, 1 / 60)
  const band = Math.min(2.2 * sd, span / 2)
  const from = Math.min(low, value - band) - span * 0.06
  return [from, Math.max(high, value + band) + span * 0.06]
}

/** The track's azimuths on the turn on which they lie nearest the line. */
export function nearLine(track: Track): (number | null)[] {
  return track.years.map((_, index) => azimuthAt(track, index))
}

/** A track's azimuth in a year, between its points; null outside them or where it has none. */
export function azimuthIn(track: Track, year: number): number | null {
  const after = bisectLeft(track.years, year)
  const next = track.years[after]
  const previous = track.years[after - 1]
  if (next === undefined) return null
  if (next === year) return azimuthAt(track, after)
  const [from, to] = [azimuthAt(track, after - 1), azimuthAt(track, after)]
  if (previous === undefined || from === null || to === null) return null
  return from + ((to - from) * (year - previous)) / (next - previous)
}

function azimuthAt({ azimuth_deg, line_deg }: Track, index: number): number | null {
  const deg = azimuth_deg[index] ?? null
  if (deg === null) return null
  const offset = (((deg - line_deg.value) % 360) + 540) % 360
  return line_deg.value + offset - 180
}
