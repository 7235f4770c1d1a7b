import { type Box, sharedArea } from './box.ts'
import { TEXT_SIZE } from './shape.ts'
import { textWidth } from './text-width.ts'
import { trackObstacles } from './track-curves.ts'
import type { TrackPlot, TrackSource } from './track-layout.ts'

const HEIGHT = 8.5

/** The texts that name the greyed years; each in the corner the track leaves free. */
export function outsideNotes(
  source: TrackSource,
  plot: TrackPlot,
  stretches: readonly (readonly [number, number])[],
): { box: Box; content: string }[] {
  return stretches.flatMap(([from, to]) => {
    const [left, right] = [plot.x(from), plot.x(to)]
    const content = ['outside the window', 'outside'].find(
      (words) => textWidth(words, TEXT_SIZE) + 4 <= right - left,
    )
    if (content === undefined) return []
    const width = textWidth(content, TEXT_SIZE)
    const at = (bottom: number) => ({ left: left + 2, right: left + 2 + width, top: bottom - HEIGHT, bottom })
    const spots = [at(plot.box.bottom - 2), at(plot.box.top + HEIGHT + 2)]
    const curve = trackObstacles(source.track, plot, 1)
    const covered = spots.map((box) => curve.reduce((sum, other) => sum + sharedArea(box, other), 0))
    return [{ box: covered[1]! < covered[0]! ? spots[1]! : spots[0]!, content }]
  })
}
