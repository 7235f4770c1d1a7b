import { bench, describe } from 'vitest'
import { azimuthOneAboveOtherDeg } from '../../src/sky/above-one-another.ts'
import { findStar } from '../../src/sky/find-star.ts'
import { starDeclinationDeg, starTrack } from '../../src/sky/star-place.ts'
import { namedStar } from '../sky/named-star.ts'

const YEARS = Float64Array.from({ length: 5000 }, (_, i) => -20_000 + 4.4 * i)

describe('5,000 dates', () => {
  bench('declination of one star', () => {
    YEARS.map(starDeclinationDeg(namedStar('Sirius')))
  })

  bench('right ascension and declination of one star', () => {
    YEARS.forEach(starTrack(namedStar('Sirius')))
  })

  bench('two stars one above the other', () => {
    const [kochab, mizar] = [starTrack(namedStar('Kochab')), starTrack(namedStar('Mizar'))]
    for (const year of YEARS) azimuthOneAboveOtherDeg(kochab(year), mizar(year), 30, 'first')
  })
})

describe('names', () => {
  bench('a star found', () => {
    findStar('alpha Canis Majoris')
  })

  bench('a star not found', () => {
    findStar('Betelguese')
  })
})
