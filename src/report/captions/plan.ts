import type { PhrasingContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { isBeyondView } from '../figures/plan-across.ts'
import { layPlan, type PlanLayout } from '../figures/plan-layout.ts'
import { rightOfLineDeg } from '../figures/plan-source.ts'
import { phrasing, strong } from '../nodes.ts'

/** Tells a reader how to read the plan and the views along its lines. Throws a RangeError where there is no plan. */
export function planCaption(audit: Audit): PhrasingContent[] {
  const layout = layPlan(audit)
  if (layout === null) throw new RangeError('the audit has no line that a plan can show')
  const line = layout.views.length > 1 ? 'each line' : 'the line'
  return phrasing([
    strong(layout.scene === null ? `Along ${line}.` : `From above, and along ${line}.`),
    layout.scene === null
      ? ' The view'
      : ' The plan is to scale, with ticks on its rim where the target stood; beside it the view',
    ` as one looks along ${line}, widths across drawn ${layout.factor} times as large as lengths along: the line black, `,
    'its whisker one standard deviation of the survey, the build tolerances held plausible a grey wedge. The target ',
    `stood at the red mark at the asserted date${independent(audit)} and stands at the broken one today`,
    hasArrows(layout) ? '; an arrow points to one beyond the view.' : '.',
  ])
}

function independent({ other_dates }: Audit): string {
  if (other_dates.length === 0) return ''
  return other_dates.length === 1
    ? ', at the hatched one at the independent date'
    : ', at the hatched ones at independent dates'
}

function hasArrows({ views, scale }: PlanLayout): boolean {
  return views.some(({ source }) =>
    source.placements.some((placement) => {
      const right = rightOfLineDeg(source, placement)
      return right !== null && isBeyondView(right * 60, scale)
    }),
  )
}
