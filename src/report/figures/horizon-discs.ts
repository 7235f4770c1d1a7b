import type { Element } from 'hast'
import type { HorizonLabel } from './horizon-labels.ts'
import { type HorizonPlot, SPREAD_ROW } from './horizon-layout.ts'
import type { HorizonMark } from './horizon-source.ts'
import { markStroke, stemStroke } from './horizon-strokes.ts'
import { line, round2, shape } from './shape.ts'

/** Half of a star's cross, points. */
const CROSS = 3.2
/** The arrows of what lies beyond the picture stand in rows of this height. */
export const ARROW_ROW = 8

/** The discs at their true size as circles, stars as crosses; strong outlines first, so that none hides another. */
export function discs({ inside, x, y, perDegree }: HorizonPlot): Element[] {
  const drawn = (mark: HorizonMark) => {
    const [cx, cy] = [x(mark.azimuthDeg), y(mark.altitudeDeg)]
    if (mark.radiusDeg === null) return crossAt(cx, cy, mark)
    return [shape('circle', { cx, cy, r: mark.radiusDeg * perDegree, fill: 'none', ...markStroke(mark) })]
  }
  return [...inside].sort((a, b) => strength(b) - strength(a)).flatMap(drawn)
}

function strength({ placement }: HorizonMark): number {
  return { asserted: 2, independent: 1, today: 0 }[placement.kind]
}

function crossAt(x: number, y: number, mark: HorizonMark): Element[] {
  const { strokeDasharray: _, ...stroke } = markStroke(mark)
  return [
    line([x - CROSS, y - CROSS], [x + CROSS, y + CROSS], stroke),
    line([x - CROSS, y + CROSS], [x + CROSS, y - CROSS], stroke),
  ]
}

/** From the labels' stems down to the discs, or out of the picture. */
export function stems(labels: readonly HorizonLabel[], plot: HorizonPlot): Element[] {
  return labels.flatMap((label) =>
    plot.inside.includes(label.mark)
      ? [line([label.x, plot.box.top], [label.x, topOf(label.mark, plot)], stemStroke(label.mark))]
      : arrowOut(label, plot),
  )
}

/** Where a stem meets its disc: on the outline right under it. */
function topOf(
  { directionDeg, azimuthDeg, altitudeDeg, radiusDeg }: HorizonMark,
  { x, y, perDegree }: HorizonPlot,
) {
  const radius = (radiusDeg ?? 0) * perDegree
  const aside = Math.min(radius, Math.abs(x(directionDeg) - x(azimuthDeg)))
  return y(altitudeDeg) - Math.sqrt(radius ** 2 - aside ** 2)
}

/** An arrow to the side on which a target lies beyond the picture. */
function arrowOut({ mark, x: at }: HorizonLabel, { box, x, y, outside }: HorizonPlot): Element[] {
  const row = box.top + ARROW_ROW * (1 + outside.indexOf(mark))
  const stroke = stemStroke(mark)
  const to = x(mark.azimuthDeg)
  if (to < box.left || to > box.right) {
    const tip: Point = [to < box.left ? box.left : box.right, row]
    return [
      line([at, box.top], [at, row], stroke),
      line([at, row], tip, stroke),
      head(tip, to < box.left ? [1, 0] : [-1, 0], mark),
    ]
  }
  if (y(mark.altitudeDeg) < (box.top + box.bottom) / 2) return [head([at, box.top], [0, 1], mark)]
  return [line([at, box.top], [at, box.bottom], stroke), head([at, box.bottom], [0, -1], mark)]
}

type Point = readonly [x: number, y: number]

/** A head at `tip`, whose shaft comes from the direction `back`. */
function head([x, y]: Point, [backX, backY]: Point, mark: HorizonMark): Element {
  const corner = (side: number) =>
    `${round2(x + 5 * backX + side * backY)} ${round2(y + 5 * backY + side * backX)}`
  const { stroke } = markStroke(mark)
  return shape('path', {
    d: `M${round2(x)} ${round2(y)}L${corner(2.2)}L${corner(-2.2)}Z`,
    fill: String(stroke),
  })
}

/** The directions over the whole of a date as a bar across its stem, each in a row of its own. */
export function spreads({ spreads: all, box, x }: HorizonPlot): Element[] {
  return all.flatMap(({ mark, row }) => {
    const y = box.top + (row + 0.7) * SPREAD_ROW
    const [from, to] = mark.rangeDeg.map((deg) => Math.max(box.left, Math.min(box.right, x(deg)))) as [
      number,
      number,
    ]
    const { stroke } = markStroke(mark)
    const isWhole = (deg: number) => x(deg) >= box.left && x(deg) <= box.right
    return [
      line([from, y], [to, y], { stroke: String(stroke), strokeWidth: 1.6 }),
      ...mark.rangeDeg
        .filter(isWhole)
        .map((deg) =>
          line([x(deg), y - 1.8], [x(deg), y + 1.8], { stroke: String(stroke), strokeWidth: 0.6 }),
        ),
    ]
  })
}
