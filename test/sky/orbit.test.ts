import { describe, expect, test } from 'vitest'
import { wrap180 } from '../../src/quantity/degrees.ts'
import { eccentricity, ORBIT_SPAN, perihelionDeg } from '../../src/sky/orbit.ts'
import { expectWithin } from '../published/expect-within.ts'
import { readTable } from '../published/read-table.ts'

describe("the Earth's orbit", () => {
  test('has the published elements at every row', () => {
    for (const row of readTable('orbit.csv')) {
      expectWithin(eccentricity(row.year!), row.eccentricity!, 1e-12, '', `e at ${row.year}`)
      expectWithin(wrap180(perihelionDeg(row.year!) - row.perihelion_deg!), 0, 1e-9, 'degrees', row.year!)
    }
  })

  // Another theory: Simon et al. 1994, A&A 282, 663 (from memory): e = 0.0167086 − 0.00004204 T, and the perihelion at
  // 102.93735° + 1.71946° T from the equinox of date, T centuries from J2000. The two theories part by a few 1e-6 and
  // by hundredths of a degree.
  test.each([1750, 1900, 1950, 2000, 2026])('in %s is that of Simon et al. 1994', (year) => {
    const t = (year - 2000) / 100
    expectWithin(eccentricity(year), 0.0167086 - 0.00004204 * t, 1.2e-5, '', 'e')
    expectWithin(wrap180(perihelionDeg(year)), 102.93735 + 1.71946 * t, 0.05, 'degrees', 'perihelion')
  })

  // Precession (one turn in 25,800 years) and the perihelion's own motion add up to a turn in some 21,000 years.
  test('has a perihelion that moves on by 15.5° to 18.5° every millennium, without a jump', () => {
    for (let year = ORBIT_SPAN.from; year + 1000 <= ORBIT_SPAN.to; year += 250) {
      const motion = perihelionDeg(year + 1000) - perihelionDeg(year)
      expect(motion, `${year}`).toBeGreaterThan(15.5)
      expect(motion, `${year}`).toBeLessThan(18.5)
    }
  })
})
