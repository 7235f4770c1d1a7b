import { ARROW_ROW } from './horizon-discs.ts'
import type { HorizonLabel } from './horizon-labels.ts'
import { type HorizonPlot, SPREAD_ROW } from './horizon-layout.ts'
import { isWideError, whiskerY } from './horizon-line.ts'
import { skylineEnds } from './horizon-skyline.ts'
import type { HorizonSource } from './horizon-source.ts'
import type { Obstacle } from './place-around.ts'

/** How far the arrows of what lies beyond reach into the plot. */
const ARROW_REACH = 30

/** What the names in the plot had better not cover: the line and its error, discs, stems, spreads, arrows, a profile's ends. */
export function horizonObstacles(
  source: HorizonSource,
  plot: HorizonPlot,
  labels: readonly HorizonLabel[],
): Obstacle[] {
  const { line, skyline } = source
  const { box, azimuths, x, y, perDegree, inside, outside, spreads } = plot
  const about = (left: number, right: number, top: number, bottom: number): Obstacle => ({
    ...{ left, right, top, bottom },
    weight: 1,
  })
  return [
    about(x(line.value) - 2, x(line.value) + 2, box.top, box.bottom),
    ...(isWideError(source, plot)
      ? [about(x(line.value - line.sd), x(line.value + line.sd), whiskerY(plot) - 2, whiskerY(plot) + 2)]
      : []),
    ...inside.map(({ azimuthDeg, altitudeDeg, radiusDeg }) => {
      const [middle, height] = [x(azimuthDeg), y(altitudeDeg)]
      const reach = (radiusDeg ?? 0) * perDegree + 4
      return about(middle - reach, middle + reach, height - reach, height + reach)
    }),
    ...labels
      .filter(({ mark }) => inside.includes(mark))
      .map(({ x: stem, mark }) => about(stem - 2, stem + 2, box.top, y(mark.altitudeDeg))),
    ...spreads.map(({ mark, row }) =>
      about(x(mark.rangeDeg[0]), x(mark.rangeDeg[1]), box.top, box.top + (row + 1) * SPREAD_ROW),
    ),
    ...skylineEnds(skyline, ...azimuths).map(({ node }) =>
      about(x(node[0]) - 1, x(node[0]) + 1, box.top, box.bottom),
    ),
    // Arrows stand in rows from the top at either side.
    ...[box.left, box.right]
      .map((side) =>
        about(side - ARROW_REACH, side + ARROW_REACH, box.top, box.top + ARROW_ROW * (outside.length + 1)),
      )
      .slice(0, outside.length === 0 ? 0 : 2),
  ]
}
