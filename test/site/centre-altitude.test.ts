import { describe, expect, test } from 'vitest'
import { DEG } from '../../src/quantity/degrees.ts'
import { centreAltitudeDeg, horizonAboveCentreArcmin } from '../../src/site/centre-altitude.ts'
import { declinationDeg } from '../../src/site/horizontal.ts'
import { expectWithin } from '../published/expect-within.ts'

describe('centreAltitudeDeg', () => {
  // The Sun's parallax by vectors: an observer one Earth radius from the centre, the Sun 1/sin 8.794″ of them away.
  test.each([0, 1.5, 30, 60])('has the parallax of the plain geometry at %s°', (altitude) => {
    const distance = 1 / Math.sin((8.794 / 3600) * DEG)
    const sin = Math.sin(altitude * DEG)
    const toSun = Math.sqrt(distance ** 2 - 1 + sin ** 2) - sin
    const geocentric = Math.atan2(1 + toSun * sin, toSun * Math.cos(altitude * DEG)) / DEG
    expectWithin(centreAltitudeDeg(altitude, 0, 0, 8.794) * 3600, geocentric * 3600, 0.001, 'arcsec')
  })

  test('lowers the Sun by refraction, and its centre below a limb that stands above it', () => {
    expectWithin(centreAltitudeDeg(1, 24, 0, 0), 0.6, 1e-12, 'degrees', 'refraction')
    expectWithin(centreAltitudeDeg(1, 0, 15, 0), 0.75, 1e-12, 'degrees', 'upper limb')
    expectWithin(centreAltitudeDeg(1, 0, -15, 0), 1.25, 1e-12, 'degrees', 'lower limb')
  })

  // The convention of the almanacs (from memory): at sunrise on a level horizon the centre stands at −50′, by 34′ of
  // refraction and 16′ of semidiameter.
  test('puts the centre at −50′ when the first gleam stands on a level horizon', () => {
    expectWithin(centreAltitudeDeg(0, 34, 16, 0) * 60, -50, 1e-9, 'arcmin')
  })
})

describe('horizonAboveCentreArcmin', () => {
  test('is a semidiameter up, none, or down', () => {
    expect(horizonAboveCentreArcmin({ part: 'upper limb' }, 16)).toBe(16)
    expect(horizonAboveCentreArcmin({ part: 'centre' }, 16)).toBe(0)
    expect(horizonAboveCentreArcmin({ part: 'lower limb' }, 16)).toBe(-16)
  })

  test('runs from the upper limb to the lower one as more of the disc shows', () => {
    const showing = (showingArcmin: number) =>
      horizonAboveCentreArcmin({ part: 'showing', showingArcmin }, 16)
    expect([0, 2, 16, 32].map(showing)).toEqual([16, 14, 0, -16])
  })
})

// Proceedings of the Royal Society of London 69 (1902), 137–147: azimuth 49°34′18″, latitude 51°10′42″, horizon 35′30″,
// 2′ of the limb, refraction less parallax 27′20″, semidiameter 15′45″ give a declination printed as 23°54′30″.
test('the printed example of 1902 gives its printed declination', () => {
  const above = horizonAboveCentreArcmin({ part: 'showing', showingArcmin: 2 }, 15.75)
  const altitude = centreAltitudeDeg(35.5 / 60, 27 + 20 / 60, above, 0)
  const declination = declinationDeg(49 + 34 / 60 + 18 / 3600, altitude, 51 + 10 / 60 + 42 / 3600)
  expectWithin(declination * 3600, 23 * 3600 + 54 * 60 + 30, 1, 'arcsec')
})
