import { describe, expect, test } from 'vitest'
import { posterior } from '../../src/inference/posterior.ts'
import type { Interval } from '../../src/inference/smallest-set.ts'
import { prepareSweep, sweepPoint } from '../../src/inference/sweep.ts'
import { DEG } from '../../src/quantity/degrees.ts'
import { expectWithin } from '../published/expect-within.ts'
import { seededRandom } from './seeded-random.ts'
import { WORKED, WORKED_LINE } from './sights.ts'

/**
 * The second route to the sets of the sweep (method notes of this project, section 8): dates are drawn from the prior,
 * a random build error is added to the direction that each would have, with the errors of measurement, and those are
 * kept that come within 1′ of the line. No density, no derivative and no grid of the program is used.
 */
const WINDOW = { from: -20_000, to: 2026 }
const DRAWS = 2_000_000
const NEAR_DEG = 1 / 60

interface Drawn {
  year: number
  weight: number
}

/** Declination and altitude of the target at steps of ten years, straight between them: off by less than 0.001″. */
const STEP = 10
const TRACK = Array.from({ length: (WINDOW.to - WINDOW.from) / STEP + 2 }, (_, i) => {
  const year = WINDOW.from + i * STEP
  return [WORKED_LINE.declinationDeg(year), WORKED_LINE.altitudeDeg(year)] as const
})

/** The direction that a date would have, degrees, when horizon and refraction together are off by an error. */
function azimuthDeg(year: number, altitudeErrorDeg: number): number {
  const place = (year - WINDOW.from) / STEP
  const [before, after] = [TRACK[Math.floor(place)]!, TRACK[Math.floor(place) + 1]!]
  const share = place - Math.floor(place)
  const declination = (before[0] + share * (after[0] - before[0])) * DEG
  const altitude = (before[1] + share * (after[1] - before[1]) + altitudeErrorDeg) * DEG
  const latitude = WORKED_LINE.latitudeDeg * DEG
  const cosine =
    (Math.sin(declination) - Math.sin(latitude) * Math.sin(altitude)) /
    (Math.cos(latitude) * Math.cos(altitude))
  return Math.acos(cosine) / DEG
}

/** Dates kept for a build tolerance, all with the same weight. */
function keepNear(toleranceArcmin: number): Drawn[] {
  const { uniform, normal } = seededRandom(1902)
  const kept: Drawn[] = []
  for (let i = 0; i < DRAWS; i++) {
    const year = WINDOW.from + (WINDOW.to - WINDOW.from) * uniform()
    const built =
      azimuthDeg(year, WORKED_LINE.altitudeSdDeg(year) * normal()) + (toleranceArcmin / 60) * normal()
    const measured = built + WORKED_LINE.azimuthSdDeg * normal()
    if (Math.abs(measured - WORKED_LINE.azimuthDeg) < NEAR_DEG) kept.push({ year, weight: 1 })
  }
  return kept
}

/**
 * The same without a build tolerance. Then 1′ is no longer small beside the errors, and keeping what comes so near
 * would widen the sets by 3 %: each date is weighted by how likely the measurement is of the direction it has.
 */
function weighAll(): Drawn[] {
  const { uniform, normal } = seededRandom(1903)
  return Array.from({ length: DRAWS }, () => {
    const year = WINDOW.from + (WINDOW.to - WINDOW.from) * uniform()
    const off =
      (azimuthDeg(year, WORKED_LINE.altitudeSdDeg(year) * normal()) - WORKED_LINE.azimuthDeg) /
      WORKED_LINE.azimuthSdDeg
    return { year, weight: Math.exp((-off * off) / 2) }
  })
}

/** The weight of the dates between two years as a share of the whole, with the sampling error of that share. */
function shareBetween(drawn: readonly Drawn[], inside: (year: number) => boolean) {
  let [all, within, spread] = [0, 0, 0]
  for (const { year, weight } of drawn) {
    all += weight
    if (inside(year)) within += weight
  }
  const share = within / all
  for (const { year, weight } of drawn) spread += (weight * ((inside(year) ? 1 : 0) - share)) ** 2
  return { share, error: Math.sqrt(spread) / all }
}

describe.each([
  // Largest sampling error that an edge may have for the test to mean anything, years.
  { tolerance: 0, half: 100, largest: 45 },
  { tolerance: 10, half: 200, largest: 35 },
  { tolerance: 20, half: 300, largest: 60 },
  { tolerance: 30, half: 400, largest: 90 },
])('the sets at $tolerance′ by drawing dates', ({ tolerance, half, largest }) => {
  const ground = prepareSweep([WORKED], WINDOW, { from: -9700, to: -9500 }, [])
  const { sets95, sets68 } = sweepPoint(ground, tolerance)
  const drawn = tolerance === 0 ? weighAll() : keepNear(tolerance)
  const holds = (sets: readonly Interval[]) => (year: number) =>
    sets.some(([from, to]) => from <= year && year <= to)

  test.each([
    { share: 0.95, sets: sets95 },
    { share: 0.68, sets: sets68 },
  ])('hold $share of the dates within sampling error', ({ share, sets }) => {
    const found = shareBetween(drawn, holds(sets))
    expect(found.error).toBeLessThan(0.004)
    expectWithin(found.share, share, 4 * found.error, 'of the dates')
  })

  // A set with its share of the dates is the smallest one if the dates lie equally close at all of its edges, and closer
  // inside. The density is counted over `half` years on either side of an edge; divided by its slope there, what is
  // left between two edges is a number of years.
  test('have edges at which the dates lie equally close', () => {
    const density = (middle: number) => {
      const { share, error } = shareBetween(drawn, (year) => Math.abs(year - middle) < half)
      return { height: share / (2 * half), error: error / (2 * half) }
    }
    const edges = sets95.flat().map((year, i) => {
      const inwards = i % 2 === 0 ? 1 : -1
      const here = density(year)
      const slope =
        (density(year + inwards * 2 * half).height - density(year - inwards * 2 * half).height) / (4 * half)
      return { year, ...here, slope }
    })
    expect(edges).toHaveLength(tolerance === 0 ? 4 : 2)
    const weights = edges.map(({ error }) => error ** -2)
    const level =
      edges.reduce((sum, { height }, i) => sum + height * weights[i]!, 0) / weights.reduce((a, b) => a + b)
    for (const { year, height, error, slope } of edges) {
      expect(slope, `slope at ${year}`).toBeGreaterThan(0)
      expect(error / slope, `sampling error at ${year}`).toBeLessThan(largest)
      expectWithin((height - level) / slope, 0, 4 * (error / slope), 'years', `edge at ${year}`)
    }
  })

  // The whole posterior, and not only its sets: shares up to every second millennium.
  test('come from the same posterior', () => {
    const { years, cells } = ground.window
    const { density } = posteriorOf(tolerance)
    for (let until = -18_000; until < 2000; until += 2000) {
      const found = shareBetween(drawn, (year) => year < until)
      const want = density.reduce((sum, d, i) => sum + (years[i]! < until ? d * cells[i]! : 0), 0)
      // Half a cell of the grid, 5 years, at the end.
      expectWithin(
        found.share,
        want,
        4 * found.error + 5 * Math.max(...density),
        'of the dates',
        `until ${until}`,
      )
    }
  })

  function posteriorOf(arcmin: number) {
    const whole = posterior(ground.window, arcmin / 60)
    if (whole === null) throw new Error('the worked case has weight in every year')
    return whole
  }
})
