import { describe, expect, test } from 'vitest'
import { sightOf } from '../../../src/audit/sight-of.ts'
import { compare } from '../../../src/inference/comparison.ts'
import { lnWeight } from '../../../src/inference/weight.ts'
import { DEG, wrap180 } from '../../../src/quantity/degrees.ts'
import { geodesicLine } from '../../../src/site/geodesic-line.ts'
import { type Random, seededRandom } from '../../inference/seeded-random.ts'
import { expectWithin } from '../../published/expect-within.ts'
import { DRAWS, drawSurveys, meanProduct, SAMPLING_ERROR } from '../../site/sampled-survey.ts'
import { claimText } from '../audit-of.ts'
import { settledLine, settledLines } from '../settled.ts'

/** Four times the sampling error: one seeded draw in 16,000 would be further off. */
const WITHIN = 4 * SAMPLING_ERROR

/** A plan, metres, with one standard deviation in each of east and north. */
const POINTS = {
  a: { east: 0, north: 0, sd: 0.04 },
  b: { east: 60, north: 40, sd: 0.07 },
  c: { east: -35, north: 52, sd: 0.05 },
}
type Name = keyof typeof POINTS
const pointsText = (sdOf: (sd: number) => string) =>
  `{${Object.entries(POINTS)
    .map(
      ([name, { east, north, sd }]) =>
        `${name}: {east: ${east} m, north: ${north} m, uncertainty: ${sdOf(sd)}}`,
    )
    .join(', ')}}`
const STATED = pointsText((sd) => `${sd} m`)
const EXACT = pointsText(() => '0 m')

function plan(points: string, north: string): string {
  return claimText({ points, north, sightlines: '{one: {from: a, to: b, horizon: 30′ ± 1′}}' })
}

type Places = Record<Name, { east: number; north: number }>

function drawPlaces({ normal }: Random, isExact: boolean): Places {
  const drawn = Object.entries(POINTS).map(([name, { east, north, sd }]) => {
    const error = isExact ? 0 : sd
    return [name, { east: east + error * normal(), north: north + error * normal() }]
  })
  return Object.fromEntries(drawn)
}

function bearing(places: Places, from: Name, to: Name): number {
  const [start, end] = [places[from], places[to]]
  return Math.atan2(end.east - start.east, end.north - start.north) / DEG
}

/** How far off the bearing is in each survey. */
function errorsOf(seed: number, northSdDeg: number, isExact: boolean): number[] {
  const own = bearing(POINTS, 'a', 'b')
  return drawSurveys(seed, (random) => {
    const turn = northSdDeg * random.normal()
    return wrap180(bearing(drawPlaces(random, isExact), 'a', 'b') + turn - own)
  })
}

const sdOf = (errors: readonly number[]) => Math.sqrt(meanProduct(errors, errors))

describe('the standard deviation of a line is that of surveys made again and again (JCGM 101)', () => {
  test.each([
    ['of its points', STATED, '{from: sun, uncertainty: 0°}', 0, false],
    ['of the plan’s north', EXACT, '{from: sun, uncertainty: 5′}', 5 / 60, true],
    ['of both', STATED, '{from: sun, uncertainty: 5′}', 5 / 60, false],
  ])('%s', (_, points, north, northSdDeg, isExact) => {
    const line = settledLine(plan(points, north))
    const want = sdOf(errorsOf(11, northSdDeg, isExact))
    expectWithin(Math.hypot(line.measuredSdDeg, line.northSdDeg) / want, 1, WITHIN, 'of the deviation')
  })

  test('of places on the Earth', () => {
    const eye = { latitudeDeg: 46.55, longitudeDeg: 8 }
    const peak = { latitudeDeg: 46.56, longitudeDeg: 8.03 }
    const [metresEast, metresNorth] = metresOfDegree(46.55)
    const moved = (place: typeof eye, sd: number, { normal }: Random) => ({
      latitudeDeg: place.latitudeDeg + (sd * normal()) / metresNorth,
      longitudeDeg: place.longitudeDeg + (sd * normal()) / metresEast,
    })
    const own = geodesicLine(eye, peak).azimuthDeg
    // A hundredth of the draws: each takes a geodesic. So the sampling error is ten times that of the others.
    const random = seededRandom(12)
    const errors = Array.from({ length: DRAWS / 100 }, () =>
      wrap180(geodesicLine(moved(eye, 4, random), moved(peak, 10, random)).azimuthDeg - own),
    )
    const text = claimText({
      points:
        '{eye: {latitude: 46.550000° N, longitude: 8.000000° E, uncertainty: 4 m}, peak: {latitude: 46.560000° N, longitude: 8.030000° E, uncertainty: 10 m}}',
      sightlines: '{one: {from: eye, to: peak, horizon: 3° ± 1′}}',
    })
    const line = settledLine(text)
    expectWithin(line.measuredSdDeg / sdOf(errors), 1, 10 * WITHIN, 'of the deviation')
    expect(line.northSdDeg).toBe(0)
  })
})

/** Metres of a degree of longitude and of latitude on WGS84: a cos φ/W and a(1 − e²)/W³, W² = 1 − e² sin² φ. */
function metresOfDegree(latitude: number): [number, number] {
  const [a, e2] = [6_378_137, 0.00669437999014]
  const w = Math.sqrt(1 - e2 * Math.sin(latitude * DEG) ** 2)
  return [((a * Math.cos(latitude * DEG)) / w) * DEG, ((a * (1 - e2)) / w ** 3) * DEG]
}

describe('two lines of one plan', () => {
  const text = claimText({
    points: STATED,
    north: '{from: sun, uncertainty: 5′}',
    sightlines:
      '{one: {from: a, to: b, horizon: 30′ ± 0′}, other: {from: b, to: c, horizon: 30′ ± 0′, target: {body: sun, event: december solstice, at: setting, disc: upper limb}}}',
    atmosphere: '{refraction_uncertainty: 0′}',
  })

  test('share the error of north', () => {
    const [one, other] = settledLines(text)
    const own = { ab: bearing(POINTS, 'a', 'b'), bc: bearing(POINTS, 'b', 'c') }
    const errors = drawSurveys(13, (random) => {
      const turn = (5 / 60) * random.normal()
      // Each line is surveyed with errors of its own, as the audit warns, though both use b.
      const [mine, theirs] = [drawPlaces(random, false), drawPlaces(random, false)]
      return [
        wrap180(bearing(mine, 'a', 'b') + turn - own.ab),
        wrap180(bearing(theirs, 'b', 'c') + turn - own.bc),
      ] as const
    })
    const [first, second] = [errors.map(([error]) => error), errors.map(([, error]) => error)]
    const want = meanProduct(first, second) / (sdOf(first) * sdOf(second))
    const got =
      (one!.northSdDeg * other!.northSdDeg) /
      (Math.hypot(one!.measuredSdDeg, one!.northSdDeg) * Math.hypot(other!.measuredSdDeg, other!.northSdDeg))
    // A correlation of r from n draws is good to (1 − r²)/√n.
    expectWithin(got, want, (4 * (1 - want ** 2)) / Math.sqrt(DRAWS), 'of correlation')

    // The weights take it so: Σ of the two lines from its determinant, which the weights of one and of both hold.
    const comparisons = [one!, other!].map((line) => {
      const sight = sightOf(line)
      return [compare(sight, sight.branches[0]!, 1000)]
    })
    const straight = comparisons.map(([comparison]) => {
      if (comparison?.kind !== 'straight') throw new Error('not straight')
      return comparison
    })
    const [x, y] = straight as [(typeof straight)[0], (typeof straight)[0]]
    const total = (line: typeof x) => line.variance + line.shared[0] ** 2 + line.shared[1] ** 2
    const between =
      got *
        Math.hypot(one!.measuredSdDeg, one!.northSdDeg) *
        Math.hypot(other!.measuredSdDeg, other!.northSdDeg) +
      x.shared[1] * y.shared[1]
    const determinant = total(x) * total(y) - between ** 2
    const squared =
      (total(y) * x.offsetDeg ** 2 + total(x) * y.offsetDeg ** 2 - 2 * between * x.offsetDeg * y.offsetDeg) /
      determinant
    expectWithin(lnWeight(comparisons, 0), -(Math.log(determinant) + squared) / 2, 1e-9 * squared, 'nepers')
  })
})

describe('a span between three points', () => {
  test('has the standard deviation of its three points, in which north has no part', () => {
    const text = claimText({
      points: STATED,
      north: 'unknown',
      sightlines: '{one: {span: {from: a, june: c, december: b}}}',
      target: '{body: sun, event: june to december solstice, at: rising}',
    })
    const line = settledLine(text)
    const own = bearing(POINTS, 'a', 'b') - bearing(POINTS, 'a', 'c')
    const errors = drawSurveys(14, (random) => {
      const places = drawPlaces(random, false)
      return wrap180(bearing(places, 'a', 'b') - bearing(places, 'a', 'c') - own)
    })
    expectWithin(line.measuredDeg, own, 1e-9, 'degrees')
    expectWithin(line.measuredSdDeg / sdOf(errors), 1, WITHIN, 'of the deviation')
    expect(line.northSdDeg).toBe(0)
  })
})
