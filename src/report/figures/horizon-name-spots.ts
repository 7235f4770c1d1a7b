import type { Box } from './box.ts'
import { type Point, skylinePoints } from './horizon-ground.ts'
import type { HorizonPlot } from './horizon-layout.ts'
import type { HorizonSource } from './horizon-source.ts'
import { TEXT_SIZE } from './shape.ts'
import { textWidth } from './text-width.ts'

/** Of a name in the plot, points. */
export const HEIGHT = 8
/** From the skyline to its name. */
export const CLEAR = 3
/** Where along the plot a name may stand, as shares of the room, the best first. */
const PLACES = [1, 0, 0.9, 0.1, 0.75, 0.25, 0.6, 0.4]
/** So near to what it speaks of a name needs no leader. */
const BESIDE = 14

/** Where the line meets the skyline. */
export function markOf({ line: { value }, skyline }: HorizonSource, { x, y }: HorizonPlot): Point {
  return [x(value), y(skyline.at_line_deg.value)]
}

/** Places right over and right under the skyline that lie in the plot. */
export function spotsAlong(content: string, source: HorizonSource, plot: HorizonPlot): Box[] {
  const width = textWidth(content, TEXT_SIZE)
  const { left, right } = plot.box
  const starts = PLACES.map((share) => left + 3 + share * (right - left - width - 6))
  return spotsFrom(starts, width, source, plot)
}

/** The same beside the line, no farther from where it meets the skyline than a reader sees at once. */
export function spotsNear(content: string, source: HorizonSource, plot: HorizonPlot): Box[] {
  const width = textWidth(content, TEXT_SIZE)
  const [x, y] = markOf(source, plot)
  const starts = [CLEAR, BESIDE].flatMap((gap) => [x + gap, x - gap - width])
  return spotsFrom(starts, width, source, plot).filter(
    (box) =>
      box.left > plot.box.left &&
      box.right < plot.box.right &&
      box.top - y < BESIDE &&
      y - box.bottom < BESIDE,
  )
}

function spotsFrom(
  starts: readonly number[],
  width: number,
  source: HorizonSource,
  plot: HorizonPlot,
): Box[] {
  const { top, bottom } = plot.box
  const parts = skylinePoints(source, plot)
  return starts.flatMap((start) => {
    const side = { left: start, right: start + width }
    const part = parts.find((each) => each[0]![0] <= side.left && each.at(-1)![0] >= side.right)
    if (part === undefined) return []
    const heights = heightsBetween(part, side.left, side.right)
    const over = Math.min(...heights) - CLEAR
    const under = Math.max(...heights) + CLEAR
    return [
      { ...side, top: over - HEIGHT, bottom: over },
      { ...side, top: under, bottom: under + HEIGHT },
    ].filter((box) => box.top >= top && box.bottom <= bottom)
  })
}

/** Heights of a line of points between two positions, those at the two included. */
function heightsBetween(points: readonly Point[], from: number, to: number): number[] {
  return points.flatMap(([x, y], index) => {
    const before = points[index - 1]
    const own = x >= from && x <= to ? [y] : []
    if (before === undefined || before[0] >= x) return own
    const cut = (at: number) =>
      at > before[0] && at < x ? [before[1] + ((y - before[1]) * (at - before[0])) / (x - before[0])] : []
    return [...cut(from), ...cut(to), ...own]
  })
}
