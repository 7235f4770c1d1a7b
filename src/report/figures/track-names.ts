import type { Track } from '../../audit/audit.ts'
import { modelLabel } from '../wording/model-label.ts'
import type { TrackPlot } from './track-layout.ts'
import { nearLine, type TrackSource } from './track-source.ts'

/** What a curve is called, and where: in the margin, where it ends in view, else at a point inside the plot. */
export interface TrackName {
  lines: string[]
  /** The place on the curve; null in the margin, at the plot's right edge. */
  x: number | null
  y: number
}

/** A name inside the plot keeps this far from the plot's sides where it can. */
const ROOM = 20

export function trackNames({ tracks, sightline }: TrackSource, plot: TrackPlot): TrackName[] {
  return tracks.flatMap((track): TrackName[] => {
    const lines =
      track.branch_words === null
        ? [`${sightline.measures} of target`, modelLabel(track.model)]
        : [track.branch_words]
    const end = nearLine(track).at(-1) ?? null
    if (end !== null && isShown(end, plot)) return [{ lines, x: null, y: plot.y(end) }]
    const place = lastInView(track, plot)
    return place === null ? [] : [{ lines, ...place }]
  })
}

function isShown(deg: number, { range: { shown } }: TrackPlot): boolean {
  return shown[0] <= deg && deg <= shown[1]
}

function lastInView(track: Track, plot: TrackPlot): { x: number; y: number } | null {
  const directions = nearLine(track)
  const inView = track.years.flatMap((year, index) => {
    const deg = directions[index] ?? null
    return deg === null || !isShown(deg, plot) ? [] : [{ x: plot.x(year), y: plot.y(deg) }]
  })
  return inView.findLast(({ x }) => x < plot.box.right - ROOM) ?? inView.at(-1) ?? null
}
