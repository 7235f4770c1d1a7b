import type { Element } from 'hast'
import { describe, expect, it } from 'vitest'
import type { Audit } from '../../../src/audit/audit.ts'
import { PALETTE } from '../../../src/report/figures/palette.ts'
import { planFigure } from '../../../src/report/figures/plan-figure.ts'
import { writeSvg } from '../../../src/report/write-svg.ts'
import { differsFromGolden } from './golden.ts'
import {
  anglePlan,
  axisPlan,
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
  untoldPlan,
} from './plan-cases.ts'
import {
  badNumbers,
  type DrawnLine,
  linesOf,
  overlappingTexts,
  polygonsOf,
  shapesOf,
  textOf,
  textsOf,
  textsOutside,
} from './read-drawing.ts'

const DEG = Math.PI / 180
/** The views along the lines begin here, points from the left. */
const VIEWS = 198

function drawingOf(audit: Audit): Element {
  return planFigure(audit)!.drawing
}

/** The rim of the plan. */
function rimOf(drawing: Element) {
  const { cx, cy, r } = shapesOf(drawing, 'circle').find(
    ({ properties }) => Number(properties.r) > 50,
  )!.properties
  return { x: Number(cx), y: Number(cy), r: Number(r) }
}

function strokes(drawing: Element, colour: string, width: number): DrawnLine[] {
  return linesOf(drawing).filter(
    ({ element: { properties } }) => properties.stroke === colour && Number(properties.strokeWidth) === width,
  )
}

/** Azimuth of a stroke from its first end to its second. */
function azimuthOf({ x1, y1, x2, y2 }: DrawnLine): number {
  return (Math.atan2(x2 - x1, y1 - y2) / DEG + 360) % 360
}

function lengthOf({ x1, y1, x2, y2 }: DrawnLine): number {
  return Math.hypot(x2 - x1, y2 - y1)
}

/** How many times wider than deep, as the figure itself says. */
function factorOf(drawing: Element): number {
  const words = textsOf(drawing).find(({ content }) => content.startsWith('along'))!.content
  return Number(/drawn (\d+) times as wide/.exec(words)![1])
}

/** The sights from the eye of a view to its board: slope across per slope along, true to scale. */
function sightSlopes(drawing: Element, colour: string, width: number): number[] {
  return strokes(drawing, colour, width)
    .filter(({ x1, x2, y1, y2 }) => Math.min(x1, x2) >= VIEWS && x1 !== x2 && y1 - y2 > 5)
    .map(({ x1, x2, y1, y2 }) => (x2 - x1) / (y1 - y2) / factorOf(drawing))
}

describe.each(Object.entries(PLAN_CASES))('the plan `%s`', (name, makeCase) => {
  const drawing = drawingOf(makeCase())

  it('is drawn as it was', () => {
    expect(differsFromGolden(`${name}-plan.svg`, writeSvg(drawing))).toBeNull()
  })

  it('prints no text over another, none beyond the edges, none too small, and has numbers everywhere', () => {
    expect(overlappingTexts(drawing)).toEqual([])
    expect(textsOutside(drawing)).toEqual([])
    expect(Math.min(...textsOf(drawing).map(({ size }) => size))).toBeGreaterThanOrEqual(7)
    expect(badNumbers(drawing)).toEqual([])
  })

  it('is 440 points wide, and no higher than its lines need', () => {
    expect(drawing.properties.width).toBe(440)
    const lines = makeCase().plan.lines.length
    expect(Number(drawing.properties.height)).toBeLessThanOrEqual(lines <= 2 ? 300 : 330 + 30 * (lines - 3))
  })

  it('uses paths of straight strokes only', () => {
    for (const { properties } of shapesOf(drawing, 'path'))
      expect(properties.d).toMatch(/^(?:[MLZ][-\d., ]*)+$/)
  })

  it('lets no stroke of a line run through a name', () => {
    const rays = [0.6, 0.9, 1.1].flatMap((width) => strokes(drawing, PALETTE.ink, width))
    const plan = rays.filter(({ x1, x2 }) => Math.max(x1, x2) < VIEWS)
    const names = textsOf(drawing).filter(({ box }) => box.right < VIEWS)
    const struck = names.filter(({ box }) =>
      plan.some(({ x1, y1, x2, y2 }) =>
        Array.from({ length: 201 }, (_, i) => i / 200).some((share) => {
          const [x, y] = [x1 + (x2 - x1) * share, y1 + (y2 - y1) * share]
          return x > box.left && x < box.right && y > box.top && y < box.bottom
        }),
      ),
    )
    expect(struck.map(({ content }) => content)).toEqual([])
  })
})

describe('the plan to scale', () => {
  const drawing = drawingOf(onePlan())

  it('has its points as far apart as its bar says', () => {
    const [sight] = strokes(drawing, PALETTE.ink, 1.1)
    const bar = textOf(drawing, '50 m')
    const rule = linesOf(drawing).find(
      ({ x1, x2, y1, y2 }) => y1 === y2 && x1 === 2 && x2 < bar.x && y1 > 200,
    )!
    // The points are 99.92 m apart; coordinates are rounded to 0.01 points.
    expect((lengthOf(sight!) / lengthOf(rule)) * 50).toBeCloseTo(99.92, 1)
  })

  it('has north up, and the line from its backsight through its foresight to the rim', () => {
    const [sight] = strokes(drawing, PALETTE.ink, 1.1)
    const beyond = strokes(drawing, PALETTE.ink, 0.6).find(
      ({ x1, x2 }) => x1 === sight!.x1 && x2 > sight!.x2,
    )!
    for (const stroke of [sight!, beyond]) expect(azimuthOf(stroke)).toBeCloseTo(57.905, 1)
    const rim = rimOf(drawing)
    expect(Math.hypot(beyond.x2 - rim.x, beyond.y2 - rim.y)).toBeCloseTo(rim.r, 1)
    textOf(drawing, 'N')
  })

  it('lays the greatest plausible tolerance, 1°, to either side of the line', () => {
    const [sight] = strokes(drawing, PALETTE.ink, 1.1)
    const wedge = shapesOf(drawing, 'path').find(
      ({ properties }) => properties.fill === PALETTE.outside && Number(properties.strokeWidth) === 0.3,
    )!
    const [corners] = polygonsOf(String(wedge.properties.d))
    const azimuths = corners!.slice(0, -1).map(([x2, y2]) => azimuthOf({ ...sight!, x2, y2 }))
    expect(Math.min(...azimuths)).toBeCloseTo(57.905 - 1, 1)
    expect(Math.max(...azimuths)).toBeCloseTo(57.905 + 1, 1)
  })

  it('marks on the rim where the target stood: to the right of a line that is left of it', () => {
    const rim = rimOf(drawing)
    const { x1, y1 } = strokes(drawing, PALETTE.ink, 1.1)[0]!
    const today = linesOf(drawing).find(
      ({ element, ...at }) => element.properties.strokeDasharray === '1.6 1.2' && at.x1 < VIEWS,
    )!
    expect(Math.hypot(today.x1 - rim.x, today.y1 - rim.y)).toBeCloseTo(rim.r, 1)
    // 65.4′ clockwise of the line; 0.01 points are 0.005° there.
    expect(azimuthOf({ ...today, x1, y1, x2: today.x1, y2: today.y1 }) - 57.905).toBeCloseTo(65.4 / 60, 1)
  })

  it('says how well north is known, where a plan says so', () => {
    textOf(drawingOf(calendarPlan()), 'true north ± 30′')
    expect(textsOf(drawing).filter(({ content }) => /north/.test(content)).length).toBe(1)
    textOf(drawing, 'true north')
  })

  it('does not claim true north where nothing tells of it', () => {
    const unknown = { ...calendarPlan().plan, north: { words: 'unknown', sd_deg: 2 } }
    const found = [untoldPlan(), anglePlan(), { ...calendarPlan(), plan: unknown }].map((audit) => {
      const { drawing, alt } = planFigure(audit)!
      expect(alt).toContain('The survey from above, north up as the plan has it')
      expect(textsOf(drawing).filter(({ content }) => content.includes('true')).length).toBe(0)
      return textsOf(drawing).find(({ content }) => content.startsWith('as the plan has it'))?.content
    })
    expect(found).toEqual(['as the plan has it', 'as the plan has it', 'as the plan has it ± 2°'])
  })

  it('has no bar of metres for bare azimuths', () => {
    const texts = textsOf(drawingOf(northPlan())).filter(({ x }) => x < VIEWS)
    expect(texts.some(({ content }) => / k?m$/.test(content))).toBe(false)
  })
})

describe('a far foresight', () => {
  it('is left out of the scale, with an arrow and its distance', () => {
    const drawing = drawingOf(roundPlan())
    // √(5000² + 6000²) m = 7810 m.
    textOf(drawing, 'to peak 7.8 km')
    textOf(drawing, '50 m')
    expect(textsOf(drawing).map(({ content }) => content)).not.toContain('peak')
  })

  it('is drawn to scale where there is nothing nearer', () => {
    const audit = makePlanAudit({
      points: [point('door', 0, 0), point('peak', 5000, 6000)],
      lines: [{ name: 'x', azimuthDeg: 39.806, from: 0, to: 1, lengthM: 7810, offsets: [1, 2, 3] }],
    })
    textOf(drawingOf(audit), 'peak')
    textOf(drawingOf(audit), '5 km')
  })
})

describe('posts, gaps and uncertain points', () => {
  const drawing = drawingOf(roundPlan())

  it('draws a gap as wide as it is, across its line', () => {
    const [a, b] = strokes(drawing, PALETTE.ink, 1.6)
    const bar = textOf(drawing, '50 m')
    const rule = linesOf(drawing).find(
      ({ x1, x2, y1, y2 }) => y1 === y2 && x1 === 2 && x2 < bar.x && y1 < bar.y,
    )!
    const middle = (stroke: DrawnLine) => [(stroke.x1 + stroke.x2) / 2, (stroke.y1 + stroke.y2) / 2] as const
    const [[ax, ay], [bx, by]] = [middle(a!), middle(b!)]
    const metres = (Math.hypot(ax - bx, ay - by) / lengthOf(rule)) * 50
    expect(Math.abs(metres - 6)).toBeLessThan(0.02)
    // Across the line at 273.75°.
    expect(azimuthOf({ ...a!, x1: ax, y1: ay, x2: bx, y2: by }) % 180).toBeCloseTo(3.75, 0)
  })

  it('draws one standard deviation about a point where it shows', () => {
    const dashed = shapesOf(drawing, 'circle').filter(
      ({ properties }) => properties.strokeDasharray === '1.5 1',
    )
    expect(dashed.length).toBe(1)
  })
})

describe('the view along a line', () => {
  const audit = onePlan()
  const drawing = drawingOf(audit)

  it('is magnified across by what it says', () => {
    const [asserted] = sightSlopes(drawing, PALETTE.accent, 1.3)
    const [radiocarbon] = sightSlopes(drawing, PALETTE.ink, 0.7)
    // Offsets of the fixture: 1.8′ and 36.5′, to the right; 0.01 points across are 0.006′.
    expect(Math.abs(Math.atan(asserted!) / DEG - 1.8 / 60) * 60).toBeLessThan(0.02)
    expect(Math.abs(Math.atan(radiocarbon!) / DEG - 36.5 / 60) * 60).toBeLessThan(0.02)
  })

  it('has the wedges of both plausible tolerances', () => {
    const halves = [PALETTE.outside, PALETTE.set95].map((fill) => {
      const path = shapesOf(drawing, 'path').find(
        ({ properties }) => properties.fill === fill && Number(properties.strokeWidth) === 0.4,
      )!
      const [[eye, left]] = polygonsOf(String(path.properties.d)) as [[[number, number], [number, number]]]
      return Math.atan((eye[0] - left[0]) / (eye[1] - left[1]) / factorOf(drawing)) / DEG
    })
    expect(Math.abs(halves[0]! - 1) * 60).toBeLessThan(0.05)
    expect(Math.abs(halves[1]! - 10 / 60) * 60).toBeLessThan(0.02)
  })

  it('labels each date with how far off its target stood, as an angle and at the marker', () => {
    // 99.92 m: 1.8′ spans 5.23 cm, 36.5′ 106 cm, 65.4′ 190 cm.
    for (const words of [
      '1.8′ ± 2.5′ right, 5.2 cm',
      '37′ ± 2.5′ right, 1.1 m',
      '1°05′ ± 2.5′ right, 1.9 m',
      'asserted: 9701 to 9501 BCE',
    ])
      textOf(drawing, words)
  })

  it('has scales of arcminutes, of lengths and of the Sun that agree', () => {
    const bar = (words: string) => {
      const { x, y } = textOf(drawing, words)
      return lengthOf(
        linesOf(drawing).find((l) => l.y1 === l.y2 && l.x1 === VIEWS && l.x2 < x && Math.abs(l.y1 - y) < 4)!,
      )
    }
    const perArcmin = bar('20′, one tick') / 20
    // The fixture's sweep takes 32.4′ for the Sun's width; 50 cm at 99.92 m are 17.20′.
    expect(bar('the Sun, 32′ wide') / perArcmin).toBeCloseTo(32.4, 1)
    expect(bar('50 cm at the marker, 100 m off') / perArcmin).toBeCloseTo(17.2, 1)
  })

  it('has no bar of lengths where the markers are not equally far off, and says the sides', () => {
    // 51.02, 51.50 and 51.91 m.
    const texts = textsOf(drawingOf(calendarPlan())).map(({ content }) => content)
    expect(texts.filter((content) => / (?:at 100 m|at the marker)/.test(content))).toEqual([])
    expect(texts).toContain('asserted 2.4′ right, 3.6 cm')
    expect(texts).toContain('20′, one tick')
  })

  it('has a bar of the Sun as long as it fits, with its words in a gap, and says where it does not', () => {
    const plausible = { low_arcmin: 2, high_arcmin: 10, stated: true }
    const line = { name: 'x', azimuthDeg: 90, lengthM: 50 }
    const wide = drawingOf(makePlanAudit({ plausible, lines: [{ ...line, offsets: [1, 9, -25] }] }))
    const { y, x, anchor } = textOf(wide, 'the Sun, 32′ wide')
    const row = linesOf(wide).filter((l) => l.y1 === l.y2 && l.x1 >= VIEWS && Math.abs(l.y1 - y) < 4)
    const tick = textOf(wide, '5′, one tick')
    const perArcmin =
      lengthOf(linesOf(wide).find((l) => l.y1 === l.y2 && l.x1 === VIEWS && Math.abs(l.y1 - tick.y) < 4)!) / 5
    const [start, end] = [Math.min(...row.map(({ x1 }) => x1)), Math.max(...row.map(({ x2 }) => x2))]
    // The fixture's sweep takes 32.4′ for the Sun's width.
    expect((end - start) / perArcmin).toBeCloseTo(32.4, 1)
    expect([anchor, row.length]).toEqual(['middle', 2])
    expect(x).toBeCloseTo((start + end) / 2, 1)
    textOf(drawingOf(exactPlan()), 'the Sun, 32′ wide, is wider than this view')
  })

  it('points an arrow to a target that is degrees off', () => {
    const away = drawingOf(northPlan())
    textOf(away, '7°20′ ± 2.5′ left, 13 m')
    const arrows = shapesOf(away, 'path').filter(({ properties }) => properties.fill === PALETTE.accent)
    expect(arrows.length).toBe(1)
    expect(sightSlopes(away, PALETTE.accent, 1.3).length).toBe(1)
  })

  it('says at which dates the target stood nowhere', () => {
    textOf(drawingOf(northPlan()), 'today: no June solstice sunrise at that altitude')
    textOf(drawingOf(neverPlan()), 'no June solstice sunrise at that altitude at any of these dates')
  })

  it('carries a date across north', () => {
    const [asserted] = sightSlopes(drawingOf(northPlan()), PALETTE.accent, 1.3)
    expect(Math.abs(Math.atan(asserted!) / DEG - 12 / 60) * 60).toBeLessThan(0.05)
  })

  it('says on the line, and exact, where that is so', () => {
    const exact = drawingOf(exactPlan())
    expect(textsOf(exact).filter(({ content }) => content === 'on the line').length).toBe(3)
    textOf(exact, 'plausible tolerance: exact (default)')
  })

  it('keeps the measured error in view', () => {
    for (const { x1, x2 } of linesOf(drawingOf(axisPlan()))) {
      expect(Math.min(x1, x2)).toBeGreaterThanOrEqual(0)
      expect(Math.max(x1, x2)).toBeLessThanOrEqual(440)
    }
  })
})

describe('an angle between two lines', () => {
  it('has its wedge on the second line and its marks by the angle', () => {
    const drawing = drawingOf(anglePlan())
    textOf(drawing, '53°08′')
    textOf(drawing, '69°36′ from it')
    textOf(drawing, '6′ ± 2.5′ wider')
    // A wider angle lies to the right where the angle opens clockwise.
    expect(sightSlopes(drawing, PALETTE.accent, 1.3)[0]).toBeGreaterThan(0)
  })

  it('opens to the left where it runs the other way, and has no plan without a direction', () => {
    const drawing = drawingOf(bareAnglePlan())
    textOf(drawing, '6′ ± 2.5′ wider')
    const accent = strokes(drawing, PALETTE.accent, 1.3).find(({ x1, x2 }) => x1 !== x2)!
    expect(accent.x2).toBeLessThan(accent.x1)
    expect(textsOf(drawing).map(({ content }) => content)).not.toContain('N')
  })
})

describe('a line with no place on a plan', () => {
  const noon = makePlanAudit({
    lines: [{ name: 'noon', azimuthDeg: 180, offsets: [1, 2, 3], measures: 'altitude' }],
  })

  it('is left out', () => {
    expect(planFigure(noon)).toBeNull()
    const one = onePlan()
    const both = {
      ...one,
      sightlines: [...noon.sightlines, ...one.sightlines],
      plan: { ...one.plan, lines: [...noon.plan.lines, ...one.plan.lines] },
      placements: [...noon.placements, ...one.placements],
    }
    expect(planFigure(both)).toEqual(planFigure(one))
  })
})

describe('the words for who cannot see the plan', () => {
  it('name points, line, tolerances, and where the target stood', () => {
    expect(planFigure(onePlan())!.alt).toBe(
      'The survey from above, true north up: hearthstone and east-pillar. Beside it the surroundings of the line, stretched 50 times across, with wedges of 10′ and 1°, the build tolerances held plausible. midsummer runs from hearthstone to east-pillar at 57°54′ ± 2′, 100 m long. Against it the June solstice sunrise stood: asserted date, 9701 to 9501 BCE, 1.8′ ± 2.5′ right, 5.2 cm; radiocarbon, 801 to 501 BCE, 37′ ± 2.5′ right, 1.1 m; today, 2026 CE, 1°05′ ± 2.5′ right, 1.9 m.',
    )
  })

  it('name an angle and a target that is not seen', () => {
    expect(planFigure(anglePlan())!.alt).toContain(
      'span is the angle of 69°36′ ± 2′ between the line from stone to June peg at 53°08′ and a second one to December peg.',
    )
    expect(planFigure(neverPlan())!.alt).toContain(
      'asserted date, 9701 to 9501 BCE, no June solstice sunrise at that altitude;',
    )
    expect(planFigure(exactPlan())!.alt).toContain('with wedges of no build tolerance.')
  })
})
