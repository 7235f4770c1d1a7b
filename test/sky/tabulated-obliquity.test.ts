import { describe, expect, test } from 'vitest'
import { meanObliquityDeg } from '../../src/sky/mean-obliquity.ts'
import { OBLIQUITY_MODELS } from '../../src/sky/obliquity-models.ts'
import { tabulatedObliquityDeg } from '../../src/sky/tabulated-obliquity.ts'
import { expectWithin } from '../published/expect-within.ts'
import { readTable } from '../published/read-table.ts'

describe('tabulatedObliquityDeg', () => {
  // The error of a cubic spline of step h is 5h⁴/384 of the fourth derivative: below 1e-5″ here.
  test('is the series itself to 0.0001″, between the rows of its table and across the ends of it', () => {
    for (let year = -47_013; year < 32_000; year += 37) {
      const [got, want] = [tabulatedObliquityDeg('vondrak2011', year), meanObliquityDeg(year)]
      expectWithin(got * 3600, want * 3600, 0.0001, 'arcsec', year)
    }
  })

  test('is the published one at every row', () => {
    for (const { year, vondrak2011 } of readTable('obliquity.csv'))
      expectWithin(
        tabulatedObliquityDeg('vondrak2011', year!) * 3600,
        vondrak2011! * 3600,
        0.002,
        'arcsec',
        year,
      )
  })

  test.each(['laskar2004', 'p03', 'newcomb1895'] as const)('leaves %s alone', (name) => {
    for (const year of [-9600.3, 1234.5])
      expect(tabulatedObliquityDeg(name, year)).toBe(OBLIQUITY_MODELS[name].obliquityDeg(year))
  })
})
