import { type Box, sharedArea } from './box.ts'

/** A point to label, and the size of its label. */
export interface Labelled {
  x: number
  y: number
  width: number
  height: number
}

/** Something a label had better not lie on, and how bad each square point of it is, in points of distance. */
export interface Obstacle extends Box {
  weight: number
}

interface Candidate {
  box: Box
  distance: number
}

const RINGS = [5, 8, 12, 17, 23, 30, 38, 48, 60, 75, 95, 120, 150]
/** Directions from the point, the best places for a label first; y grows downwards. */
const DIRECTIONS: readonly (readonly [number, number])[] = [
  [1, -1],
  [-1, -1],
  [1, 1],
  [-1, 1],
  [0, -1],
  [0, 1],
  [1, 0],
  [-1, 0],
  [1, -0.4],
  [-1, -0.4],
  [1, 0.4],
  [-1, 0.4],
  [0.1, -1],
  [-0.1, -1],
  [0.1, 1],
  [-0.1, 1],
]

/**
 * A place for each label beside its point: inside the bounds, never on another label, and where nearness and
 * keeping off the obstacles balance best.
 */
export function placeAround(
  points: readonly Labelled[],
  bounds: Box,
  taken: readonly Box[],
  obstacles: readonly Obstacle[],
): Box[] {
  const placed: Box[] = []
  for (const point of points) {
    const others = [...taken, ...placed]
    const free = candidates(point)
      .filter(({ box }) => isInside(box, bounds))
      .filter(({ box }) => others.every((other) => sharedArea(grown(box), other) === 0))
    placed.push(cheapest(free, obstacles) ?? stacked(point, bounds, others))
  }
  return placed
}

function candidates({ x, y, width, height }: Labelled): Candidate[] {
  return RINGS.flatMap((distance) =>
    DIRECTIONS.map(([right, down]) => {
      const left = x + right * distance - (right > 0 ? 0 : right < 0 ? width : width / 2)
      const top = y + down * distance - (down > 0 ? 0 : down < 0 ? height : height / 2)
      return { distance, box: { left, right: left + width, top, bottom: top + height } }
    }),
  )
}

/** What a box covers of the obstacles, each square point at its weight. */
export function costOf(box: Box, obstacles: readonly Obstacle[]): number {
  return obstacles.reduce((sum, other) => sum + other.weight * sharedArea(box, other), 0)
}

function cheapest(free: readonly Candidate[], obstacles: readonly Obstacle[]): Box | null {
  let best: { box: Box; cost: number } | null = null
  for (const { box, distance } of free) {
    const cost = distance + costOf(box, obstacles)
    if (best === null || cost < best.cost) best = { box, cost }
  }
  return best?.box ?? null
}

/** Where no place near the point is free: under the labels in the top left corner of the bounds. */
function stacked({ width, height }: Labelled, bounds: Box, others: readonly Box[]): Box {
  let top = bounds.top
  const boxAt = (y: number) => ({ left: bounds.left, right: bounds.left + width, top: y, bottom: y + height })
  while (others.some((other) => sharedArea(boxAt(top), other) > 0)) top += height
  return boxAt(top)
}

function isInside(box: Box, bounds: Box): boolean {
  const { left, right, top, bottom } = bounds
  return box.left >= left && box.right <= right && box.top >= top && box.bottom <= bottom
}

function grown(box: Box): Box {
  return { left: box.left - 2, right: box.right + 2, top: box.top - 1, bottom: box.bottom + 1 }
}
