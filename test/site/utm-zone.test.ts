import { describe, expect, test } from 'vitest'
import { GRS80, WGS84 } from '../../src/site/ellipsoid.ts'
import { utmGrid } from '../../src/site/utm-zone.ts'

describe('utmGrid', () => {
  // NGA.SIG.0012 (from memory): zone 1 reaches from 180° W to 174° W, zone 60 ends at 180° E.
  test.each([
    [1, -177],
    [30, -3],
    [31, 3],
    [60, 177],
  ])('zone %s is centred on %s°', (zone, meridian) => {
    expect(utmGrid(zone, 'N').centralMeridianDeg).toBe(meridian)
  })

  test('counts northings from 10,000 km in the south, and stands on WGS 84 unless told otherwise', () => {
    expect(utmGrid(55, 'N').falseNorthingM).toBe(0)
    expect(utmGrid(55, 'S').falseNorthingM).toBe(10_000_000)
    expect(utmGrid(55, 'S').ellipsoid).toBe(WGS84)
    expect(utmGrid(55, 'S', GRS80).ellipsoid).toBe(GRS80)
  })

  test.each([0, 61, 31.5, Number.NaN])('refuses zone %s', (zone) => {
    expect(() => utmGrid(zone, 'N')).toThrow(
      new RangeError(`the UTM zone is ${zone}; write a whole number from 1 to 60`),
    )
  })
})
