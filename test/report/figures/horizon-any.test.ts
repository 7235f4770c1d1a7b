import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Audit } from '../../../src/audit/audit.ts'
import { horizonCaption } from '../../../src/report/captions/horizon.ts'
import { horizonFigure } from '../../../src/report/figures/horizon-figure.ts'
import { plainText } from '../../../src/report/plain-text.ts'
import { horizonAudit, type Place } from './horizon-cases.ts'
import { badNumbers, overlappingTexts, shapesOf, textsOf, textsOutside } from './read-drawing.ts'

fc.configureGlobal({ seed: 1977 })

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const label = fc.oneof(
  fc.constantFrom('radiocarbon', 'W', 'медная монета', '放射性炭素', 'x'.repeat(90)),
  fc.string({ minLength: 1, maxLength: 40 }),
)
/** Near the line, degrees away, or anywhere. */
const right = fc.oneof(real(-2, 2), real(-120, 120), real(-10_000, 10_000), fc.constantFrom(0, 1e-9))
const altitude = fc.oneof(real(-2, 5), real(-5, 80), fc.constantFrom(0, -0.5, 25, 80))

const place = (kind: Place['kind']) =>
  fc.record({
    ...{ kind: fc.constant(kind), label, right: fc.option(right, { freq: 8 }) },
    printed: fc.constantFrom('9700 to 9500 BCE', '2026 CE', '12,345 BCE to 120 CE'),
    middle: fc.option(real(-1, 1), { freq: 4 }),
    half: real(14, 17),
    range: fc.tuple(real(-300, 0), real(0, 300)),
  })

/** Ascending nodes, some of them almost one above the other. */
const steps = fc.array(fc.tuple(fc.oneof(real(0.01, 40), fc.constant(1e-6)), real(-2, 2)), {
  minLength: 1,
  maxLength: 8,
})

const audit: fc.Arbitrary<Audit> = fc
  .record({
    ...{ asserted: place('asserted'), today: place('today'), altitude, steps },
    others: fc.array(place('independent'), { maxLength: 11 }),
    lineDeg: fc.record({ value: real(0, 360), sd: fc.oneof(real(0, 0.2), real(0, 10), fc.constant(0)) }),
    sd: fc.oneof(real(0, 0.1), real(0, 3)),
    start: real(-20, 5),
    isProfile: fc.boolean(),
    plausible: fc.tuple(real(0, 300), real(0, 300)),
  })
  .map(({ asserted, others, today, ...drawn }) => {
    const nodes: [number, number][] = [[drawn.lineDeg.value + drawn.start, drawn.altitude]]
    for (const [further, rise] of drawn.steps) {
      const [azimuth, height] = nodes.at(-1)!
      if (azimuth + further < nodes[0]![0] + 360) nodes.push([azimuth + further, height + rise])
    }
    const [low, high] = drawn.plausible.toSorted((a, b) => a - b) as [number, number]
    return horizonAudit({
      lineDeg: drawn.lineDeg,
      plausible: [low, high],
      skyline: {
        from: drawn.isProfile ? 'profile' : 'altitude',
        nodes: drawn.isProfile ? nodes : nodes.slice(0, 1),
        at_line_deg: { value: drawn.altitude, sd: drawn.sd },
      },
      places: [asserted, ...others, today].map((each) => ({
        ...each,
        middle: each.middle === null ? null : drawn.altitude + each.middle,
      })),
    })
  })

describe('any skyline', () => {
  it('gives a figure without bad numbers, small type, or texts that overlap or run out', () => {
    fc.assert(
      fc.property(audit, (each) => {
        const { drawing, alt } = horizonFigure(each, 'midsummer')
        expect(badNumbers(drawing)).toEqual([])
        expect(overlappingTexts(drawing)).toEqual([])
        expect(textsOutside(drawing)).toEqual([])
        expect(Math.min(...textsOf(drawing).map(({ size }) => size))).toBeGreaterThanOrEqual(7)
        const caption = horizonCaption(each, each.sightlines[0]!).map(plainText).join('')
        for (const words of [alt, caption]) expect(words).not.toMatch(/NaN|undefined|Infinity/)
      }),
      { numRuns: 150 },
    )
  })

  it('shows every target, as a circle between its least and largest size or as a cross, or points to it', () => {
    fc.assert(
      fc.property(audit, (each) => {
        const { drawing } = horizonFigure(each, 'midsummer')
        const circles = shapesOf(drawing, 'circle')
        const arrows = shapesOf(drawing, 'path').filter(
          ({ properties }) => properties.fill !== 'none' && properties.fillOpacity === undefined,
        )
        const crosses = shapesOf(drawing, 'line').filter(
          ({ properties: { x1, x2, y1, y2 } }) =>
            Math.abs(Number(x2) - Number(x1) - 6.4) < 0.03 && Math.abs(Number(y2) - Number(y1) - 6.4) < 0.03,
        )
        const placed = each.placements.filter(({ direction_deg }) => direction_deg !== null)
        expect(circles.length + crosses.length + arrows.length).toBe(placed.length)
        // 6 to 72 points for the Sun at 32′, as near as its limits take that; half widths of 14′ to 17′ are drawn here.
        for (const { properties } of circles) {
          expect(Number(properties.r)).toBeGreaterThan(2.6)
          expect(Number(properties.r)).toBeLessThan(38.5)
        }
      }),
      { numRuns: 150 },
    )
  })
})
