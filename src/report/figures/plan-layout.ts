import type { Audit } from '../../audit/audit.ts'
import { DEG } from '../../quantity/degrees.ts'
import { type AcrossScale, acrossScale } from './plan-across.ts'
import { dateLines } from './plan-dates.ts'
import { FOOT_HEIGHT, type FootPlace } from './plan-foot.ts'
import { type PlanScene, planScene } from './plan-scene.ts'
import { type PlanSource, planSources } from './plan-source.ts'
import { type PlanView, stackViews } from './plan-views.ts'

/** Where things stand in the figure of the plan, points. */
export interface PlanLayout {
  width: number
  height: number
  /** The plan itself on the left; null where no line has a direction of its own. */
  scene: PlanScene | null
  /** Across the lines, right of it. */
  scale: AcrossScale
  views: readonly PlanView[]
  /** How many times widths across a line are drawn as large as lengths along it. */
  factor: number
  /** The dates, where the flags have no room for them. */
  dates: readonly string[]
  /** Where the scales of the views begin: under the last view, or under the plan where the views take more height. */
  foot: FootPlace
  /** Where the plan ends below. */
  planBottom: number
}

export const PLAN_WIDTH = 440
export const PLAN_PANE = 195
const VIEWS_LEFT = 198
const RIGHT = 438
/** A line of small print. */
export const LINE = 9
const LEAST_HEIGHT = 226
const TARGET_HEIGHT = 272
/** Three and more lines are given more room; they, or so many dates, have flags of one line each. */
const MANY_LINES = 3
const MANY_DATES = 6
/** So many lines leave room for the scales under the plan. */
const FOOT_UNDER_PLAN = 4
const TARGET_OF_MANY = 325
const RIM_RADIUS = 68
/** The rim moves so far from the side to which all lines point, to leave the labels room there. */
const SHIFT = 19

/** Where things stand in the figure of an audit's plan; null where there is no line that a plan can show. */
export function layPlan(audit: Audit): PlanLayout | null {
  const sources = planSources(audit)
  if (sources.length === 0) return null
  const hasPlan = sources.some(({ line }) => line.from !== null || line.azimuth_deg !== null)
  const scale = acrossScale(sources, hasPlan ? VIEWS_LEFT : 2, RIGHT)
  const isMany = sources.length >= MANY_LINES
  const isShort = isMany || sources.some(({ placements }) => placements.length >= MANY_DATES)
  const dates = isShort ? dateLines(audit, scale.right - scale.left) : []
  const top = (1 + dates.length) * LINE + 4
  const isUnderPlan = hasPlan && sources.length >= FOOT_UNDER_PLAN
  const most = (isMany ? TARGET_OF_MANY : TARGET_HEIGHT) - top - (isUnderPlan ? 0 : FOOT_HEIGHT)
  const { views, factor, height: viewsHeight } = stackViews(sources, scale, { top, most, isShort })
  const { height, foot, planBottom } = isUnderPlan
    ? footUnderPlan(top + viewsHeight)
    : footUnderViews(top + viewsHeight, scale.left)
  const scene = hasPlan ? sceneOf(audit, sources, planBottom) : null
  return { width: PLAN_WIDTH, height, scene, scale, views, factor, dates, foot, planBottom }
}

type Bottoms = Pick<PlanLayout, 'height' | 'foot' | 'planBottom'>

function footUnderViews(viewsBottom: number, left: number): Bottoms {
  const height = Math.ceil(Math.max(LEAST_HEIGHT, viewsBottom + FOOT_HEIGHT))
  return { height, foot: { at: [left, viewsBottom], right: RIGHT }, planBottom: height }
}

/** Two lines above it part it from the plan. */
function footUnderPlan(viewsBottom: number): Bottoms {
  const height = Math.ceil(Math.max(LEAST_HEIGHT + FOOT_HEIGHT, viewsBottom))
  const top = height - FOOT_HEIGHT
  return { height, foot: { at: [2, top], right: PLAN_PANE }, planBottom: top - 2 * LINE }
}

function sceneOf(audit: Audit, sources: readonly PlanSource[], height: number): PlanScene | null {
  const y = Math.min(height / 2, LEAST_HEIGHT * 0.62)
  const rimAt = (x: number) => ({ centre: [x, y] as const, radius: RIM_RADIUS })
  const middle = PLAN_PANE / 2
  const { rays } = planScene(audit, sources, rimAt(middle))
  if (rays.length === 0) return null
  const east = rays.reduce((sum, { azimuthDeg }) => sum + Math.sin(azimuthDeg * DEG), 0) / rays.length
  return planScene(audit, sources, rimAt(middle - SHIFT * east))
}
