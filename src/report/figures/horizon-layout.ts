import type { Box } from './box.ts'
import { type HorizonFlags, horizonFlags } from './horizon-flags.ts'
import { horizonLabels } from './horizon-labels.ts'
import type { HorizonMark, HorizonSource } from './horizon-source.ts'
import { type HorizonView, horizonView, isInView } from './horizon-view.ts'

/** Where things stand in the horizon figure, points. */
export interface HorizonPlot {
  box: Box
  view: HorizonView
  /** The azimuths at its two sides, degrees, about the line's. */
  azimuths: readonly [number, number]
  /** Points to a degree on the sky. */
  perDegree: number
  x: (azimuthDeg: number) => number
  y: (altitudeDeg: number) => number
  /** Marks that lie wholly in the plot, and those that do not. */
  inside: readonly HorizonMark[]
  outside: readonly HorizonMark[]
  /** Directions over a whole date, of those inside for which one can see them apart; rows count from the top. */
  spreads: readonly Spread[]
}

export interface Spread {
  mark: HorizonMark
  row: number
}

export const HORIZON_WIDTH = 440
const LEFT = 46
const RIGHT = 437
/** Labels over the plot may stand over the altitudes too. */
const LABELS = { left: 2, right: HORIZON_WIDTH - 2 }
/** Rows below the plot, as distances of their rules from its bottom. */
export const HORIZON_ROWS = { bracket: 6, azimuth: 20, sun: 36, height: 50 }
export const NOTE_HEIGHT = 10
/** The height of a row of spreads, between the labels and the discs. */
export const SPREAD_ROW = 5
/** A shorter spread is not seen, points. */
const SHORTEST_SPREAD = 1.6
const SPREAD_GAP = 4

/** The plot, and the rows of labels over it. */
export function layHorizon(source: HorizonSource): { plot: HorizonPlot; flags: HorizonFlags } {
  const view = horizonView(source, RIGHT - LEFT)
  const { perDegree, acrossPerAzimuth, across, altitudes } = view
  const { value } = source.line
  const x = (azimuthDeg: number) => LEFT + ((azimuthDeg - value) * acrossPerAzimuth - across[0]) * perDegree
  const inside = source.marks.filter((mark) => isInView(mark, value, view))
  const outside = source.marks.filter((mark) => !inside.includes(mark))
  const spreads = spreadsOf(inside, x)
  const flags = horizonFlags(
    horizonLabels(source, { inside, outside, x, left: LEFT, right: RIGHT }),
    LABELS.left,
    LABELS.right,
  )
  const top = Math.max(source.unseen.length * NOTE_HEIGHT + flags.height, 10) + 1
  const bottom = top + spreadRows(spreads) * SPREAD_ROW + (altitudes[1] - altitudes[0]) * perDegree
  const plot = {
    ...{ box: { left: LEFT, right: RIGHT, top, bottom }, view, perDegree, x, inside, outside, spreads },
    azimuths: [value + across[0] / acrossPerAzimuth, value + across[1] / acrossPerAzimuth] as const,
    y: (altitudeDeg: number) => bottom - (altitudeDeg - altitudes[0]) * perDegree,
  }
  return { plot, flags }
}

/** Each spread in the first row in which it meets no other. */
function spreadsOf(marks: readonly HorizonMark[], x: (azimuthDeg: number) => number): Spread[] {
  const spreads: Spread[] = []
  const meets = (a: HorizonMark, b: HorizonMark) =>
    x(a.rangeDeg[0]) < x(b.rangeDeg[1]) + SPREAD_GAP && x(b.rangeDeg[0]) < x(a.rangeDeg[1]) + SPREAD_GAP
  for (const mark of marks.filter(({ rangeDeg }) => x(rangeDeg[1]) - x(rangeDeg[0]) >= SHORTEST_SPREAD)) {
    let row = 0
    while (spreads.some((other) => other.row === row && meets(other.mark, mark))) row++
    spreads.push({ mark, row })
  }
  return spreads
}

function spreadRows(spreads: readonly Spread[]): number {
  return spreads.reduce((most, { row }) => Math.max(most, row + 1), 0)
}
