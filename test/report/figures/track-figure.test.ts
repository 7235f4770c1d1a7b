import type { Element } from 'hast'
import { describe, expect, it } from 'vitest'
import { PALETTE } from '../../../src/report/figures/palette.ts'
import { trackFigure } from '../../../src/report/figures/track-figure.ts'
import {
  equinoxAudit,
  missedAudit,
  moonAudit,
  neverAudit,
  noneAudit,
  noonAudit,
  pairAudit,
  partsAudit,
  premiseAudit,
  starAudit,
  vanishingAudit,
} from './cases.ts'
import { courseOf, impliedOf, makeShapedAudit, trackOf } from './make-audit.ts'
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
    textOf(drawing, '4000 CE')
    textOf(drawing, '(to come)')
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
    const direction_deg = whole.direction_deg.map((deg, index) => (index > 300 && index < 500 ? null : deg))
    const { drawing } = trackFigure(
      makeShapedAudit({ lineDeg: line, tracks: [{ ...whole, direction_deg }] }),
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
    const direction_deg = whole.direction_deg.map((deg) => (deg! - 59.3 + 360) % 360)
    const { drawing } = trackFigure(
      makeShapedAudit({ lineDeg: line, tracks: [{ ...whole, direction_deg }], implied: [] }),
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

/** The drawn tracks, each as its runs of points. */
function curvesOf(drawing: Element): [number, number][][][] {
  return shapesOf(drawing, 'path')
    .filter(({ properties }) => Number(properties.strokeWidth) === 1.4)
    .map(({ properties }) => polygonsOf(String(properties.d)))
}

/** Top and bottom of the plot, from its axis. */
function plotOf(drawing: Element): { top: number; bottom: number } {
  const axis = linesOf(drawing).find(({ x1, x2, y1, y2 }) => x1 === 40 && x2 === 40 && y2 - y1 > 100)!
  return { top: axis.y1, bottom: axis.y2 }
}

describe('a star that crosses the line eight times', () => {
  const audit = starAudit()
  const { drawing, alt } = trackFigure(audit, 'midsummer')
  const { top, bottom } = plotOf(drawing)

  it('has a mark and a label for each crossing', () => {
    const dates = audit.implied[0]!.dates
    expect(dates.length).toBe(8)
    expect(circles(drawing).filter(({ r }) => r === 2.6).length).toBe(8)
    expect(
      textsOf(drawing).filter(({ content }) => /^[\d,]+ B?CE$/.test(content) && content !== '1 CE').length,
    ).toBe(8 + 4)
    expect(alt.match(/\d B?CE( \(|,| and|\.)/g)!.length).toBeGreaterThanOrEqual(8)
  })

  it('is drawn without a stroke from one side of north to the other', () => {
    const [curve] = curvesOf(drawing)
    // 5.5° of the fixture's 62° sine at most pass in 141 years, a point of the scale of dates: about 35 points.
    for (const run of curve!) {
      const steps = run.slice(1).map(([x, y], index) => [x - run[index]![0], Math.abs(y - run[index]![1])])
      for (const [, rise] of steps) expect(rise).toBeLessThan(40)
    }
  })

  it('is cut where the plot ends, and shows the line, the asserted date’s place and every crossing', () => {
    const points = curvesOf(drawing).flat(2)
    for (const [, y] of points) {
      expect(y).toBeGreaterThanOrEqual(top - 0.01)
      expect(y).toBeLessThanOrEqual(bottom + 0.01)
    }
    expect(curvesOf(drawing)[0]!.length).toBeGreaterThan(3)
    // The asserted place, 64°, is in the plot; half of the swing, down to −60°, is not.
    const labels = textsOf(drawing).map(({ content }) => content)
    expect(labels).toContain('60°')
    expect(labels).not.toContain('330°')
  })

  it('shows where a second model parts, and ends with it', () => {
    const [dashed] = shapesOf(drawing, 'path').filter(
      ({ properties }) => properties.strokeDasharray === '3 2',
    )
    const xs = polygonsOf(String(dashed!.properties.d))
      .flat()
      .map(([x]) => x)
    const scales = scalesFromTicks(drawing)
    expect(Math.min(...xs)).toBeGreaterThanOrEqual(scales.x(-5000) - 0.1)
    expect(Math.max(...xs)).toBeLessThanOrEqual(scales.x(10_000) + 0.1)
    textOf(drawing, 'IAU 2006 (P03)')
  })

  it('has the Sun as a yardstick although it is no target', () => {
    // The fixture's sweep takes 32.4′ for the Sun's width.
    textOf(drawing, '32′ wide,')
    expect(circles(drawing).filter(({ r }) => r !== 2.6).length).toBe(1)
  })
})

describe('several branches of one target', () => {
  it('are each drawn and named', () => {
    const { drawing, alt } = trackFigure(equinoxAudit(), 'midsummer')
    expect(curvesOf(drawing).length).toBe(2)
    textOf(drawing, 'March equinox')
    textOf(drawing, 'September equinox')
    expect(alt).toContain('Each has its curve: March equinox and September equinox.')
  })

  it('are named inside the plot where they do not end in view', () => {
    const { drawing } = trackFigure(pairAudit(), 'midsummer')
    expect(curvesOf(drawing).length).toBe(2)
    const names = ['Kochab above', 'Mizar above'].map((name) => textOf(drawing, name))
    expect(names.map(({ x }) => x > 345)).toEqual([true, false])
    expect(circles(drawing).filter(({ r }) => r === 2.6).length).toBe(pairAudit().implied[0]!.dates.length)
  })
})

describe('a target that vanishes', () => {
  it('has a curve for each time it is seen, and hatched years between', () => {
    const { drawing, alt } = trackFigure(vanishingAudit(), 'midsummer')
    expect(curvesOf(drawing)[0]!.length).toBe(3)
    const notes = textsOf(drawing).filter(({ content }) => content.endsWith('out of reach'))
    expect(notes.length).toBe(2)
    expect(alt).toContain('There is no rising of Acrux at that altitude from ')
  })

  it('is out of reach only where no branch of it is seen', () => {
    const line = { value: 20, sd: 0.1 }
    const until = (year: number) => (year < 0 ? 21 : null)
    const from = (year: number) => (year > -5000 ? 19 : null)
    const tracks = [until, from].map((direction, branch) =>
      courseOf('vondrak2011', line, direction, { branch, branch_words: `${branch}` }),
    )
    const { drawing } = trackFigure(makeShapedAudit({ lineDeg: line, tracks }), 'midsummer')
    expect(textsOf(drawing).filter(({ content }) => content.endsWith('out of reach'))).toEqual([])
  })

  it('has no curve where it is never seen, and says so', () => {
    const { drawing, alt } = trackFigure(neverAudit(), 'midsummer')
    expect(curvesOf(drawing)).toEqual([])
    textOf(drawing, 'target out of reach')
    textOf(drawing, 'line as measured')
    expect(alt).toContain('There is no rising of Acrux at that altitude in any of these years.')
    expect(alt).not.toContain('meet')
  })
})

describe('a measured altitude', () => {
  it('has an axis of altitudes', () => {
    const { drawing, alt } = trackFigure(noonAudit(), 'midsummer')
    textOf(drawing, 'altitude')
    textOf(drawing, 'altitude of target')
    expect(textsOf(drawing).some(({ content }) => content.includes('azimuth'))).toBe(false)
    expect(alt).toMatch(/^Altitude of the target of midsummer, December solstice noon, centre, from /)
  })
})

describe('the ground about a track', () => {
  it('is one standard deviation of the comparison to either side', () => {
    const audit = moonAudit()
    const { drawing } = trackFigure(audit, 'midsummer')
    const { perDegree } = scalesFromTicks(drawing)
    const ground = shapesOf(drawing, 'path').find(
      ({ properties }) => Number(properties.fillOpacity) === 0.09,
    )!
    const [polygon] = polygonsOf(String(ground.properties.d))
    const inPlot = polygon!.filter(([, y]) => y > plotOf(drawing).top + 1 && y < plotOf(drawing).bottom - 1)
    const at = (x: number) => inPlot.filter(([px]) => px === x).map(([, y]) => y)
    const heights = inPlot.map(([x]) => at(x)).filter((ys) => ys.length === 2)
    expect(heights.length).toBeGreaterThan(50)
    // The fixture's standard deviation is 11′.
    for (const [a, b] of heights) expect(Math.abs(a! - b!)).toBeCloseTo((2 * 11 * perDegree) / 60, 1)
  })
})

describe('the stretch of directions', () => {
  it('is never so small that a course at rest looks like a swing', () => {
    const line = { value: 90, sd: 0.05 }
    const tracks = [courseOf('vondrak2011', line, (year) => 90 + year / 1e7)]
    const audit = makeShapedAudit({ lineDeg: line, tracks, implied: [impliedOf([0])] })
    const { drawing } = trackFigure(audit, 'midsummer')
    const heights = curvesOf(drawing)
      .flat(2)
      .map(([, y]) => y)
    expect(Math.max(...heights) - Math.min(...heights)).toBeLessThan(2)
  })

  it('breaks a curve opposite the line', () => {
    const line = { value: 10, sd: 0.1 }
    // Round the whole circle once in 30,000 years.
    const tracks = [courseOf('vondrak2011', line, (year) => (year / 30_000) * 360)]
    const audit = makeShapedAudit({
      lineDeg: line,
      tracks,
      implied: [impliedOf([833], { year: 833, offset_arcmin: 9600, sd_arcmin: 3, sun_widths: 1 })],
    })
    const { drawing } = trackFigure(audit, 'midsummer')
    const runs = curvesOf(drawing)[0]!
    expect(runs.length).toBeGreaterThan(1)
    for (const run of runs) {
      const rises = run.slice(1).map(([, y], index) => Math.abs(y - run[index]![1]))
      expect(Math.max(...rises)).toBeLessThan(5)
    }
  })
})
