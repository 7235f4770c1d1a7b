import type { Element } from 'hast'
import { type Box, sharedArea } from './box.ts'
import { PALETTE } from './palette.ts'
import { shape, TEXT_SIZE, text } from './shape.ts'
import { textWidth } from './text-width.ts'
import { trackObstacles } from './track-curves.ts'
import type { TrackPlot } from './track-layout.ts'
import type { TrackSource } from './track-source.ts'

/** Years that have a ground of their own, and what to call it, the longest name first. */
export interface NamedGround {
  years: readonly [number, number]
  names: readonly string[]
  /** Hatched grounds need a plate under their name. */
  isHatched: boolean
}

export interface GroundNote {
  box: Box
  content: string
  isHatched: boolean
}

const HEIGHT = 8.5

/** The texts that name the grounds; each in a corner of its ground that the tracks and the other names leave free. */
export function groundNotes(
  source: TrackSource,
  plot: TrackPlot,
  grounds: readonly NamedGround[],
): GroundNote[] {
  const curves = source.tracks.flatMap((track) => trackObstacles(track, plot, 1))
  const notes: GroundNote[] = []
  for (const { years, names, isHatched } of grounds) {
    const [left, right] = [plot.x(years[0]), plot.x(years[1])]
    const content = names.find((words) => textWidth(words, TEXT_SIZE) + 4 <= right - left)
    if (content === undefined) continue
    const free = spots(left, textWidth(content, TEXT_SIZE), plot).filter((box) =>
      notes.every((note) => sharedArea(box, note.box) === 0),
    )
    const covered = (box: Box) => curves.reduce((sum, other) => sum + sharedArea(box, other), 0)
    const best = free.reduce<Box | null>(
      (kept, box) => (kept === null || covered(box) < covered(kept) ? box : kept),
      null,
    )
    if (best !== null) notes.push({ box: best, content, isHatched })
  }
  return notes
}

export function groundNoteShapes({ box, content, isHatched }: GroundNote): Element[] {
  const { left, right, top, bottom } = box
  const plate = { x: left - 1, y: top, width: right - left + 2, height: bottom - top }
  return [
    ...(isHatched ? [shape('rect', { ...plate, fill: PALETTE.paper, fillOpacity: 0.85 })] : []),
    text(left, bottom - 2, content, { fill: PALETTE.muted }),
  ]
}

/** Bottom and top left corner, then the rows next to them. */
function spots(left: number, width: number, { box }: TrackPlot): Box[] {
  const at = (bottom: number) => ({ left: left + 2, right: left + 2 + width, top: bottom - HEIGHT, bottom })
  return [0, 1, 2].flatMap((row) => [
    at(box.bottom - 2 - row * (HEIGHT + 1)),
    at(box.top + HEIGHT + 2 + row * (HEIGHT + 1)),
  ])
}
