import { describe, expect, it } from 'vitest'
import type { Audit } from '../../src/audit/audit.ts'
import { planCaption } from '../../src/report/captions/plan.ts'
import { planFigure } from '../../src/report/figures/plan-figure.ts'
import { planParts } from '../../src/report/figures/plan-parts.ts'
import { plainText } from '../../src/report/plain-text.ts'
import { FIGURES } from '../../src/report/template/figures.ts'
import {
  anglePlan,
  bareAnglePlan,
  calendarPlan,
  exactPlan,
  makePlanAudit,
  neverPlan,
  northPlan,
  onePlan,
  PLAN_CASES,
  point,
  roundPlan,
} from './figures/plan-cases.ts'

function caption(audit: Audit): string {
  return planCaption(audit).map(plainText).join('')
}

const noon = makePlanAudit({
  lines: [{ name: 'noon', azimuthDeg: 180, offsets: [1, 2, 3], measures: 'altitude' }],
})

describe('the caption of the plan', () => {
  it('says how to read it, with the magnification of the figure', () => {
    const { alt } = planFigure(onePlan())!
    const factor = /stretched (\d+) times/.exec(alt)![1]
    expect(caption(onePlan())).toBe(
      `From above, and along the line. The plan is to scale, with ticks on its rim where the target stood; beside it the surroundings of the line, stretched ${factor} times across: the line black, its whisker one standard deviation of the survey, the dark and the light grey wedge the least and the greatest plausible build tolerance. The target stood at the red mark at the asserted date, at the hatched one at the independent date and stands at the broken one today.`,
    )
  })

  it('speaks of arrows, of several lines and of a plan only where there are any', () => {
    expect(caption(northPlan())).toMatch(/; an arrow points to one beyond the view\.$/)
    expect(caption(calendarPlan())).toMatch(/^From above, and along each line\./)
    expect(caption(calendarPlan())).not.toContain('arrow')
    expect(caption(bareAnglePlan())).toMatch(/^Along the line\. The surroundings of the line, stretched/)
  })

  it('says nothing of independent dates where there are none', () => {
    const { placements, ...audit } = onePlan()
    const own = placements.filter(({ kind }) => kind !== 'independent')
    expect(caption({ ...audit, placements: own, other_dates: [] })).not.toContain('hatched')
  })

  it('says nothing of dates at which the target stood nowhere', () => {
    expect(caption(neverPlan())).toMatch(/greatest plausible build tolerance\.$/)
    expect(caption(neverPlan())).not.toMatch(/rim|target/)
    const { placements, ...audit } = onePlan()
    const nowhere = placements.map((each) =>
      each.kind === 'asserted' ? { ...each, direction_deg: null, offset_arcmin: null } : each,
    )
    expect(caption({ ...audit, placements: nowhere })).toMatch(
      / The target stood at the hatched one at the independent date and stands at the broken one today\.$/,
    )
  })

  it('explains a hollow dot, the greys and those of an angle where there are such', () => {
    const gap = (width_m: number) => {
      const { plan, ...audit } = onePlan()
      const points = plan.points.map((each) => ({ ...each, width_m, form: 'gap' as const }))
      return caption({ ...audit, plan: { ...plan, points: [plan.points[0]!, points[1]!] } })
    }
    expect(gap(0.5)).toContain(' The hollow dot is a gap.')
    // So wide a gap is drawn as its two edges.
    expect(gap(20)).not.toContain('hollow')
    expect(caption(onePlan())).not.toContain('hollow')
    expect(caption(anglePlan())).toContain('greatest plausible build tolerance (√2 times for an angle)')
    expect(caption(exactPlan())).not.toContain('grey')
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

  it('is several of four lines at most where there are many, each with the points it needs', () => {
    const figures = FIGURES.plan!(roundPlan())
    expect(figures.map(({ name }) => name)).toEqual(['plan', 'plan-2'])
    const captions = figures.map((figure) => figure.caption.map(plainText).join(''))
    expect(captions[0]).toMatch(
      /^From above, and along each line: line to north marker of the outer bank, line to east and line to south-east heel stone\./,
    )
    expect(captions[1]).toMatch(
      /^From above, and along each line: line to south-west, line to west gap and line to peak\./,
    )
    expect(figures[1]!.alt).toContain('line to west gap runs from centre stone to west gap at 273°45′')
    expect(figures[1]!.alt).not.toContain('heel stone')
  })

  it('is one of five lines', () => {
    const parts = planParts(PLAN_CASES.five!())
    expect(parts.map(({ plan }) => plan.lines.length)).toEqual([5])
  })

  it('keeps the second points of angles', () => {
    const { plan, ...audit } = anglePlan()
    const many = { ...plan, points: [point('unused', 9, 9), ...plan.points] }
    const [line] = plan.lines
    const moved = { ...line!, from: 1, to: 2, span: { ...line!.span!, to: 3 } }
    const [first] = planParts({ ...audit, plan: { ...many, lines: Array(6).fill(moved) } })
    expect(first!.plan.lines[0]).toEqual(line)
    expect(first!.plan.points).toEqual(plan.points)
  })
})
