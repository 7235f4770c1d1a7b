import { extent } from 'd3-array'
import { scaleLinear } from 'd3-scale'
import type { Audit } from '../../audit/audit.ts'
import type { Box } from './box.ts'
import { dateFlags } from './date-flags.ts'
import { type FlagRows, flagRows } from './flag-row.ts'
import { type TrackRange, trackRange } from './track-range.ts'
import type { TrackSource } from './track-source.ts'

export interface TrackPlot {
  box: Box
  years: readonly [number, number]
  range: TrackRange
  x: (year: number) => number
  y: (directionDeg: number) => number
}

export const TRACK_WIDTH = 440
const LEFT = 40
const RIGHT = 338
export const TRACK_MARGIN = { left: RIGHT + 11, right: TRACK_WIDTH - 1 }
/** Below the plot. */
export const TRACK_AXIS_HEIGHT = 15
const TARGET_HEIGHT = 236
const LEAST_PLOT = 140

/** Where things stand in the track figure of one sightline: the plot, and the rows of flags over it. */
export function layTrack(audit: Audit, source: TrackSource): { plot: TrackPlot; flags: FlagRows } {
  const years = yearsShown(audit, source)
  const x = scaleLinear(years, [LEFT, RIGHT])
  const flags = flagRows(
    dateFlags(audit, (year) => x(year)),
    LEFT,
    TRACK_WIDTH - 2,
  )
  const top = Math.max(flags.height, 11) + 1
  const height = Math.max(LEAST_PLOT, TARGET_HEIGHT - top - TRACK_AXIS_HEIGHT)
  const range = trackRange(source)
  const y = scaleLinear(range.shown, [top + height, top])
  const box = { left: LEFT, right: RIGHT, top, bottom: top + height }
  return { flags, plot: { box, years, range, x: (year) => x(year), y: (directionDeg) => y(directionDeg) } }
}

/** All years that something is drawn for. */
function yearsShown(audit: Audit, { tracks, seconds }: TrackSource): [number, number] {
  const dates = [audit.sweep.window, audit.asserted, ...audit.other_dates]
  const drawn = [...tracks, ...seconds].flatMap((track) => [...track.years])
  const [from, to] = extent([...drawn, ...dates.flatMap((date) => [date.from, date.to])]) as [number, number]
  return from < to ? [from, to] : [from - 1, to + 1]
}
