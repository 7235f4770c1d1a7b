import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { describe, expect, test } from 'vitest'
import { figuresOf, findStar, makeAudit, readClaim, renderTemplate } from '../../src/index.ts'
import { shape, text } from '../../src/report/figures/shape.ts'
import { svgRoot } from '../../src/report/figures/svg-root.ts'
import { writeSvg } from '../../src/report/write-svg.ts'
import { CHROMIUM } from './chromium.ts'
import { type MeasuredSvg, measureSvgs } from './measure-svgs.ts'

const ROOT = fileURLToPath(new URL('../../', import.meta.url))
/** On CI a missing browser is a failure. */
const SKIPPED = CHROMIUM === null && !process.env.CI
const REASON = SKIPPED ? ' (skipped: there is no chromium on PATH)' : ''

function svgsOf(sample: string): string[] {
  const { claim } = readClaim(readFileSync(`${ROOT}samples/${sample}.yaml`, 'utf8'), { findStar })
  const audit = makeAudit(claim!, {
    version: '0.0.0',
    file: `${sample}.yaml`,
    sha256: '0'.repeat(64),
    now: new Date('2026-12-01T12:00:00Z'),
    readingWarnings: [],
  })
  const { tree } = renderTemplate(readFileSync(`${ROOT}templates/audit.md`, 'utf8'), audit)
  return figuresOf(tree!).map(({ svg }) => svg)
}

/**
 * Half a unit for the layout's own rounding of glyph positions, and for the air that a text's box holds above its
 * tallest letter; a unit is a point, a letter about four.
 */
const ROUNDING = 0.5

/** The texts that do not lie wholly in the viewBox; one without a measure counts among them. */
function textsOutside({ viewBox: [x, y, width, height], texts }: MeasuredSvg): string[] {
  return texts
    .filter(
      ({ left, right, top, bottom }) =>
        !(
          left >= x - ROUNDING &&
          right <= x + width + ROUNDING &&
          top >= y - ROUNDING &&
          bottom <= y + height
        ) || !(right > left && bottom > top),
    )
    .map(({ content, left, right, top, bottom }) => `${content}: ${[left, right, top, bottom].join(' ')}`)
}

/** The largest difference in width between the same texts of two measurings. */
function mostDifference(some: readonly MeasuredSvg[], others: readonly MeasuredSvg[]): number {
  const widths = (svgs: readonly MeasuredSvg[]) =>
    svgs.flatMap(({ texts }) => texts.map(({ left, right }) => right - left))
  const second = widths(others)
  return Math.max(...widths(some).map((width, i) => Math.abs(width - second[i]!)))
}

describe.skipIf(SKIPPED)(`the SVG files in Chromium${REASON}`, () => {
  const svgs = ['thornmere', 'velahar'].flatMap(svgsOf)

  test.each(['Source Sans 3', 'DejaVu Sans'] as const)('show every text in %s', async (face) => {
    const measured = await measureSvgs(svgs, face)
    expect(measured.length).toBe(svgs.length)
    expect(svgs.length).toBeGreaterThanOrEqual(4)
    for (const svg of measured) {
      expect(svg.texts.length).toBeGreaterThan(5)
      expect(textsOutside(svg)).toEqual([])
      expect(svg.title).not.toBe('')
      expect(svg.description).not.toBe('')
    }
  })

  test('take as much room in a wide face as in their own, by the width that is written down', async () => {
    const own = await measureSvgs(svgs, 'Source Sans 3')
    const wide = await measureSvgs(svgs, 'DejaVu Sans')
    // The box holds the whole cells of the first and last letter, which kerning and squeezing move a little.
    expect(mostDifference(own, wide)).toBeLessThan(2)
    const free = svgs.map((svg) => svg.replaceAll(/ textLength="[^"]*"/g, ''))
    expect(mostDifference(own, await measureSvgs(free, 'DejaVu Sans'))).toBeGreaterThan(8)
  })

  test('hold no number that is none', () => {
    for (const svg of svgs) expect(svg).not.toMatch(/\b(?:NaN|Infinity|undefined)\b/)
  })

  test('are measured: a text over the edge is found, also a turned one', async () => {
    const turned = text(50, 40, 'turned over the edge')
    turned.properties.transform = 'rotate(90 50 40)'
    const { drawing } = svgRoot({ width: 100, height: 50 }, 'A', 'B', [
      shape('line', { x1: 0, y1: 0, x2: 9, y2: 9, stroke: '#000000' }),
      text(10, 20, 'inside'),
      text(90, 20, 'over the edge'),
      turned,
    ])
    const [measured] = await measureSvgs([writeSvg(drawing)], 'DejaVu Sans')
    expect(textsOutside(measured!).map((told) => told.replace(/:.*/, ''))).toEqual([
      'over the edge',
      'turned over the edge',
    ])
  })
})
