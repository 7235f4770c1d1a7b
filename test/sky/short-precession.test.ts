import { describe, expect, test } from 'vitest'
import { equatorPole } from '../../src/sky/long-term-poles.ts'
import { precessionMatrix } from '../../src/sky/precession-matrix.ts'
import { PRECESSION_MODELS } from '../../src/sky/precession-models.ts'
import { shortPrecessionMatrix } from '../../src/sky/short-precession.ts'
import { expectWithin } from '../published/expect-within.ts'
import { arcsecBetween } from './separation.ts'

/** Julian epoch of a Julian date. */
const epochOf = (julianDate: number) => 2000 + (julianDate - 2_451_545) / 365.25
const poleError = (year: number) => arcsecBetween(shortPrecessionMatrix(year)[2], equatorPole(year))
const equinoxError = (year: number) =>
  arcsecBetween(shortPrecessionMatrix(year)[0], precessionMatrix(year)[0])

describe('the IAU 2006 precession', () => {
  // Test values of liberfa's own test program (t_erfa_c.c: t_bp06, the matrix rp, MJD 50123.9999), from memory; that
  // routine goes by other angles (Fukushima & Williams) of the same theory, which agree to some 1e-12 in these years.
  const published = [
    ['0.9999995504864960278', '0.8696112578855404832e-3', '0.3778929293341390127e-3'],
    ['-0.8696112560510186244e-3', '0.9999996218880458820', '-0.1691646168941896285e-6'],
    ['-0.3778929335557603418e-3', '-0.1594554040786495076e-6', '0.9999999285984501222'],
  ]
  test.each(published.map((row, i) => ({ row, i })))('has the published row $i for 1996', ({ row, i }) => {
    const got = shortPrecessionMatrix(epochOf(2_400_000.5 + 50_123.9999))[i as 0 | 1 | 2]
    for (const [k, want] of row.entries()) expectWithin(got[k]!, Number(want), 1e-11, 'of the unit vector', k)
  })

  // The long-term theory was fitted to this one near J2000; Vondrák et al. 2011 speak of agreement within
  // milliarcseconds over a few centuries.
  test.each([1700, 1850, 2000, 2150, 2300])('in %s has the pole and equinox of the long-term one', (year) => {
    expectWithin(poleError(year), 0, 0.005, 'arcsec', 'pole')
    expectWithin(equinoxError(year), 0, 0.005, 'arcsec', 'equinox')
  })

  test('keeps within 4″ of the long-term one in its range, and not for long beyond', () => {
    const { from, to } = PRECESSION_MODELS.p03.range
    for (let year = from; year <= to; year += 100) {
      expect(poleError(year), `pole in ${year}`).toBeLessThan(4)
      expect(equinoxError(year), `equinox in ${year}`).toBeLessThan(4)
    }
    expect(poleError(from - 1000)).toBeGreaterThan(4)
    expect(equinoxError(to + 1000)).toBeGreaterThan(4)
  })

  test('is of no use for the oldest claims', () => {
    expect(poleError(-10_000) / 3600).toBeGreaterThan(1)
    expect(poleError(-5000) / 60).toBeGreaterThan(3)
  })
})
