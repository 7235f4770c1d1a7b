import { line as polyline } from 'd3-shape'
import type { Element } from 'hast'
import { clipPolygon } from './clip-polygon.ts'
import { clipToBand } from './clip-to-band.ts'
import type { HorizonPlot } from './horizon-layout.ts'
import { skylineEnds, skylineParts } from './horizon-skyline.ts'
import type { HorizonSource } from './horizon-source.ts'
import { PALETTE } from './palette.ts'
import { line, round2, shape } from './shape.ts'

export type Point = readonly [x: number, y: number]

/** A thinner band is hidden by the skyline itself, points from its middle. */
const THINNEST_BAND = 0.9

/** The skyline in points of the figure, from side to side of the plot; heights may lie outside it. */
export function skylinePoints({ skyline }: HorizonSource, { azimuths, x, y }: HorizonPlot): Point[][] {
  return skylineParts(skyline, ...azimuths).map((part) =>
    part.map(([azimuth, altitude]) => [x(azimuth), y(altitude)] as const),
  )
}

/** Whether the skyline's uncertainty is wide enough to be drawn. */
export function hasSkylineBand({ skyline }: HorizonSource, { perDegree }: HorizonPlot): boolean {
  return skyline.at_line_deg.sd * perDegree >= THINNEST_BAND
}

/** One standard deviation of the skyline's altitude under and over it, where one can see that. */
export function skylineBand(source: HorizonSource, plot: HorizonPlot): Element[] {
  if (!hasSkylineBand(source, plot)) return []
  const half = source.skyline.at_line_deg.sd * plot.perDegree
  return skylinePoints(source, plot).flatMap((part) => {
    const edge = [
      ...part.map(([x, y]) => [x, y - half] as const),
      ...part.toReversed().map(([x, y]) => [x, y + half] as const),
    ]
    const seen = clipPolygon(edge, plot.box.top, plot.box.bottom)
    const d = `M${seen.map(([x, y]) => `${round2(x)} ${round2(y)}`).join('L')}Z`
    return seen.length < 3 ? [] : [shape('path', { d, fill: PALETTE.ink, fillOpacity: 0.09 })]
  })
}

/** The skyline as a plain line, and where a profile ends in view, a dotted mark. */
export function skylineShapes(source: HorizonSource, plot: HorizonPlot): Element[] {
  const path = polyline<Point>().digits(2)
  const d = skylinePoints(source, plot)
    .flatMap((part) => clipToBand(part, plot.box.top, plot.box.bottom))
    .map((part) => path(part) ?? '')
    .join('')
  const stroke = { stroke: PALETTE.ink, strokeWidth: 1.2 }
  return [...(d === '' ? [] : [shape('path', { d, fill: 'none', ...stroke })]), ...endMarks(source, plot)]
}

function endMarks({ skyline }: HorizonSource, { azimuths, x, box }: HorizonPlot): Element[] {
  const stroke = { stroke: PALETTE.muted, strokeWidth: 0.8, strokeDasharray: '0.8 2' }
  return skylineEnds(skyline, ...azimuths).map(({ node }) =>
    line([x(node[0]), box.top], [x(node[0]), box.bottom], stroke),
  )
}
