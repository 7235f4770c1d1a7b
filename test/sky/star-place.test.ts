import { describe, expect, test } from 'vitest'
import { shortPrecessionMatrix } from '../../src/sky/short-precession.ts'
import { STARS, type Star } from '../../src/sky/star-catalogue.ts'
import { starDeclinationDeg, starDirection, starPlace, starTrack } from '../../src/sky/star-place.ts'
import { lengthOf } from '../../src/sky/vector.ts'
import { expectWithin } from '../published/expect-within.ts'
import { numberIn, readTextTable } from '../published/read-text-table.ts'
import { namedStar } from './named-star.ts'
import { separationArcsec } from './separation.ts'

const ROWS = readTextTable('star-positions.csv')
const starOfHr = (hr: number): Star => STARS.find((star) => star.hr === hr)!

describe('the place of a star', () => {
  test.each([...new Set(ROWS.map((row) => row.hr!))])('HR %s is within 1″ of every published row', (hr) => {
    const rows = ROWS.filter((row) => row.hr === hr)
    expect(rows).toHaveLength(12)
    for (const row of rows) {
      const published = { raDeg: numberIn(row.ra_deg)!, decDeg: numberIn(row.dec_deg)! }
      const place = starPlace(starOfHr(Number(hr)), Number(row.year))
      // The table is printed to 0.0001°, so that half a unit in both coordinates is 0.25″.
      expectWithin(separationArcsec(place, published), 0, 0.26, 'arcsec', `${row.name} ${row.year}`)
      expectWithin(starDeclinationDeg(starOfHr(Number(hr)))(Number(row.year)), place.decDeg, 1e-10, 'degrees')
    }
  })

  test('the table holds every star of it', () => {
    expect(ROWS).toHaveLength(276)
  })

  test.each(STARS.slice(0, 40).map((star) => [star.hr, star] as const))(
    'HR %s is at J2000 where the catalogue has it',
    (_, star) => {
      expectWithin(separationArcsec(starPlace(star, 2000), star), 0, 1e-6, 'arcsec')
    },
  )

  // Ptolemy, Almagest VII, 3 (from memory): Timocharis, about 290 BCE, had Spica 1°24′ north of the equator. His other
  // declinations err by some 0.1°.
  test('Spica stood where Timocharis measured it', () => {
    expectWithin(starPlace(namedStar('Spica'), -289).decDeg, 1 + 24 / 60, 0.25, 'degrees')
  })

  // Print has Polaris nearest to the pole about 2100 to 2105, 27′ to 28′ away (from memory: Meeus, Mathematical
  // Astronomy Morsels, 27′09″ with aberration and nutation, in 2100; they take 20″ and 9″).
  test('Polaris comes nearest to the pole when print has it', () => {
    const declination = starDeclinationDeg(namedStar('Polaris'))
    const years = Array.from({ length: 201 }, (_, i) => 2000 + i)
    const closest = years.reduce((best, year) => (declination(year) > declination(best) ? year : best))
    expectWithin(closest, 2102, 4, 'years')
    expectWithin((90 - declination(closest)) * 60, 27.15, 0.6, 'arcmin')
  })

  // Print has Thuban within some 10′ of the pole about 2830 to 2790 BCE (from memory).
  test('Thuban was the pole star of the third millennium BCE', () => {
    const declination = starDeclinationDeg(namedStar('Thuban'))
    const years = Array.from({ length: 601 }, (_, i) => -3100 + i)
    const closest = years.reduce((best, year) => (declination(year) > declination(best) ? year : best))
    expectWithin(closest, -2800, 60, 'years')
    expect((90 - declination(closest)) * 60).toBeLessThan(10)
  })

  test('by another precession differs as the precessions do', () => {
    const longTerm = starPlace(namedStar('Sirius'), -10_000)
    const short = starTrack(namedStar('Sirius'), shortPrecessionMatrix)(-10_000)
    expect(separationArcsec(longTerm, short) / 3600).toBeGreaterThan(0.5)
    expectWithin(
      separationArcsec(
        starPlace(namedStar('Sirius'), 1900),
        starTrack(namedStar('Sirius'), shortPrecessionMatrix)(1900),
      ),
      0,
      0.01,
      'arcsec',
    )
  })

  test('is a direction and a number for every star, far back and ahead', () => {
    for (const star of STARS)
      for (const year of [-40_000, 12_000]) {
        expectWithin(lengthOf(starDirection(star)(year)), 1, 1e-12, 'of the unit vector')
        const { raDeg, decDeg } = starPlace(star, year)
        expect(raDeg >= 0 && raDeg < 360 && Math.abs(decDeg) <= 90, `HR ${star.hr}`).toBe(true)
      }
  })
})

describe('a star of unknown distance', () => {
  const unknown = STARS.filter((star) => star.parallaxArcsec === null)

  test('is no rarity', () => {
    expect(unknown).toHaveLength(85)
  })

  test('moves as one very far away that keeps its distance', () => {
    // A parallax of 0.0005″ is as small as may be without a speed near that of light for these stars.
    for (const star of unknown.filter((held) => Math.abs(held.properMotionDecArcsecPerYear) < 0.03)) {
      const far = { ...star, parallaxArcsec: 0.0005, radialVelocityKmPerS: 0 }
      const [a, b] = [star, far].map((held) => starPlace(held, -10_000))
      expectWithin(separationArcsec(a!, b!), 0, 1, 'arcsec', `HR ${star.hr}`)
    }
  })
})
