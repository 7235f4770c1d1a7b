import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { horizonCrossing } from '../../src/site/horizontal.ts'
import type { StandstillEvent } from '../../src/sky/moon.ts'
import { nextMoonSighting } from '../../src/sky/next-moon-sighting.ts'
import { utDaysOf } from '../../src/sky/present-sky.ts'
import { standstillSeason } from '../../src/sky/standstill-season.ts'
import { expectWithin } from '../published/expect-within.ts'

const NOW = new Date('2026-08-25T00:00Z')
const PLACE = { latitudeDeg: 51.2, longitudeDeg: -1.8, heightM: 100 }
const OBSERVER = new Astronomy.Observer(PLACE.latitudeDeg, PLACE.longitudeDeg, PLACE.heightM)
const EVENTS: StandstillEvent[] = [
  'northern major standstill',
  'southern major standstill',
  'northern minor standstill',
  'southern minor standstill',
]

function seen(standstill: StandstillEvent, at: 'rising' | 'setting', now = NOW, centreAltitudeDeg = -0.83) {
  const { sighting, because } = nextMoonSighting(PLACE, { standstill, at, centreAltitudeDeg }, now)
  expect(because).toBeNull()
  return sighting!
}

/** Another program's altitude, azimuth and declination of a body. */
function bodyAt(body: Astronomy.Body, utc: string) {
  const { ra, dec } = Astronomy.Equator(body, new Date(utc), OBSERVER, true, true)
  return { ...Astronomy.Horizon(new Date(utc), OBSERVER, ra, dec), dec }
}

describe.each(EVENTS)('the next sighting of a %s', (event) => {
  test('is in its season', () => {
    const { date, note } = seen(event, 'rising')
    const [from, to] = event.includes('major') ? [2042, 2044] : [2033, 2035]
    expect(Number(date.slice(0, 4))).toBeGreaterThanOrEqual(from)
    expect(Number(date.slice(0, 4))).toBeLessThanOrEqual(to)
    expect(note.season.fromYear).toBe(from)
    expect([to - 1, to]).toContain(note.season.toYear)
  })

  test.each(['rising', 'setting'] as const)('has the %s Moon where another program has it', (at) => {
    for (const altitude of [-0.83, 1.5]) {
      const sighting = seen(event, at, NOW, altitude)
      const moon = bodyAt(Astronomy.Body.Moon, sighting.utc!)
      // The instant is told to the minute, in half of which the Moon moves by 8′ at most.
      expectWithin(moon.altitude, altitude, 8 / 60, 'degrees')
      const crossing = horizonCrossing(moon.dec, altitude, PLACE.latitudeDeg, at)!
      expectWithin(moon.azimuth, crossing.azimuthDeg, 8 / 60, 'degrees')
      const { extremes } = standstillSeason(event, utDaysOf(NOW))
      const fromExtremes = extremes.map(({ utDays }) => Math.abs(utDaysOf(new Date(sighting.utc!)) - utDays))
      const apartDays = Math.min(...fromExtremes)
      // Half a lunar day, which is up to 25.2 h long as the extreme of declination makes risings uneven.
      expectWithin(apartDays, 0, 0.53, 'days')
      expect(sighting.note.isSunUp).toBe(bodyAt(Astronomy.Body.Sun, sighting.utc!).altitude > -5 / 6)
    }
  })

  test('with the Sun down is no earlier, and has it down', () => {
    const sighting = seen(event, 'rising')
    const { withSunDown } = sighting
    if (sighting.note.isSunUp === false) expect(withSunDown?.utc).toBe(sighting.utc)
    else expect(Date.parse(withSunDown!.utc!)).toBeGreaterThan(Date.parse(sighting.utc!))
    expect(bodyAt(Astronomy.Body.Sun, withSunDown!.utc!).altitude).toBeLessThan(-5 / 6)
  })

  test('is never past, and the one after it is a later month of the season or a new season', () => {
    let now = NOW
    for (let i = 0; i < 20; i++) {
      const { utc } = seen(event, 'rising', now)
      expect(Date.parse(utc!)).toBeGreaterThanOrEqual(now.getTime())
      const days = (Date.parse(utc!) - now.getTime()) / 86_400_000
      // A minor standstill in 2034 ends by 2035 and comes back in 2052.
      if (i > 0) expect(days > 26 && days < 18.6 * 366).toBe(true)
      now = new Date(Date.parse(utc!) + 60_000)
    }
  })
})

// At a full Moon all of the disc is lit, and it rises as the Sun sets: in winter it is northern, in summer southern.
test('tells how much of the Moon is lit', () => {
  let now = NOW
  for (let i = 0; i < 12; i++) {
    const { utc, note } = seen('southern major standstill', 'rising', now)
    const elongation = Astronomy.AngleFromSun(Astronomy.Body.Moon, new Date(utc!))
    expectWithin(note.litShare, (1 - Math.cos((elongation * Math.PI) / 180)) / 2, 0.005, 'of the disc', utc!)
    now = new Date(Date.parse(utc!) + 60_000)
  }
})

test('within a season goes on with it', () => {
  const sighting = seen('northern major standstill', 'rising', new Date('2024-06-15T00:00Z'))
  expect(sighting.note.season).toMatchObject({ fromYear: 2024, toYear: 2025 })
  expect(sighting.date.slice(0, 4)).toMatch(/2024|2025/)
})

test('without a longitude tells the day alone', () => {
  const { sighting } = nextMoonSighting(
    { ...PLACE, longitudeDeg: null },
    { standstill: 'northern minor standstill', at: 'setting', centreAltitudeDeg: 0 },
    NOW,
  )
  expect(sighting).toMatchObject({ utc: null, withSunDown: null })
  expect(sighting!.note.isSunUp).toBeNull()
  const located = seen('northern minor standstill', 'setting', NOW, 0)
  expect(sighting!.date).toBe(located.date)
})

test.each([
  ['northern major standstill', 'stays above that altitude'],
  ['southern major standstill', 'stays below that altitude'],
] as const)('at 66° N a %s neither rises nor sets', (standstill, because) => {
  const sight = { standstill, at: 'rising', centreAltitudeDeg: 0 } as const
  expect(nextMoonSighting({ ...PLACE, latitudeDeg: 66 }, sight, NOW)).toEqual({ sighting: null, because })
})

test('refuses an impossible altitude', () => {
  const sight = { standstill: 'northern major standstill', at: 'rising', centreAltitudeDeg: 91 } as const
  expect(() => nextMoonSighting(PLACE, sight, NOW)).toThrow(RangeError)
})
