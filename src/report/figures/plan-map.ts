import type { Element } from 'hast'
import { PALETTE } from './palette.ts'
import { planMarks } from './plan-mark.ts'
import { along, onRim, outwards, type Rim, rimBetween, type Spot } from './plan-rim.ts'
import { type PlanScene, type SceneRay, startOf } from './plan-scene.ts'
import { rangeRightOfLineDeg, rightOfLineDeg } from './plan-source.ts'
import { type Attributes, line, round2, shape } from './shape.ts'

const RIM = { fill: 'none', stroke: PALETTE.rule, strokeWidth: 0.5 } as const
/** Beyond this a wedge is no wedge any more. */
const WIDEST_DEG = 89
/** A shorter stretch of the rim is not seen beside its mark. */
const SHORTEST_ARC = 0.8

/** The plan inside its rim: wedges, lines, and on the rim where each target stood, all to scale. */
export function planMap(scene: PlanScene): Element[] {
  const { rim, rays } = scene
  const measured = rays.filter(({ part }) => part !== 'first')
  return [
    ...measured.flatMap((ray) => wedges(ray, rim)),
    shape('circle', { cx: rim.centre[0], cy: rim.centre[1], r: rim.radius, ...RIM }),
    ...cardinalTicks(rim),
    ...rays.flatMap((ray) => sight(ray, scene)),
    ...measured.flatMap((ray) => rimMarks(ray, rim)),
  ]
}

/** The plausible build tolerances about a line, the greatest below the least. */
function wedges(ray: SceneRay, rim: Rim): Element[] {
  const [least, greatest] = ray.source.builtArcmin
  const outer = { fill: PALETTE.outside, stroke: PALETTE.rule, strokeWidth: 0.3 }
  const wedge = (arcmin: number, paint: Attributes) => {
    const half = Math.min(WIDEST_DEG, arcmin / 60)
    const { from, azimuthDeg, startShare } = ray
    const arc = rimBetween(rim, from, azimuthDeg - half, azimuthDeg + half)
    const inner =
      startShare === 0 ? [from] : [arc.at(-1)!, arc[0]!].map((end) => between(from, end, startShare))
    return shape('path', { d: pathOf([...arc, ...inner], true), ...paint })
  }
  return [
    ...(greatest > 0 ? [wedge(greatest, outer)] : []),
    ...(least > 0 ? [wedge(least, { fill: PALETTE.set95 })] : []),
  ]
}

/** The line itself, strong as far as its foresight. */
function sight(ray: SceneRay, { points }: PlanScene): Element[] {
  const { line: planLine } = ray.source
  const aim = ray.part === 'second' ? (planLine.span?.to ?? null) : planLine.to
  const foresight = points.find(({ index }) => index === aim)
  const end = ray.far === null ? ray.rim : along(ray.rim, ray.azimuthDeg, 9)
  return [
    ...(planLine.from === null && ray.startShare === 0 ? [eye(ray.from)] : []),
    line(startOf(ray), end, { stroke: PALETTE.ink, strokeWidth: foresight === undefined ? 0.9 : 0.6 }),
    ...(foresight === undefined
      ? []
      : [line(startOf(ray), foresight.at, { stroke: PALETTE.ink, strokeWidth: 1.1 })]),
    ...(ray.far === null ? [] : [arrowHead(end, ray.azimuthDeg)]),
  ]
}

/** Where lines without points meet. */
function eye([cx, cy]: Spot): Element {
  return shape('circle', { cx, cy, r: 1.4, fill: PALETTE.ink })
}

function arrowHead(tip: Spot, azimuthDeg: number): Element {
  const wings = [-1, 1].map((side) => along(tip, azimuthDeg + 180 + side * 20, 5))
  return shape('path', { d: pathOf([wings[0]!, tip, wings[1]!], true), fill: PALETTE.ink })
}

function rimMarks(ray: SceneRay, rim: Rim): Element[] {
  const { source, from, azimuthDeg } = ray
  return planMarks(source.placements).flatMap(({ placement, colour, stroke, length }) => {
    const right = rightOfLineDeg(source, placement)
    const range = rangeRightOfLineDeg(source, placement)
    if (right === null || range === null) return []
    const at = onRim(rim, from, azimuthDeg + right)
    const arc = rimBetween(rim, from, azimuthDeg + range[0], azimuthDeg + Math.min(range[1], range[0] + 360))
    return [
      ...(lengthOf(arc) < SHORTEST_ARC
        ? []
        : [shape('path', { d: pathOf(arc), fill: 'none', stroke: colour, strokeWidth: 2.2 })]),
      line(at, outwards(rim, at, length), stroke),
    ]
  })
}

function cardinalTicks(rim: Rim): Element[] {
  return [0, 90, 180, 270].map((azimuth) =>
    line(along(rim.centre, azimuth, rim.radius - 3), along(rim.centre, azimuth, rim.radius), {
      stroke: PALETTE.rule,
      strokeWidth: 0.5,
    }),
  )
}

function between(from: Spot, to: Spot, share: number): Spot {
  return [from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share]
}

function lengthOf(spots: readonly Spot[]): number {
  return spots
    .slice(1)
    .reduce((sum, [x, y], index) => sum + Math.hypot(x - spots[index]![0], y - spots[index]![1]), 0)
}

/** Path data of straight strokes through some spots. */
export function pathOf(spots: readonly Spot[], isClosed = false): string {
  const strokes = spots.map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${round2(x)} ${round2(y)}`)
  return strokes.join('') + (isClosed ? 'Z' : '')
}
