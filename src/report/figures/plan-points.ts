import type { Element } from 'hast'
import { PALETTE } from './palette.ts'
import { along } from './plan-rim.ts'
import type { PlanScene, ScenePoint } from './plan-scene.ts'
import { line, shape } from './shape.ts'

const DOT = 1.9
/** What is smaller on the drawing than this is not drawn to scale. */
const VISIBLE = 3.5

/** The points: a dot, a post as wide as it is, a gap as its two edges, and about each its uncertainty where it shows. */
export function planPoints(scene: PlanScene): Element[] {
  return scene.points.flatMap((point) => [...uncertainty(point, scene), ...pointMark(point, scene)])
}

/** One standard deviation; none where it is hidden by the dot, or would reach beyond the plan. */
function uncertainty({ point, at }: ScenePoint, { scale, rim }: PlanScene): Element[] {
  const radius = point.sd_m * (scale ?? 0)
  const fromCentre = Math.hypot(at[0] - rim.centre[0], at[1] - rim.centre[1])
  if (radius < DOT + 0.6 || radius + fromCentre > rim.radius) return []
  const stroke = { stroke: PALETTE.muted, strokeWidth: 0.4, strokeDasharray: '1.5 1' }
  return [shape('circle', { cx: at[0], cy: at[1], r: radius, fill: 'none', ...stroke })]
}

/** Whether a point is drawn as a hollow dot: a gap too narrow to be drawn to scale. */
export function isHollow({ point: { form, width_m } }: ScenePoint, { scale }: PlanScene): boolean {
  return form === 'gap' && (width_m ?? 0) * (scale ?? 0) < VISIBLE
}

function pointMark(point: ScenePoint, scene: PlanScene): Element[] {
  const { at } = point
  const { width_m, form } = point.point
  const width = (width_m ?? 0) * (scene.scale ?? 0)
  const across = (lineThrough(point, scene) ?? 0) + 90
  const dot = { cx: at[0], cy: at[1], r: DOT, stroke: PALETTE.ink, strokeWidth: 0.9 }
  if (form === null || width < VISIBLE) {
    return [shape('circle', { ...dot, fill: isHollow(point, scene) ? PALETTE.paper : PALETTE.ink })]
  }
  const [left, right] = [along(at, across, -width / 2), along(at, across, width / 2)]
  if (form === 'post') return [line(left, right, { stroke: PALETTE.ink, strokeWidth: 3 })]
  return [left, right].map((edge) =>
    line(along(edge, across + 90, -2.5), along(edge, across + 90, 2.5), {
      stroke: PALETTE.ink,
      strokeWidth: 1.6,
    }),
  )
}

/** The azimuth of the first line that begins or ends at a point. */
function lineThrough({ index }: ScenePoint, { rays }: PlanScene): number | null {
  const ray = rays.find(({ source: { line }, part }) => {
    const aim = part === 'second' ? (line.span?.to ?? null) : line.to
    return line.from === index || aim === index
  })
  return ray?.azimuthDeg ?? null
}
