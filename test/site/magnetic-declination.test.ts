import { describe, expect, test } from 'vitest'
import { MAGNETIC_MODEL_SPAN, magneticDeclination } from '../../src/site/magnetic-declination.ts'
import { expectWithin } from '../published/expect-within.ts'
import { readTable } from '../published/read-table.ts'

const HOUR = 3_600_000
const PLACE = { latitudeDeg: 51, longitudeDeg: -2, heightM: 100 }

/** The moment of a decimal year. */
function momentOf(decimalYear: number): Date {
  const year = Math.floor(decimalYear)
  const [start, end] = [Date.UTC(year), Date.UTC(year + 1)]
  return new Date(start + (end - start) * (decimalYear - year))
}

const ROWS = readTable('magnetic-declination.csv')

describe('magneticDeclination', () => {
  // Printed to 0.01°.
  test.each(ROWS)('is $declination_deg° in $date at $latitude_deg°, $longitude_deg°', (row) => {
    const place = {
      latitudeDeg: row.latitude_deg!,
      longitudeDeg: row.longitude_deg!,
      heightM: row.height_km! * 1000,
    }
    const got = magneticDeclination(place, momentOf(row.date!))
    expectWithin(got!.deg, row.declination_deg!, 0.0051, 'degrees')
  })

  // Error models of the technical reports (from memory), with the published horizontal field.
  test.each([
    ['WMM-2015', 2015, 0.23, 5430],
    ['WMM-2020', 2021, 0.26, 5625],
    ['WMM-2025', 2027, 0.26, 5417],
  ])('of %s has the stated error', (name, date, steady, overField) => {
    const rows = ROWS.filter((row) => row.date === date)
    expect(rows.length).toBeGreaterThan(5)
    for (const row of rows) {
      const place = {
        latitudeDeg: row.latitude_deg!,
        longitudeDeg: row.longitude_deg!,
        heightM: row.height_km! * 1000,
      }
      const got = magneticDeclination(place, momentOf(date))
      const want = Math.sqrt(steady ** 2 + (overField / row.horizontal_nt!) ** 2)
      // The field is printed to 0.1 nT, which is 1e−4 of the weakest here.
      expectWithin(got!.sdDeg / want, 1, 1e-4, 'of the deviation')
      expect(got!.model).toBe(name)
    }
  })

  test('is told for each month of the span, and for no moment outside of it', () => {
    const [from, to] = [MAGNETIC_MODEL_SPAN.from, MAGNETIC_MODEL_SPAN.to].map(Date.parse) as [number, number]
    for (let moment = from; moment <= to; moment += 730 * HOUR)
      expect(Number.isFinite(magneticDeclination(PLACE, new Date(moment))!.deg)).toBe(true)
    expect(magneticDeclination(PLACE, new Date(to))).not.toBeNull()
    expect(magneticDeclination(PLACE, new Date(from - 1))).toBeNull()
    expect(magneticDeclination(PLACE, new Date(to + 1))).toBeNull()
  })

  // The first edition was issued in December 2014 and the last holds to the end of 2029, less what it came early.
  test('covers fifteen years', () => {
    expect(MAGNETIC_MODEL_SPAN.from.slice(0, 7)).toBe('2014-12')
    expect(MAGNETIC_MODEL_SPAN.to.slice(0, 7)).toBe('2029-11')
  })

  test('refuses what is no place, no height and no date', () => {
    const date = new Date('2021-06-15')
    expect(() => magneticDeclination({ ...PLACE, latitudeDeg: 91 }, date)).toThrow(/the latitude is 91°/)
    expect(() => magneticDeclination({ ...PLACE, heightM: Number.NaN }, date)).toThrow(/the height is NaN/)
    expect(() => magneticDeclination(PLACE, new Date('some day'))).toThrow(/the date is none/)
  })
})
