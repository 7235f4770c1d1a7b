import { describe, expect, test } from 'vitest'
import { cubicSpline } from '../../src/sky/cubic-spline.ts'
import { LASKAR_2004_OBLIQUITY } from '../../src/sky/laskar-2004-table.ts'
import { OBLIQUITY_MODELS, type ObliquityModelName } from '../../src/sky/obliquity-models.ts'
import { expectWithin } from '../published/expect-within.ts'
import { readTable } from '../published/read-table.ts'

const ROWS = readTable('obliquity.csv')
const arcsec = (name: ObliquityModelName, year: number) => 3600 * OBLIQUITY_MODELS[name].obliquityDeg(year)
const fromVondrak = (name: ObliquityModelName, year: number) =>
  Math.abs(arcsec(name, year) - arcsec('vondrak2011', year))

/** A printed angle in radians, with more digits than a number holds, in arcseconds. */
const fromRadians = (printed: string) => (Number(printed) * 648_000) / Math.PI

/** 23°26′s″ in arcseconds. */
const today = (s: number) => 23 * 3600 + 26 * 60 + s

describe('the obliquity models at every row of the published table', () => {
  // Half a unit of the table's last figure is 0.0018″; the polynomials reach 2000° there, past any use.
  test.each(['vondrak2011', 'laskar2004', 'p03', 'laskar1986', 'newcomb1895'] as const)('%s', (name) => {
    for (const row of ROWS)
      expectWithin(arcsec(name, row.year!), row[name]! * 3600, 0.002, 'arcsec', row.year!)
    expect(ROWS).toHaveLength(56)
  })
})

describe('single published values', () => {
  test.each([
    // Lieske et al. 1977: 23°26′21.448″ at J2000.0.
    ['iau1976', 2000, today(21.448), 1e-6],
    // Meeus, Astronomical Algorithms, example 22.a (from memory): 1987 April 10.0, 23°26′27.407″.
    ['iau1976', 2000 - 12.7296372348, today(27.407), 0.0005],
    // liberfa's test program, t_obl80 and t_obl06 at JD 2454388.5 (from memory), in radians.
    ['iau1976', 2000 + 2843.5 / 365.25, fromRadians('0.4090751347643816218'), 1e-8],
    ['p03', 2000 + 2843.5 / 365.25, fromRadians('0.4090749229387258204'), 1e-8],
    // Newcomb's value for 1950.0 (from memory): 23°26′44.84″.
    ['newcomb1895', 1950, today(44.84), 0.005],
    // Vondrák et al. 2011 and Capitaine et al. 2003 both take 84381.406″ at J2000.0.
    ['p03', 2000, 84381.406, 1e-9],
  ] as const)('%s at %s', (name, year, want, tolerance) => {
    expectWithin(arcsec(name, year), want, tolerance, 'arcsec')
  })
})

describe('Laskar 2004', () => {
  // Method notes of this project, section 2, printed in whole arcseconds.
  test.each([
    [-2000, 2],
    [-9000, 36],
    [-15_000, 92],
    [-18_000, 145],
  ])('at %s differs from Vondrák 2011 by %s″', (year, printed) => {
    expectWithin(fromVondrak('laskar2004', year), printed, 0.5, 'arcsec')
  })

  const years = Array.from({ length: 48 }, (_, i) => -39_500 + 1000 * i)

  // Within four rows of the table's ends the natural spline, whose ends are straight, parts from the curve: by 3″ in
  // the last millennium, as the next test shows.
  test('between rows is what a polynomial of degree 7 through the eight rows about it gives', () => {
    for (const year of years)
      expectWithin(arcsec('laskar2004', year), 3600 * lagrange(year), 0.08, 'arcsec', year)
  })

  test('between rows would err by more than 10″ on straight lines', () => {
    const straight = (year: number) =>
      (arcsec('laskar2004', year - 500) + arcsec('laskar2004', year + 500)) / 2
    const worst = Math.max(...years.map((year) => Math.abs(straight(year) - 3600 * lagrange(year))))
    expect(worst).toBeGreaterThan(10)
    expect(worst).toBeLessThan(15)
  })

  test('a spline through a smooth model at the same rows keeps to it', () => {
    const spline = cubicSpline(
      LASKAR_2004_OBLIQUITY.map(([year]) => [year, OBLIQUITY_MODELS.vondrak2011.obliquityDeg(year)]),
    )
    const error = (year: number) => Math.abs(3600 * spline(year) - arcsec('vondrak2011', year))
    for (const year of [-29_500, -19_500, -9_500, -500, 1500, 2500, 8500])
      expectWithin(error(year), 0, 0.25, 'arcsec', year)
    expectWithin(error(11_500), 0, 3.5, 'arcsec', 'beside the end')
  })
})

describe('the stated ranges', () => {
  // The ranges of the two old cubics and of IAU 2006 are this program's own reading; they must keep what they promise.
  test.each(['iau1976', 'newcomb1895'] as const)(
    '%s stays within 10″ of Vondrák 2011 inside, not beyond',
    (name) => {
      const { from, to } = OBLIQUITY_MODELS[name].range
      for (let year = from; year <= to; year += 100)
        expect(fromVondrak(name, year), `${year}`).toBeLessThan(10)
      expect(fromVondrak(name, from - 500)).toBeGreaterThan(10)
      expect(fromVondrak(name, to + 500)).toBeGreaterThan(10)
    },
  )

  test.each(Object.entries(OBLIQUITY_MODELS))('%s gives numbers wherever its range reaches', (_, model) => {
    expect(model.computable.from).toBeLessThanOrEqual(model.range.from)
    expect(model.computable.to).toBeGreaterThanOrEqual(Math.min(model.range.to, 200_000))
  })
})

/** The polynomial of degree 7 through the four rows of the table on either side, degrees. */
function lagrange(year: number): number {
  const after = LASKAR_2004_OBLIQUITY.findIndex(([row]) => row > year)
  const rows = LASKAR_2004_OBLIQUITY.slice(after - 4, after + 4)
  return rows.reduce(
    (sum, [x, value], i) =>
      sum + value * rows.reduce((p, [other], j) => (j === i ? p : (p * (year - other)) / (x - other)), 1),
    0,
  )
}
