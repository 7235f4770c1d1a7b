import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Audit } from '../../../src/audit/audit.ts'
import { premiseFigure } from '../../../src/report/figures/premise-figure.ts'
import { trackFigure } from '../../../src/report/figures/track-figure.ts'
import { impliedOf, makeShapedAudit, type Sets, stepAt, trackOf } from './make-audit.ts'
import { badNumbers, overlappingTexts, textsOf, textsOutside } from './read-drawing.ts'

fc.configureGlobal({ seed: 1977 })

const year = fc.oneof(fc.integer({ min: -25_000, max: 2100 }), fc.constantFrom(-20_000, 2026, 0, 1))
const stretch = fc.tuple(year, year).map(([a, b]): [number, number] => [Math.min(a, b), Math.max(a, b)])
const window = fc.constantFrom<[number, number]>([-20_000, 2026], [-3000, 500], [1100, 1200], [-12_000, 2026])
const label = fc.oneof(
  fc.constantFrom('radiocarbon', 'W', 'медная монета', '放射性炭素', 'x'.repeat(90)),
  fc.string({ minLength: 1, maxLength: 40 }),
)
const tolerance = fc.oneof(
  fc.double({ min: 0.001, max: 300, noNaN: true }),
  fc.constantFrom(0, 1e-9, 0.5, 10, 60, 300),
)
const limit = fc.option(tolerance)

/** Sets inside a window: separate stretches, possibly none, possibly one year long. */
function setsIn([from, to]: readonly [number, number]): fc.Arbitrary<Sets> {
  const share = fc.double({ min: 0, max: 1, noNaN: true })
  return fc.uniqueArray(share, { maxLength: 10 }).map((shares) => {
    const ends = [...shares].sort((a, b) => a - b).map((each) => from + each * (to - from))
    return Array.from(
      { length: Math.floor(ends.length / 2) },
      (_, i) => [ends[2 * i]!, ends[2 * i + 1]!] as const,
    )
  })
}

const audit: fc.Arbitrary<Audit> = window.chain((bounds) =>
  fc
    .record({
      steps: fc.array(fc.tuple(tolerance, setsIn(bounds), setsIn(bounds)), { maxLength: 12 }),
      asserted: stretch,
      others: fc.array(fc.tuple(label, stretch), { maxLength: 6 }),
      assumed: fc.option(tolerance),
      plausible: fc.tuple(tolerance, tolerance),
      limits: fc.array(fc.tuple(limit, limit, limit), { minLength: 6, maxLength: 6 }),
      noTarget: setsIn(bounds),
      outcome: fc.constantFrom('premise', 'none', 'missed', 'open', 'carried' as const),
      line: fc.record({
        value: fc.double({ min: 0, max: 360, noNaN: true }),
        sd: fc.double({ min: 0, max: 5, noNaN: true }),
      }),
      crossings: fc.array(year, { maxLength: 4 }),
      late: fc.double({ min: -3, max: 3, noNaN: true }),
    })
    .map((drawn) => {
      const byTolerance = new Map(drawn.steps.map(([at, sets95, sets68]) => [at, stepAt(at, sets95, sets68)]))
      const steps = [...byTolerance.values()].sort((a, b) => a.tolerance_arcmin - b.tolerance_arcmin)
      const [low, high] = [...drawn.plausible].sort((a, b) => a - b) as [number, number]
      return makeShapedAudit({
        window: bounds,
        asserted: drawn.asserted,
        others: drawn.others.map(([name, [from, to]]) => [name, from, to] as const),
        assumed: drawn.assumed,
        plausible: { low_arcmin: low, high_arcmin: high, stated: true },
        steps,
        limits: drawn.others.map(([name], index) => {
          const [ratio3, inSet, halfBit] = drawn.limits[index]!
          return {
            against: name,
            ratio_3_arcmin: ratio3,
            other_date_in_95_arcmin: inSet,
            half_bit_arcmin: halfBit,
          }
        }),
        noTarget: drawn.noTarget,
        outcome: drawn.outcome,
        lineDeg: drawn.line,
        tracks: [trackOf('vondrak2011', drawn.line, 0), trackOf('laskar2004', drawn.line, drawn.late)],
        implied: [
          impliedOf(drawn.crossings, {
            year: bounds[0],
            offset_arcmin: drawn.late * 40,
            sd_arcmin: 3,
            sun_widths: drawn.late,
          }),
        ],
      })
    }),
)

describe('any audit', () => {
  it('gives a premise figure without bad numbers, small type or texts that overlap', () => {
    fc.assert(
      fc.property(audit, (each) => checkFigure(premiseFigure(each).drawing)),
      { numRuns: 80 },
    )
  })

  it('gives a track figure without bad numbers, small type or texts that overlap', () => {
    fc.assert(
      fc.property(audit, (each) => checkFigure(trackFigure(each, 'midsummer').drawing)),
      { numRuns: 80 },
    )
  })
})

function checkFigure(drawing: ReturnType<typeof premiseFigure>['drawing']): void {
  expect(badNumbers(drawing)).toEqual([])
  expect(overlappingTexts(drawing)).toEqual([])
  expect(textsOutside(drawing)).toEqual([])
  expect(Math.min(...textsOf(drawing).map(({ size }) => size))).toBeGreaterThanOrEqual(7)
}
