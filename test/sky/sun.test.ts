import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { meanObliquityDeg } from '../../src/sky/mean-obliquity.ts'
import {
  hemisphere,
  type SolsticeEvent,
  solsticeDwellDays,
  sunDistanceAu,
  sunSemidiameter,
} from '../../src/sky/sun.ts'
import { expectWithin } from '../published/expect-within.ts'

const EVENTS: readonly SolsticeEvent[] = ['june solstice', 'december solstice']

function solstice(event: SolsticeEvent, year: number): Astronomy.AstroTime {
  const { jun_solstice, dec_solstice } = Astronomy.Seasons(year)
  return event === 'june solstice' ? jun_solstice : dec_solstice
}

describe('the distance of the Sun', () => {
  // astronomy-engine has the true Sun: the Moon sways the Earth by 3.1e-5 au about the orbit tabulated here, Venus and
  // Jupiter by 2e-5 each; its own error is below 1e-6.
  test.each(EVENTS)('at the %s of recent years is that of another program', (event) => {
    for (let year = 1980; year < 2037; year += 3) {
      const time = solstice(event, year)
      const distance = Astronomy.GeoVector(Astronomy.Body.Sun, time, true).Length()
      const longitude = event === 'june solstice' ? 90 : 270
      expectWithin(sunDistanceAu(2000 + time.tt / 365.25, longitude), distance, 8e-5, 'au', year)
    }
  })

  test('is 1 − e at the perihelion of 2000 and 1 + e opposite', () => {
    // Row 2000 of orbit.csv (Laskar et al. 2004): e = 0.0167024, perihelion 102.9179°.
    expectWithin(sunDistanceAu(2000, 282.9179), 1 - 0.0167024, 1e-12, 'au', 'nearest')
    expectWithin(sunDistanceAu(2000, 102.9179), 1 + 0.0167024, 1e-12, 'au', 'farthest')
  })
})

describe('the semidiameter of the Sun', () => {
  // Method notes of this project, section 1, printed to 0.01′.
  test.each([
    [-9600, 16.31],
    [2000, 15.74],
  ])('at the June solstice of %s is %s′', (year, printed) => {
    const { arcmin, sdArcmin } = sunSemidiameter(year, 'june solstice')
    expectWithin(arcmin, printed, 0.005, 'arcmin')
    expect(sdArcmin).toBe(0)
  })

  // Astronomical almanacs (from memory): 15′44″ in early July, 16′16″ in early January; the June solstice comes
  // within 0.01′ of the first, the December one within 0.02′ of the second.
  test('of today is what the almanacs print', () => {
    expectWithin(sunSemidiameter(2026, 'june solstice').arcmin, 15 + 44 / 60, 0.02, 'arcmin')
    expectWithin(sunSemidiameter(2026, 'december solstice').arcmin, 16 + 16 / 60, 0.02, 'arcmin')
  })

  test.each(EVENTS)('from 1,000 years beyond the table is 15.99′ ± 0.27′ (%s)', (event) => {
    for (const year of [-29_000, -29_001, -100_000, 13_000, 20_000])
      expect(sunSemidiameter(year, event)).toEqual({ arcmin: 15.99, sdArcmin: 0.27 })
    for (const year of [-28_000, 12_000]) expect(sunSemidiameter(year, event).sdArcmin).toBe(0)
  })

  // A jump where the table ends would be read as a crossing of a line that lies between its two sides.
  test.each(EVENTS)('passes from the table into that mean without a jump (%s)', (event) => {
    for (const [end, outwards] of [
      [-28_000, -1],
      [12_000, 1],
    ] as const) {
      const at = (years: number) => sunSemidiameter(end + outwards * years, event)
      expectWithin(at(1e-6).arcmin, at(0).arcmin, 1e-6, 'arcmin', 'at the end of the table')
      expectWithin(at(1e-6).sdArcmin, 0, 1e-6, 'arcmin', 'at the end of the table')
      expectWithin(at(1000 - 1e-6).arcmin, 15.99, 1e-6, 'arcmin', '1,000 years beyond')
      expectWithin(at(1000 - 1e-6).sdArcmin, 0.27, 1e-6, 'arcmin', '1,000 years beyond')
      expectWithin(at(500).arcmin, (at(0).arcmin + 15.99) / 2, 1e-9, 'arcmin', 'halfway')
      expectWithin(at(500).sdArcmin, 0.135, 1e-9, 'arcmin', 'halfway')
    }
  })

  test('has strayed from 15.99′ by 0.27′ at times, and by less in the mean of the table', () => {
    const strays = EVENTS.flatMap((event) =>
      Array.from({ length: 161 }, (_, i) => sunSemidiameter(-28_000 + 250 * i, event).arcmin - 15.99),
    )
    expect(Math.hypot(...strays) / Math.sqrt(strays.length)).toBeLessThan(0.27)
    expect(Math.max(...strays)).toBeGreaterThan(0.27)
  })
})

describe('the dwell at a solstice', () => {
  /** Days in which another program's Sun keeps within a margin of its extreme declination of 2020. */
  function dwellDays(event: SolsticeEvent, marginDeg: number): number {
    const middle = solstice(event, 2020)
    const size = (days: number) => {
      const time = middle.AddDays(days)
      const place = Astronomy.GeoVector(Astronomy.Body.Sun, time, true)
      const ofDate = Astronomy.RotateVector(Astronomy.Rotation_EQJ_EQD(time), place)
      return Math.abs(Astronomy.EquatorFromVector(ofDate).dec)
    }
    const edge = (direction: 1 | -1) => {
      let [inside, outside] = [0, 30]
      for (let i = 0; i < 40; i++) {
        const day = (inside + outside) / 2
        if (size(0) - size(direction * day) < marginDeg) inside = day
        else outside = day
      }
      return inside
    }
    return edge(1) + edge(-1)
  }

  // Over the days of a dwell the speed changes by up to 0.1 %, nutation by 0.1″.
  test.each(EVENTS.flatMap((event) => [1, 10].map((arcmin) => ({ event, arcmin }))))(
    'of $arcmin′ about the $event is that of another program',
    ({ event, arcmin }) => {
      const want = dwellDays(event, arcmin / 60)
      const got = solsticeDwellDays(2020, event, meanObliquityDeg(2020), arcmin / 60)
      expectWithin(got, want, 0.001 * want, 'days')
    },
  )

  test('beyond the table goes at the mean speed, between those of the two solstices', () => {
    const dwell = (year: number, event: SolsticeEvent) => solsticeDwellDays(year, event, 23.44, 1 / 60)
    expect(dwell(2000, 'june solstice')).toBeGreaterThan(dwell(-30_000, 'june solstice'))
    expect(dwell(2000, 'december solstice')).toBeLessThan(dwell(-30_000, 'december solstice'))
  })

  test('is nothing for no margin, and has a value where the margin is wider than the declination', () => {
    expect(solsticeDwellDays(2000, 'june solstice', 23.44, 0)).toBe(0)
    // Twice the obliquity takes in the whole year, at the speed of the solstice: the Sun is 1.0163 au away then
    // (almanacs, from memory), and slower than in the mean by the square of that.
    const wholeYear = solsticeDwellDays(2000, 'june solstice', 23.44, 46.88)
    expectWithin(wholeYear, 365.2422 * 1.0163 ** 2, 0.2, 'days')
  })
})

describe('hemisphere', () => {
  test('is north in June and south in December', () => {
    expect([hemisphere('june solstice'), hemisphere('december solstice')]).toEqual([1, -1])
  })
})
