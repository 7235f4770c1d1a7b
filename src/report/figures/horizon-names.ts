import type { Element } from 'hast'
import type { Skyline } from '../../audit/audit.ts'
import { measuredDegrees } from '../wording/measured-angle.ts'
import { type Box, sharedArea } from './box.ts'
import { type Point, skylinePoints } from './horizon-ground.ts'
import type { HorizonLabel } from './horizon-labels.ts'
import type { HorizonPlot } from './horizon-layout.ts'
import { horizonObstacles } from './horizon-obstacles.ts'
import { skylineEnds } from './horizon-skyline.ts'
import type { HorizonSource } from './horizon-source.ts'
import { PALETTE } from './palette.ts'
import { costOf, type Obstacle } from './place-around.ts'
import { TEXT_SIZE, text } from './shape.ts'
import { textWidth } from './text-width.ts'

const HEIGHT = 8
/** From the skyline to its name. */
const CLEAR = 3
/** A name that would cover more of a disc than this is left out, square points. */
const COVERED = 12
/** Where along the plot a name may stand, as shares of the room, the best first. */
const PLACES = [1, 0, 0.9, 0.1, 0.75, 0.25, 0.6, 0.4]

const NAMES: Partial<Record<Skyline['from'], string>> = {
  sea: 'sea horizon',
  level: 'level horizon, assumed',
}

/** Names the skyline, and the ends of a profile, where most is free. */
export function skylineNames(
  source: HorizonSource,
  plot: HorizonPlot,
  labels: readonly HorizonLabel[],
): Element[] {
  const taken = horizonObstacles(source, plot, labels)
  const named = namesOf(source).flatMap((content) => {
    const box = freest(spotsAlong(content, source, plot), taken)
    return box === null || costOf(box, taken) > COVERED ? [] : [{ content, box }]
  })
  // The short name where there is no free place for the long one; none where there is none for either.
  const names = named.slice(0, 1)
  return [...names, ...endNames(source, plot, taken, names[0]?.box)].map(({ content, box }) =>
    text(box.left, box.bottom - 2, content, { fill: PALETTE.muted }),
  )
}

function namesOf({ skyline: { from, at_line_deg } }: HorizonSource): string[] {
  const altitude = `${measuredDegrees(at_line_deg)}${from === 'profile' ? ' at the line' : ''}`
  const name = NAMES[from] ?? 'skyline'
  return [`${name}, ${altitude}`, name]
}

/** In the void beyond an end where there is room, else on this side of it. */
function endNames(
  { skyline }: HorizonSource,
  { azimuths, x, box }: HorizonPlot,
  obstacles: readonly Obstacle[],
  name: Box | undefined,
): { content: string; box: Box }[] {
  const content = 'profile ends'
  const width = textWidth(content, TEXT_SIZE)
  const placed = name === undefined ? [] : [name]
  return skylineEnds(skyline, ...azimuths).flatMap(({ node, beyond }) => {
    const at = x(node[0])
    const right = { left: at + CLEAR, right: at + CLEAR + width }
    const left = { left: at - CLEAR - width, right: at - CLEAR }
    const sides = (beyond === 'right' ? [right, left] : [left, right]).filter(
      (side) => side.left >= box.left && side.right <= box.right,
    )
    const spots = [box.bottom - HEIGHT - 1, box.top + 1].flatMap((top) =>
      sides.map((side) => ({ ...side, top, bottom: top + HEIGHT })),
    )
    const free = spots.filter((spot) => placed.every((other) => sharedArea(spot, other) === 0))
    const spot = freest(free, obstacles)
    if (spot === null) return []
    placed.push(spot)
    return [{ content, box: spot }]
  })
}

/** Places right over and right under the skyline that lie in the plot. */
function spotsAlong(content: string, source: HorizonSource, plot: HorizonPlot): Box[] {
  const width = textWidth(content, TEXT_SIZE)
  const { left, right, top, bottom } = plot.box
  const parts = skylinePoints(source, plot)
  return PLACES.flatMap((share) => {
    const start = left + 3 + share * (right - left - width - 6)
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

function freest(spots: readonly Box[], taken: readonly Obstacle[]): Box | null {
  return spots.reduce<Box | null>(
    (best, spot) => (best === null || costOf(spot, taken) < costOf(best, taken) - 0.01 ? spot : best),
    null,
  )
}
