import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { azimuthOneAboveOtherDeg, momentsOneAboveOther } from '../../src/sky/above-one-another.ts'
import { shortPrecessionMatrix } from '../../src/sky/short-precession.ts'
import type { Star } from '../../src/sky/star-catalogue.ts'
import { starPlace, starTrack } from '../../src/sky/star-place.ts'
import { expectWithin } from '../published/expect-within.ts'
import { namedStar } from './named-star.ts'

/** The latitude of Giza, where Spence's case is set. */
const GIZA = 29.98

const KOCHAB = namedStar('Kochab')
const MIZAR = namedStar('Mizar')

type Where = (star: Star, year: number) => ReturnType<typeof starPlace>

/** Azimuth of Mizar above Kochab, arcminutes. */
function azimuthArcmin(year: number, where: Where = starPlace, kochab = KOCHAB, mizar = MIZAR): number {
  return 60 * azimuthOneAboveOtherDeg(where(kochab, year), where(mizar, year), GIZA, 'second')!
}

/** The year in which the two stand exactly above the pole and below it. */
function yearInLine(where: Where = starPlace, kochab = KOCHAB, mizar = MIZAR): number {
  let [low, high] = [-2700, -2200]
  while (high - low > 1e-4) {
    const middle = (low + high) / 2
    if (azimuthArcmin(middle, where, kochab, mizar) < 0) low = middle
    else high = middle
  }
  return low
}

describe('Kochab and Mizar', () => {
  const inLine = yearInLine()

  // Method notes of this project, section 4: 2465 BCE by the catalogue and the precession used here.
  test('pass over the pole in 2465 BCE', () => {
    expect(Math.round(inLine)).toBe(-2464)
  })

  // The pole moves by p sin ε, 4930″ · sin 23.98° a century at that time (Newcomb's general precession, 5025.64″ +
  // 2.22″ for each century from 1900, from memory), towards the equinox: across a line through it that points to a
  // right ascension of 127.4°, the mean of the two stars' (180° taken off Kochab's) in star-positions.csv.
  const poleAcrossLine = 4930 * Math.sin((23.98 * Math.PI) / 180) * Math.sin((127.4 * Math.PI) / 180)

  // Spence 2000, Nature 408, 320: 2467 BCE. The two years are left standing, for they are no more than the catalogue
  // can tell: with the pole halfway between the stars a motion good to 0.0075″ a year in each leaves the line at the
  // pole uncertain by 0.0075″ · 4464/√2, which takes the pole 1.5 years.
  test('pass over it when print has them, within the catalogue’s error', () => {
    const motions = ['properMotionRaArcsecPerYear', 'properMotionDecArcsecPerYear'] as const
    const shifts = motions.flatMap((key) => {
      const nudged = (star: Star) => ({ ...star, [key]: star[key] + 0.0075 })
      return [
        yearInLine(starPlace, nudged(KOCHAB), MIZAR) - inLine,
        yearInLine(starPlace, KOCHAB, nudged(MIZAR)) - inLine,
      ]
    })
    const sd = Math.hypot(...shifts)
    const want = (0.0075 * 4464) / Math.SQRT2 / (poleAcrossLine / 100)
    expectWithin(sd, want, 0.05 * want, 'years', 'standard deviation')
    expectWithin(inLine, -2466, 2 * sd, 'years')
  })

  // Used outside their range, the short polynomials come nearer to the printed year.
  test('by the short precession pass over it earlier, nearer to the printed year', () => {
    const short = yearInLine((star, year) => starTrack(star, shortPrecessionMatrix)(year))
    expect(short).toBeLessThan(inLine - 0.5)
    expectWithin(short, -2466, 1.5, 'years')
  })

  test('set a direction at Giza that moves as the pole does, in opposite senses for the two moments', () => {
    const want = poleAcrossLine / 60 / Math.cos((GIZA * Math.PI) / 180)
    // The stars' own motions, up to 12″ a century, are not in that.
    expectWithin(azimuthArcmin(-2414) - azimuthArcmin(-2514), want, 0.5, 'arcmin')
    const moments = momentsOneAboveOther(starPlace(KOCHAB, -2500), starPlace(MIZAR, -2500), GIZA)
    expect(moments.map(({ above }) => above).sort()).toEqual(['first', 'second'])
    expectWithin(moments[0]!.azimuthDeg, -moments[1]!.azimuthDeg, 1e-9, 'degrees')
  })
})

describe('two stars one above the other', () => {
  /** Another program's azimuth and true altitude of a place of date at an instant. */
  function horizonThere(
    time: Astronomy.AstroTime,
    place: { raDeg: number; decDeg: number },
    latitude: number,
  ) {
    return Astronomy.Horizon(time, new Astronomy.Observer(latitude, 20, 0), place.raDeg / 15, place.decDeg)
  }

  /** Another program's moments of a day at which two places have the same azimuth. */
  function momentsThere(first: ReturnType<typeof starPlace>, second: typeof first, latitude: number) {
    const start = Astronomy.MakeTime(new Date('2021-03-04T05:00:00Z'))
    const gap = (day: number) => {
      const [a, b] = [first, second].map((place) => horizonThere(start.AddDays(day), place, latitude))
      return ((a!.azimuth - b!.azimuth + 540) % 360) - 180
    }
    // A sidereal day in steps of half a minute; a jump past ±180° is no crossing.
    const steps = Array.from({ length: 2873 }, (_, i) => (i * 0.99727) / 2872)
    return steps.slice(1).flatMap((to, i) => {
      const [a, b] = [gap(steps[i]!), gap(to)]
      if (a * b > 0 || Math.abs(a - b) > 90) return []
      const time = start.AddDays(steps[i]! + ((to - steps[i]!) * a) / (a - b))
      const [p, q] = [first, second].map((place) => horizonThere(time, place, latitude))
      return [{ azimuthDeg: p!.azimuth, altitudesDeg: [p!.altitude, q!.altitude] }]
    })
  }

  test.each([
    ['Kochab', 'Mizar', -2600, 30],
    ['Kochab', 'Mizar', 1500, 55],
    ['Thuban', 'Alkaid', -2000, 25],
    ['Dubhe', 'Merak', 2000, 51],
    ['Sirius', 'Canopus', -3000, -20],
    ['Betelgeuse', 'Rigel', 500, 10],
    ['Polaris', 'Kochab', 2000, 60],
    ['Arcturus', 'Spica', -9000, 40],
  ])('%s and %s in %s at latitude %s: as another program finds them', (one, other, year, latitude) => {
    const [first, second] = [starPlace(namedStar(one), year), starPlace(namedStar(other), year)]
    const want = momentsThere(first, second, latitude)
    const got = momentsOneAboveOther(first, second, latitude)
    expect(got).toHaveLength(want.length)
    expect(got.length).toBeGreaterThan(0)
    for (const moment of got) {
      const gaps = want.map((held) =>
        Math.hypot(
          ((held.azimuthDeg - moment.azimuthDeg + 540) % 360) - 180,
          held.altitudesDeg[0]! - moment.altitudesDeg[0],
          held.altitudesDeg[1]! - moment.altitudesDeg[1],
        ),
      )
      // Steps of half a minute, joined by straight lines.
      expectWithin(Math.min(...gaps), 0, 0.01, 'degrees')
      expect(moment.above).toBe(moment.altitudesDeg[0] > moment.altitudesDeg[1] ? 'first' : 'second')
    }
  })

  test('of one right ascension stand due north, under the pole in reverse order', () => {
    const [low, high] = [
      { raDeg: 50, decDeg: 70 },
      { raDeg: 50, decDeg: 80 },
    ]
    expect(azimuthOneAboveOtherDeg(low!, high!, 45, 'first')).toBeCloseTo(0, 9)
    expect(azimuthOneAboveOtherDeg(low!, high!, 45, 'second')).toBeCloseTo(0, 9)
    // 90° − |45° − δ| high above the pole, 45° + δ − 90° under it.
    const altitudes = momentsOneAboveOther(low!, high!, 45).map((moment) =>
      moment.altitudesDeg.map(Math.round),
    )
    expect(altitudes.sort()).toEqual([
      [25, 35],
      [65, 55],
    ])
  })

  test('on opposite sides of the zenith are not one above the other', () => {
    const [south, north] = [
      { raDeg: 50, decDeg: 20 },
      { raDeg: 50, decDeg: 80 },
    ]
    // Above the pole the first is 65° high in the south; only under it do both stand in the north.
    const moments = momentsOneAboveOther(south!, north!, 45)
    expect(moments.map(({ above }) => above)).toEqual(['second'])
    expect(azimuthOneAboveOtherDeg(south!, north!, 45, 'first')).toBeNull()
  })

  test('that have set are not to be seen so', () => {
    // At latitude 45° both are highest in the south, 50° and 65° up, the northern one above; half a day later they
    // stand one above the other again, 40° and 25° under the northern horizon.
    const [low, high] = [
      { raDeg: 50, decDeg: 5 },
      { raDeg: 50, decDeg: 20 },
    ]
    const moments = momentsOneAboveOther(low, high, 45)
    expect(moments.map(({ above }) => above)).toEqual(['second', 'second'])
    expectWithin(Math.abs(azimuthOneAboveOtherDeg(low, high, 45, 'second')!), 180, 1e-6, 'degrees')
    expect(azimuthOneAboveOtherDeg(low, high, 45, 'first')).toBeNull()
    // One of them alone down is enough.
    expect(azimuthOneAboveOtherDeg({ raDeg: 50, decDeg: 60 }, high, 45, 'first')).toBeNull()
  })

  test('on a circle that misses the zenith never are', () => {
    const equator = [0, 40].map((raDeg) => ({ raDeg, decDeg: 0 }))
    expect(momentsOneAboveOther(equator[0]!, equator[1]!, 45)).toEqual([])
    expect(momentsOneAboveOther(equator[0]!, equator[0]!, 45)).toEqual([])
    expect(azimuthOneAboveOtherDeg(equator[0]!, equator[1]!, 45, 'first')).toBeNull()
  })
})
