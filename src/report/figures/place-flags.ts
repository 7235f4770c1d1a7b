/** A label that hangs from the top of a stem at `x`, like a flag from its pole. */
export interface Flag {
  x: number
  width: number
}

export type Side = 'left' | 'right'

export interface PlacedFlag {
  /** Rows count from 0, the lowest. */
  row: number
  /** Left edge of the label. */
  left: number
  /** On which side of its pole it hangs; null where it spans the pole. */
  side: Side | null
}

const GAP = 3
/** Beyond this many flags the search over sides would take long; they get a row each. */
const MOST_SEARCHED = 10

/**
 * Gives each flag a side of its pole and a row, so that no label lies on another label or on another's pole, in
 * as few rows as possible and to the right of the pole where there is a choice. Where that cannot be had, each
 * label gets a row of its own, shifted into the bounds.
 */
export function placeFlags(flags: readonly Flag[], from: number, to: number): PlacedFlag[] {
  let best: PlacedFlag[] | null = null
  const choices = flags.length > MOST_SEARCHED ? 0 : 2 ** flags.length
  for (let choice = 0; choice < choices; choice++) {
    const sides = flags.map((_, index): Side => ((choice >> index) & 1 ? 'left' : 'right'))
    const placed = placeOnSides(flags, sides, from, to)
    if (placed !== null && (best === null || rowCount(placed) < rowCount(best))) best = placed
  }
  return (
    best ?? flags.map((flag, row) => ({ row, left: clamp(flag.x + GAP, from, to - flag.width), side: null }))
  )
}

export function rowCount(placed: readonly PlacedFlag[]): number {
  return placed.reduce((most, { row }) => Math.max(most, row + 1), 0)
}

/** The same with the side of each flag given; null where one would leave the bounds, or they stand in each other's way. */
export function placeOnSides(
  flags: readonly Flag[],
  sides: readonly Side[],
  from: number,
  to: number,
): PlacedFlag[] | null {
  const lefts = flags.map((flag, index) =>
    sides[index] === 'right' ? flag.x + GAP : flag.x - GAP - flag.width,
  )
  if (flags.some((flag, index) => lefts[index]! < from || lefts[index]! + flag.width > to)) return null
  // A label that spans another's pole must hang above that pole's top.
  const spans = (label: number, pole: number) =>
    label !== pole &&
    flags[pole]!.x > lefts[label]! - 1 &&
    flags[pole]!.x < lefts[label]! + flags[label]!.width + 1
  const meets = (a: number, b: number) =>
    lefts[a]! < lefts[b]! + flags[b]!.width + GAP && lefts[b]! < lefts[a]! + flags[a]!.width + GAP
  const rows = new Map<number, number>()
  while (rows.size < flags.length) {
    const next = flags.findIndex(
      (_, label) => !rows.has(label) && flags.every((_, pole) => rows.has(pole) || !spans(label, pole)),
    )
    if (next < 0) return null
    let row = 0
    const isBlocked = ([other, taken]: [number, number]) =>
      (spans(next, other) && taken >= row) || (taken === row && meets(next, other))
    while ([...rows].some(isBlocked)) row++
    rows.set(next, row)
  }
  return flags.map((_, index) => ({ row: rows.get(index)!, left: lefts[index]!, side: sides[index]! }))
}

function clamp(value: number, low: number, high: number): number {
  return Math.max(low, Math.min(high, value))
}
