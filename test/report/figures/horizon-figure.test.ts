import type { Element } from 'hast'
import { describe, expect, it } from 'vitest'
import type { Audit } from '../../../src/audit/audit.ts'
import { horizonFigure } from '../../../src/report/figures/horizon-figure.ts'
import { PALETTE } from '../../../src/report/figures/palette.ts'
import { writeSvg } from '../../../src/report/write-svg.ts'
import { differsFromGolden } from './golden.ts'
import { HORIZON_CASES, horizonAudit } from './horizon-cases.ts'
import {
  badNumbers,
  linesOf,
  overlappingTexts,
  polygonsOf,
  shapesOf,
  textOf,
  textsOf,
  textsOutside,
} from './read-drawing.ts'

function figure(name: string) {
  return horizonFigure(HORIZON_CASES[name]!(), 'midsummer')
}

interface Circle {
  cx: number
  cy: number
  r: number
  stroke: string
}

function circlesOf(drawing: Element): Circle[] {
  return shapesOf(drawing, 'circle').map(({ properties: { cx, cy, r, stroke } }) => ({
    ...{ cx: Number(cx), cy: Number(cy), r: Number(r) },
    stroke: String(stroke),
  }))
}

/** The plot's left edge is the axis of altitudes. */
function plotOf(drawing: Element): { left: number; top: number; bottom: number } {
  const axis = linesOf(drawing).find(({ x1, x2, y1, y2 }) => x1 === 46 && x2 === 46 && y2 - y1 > 30)!
  return { left: 46, top: axis.y1, bottom: axis.y2 }
}

/** Points to a degree of altitude and of azimuth, and where an angle lies, read off the printed scales. */
function scalesOf(drawing: Element) {
  const { bottom } = plotOf(drawing)
  const altitudes = textsOf(drawing).filter(
    ({ anchor, x, content }) => anchor === 'end' && x === 40 && /°/.test(content),
  )
  const azimuths = textsOf(drawing).filter(
    ({ y, content }) => Math.abs(y - bottom - 31.5) < 0.1 && /°/.test(content),
  )
  const up = altitudes.map(({ content, y }) => [degrees(content), y - 2.6] as const)
  const across = azimuths.map(({ content, x }) => [degrees(content), x] as const)
  const slope = (pairs: readonly (readonly [number, number])[]) =>
    (pairs.at(-1)![1] - pairs[0]![1]) / (pairs.at(-1)![0] - pairs[0]![0])
  const [perAltitude, perAzimuth] = [slope(up), slope(across)]
  return {
    perAltitude: -perAltitude,
    perAzimuth,
    x: (deg: number) => across[0]![1] + (deg - across[0]![0]) * perAzimuth,
    y: (deg: number) => up[0]![1] + (deg - up[0]![0]) * perAltitude,
  }
}

function degrees(printed: string): number {
  const [, sign, whole, minutes] = /^(−?)(\d+)°(?:(\d+)′)?$/.exec(printed)!
  return (Number(whole) + Number(minutes ?? 0) / 60) * (sign === '' ? 1 : -1)
}

describe.each(Object.entries(HORIZON_CASES))('the horizon of the case `%s`', (name, makeCase) => {
  const { drawing, alt } = horizonFigure(makeCase(), 'midsummer')

  // Looked at as pictures when they were taken; what they show is asserted below.
  it('is drawn as it was', () => {
    expect(differsFromGolden(`${name}-horizon.svg`, writeSvg(drawing))).toBeNull()
  })

  it('prints no text over another, none beyond the edges and none too small', () => {
    expect(overlappingTexts(drawing)).toEqual([])
    expect(textsOutside(drawing)).toEqual([])
    expect(Math.min(...textsOf(drawing).map(({ size }) => size))).toBeGreaterThanOrEqual(7)
  })

  it('has numbers everywhere, in shapes that the PDF can draw', () => {
    expect(badNumbers(drawing)).toEqual([])
    expect(alt).not.toMatch(/NaN|undefined|null/)
    const tags = drawing.children.map((child) => (child.type === 'element' ? child.tagName : child.type))
    expect(
      [...new Set(tags)].filter((tag) => !/^(title|desc|rect|line|circle|path|text)$/.test(tag)),
    ).toEqual([])
    for (const { properties } of shapesOf(drawing, 'path'))
      expect(properties.d).toMatch(/^(?:[MLZ][-\d., ]*)+$/)
  })

  it('is 440 points wide and fits a page with its text', () => {
    expect(drawing.properties.width).toBe(440)
    expect(Number(drawing.properties.height)).toBeLessThanOrEqual(260)
  })

  it('draws nothing of the sky beyond the plot', () => {
    const { left, top, bottom } = plotOf(drawing)
    for (const { cx, cy, r } of circlesOf(drawing)) {
      expect(cx - r).toBeGreaterThanOrEqual(left)
      expect(cx + r).toBeLessThanOrEqual(440)
      expect(cy - r).toBeGreaterThanOrEqual(top)
      expect(cy + r).toBeLessThanOrEqual(bottom)
    }
    const points = shapesOf(drawing, 'path').flatMap(({ properties }) =>
      polygonsOf(String(properties.d)).flat(),
    )
    for (const [x, y] of points) {
      expect(x).toBeGreaterThanOrEqual(left - 0.01)
      // An arrow's head is as wide as its stroke beside the plot's top.
      expect(y).toBeGreaterThanOrEqual(top - 0.01)
      expect(y).toBeLessThanOrEqual(bottom + 0.01)
    }
  })
})

describe('the discs', () => {
  it.each([
    ['level', 57.9, [1.8, 36, 65], 1.5 - 16 / 60, 16],
    ['high', 57.9, [-60, 66, 100], 25, 15.54],
    ['sea', 57.9, [2, -100], -0.5 + 16 / 60, 16],
  ] as const)(
    'stand where the audit has them, at their size on both scales: %s',
    (name, line, rights, middle, half) => {
      const { drawing } = figure(name)
      const scales = scalesOf(drawing)
      const circles = circlesOf(drawing).sort((a, b) => a.cx - b.cx)
      expect(circles.length).toBe(rights.length)
      rights
        .toSorted((a, b) => a - b)
        .forEach((right, index) => {
          const { cx, cy, r } = circles[index]!
          // Printed coordinates are rounded to a hundredth of a point.
          expect(Math.abs(cx - scales.x(line + right / 60))).toBeLessThan(0.05)
          expect(Math.abs(cy - scales.y(middle))).toBeLessThan(0.05)
          expect(Math.abs(r - (half / 60) * scales.perAltitude)).toBeLessThan(0.05)
        })
    },
  )

  it('are round on the sky: a degree of azimuth is as wide as the cosine of the altitude says', () => {
    for (const [name, altitude] of [
      ['level', 1.5],
      ['high', 25],
    ] as const) {
      const { perAzimuth, perAltitude } = scalesOf(figure(name).drawing)
      expect(perAzimuth / perAltitude).toBeCloseTo(Math.cos((altitude * Math.PI) / 180), 3)
    }
  })

  it('are at most 72 points wide for the Sun, and not so small that one cannot see them', () => {
    // The Sun is 32′ wide, less or more by a sixtieth.
    expect(circlesOf(figure('crowded').drawing)[0]!.r).toBeGreaterThan(34)
    expect(circlesOf(figure('crowded').drawing)[0]!.r).toBeLessThan(37)
    for (const { r } of circlesOf(figure('far').drawing)) expect(r).toBeGreaterThanOrEqual(6)
  })

  it('differ by colour, width and dashes', () => {
    const styles = shapesOf(figure('crowded').drawing, 'circle').map(({ properties }) =>
      [properties.stroke, properties.strokeWidth, properties.strokeDasharray ?? ''].join(' '),
    )
    expect(new Set(styles).size).toBe(6)
    expect(styles[0]).toContain(PALETTE.accent)
    for (const { properties } of shapesOf(figure('crowded').drawing, 'circle'))
      expect(properties.fill).toBe('none')
  })

  it('are crosses for stars, at the altitude at which they are seen', () => {
    const onSkyline = figure('star').drawing
    expect(circlesOf(onSkyline)).toEqual([])
    expect(crossHeights(onSkyline)).toEqual([0.66, 0.66, 0.66].map((deg) => near(scalesOf(onSkyline).y(deg))))
    const above = figure('north').drawing
    expect(crossHeights(above)).toEqual([2.4, 2.4, 2.4].map((deg) => near(scalesOf(above).y(deg))))
  })
})

/** Middles of the crosses, from their falling strokes. */
function crossHeights(drawing: Element): number[] {
  return linesOf(drawing)
    .filter(({ x1, x2, y1, y2 }) => Math.abs(x2 - x1 - 6.4) < 0.02 && Math.abs(y2 - y1 - 6.4) < 0.02)
    .map(({ y1, y2 }) => (y1 + y2) / 2)
}

function near(value: number) {
  return expect.closeTo(value, 1)
}

describe('the skyline', () => {
  const heaviest = (drawing: Element) =>
    polygonsOf(
      String(
        shapesOf(drawing, 'path').find(({ properties }) => Number(properties.strokeWidth) === 1.2)!.properties
          .d,
      ),
    )

  it('is level where only its altitude is known', () => {
    const { drawing } = figure('level')
    const [line] = heaviest(drawing)
    expect(line!.map(([x]) => x)).toEqual([46, 437])
    for (const [, y] of line!) expect(y).toBeCloseTo(scalesOf(drawing).y(1.5), 1)
  })

  it('has a profile’s nodes where they belong, and nothing beyond its ends', () => {
    const { drawing } = figure('cliff')
    const scales = scalesOf(drawing)
    const points = heaviest(drawing).flat()
    expect(Math.min(...points.map(([x]) => x))).toBeCloseTo(scales.x(57), 1)
    expect(Math.max(...points.map(([x]) => x))).toBeCloseTo(scales.x(59.4), 1)
    const top = points.find(([, y]) => Math.abs(y - scales.y(2.6)) < 0.1)!
    expect(top[0]).toBeCloseTo(scales.x(58.2), 1)
    const dotted = linesOf(drawing).filter(({ element }) => element.properties.strokeDasharray === '0.8 2')
    expect(dotted.map(({ x1 }) => x1)).toEqual([57, 59.4].map((deg) => near(scales.x(deg))))
    expect(textsOf(drawing).filter(({ content }) => content === 'profile ends').length).toBe(2)
  })

  it('runs through north', () => {
    const { drawing } = figure('north')
    const labels = textsOf(drawing).map(({ content }) => content)
    expect(labels).toEqual(expect.arrayContaining(['359°', '0°', '1°']))
    expect(heaviest(drawing).length).toBe(1)
  })

  it('has a pale band as high as its uncertainty, where that is to be seen', () => {
    const bands = (drawing: Element) =>
      shapesOf(drawing, 'path').filter(({ properties }) => Number(properties.fillOpacity) === 0.09)
    const { drawing } = figure('level')
    const heights = polygonsOf(String(bands(drawing)[0]!.properties.d))[0]!.map(([, y]) => y)
    // 2′ to either side.
    expect(Math.max(...heights) - Math.min(...heights)).toBeCloseTo(
      (4 / 60) * scalesOf(drawing).perAltitude,
      1,
    )
    expect(bands(figure('sea').drawing)).toEqual([])
  })

  it('is named, by what it is', () => {
    textOf(figure('level').drawing, 'skyline, 1°30′ ± 2′')
    textOf(figure('sea').drawing, 'sea horizon, −0°30′00″ ± 18″')
    textOf(figure('nowhere').drawing, 'level horizon, assumed, 1°30′ ± 2′')
  })

  it('has its altitude at the line near the line, or with a leader to it', () => {
    const leaders = (drawing: Element) =>
      linesOf(drawing).filter(({ element }) => Number(element.properties.strokeWidth) === 0.4)
    const { drawing } = figure('north')
    const name = textOf(drawing, 'skyline, 0°46′ ± 1.2′ at the line')
    const mark = linesOf(drawing).find(({ element }) => Number(element.properties.strokeWidth) === 1.1)!
    expect(name.box.left - mark.x1).toBeGreaterThan(0)
    expect(name.box.left - mark.x1).toBeLessThan(14)
    expect(leaders(drawing).filter(({ y1, y2 }) => Math.max(y1, y2) < plotOf(drawing).bottom)).toEqual([])
    const crowded = figure('slope').drawing
    textOf(crowded, 'skyline; 1°38′ ± 1.2′ at the line')
    const own = leaders(crowded).filter(({ y1, y2 }) => Math.max(y1, y2) < plotOf(crowded).bottom)
    const to = scalesOf(crowded)
    expect(own.map(({ x2, y2 }) => [x2, y2])).toEqual([
      [near(to.x(57.9)), near(to.y(1.25 + (0.7 / 1.7) * 0.95))],
    ])
  })
})

describe('the line and its tolerances', () => {
  it('stand on the scales', () => {
    const { drawing } = figure('level')
    const { bottom } = plotOf(drawing)
    const scales = scalesOf(drawing)
    const mark = linesOf(drawing).find(({ element }) => Number(element.properties.strokeWidth) === 1.1)!
    expect(mark.x1).toBeCloseTo(scales.x(57.9), 1)
    expect(mark.x2).toBe(mark.x1)
    const band = shapesOf(drawing, 'rect').find(({ properties }) => properties.fill === PALETTE.set95)!
    expect(Number(band.properties.width)).toBeCloseTo((4 / 60) * scales.perAzimuth, 1)
    const caps = linesOf(drawing)
      .filter(({ x1, x2, y1, y2 }) => x1 === x2 && y2 - y1 === 6 && y1 > bottom)
      .map(({ x1 }) => x1)
    expect(caps).toEqual([-60, -10, 10, 60].map((arcmin) => near(scales.x(57.9 + arcmin / 60))))
    textOf(drawing, 'the line, 57°54′ ± 2′')
    textOf(drawing, 'plausible tolerance: 10′ to 1°')
  })

  it('draw a wide error as a whisker at the foot, not as a block', () => {
    const { drawing } = figure('sea')
    const { bottom } = plotOf(drawing)
    expect(shapesOf(drawing, 'rect').filter(({ properties }) => properties.fill === PALETTE.set95)).toEqual(
      [],
    )
    const { x } = scalesOf(drawing)
    const bar = linesOf(drawing).find(({ y1, y2 }) => y1 === y2 && Math.abs(y1 - (bottom - 4)) < 0.02)!
    // 57.9° ± 2°; the printed scale is good to 0.1 points.
    expect([bar.x1, bar.x2]).toEqual([near(x(55.9)), near(x(59.9))])
  })

  it('end a bracket that runs out of the plot in arrow heads', () => {
    const { drawing } = figure('sea')
    const { bottom } = plotOf(drawing)
    const caps = linesOf(drawing).filter(({ x1, x2, y1, y2 }) => x1 === x2 && y2 - y1 === 6 && y1 > bottom)
    expect(caps.every(({ x1 }) => Math.abs(x1 - scalesOf(drawing).x(57.9)) < 0.1)).toBe(true)
    const tips = (name: string) => {
      const { drawing } = figure(name)
      const y = plotOf(drawing).bottom + 6
      const heads = linesOf(drawing).filter((l) => Math.abs(l.y2 - y) < 0.02 && Math.abs(l.y1 - y) === 3)
      return [...new Set(heads.map(({ x2 }) => x2))]
    }
    expect(tips('sea')).toEqual([46, 437])
    expect(tips('far')).toEqual([437])
    expect(tips('level')).toEqual([])
    textOf(drawing, 'plausible tolerance: exact to 5°')
  })

  it('count Sun’s widths from the line to both sides', () => {
    const { drawing } = figure('level')
    const { bottom } = plotOf(drawing)
    const row = textsOf(drawing).filter(
      ({ y, anchor }) => Math.abs(y - bottom - 47.5) < 0.1 && anchor === 'middle',
    )
    const { x, perAzimuth } = scalesOf(drawing)
    const at = (content: string) => row.filter((each) => each.content === content).map((each) => each.x)
    expect(at('0')).toEqual([near(x(57.9))])
    // The sweep takes 32.4′ of azimuth for one.
    expect(at('1')).toEqual([-1, 1].map((count) => near(x(57.9) + count * (32.4 / 60) * perAzimuth)))
  })
})

describe('the labels', () => {
  it('tell the date and the distance from the line', () => {
    const { drawing } = figure('level')
    textOf(drawing, 'asserted date, 9700 to 9500 BCE')
    textOf(drawing, '1.8′ to the right, 0.06 Sun’s widths')
    textOf(drawing, 'radiocarbon, 800 to 500 BCE')
    // 36 / 32.4 = 1.11 and 65 / 32.4 = 2.01, printed to two digits.
    textOf(drawing, '36′ to the right, 1.1 Sun’s widths')
    textOf(drawing, 'today, 2026 CE')
    textOf(drawing, '1°05′ to the right, 2 Sun’s widths')
  })

  it('stand over their discs', () => {
    const { drawing } = figure('level')
    const { top } = plotOf(drawing)
    for (const { cx, cy, r } of circlesOf(drawing)) {
      const stems = linesOf(drawing).filter(
        ({ x1, x2, y1 }) => Math.abs(x1 - cx) < 0.02 && x1 === x2 && y1 === top,
      )
      expect(stems.some(({ y2 }) => Math.abs(y2 - (cy - r)) < 0.02)).toBe(true)
    }
  })

  it('take one line each where they are many', () => {
    const { drawing } = figure('many')
    textOf(drawing, 'asserted date, 9700 to 9500 BCE: at the line')
    textOf(drawing, 'layer 1, 800 to 500 BCE: 30′ to the left')
  })

  it('come with an arrow where the target lies beyond the picture', () => {
    const heads = (drawing: Element) =>
      shapesOf(drawing, 'path')
        .filter(({ properties }) => properties.fill !== 'none' && properties.fillOpacity === undefined)
        .map(({ properties }) => polygonsOf(String(properties.d))[0]![0]![0])
    expect(heads(figure('level').drawing)).toEqual([])
    expect(heads(figure('far').drawing)).toEqual([437])
    expect(heads(figure('beyond').drawing)).toEqual([437, 437, 46])
    textOf(figure('far').drawing, '25° to the right, 46 Sun’s widths')
    expect(circlesOf(figure('beyond').drawing)).toEqual([])
  })

  it('say where there is nothing to draw', () => {
    const { drawing } = figure('nowhere')
    textOf(drawing, 'asserted date, 9700 to 9500 BCE: no June solstice sunrise at that altitude')
    expect(circlesOf(drawing).length).toBe(2)
  })

  it('have a bar for directions that differ over a date', () => {
    const { drawing } = figure('star')
    const bars = linesOf(drawing).filter(
      ({ y1, y2, x1, x2, element }) => y1 === y2 && x2 > x1 && element.properties.stroke === PALETTE.accent,
    )
    const { x } = scalesOf(drawing)
    expect(bars.map(({ x1, x2 }) => [x1, x2])).toEqual([[near(x(57.9 + 3 / 60)), near(x(57.9 + 24 / 60))]])
  })
})

describe('the alternative text', () => {
  it('has the figures', () => {
    expect(figure('level').alt).toBe(
      'The skyline of midsummer, drawn level at 1°30′ ± 2′, and on it the line as measured, at azimuth 57°54′ ± 2′. ' +
        'The target is June solstice sunrise, upper limb on the horizon. ' +
        'Asserted date, 9700 to 9500 BCE: at azimuth 57°56′, 1.8′ ± 2.5′ (0.06 Sun’s widths) to the right of the line, a disc 32′ wide. ' +
        'Radiocarbon, 800 to 500 BCE: at azimuth 58°30′, 36′ ± 2.5′ (1.1 Sun’s widths) to the right of the line, a disc 32′ wide. ' +
        'Today, 2026 CE: at azimuth 58°59′, 1°05′ ± 2.5′ (2 Sun’s widths) to the right of the line, a disc 32′ wide. ' +
        'A bracket about the line spans the build tolerances held plausible, 10′ to 1°.',
    )
  })

  it('says where there is nothing', () => {
    expect(figure('nowhere').alt).toContain(
      'Asserted date, 9700 to 9500 BCE: no June solstice sunrise at that altitude.',
    )
  })
})

describe('an audit', () => {
  const empty = horizonAudit({
    skyline: { nodes: [[57.9, 1.5]], at_line_deg: { value: 1.5, sd: 0 } },
    lineDeg: { value: 57.9, sd: 0 },
    plausible: [0, 0],
    places: [],
  })

  it('without dates, errors, tolerances or a sweep still has a skyline and a line', () => {
    const bare: Audit = { ...empty, sweep: { ...empty.sweep, steps: [] } }
    const { drawing } = horizonFigure(bare, 'midsummer')
    expect(badNumbers(drawing)).toEqual([])
    textOf(drawing, 'plausible tolerance: exact')
    expect(textsOf(drawing).some(({ content }) => content === 'Sun’s widths')).toBe(false)
  })

  it('without that skyline is refused', () => {
    const none: Audit = { ...empty, sightlines: empty.sightlines.map((line) => ({ ...line, skyline: null })) }
    expect(() => horizonFigure(none, 'midsummer')).toThrow(RangeError)
    expect(() => horizonFigure(empty, 'midwinter')).toThrow('no skyline of a sightline `midwinter`')
  })
})
