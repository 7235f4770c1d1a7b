import type { Element } from 'hast'
import { wrap360 } from '../../quantity/degrees.ts'
import { formatArcmin, formatDegrees } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import type { Box } from './box.ts'
import { PALETTE } from './palette.ts'
import {
  type MapLabel,
  nearestOf,
  needsStroke,
  type PlacedLabel,
  placeLabels,
  ROW_HEIGHT,
  weightOf,
} from './plan-label-places.ts'
import { obstaclesOf } from './plan-obstacles.ts'
import { outwards } from './plan-rim.ts'
import type { PlanScene, SceneRay } from './plan-scene.ts'
import { line, TEXT_SIZE, text } from './shape.ts'
import { fitText } from './text-width.ts'

const LONGEST = 84
/** Names of the lines at the rim and of the points, clear of each other and, where there is room, of all lines. */
export function mapLabels(scene: PlanScene, bounds: Box, taken: readonly Box[]): Element[] {
  const rays = scene.rays.map((ray) => rayLabel(ray, scene))
  const points = pointLabels(scene)
  return placeLabels(rays, points, { bounds, taken, obstacles: obstaclesOf(scene) }).flatMap(labelShapes)
}

/** The name of the line and its azimuth; of an angle's second line, how far it lies from the first. */
function rayLabel({ source, part, rim: end, far }: SceneRay, { rim }: PlanScene): MapLabel {
  const { line: planLine, sightline } = source
  const opening =
    planLine.span === null ? '' : `${formatArcmin(Math.abs(planLine.span.angle_deg) * 60)} from it`
  const azimuth =
    planLine.azimuth_deg === null ? [] : [formatDegrees(wrap360(planLine.azimuth_deg), 'minute')]
  const distance = far?.distanceM == null ? '' : ` ${formatCm(far.distanceM * 100)}`
  return {
    at: outwards(rim, end, far === null ? 4 : 9),
    isStrong: part !== 'second',
    isAtRim: true,
    lines: [
      ...(part === 'second' ? [opening] : [fitText(sightline.name, LONGEST, TEXT_SIZE, 600), ...azimuth]),
      ...(far === null ? [] : [`to ${fitText(far.name, LONGEST - 40, TEXT_SIZE)}${distance}`]),
    ],
  }
}

function pointLabels({ points }: PlanScene): MapLabel[] {
  return points.map(({ point, at }) => ({
    ...{ at, isStrong: false, isAtRim: false },
    lines: [fitText(point.name, LONGEST, TEXT_SIZE)],
  }))
}

function labelShapes({ label, box }: PlacedLabel): Element[] {
  const { at, lines } = label
  const side = facing(at[0], box)
  return [
    ...(needsStroke(at, box)
      ? [line(at, nearestOf(at, box), { stroke: PALETTE.muted, strokeWidth: 0.4 })]
      : []),
    ...lines.map((content, row) =>
      text(side.x, box.top + (row + 1) * ROW_HEIGHT - 2, content, {
        anchor: side.anchor,
        weight: weightOf(label, row),
      }),
    ),
  ]
}

/** A label is set from the side that faces what it names, since estimated widths err on the wide side. */
function facing(x: number, { left, right }: Box): { x: number; anchor: 'start' | 'middle' | 'end' } {
  if (left >= x) return { x: left, anchor: 'start' }
  if (right <= x) return { x: right, anchor: 'end' }
  return { x: (left + right) / 2, anchor: 'middle' }
}
