import type { Canvas } from './canvas.ts'
import type { Outline } from './outline.ts'
import type { Tagger } from './tagging.ts'

/** What a strip is drawn with. */
export interface Painter {
  readonly canvas: Canvas
  readonly tagger: Tagger
  readonly outline: Outline
}

export type Paint = (painter: Painter, top: number) => void

/**
 * A horizontal strip of the page that is never divided: a line of text, a row of a table, a figure with its
 * caption. The document is one list of them; paginate.ts deals it out to pages.
 */
export interface Strip {
  readonly height: number
  /** Wanted distance to the strip above and below; the greater one counts, and none at the top of a page. */
  readonly gapAbove: number
  readonly gapBelow: number
  /** No page break after this strip. */
  readonly keepWithNext: boolean
  readonly startsPage?: boolean
  /** If it does not fit, and no heading stands over it, it goes to the top of the next page and lets what
   * follows come before it. */
  readonly floats?: boolean
  /** Begins a section: floats that wait are set before it, so that none strays out of its own. */
  readonly beginsSection?: boolean
  /** The table it is a row of, for what is set again where a page break divides the table. */
  readonly series?: Series
  /** The panels it stands in, from the outermost. */
  readonly panels: readonly PanelBox[]
  readonly paint: Paint
}

export interface Series {
  /** Set above the rows that come first on a further page. */
  readonly head: Strip
  /** Drawn below the rows that come last on a page, in no height. */
  readonly foot: Strip
}

/** A tint and a rule behind strips. */
export interface PanelBox {
  readonly left: number
  readonly width: number
  readonly tint: string
  readonly rules: readonly { readonly offset: number; readonly width: number; readonly colour: string }[]
  /** How far the tint reaches above the first strip and below the last. */
  readonly padding: number
}

export function strip(height: number, paint: Paint): Strip {
  return { height, gapAbove: 0, gapBelow: 0, keepWithNext: false, panels: [], paint }
}

/** The same strips with more space before the first and after the last. */
export function withGaps(strips: readonly Strip[], above: number, below: number): Strip[] {
  return strips.map((each, index) => ({
    ...each,
    gapAbove: index === 0 ? Math.max(each.gapAbove, above) : each.gapAbove,
    gapBelow: index === strips.length - 1 ? Math.max(each.gapBelow, below) : each.gapBelow,
  }))
}

/** The same strips, none of which may float away from what it stands in. */
export function anchored(strips: readonly Strip[]): Strip[] {
  return strips.map((each) => ({ ...each, floats: false }))
}

/** The same strips with no page break among them. */
export function keptTogether(strips: readonly Strip[]): Strip[] {
  return strips.map((each, index) => ({
    ...each,
    keepWithNext: index < strips.length - 1 || each.keepWithNext,
  }))
}

/** The greater gap, and the padding of the panels that end or begin here. */
export function gapBetween(above: Strip, below: Strip): number {
  return Math.max(above.gapBelow, below.gapAbove) + paddingOf(above, below) + paddingOf(below, above)
}

/** Padding of the panels that `inner` stands in and `outer` does not. */
export function paddingOf(inner: Strip, outer: Strip | null): number {
  const boxes = inner.panels.filter((box) => !outer?.panels.includes(box))
  return boxes.reduce((sum, box) => sum + box.padding, 0)
}

export function totalHeight(strips: readonly Strip[]): number {
  const gaps = strips.slice(1).map((each, index) => gapBetween(strips[index]!, each))
  return [...strips.map((each) => each.height), ...gaps].reduce((sum, part) => sum + part, 0)
}

/** Several strips as one that is never divided. */
export function joined(strips: readonly Strip[]): Strip {
  const paint: Paint = (painter, top) => {
    let y = top
    for (const [index, each] of strips.entries()) {
      if (index > 0) y += gapBetween(strips[index - 1]!, each)
      each.paint(painter, y)
      y += each.height
    }
  }
  const [first, last] = [strips[0]!, strips.at(-1)!]
  const gaps = { gapAbove: first.gapAbove, gapBelow: last.gapBelow }
  return {
    ...strip(totalHeight(strips), paint),
    ...gaps,
    keepWithNext: last.keepWithNext,
    panels: first.panels,
  }
}
