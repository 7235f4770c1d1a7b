import { describe, expect, test } from 'vitest'
import type { Claim } from '../../src/claim/claim.ts'
import { read } from './read.ts'
import { THORNMERE, thornmereAnd, thornmereWith } from './thornmere.ts'

/** The claim of a file in which nothing is wrong or doubtful. */
function claimOf(text: string): Claim {
  const { claim, problems } = read(text)
  expect(problems).toEqual([])
  return claim!
}

const ARCMIN = 1 / 60

describe('the example of the format', () => {
  const claim = claimOf(THORNMERE)

  test('says what it says', () => {
    expect(claim).toMatchObject({
      statement:
        'The east pillar of the Thornmere court marked midsummer sunrise exactly, so the court was built in 9600 BCE.',
      source: 'Thornmere visitor leaflet, third printing, page 4',
      structure: { name: 'Thornmere court', longitudeDeg: 23 + 5 / 60, elevationM: 640 },
      assertedDate: { from: -9699, to: -9499, text: '9600 BCE ± 100', circaYears: 0 },
      assumedPrecisionArcmin: 0,
      plausiblePrecision: { lowArcmin: 10, highArcmin: 60 },
      otherDates: [
        { label: 'radiocarbon', date: { from: -799, to: -499, text: '800 BCE to 500 BCE', circaYears: 0 } },
      ],
    })
    expect(claim.structure.latitudeDeg).toBeCloseTo(41.27, 12) // 16′12″ is 0.27°
  })

  test('has two points and a line between them', () => {
    const plain = { by: 'plan', tie: null, breadth: null }
    expect([...claim.points]).toEqual([
      ['hearthstone', { ...plain, eastM: 0, northM: 0, upM: null, uncertaintyM: 0.03 }],
      ['east-pillar', { ...plain, eastM: 84.65, northM: 53.09, upM: 0.4, uncertaintyM: 0.05 }],
    ])
    expect(claim.sightlines).toEqual([
      {
        name: 'midsummer',
        direction: {
          by: 'points',
          from: 'hearthstone',
          to: 'east-pillar',
          sighted: { from: 'omitted', to: 'omitted' },
        },
        horizon: { by: 'altitude', altitudeDeg: { value: 1.5, sd: 2 * ARCMIN } },
        target: {
          body: 'sun',
          event: { name: 'june solstice' },
          at: 'rising',
          disc: { part: 'upper limb' },
        },
      },
    ])
  })

  test('leaves the rest out, and nothing is filled in', () => {
    expect(claim).toMatchObject({
      north: 'omitted',
      grid: null,
      attachments: [],
      window: 'omitted',
      formula: 'omitted',
      notes: null,
    })
    expect(claim.tolerancesArcmin).toEqual([])
    expect(new Set(Object.values(claim.atmosphere))).toEqual(new Set(['omitted']))
    expect(new Set(Object.values(claim.claimed))).toEqual(new Set([null]))
  })

  test('is echoed as it is written', () => {
    expect(claim.echo).toMatchObject({
      structure: { name: 'Thornmere court', latitude: '41°16′12″ N' },
      sightlines: { midsummer: { from: 'hearthstone', horizon: '1°30′ ± 2′' } },
      other_dates: [{ label: 'radiocarbon', date: '800 BCE to 500 BCE' }],
    })
    expect(JSON.parse(JSON.stringify(claim.echo))).toEqual(claim.echo)
  })

  test('is the same with other line ends, with a byte order mark, and with plain typing', () => {
    expect(claimOf(THORNMERE.replaceAll('\n', '\r\n'))).toEqual(claim)
    expect(claimOf(`\ufeff${THORNMERE}`)).toEqual(claim)
    const typed = THORNMERE.replaceAll('′', "'").replaceAll('″', '"').replaceAll('±', '+/-')
    const { echo: _, ...values } = claimOf(typed)
    const { assertedDate } = claim
    expect(values).toEqual({
      ...Object.fromEntries(Object.entries(claim).filter(([key]) => key !== 'echo')),
      assertedDate: { ...assertedDate, text: '9600 BCE +/- 100' },
    })
  })
})

describe('unknown', () => {
  test('is legal for horizon, north, disc, elevation and uncertainties', () => {
    const text = `${THORNMERE.replace('1°30′ ± 2′', 'unknown')
      .replace('disc: upper limb', 'disc: unknown')
      .replace('640 m', 'Unknown')
      .replace('3 cm', 'unknown')
      .replace('precision: exact', 'precision: unknown')
      .replace('10′ to 1°', 'unknown')}north: unknown\nwindow: unknown\nformula: unknown\n`
    const claim = claimOf(text)
    expect(claim).toMatchObject({
      north: 'unknown',
      window: 'unknown',
      formula: 'unknown',
      assumedPrecisionArcmin: 'unknown',
      plausiblePrecision: 'unknown',
      structure: { elevationM: 'unknown' },
    })
    expect(claim.sightlines[0]).toMatchObject({ horizon: 'unknown', target: { disc: 'unknown' } })
    expect(claim.points.get('hearthstone')?.uncertaintyM).toBe('unknown')
  })

  test('is told apart from what is left out', () => {
    const line = (horizon: string) => claimOf(thornmereWith(', horizon: 1°30′ ± 2′', horizon)).sightlines[0]
    const altitude = (sd: string) => ({ by: 'altitude', altitudeDeg: { value: 1.5, sd } })
    expect(line('')?.horizon).toBe('omitted')
    expect(line(', horizon: 1°30′')?.horizon).toEqual(altitude('omitted'))
    expect(line(', horizon: 1°30′ ± unknown')?.horizon).toEqual(altitude('unknown'))
    const north = claimOf(thornmereAnd('north: {from: plan, uncertainty: unknown}')).north
    expect(north).toMatchObject({ from: 'plan', uncertaintyDeg: 'unknown' })
    expect(claimOf(thornmereAnd('north: {from: GPS}')).north).toMatchObject({
      from: 'gps',
      uncertaintyDeg: 'omitted',
    })
  })

  test('is not legal for a latitude', () => {
    expect(read(thornmereWith('41°16′12″ N', 'unknown')).claim).toBeNull()
  })
})

describe('the other keys', () => {
  test('a measured azimuth with a target of its own', () => {
    const claim = claimOf(
      thornmereWith(
        'target: {body',
        '  sunset: {azimuth: 302°05′ within 3′, target: {body: Sun, event: June solstice, at: setting, disc: 2′ showing}}\ntarget: {body',
      ),
    )
    expect(claim.sightlines[1]).toEqual({
      name: 'sunset',
      direction: {
        by: 'azimuth',
        azimuthDeg: {
          value: expect.closeTo(302 + 5 / 60, 12),
          sd: expect.closeTo((3 * ARCMIN) / Math.sqrt(3), 14),
        },
      },
      horizon: 'omitted',
      target: {
        body: 'sun',
        event: { name: 'june solstice' },
        at: 'setting',
        disc: { part: 'showing', showingArcmin: 2 },
      },
    })
  })

  test.each([
    ['upper limb', { part: 'upper limb' }],
    ['Centre', { part: 'centre' }],
    ['center', { part: 'centre' }],
    ['lower limb', { part: 'lower limb' }],
    ['0.5′ showing', { part: 'showing', showingArcmin: 0.5 }],
  ])('disc: %s', (text, disc) => {
    expect(claimOf(thornmereWith('upper limb', text)).sightlines[0]?.target).toMatchObject({ disc })
  })

  test('the air', () => {
    const claim = claimOf(
      thornmereAnd(
        'atmosphere: {temperature: 50 °F, pressure: 94 kPa, humidity: 40 %, lapse: 6.5 K/km, refraction_uncertainty: ± 3′}',
      ),
    )
    expect(claim.atmosphere).toEqual({
      temperatureC: 10,
      pressureHpa: 940,
      humidity: expect.closeTo(0.4, 12),
      lapseKPerKm: 6.5,
      refractionArcmin: 'omitted',
      refractionUncertaintyArcmin: 3,
    })
  })

  // The results printed in Proc. R. Soc. Lond. 69 (1902), 137–147.
  test('what the source prints, with half a unit of its last digit', () => {
    const claim = claimOf(
      thornmereAnd(
        'claimed: {azimuth: 49°34′18″, refraction: 27′20″, semidiameter: 15′45″, declination: 23°54′30″, obliquity: 23.9°}\natmosphere: {refraction: 27′20″}',
      ),
    )
    expect(claim.claimed).toEqual({
      azimuthDeg: { value: 178_458 / 3600, text: '49°34′18″', half: 0.5 / 3600 },
      altitudeDeg: null,
      refractionArcmin: {
        value: expect.closeTo(27 + 1 / 3, 10),
        text: '27′20″',
        half: expect.closeTo(0.5 / 60, 12),
      },
      semidiameterArcmin: { value: 15.75, text: '15′45″', half: expect.closeTo(0.5 / 60, 12) },
      declinationDeg: { value: expect.closeTo(23.908333333333, 10), text: '23°54′30″', half: 0.5 / 3600 },
      obliquityDeg: { value: 23.9, text: '23.9°', half: expect.closeTo(0.05, 12) },
    })
    expect(claim.atmosphere.refractionArcmin).toBeCloseTo(27 + 1 / 3, 10)
  })

  test.each([
    ['vondrak2011', 'vondrak2011'],
    ['Newcomb 1895', 'newcomb1895'],
    ['IAU_1976', 'iau1976'],
    ['P03', 'p03'],
  ])('formula: %s', (text, model) => {
    expect(claimOf(thornmereAnd(`formula: ${text}`)).formula).toEqual({ model })
  })

  test('a formula this program lacks is kept by its name', () => {
    expect(read(thornmereAnd('formula: Stockwell 1873')).claim?.formula).toEqual({
      lacking: 'Stockwell 1873',
    })
  })

  test('tolerances come in order and once, as whole minutes where they are', () => {
    const claim = claimOf(thornmereAnd('tolerances: [20′, 7′, 0.5°, 30″, exact, 30′, 1°]'))
    expect(claim.tolerancesArcmin).toEqual([0, 0.5, 7, 20, 30, 60])
  })

  test('a window, and a date about a year', () => {
    const claim = claimOf(
      thornmereWith('9600 BCE ± 100', 'c. 9600 BCE').concat('window: 12001 BCE to 2026 CE\n'),
    )
    expect(claim.window).toMatchObject({ from: -12000, to: 2026 })
    expect(claim.assertedDate).toMatchObject({ from: -9649, to: -9549, circaYears: 50 })
  })

  test('texts lose their line breaks, notes keep them', () => {
    const claim = claimOf(
      thornmereWith('source: Thornmere visitor leaflet,', 'source:\n  Thornmere visitor\n  leaflet,').concat(
        'notes: |\n  One.\n\n  Two.\n',
      ),
    )
    expect(claim.source).toBe('Thornmere visitor leaflet, third printing, page 4')
    expect(claim.notes).toBe('One.\n\nTwo.\n')
  })

  test('names that are numbers or words of the language stay names', () => {
    const claim = claimOf(
      thornmereWith('hearthstone: {', '12: {')
        .replace('from: hearthstone', 'from: 12')
        .replaceAll('east-pillar', 'constructor')
        .replace('midsummer: {', '__proto__: {'),
    )
    expect(claim.sightlines[0]).toMatchObject({
      name: '__proto__',
      direction: { from: '12', to: 'constructor' },
    })
    expect([...claim.points.keys()]).toEqual(['12', 'constructor'])
    expect(Object.keys(claim.echo.sightlines as object)).toEqual(['__proto__'])
  })

  test('the echo keeps digits that a number would lose', () => {
    const { claim } = read(
      thornmereAnd('prior: {a: 1e400, b: 12345678901234567890, c: 0.10, d: 2, e: true, f: null}'),
    )
    expect(claim?.echo.prior).toEqual({
      a: '1e400',
      b: '12345678901234567890',
      c: '0.10',
      d: 2,
      e: true,
      f: null,
    })
  })
})

test('all problems of a file come at once, in the order of the text', () => {
  const text = THORNMERE.replace('source', 'sorce')
    .replace('41°16′12″ N', '95°')
    .replace('640 m', '20 km')
    .replace('3 cm', '3')
    .replace('to: east-pillar', 'to: east-pilar')
    .replace('± 2′', '± 2')
    .replace('at: rising', 'at: sunrise')
    .replace('9600 BCE ± 100', '-9600')
    .replace('800 BCE to 500 BCE', '500 BCE to 800 BCE')
  const { claim, problems } = read(`${text}prior: uniform\n`)
  expect(claim).toBeNull()
  expect(problems.map(({ code }) => code)).toEqual([
    'unknown-key',
    'out-of-range',
    'out-of-range',
    'tolerance-without-unit',
    'unknown-point',
    'tolerance-without-unit',
    'unknown-word',
    'year-negative',
    'range-backwards',
    'unused-key',
  ])
})

test('before a break of syntax problems are told, behind it they are not', () => {
  const text = thornmereWith('41°16′12″ N', '95°')
    .replace('points:', 'points')
    .replace('9600 BCE ± 100', '-9600')
  expect(read(text).problems.map(({ code }) => code)).toEqual(['out-of-range', 'yaml-syntax'])
})

test.each(['east: 0 m, north: 53.09 m', 'east: 84.65 m, north: 0 m'])(
  'points apart in one direction only: %s',
  (place) => {
    claimOf(thornmereWith('east: 84.65 m, north: 53.09 m', place))
  },
)

test('points that cannot be read give no further problem in the lines between them', () => {
  expect(read(thornmereWith('points:', 'point:')).problems.map(({ code }) => code)).toEqual(['unknown-key'])
  const unreadable = thornmereWith('east: 84.65 m', 'east: far')
  expect(read(unreadable).problems.map(({ code }) => code)).toEqual(['not-readable'])
})

test('without points a line between them is told what is missing', () => {
  const text = THORNMERE.replace(/points:\n.*\n.*\n/, '')
  expect(read(text).problems).toMatchObject([
    { code: 'unknown-point', expected: 'the key points, which describes it' },
    { code: 'unknown-point', expected: 'the key points, which describes it' },
  ])
})

test('a value too long for a quantity is not looked into', () => {
  const { problems } = read(thornmereWith('41°16′12″ N', `"${' '.repeat(90_000)}x"`))
  expect(problems).toMatchObject([{ code: 'not-readable', path: 'structure.latitude' }])
  expect(problems[0]?.message).toMatch(/ is too long$/)
})

test('a place inside a folded or escaped text is the whole text', () => {
  const text = thornmereWith('41°16′12″ N', '"41\\u00b075\' N"')
  const { problems } = read(text)
  expect(problems.map(({ offset, length }) => text.slice(offset, offset + length))).toEqual([
    '"41\\u00b075\' N"',
  ])
})
