import type { Element } from 'hast'
import { describe, expect, it } from 'vitest'
import { PALETTE } from '../../../src/report/figures/palette.ts'
import { trackFigure } from '../../../src/report/figures/track-figure.ts'
import { missedAudit, noneAudit, partsAudit, premiseAudit } from './cases.ts'
import { impliedOf, makeShapedAudit, trackOf } from './make-audit.ts'
import { linesOf, polygonsOf, shapesOf, textOf, textsOf } from './read-drawing.ts'

/** A figure's two scales, found from the ticks it prints. */
function scalesFromTicks(drawing: Element) {
  const ticks = textsOf(drawing).filter(({ content, anchor }) => anchor === 'end' && /^\d+°/.test(content))
  const height = (text: (typeof ticks)[number]) =>
    linesOf(drawing).find(({ x1, x2, y1, y2 }) => y1 === y2 && x2 - x1 === 4 && Math.abs(y1 - text.y) < 4)!.y1
  const degrees = (content: string) => {
    const [whole, minutes] = content.split('°')
    return Number(whole) + Number((minutes ?? '0').replace('′', '')) / 60
  }
  const [low, high] = [ticks[0]!, ticks.at(-1)!]
  const perDegree = (height(high) - height(low)) / (degrees(high.content) - degrees(low.content))
  const [x1, x2] = [textOf(drawing, '10,000 BCE').x, textOf(drawing, '1 CE').x]
  return {
    y: (deg: number) => height(low) + (deg - degrees(low.content)) * perDegree,
    x: (year: number) => x1 + ((year + 9999) * (x2 - x1)) / 10_000,
    perDegree: -perDegree,
  }
}

function circles(drawing: Element): { cx: number; cy: number; fill: unknown; r: number }[] {
  return shapesOf(drawing, 'circle').map(({ properties }) => ({
    cx: Number(properties.cx),
    cy: Number(properties.cy),
    r: Number(properties.r),
    fill: properties.fill,
  }))
}

describe('trackFigure', () => {
  const audit = premiseAudit()
  const { drawing, alt } = trackFigure(audit, 'midsummer')
  const scales = scalesFromTicks(drawing)

  it('draws the track through its azimuths', () => {
    const track = shapesOf(drawing, 'path').find(({ properties }) => Number(properties.strokeWidth) === 1.4)!
    const points = polygonsOf(String(track.properties.d)).flat()
    expect(points.length).toBeGreaterThan(200)
    // The fixture's own wave.
    const azimuth = (year: number) => 59.3 - 1.45 * Math.cos(((year + 7390) / 41_000) * 2 * Math.PI)
    for (const [x, y] of points) {
      const year = -9999 + ((x - scales.x(-9999)) / (scales.x(1) - scales.x(-9999))) * 10_000
      expect(Math.abs(y - scales.y(azimuth(year)))).toBeLessThan(0.06)
    }
  })

  it('marks every crossing where the track meets the line, with its date', () => {
    const marks = circles(drawing).filter(({ r }) => r === 2.6)
    const dates = audit.implied[0]!.dates
    expect(marks.length).toBe(dates.length)
    for (const { year } of dates) {
      expect(
        marks.some(
          ({ cx, cy }) => Math.abs(cx - scales.x(year)) < 0.03 && Math.abs(cy - scales.y(57.9077)) < 0.03,
        ),
      ).toBe(true)
    }
    textOf(drawing, '9240 BCE')
    textOf(drawing, '5540 BCE')
    expect(alt).toContain('They meet in 9240 BCE and 5540 BCE')
  })

  it('draws the measured band one and two standard deviations wide', () => {
    const bandOf = (fill: string) =>
      shapesOf(drawing, 'rect').find(({ properties }) => properties.fill === fill)!.properties
    for (const [fill, times] of [
      [PALETTE.set68, 1],
      [PALETTE.set95, 2],
    ] as const) {
      expect(Number(bandOf(fill).y)).toBeCloseTo(scales.y(57.9077 + times / 60), 1)
      expect(Number(bandOf(fill).height)).toBeCloseTo((2 * times * scales.perDegree) / 60, 1)
    }
    textOf(drawing, '57°54′ ± 1′')
  })

  it('draws the Sun to the scale of the azimuths', () => {
    const sun = circles(drawing).find(({ r }) => r !== 2.6)!
    // The fixture's semidiameter is 16.31′.
    expect(2 * sun.r).toBeCloseTo((32.62 / 60) * scales.perDegree, 1)
    textOf(drawing, '33′ wide,')
  })

  it('greys the years outside the window', () => {
    const grounds = shapesOf(drawing, 'rect').filter(({ properties }) => properties.fill === PALETTE.outside)
    const ends = grounds.flatMap(({ properties: { x, width } }) => [Number(x), Number(x) + Number(width)])
    expect(ends[1]).toBeCloseTo(scales.x(-20_000), 1)
    expect(ends[2]).toBeCloseTo(scales.x(2026), 1)
    expect(textsOf(drawing).filter(({ content }) => content === 'outside the window').length).toBe(2)
  })

  it('draws the dates as upright bands', () => {
    const edges = linesOf(drawing)
      .filter(({ x1, x2, y1, y2 }) => x1 === x2 && Math.abs(y2 - y1) > 120)
      .map(({ x1 }) => x1)
    for (const year of [-9700, -9500, -800, -500]) {
      expect(
        edges.some((x) => Math.abs(x - scales.x(year)) < 0.15),
        String(year),
      ).toBe(true)
    }
    textOf(drawing, 'asserted: 9701 to 9501 BCE')
    textOf(drawing, 'radiocarbon: 801 to 501 BCE')
  })

  it('dashes a second model where one can see it, and leaves it out where not', () => {
    const dashed = shapesOf(drawing, 'path').filter(({ properties }) => properties.strokeDasharray === '3 2')
    expect(dashed.length).toBe(1)
    textOf(drawing, 'Laskar 2004')
    const line = { value: 57.9077, sd: 1 / 60 }
    const alike = makeShapedAudit({
      tracks: [trackOf('vondrak2011', line, 0), trackOf('laskar2004', line, 0.001)],
    })
    const same = trackFigure(alike, 'midsummer').drawing
    expect(shapesOf(same, 'path').filter(({ properties }) => properties.strokeDasharray === '3 2')).toEqual(
      [],
    )
  })

  it('refuses a sightline that the audit does not have', () => {
    expect(() => trackFigure(audit, 'midwinter')).toThrow(RangeError)
  })
})

describe('a crossing still to come', () => {
  it('is an open circle, named so', () => {
    const line = { value: 59, sd: 0.1 }
    const audit = makeShapedAudit({
      lineDeg: line,
      tracks: [trackOf('vondrak2011', line, 0)],
      implied: [impliedOf([-13_700, 4000])],
    })
    const { drawing, alt } = trackFigure(audit, 'midsummer')
    expect(
      circles(drawing)
        .filter(({ r }) => r === 2.6)
        .map(({ fill }) => fill),
    ).toEqual([PALETTE.ink, PALETTE.paper])
    textOf(drawing, '4000 CE (to come)')
    expect(alt).toContain('4000 CE (outside the window, in the future)')
  })
})

describe('a line that nothing fits', () => {
  it('shows how far off the nearest approach is', () => {
    const { drawing, alt } = trackFigure(noneAudit(), 'midsummer')
    const { x, y } = scalesFromTicks(drawing)
    const mark = linesOf(drawing).find(
      ({ x1, x2, element }) => x1 === x2 && Number(element.properties.strokeWidth) === 1,
    )!
    expect(mark.x1).toBeCloseTo(x(-20_000), 1)
    expect(Math.min(mark.y1, mark.y2)).toBeCloseTo(y(64.2), 1)
    textOf(drawing, '20,000 BCE,')
    textOf(drawing, '4°23′ off')
    expect(alt).toContain(
      'The two never meet. Within the window they come nearest in 20,000 BCE, 4°23′ apart.',
    )
  })
})

describe('hard cases', () => {
  it('breaks the curve where the target has no azimuth', () => {
    const line = { value: 58, sd: 0.1 }
    const whole = trackOf('vondrak2011', line, 0)
    const azimuth_deg = whole.azimuth_deg.map((deg, index) => (index > 300 && index < 500 ? null : deg))
    const { drawing } = trackFigure(
      makeShapedAudit({ lineDeg: line, tracks: [{ ...whole, azimuth_deg }] }),
      'midsummer',
    )
    const d = String(
      shapesOf(drawing, 'path').find(({ properties }) => Number(properties.strokeWidth) === 1.4)!.properties
        .d,
    )
    expect(polygonsOf(d).length).toBe(2)
  })

  it('carries a track across north without a jump', () => {
    const line = { value: 359.9, sd: 0.1 }
    const whole = trackOf('vondrak2011', line, 0)
    const azimuth_deg = whole.azimuth_deg.map((deg) => (deg! - 59.3 + 360) % 360)
    const { drawing } = trackFigure(
      makeShapedAudit({ lineDeg: line, tracks: [{ ...whole, azimuth_deg }], implied: [] }),
      'midsummer',
    )
    const d = String(
      shapesOf(drawing, 'path').find(({ properties }) => Number(properties.strokeWidth) === 1.4)!.properties
        .d,
    )
    const heights = polygonsOf(d)
      .flat()
      .map(([, y]) => y)
    const jumps = heights.slice(1).map((y, index) => Math.abs(y - heights[index]!))
    expect(Math.max(...jumps)).toBeLessThan(4)
    textOf(drawing, '359°00′')
    textOf(drawing, '0°00′')
  })

  it('draws a wide band no further than the plot', () => {
    const { drawing } = trackFigure(partsAudit(), 'midsummer')
    const axis = linesOf(drawing).find(({ x1, x2 }) => x1 === 40 && x2 === 40)!
    for (const { properties } of shapesOf(drawing, 'rect')) {
      expect(Number(properties.y)).toBeGreaterThanOrEqual(axis.y1 - 0.01)
      expect(Number(properties.y) + Number(properties.height)).toBeLessThanOrEqual(axis.y2 + 0.02)
    }
  })

  it('includes an asserted date outside the window', () => {
    const { drawing } = trackFigure(missedAudit(), 'midsummer')
    textOf(drawing, 'asserted: 10,551 to 10,451 BCE')
  })
})
