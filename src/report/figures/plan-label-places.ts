import { type Box, sharedArea } from './box.ts'
import { costOf, type Labelled, type Obstacle, placeAround } from './place-around.ts'
import { about, stretchObstacles } from './plan-obstacles.ts'
import type { Spot } from './plan-rim.ts'
import { TEXT_SIZE } from './shape.ts'
import { textWidth } from './text-width.ts'

/** A label of the plan and the spot it belongs to. */
export interface MapLabel {
  at: Spot
  lines: readonly string[]
  /** The first line in semibold. */
  isStrong: boolean
  isAtRim: boolean
}

export interface PlacedLabel {
  label: MapLabel
  box: Box
  /** What is awkward about the place, in points of distance. */
  cost: number
}

/** Where labels may stand, and what they must and had better keep off. */
export interface LabelRoom {
  bounds: Box
  taken: readonly Box[]
  obstacles: readonly Obstacle[]
}

export const ROW_HEIGHT = 8.6
/** From here on a label needs a stroke to what it names. */
const FAR = 9
/** How bad each bit of stroke on a label is, in points of distance. */
const CROSSED = 30
/** A label that stands within so many points of another's spot at the rim looks like that other's, and how bad that is. */
const NEAR = 11
const STRANGE = 0.5
const ATTEMPTS = 8
const FEW = 4

/**
 * Places the labels at the rim, then those of the points. Which of them come first is tried both ways; of points only
 * where there are not so many that it would take long.
 */
export function placeLabels(
  atRim: readonly MapLabel[],
  ofPoints: readonly MapLabel[],
  room: LabelRoom,
): PlacedLabel[] {
  const orders = [atRim, atRim.toReversed()].flatMap((first) =>
    [ofPoints, ...(ofPoints.length <= FEW ? [ofPoints.toReversed()] : [])].map((second) => [
      ...first,
      ...second,
    ]),
  )
  const costOfAll = (placed: readonly PlacedLabel[]) => placed.reduce((sum, { cost }) => sum + cost, 0)
  const [best] = orders.map((labels) => place(labels, room)).toSorted((a, b) => costOfAll(a) - costOfAll(b))
  return best!
}

export function weightOf({ isStrong }: MapLabel, row: number): 400 | 600 {
  return isStrong && row === 0 ? 600 : 400
}

/** Whether a label stands so far from its spot that it needs a stroke to it. */
export function needsStroke(at: Spot, box: Box): boolean {
  return apart(at, nearestOf(at, box)) > FAR
}

/** Where a stroke from a spot meets a label. */
export function nearestOf([x, y]: Spot, { left, right, top, bottom }: Box): Spot {
  return [clamp(x, left, right), clamp(y, top, bottom)]
}

/** One label after the other; each keeps off the strokes of those before it. */
function place(labels: readonly MapLabel[], { bounds, taken, obstacles }: LabelRoom): PlacedLabel[] {
  const placed: PlacedLabel[] = []
  for (const label of labels) {
    const others = labels.filter((other) => other !== label)
    const strange = others.filter(({ isAtRim }) => isAtRim).map(({ at }) => about(at, NEAR, STRANGE))
    const strokes = placed.flatMap(({ label: { at }, box }) => strokeObstacles(at, box))
    const boxes = placed.map(({ box }) => box)
    const inTheWay = [...boxes, ...others.map(({ at }) => about(at, 2.5, 1))]
    const room = { bounds, taken: [...taken, ...boxes], obstacles: [...obstacles, ...strange, ...strokes] }
    placed.push(placeOne(label, room, inTheWay))
  }
  return placed
}

/** The nearest good place; where a stroke from there would run through what is in the way, the next ones are tried. */
function placeOne(
  label: MapLabel,
  { bounds, taken, obstacles }: LabelRoom,
  inTheWay: readonly Box[],
): PlacedLabel {
  const wanted = wantedPlace(label, bounds)
  const rejected: Obstacle[] = []
  let best: PlacedLabel | null = null
  for (let attempt = 0; attempt < ATTEMPTS; attempt++) {
    const [box] = placeAround([wanted], bounds, taken, [...obstacles, ...rejected]) as [Box]
    const crossed = strokeObstacles(label.at, box).filter((bit) =>
      inTheWay.some((other) => sharedArea(bit, other) > 0),
    )
    const cost = costOf(box, obstacles) + apart(label.at, nearestOf(label.at, box)) + CROSSED * crossed.length
    if (best === null || cost < best.cost) best = { label, box, cost }
    if (crossed.length === 0) break
    rejected.push({ ...box, weight: 1 })
  }
  return best!
}

/** The size of a label, and the spot it is to be near: at the rim, where it fits between the edges. */
function wantedPlace(label: MapLabel, { left, right }: Box): Labelled {
  const { at, lines, isAtRim } = label
  const width = Math.max(...lines.map((content, row) => textWidth(content, TEXT_SIZE, weightOf(label, row))))
  const x = isAtRim ? clamp(at[0], left + width / 2 + 0.5, right - width / 2 - 0.5) : at[0]
  return { x, y: at[1], width, height: lines.length * ROW_HEIGHT }
}

function strokeObstacles(at: Spot, box: Box): Obstacle[] {
  return needsStroke(at, box) ? stretchObstacles(at, nearestOf(at, box)) : []
}

function apart(a: Spot, b: Spot): number {
  return Math.hypot(a[0] - b[0], a[1] - b[1])
}

function clamp(value: number, low: number, high: number): number {
  return Math.max(low, Math.min(high, value))
}
