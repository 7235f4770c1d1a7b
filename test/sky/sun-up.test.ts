import * as Astronomy from 'astronomy-engine'
import { expect, test } from 'vitest'
import { isSunUp } from '../../src/sky/sun-up.ts'

const PLACE = { latitudeDeg: 51.2, longitudeDeg: -1.8, heightM: 0 }
const MINUTE = 1 / 1440

// The library's sunrise has the same 34′ of refraction and the semidiameter of the day, 0.3′ from 16′: 3 s at most here.
test('the Sun is up from sunrise to sunset', () => {
  const observer = new Astronomy.Observer(PLACE.latitudeDeg, PLACE.longitudeDeg, PLACE.heightM)
  for (let day = 9700; day < 10_065; day += 23) {
    const [rise, set] = [1, -1].map(
      (side) => Astronomy.SearchRiseSet(Astronomy.Body.Sun, observer, side, day, 2)!,
    ) as [Astronomy.AstroTime, Astronomy.AstroTime]
    expect(isSunUp(PLACE, rise.ut - MINUTE / 2)).toBe(false)
    expect(isSunUp(PLACE, rise.ut + MINUTE / 2)).toBe(true)
    expect(isSunUp(PLACE, set.ut - MINUTE / 2)).toBe(true)
    expect(isSunUp(PLACE, set.ut + MINUTE / 2)).toBe(false)
  }
})
