import type { Element } from 'hast'
import type { Audit } from '../../audit/audit.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { measuredDegrees } from '../wording/measured-angle.ts'
import { PALETTE } from './palette.ts'
import { planAlt } from './plan-alt.ts'
import { planFan } from './plan-fan.ts'
import { planFoot } from './plan-foot.ts'
import { northArrow, scaleBar } from './plan-furniture.ts'
import { LINE, layPlan, PLAN_PANE, type PlanLayout } from './plan-layout.ts'
import { planMap } from './plan-map.ts'
import { mapLabels } from './plan-map-labels.ts'
import { planPoints } from './plan-points.ts'
import type { PlanScene } from './plan-scene.ts'
import type { PlanSource } from './plan-source.ts'
import { type PlanView, VIEW_ROW } from './plan-views.ts'
import { TEXT_SIZE, text } from './shape.ts'
import { type FigureDrawing, svgRoot } from './svg-root.ts'
import { fitText, textWidth } from './text-width.ts'

/** Room for the tails of the letters in the last row. */
const DESCENT = 2

/**
 * The survey from above, north up and to scale; beside it the surroundings of each line, drawn many times as wide as
 * it is deep, with the tolerances held plausible as a wedge and where the target stood at each date. Points; 440 wide,
 * about 280 high for up to three lines. Null where no line has a place on a plan.
 */
export function planFigure(audit: Audit): FigureDrawing | null {
  const layout = layPlan(audit)
  if (layout === null) return null
  const { scene, views, width, height } = layout
  const shapes = [
    ...(scene === null ? [] : mapShapes(audit, scene, layout)),
    ...views.flatMap((view) => viewShapes(view, layout)),
    ...viewsHead(layout),
    ...planFoot(
      audit,
      views.map(({ source }) => source),
      layout.scale,
      layout.foot,
    ),
    ...(layout.planBottom < height ? [footHead(layout)] : []),
  ]
  return svgRoot(
    { width, height: height + DESCENT },
    `Plan of the survey: ${audit.structure.name}`,
    planAlt(audit, layout),
    shapes,
  )
}

function mapShapes(audit: Audit, scene: PlanScene, { planBottom }: PlanLayout): Element[] {
  const arrow = northArrow(audit, 2, LINE + 6)
  const { rim, scale } = scene
  const bar = { left: 2, right: rim.radius + 40, top: planBottom - 14, bottom: planBottom }
  const bounds = { left: 0, right: PLAN_PANE, top: LINE + 4, bottom: planBottom - 2 }
  return [
    text(0, LINE - 1, 'from above, to scale', { fill: PALETTE.muted }),
    ...planMap(scene),
    ...planPoints(scene),
    ...arrow.draw,
    ...(scale === null ? [] : scaleBar(scale, bar.left, bar.bottom - 3, rim.radius)),
    ...mapLabels(scene, bounds, [arrow.box, ...(scale === null ? [] : [bar])]),
  ]
}

function viewShapes(view: PlanView, { scale }: PlanLayout): Element[] {
  const baseline = view.top + VIEW_ROW - 1
  return [
    ...head(view.source, scale.left, scale.right, baseline),
    ...view.notes.map((note, row) =>
      text(scale.left, baseline + (row + 1) * VIEW_ROW, note, { fill: PALETTE.muted }),
    ),
    ...planFan(view, scale),
    ...view.flags.draw(view.boardTop),
  ]
}

/** Name of the line on the left; on the right what was measured, and how far off its marker is. */
function head({ sightline, measured }: PlanSource, left: number, right: number, baseline: number): Element[] {
  const marker =
    sightline.length_m === null ? 'lengths at 100 m' : `marker ${formatCm(sightline.length_m * 100)} off`
  const rest = `${sightline.measures === 'angle' ? 'angle ' : ''}${measuredDegrees(measured)}, ${marker}`
  const name = fitText(sightline.name, right - left - textWidth(rest, TEXT_SIZE) - 6, TEXT_SIZE, 600)
  return [text(left, baseline, name, { weight: 600 }), text(right, baseline, rest, { anchor: 'end' })]
}

/** Over the scales of the views, where they stand under the plan. */
function footHead({
  foot: {
    at: [left, top],
  },
}: PlanLayout): Element {
  return text(left, top - 1, 'along each line', { fill: PALETTE.muted })
}

/** Over the views: how they are drawn, and the dates where the flags do not say them. */
function viewsHead({ scale, factor, dates, views }: PlanLayout): Element[] {
  const how = `along ${views.length > 1 ? 'each line' : 'the line'}, drawn ${factor} times as wide`
  return [how, ...dates].map((content, row) =>
    text(scale.left, (row + 1) * LINE - 1, content, { fill: PALETTE.muted }),
  )
}
