import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Outcome } from '../../src/audit/audit.ts'
import { auditImplied } from '../../src/audit/audit-implied.ts'
import { auditLimits } from '../../src/audit/audit-limits.ts'
import { auditSightline } from '../../src/audit/audit-sightline.ts'
import { auditSweep, groundOf, sweepStep } from '../../src/audit/audit-sweep.ts'
import { verdictOf } from '../../src/audit/outcome.ts'
import { settleClaim } from '../../src/audit/settle-claim.ts'
import { findStar } from '../../src/audit/star-names.ts'
import type { SummaryFacts } from '../../src/audit/summary/summary-facts.ts'
import { writeSummary } from '../../src/audit/summary/write-summary.ts'
import { takenAs } from '../../src/audit/taken-as.ts'
import { readClaim } from '../../src/claim/read-claim.ts'
import { claimText } from './audit-of.ts'

/** What the finding is written from, without the parts of an audit that it does not use. */
function factsOf(text: string): SummaryFacts {
  const { claim, problems } = readClaim(text, { findStar })
  if (claim === null) throw new Error(problems.map(({ message }) => message).join('\n'))
  const { lines, sights, dates, plausible, yardstick, wantedArcmin } = settleClaim(claim)
  const { asserted, others, window } = dates
  const ground = groundOf(sights, dates)
  const sweep = auditSweep(ground, dates, yardstick, wantedArcmin)
  const limits = auditLimits(ground, dates, yardstick.marker)
  const sightlines = lines.map((line) => auditSightline(line, asserted, null, null))
  const plausibleArcmin = [plausible.low_arcmin, plausible.high_arcmin]
  const { outcome, misfits } = verdictOf({ sights, joint: sights, dates, ground, limits, plausibleArcmin })
  return {
    ...{ outcome, asserted, other_dates: others, plausible, window, sightlines, sweep, limits, misfits },
    implied: lines.map((line) => auditImplied(line, 'vondrak2011', window, 2026, 2026)),
    atOffset: misfits.length === 0 ? null : sweepStep(ground, dates, yardstick, 90),
    taken: lines.map((line, i) => takenAs(claim.sightlines[i]!, line, asserted)),
    isUnsteady: false,
    northTaken: text.includes('points:'),
  }
}

const OTHERS = '[{label: a, date: 300 CE}, {label: b, date: 400 CE}, {label: c, date: 500 to 600 CE}]'
const WITHIN = (changes: Readonly<Record<string, string | null>>) => ({
  window: '6000 BCE to 1000 CE',
  ...changes,
})
const place = (latitude: string) => `{name: Place, latitude: ${latitude}, elevation: 0 m}`
const POINTS =
  '{p: {east: 0 m, north: 0 m, uncertainty: 1 cm}, q: {east: 77.19 m, north: 63.6 m, uncertainty: 1 cm}, r: {east: -77.19 m, north: 63.6 m}}'
const sunset = 'target: {body: sun, event: june solstice, at: setting}'

/** Claims of each outcome, with targets of each kind, one line or several, and much or little left unknown. */
const CLAIMS: readonly (readonly [Outcome, Readonly<Record<string, string | null>>])[] = [
  ['open', WITHIN({})],
  ['open', WITHIN({ structure: place('65.4° N'), sightlines: '{a: {azimuth: 3° ± 30′, horizon: 0° ± 1′}}' })],
  [
    'open',
    WITHIN({ target: '{body: sun, event: equinox, at: setting}', sightlines: '{a: {azimuth: 270°40′}}' }),
  ],
  ['premise', WITHIN({ other_dates: OTHERS })],
  [
    'premise',
    WITHIN({ other_dates: OTHERS, points: POINTS, sightlines: '{a: {from: p, to: q, horizon: 30′}}' }),
  ],
  [
    'premise',
    WITHIN({
      other_dates: OTHERS,
      points: POINTS,
      sightlines: `{a: {from: p, to: q, horizon: 30′}, b: {from: p, to: r, horizon: 30′, ${sunset}}}`,
      plausible_precision: '5′ to 40′',
    }),
  ],
  [
    'carried',
    WITHIN({
      other_dates: OTHERS,
      plausible_precision: '1′ to 2′',
      atmosphere: '{refraction_uncertainty: 1′}',
    }),
  ],
  [
    'carried',
    WITHIN({
      other_dates: OTHERS,
      points: POINTS,
      sightlines: `{a: {from: p, to: q, horizon: 30′}, b: {from: p, to: r, horizon: 30′, ${sunset}}}`,
      plausible_precision: '1′ to 2′',
      atmosphere: '{refraction_uncertainty: 1′}',
    }),
  ],
  [
    'carried',
    WITHIN({
      structure: place('30° N'),
      target: '{bodies: [Kochab, Mizar], event: one above the other}',
      sightlines: '{a: {azimuth: 0° ± 2′}}',
      asserted_date: '2467 BCE ± 10',
      window: '3000 BCE to 1000 BCE',
      other_dates: OTHERS,
    }),
  ],
  [
    'missed',
    WITHIN({
      target: '{body: sun, event: june solstice, at: rising, disc: unknown}',
      sightlines: '{a: {azimuth: 51°18′ ± 2′, horizon: 30′ ± 1′}}',
      atmosphere: '{refraction_uncertainty: 1′}',
    }),
  ],
  [
    'missed',
    WITHIN({
      points: POINTS.replace('63.6 m, unc', '61 m, unc').replace('63.6 m}', '61 m}'),
      target: '{body: sun, event: june solstice, at: rising, disc: unknown}',
      sightlines: `{a: {from: p, to: q, horizon: 30′ ± 1′}, b: {from: p, to: r, horizon: 30′ ± 1′, ${sunset}}}`,
      atmosphere: '{refraction_uncertainty: 1′}',
      other_dates: OTHERS,
    }),
  ],
  [
    'missed',
    WITHIN({
      structure: place('26.5° N'),
      target: '{body: Sirius, at: rising}',
      sightlines: '{a: {azimuth: 113° ± 2′}, b: {azimuth: 113°02′ ± 2′}, c: {azimuth: 113°01′ ± 2′}}',
      asserted_date: '997 CE',
    }),
  ],
  [
    'missed',
    WITHIN({
      structure: place('34° N'),
      target: '{body: Thuban, at: upper culmination}',
      sightlines: '{a: {altitude: 36° ± 2′}}',
      asserted_date: '1000 BCE to 500 BCE',
    }),
  ],
  [
    'none',
    WITHIN({
      structure: place('47° N'),
      target: '{body: sun, event: december solstice, at: setting, disc: unknown}',
      sightlines: '{a: {azimuth: 228° ± 2′}, b: {azimuth: 228°30′ ± 2′}}',
    }),
  ],
  [
    'none',
    WITHIN({
      structure: place('70° N'),
      target: '{body: moon, event: southern major standstill, at: rising}',
      sightlines: '{a: {azimuth: 170° ± 2′}}',
    }),
  ],
  [
    'none',
    WITHIN({
      target: '{body: sun, day: 45 days before december solstice, at: rising}',
      sightlines: '{a: {azimuth: 95° ± 2′}, b: {azimuth: 250° ± 2′}, c: {azimuth: 100° ± 2′}}',
    }),
  ],
]

const WORDS = [
  'radiocarbon',
  'dates',
  'of',
  'charred',
  'seeds',
  'from',
  'the',
  'third',
  'pit',
  'and',
  'its',
  'rim',
]
const naming = fc
  .tuple(fc.integer({ min: 1, max: 14 }), fc.integer({ min: 0, max: 11 }))
  .map(([length, from]) => Array.from({ length }, (_, i) => WORDS[(from + i) % WORDS.length]!).join(' '))

/** The same facts with as many dates and parts of sets as a fast star may have. */
function crowded(facts: SummaryFacts): SummaryFacts {
  const dates = [-5990, -4410, -3330, -2220, -1110, 4440, 5550].map((year) => ({
    ...{ year, low95: null, high95: null, future: year > 2026 },
    in_window: year < 1000,
  }))
  const sets95 = [-5000, -3800, -2600, -1400, -200].map((from) => [from, from + 900] as const)
  return {
    ...facts,
    implied: facts.implied.map((row) => ({ ...row, dates })),
    sweep: { ...facts.sweep, steps: facts.sweep.steps.map((step) => ({ ...step, sets95, bits: 3 })) },
    atOffset: facts.atOffset === null ? null : { ...facts.atOffset, sets95 },
  }
}

/** The same facts with other names of lines and labels of dates. */
function renamed(facts: SummaryFacts, names: readonly string[]): SummaryFacts {
  const lineName = (i: number) => `${names[i % names.length]} ${i}`
  const labels = new Map(
    facts.other_dates.map(({ label }, i) => [label, `${names[(i + 4) % names.length]} ${i}`]),
  )
  return {
    ...facts,
    sightlines: facts.sightlines.map((line, i) => ({ ...line, name: lineName(i) })),
    implied: facts.implied.map((row, i) => ({ ...row, sightline: lineName(i) })),
    other_dates: facts.other_dates.map((date) => ({ ...date, label: labels.get(date.label)! })),
    limits: facts.limits.map((limit) => ({ ...limit, against: labels.get(limit.against ?? '') ?? null })),
  }
}

describe('the finding of page one', () => {
  const bases = CLAIMS.map(([outcome, changes]) => ({ outcome, facts: factsOf(claimText(changes)) }))

  test('is written for each outcome', () => {
    expect(bases.map(({ facts }) => facts.outcome)).toEqual(bases.map(({ outcome }) => outcome))
    expect(new Set(bases.map(({ outcome }) => outcome)).size).toBe(5)
  })

  test('has at most 150 words, whatever its lines and dates are called', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...bases),
        fc.array(naming, { minLength: 9, maxLength: 9 }),
        fc.boolean(),
        ({ facts }, names, isCrowded) => {
          const text = writeSummary(renamed(isCrowded ? crowded(facts) : facts, names)).join(' ')
          expect(text.split(/\s+/).length, text).toBeLessThanOrEqual(150)
          expect(text).not.toMatch(/NaN|undefined|null|Infinity|\[object| {2}|the wh/)
        },
      ),
      { seed: 150, numRuns: 600 },
    )
  })
})
