import { gapBetween, paddingOf, type Strip } from './strip.ts'

/** A strip with its top, measured from the top of the frame. */
export interface Placed {
  readonly strip: Strip
  readonly top: number
}

interface PageSoFar {
  readonly placed: readonly Placed[]
  /** Floats put off to a later page, in order. */
  readonly waiting: readonly Strip[]
  /** Index of the first strip not yet dealt with. */
  readonly next: number
}

/**
 * Deals strips out to pages of the given height. Breaks come only where `keepWithNext` allows, as late as
 * possible; where nothing allows one, at the last strip that fits. A strip taller than a page gets one to itself.
 */
export function paginate(strips: readonly Strip[], frameHeight: number): Placed[][] {
  const pages: Placed[][] = []
  let state: PageSoFar = { placed: [], waiting: [], next: 0 }
  while (state.next < strips.length || state.waiting.length > 0) {
    state = fillPage(strips, state, frameHeight)
    pages.push([...state.placed])
  }
  return pages
}

function fillPage(strips: readonly Strip[], before: PageSoFar, height: number): PageSoFar {
  let page = startPage(strips, before, height)
  let lastBreak: PageSoFar | null = null
  while (page.next < strips.length) {
    const strip = strips[page.next]!
    const isFilled = page.placed.some((placed) => placed.strip !== strip.series?.head)
    if (strip.startsPage && isFilled) return page
    if (strip.beginsSection && page.waiting.length > 0) return page
    const fits = fitsBelow(page.placed, strip, height)
    const mayWait = strip.floats && isFilled && !page.placed.at(-1)?.strip.keepWithNext
    if (mayWait && (!fits || page.waiting.length > 0)) {
      page = { ...page, waiting: [...page.waiting, strip], next: page.next + 1 }
      continue
    }
    if (!fits && isFilled) return withFoot(lastBreak ?? page, strips)
    page = { ...page, placed: place(page.placed, strip), next: page.next + 1 }
    if (!strip.keepWithNext) lastBreak = page
  }
  return page
}

/** Floats that wait come first; then, within a table, its head again. */
function startPage(strips: readonly Strip[], before: PageSoFar, height: number): PageSoFar {
  let placed: Placed[] = []
  let waiting = before.waiting
  while (waiting.length > 0 && (placed.length === 0 || fitsBelow(placed, waiting[0]!, height))) {
    placed = place(placed, waiting[0]!)
    waiting = waiting.slice(1)
  }
  const series = seriesAcross(strips, before.next)
  if (series) placed = place(placed, series.head)
  return { placed, waiting, next: before.next }
}

function withFoot(page: PageSoFar, strips: readonly Strip[]): PageSoFar {
  const series = seriesAcross(strips, page.next)
  return series ? { ...page, placed: place(page.placed, series.foot) } : page
}

/** The table that a break before the strip of this index divides. */
function seriesAcross(strips: readonly Strip[], index: number): Strip['series'] {
  const series = strips[index]?.series
  return series && strips[index - 1]?.series === series ? series : undefined
}

function place(placed: readonly Placed[], strip: Strip): Placed[] {
  return [...placed, { strip, top: topOf(placed, strip) }]
}

function topOf(placed: readonly Placed[], strip: Strip): number {
  const last = placed.at(-1)
  return last ? last.top + last.strip.height + gapBetween(last.strip, strip) : paddingOf(strip, null)
}

function fitsBelow(placed: readonly Placed[], strip: Strip, height: number): boolean {
  return topOf(placed, strip) + strip.height + paddingOf(strip, null) <= height
}
