import { describe, expect, test } from 'vitest'
import {
  type Comparison,
  compare as compareWith,
  isReached,
  nearestOffset,
  offsetDeg as offsetFrom,
  offsetSdDeg as offsetSdFrom,
} from '../../src/inference/comparison.ts'
import { horizonBranch } from '../../src/inference/horizon-branch.ts'
import type { Sight } from '../../src/inference/sight.ts'
import { lnWeight } from '../../src/inference/weight.ts'
import { DEG } from '../../src/quantity/degrees.ts'
import { expectWithin } from '../published/expect-within.ts'
import {
  artificialSight,
  branchedSight,
  directionDeg,
  exactBranch,
  type HorizonLine,
  horizonSight,
  onlyBranch,
  WORKED,
  WORKED_LINE,
  WORKED_LINE_WITH_MODELS,
} from './sights.ts'

const compare = (sight: Sight, year: number) => compareWith(sight, onlyBranch(sight), year)
const offsetDeg = (sight: Sight, year: number) => offsetFrom(sight, onlyBranch(sight), year)
const offsetSdDeg = (sight: Sight, year: number) => offsetSdFrom(sight, onlyBranch(sight), year)
const lnWeightOf = (comparison: Comparison | null, tolerance: number) => lnWeight([[comparison]], tolerance)

/** The rule of the method notes, section 1: cos A = (sin δ − sin φ sin h)/(cos φ cos h); NaN where it is not reached. */
function risingAzimuth(declination: number, altitude: number, latitude: number): number {
  const [d, h, phi] = [declination * DEG, altitude * DEG, latitude * DEG]
  return Math.acos((Math.sin(d) - Math.sin(phi) * Math.sin(h)) / (Math.cos(phi) * Math.cos(h))) / DEG
}

describe('a comparison away from the meridian', () => {
  const line: HorizonLine = { ...WORKED_LINE_WITH_MODELS, azimuthSdDeg: 0.05, northSdDeg: 0.2 }
  const sight = horizonSight(line)
  const year = -9600
  const [declination, altitude] = [line.declinationDeg(year), line.altitudeDeg(year)]
  const azimuth = (byDeclination: number, byAltitude: number) =>
    risingAzimuth(declination + byDeclination, altitude + byAltitude, line.latitudeDeg)
  const perAltitude = (azimuth(0, 0.01) - azimuth(0, -0.01)) / 0.02
  const perDeclination = (azimuth(0.01, 0) - azimuth(-0.01, 0)) / 0.02

  test('is straight: its offset, its own variance, and what it shares, by plain differences', () => {
    const comparison = compare(sight, year)!
    if (comparison.kind !== 'straight') throw new Error('want a straight comparison')
    expectWithin(comparison.offsetDeg, line.azimuthDeg - azimuth(0, 0), 1e-10, 'degrees', 'offset')
    expectWithin(
      Math.sqrt(comparison.variance),
      Math.hypot(0.05, (perAltitude * 2) / 60),
      1e-6,
      'degrees',
      'own',
    )
    expectWithin(Math.sqrt(comparison.measuredVariance), 0.05, 1e-12, 'degrees', 'the survey’s part')
    expect(comparison.shared[0]).toBe(0.2)
    const byObliquity = perDeclination * line.declinationSdDeg(year)
    expectWithin(comparison.shared[1], byObliquity, 1e-6, 'degrees', 'obliquity')
  })

  test('has the same standard deviation as a whole', () => {
    const own = Math.hypot(0.05, 0.2, (perAltitude * 2) / 60, perDeclination * line.declinationSdDeg(year))
    expectWithin(offsetSdDeg(sight, year)!, own, 1e-6, 'degrees')
  })

  // A larger obliquity takes the Sun north in June, south in December.
  test('a larger obliquity turns June and December lines opposite ways', () => {
    const december = horizonSight({
      ...line,
      azimuthDeg: 120,
      declinationDeg: (y) => -line.declinationDeg(y),
      declinationSign: -1,
    })
    const [june, winter] = [compare(sight, year)!, compare(december, year)!]
    if (june.kind !== 'straight' || winter.kind !== 'straight') throw new Error('want straight comparisons')
    expect(june.shared[1]).toBeLessThan(0)
    expect(winter.shared[1]).toBeGreaterThan(0)
  })

  // Method notes, section 8: exactly the azimuth that −9600 gives, 57.9077°.
  test('puts the worked case on its printed azimuth', () => {
    expectWithin(directionDeg(WORKED, -9600)!, 57.9077, 0.0001, 'degrees')
    expectWithin(offsetDeg(WORKED, -9600)!, 0, 0.0001, 'degrees')
  })
})

describe('a setting', () => {
  // A setting is the mirror image of a rising in the meridian.
  test('is the mirror image of a rising', () => {
    const setting = horizonSight({ ...WORKED_LINE, at: 'setting', azimuthDeg: 360 - WORKED_LINE.azimuthDeg })
    for (const year of [-15_000, -9600, 0]) {
      expectWithin(directionDeg(setting, year)!, 360 - directionDeg(WORKED, year)!, 1e-10, 'degrees')
      expectWithin(offsetDeg(setting, year)!, -offsetDeg(WORKED, year)!, 1e-10, 'degrees')
      expectWithin(
        lnWeightOf(compare(setting, year), 0.1),
        lnWeightOf(compare(WORKED, year), 0.1),
        1e-9,
        'nepers',
      )
    }
  })
})

describe('a line across north from its target', () => {
  test('is off by the short way round', () => {
    const sight = artificialSight(() => 0.3, { azimuthDeg: 359.9 })
    expectWithin(offsetDeg(sight, 0)!, -0.4, 1e-9, 'degrees')
  })
})

describe('near the equator, where an altitude hardly turns the line', () => {
  // The azimuth is 90° less the declination: an error of the obliquity of 30″ turns the line by 30″, whatever the
  // altitude does, even though the line itself has no error.
  test('keeps the error of the declination', () => {
    const sight = artificialSight(() => 66, {
      altitudeSdDeg: () => 0.2,
      declinationSdDeg: () => 30 / 3600,
      azimuthDeg: 66,
    })
    const comparison = compare(sight, 0)!
    expect(comparison.kind).toBe('straight')
    expectWithin(offsetSdDeg(sight, 0)! * 3600, 30, 0.01, 'arcsec')
    expectWithin(lnWeightOf(comparison, 0), -Math.log(30 / 3600), 1e-3, 'nepers')
  })
})

describe('near the meridian', () => {
  /** A Sun that all but stays up: at latitude 66° over a horizon whose true altitude is −0.3°. */
  const line = (declination: number, changes: Partial<HorizonLine> = {}): HorizonLine => ({
    latitudeDeg: 66,
    at: 'rising',
    azimuthDeg: 5,
    azimuthSdDeg: 1 / 60,
    northSdDeg: 0,
    axis: null,
    altitudeDeg: () => -0.3,
    altitudeSdDeg: () => 0.16,
    declinationDeg: () => declination,
    declinationSdDeg: () => 0,
    declinationSign: 1,
    ...changes,
  })
  const sight = (declination: number, changes: Partial<HorizonLine> = {}) =>
    horizonSight(line(declination, changes))

  /** The weight of the method notes averaged over normal errors of altitude and declination, in small steps. */
  function averaged(given: HorizonLine, tolerance: number): number {
    const s = Math.hypot(given.azimuthSdDeg, given.northSdDeg, tolerance)
    const bySd = given.declinationSdDeg(0) === 0 ? [0] : Array.from({ length: 41 }, (_, i) => (i - 20) / 4)
    const steps = 10_000
    let sum = 0
    let mass = 0
    for (const inDeclination of bySd) {
      for (let i = -steps; i < steps; i++) {
        const inAltitude = (5 * (i + 0.5)) / steps
        const probability = Math.exp(-(inAltitude ** 2 + inDeclination ** 2) / 2)
        mass += probability
        const azimuth = risingAzimuth(
          given.declinationDeg(0) + inDeclination * given.declinationSdDeg(0),
          given.altitudeDeg(0) + inAltitude * given.altitudeSdDeg(0),
          given.latitudeDeg,
        )
        // Not reached: no weight.
        if (Number.isNaN(azimuth)) continue
        sum += (probability / s) * Math.exp(-((given.azimuthDeg - azimuth) ** 2) / (2 * s * s))
      }
    }
    return Math.log(sum / mass)
  }

  // From a Sun that rises at 10° down to one that on the mean day does not set: it grazes −0.3° at δ = 23.7°.
  test.each(
    [23.3, 23.6, 23.69, 23.71, 23.8, 24.1].flatMap((declination) =>
      [0, 10 / 60, 1].map((tolerance) => ({ declination, tolerance })),
    ),
  )(
    'the weight is the average over altitudes: δ = $declination°, τ = $tolerance°',
    ({ declination, tolerance }) => {
      const given = line(declination)
      const comparison = compare(horizonSight(given), 0)!
      expect(comparison.kind).toBe('curved')
      // Inside each of 128 pieces the azimuth is held straight. A line that is sure to 1′ looks into a single one and
      // sees 2 % of that; from 10′ on it sees several at once.
      const allowed = tolerance === 0 ? 0.025 : 0.002
      expectWithin(lnWeightOf(comparison, tolerance), averaged(given, tolerance), allowed, 'nepers')
    },
  )

  // A declination that is uncertain moves the altitude at which the Sun turns by as much: taken as one error.
  test.each([23.6, 23.8])(
    'an error of the declination counts as one of the altitude: δ = %s°',
    (declination) => {
      const given = line(declination, { altitudeSdDeg: () => 0.05, declinationSdDeg: () => 0.04 })
      expectWithin(lnWeightOf(compare(horizonSight(given), 0), 0.2), averaged(given, 0.2), 0.02, 'nepers')
    },
  )

  test('an error of north counts as the line’s own', () => {
    const given = line(23.6, { northSdDeg: 3 })
    expectWithin(lnWeightOf(compare(horizonSight(given), 0), 0.2), averaged(given, 0.2), 0.01, 'nepers')
  })

  test('there is no target where none of the likely altitudes is reached', () => {
    // The Sun's lowest altitude is φ + δ − 90°; −0.3° lies 2.5° below it, more than fifteen standard deviations.
    expect(compare(sight(26.2), 0)).toBeNull()
    for (const declination of [26.2, 24.4]) {
      expect(offsetDeg(sight(declination), 0)).toBeNull()
      expect(directionDeg(sight(declination), 0)).toBeNull()
      expect(offsetSdDeg(sight(declination), 0)).toBeNull()
    }
    expect(compare(sight(23.71, { altitudeSdDeg: () => 0 }), 0)).toBeNull()
  })

  test('tells a target that is there from one that only its errors bring up', () => {
    // Grazing is at δ = 23.7°.
    expect(isReached(compare(sight(23.69), 0))).toBe(true)
    expect(isReached(compare(sight(23.71), 0))).toBe(false)
    expect(isReached(compare(sight(24.4), 0))).toBe(false)
    expect(isReached(compare(sight(26.2), 0))).toBe(false)
    expect(isReached(compare(WORKED, -9600))).toBe(true)
  })

  test('gives the straight and the curved weight alike where one takes over from the other', () => {
    // Along declinations from 15° up the comparison turns curved somewhere; the weight must not jump there.
    let before: { kind: string; ln: number } | null = null
    let turned = false
    for (let declination = 15; declination < 23; declination += 0.01) {
      const azimuth = risingAzimuth(declination, -0.3, 66)
      const given = sight(declination, { azimuthDeg: azimuth + 1, azimuthSdDeg: 0.5 })
      const comparison = compare(given, 0)!
      const ln = lnWeightOf(comparison, 0)
      if (before !== null && before.kind !== comparison.kind) {
        turned = true
        // The curve may part from its tangent by a tenth of a standard deviation: that is what the jump is.
        expectWithin(ln, before.ln, 0.05, 'nepers', `δ = ${declination}°`)
      }
      before = { kind: comparison.kind, ln }
    }
    expect(turned).toBe(true)
  })

  test('is not taken for curved in the worked case', () => {
    for (const year of [-20_000, -9600, 2026]) expect(compare(WORKED, year)!.kind).toBe('straight')
  })

  // At 22.3° the Sun rises 17° from north, where its azimuth answers likely errors nearly in proportion; only the
  // unlikely ones that would take it to a line at 5° do more than that.
  test('is curved where only unlikely errors come near the meridian', () => {
    for (const declination of [22, 22.5]) {
      const given = line(declination)
      const comparison = compare(horizonSight(given), 0)!
      expect(comparison.kind).toBe('curved')
      for (const tolerance of [0, 10 / 60, 1]) {
        // ln weights of −20 to −50: a hundredth of a neper is nothing beside that.
        expectWithin(
          lnWeightOf(comparison, tolerance),
          farAveraged(given, tolerance),
          0.03,
          'nepers',
          tolerance,
        )
      }
    }
  })

  /** As `averaged`, over errors of up to 15 standard deviations, with the highest term taken out. */
  function farAveraged(given: HorizonLine, tolerance: number): number {
    const s = Math.hypot(given.azimuthSdDeg, tolerance)
    const [reach, steps] = [15, 100_000]
    const logs: number[] = []
    for (let i = -steps; i < steps; i++) {
      const error = (reach * (i + 0.5)) / steps
      const altitude = given.altitudeDeg(0) + error * given.altitudeSdDeg(0)
      const azimuth = risingAzimuth(given.declinationDeg(0), altitude, given.latitudeDeg)
      if (!Number.isNaN(azimuth)) logs.push(-(error ** 2 + ((given.azimuthDeg - azimuth) / s) ** 2) / 2)
    }
    const top = logs.reduce((a, b) => Math.max(a, b), -Infinity)
    const sum = logs.reduce((total, ln) => total + Math.exp(ln - top), 0)
    return top + Math.log((sum * reach) / steps / Math.sqrt(2 * Math.PI)) - Math.log(s)
  }
})

describe('by how much a target misses its altitude', () => {
  const shortfall = (declination: number, altitude: number, latitude: number) =>
    onlyBranch(
      horizonSight({
        ...WORKED_LINE,
        latitudeDeg: latitude,
        declinationDeg: () => declination,
        altitudeDeg: () => altitude,
      }),
    ).shortfallDeg!(0)!

  // A body moves between |φ + δ| − 90° and 90° − |φ − δ|.
  test.each([
    [23.5, 0, 45, 0],
    [23.5, 0, 72, 5.5],
    [-23.5, 0, 72, 5.5],
    [-23.5, 0, -72, 5.5],
    [23.5, 70, 45, 1.5],
    [23.5, -20, 45, 0],
    [23.5, -22, 45, 0.5],
    [80, 0, 89, 79],
  ])('δ = %s° at %s° from latitude %s° misses by %s°', (declination, altitude, latitude, want) => {
    expectWithin(shortfall(declination, altitude, latitude), want, 1e-9, 'degrees')
  })

  test('is not known where there is no such day or the body is never seen', () => {
    const at = (known: { altitude: boolean; declination: boolean }) =>
      horizonBranch({
        latitudeDeg: 45,
        at: 'rising',
        altitude: () => (known.altitude ? { deg: 0, errors: [] } : null),
        declination: () => (known.declination ? { deg: 20, errors: [] } : null),
      })
    for (const known of [
      { altitude: false, declination: true },
      { altitude: true, declination: false },
    ]) {
      const branch = at(known)
      expect(branch.predict(0)).toBeNull()
      expect(branch.curve!(0)).toEqual([])
      expect(branch.shortfallDeg!(0)).toBeNull()
      expect(compareWith(branchedSight([branch]), branch, 0)).toBeNull()
    }
  })
})

describe('of several branches', () => {
  const branches = [exactBranch(() => 59), exactBranch(() => 60.4), exactBranch(() => null)]

  test('the nearest to the line counts', () => {
    const nearest = nearestOffset(branchedSight(branches, { measuredSdDeg: 0.03, northSdDeg: 0.04 }), 0)!
    expectWithin(nearest.offsetDeg, -0.4, 1e-9, 'degrees')
    expectWithin(nearest.sdDeg, 0.05, 1e-9, 'degrees')
    expect(nearest.directionDeg).toBe(60.4)
    // From 359.9° the way to 59° is shorter round north than to 300°.
    const round = branchedSight([exactBranch(() => 300), exactBranch(() => 59)], { measuredDeg: 359.9 })
    expect(nearestOffset(round, 0)!.directionDeg).toBe(59)
  })

  test('there is none where none is to be seen', () => {
    expect(nearestOffset(branchedSight([exactBranch(() => null)]), 0)).toBeNull()
  })
})
