import type { Element } from 'hast'
import type { Box } from './box.ts'
import { hatch } from './hatch.ts'
import { PALETTE } from './palette.ts'
import { type Attributes, line, shape } from './shape.ts'

/** Which way a plot's dates run. */
export type DateAxis = 'vertical' | 'horizontal'

const THINNEST = 1.6
/** Up to this thickness the asserted band is solid: a tint would not be seen. */
const SOLID = 4

/** The asserted date as a band across a plot: tinted, with strong edges that run together where it is narrow. */
export function assertedBand(box: Box, axis: DateAxis): Element[] {
  const band = atLeastAsWide(box, axis)
  const isSolid = thickness(band, axis) <= SOLID
  const stroke = { stroke: PALETTE.accent, strokeWidth: isSolid ? 1.1 : 1.4 }
  // So faint that no ground turns into another ground's grey.
  const fillOpacity = isSolid ? 1 : 0.12
  return [
    shape('rect', { ...rectangle(band), fill: PALETTE.accent, fillOpacity }),
    ...edges(band, axis, stroke),
  ]
}

/** An independent date as a band: white, outlined, hatched; neighbours are hatched the other way. */
export function independentBand(box: Box, axis: DateAxis, index: number): Element[] {
  const band = atLeastAsWide(box, axis)
  const lines = hatch(band, index < 2 ? 4 : 7, index % 2 === 0)
  return [
    shape('rect', { ...rectangle(band), fill: PALETTE.paper, fillOpacity: 0.6 }),
    ...(lines === ''
      ? []
      : [shape('path', { d: lines, fill: 'none', stroke: PALETTE.ink, strokeWidth: 0.4 })]),
    ...edges(band, axis, { stroke: PALETTE.ink, strokeWidth: 0.7 }),
  ]
}

function rectangle({ left, right, top, bottom }: Box): Attributes {
  return { x: left, y: top, width: right - left, height: bottom - top }
}

function edges(band: Box, axis: DateAxis, stroke: Attributes): Element[] {
  const { left, right, top, bottom } = band
  if (axis === 'vertical') return [top, bottom].map((y) => line([left, y], [right, y], stroke))
  return [left, right].map((x) => line([x, top], [x, bottom], stroke))
}

function thickness(box: Box, axis: DateAxis): number {
  return axis === 'vertical' ? box.bottom - box.top : box.right - box.left
}

function atLeastAsWide(box: Box, axis: DateAxis): Box {
  const [from, to] = axis === 'vertical' ? [box.top, box.bottom] : [box.left, box.right]
  const lack = Math.max(0, THINNEST - (to - from)) / 2
  if (axis === 'vertical') return { ...box, top: from - lack, bottom: to + lack }
  return { ...box, left: from - lack, right: to + lack }
}
