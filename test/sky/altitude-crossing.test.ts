import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { crossingNear, transitNear } from '../../src/sky/altitude-crossing.ts'
import { utDaysOf } from '../../src/sky/present-sky.ts'
import { expectWithin } from '../published/expect-within.ts'

const at = (utc: string) => utDaysOf(new Date(utc))
const START = at('2026-08-01T00:00Z')
const RADIUS_KM = { sun: 695_700, moon: 1737.4 }
const BODIES = { sun: Astronomy.Body.Sun, moon: Astronomy.Body.Moon }
const PLACES = [
  { latitudeDeg: 51.2, longitudeDeg: -1.8, heightM: 0 },
  { latitudeDeg: -13.5, longitudeDeg: -72, heightM: 0 },
  { latitudeDeg: 40, longitudeDeg: 175, heightM: 0 },
]

describe.each(['sun', 'moon'] as const)('the %s', (name) => {
  const body = BODIES[name]

  // Where the altitude is that of the library's own horizon, its own search finds the same instant: 34′ of refraction and
  // the upper limb. Both searches stop within a second or so.
  test.each(PLACES)('rises and sets when astronomy-engine’s own search has it: %o', (place) => {
    const observer = new Astronomy.Observer(place.latitudeDeg, place.longitudeDeg, place.heightM)
    for (let day = 0; day < 200; day += 13.3)
      for (const at of ['rising', 'setting'] as const) {
        const start = START + day
        const want = Astronomy.SearchRiseSet(body, observer, at === 'rising' ? 1 : -1, start, 3)!
        const { dist } = Astronomy.Equator(body, want, observer, true, true)
        const semidiameter = Math.asin(RADIUS_KM[name] / Astronomy.KM_PER_AU / dist) * Astronomy.RAD2DEG
        for (const off of [-0.45, 0, 0.45]) {
          const got = crossingNear(name, place, want.ut + off, at, -34 / 60 - semidiameter)
          expectWithin('utDays' in got ? (got.utDays - want.ut) * 86_400 : Number.NaN, 0, 3, 'seconds', off)
        }
      }
  })

  test('culminates when astronomy-engine’s own search has it', () => {
    for (const place of PLACES) {
      const observer = new Astronomy.Observer(place.latitudeDeg, place.longitudeDeg, place.heightM)
      for (let day = 0; day < 200; day += 13.3) {
        const want = Astronomy.SearchHourAngle(body, observer, 0, START + day).time.ut
        for (const off of [-0.48, 0.1, 0.48])
          expectWithin((transitNear(name, place, want + off) - want) * 86_400, 0, 1, 'seconds', off)
      }
    }
  })
})

describe('what does not pass an altitude', () => {
  const NORTH = { latitudeDeg: 70, longitudeDeg: 20, heightM: 0 }
  test('is above it in the time of the midnight Sun, below it in the polar night', () => {
    const june = at('2027-06-21T14:11Z')
    const december = at('2026-12-21T20:50Z')
    for (const side of ['rising', 'setting'] as const) {
      expect(crossingNear('sun', NORTH, june, side, -0.8)).toEqual({ because: 'stays above that altitude' })
      expect(crossingNear('sun', NORTH, december, side, -0.8)).toEqual({
        because: 'stays below that altitude',
      })
    }
  })
})
