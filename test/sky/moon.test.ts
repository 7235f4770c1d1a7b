import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import {
  MOON_INCLINATION_DEG,
  MOON_NEARNESS_SD,
  MOON_PARALLAX_ARCMIN,
  MOON_SEMIDIAMETER_ARCMIN,
  MOON_WOBBLE_ARCMIN,
  MOON_WOBBLE_SD_ARCMIN,
  STANDSTILL_CYCLE_YEARS,
  type StandstillEvent,
  standstillDeclinationDeg,
} from '../../src/sky/moon.ts'
import { expectWithin } from '../published/expect-within.ts'

const DEG = Math.PI / 180
const STEP_DAYS = 0.25

interface Extreme {
  year: number
  declinationDeg: number
}

/** Another program's northernmost and southernmost declinations of the Moon in every month, of date. */
function extremes(from: number, to: number): Extreme[] {
  const start = Astronomy.MakeTime(new Date(Date.UTC(from, 0, 1)))
  const steps = Math.round(((to - from) * 365.25) / STEP_DAYS)
  const rows = Array.from({ length: steps }, (_, i) => declinationAt(start.AddDays(i * STEP_DAYS)))
  return rows.slice(1, -1).flatMap((row, i) => {
    const [a, b, c] = [rows[i]!.declinationDeg, row.declinationDeg, rows[i + 2]!.declinationDeg]
    if ((b - a) * (c - b) > 0) return []
    // The top of the parabola through the three.
    return [{ year: row.year, declinationDeg: b - (c - a) ** 2 / (8 * (a - 2 * b + c)) }]
  })
}

function declinationAt(time: Astronomy.AstroTime): Extreme {
  const place = Astronomy.RotateVector(Astronomy.Rotation_EQJ_EQD(time), Astronomy.GeoMoon(time))
  return { year: 2000 + time.tt / 365.25, declinationDeg: Astronomy.EquatorFromVector(place).dec }
}

/** Longitude of the Moon's ascending node, radians: Meeus, Astronomical Algorithms, chapter 47 (from memory). */
function nodeOf(year: number): number {
  return (125.0445479 - 19.341362891 * (year - 2000)) * DEG
}

const ALL = extremes(1987, 2027)

/** The monthly extremes of the years about a standstill, on its side of the equator. */
function near(event: StandstillEvent): Extreme[] {
  const sign = event.startsWith('northern') ? 1 : -1
  const wanted = event.endsWith('major standstill') ? 1 : -1
  return ALL.filter(
    ({ year, declinationDeg }) => sign * declinationDeg > 0 && wanted * Math.cos(nodeOf(year)) > 0.9,
  )
}

const EVENTS: readonly StandstillEvent[] = [
  'northern major standstill',
  'southern major standstill',
  'northern minor standstill',
  'southern minor standstill',
]

describe('the Moon at a standstill', () => {
  // The major standstills of 1987, 2006 and 2025, the minor ones of 1997 and 2015. The mean path gives a monthly
  // extreme of the inclination of a circle crossed at the node; what is left is the wobble and, by up to 1′, smaller
  // terms.
  test.each(EVENTS)('%s: strays from another program’s monthly extremes by the wobble', (event) => {
    const months = near(event)
    expect(months.length).toBeGreaterThan(60)
    const strays = months.map(({ year, declinationDeg }) => {
      const atNode = standstillDeclinationDeg(year, event, 'vondrak2011')
      return 60 * (Math.abs(declinationDeg) - Math.abs(atNode) + shortOfStandstill(year))
    })
    const mean = strays.reduce((sum, x) => sum + x, 0) / strays.length
    const sd = Math.sqrt(strays.reduce((sum, x) => sum + (x - mean) ** 2, 0) / strays.length)
    expectWithin(mean, 0, 1, 'arcmin', 'mean')
    expectWithin(sd, MOON_WOBBLE_SD_ARCMIN, 0.3, 'arcmin', 'standard deviation')
    expect(Math.max(...strays.map(Math.abs))).toBeLessThan(MOON_WOBBLE_ARCMIN + 1)
    expect(Math.max(...strays)).toBeGreaterThan(MOON_WOBBLE_ARCMIN - 2)
    expect(Math.min(...strays)).toBeLessThan(-MOON_WOBBLE_ARCMIN + 2)
  })

  /** Degrees by which the mean path's tilt against the equator falls short of the standstill's, at another node. */
  function shortOfStandstill(year: number): number {
    const [obliquity, inclination, node] = [23.4393 * DEG, MOON_INCLINATION_DEG * DEG, nodeOf(year)]
    const tilt = Math.acos(
      Math.cos(obliquity) * Math.cos(inclination) -
        Math.sin(obliquity) * Math.sin(inclination) * Math.cos(node),
    )
    return (obliquity + Math.sign(Math.cos(node)) * inclination - tilt) / DEG
  }

  // The northernmost and southernmost Moon of these standstills as print has them (from memory): 28°43′ in September
  // 2006 and March 2025, 18°08′ in 2015. They are at the end of the wobble.
  test.each([
    ['northern major standstill', 2006, 28 + 43 / 60, 1],
    ['southern major standstill', 2025, 28 + 43 / 60, 1],
    ['northern minor standstill', 2015, 18 + 8 / 60, -1],
  ] as const)('%s of %s: print has %s°, the wobble’s end', (event, year, printed, end) => {
    const size = Math.abs(standstillDeclinationDeg(year, event, 'vondrak2011'))
    expectWithin(60 * (printed - size), end * MOON_WOBBLE_ARCMIN, 1.5, 'arcmin')
  })

  test('lies on its own side of the equator, the major one farther out', () => {
    const [northMajor, southMajor, northMinor, southMinor] = EVENTS.map((event) =>
      standstillDeclinationDeg(-2000, event, 'vondrak2011'),
    )
    expect(southMajor).toBe(-northMajor!)
    expect(southMinor).toBe(-northMinor!)
    // With the obliquity of −2000 from obliquity.csv (Vondrák 2011).
    expectWithin(northMajor! + northMinor!, 2 * 23.923517, 1e-6, 'degrees')
    expectWithin(northMajor! - northMinor!, 2 * 5.145, 1e-9, 'degrees')
  })

  test('comes back after 18.6 years', () => {
    expectWithin(STANDSTILL_CYCLE_YEARS, 360 / 19.341362891, 0.02, 'years')
  })
})

describe('the size and parallax of the Moon', () => {
  const parallaxes = Array.from({ length: 14_000 }, (_, i) => {
    const distance = Astronomy.GeoMoon(
      Astronomy.MakeTime(new Date(Date.UTC(1990, 0, 1))).AddDays(i / 2),
    ).Length()
    // The equator's radius, 6378.14 km, as seen from there.
    return (Math.asin(6378.14 / (distance * 149_597_870.7)) / DEG) * 60
  })
  const mean = parallaxes.reduce((sum, x) => sum + x, 0) / parallaxes.length

  test('are those of another program over 19 years', () => {
    expectWithin(MOON_PARALLAX_ARCMIN, mean, 0.02, 'arcmin', 'parallax')
    // The Moon's radius is 0.272481 of the Earth's (IAU 1982).
    expectWithin(MOON_SEMIDIAMETER_ARCMIN, 0.272481 * mean, 0.01, 'arcmin', 'semidiameter')
  })

  test('vary by the share stated', () => {
    const sd = Math.sqrt(parallaxes.reduce((sum, x) => sum + (x - mean) ** 2, 0) / parallaxes.length)
    expectWithin(MOON_NEARNESS_SD, sd / mean, 0.001, 'of the mean')
  })
})
