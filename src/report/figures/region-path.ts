import { area } from 'd3-shape'
import { middle, type Span, slabsBetween } from './region-slabs.ts'

/** The spans a region has at one place along the horizontal. */
export interface Column {
  x: number
  spans: readonly Span[]
}

interface Corner {
  x: number
  low: number
  high: number
}

const outline = area<Corner>()
  .x((corner) => corner.x)
  .y0((corner) => corner.high)
  .y1((corner) => corner.low)
  .digits(2)

/**
 * Path data (M L Z) of a region known at some columns as unions of spans. Between columns edges run straight;
 * where the number of spans changes, a gap closes, or a span without a counterpart ends, in a point at the
 * middle. Spans thinner than `minThickness` are drawn that thick, so that nothing in the data goes unseen.
 */
export function regionPath(columns: readonly Column[], minThickness: number): string {
  const thick = columns.map(({ x, spans }) => ({ x, spans: tidySpans(spans, minThickness) }))
  const finished: Corner[][] = []
  let open = new Map<number, Corner[]>()
  thick.forEach((column, index) => {
    if (index === 0) open = startChains(column)
    const next = thick[index + 1]
    if (next === undefined) return
    const reached = new Map<number, Corner[]>()
    for (const slab of slabsBetween(column.spans, next.spans)) {
      const chain = slab.continues === null ? [corner(column.x, slab.left)] : open.get(slab.continues)!
      chain.push(corner(next.x, slab.right))
      if (slab.reaches === null) finished.push(chain)
      else reached.set(slab.reaches, chain)
      if (slab.continues !== null) open.delete(slab.continues)
    }
    finished.push(...open.values())
    open = startChains(next, reached)
  })
  finished.push(...open.values())
  return finished
    .filter((chain) => chain.length > 1)
    .map((chain) => outline(chain) ?? '')
    .join('')
}

/** In order, without touching neighbours, and none thinner than the least thickness. */
export function tidySpans(spans: readonly Span[], minThickness: number): Span[] {
  const ordered = spans
    .map(([a, b]): Span => [Math.min(a, b), Math.max(a, b)])
    .map((span) => atLeast(span, minThickness))
    .sort((a, b) => a[0] - b[0])
  const merged: Span[] = []
  for (const span of ordered) {
    const last = merged.at(-1)
    if (last !== undefined && span[0] <= last[1])
      merged[merged.length - 1] = [last[0], Math.max(last[1], span[1])]
    else merged.push(span)
  }
  return merged
}

function startChains(column: Column, reached = new Map<number, Corner[]>()): Map<number, Corner[]> {
  return new Map(column.spans.map((span, index) => [index, reached.get(index) ?? [corner(column.x, span)]]))
}

function atLeast(span: Span, thickness: number): Span {
  if (span[1] - span[0] >= thickness) return span
  return [middle(span) - thickness / 2, middle(span) + thickness / 2]
}

function corner(x: number, [low, high]: Span): Corner {
  return { x, low, high }
}
