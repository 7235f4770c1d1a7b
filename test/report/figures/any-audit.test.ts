import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Audit } from '../../../src/audit/audit.ts'
import { premiseFigure } from '../../../src/report/figures/premise-figure.ts'
import { trackFigure } from '../../../src/report/figures/track-figure.ts'
import { courseOf, impliedOf, makeShapedAudit, type Sets, stepAt, trackOf } from './make-audit.ts'
import {
  badNumbers,
  linesOf,
  overlappingTexts,
  polygonsOf,
  shapesOf,
  textsOf,
  textsOutside,
} from './read-drawing.ts'

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

/** Any course of a target: a wave that may go round and round, or vanish below some level. */
const course = fc
  .record({
    middle: fc.double({ min: -400, max: 400, noNaN: true }),
    swing: fc.oneof(fc.double({ min: 0, max: 250, noNaN: true }), fc.constant(0)),
    period: fc.double({ min: 3000, max: 60_000, noNaN: true }),
    level: fc.double({ min: -1.5, max: 1.2, noNaN: true }),
  })
  .map(({ middle, swing, period, level }) => (year: number) => {
    const phase = Math.sin((year / period) * 2 * Math.PI)
    return phase < level ? null : middle + swing * phase
  })

const otherTarget = fc
  .record({
    base: audit,
    courses: fc.array(course, { minLength: 1, maxLength: 3 }),
    second: fc.option(course),
    measures: fc.constantFrom('azimuth', 'altitude' as const),
    body: fc.constantFrom('sun', 'moon', 'star', 'two stars' as const),
    asserted: fc.option(fc.double({ min: 0, max: 360, noNaN: true })),
    sd: fc.double({ min: 0, max: 600, noNaN: true }),
    crossings: fc.array(year, { maxLength: 12 }),
  })
  .map(({ base, courses, second, measures, body, asserted, sd, crossings }): Audit => {
    const line = base.tracks[0]!.line_deg
    const names = ['March equinox', 'Kochab above', 'x'.repeat(30)]
    const tracks = courses.map((direction, branch) =>
      courseOf('vondrak2011', line, direction, {
        ...{ branch, sd, branch_words: courses.length > 1 ? names[branch]! : null },
      }),
    )
    const short = second === null ? [] : [courseOf('p03', line, second, { from: -5000, to: 10_000 })]
    return {
      ...base,
      tracks: [...tracks, ...short],
      implied: [impliedOf(crossings, crossings.length > 0 ? null : base.implied[0]!.nearest_approach)],
      sightlines: base.sightlines.map((each) => ({
        ...each,
        ...{ measures, body, direction_at_asserted_deg: asserted },
        semidiameter_arcmin: body === 'sun' || body === 'moon' ? each.semidiameter_arcmin : null,
      })),
    }
  })

describe('any other target', () => {
  it('gives a track figure without bad numbers, small type, texts that overlap or curves beyond the plot', () => {
    fc.assert(
      fc.property(otherTarget, (each) => {
        const { drawing } = trackFigure(each, 'midsummer')
        checkFigure(drawing)
        expect(strayHeights(drawing)).toEqual([])
      }),
      { numRuns: 120 },
    )
  })
})

/** Heights of curves and grounds outside the plot. */
function strayHeights(drawing: ReturnType<typeof premiseFigure>['drawing']): number[] {
  const axis = linesOf(drawing).find(({ x1, x2, y1, y2 }) => x1 === 40 && x2 === 40 && y2 - y1 > 100)!
  return shapesOf(drawing, 'path')
    .filter(
      ({ properties }) => Number(properties.strokeWidth) >= 0.8 || Number(properties.fillOpacity) === 0.09,
    )
    .flatMap(({ properties }) => polygonsOf(String(properties.d)).flat())
    .map(([, y]) => y)
    .filter((y) => y < axis.y1 - 0.01 || y > axis.y2 + 0.01)
}

function checkFigure(drawing: ReturnType<typeof premiseFigure>['drawing']): void {
  expect(badNumbers(drawing)).toEqual([])
  expect(overlappingTexts(drawing)).toEqual([])
  expect(textsOutside(drawing)).toEqual([])
  expect(Math.min(...textsOf(drawing).map(({ size }) => size))).toBeGreaterThanOrEqual(7)
}
