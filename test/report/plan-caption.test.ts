import { describe, expect, it } from 'vitest'
import type { Audit } from '../../src/audit/audit.ts'
import { planCaption } from '../../src/report/captions/plan.ts'
import { planFigure } from '../../src/report/figures/plan-figure.ts'
import { plainText } from '../../src/report/plain-text.ts'
import { FIGURES } from '../../src/report/template/figures.ts'
import { bareAnglePlan, calendarPlan, makePlanAudit, northPlan, onePlan } from './figures/plan-cases.ts'

function caption(audit: Audit): string {
  return planCaption(audit).map(plainText).join('')
}

const noon = makePlanAudit({
  lines: [{ name: 'noon', azimuthDeg: 180, offsets: [1, 2, 3], measures: 'altitude' }],
})

describe('the caption of the plan', () => {
  it('says how to read it, with the magnification of the figure', () => {
    const { alt } = planFigure(onePlan())!
    const factor = /drawn (\d+) times/.exec(alt)![1]
    expect(caption(onePlan())).toBe(
      `From above, and along the line. The plan is to scale, with ticks on its rim where the target stood; beside it the view as one looks along the line, widths across drawn ${factor} times as large as lengths along: the line black, its whisker one standard deviation of the survey, the build tolerances held plausible a grey wedge. The target stood at the red mark at the asserted date, at the hatched one at the independent date and stands at the broken one today.`,
    )
  })

  it('speaks of arrows, of several lines and of a plan only where there are any', () => {
    expect(caption(northPlan())).toMatch(/; an arrow points to one beyond the view\.$/)
    expect(caption(calendarPlan())).toMatch(/^From above, and along each line\./)
    expect(caption(calendarPlan())).not.toContain('arrow')
    expect(caption(bareAnglePlan())).toMatch(/^Along the line\. The view as one looks along the line, widths/)
  })

  it('says nothing of independent dates where there are none', () => {
    const { placements, ...audit } = onePlan()
    const own = placements.filter(({ kind }) => kind !== 'independent')
    expect(caption({ ...audit, placements: own, other_dates: [] })).not.toContain('hatched')
  })

  it('is refused where there is no plan', () => {
    expect(() => planCaption(noon)).toThrow(RangeError)
  })
})

describe('the figure `plan` of a template', () => {
  it('is one figure, or none where no line has a place on a plan', () => {
    expect(FIGURES.plan!(onePlan()).map(({ name }) => name)).toEqual(['plan'])
    expect(FIGURES.plan!(noon)).toEqual([])
  })
})
