import type { Element, Properties } from 'hast'
import { s } from 'hastscript'
import { beforeAll, describe, expect, test, vi } from 'vitest'
import { fontFiles } from '../../../src/report/fonts/font-files.ts'
import { type Canvas, openCanvas } from '../../../src/report/pdf/canvas.ts'
import { drawSvg, svgSize } from '../../../src/report/pdf/draw-svg.ts'
import { createShaper, type Shaper } from '../../../src/report/pdf/shaper.ts'

let canvas: Canvas
let shape: Shaper

beforeAll(async () => {
  const createdOn = new Date('2026-06-21T12:00:00Z')
  canvas = await openCanvas({ title: 'T', subject: undefined, language: 'en', createdOn, fonts: fontFiles() })
  canvas.addPage()
  shape = createShaper(canvas, () => {})
})

const svg = (...children: Element[]) =>
  s('svg', { viewBox: '0 0 100 50', width: 200, height: 100 }, children) as Element
const draw = (...children: Element[]) =>
  drawSvg(svg(...children), canvas, shape, { left: 0, top: 0, scale: 1 })
const element = (name: string, properties: Record<string, unknown>, ...children: (Element | string)[]) =>
  s(name, properties as never, children) as Element

/** What the drawing writes into the page, less the state it saves and restores. */
function written(...children: Element[]): string[] {
  const spy = vi.spyOn(canvas as unknown as { addContent(line: string): Canvas }, 'addContent')
  drawSvg(svg(...children), canvas, shape, { left: 10, top: 20, scale: 0.5 })
  const lines = spy.mock.calls.map(([line]) => line)
  spy.mockRestore()
  return lines.filter((line) => !/^[qQ]$/.test(line))
}

describe('shapes', () => {
  test('are drawn in the place and the scale of the drawing', () => {
    // The view box is half the size: 2 times 0.5 is 1. ISO 32000-1, 8.5: `re` a rectangle, `f` fill.
    expect(written(element('rect', { x: 1, y: 2, width: 30, height: 4, fill: '#ff0000' }))).toEqual([
      '1 0 0 1 10 20 cm',
      '/DeviceRGB cs',
      '1 0 0 scn',
      expect.stringMatching(/^\/Gs\d+ gs$/),
      '1 2 30 4 re',
      'f',
    ])
  })

  test('have the fill and stroke of SVG: black and none where nothing is said', () => {
    expect(written(element('path', { d: 'M0 0L10 0' }))).toContain('f')
    expect(written(element('line', { x1: 0, y1: 0, x2: 5, y2: 5 }))).toEqual(['1 0 0 1 10 20 cm'])
    const both = written(element('circle', { cx: 5, cy: 5, r: 2, fill: '#fff', stroke: '#000' }))
    expect(both).toContain('B')
    expect(both).toContain('1 w')
  })

  test('draw the commands of a path, H and V and exponents too', () => {
    const path = written(element('path', { d: 'M1,2H5V6C1 1 2 2 3e-1 3Z', fill: 'none', stroke: '#000' }))
    expect(path.slice(-6)).toEqual(['1 2 m', '5 2 l', '5 6 l', '1 1 2 2 0.3 3 c', 'h', 'S'])
  })

  test('are dashed, however the attribute is spelled', () => {
    const line = { x1: 0, y1: 0, x2: 5, y2: 0, stroke: '#000' }
    expect(written(element('line', { ...line, strokeDasharray: '3,2' }))).toContain('[3 2] 0 d')
    const raw: Element = {
      type: 'element',
      tagName: 'line',
      properties: { ...line, strokeDasharray: '3 2' } as unknown as Properties,
      children: [],
    }
    expect(written(raw)).toContain('[3 2] 0 d')
  })

  test('text stands left of, about or right of its point', () => {
    const x = (textAnchor: string) => {
      const lines = written(element('text', { x: 50, y: 10, fontSize: 10, textAnchor }, 'north'))
      return Number(lines.find((line) => line.endsWith('Tm'))!.split(' ')[4])
    }
    const width = shape('north', 'sans').reduce((sum, segment) => sum + segment.width * 10, 0)
    expect(x('start')).toBeCloseTo(50, 4)
    expect(x('middle')).toBeCloseTo(50 - width / 2, 4)
    expect(x('end')).toBeCloseTo(50 - width, 4)
  })
})

describe('what is not in drawing.ts is refused', () => {
  const rect = { x: 0, y: 0, width: 1, height: 1 }
  const label = { x: 0, y: 0, fontSize: 8 }
  test.each<[string, Element, string]>([
    ['an element', element('ellipse', { cx: 1, cy: 1, rx: 1, ry: 2 }), '<ellipse> is not one of the shapes'],
    ['an attribute', element('rect', { ...rect, rx: 2 }), '<rect> has the attribute `rx`'],
    ['an arc', element('path', { d: 'M0 0A1 1 0 0 1 2 2' }), 'only absolute M, L, H, V, C, Z'],
    ['a relative step', element('path', { d: 'M0 0l1 1' }), 'only absolute'],
    ['not a number', element('path', { d: 'M0 0LNaN 1' }), 'only absolute'],
    ['an empty path', element('path', { d: '' }), 'only absolute'],
    ['a colour by name', element('rect', { ...rect, fill: 'red' }), 'has the fill `red`'],
    ['a length that is no number', element('rect', { ...rect, x: 'NaN' }), 'has `NaN` as `x`'],
    ['a missing length', element('circle', { cx: 1, cy: 1 }), 'wants one number as `r`'],
    ['a scaled group', element('g', { transform: 'scale(2)' }), 'only `translate(…)`'],
    ['text in parts', element('text', label, element('tspan', {}, 'a')), 'just one text node'],
    [
      'a weight that is not there',
      element('text', { ...label, fontWeight: 700 }, 'a'),
      'asks for weight 700',
    ],
    ['an anchor that is not there', element('text', { ...label, textAnchor: 'left' }, 'a'), 'anchor `left`'],
    [
      'loose text',
      { ...svg(), tagName: 'g', properties: {}, children: [{ type: 'text', value: 'a' }] },
      'a node of the type `text`',
    ],
  ])('%s', (_, child, message) => {
    expect(() => draw(child)).toThrow(message)
  })

  test('a drawing without a size', () => {
    expect(() => svgSize(s('svg', { width: '100%', height: 50 }) as Element)).toThrow('`100%` as `width`')
    expect(() => svgSize(s('svg', { width: 0, height: 50 }) as Element)).toThrow('has no size')
  })
})
