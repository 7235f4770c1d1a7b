import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Audit, PlanPoint } from '../../../src/audit/audit.ts'
import { planFigure } from '../../../src/report/figures/plan-figure.ts'
import { makePlanAudit, point } from './plan-cases.ts'
import { badNumbers, linesOf, overlappingTexts, shapesOf, textsOf, textsOutside } from './read-drawing.ts'

fc.configureGlobal({ seed: 1977 })

const name = fc.oneof(
  fc.constantFrom('east', 'W', 'медный столб у восточных ворот', '神殿の入口', 'x'.repeat(60)),
  fc.string({ minLength: 1, maxLength: 30 }),
)
const metres = fc.oneof(
  fc.double({ min: -200, max: 200, noNaN: true }),
  fc.constantFrom(0, 0.02, 60, -60, 8000, -20_000),
)
const somewhere: fc.Arbitrary<PlanPoint> = fc
  .record({
    ...{ label: name, east: metres, north: metres },
    sd_m: fc.constantFrom(0, 0.05, 3, 500),
    width_m: fc.constantFrom(null, 0.4, 6, 300),
    form: fc.constantFrom(null, 'post', 'gap'),
  })
  .map(({ label, east, north, ...more }) => point(label, east, north, more))
const arcmin = fc.oneof(
  fc.double({ min: -300, max: 300, noNaN: true }),
  fc.constantFrom(null, 0, 9000, -10_799),
)
const tolerance = fc.constantFrom(0, 0.01, 2, 10, 60, 300, 2700)
const dates = fc
  .array(name, { maxLength: 8 })
  .map((names) => [
    ['asserted', 'asserted date', '10,551 to 10,451 BCE'] as const,
    ...names.map((label) => ['independent', label, '801 to 501 BCE'] as const),
    ['today', 'today', '2026 CE'] as const,
  ])

const audit: fc.Arbitrary<Audit> = fc
  .record({
    points: fc.array(somewhere, { maxLength: 7 }),
    lines: fc.array(
      fc.record({
        name,
        azimuthDeg: fc.double({ min: 0, max: 360, noNaN: true }),
        angleDeg: fc.option(fc.double({ min: -180, max: 180, noNaN: true }), { freq: 5 }),
        ends: fc.tuple(fc.nat(6), fc.nat(6), fc.nat(6)),
        isBare: fc.boolean(),
        sdDeg: fc.constantFrom(0, 0.001, 0.03, 2, 20),
        offsets: fc.array(arcmin, { minLength: 10, maxLength: 10 }),
        halves: fc.array(fc.constantFrom(0, 1, 30, 10_800), { minLength: 10, maxLength: 10 }),
      }),
      { minLength: 1, maxLength: 5 },
    ),
    dates,
    tolerances: fc.tuple(tolerance, tolerance),
    northSdDeg: fc.constantFrom(0, 0.5, 10),
  })
  .map(({ points, lines, dates, tolerances, northSdDeg }) =>
    makePlanAudit({
      ...{ points, dates, northSdDeg },
      plausible: { low_arcmin: Math.min(...tolerances), high_arcmin: Math.max(...tolerances), stated: true },
      lines: lines.map(({ ends: [from, to, second], isBare, angleDeg, ...line }, index) => ({
        ...line,
        name: `${line.name} ${index}`,
        ...(angleDeg === null ? {} : { angleDeg }),
        ...(isBare || Math.max(from, to, second) >= points.length || from === to
          ? {}
          : {
              from,
              to,
              ...(angleDeg === null ? { lengthM: apart(points[from]!, points[to]!) } : { second }),
            }),
      })),
    }),
  )

function apart(a: PlanPoint, b: PlanPoint): number {
  return Math.max(0.01, Math.hypot(a.east_m - b.east_m, a.north_m - b.north_m))
}

describe('any plan', () => {
  it('has no bad numbers, small type, texts that overlap or strokes beyond the edges', () => {
    fc.assert(
      fc.property(audit, (each) => {
        const { drawing } = planFigure(each)!
        expect(badNumbers(drawing)).toEqual([])
        expect(overlappingTexts(drawing)).toEqual([])
        expect(textsOutside(drawing)).toEqual([])
        expect(Math.min(...textsOf(drawing).map(({ size }) => size))).toBeGreaterThanOrEqual(7)
        for (const { x1, x2 } of linesOf(drawing)) {
          expect(Math.min(x1, x2)).toBeGreaterThanOrEqual(-0.01)
          expect(Math.max(x1, x2)).toBeLessThanOrEqual(440.01)
        }
        for (const { properties } of shapesOf(drawing, 'rect'))
          expect(Number(properties.width)).toBeGreaterThanOrEqual(0)
      }),
      { numRuns: 50 },
    )
  })
})
