import { describe, expect, it } from 'vitest'
import { PALETTE } from '../../../src/report/figures/palette.ts'
import { premiseFigure } from '../../../src/report/figures/premise-figure.ts'
import { trackFigure } from '../../../src/report/figures/track-figure.ts'
import { CASES } from './cases.ts'
import { badNumbers, overlappingTexts, shapesOf, textsOf, textsOutside } from './read-drawing.ts'

/** CIE 1976 lightness of an sRGB colour (IEC 61966-2-1 transfer curve; CIE 15, L*). */
function lightness(colour: string): number {
  const [red, green, blue] = [1, 3, 5].map((at) => {
    const value = Number.parseInt(colour.slice(at, at + 2), 16) / 255
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4
  }) as [number, number, number]
  const luminance = 0.2126 * red + 0.7152 * green + 0.0722 * blue
  return luminance > 216 / 24_389 ? 116 * Math.cbrt(luminance) - 16 : (luminance * 24_389) / 27
}

const FIGURES = Object.entries(CASES).flatMap(([name, makeCase]) => [
  [`${name}, premise`, premiseFigure(makeCase()).drawing] as const,
  [`${name}, track`, trackFigure(makeCase(), 'midsummer').drawing] as const,
])

describe.each(FIGURES)('the figure %s', (_, drawing) => {
  it('prints no text over another, and none beyond the edges', () => {
    expect(overlappingTexts(drawing)).toEqual([])
    expect(textsOutside(drawing)).toEqual([])
  })

  it('sets no text smaller than 7 points', () => {
    expect(Math.min(...textsOf(drawing).map(({ size }) => size))).toBeGreaterThanOrEqual(7)
  })

  it('is 440 points wide and fits page one', () => {
    expect(drawing.properties.width).toBe(440)
    expect(Number(drawing.properties.height)).toBeLessThanOrEqual(300)
  })

  it('has numbers everywhere', () => {
    expect(badNumbers(drawing)).toEqual([])
  })

  it('uses the shapes and attributes of drawing.ts only', () => {
    const paint = ['fill', 'fillOpacity', 'stroke', 'strokeWidth', 'strokeDasharray']
    const allowed: Record<string, string[]> = {
      rect: ['x', 'y', 'width', 'height', ...paint],
      line: ['x1', 'y1', 'x2', 'y2', ...paint],
      circle: ['cx', 'cy', 'r', ...paint],
      path: ['d', ...paint],
      text: ['x', 'y', 'textAnchor', 'fontSize', 'fontWeight', 'fontStyle', 'fill'],
      title: [],
      desc: [],
    }
    for (const child of drawing.children) {
      if (child.type !== 'element') throw new Error('a node that is not an element')
      expect(Object.keys(allowed)).toContain(child.tagName)
      expect(allowed[child.tagName]).toEqual(expect.arrayContaining(Object.keys(child.properties)))
    }
    for (const { properties } of shapesOf(drawing, 'path'))
      expect(properties.d).toMatch(/^(?:[MLZ][-\d., ]*)+$/)
  })
})

describe('the greys', () => {
  it('keep paper, the two sets and the strong lines apart in grey print', () => {
    const steps = [PALETTE.paper, PALETTE.set95, PALETTE.set68, PALETTE.accent, PALETTE.ink].map(lightness)
    const differences = steps.slice(1).map((step, index) => steps[index]! - step)
    // A difference of 12 in L* is plain to see side by side; just noticeable is about 1 to 2.
    expect(Math.min(...differences)).toBeGreaterThan(12)
  })

  it('have the anchors of lightness right', () => {
    expect(lightness('#ffffff')).toBeCloseTo(100, 6)
    expect(lightness('#000000')).toBe(0)
    // CIE: a grey of 18.4 % reflectance has L* 50; sRGB 119 is nearest to it.
    expect(lightness('#777777')).toBeCloseTo(50, 0)
  })
})
