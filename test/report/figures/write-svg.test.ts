import { describe, expect, it } from 'vitest'
import { shape, text } from '../../../src/report/figures/shape.ts'
import { svgRoot } from '../../../src/report/figures/svg-root.ts'
import { writeSvg } from '../../../src/report/write-svg.ts'

const { drawing } = svgRoot({ width: 100, height: 50 }, 'A & B', 'Says 3 < 5.', [
  shape('line', {
    x1: 1 / 3,
    y1: -0.001,
    x2: 50,
    y2: 20,
    stroke: '#000000',
    strokeWidth: 0.5,
    strokeDasharray: '4 2',
  }),
  text(10, 20, '57°54′ <b>"&', { anchor: 'end', weight: 600 }),
])

describe('writeSvg', () => {
  it('writes a standalone file: title and description first, then a white ground, then the shapes', () => {
    expect(writeSvg(drawing)).toBe(
      [
        '<?xml version="1.0" encoding="UTF-8"?>',
        `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 100 50" width="100" height="50" role="img" font-family="&#x27;Source Sans 3&#x27;, &#x27;Helvetica Neue&#x27;, Arial, sans-serif">`,
        '<title>A &#x26; B</title>',
        '<desc>Says 3 &#x3C; 5.</desc>',
        '<rect x="0" y="0" width="100" height="50" fill="#ffffff"/>',
        '<line x1="0.33" y1="0" x2="50" y2="20" stroke="#000000" stroke-width="0.5" stroke-dasharray="4 2"/>',
        // 1.1 (semibold) × 7.5 points × 6.08, the sum of the widths of the twelve characters in text-width.ts.
        '<text x="10" y="20" text-anchor="end" font-size="7.5" font-weight="600" fill="#1a1a1a" textLength="50.16" lengthAdjust="spacingAndGlyphs">57°54′ &#x3C;b>"&#x26;</text>',
        '</svg>',
        '',
      ].join('\n'),
    )
  })

  it('leaves a text of unknown width to the face it is set in', () => {
    const { drawing: unknown } = svgRoot({ width: 100, height: 50 }, 'A', 'B', [text(10, 20, '𓉔𓉔')])
    expect(writeSvg(unknown)).toContain('>𓉔𓉔</text>')
    expect(writeSvg(unknown)).not.toContain('textLength')
  })

  it('leaves the drawing as it was', () => {
    const before = JSON.stringify(drawing)
    writeSvg(drawing)
    expect(JSON.stringify(drawing)).toBe(before)
  })
})

describe('shape', () => {
  it('refuses a number that would draw nothing', () => {
    expect(() => shape('line', { x1: Number.NaN })).toThrow(RangeError)
    expect(() => text(0, Number.POSITIVE_INFINITY, 'x')).toThrow(RangeError)
  })
})
