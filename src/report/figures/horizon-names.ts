import type { Element } from 'hast'
import type { Skyline } from '../../audit/audit.ts'
import { measuredDegrees } from '../wording/measured-angle.ts'
import { type Box, sharedArea } from './box.ts'
import type { Point } from './horizon-ground.ts'
import type { HorizonLabel } from './horizon-labels.ts'
import type { HorizonPlot } from './horizon-layout.ts'
import { CLEAR, HEIGHT, markOf, spotsAlong, spotsNear } from './horizon-name-spots.ts'
import { horizonObstacles } from './horizon-obstacles.ts'
import { skylineEnds } from './horizon-skyline.ts'
import type { HorizonSource } from './horizon-source.ts'
import { PALETTE } from './palette.ts'
import { costOf, type Obstacle } from './place-around.ts'
import { line, shape, TEXT_SIZE, text } from './shape.ts'
import { textWidth } from './text-width.ts'

/** A name that would cover more of a disc than this is left out, square points. */
const COVERED = 12

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
  const name = nameOf(source, plot, taken)
  const ends = endNames(source, plot, taken, name?.box)
  return [...(name === null ? [] : nameShapes(name, markOf(source, plot))), ...ends.map(nameText)]
}

function nameText({ content, box }: Pick<Name, 'content' | 'box'>): Element {
  return text(box.left, box.bottom - 2, content, { fill: PALETTE.muted })
}

/** Set from the side that faces its leader, since estimated widths err on the wide side. */
function nameShapes(name: Name, mark: Point): Element[] {
  const { content, box, hasLeader } = name
  if (!hasLeader) return [nameText(name)]
  const isLeft = box.right < mark[0]
  const at = isLeft ? box.right : box.left
  return [
    ...leader(box, mark),
    text(at, box.bottom - 2, content, { anchor: isLeft ? 'end' : 'start', fill: PALETTE.muted }),
  ]
}

interface Name {
  content: string
  box: Box
  hasLeader: boolean
}

/**
 * The name with the altitude, in a profile near the line or with a leader to it; the short name where there is no free
 * place for that; null where there is none for either.
 */
function nameOf(source: HorizonSource, plot: HorizonPlot, taken: readonly Obstacle[]): Name | null {
  const { from, at_line_deg } = source.skyline
  const [short, altitude] = [NAMES[from] ?? 'skyline', measuredDegrees(at_line_deg)]
  const named = (content: string, spots: readonly Box[], hasLeader = false) => {
    const box = freest(spots, taken)
    return box === null || costOf(box, taken) > COVERED ? null : { content, box, hasLeader }
  }
  const along = (content: string) => spotsAlong(content, source, plot)
  const plain = () => named(short, along(short))
  if (from !== 'profile') return named(`${short}, ${altitude}`, along(`${short}, ${altitude}`)) ?? plain()
  const [near, far] = [`${short}, ${altitude} at the line`, `${short}; ${altitude} at the line`]
  return named(near, spotsNear(near, source, plot)) ?? named(far, along(far), true) ?? plain()
}

/** From a name far off to what it speaks of. */
function leader({ left, right, top, bottom }: Box, [x, y]: Point): Element[] {
  const from = [x < left ? left - 1 : right + 1, (top + bottom) / 2] as const
  return [
    line(from, [x, y], { stroke: PALETTE.muted, strokeWidth: 0.4 }),
    shape('rect', { x: x - 1.2, y: y - 1.2, width: 2.4, height: 2.4, fill: PALETTE.muted }),
  ]
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

function freest(spots: readonly Box[], taken: readonly Obstacle[]): Box | null {
  return spots.reduce<Box | null>(
    (best, spot) => (best === null || costOf(spot, taken) < costOf(best, taken) - 0.01 ? spot : best),
    null,
  )
}
