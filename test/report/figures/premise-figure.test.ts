import type { Element } from 'hast'
import { describe, expect, it } from 'vitest'
import type { Audit } from '../../../src/audit/audit.ts'
import { PALETTE } from '../../../src/report/figures/palette.ts'
import { premiseFigure } from '../../../src/report/figures/premise-figure.ts'
import {
  CASES,
  carriedAudit,
  missedAudit,
  narrowAudit,
  noneAudit,
  partsAudit,
  premiseAudit,
  severalAudit,
} from './cases.ts'
import { makeShapedAudit, type Sets, stepAt } from './make-audit.ts'
import { isInside, linesOf, polygonsOf, shapesOf, textOf, textsOf } from './read-drawing.ts'

/** A figure's two scales, found from the ticks it prints. */
function scalesFromTicks(drawing: Element, audit: Audit) {
  const tick = (label: string) => {
    const { box, y } = textOf(drawing, label)
    const ends = linesOf(drawing).filter(
      ({ x1, x2, y1, y2 }) => y1 === y2 && x2 - x1 === 4 && Math.abs(y1 - y) < 4 && x1 > box.left,
    )
    return ends[0]!.y1
  }
  const years = textsOf(drawing).filter(
    ({ content, anchor }) => anchor === 'end' && /^[\d,]+ B?CE$/.test(content),
  )
  const [first, last] = [years[0]!.content, years.at(-1)!.content]
  const yearOf = (label: string) => {
    const count = Number(label.replace(/\D/g, ''))
    return label.endsWith('BCE') ? 1 - count : count
  }
  const perYear = (tick(last) - tick(first)) / (yearOf(last) - yearOf(first))
  const [x1, x60] = [textOf(drawing, '1′').x, textOf(drawing, '1°').x]
  return {
    y: (year: number) => tick(first) + (year - yearOf(first)) * perYear,
    x: (arcmin: number) => x1 + ((x60 - x1) * Math.log(arcmin)) / Math.log(60),
    strip: textOf(drawing, 'exact').x,
    window: audit.sweep.window,
  }
}

const NAMES = ['premise', 'carried', 'missed', 'none', 'several', 'parts'] as const

describe.each(NAMES)('the sets of the case `%s`', (name) => {
  const audit = CASES[name]!()
  const { drawing } = premiseFigure(audit)
  const scales = scalesFromTicks(drawing, audit)
  const pathOf = (fill: string) =>
    polygonsOf(String(shapesOf(drawing, 'path').find((path) => path.properties.fill === fill)!.properties.d))

  it.each([
    ['95 %', PALETTE.set95, (step: Audit['sweep']['steps'][number]) => step.sets95],
    ['68 %', PALETTE.set68, (step: Audit['sweep']['steps'][number]) => step.sets68],
  ] as const)('have every interval of the %s set at its place', (_, fill, setsOf) => {
    const corners = pathOf(fill).flat()
    const isCorner = (x: number, y: number) =>
      corners.some(([cx, cy]) => Math.abs(cx - x) < 0.03 && Math.abs(cy - y) < 0.03)
    for (const step of audit.sweep.steps.filter(({ tolerance_arcmin }) => tolerance_arcmin > 0)) {
      const x = scales.x(step.tolerance_arcmin)
      for (const [from, to] of setsOf(step)) {
        const [bottom, top] = [scales.y(from), scales.y(to)]
        // An interval thinner than 1.2 points is drawn that thick about its middle.
        const lack = Math.max(0, 1.2 - (bottom - top)) / 2
        expect(isCorner(x, bottom + lack), `${step.tolerance_arcmin}′ from ${from}`).toBe(true)
        expect(isCorner(x, top - lack), `${step.tolerance_arcmin}′ to ${to}`).toBe(true)
      }
    }
  })

  it('cover no year that the sets leave out', () => {
    const polygons = pathOf(PALETTE.set95)
    const inner = audit.sweep.steps.filter(
      (step) => step.tolerance_arcmin > 0.5 && step.tolerance_arcmin < 299,
    )
    const wrong: string[] = []
    for (const step of inner.filter((_, index) => index % 3 === 0)) {
      for (let year = scales.window.from + 137; year < scales.window.to; year += 600) {
        const y = scales.y(year)
        const nearest = Math.min(...step.sets95.flat().map((edge) => Math.abs(scales.y(edge) - y)))
        if (nearest < 2) continue
        const isInSet = step.sets95.some(([from, to]) => from < year && year < to)
        const isDrawn = isInside(polygons, scales.x(step.tolerance_arcmin) + 0.01, y)
        if (isDrawn !== isInSet) wrong.push(`${step.tolerance_arcmin}′, ${year}`)
      }
    }
    expect(wrong).toEqual([])
  })

  it('have the intervals for exact building in the strip', () => {
    const step = audit.sweep.steps[0]!
    const rects = shapesOf(drawing, 'rect').map(({ properties }) => properties)
    for (const [fill, sets] of [
      [PALETTE.set95, step.sets95],
      [PALETTE.set68, step.sets68],
    ] as const) {
      const drawn = rects.filter((rect) => rect.fill === fill)
      expect(drawn.length).toBe(sets.length)
      for (const [from, to] of sets) {
        const middle = (scales.y(from) + scales.y(to)) / 2
        const rect = drawn.find(({ y, height }) => Math.abs(Number(y) + Number(height) / 2 - middle) < 0.02)!
        expect(rect.height).toBeCloseTo(Math.max(1.2, scales.y(from) - scales.y(to)), 1)
        expect(Number(rect.x) < scales.strip && scales.strip < Number(rect.x) + Number(rect.width)).toBe(true)
      }
    }
  })

  it('have the asserted and the independent dates across the whole plot', () => {
    const dates = [audit.asserted, ...audit.other_dates]
    for (const { from, to } of dates) {
      const edges = linesOf(drawing).filter(({ x1, x2, y1, y2 }) => y1 === y2 && x2 - x1 > 280)
      const lack = Math.max(0, 1.6 - (scales.y(from) - scales.y(to))) / 2
      expect(edges.some(({ y1 }) => Math.abs(y1 - scales.y(from) - lack) < 0.02)).toBe(true)
      expect(edges.some(({ y1 }) => Math.abs(y1 - scales.y(to) + lack) < 0.02)).toBe(true)
    }
  })
})

describe('the marks across the tolerances', () => {
  /** The upright lines through the plot from its top, by their place. */
  function uprights(drawing: Element): number[] {
    return linesOf(drawing)
      .filter(({ x1, x2, y1, y2 }) => x1 === x2 && y2 - y1 > 120)
      .map(({ x1 }) => x1)
  }

  it('stand at the three limits, at the ends of the plausible range, and frame what the claim assumes', () => {
    const audit = premiseAudit()
    const { drawing } = premiseFigure(audit)
    const { x, strip } = scalesFromTicks(drawing, audit)
    for (const arcmin of [23.2, 23.3, 25.8, 10, 60]) {
      expect(
        uprights(drawing).some((place) => Math.abs(place - x(arcmin)) < 0.02),
        `${arcmin}′`,
      ).toBe(true)
    }
    textOf(drawing, '3 to 1 over radiocarbon up to 23′')
    textOf(drawing, 'radiocarbon in the 95 % set from 23′')
    textOf(drawing, 'line tells under ½ bit from 26′')
    textOf(drawing, 'plausible: 10′ to 1° (stated)')
    textOf(drawing, 'the claim assumes exact building')
    const frame = shapesOf(drawing, 'rect').find(({ properties }) => properties.stroke === PALETTE.accent)!
    expect(Number(frame.properties.x) + Number(frame.properties.width) / 2).toBeCloseTo(strip, 1)
  })

  it('stand at the precision that the claim assumes, where it is not exact', () => {
    const audit = carriedAudit()
    const { drawing } = premiseFigure(audit)
    const { x } = scalesFromTicks(drawing, audit)
    expect(uprights(drawing).some((place) => Math.abs(place - x(3)) < 0.02)).toBe(true)
    expect(
      shapesOf(drawing, 'rect').filter(({ properties }) => properties.stroke === PALETTE.accent),
    ).toEqual([])
  })

  it('leave out what is null, and say where the plausible range is a default', () => {
    const contents = textsOf(premiseFigure(missedAudit()).drawing).map(({ content }) => content)
    expect(contents.filter((content) => /3 to 1|95 % set from|claim assumes/.test(content))).toEqual([])
    expect(contents).toContain('plausible: 10′ to 1° (default)')
  })

  it('name the 3-to-1 limit alone of each of several independent dates', () => {
    const contents = textsOf(premiseFigure(severalAudit()).drawing).map(({ content }) => content)
    expect(contents.filter((content) => content.startsWith('3 to 1 over')).length).toBe(4)
    expect(contents.filter((content) => content.includes('95 % set from'))).toEqual([])
    expect(contents.filter((content) => content.includes('½ bit')).length).toBe(1)
  })

  it('say so where a limit lies at exact building', () => {
    const limit = { against: 'pottery', ratio_3_arcmin: 0, other_date_in_95_arcmin: 0, half_bit_arcmin: 0 }
    const audit = makeShapedAudit({ others: [['pottery', -800, -500]], limits: [limit] })
    const contents = textsOf(premiseFigure(audit).drawing).map(({ content }) => content)
    expect(contents).toContain('3 to 1 over pottery only if exact')
    expect(contents).toContain('pottery in the 95 % set throughout')
    expect(contents).toContain('line tells under ½ bit throughout')
  })

  it('bracket a plausible range that begins at exact from the strip on', () => {
    const { drawing } = premiseFigure(partsAudit())
    const label = textOf(drawing, 'plausible: exact to 5° (stated)')
    expect(label.anchor).toBe('middle')
  })
})

describe('the second and third scale', () => {
  it('give the same tolerances in centimetres and in widths of the Sun', () => {
    const audit = premiseAudit()
    const { drawing } = premiseFigure(audit)
    const { x } = scalesFromTicks(drawing, audit)
    // 10 cm at 100 m is 3.44′ (small angles: 3437.75′ to the radian); one of the fixture's Suns is 32.4′ wide.
    expect(textOf(drawing, '10 cm').x).toBeCloseTo(x(3.43775), 1)
    const inWidths = textsOf(drawing).filter(
      ({ content, y }) => content === '1' && y > textOf(drawing, '10 cm').y,
    )
    expect(inWidths[0]!.x).toBeCloseTo(x(32.4), 1)
    textOf(drawing, 'at the marker')
    textOf(premiseFigure(missedAudit()).drawing, 'at 100 m')
  })
})

describe('the figure where nothing fits', () => {
  it('says so in the picture and hatches the years out of reach', () => {
    const audit = noneAudit()
    const { drawing, alt } = premiseFigure(audit)
    const { y } = scalesFromTicks(drawing, audit)
    textOf(drawing, 'No date in reach fits this line: the sets only weigh misses against each other.')
    textOf(drawing, 'target out of reach')
    const hatching = shapesOf(drawing, 'path').find(({ properties }) => properties.stroke === PALETTE.rule)!
    const heights = polygonsOf(String(hatching.properties.d))
      .flat()
      .map(([, height]) => height)
    expect(Math.max(...heights)).toBeCloseTo(y(-1000), 1)
    expect(Math.min(...heights)).toBeCloseTo(y(2026), 1)
    expect(alt).toContain('No date in reach fits the line')
  })
})

describe('the alternative text', () => {
  it('tells the sets, the dates and the limit in figures', () => {
    const { alt, drawing } = premiseFigure(premiseAudit())
    expect(alt).toContain('10,460 to 7840 BCE and 7060 to 4350 BCE')
    expect(alt).toContain('at 10′ 11,880 to 2800 BCE')
    expect(alt).toContain('it beats radiocarbon (801 to 501 BCE) by 3 to 1 up to 23′')
    const [title, desc] = drawing.children as Element[]
    expect([title!.tagName, desc!.tagName]).toEqual(['title', 'desc'])
    expect(desc!.children).toEqual([{ type: 'text', value: alt }])
  })
})

describe('dates and sets that fill little of the window', () => {
  const audit = narrowAudit()
  const { drawing, alt } = premiseFigure(audit)

  it('are shown with the part of the window about them', () => {
    const { y } = scalesFromTicks(drawing, audit)
    // The earliest and the latest of the dates and of the sets at 15′ and less: 102 years about 2492 and 2440 BCE.
    const [low, high] = [-2593, -2337]
    const frame = linesOf(drawing).find(({ x1, x2 }) => x1 === 52 && x2 === 52)!
    expect(frame.y1).toBeLessThan(y(high))
    expect(frame.y2).toBeGreaterThan(y(low))
    expect(y(low) - y(high)).toBeGreaterThan((frame.y2 - frame.y1) / 2)
    textOf(drawing, 'the window goes on')
    textOf(drawing, 'in 20,001 BCE')
    expect(alt).toContain('Of the window, 2670 to 2260 BCE is drawn.')
  })

  it('have nothing drawn beyond the plot', () => {
    const frame = linesOf(drawing).find(({ x1, x2 }) => x1 === 52 && x2 === 52)!
    const heights = shapesOf(drawing, 'path')
      .filter(({ properties }) => [PALETTE.set95, PALETTE.set68].includes(String(properties.fill) as never))
      .flatMap(({ properties }) => polygonsOf(String(properties.d)).flat())
      .map(([, y]) => y)
    expect(Math.min(...heights)).toBeGreaterThanOrEqual(frame.y1 - 0.01)
    expect(Math.max(...heights)).toBeLessThanOrEqual(frame.y2 + 0.01)
    for (const { y1, y2 } of linesOf(drawing).filter(({ x1 }) => x1 === 52)) {
      expect(Math.max(y1, y2)).toBeLessThanOrEqual(frame.y2 + 0.01)
    }
  })

  it('fill the whole window where a plausible tolerance lets them', () => {
    const wide = premiseFigure({ ...audit, plausible: { ...audit.plausible, high_arcmin: 120 } }).drawing
    textOf(wide, 'window from 20,001 BCE')
  })
})

describe('hard cases', () => {
  it('draws a set of one year thick enough to be seen', () => {
    const one: Sets = [[-5000, -5000]]
    const audit = makeShapedAudit({
      steps: [stepAt(0, one), stepAt(1, one), stepAt(60, one), stepAt(300, one)],
    })
    const rects = shapesOf(premiseFigure(audit).drawing, 'rect').filter(
      ({ properties }) => properties.fill === PALETTE.set95,
    )
    expect(rects.map(({ properties }) => properties.height)).toEqual([1.2])
  })

  it('grows with the labels of a dozen independent dates', () => {
    const others = Array.from(
      { length: 12 },
      (_, index) => [`sample ${index + 1}`, -800 + index, -500 + index] as const,
    )
    const { drawing } = premiseFigure(makeShapedAudit({ others }))
    expect(Number(drawing.properties.height)).toBeGreaterThan(300)
    expect(textsOf(drawing).filter(({ content }) => content.startsWith('sample')).length).toBe(12)
  })

  it('does without steps, and without a step at exact', () => {
    expect(() => premiseFigure(makeShapedAudit({ steps: [] }))).not.toThrow()
    expect(() => premiseFigure(makeShapedAudit({ steps: [stepAt(7, [[-100, 100]])] }))).not.toThrow()
  })
})
