import type { PhrasingContent } from 'mdast'
import type { Audit, Placement } from '../../audit/audit.ts'
import { listed } from '../../quantity/listed.ts'
import { isBeyondView } from '../figures/plan-across.ts'
import { hasWhisker } from '../figures/plan-fan.ts'
import { layPlan, type PlanLayout } from '../figures/plan-layout.ts'
import { isHollow } from '../figures/plan-points.ts'
import { rightOfLineDeg } from '../figures/plan-source.ts'
import { phrasing, strong } from '../nodes.ts'

/**
 * Tells a reader how to read the plan and the surroundings of its lines; `namesLines` where others of the audit are in
 * another figure. Throws a RangeError where there is no plan.
 */
export function planCaption(audit: Audit, namesLines = false): PhrasingContent[] {
  const layout = layPlan(audit)
  if (layout === null) throw new RangeError('the audit has no line that a plan can show')
  const sentences = [...drawn(audit, layout), ...targets(layout)]
  return phrasing([strong(title(layout, namesLines)), ` ${sentences.join(' ')}`])
}

function title({ scene, views }: PlanLayout, namesLines: boolean): string {
  const line = views.length > 1 ? 'each line' : 'the line'
  const names = namesLines ? `: ${listed(views.map(({ source }) => source.sightline.name))}` : ''
  return `${scene === null ? `Along ${line}` : `From above, and along ${line}`}${names}.`
}

/** The plan, the surroundings of the lines and their wedges. */
function drawn(audit: Audit, layout: PlanLayout): string[] {
  const { scene, views, scale, factor } = layout
  const line = views.length > 1 ? 'each line' : 'the line'
  const ticks = targets(layout).length > 0 ? ', with ticks on its rim where the target stood' : ''
  const opening = scene === null ? 'The' : `The plan is to scale${ticks}; beside it the`
  const whisker = views.some(({ source }) => hasWhisker(source, scale))
    ? ', its whisker one standard deviation of the survey'
    : ''
  const hollow = scene === null ? [] : scene.points.filter((point) => isHollow(point, scene))
  return [
    `${opening} surroundings of ${line}, stretched ${factor} times across: the line black${whisker}${wedges(audit, layout)}.`,
    ...(hollow.length === 0
      ? []
      : [hollow.length === 1 ? 'The hollow dot is a gap.' : 'Hollow dots are gaps.']),
  ]
}

function wedges({ plausible: { low_arcmin: low, high_arcmin: high } }: Audit, { views }: PlanLayout): string {
  if (high <= 0) return ''
  const isOfAngle = views.some(({ source }) => source.sightline.measures === 'angle')
  const ofAngle = isOfAngle ? ' (√2 times for an angle)' : ''
  if (low === high) return `, the grey wedge the plausible build tolerance${ofAngle}`
  if (low <= 0) return `, the grey wedge the greatest plausible build tolerance${ofAngle}`
  return `, the dark and the light grey wedge the least and the greatest plausible build tolerance${ofAngle}`
}

/** How each date that is drawn is marked. */
function targets(layout: PlanLayout): string[] {
  const others = countDrawn(layout, 'independent')
  const stood = [
    ...(countDrawn(layout, 'asserted') > 0 ? ['at the red mark at the asserted date'] : []),
    ...(others === 1 ? ['at the hatched one at the independent date'] : []),
    ...(others > 1 ? ['at the hatched ones at independent dates'] : []),
  ]
  const clauses = [
    ...(stood.length > 0 ? [`stood ${stood.join(', ')}`] : []),
    ...(countDrawn(layout, 'today') > 0 ? ['stands at the broken one today'] : []),
  ]
  if (clauses.length === 0) return []
  const arrows = hasArrows(layout) ? '; an arrow points to one beyond the view' : ''
  return [`The target ${clauses.join(' and ')}${arrows}.`]
}

/** Of one kind of date, the most at which the target of some line has a direction. */
function countDrawn({ views }: PlanLayout, kind: Placement['kind']): number {
  const counts = views.map(({ source }) => {
    const own = source.placements.filter((placement) => placement.kind === kind)
    return own.filter((placement) => rightOfLineDeg(source, placement) !== null).length
  })
  return Math.max(0, ...counts)
}

function hasArrows({ views, scale }: PlanLayout): boolean {
  return views.some(({ source }) =>
    source.placements.some((placement) => {
      const right = rightOfLineDeg(source, placement)
      return right !== null && isBeyondView(right * 60, scale)
    }),
  )
}
