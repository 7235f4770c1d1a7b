import { describe, expect, test } from 'vitest'
import { compare } from '../../src/inference/comparison.ts'
import { bestFit, isFit } from '../../src/inference/fit.ts'
import { crossingYears } from '../../src/inference/implied-dates.ts'
import { lnRatio, prepareSweep } from '../../src/inference/sweep.ts'
import { DEG } from '../../src/quantity/degrees.ts'
import { standardPressureHpa, standardTemperatureC } from '../../src/site/air.ts'
import { centreAltitudeDeg } from '../../src/site/centre-altitude.ts'
import { refractionArcmin } from '../../src/site/refraction.ts'
import { meanObliquityDeg } from '../../src/sky/mean-obliquity.ts'
import { modelSpreadSdDeg, NUTATION_SD_DEG } from '../../src/sky/solstice-declination.ts'
import { SUN_PARALLAX_ARCSEC, sunSemidiameter } from '../../src/sky/sun.ts'
import { expectWithin } from '../published/expect-within.ts'
import { seededRandom } from './seeded-random.ts'
import { directionDeg, type HorizonLine, horizonSight, onlyBranch, WORKED_LINE } from './sights.ts'

const LATITUDE_DEG = 66.3
const REFRACTION_ARCMIN = refractionAt(1)
/** The horizon's 1′, less what refraction changes with it, and the day's scatter of 9.6′ e^−1. */
const ALTITUDE_SD_DEG = Math.hypot(1 - (refractionAt(1.05) - refractionAt(0.95)) / 6, 9.6 * Math.exp(-1)) / 60

/**
 * A line 1° from north at latitude 66.3°, where the June Sun of −2000 rose 10° and that of 1000 14° from north: only
 * errors of altitude of 11 and 12 standard deviations take it to the line. Carried on straight from the likely errors
 * the weight of 1000 would be e^170 too small.
 */
const NEAR_NORTH: HorizonLine = {
  latitudeDeg: LATITUDE_DEG,
  at: 'rising',
  azimuthDeg: 1,
  azimuthSdDeg: 1 / 60,
  northSdDeg: 0,
  axis: null,
  altitudeDeg: () => centreAltitudeDeg(1, REFRACTION_ARCMIN, 0, SUN_PARALLAX_ARCSEC),
  altitudeSdDeg: () => ALTITUDE_SD_DEG,
  declinationDeg: meanObliquityDeg,
  declinationSdDeg: (year) => Math.hypot(modelSpreadSdDeg(year), NUTATION_SD_DEG),
  declinationSign: 1,
}

function refractionAt(altitudeDeg: number): number {
  const air = {
    heightM: 100,
    temperatureC: standardTemperatureC(100),
    pressureHpa: standardPressureHpa(100),
    humidity: 0,
    lapseKPerKm: 6.5,
  }
  return refractionArcmin(altitudeDeg, air, LATITUDE_DEG)
}

/** The rule of the method notes of this project, section 1; NaN where the altitude is not reached. */
function risingAzimuth(declination: number, altitude: number, latitude: number): number {
  const [d, h, phi] = [declination * DEG, altitude * DEG, latitude * DEG]
  return Math.acos((Math.sin(d) - Math.sin(phi) * Math.sin(h)) / (Math.cos(phi) * Math.cos(h))) / DEG
}

/** ln of the weight averaged over errors of altitude and declination, in small steps; the highest term taken out. */
function lnAveraged(line: HorizonLine, year: number, toleranceDeg: number): number {
  const s = Math.hypot(line.azimuthSdDeg, toleranceDeg)
  const [reach, steps] = [20, 20_000]
  const [mean, sd] = [line.altitudeDeg(year), line.altitudeSdDeg(year)]
  const logs: number[] = []
  for (let j = -8; j <= 8; j++) {
    const inDeclination = j / 2
    const declination = line.declinationDeg(year) + inDeclination * line.declinationSdDeg(year)
    for (let i = -steps; i < steps; i++) {
      const inAltitude = (reach * (i + 0.5)) / steps
      const azimuth = risingAzimuth(declination, mean + inAltitude * sd, line.latitudeDeg)
      if (Number.isNaN(azimuth)) continue
      const off = (line.azimuthDeg - azimuth) / s
      logs.push(-(inAltitude ** 2 + inDeclination ** 2 + off ** 2) / 2)
    }
  }
  const top = logs.reduce((a, b) => Math.max(a, b), -Infinity)
  const sum = logs.reduce((total, ln) => total + Math.exp(ln - top), 0)
  return top + Math.log((sum * reach) / steps / 2 / (2 * Math.PI)) - Math.log(s)
}

describe('a line near north at the edge of the midnight sun', () => {
  const at = (year: number) => ({ from: year, to: year })
  const sight = horizonSight(NEAR_NORTH)
  const ground = prepareSweep([sight], { from: -5000, to: 2000 }, at(-2000), [at(1000)])

  test('has the Sun of both dates well beside it', () => {
    expectWithin(directionDeg(sight, -2000)!, 10, 1, 'degrees')
    expectWithin(directionDeg(sight, 1000)!, 14, 1, 'degrees')
    for (const year of [-2000, 1000]) expect(compare(sight, onlyBranch(sight), year)!.kind).toBe('curved')
  })

  // The second figure is a reviewer's of the first version of this program, by an integral of his own, to a tenth.
  test.each([
    [0, 52.4],
    [10, 52.4],
    [30, 51.7],
    [120, 10.5],
  ])('has at %s′ the ratio of the integrals over all errors, ln %s', (arcmin, reviewed) => {
    const got = lnRatio(ground, 0, arcmin)!
    const want = lnAveraged(NEAR_NORTH, -2000, arcmin / 60) - lnAveraged(NEAR_NORTH, 1000, arcmin / 60)
    // At τ = 0 the line, sure to 1′, looks at the azimuths inside one or two pieces, held straight.
    expectWithin(got, want, arcmin === 0 ? 0.15 : 0.03, 'nepers', 'here')
    expectWithin(want, reviewed, 0.25, 'nepers', 'his')
  })
})

describe('how well a line fits a Sun that hardly sets', () => {
  /** Lines surveyed of a Sun of a declination whose altitude is off by a normal error; null where it stayed up. */
  const line = (declination: number): HorizonLine => ({
    ...NEAR_NORTH,
    latitudeDeg: 66,
    altitudeDeg: () => -0.3,
    altitudeSdDeg: () => 0.16,
    declinationDeg: () => declination,
    declinationSdDeg: () => 0,
  })
  const squaredOf = (declination: number, azimuthDeg: number) =>
    bestFit([horizonSight({ ...line(declination), azimuthDeg })], { from: 0, to: 0 }).squared

  // It grazes −0.3° at δ = 23.7°. Away from there the distribution is that of χ², close to it skewed: some percent
  // more or fewer fit.
  test.each([
    [22.5, 0.015],
    [23, 0.015],
    [23.3, 0.02],
    [23.5, 0.04],
  ])('is a fit for 95 % of true lines: δ = %s°', (declination, allowed) => {
    const { normal } = seededRandom(66)
    let [fitting, seen] = [0, 0]
    for (let i = 0; i < 2000; i++) {
      const azimuth = risingAzimuth(declination, -0.3 + 0.16 * normal(), 66) + normal() / 60
      if (Number.isNaN(azimuth)) continue
      seen++
      if (isFit({ year: 0, squared: squaredOf(declination, azimuth) }, 1)) fitting++
    }
    expectWithin(fitting / seen, 0.95, allowed, 'of the lines')
  })

  test('is none where it takes more than likely errors for the Sun to set at all', () => {
    // 1.5, 2.5 and 5 standard deviations of altitude: it grazes there, a degree or two from north.
    for (const [sd, fits] of [
      [1.5, true],
      [2.5, false],
      [5, false],
    ] as const) {
      const declination = 23.7 + 0.16 * sd
      const azimuths = [1, 2, 3, 4].map((azimuth) => squaredOf(declination, azimuth))
      expect(Math.min(...azimuths)).toBeGreaterThanOrEqual(sd ** 2)
      expect(isFit({ year: 0, squared: Math.min(...azimuths) }, 1), `${sd} sd`).toBe(fits)
    }
  })
})

describe('where the table of the orbit ends', () => {
  /** The worked case at latitude 45°, on the azimuth that the Sun of −28000 would have with a semidiameter halfway. */
  const between = (() => {
    const line = { ...WORKED_LINE, latitudeDeg: 45 }
    const held = sunSemidiameter(-28_000, 'june solstice').arcmin
    const halfway = { ...line, altitudeDeg: (year: number) => line.altitudeDeg(year) + (held - 15.99) / 120 }
    return horizonSight({ ...line, azimuthDeg: directionDeg(horizonSight(halfway), -28_000)! })
  })()

  test('no date is found that only a jump of the Sun’s size would make', () => {
    // The Sun's own course takes it over the line 20 years later.
    for (const year of crossingYears(between, -28_100, -27_900, 10))
      expect(Math.abs(year + 28_000)).toBeGreaterThan(5)
    const before = directionDeg(between, -28_000 - 1e-4)!
    expectWithin(before, directionDeg(between, -28_000 + 1e-4)!, 1e-6, 'degrees')
  })

  test('every date found is one on which the target stands on the line', () => {
    for (const year of crossingYears(between, -40_000, 0, 10))
      expectWithin(directionDeg(between, year)!, between.measuredDeg, 1e-7, 'degrees', year)
  })
})
