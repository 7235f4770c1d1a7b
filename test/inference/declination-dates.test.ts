import { describe, expect, test } from 'vitest'
import { yearsOfDeclination } from '../../src/inference/declination-dates.ts'
import { OBLIQUITY_MODELS } from '../../src/sky/obliquity-models.ts'
import { expectWithin } from '../published/expect-within.ts'

describe('yearsOfDeclination', () => {
  // Proc. R. Soc. Lond. 69 (1902), 137–147, prints a declination of 23°54′30″. The years are the method notes' of this
  // project, section 10: 1855 BCE by today's obliquity, 1822 BCE by Newcomb's; 1 BCE is the year 0.
  test.each([
    ['vondrak2011', -1854],
    ['newcomb1895', -1821],
  ] as const)('of the declination printed in 1902 by %s', (name, year) => {
    const years = yearsOfDeclination(23 + 54.5 / 60, OBLIQUITY_MODELS[name].obliquityDeg, -3000, 1000)
    expect(years).toHaveLength(1)
    expectWithin(years[0]!, year, 1, 'years')
  })

  const wave = (year: number) => 23.3 + 1.2 * Math.sin((2 * Math.PI * year) / 41_000)

  test('finds every date of a wave, ascending', () => {
    // sin x = ½ at 30°, 150° and so on of a turn of 41,000 years.
    const want = [30, 150, 390, 510].map((degrees) => (degrees / 360) * 41_000)
    const years = yearsOfDeclination(23.9, wave, -1000, 70_000)
    expect(years).toHaveLength(4)
    want.forEach((year, i) => {
      expectWithin(years[i]!, year, 1e-3, 'years')
    })
  })

  test('finds none beyond the extremes, and one where the stretch ends before the second', () => {
    expect(yearsOfDeclination(24.6, wave, -50_000, 50_000)).toEqual([])
    expect(yearsOfDeclination(23.9, wave, 0, 10_000)).toHaveLength(1)
  })

  test('finds a date on a step of its search once', () => {
    for (const sign of [1, -1]) {
      const years = yearsOfDeclination(23, (year) => 23 + (sign * (year - 500)) / 1e4, 0, 1000)
      expect(years).toHaveLength(1)
      expectWithin(years[0]!, 500, 1e-3, 'years')
    }
  })
})
