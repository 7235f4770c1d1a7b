import { describe, expect, test } from 'vitest'
import { DEG } from '../../src/quantity/degrees.ts'
import { seededRandom } from '../inference/seeded-random.ts'
import { expectWithin } from '../published/expect-within.ts'
import { SAMPLING_ERROR } from '../site/sampled-survey.ts'
import { auditOf, claimText } from './audit-of.ts'
import { auditWith, profileOf, settledLine } from './settled.ts'

const DRAWS = 200_000
const RADIUS_M = 6_371_000
/** Gauss's coefficient, and the range of clear days: both as the report prints them. */
const BENDING = { mean: 0.13, sd: 0.05 }

/** Altitude of a point over a round Earth by its two triangles, with the ray's bend taken as a larger Earth; degrees. */
function altitudeOver(distanceM: number, riseM: number, bending: number): number {
  const radius = RADIUS_M / (1 - bending)
  const angle = distanceM / radius
  // Eye at the ground; the point at the angle, `rise` above the circle.
  const across = (radius + riseM) * Math.sin(angle)
  const up = (radius + riseM) * Math.cos(angle) - radius
  return Math.atan2(up, across) / DEG
}

function seaAltitude(eyeM: number, bending: number): number {
  const radius = RADIUS_M / (1 - bending)
  return -Math.acos(radius / (radius + eyeM)) / DEG
}

function sdOf(seed: number, draw: (normal: () => number) => number): number {
  const { normal } = seededRandom(seed)
  const values = Array.from({ length: DRAWS }, () => draw(normal))
  const mean = values.reduce((sum, value) => sum + value, 0) / DRAWS
  return Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / DRAWS)
}

const withHorizon = (horizon: string) =>
  claimText({ sightlines: `{one: {azimuth: 50°32′ ± 2′, horizon: ${horizon}}}` })
const bendingOf = (normal: () => number) => BENDING.mean + BENDING.sd * normal()

describe('a horizon by distance and rise', () => {
  // The parabola in place of the circle costs Δh²/(dR): 0.06″ here.
  test('stands where the triangles over a round Earth put it', () => {
    const line = settledLine(withHorizon('{distance: 8 km ± 100 m, rise: 120 m ± 5 m}'))
    expectWithin((line.horizonDeg - altitudeOver(8000, 120, BENDING.mean)) * 3600, 0, 0.1, 'arcsec')
    expect(line.horizon).toMatchObject({ from: 'distance', distanceM: 8000, nodes: null })
  })

  test.each([
    ['{distance: 8 km ± 100 m, rise: 120 m ± 5 m}', 8000, 100, 120, 5],
    // The eye of a map: a hundredth of the distance and half a contour.
    ['{distance: 30 km, rise: 900 m}', 30_000, 300, 900, 5],
    ['{distance: 400 m ± 4 m, rise: -12 m ± 1 m}', 400, 4, -12, 1],
  ])(
    '%s: its error is that of distance, rise and bending drawn again and again',
    (horizon, distance, dSd, rise, rSd) => {
      const line = settledLine(withHorizon(horizon))
      const want = sdOf(21, (normal) =>
        altitudeOver(distance + dSd * normal(), rise + rSd * normal(), bendingOf(normal)),
      )
      expectWithin(line.horizonSdDeg / want, 1, 4 * SAMPLING_ERROR, 'of the deviation')
    },
  )
})

describe('the sea', () => {
  test.each([
    ['{sea: 25 m ± 1 m}', 25, 1],
    ['{sea: 25 m}', 25, 1],
    ['{sea: 300 m ± 2 m}', 300, 2],
  ])('%s lies below the level by the arc of its tangent', (horizon, eye, sd) => {
    const line = settledLine(withHorizon(horizon))
    expectWithin((line.horizonDeg - seaAltitude(eye, BENDING.mean)) * 3600, 0, 0.01, 'arcsec')
    const want = sdOf(22, (normal) => seaAltitude(eye + sd * normal(), bendingOf(normal)))
    // Dip goes as a root: of second order in its errors, 4 % and 6 % of it, a thousandth is missing.
    expectWithin(line.horizonSdDeg / want, 1, 4 * SAMPLING_ERROR + 1e-3, 'of the deviation')
  })

  // Navigators take 1.76′ √H (from memory), which bends a little more: 0.165 in place of 0.13, 2 % of the dip.
  test('is where a navigator has it', () => {
    expectWithin(settledLine(withHorizon('{sea: 25 m}')).horizonDeg * 60, -1.76 * 5, 0.2, 'arcmin')
  })
})

describe('a point of the survey as horizon', () => {
  const points =
    '{a: {east: 0 m, north: 0 m, up: 2 m, uncertainty: 10 cm}, b: {east: 300 m, north: 400 m, uncertainty: 10 cm}, rock: {east: 1500 m, north: 2000 m, up: 82 m, uncertainty: 50 cm}}'
  const text = claimText({
    points,
    north: '{from: sun}',
    sightlines: '{one: {from: a, to: b, horizon: {point: rock}}}',
  })

  test('is as high as it stands above the first point', () => {
    const line = settledLine(text)
    // The parabola in place of the circle costs Δh²/(dR), 0.083″, less what the bent ray takes off it.
    expectWithin((line.horizonDeg - altitudeOver(2500, 80, BENDING.mean)) * 3600, 0, 0.084, 'arcsec')
    expect(line.horizon).toMatchObject({ from: 'point', nodes: null })
    expectWithin(line.horizon.distanceM!, 2500, 1e-9, 'metres')
  })

  // Near and steep, so that the place of the rock counts as its height does.
  test('has the error of both points, height and place', () => {
    const steep = text.replace('east: 1500 m, north: 2000 m, up: 82 m', 'east: 60 m, north: 80 m, up: 62 m')
    const want = sdOf(23, (normal) => {
      const off = (sd: number) => sd * normal()
      const distance = Math.hypot(60 + off(0.5) - off(0.1), 80 + off(0.5) - off(0.1))
      return altitudeOver(distance, 60 + off(0.5) - off(0.1), bendingOf(normal))
    })
    expectWithin(settledLine(steep).horizonSdDeg / want, 1, 4 * SAMPLING_ERROR, 'of the deviation')
  })
})

describe('a profile', () => {
  const file = {
    's.csv': profileOf(
      [
        [45, 1],
        [50, 2],
        [52, 0.5],
        [60, 1.5],
      ],
      0.03,
    ),
  }
  const at = (azimuth: string) =>
    settledLine(
      claimText({ sightlines: `{one: {azimuth: ${azimuth} ± 2′, horizon: {profile: s.csv}}}` }),
      file,
    )

  test.each([
    ['47°30′', 1.5],
    ['50°', 2],
    ['51°', 1.25],
    ['58°', 1.25],
  ])('is read where the line meets it, at %s', (azimuth, altitude) => {
    const line = at(azimuth)
    expectWithin(line.horizonDeg, altitude, 1e-9, 'degrees')
    expectWithin(line.horizonSdDeg, 0.03, 1e-12, 'degrees')
  })

  test('stands in the audit as it was given, with where the line meets it', () => {
    const { sightlines } = auditWith(
      claimText({ sightlines: '{one: {azimuth: 51° ± 2′, horizon: {profile: s.csv}}}' }),
      file,
    )
    expect(sightlines[0]!.skyline).toMatchObject({
      from: 'profile',
      nodes: [
        [45, 1],
        [50, 2],
        [52, 0.5],
        [60, 1.5],
      ],
    })
    expectWithin(sightlines[0]!.skyline!.at_line_deg.value, 1.25, 1e-9, 'degrees')
  })

  test('that does not reach the line is doubtful, and a warning says so', () => {
    // At an azimuth of 63°; of a measured azimuth the reader of the file says so already.
    const text = claimText({
      north: '{from: sun}',
      points: '{a: {east: 0 m, north: 0 m}, b: {east: 89.10 m, north: 45.40 m}}',
      sightlines: '{one: {from: a, to: b, horizon: {profile: s.csv}}}',
    })
    expect(settledLine(text, file).horizonSdDeg).toBe(0.5)
    expect(auditWith(text, file).warnings.join()).toMatch(
      /the skyline profile does not reach the line itself/,
    )
  })

  test('that reaches it raises no such warning', () => {
    const text = claimText({ sightlines: '{one: {azimuth: 51° ± 2′, horizon: {profile: s.csv}}}' })
    expect(auditWith(text, file).warnings.join()).not.toMatch(/does not reach/)
  })
})

describe('no horizon at all', () => {
  test.each(['unknown', null])('%s: level, as uncertain as a hill', (horizon) => {
    const stated = horizon === null ? '' : `, horizon: ${horizon}`
    const audit = auditOf(claimText({ sightlines: `{one: {azimuth: 50°32′ ± 2′${stated}}}` }))
    expect(audit.sightlines[0]!.skyline).toMatchObject({
      from: 'level',
      nodes: [[expect.closeTo(50 + 32 / 60, 9), 0]],
    })
    expect(audit.sightlines[0]!.altitude_deg).toEqual({ value: 0, sd: 0.5 })
  })

  test('on the meridian there is none to speak of', () => {
    const text = claimText({
      sightlines: '{one: {altitude: 63° ± 2′}}',
      target: '{body: sun, event: june solstice, at: noon}',
    })
    expect(auditOf(text).sightlines[0]!.skyline).toBeNull()
  })
})
