import { describe, expect, test } from 'vitest'
import { utDaysOf } from '../../src/sky/present-sky.ts'
import { isoDay, isoMinute, locatedPlace } from '../../src/sky/sky-place.ts'

const at = (utc: string) => utDaysOf(new Date(utc))
const NOW = new Date('2026-08-01T00:00Z')
const PLACE = { latitudeDeg: 50, longitudeDeg: 10, heightM: 0 }

describe('an instant', () => {
  test('is told to the nearest minute', () => {
    expect(isoMinute(at('2027-06-21T14:11:29Z'))).toBe('2027-06-21T14:11Z')
    expect(isoMinute(at('2027-06-21T14:11:31Z'))).toBe('2027-06-21T14:12Z')
    expect(isoMinute(at('2026-12-31T23:59:40Z'))).toBe('2027-01-01T00:00Z')
  })

  test.each([
    ['2027-06-21T14:11Z', 0, '2027-06-21'],
    ['2027-06-21T14:11Z', null, '2027-06-21'],
    ['2027-06-21T14:11Z', 150, '2027-06-22'],
    ['2027-06-21T03:00Z', -60, '2027-06-20'],
    ['2027-06-21T04:01Z', -60, '2027-06-21'],
  ])('%s is at longitude %s on %s', (utc, longitude, day) => {
    expect(isoDay(at(utc), longitude)).toBe(day)
  })
})

describe('a place', () => {
  test('without a longitude is looked at from Greenwich', () => {
    expect(locatedPlace({ ...PLACE, longitudeDeg: null }, NOW)).toEqual({ ...PLACE, longitudeDeg: 0 })
    expect(locatedPlace(PLACE, NOW)).toEqual(PLACE)
  })

  test.each([
    [{ ...PLACE, latitudeDeg: 91 }, NOW, 'latitude is 91°'],
    [{ ...PLACE, latitudeDeg: Number.NaN }, NOW, 'latitude is NaN°'],
    [{ ...PLACE, longitudeDeg: 200 }, NOW, 'longitude is 200°'],
    [{ ...PLACE, heightM: Number.POSITIVE_INFINITY }, NOW, 'height is Infinity m'],
    [PLACE, new Date('1850-01-01T00:00Z'), 'now is in the year 1850'],
    [PLACE, new Date('nonsense'), 'now is in the year NaN'],
  ])('that cannot be is refused: %o', (place, now, message) => {
    expect(() => locatedPlace(place, now)).toThrow(RangeError)
    expect(() => locatedPlace(place, now)).toThrow(message)
  })
})
