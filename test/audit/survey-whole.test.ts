import { describe, expect, test } from 'vitest'
import { raisedHorizon } from '../../src/audit/raised-horizon.ts'
import { sightOf } from '../../src/audit/sight-of.ts'
import type { SightlineInputs } from '../../src/audit/sightline-inputs.ts'
import { magneticDeclination } from '../../src/site/magnetic-declination.ts'
import { expectWithin } from '../published/expect-within.ts'
import { claimText } from './audit-of.ts'
import { auditWith, profileOf, settledLine } from './settled.ts'

const PLACE = '{name: Place, latitude: 50° N, longitude: 2° W, elevation: 100 m}'
const PLAN = `{
  o: {east: 0 m, north: 0 m, uncertainty: 3 cm},
  j: {east: 61 m, north: 50 m, uncertainty: 3 cm},
  d: {east: 61 m, north: -50 m, uncertainty: 3 cm},
}`
const JUNE = 'target: {body: sun, event: june solstice, at: rising, disc: upper limb}'
const DECEMBER = 'target: {body: sun, event: december solstice, at: rising, disc: upper limb}'
const SPAN = 'target: {body: sun, event: june to december solstice, at: rising, disc: upper limb}'
const LINES = `june: {from: o, to: j, horizon: 30′ ± 1′, ${JUNE}}, december: {from: o, to: d, horizon: 30′ ± 1′, ${DECEMBER}}`
const ANGLE = `angle: {span: {from: o, june: j, december: d, horizons: {june: 30′ ± 1′, december: 30′ ± 1′}}, ${SPAN}}`

const planned = (sightlines: string, north = '{from: sun, uncertainty: 1′}') =>
  claimText({ structure: PLACE, points: PLAN, north, sightlines: `{${sightlines}}`, target: null })

describe('an angle beside the lines that it is made of', () => {
  // It is their difference, and tells nothing that they do not.
  test('adds nothing to the joint reading, and a warning says so', () => {
    const [lines, both] = [LINES, `${LINES}, ${ANGLE}`].map((text) => auditWith(planned(text)))
    expect(both!.sweep.steps.map(({ bits, sets95 }) => [bits, sets95])).toEqual(
      lines!.sweep.steps.map(({ bits, sets95 }) => [bits, sets95]),
    )
    expect(both!.limits).toEqual(lines!.limits)
    expect(both!.warnings.join()).toMatch(
      /Line angle is an angle of which a line stands in the claim already/,
    )
    expect(both!.sightlines).toHaveLength(3)
  })

  test('stands alone where they do not', () => {
    const audit = auditWith(planned(ANGLE))
    expect(audit.sweep.steps[0]!.bits).toBeGreaterThan(0.1)
    expect(audit.warnings.join()).not.toMatch(/is an angle of which/)
  })
})

test('the readings of the disc of an angle are those of both its lines', () => {
  const audit = auditWith(planned(ANGLE))
  const lower = auditWith(planned(ANGLE.replace('disc: upper limb', 'disc: lower limb')))
  const reading = audit.alternatives.find(({ value }) => value === 'lower limb on the horizon')!
  const own = lower.alternatives.find(({ is_claims }) => is_claims)!
  expect(reading.years.length).toBe(own.years.length)
  for (const [i, year] of reading.years.entries()) expectWithin(year, own.years[i]!, 0.01, 'years')
})

describe('the north of a plan by compass', () => {
  const northSd = (north: string) =>
    settledLine(planned(`june: {from: o, to: j, horizon: 30′ ± 1′, ${JUNE}}`, north)).northSdDeg

  test('has the error of the magnetic model besides the compass’s own, where the claim states none', () => {
    const place = { latitudeDeg: 50, longitudeDeg: -2, heightM: 100 }
    const model = magneticDeclination(place, new Date('2021-06-12T00:00:00Z'))!
    expectWithin(
      northSd('{from: compass, date: 12 June 2021}'),
      Math.hypot(0.5, model.sdDeg),
      1e-9,
      'degrees',
    )
  })

  test('has that of a stated declination, and nothing besides a stated uncertainty', () => {
    expectWithin(
      northSd('{from: compass, declination: 3° W ± 40′}'),
      Math.hypot(30, 40) / 60,
      1e-9,
      'degrees',
    )
    expectWithin(
      northSd('{from: compass, declination: 3° W ± 40′, uncertainty: 20′}'),
      20 / 60,
      1e-9,
      'degrees',
    )
  })
})

test('a line from a plan to a place on the Earth has the error of where the plan is', () => {
  const line = settledLine(
    claimText({
      structure: PLACE,
      north: '{from: sun}',
      points:
        '{stone: {east: 0 m, north: 0 m, uncertainty: 4 m, latitude: 50.000000° N, longitude: 2.000000° W}, peak: {latitude: 50.030000° N, longitude: 1.950000° W, uncertainty: 12 m}}',
      sightlines: `{one: {from: stone, to: peak, horizon: 2° ± 1′, ${JUNE}}}`,
      target: null,
    }),
  )
  // 3 m is this program's own for a place by latitude and longitude that states nothing.
  const want = Math.hypot(4, 12, 3) / line.lengthM!
  expectWithin(line.measuredSdDeg / ((want * 180) / Math.PI), 1, 1e-9, 'of the deviation')
})

test('what half a contour of a distant skyline is worth is what a skyline 5 m higher or lower gives', () => {
  const dateOf = (rise: string) => {
    const text = claimText({
      structure: PLACE,
      sightlines: `{one: {azimuth: 52°30′ ± 2′, horizon: {distance: 8 km ± 1 m, rise: ${rise}}, ${JUNE}}}`,
      target: null,
    })
    return auditWith(text)
  }
  const base = dateOf('120 m')
  const near = (audit: typeof base) => audit.alternatives.find(({ is_claims }) => is_claims)!.nearest_year!
  const shifts = ['125 m ± 5 m', '115 m ± 5 m'].map((rise) => Math.abs(near(dateOf(rise)) - near(base)))
  const row = base.assumptions.find(
    ({ what }) => what === 'uncertainty of the horizon’s height above the eye',
  )!
  expect(row.used).toBe('± 5 m')
  expectWithin(row.effect_years! / Math.max(...shifts), 1, 0.01, 'of the effect')
})

describe('a skyline that is looked at more than once', () => {
  const nodes = Array.from({ length: 41 }, (_, i) => [40 + i * 0.75, 1 + 0.2 * Math.sin(i)] as const)
  const line = settledLine(
    claimText({
      structure: PLACE,
      sightlines: `{one: {azimuth: 52° ± 2′, horizon: {profile: s.csv}, ${JUNE}}}`,
      target: null,
    }),
    { 's.csv': profileOf(nodes, 0.03) },
  )
  const directionOf = (inputs: SightlineInputs) => sightOf(inputs).branches[0]!.predict(-3000)!.directionDeg
  /** The same without anything kept from before: what is kept hangs on the nodes themselves. */
  const afresh = (inputs: SightlineInputs): SightlineInputs => ({
    ...inputs,
    horizon: { ...inputs.horizon, nodes: inputs.horizon.nodes!.map((node) => ({ ...node })) },
  })

  test.each([
    ['raised', (inputs: SightlineInputs) => raisedHorizon(inputs, 0.3)],
    ['in other air', (inputs: SightlineInputs) => ({ ...inputs, refractionShiftArcmin: 12 })],
  ])('%s is not taken for the one before', (_, change) => {
    const before = directionOf(line)
    const after = directionOf(change(line))
    expectWithin(after, directionOf(afresh(change(line))), 1e-9, 'degrees')
    expect(Math.abs(after - before)).toBeGreaterThan(0.05)
  })
})

// On the meridian where the days meet, one place has two longitudes.
test.each([
  ['2.000000° W', '2.000000° W', '1.980000° W'],
  ['180.000000° E', '180.000000° W', '179.980000° W'],
])('two names for one place do not trouble the plan: %s and %s', (one, same, east) => {
  const audit = auditWith(
    claimText({
      structure: `{name: Place, latitude: 50° N, longitude: ${one}, elevation: 100 m}`,
      points: `{a: {latitude: 50.000000° N, longitude: ${one}}, b: {latitude: 50.010000° N, longitude: ${east}}, c: {latitude: 50.000000° N, longitude: ${same}}, e: {latitude: 50.012000° N, longitude: ${east}}}`,
      sightlines: `{one: {from: a, to: b, horizon: 30′ ± 1′}, two: {from: c, to: e, horizon: 30′ ± 1′}}`,
      target: '{body: sun, event: june solstice, at: rising, disc: upper limb}',
    }),
  )
  const [a, , c] = audit.plan.points
  expect([c!.east_m, c!.north_m]).toEqual([a!.east_m, a!.north_m])
})
