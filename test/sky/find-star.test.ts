import { describe, expect, test } from 'vitest'
import { findStar } from '../../src/sky/find-star.ts'
import { STARS } from '../../src/sky/star-catalogue.ts'

const hrOf = (text: string) => findStar(text).star?.hr ?? null

// HR numbers as the Bright Star Catalogue and the IAU's list of star names have them.
describe('a star is found', () => {
  test.each([
    ['Sirius', 2491],
    ['SIRIUS', 2491],
    ['  sirius ', 2491],
    ['Kaus Australis', 6879],
    ['kaus-australis', 6879],
    ['Áldebaran', 1457],
    ['Zuben el Akrab', 5787],
  ])('by name: %s', (text, hr) => {
    expect(hrOf(text)).toBe(hr)
  })

  test.each([
    ['alpha CMa', 2491],
    ['ALPHA cma', 2491],
    ['α CMa', 2491],
    ['Α Canis Majoris', 2491], // a capital alpha
    ['αCMa', 2491],
    ['Alpha Canis Majoris', 2491],
    ['alpha Canis Major', 2491],
    ['alpha Bootis', 5340],
    ['α Boötis', 5340],
    ['ϵ Ori', 1903], // the other shape of epsilon
    ['µ UMa', 4069], // the micro sign
    ['alpha2 CVn', 4915],
    ['α² CVn', 4915],
    ['α₂ CVn', 4915],
    ['alpha-2 CVn', 4915],
    ['alpha^2 CVn', 4915],
    ['alpha 2 Canum Venaticorum', 4915],
    ['π³ Orionis', 1543],
    ['pi03 Ori', 1543],
    ['omicron1 CMa', 2580],
    ['o Cet', null], // a Latin o is not an omicron
  ])('by Bayer’s letter: %s', (text, hr) => {
    expect(hrOf(text)).toBe(hr)
  })

  test.each([
    ['HR 2491', 2491],
    ['hr2491', 2491],
    ['2491', 2491],
    ['HR 5958', 5958],
  ])('by its HR number: %s', (text, hr) => {
    expect(hrOf(text)).toBe(hr)
  })

  test.each([
    ['51 And', 464],
    ['51 Andromedae', 464],
    ['9 CMa', 2491],
  ])('by Flamsteed’s number: %s', (text, hr) => {
    expect(hrOf(text)).toBe(hr)
  })

  test('every star by its HR number, and every name and letter by that star or a brighter one', () => {
    for (const star of STARS) {
      expect(hrOf(`HR ${star.hr}`)).toBe(star.hr)
      for (const text of [
        star.name,
        star.bayer && `${star.bayer}${star.bayerNumber ?? ''} ${star.constellation}`,
      ]) {
        // The next test but one is about this name.
        if (!text || text === 'Al Niyat') continue
        const found = findStar(text)
        if (found.star === null) expect.fail(`${text} is not found`)
        const all = [found.star, ...found.sharedWith]
        expect(
          all.map(({ hr }) => hr),
          text,
        ).toContain(star.hr)
        expect(found.star.magnitude, text).toBe(Math.min(...all.map(({ magnitude }) => magnitude)))
      }
    }
  })
})

describe('what several stars share means the brightest, and the others are told', () => {
  test.each([
    ['Mizar', 5054, [5055]],
    ['Castor', 2891, [2890]],
    ['Rigil Kentaurus', 5459, [5460]],
    ['alpha Centauri', 5459, [5460]],
    ['alpha1 Cen', 5459, []],
    ['alpha2 Cen', 5460, []],
    ['gamma Vir', 4825, [4826]],
    ['alpha CVn', 4915, []],
    ['HR 5055', 5055, []],
  ])('%s', (text, hr, others) => {
    const found = findStar(text)
    expect(found.star?.hr).toBe(hr)
    expect(found.star && found.sharedWith.map((star) => star.hr)).toEqual(others)
  })

  test('but the very spelling comes first', () => {
    // Tau Scorpii is the brighter; sigma is spelt in two words.
    expect(hrOf('Alniyat')).toBe(6165)
    expect(hrOf('Al Niyat')).toBe(6084)
    expect(findStar('Al Niyat')).toMatchObject({ sharedWith: [{ hr: 6165 }] })
  })
})

describe('a star that is not found', () => {
  test.each([
    ['Siruis', 'Sirius'],
    ['Betelguese', 'Betelgeuse'],
    ['Aldebarran', 'Aldebaran'],
    ['Fomalhout', 'Fomalhaut'],
    ['Kocab', 'Kochab'],
    ['alfa CMa', 'alpha CMa'],
    ['beta Orionid', 'beta Orionis'],
  ])('%s: %s is suggested first', (text, suggestion) => {
    const found = findStar(text)
    expect(found).toMatchObject({ star: null, because: 'unknown name' })
    expect(found.star === null && found.suggestions[0]).toBe(suggestion)
  })

  test('suggests at most three, each of them a star', () => {
    const found = findStar('Alni')
    if (found.star !== null) expect.fail('found')
    expect(found.suggestions.length).toBeLessThanOrEqual(3)
    for (const suggestion of found.suggestions) expect(findStar(suggestion).star, suggestion).not.toBeNull()
  })

  test.each(['Xyzzy the Great', '', 'Venus', '0', 'HR 9111'])('%s: nothing is suggested', (text) => {
    expect(findStar(text)).toEqual({ star: null, because: 'unknown name', suggestions: [] })
  })

  // Fainter than V = 4.0, from the Bright Star Catalogue: 5.3, 4.3 and 4.0 or so.
  test.each(['zeta UMi', 'HR 1', '61 Cyg', 'nu Cnc'])('%s is told to be a fainter star', (text) => {
    expect(findStar(text)).toEqual({ star: null, because: 'not listed', suggestions: [] })
  })

  test('a number that the catalogue does not use points to the letter alone', () => {
    expect(findStar('zeta1 UMa')).toEqual({ star: null, because: 'not listed', suggestions: ['zeta UMa'] })
    expect(findStar('alpha3 Cen')).toMatchObject({ suggestions: ['alpha1 Cen', 'alpha2 Cen'] })
  })
})
