import { describe, expect, test } from 'vitest'
import { expectWithin } from '../published/expect-within.ts'
import { auditOf, claimText } from './audit-of.ts'
import { azimuthOf } from './by-tables.ts'

/**
 * The case of a claim about a place 3,200 m up that takes the textbooks' refraction of the sea. By the method notes of
 * this project, section 5: 683.5 hPa and 5 °C give 22.9′ on the horizon, not 34′, and at the present rate of the
 * obliquity the difference is worth some 800 years at latitude 30°.
 */
function highUp(latitude: number, changes: Record<string, string> = {}): string {
  // Of the upper limb in 2000: ε = 23.4393° (J2000), 15.73′ of semidiameter in June, and the stated 34′.
  const azimuth = azimuthOf(23.4393, -(34 + 15.73) / 60, latitude, 'rising')
  return claimText({
    structure: `{name: High place, latitude: ${latitude}° N, elevation: 3200 m}`,
    sightlines: `{one: {azimuth: ${azimuth.toFixed(5)}° ± 2′, horizon: 0° ± 1′}}`,
    target: '{body: sun, event: june solstice, at: rising, disc: upper limb}',
    asserted_date: '2000 CE ± 50',
    window: '8000 BCE to 2026 CE',
    atmosphere: '{pressure: 683.5 hPa, temperature: 5 °C, refraction: 34′}',
    ...changes,
  })
}

const checkOf = (text: string) => auditOf(text).sightlines[0]!.refraction_check

describe('a refraction stated for a place 3,200 m up', () => {
  // The obliquity changes by Δh cos q, cos q = (sin φ − sin δ sin h)/(cos δ cos h) at h = −0.83°: 0.551 · 11.1′ at 30°,
  // 0.841 · 11.1′ at 50°. At 0.468″ a year (IAU 2006) that is 785 and 1,197 years. The notes round the first to 800, and
  // have 1,100 for the second, which their own figures do not give.
  test.each([
    [30, 785],
    [50, 1197],
  ])('at latitude %s° is found to be that of the sea, and worth %s years', (latitude, years) => {
    const check = checkOf(highUp(latitude))!
    expect(check.is_sea_level).toBe(true)
    expect(check.stated_arcmin).toBe(34)
    // Printed to 0.1′; the lapse and the humidity are not, which the default fills.
    expectWithin(check.traced_arcmin, 22.9, 0.1, 'arcmin')
    // Bennett 1982: 34.5′ at the horizon for 1010 hPa and 10 °C.
    expectWithin(check.sea_level_arcmin, 34.5, 0.05, 'arcmin')
    // A thousand years ago the rate was less by 2 % (the obliquity's bend), of which half counts; 22.9′ is rounded.
    expectWithin(check.effect_years!, years, 0.015 * years, 'years')
  })

  // More refraction shows the Sun further north at the same obliquity: the line then wants a smaller one, which came later.
  test('makes the date later than the air of the place does', () => {
    expect(checkOf(highUp(30))!.effect_years).toBeGreaterThan(0)
  })

  test('printed by the source of the claim is checked likewise', () => {
    const printed = highUp(30, {
      atmosphere: '{pressure: 683.5 hPa, temperature: 5 °C}',
      claimed: '{refraction: 34′}',
    })
    const check = checkOf(printed)!
    expect(check).toMatchObject({ stated_arcmin: 34, is_sea_level: true })
    expectWithin(check.effect_years!, 785, 12, 'years')
  })
})

describe('a refraction', () => {
  test('that is the place’s own is not taken for that of the sea', () => {
    const check = checkOf(
      highUp(30, { atmosphere: '{pressure: 683.5 hPa, temperature: 5 °C, refraction: 22.9′}' }),
    )!
    expect(check.is_sea_level).toBe(false)
    expectWithin(check.effect_years!, 0, 15, 'years')
  })

  test('that is the sea’s at the sea is in its place', () => {
    const check = checkOf(
      highUp(30, {
        structure: '{name: Shore, latitude: 30° N, elevation: 0 m}',
        atmosphere: '{pressure: 1010 hPa, temperature: 10 °C, refraction: 34.4′}',
      }),
    )!
    expect(check.is_sea_level).toBe(false)
  })

  test('that is not stated has nothing to be held against', () => {
    expect(checkOf(highUp(30, { atmosphere: '{pressure: 683.5 hPa, temperature: 5 °C}' }))).toBeNull()
  })

  // A claim gives it less parallax: 34′ less the Moon's 57′ is -23′ and no other refraction than 34′.
  test('of the Moon has its parallax put back', () => {
    const check = checkOf(
      highUp(30, {
        target: '{body: moon, event: northern major standstill, at: rising, disc: centre}',
        sightlines: '{one: {azimuth: 57° ± 2′, horizon: 0° ± 1′}}',
        atmosphere: '{pressure: 683.5 hPa, temperature: 5 °C, refraction: -23.04′}',
      }),
    )!
    // The mean parallax of the Moon is 57.04′, of which the cosine of the altitude leaves all.
    expectWithin(check.stated_arcmin, 34, 0.01, 'arcmin')
    expect(check.is_sea_level).toBe(true)
  })
})
