import { describe, expect, test } from 'vitest'
import type { Files } from '../claim/read.ts'
import { expectWithin } from '../published/expect-within.ts'
import { claimText } from './audit-of.ts'
import { obliquityOf } from './by-tables.ts'
import { auditWith, profileOf } from './settled.ts'

const PLAN =
  '{a: {east: 0 m, north: 0 m, uncertainty: 1 cm}, b: {east: 61 m, north: 50 m, uncertainty: 1 cm}}'
const BETWEEN = '{one: {from: a, to: b, horizon: 30′ ± 1′}}'
const NORTH = '{from: star, uncertainty: 1′}'
const PLACE = '{name: Place, latitude: 50° N, longitude: 2° W, elevation: 100 m}'
const GEOGRAPHIC = (sd: string) =>
  `{a: {latitude: 50.000000° N, longitude: 2.000000° W, uncertainty: 1 m}, b: {latitude: 50.010000° N, longitude: 1.980000° W${sd}}}`
const ON_GRID = (sd: string) =>
  `{a: {easting: 571000 m, northing: 5539000 m, uncertainty: 1 m}, b: {easting: 571610 m, northing: 5539500 m${sd}}}`
const SPAN = { target: '{body: sun, event: june to december solstice, at: rising, disc: upper limb}' }
const LEVELS = 'horizons: {june: 0° ± 1′, december: 0° ± 1′}'
const horizon = (text: string) => ({ sightlines: `{one: {azimuth: 50°32′ ± 2′, horizon: ${text}}}` })
const HEIGHTS = (rock: string) =>
  `{a: {east: 0 m, north: 0 m, up: 0 m, uncertainty: 1 cm}, b: {east: 61 m, north: 50 m, uncertainty: 1 cm}, rock: {east: 610 m, north: 500 m, up: 20 m${rock}}}`
const nodes = [
  [30, 0.5],
  [50, 0.5],
  [80, 0.5],
] as const
const WITH_SD = { 's.csv': profileOf(nodes, 0.03) }
const WITHOUT_SD = { 's.csv': 'azimuth,altitude\n30,0.5\n50,0.5\n80,0.5\n' }
const ALL_ROUND = {
  's.csv': profileOf(
    [0, 90, 180, 270, 360].map((azimuth) => [azimuth, 0.5] as const),
    0.03,
  ),
}

type Changes = Record<string, string>

/** What appears where its value is left out, and not where it is stated. */
const CASES: readonly [string, Changes, Changes, (readonly [Files, Files])?][] = [
  [
    'the plan’s north',
    { points: PLAN, sightlines: BETWEEN },
    { points: PLAN, sightlines: BETWEEN, north: NORTH },
  ],
  ...(
    ['compass, declination: applied', 'gps', 'sun', 'star', 'plan', 'grid, convergence: 1° E ± 1′'] as const
  ).map((from): [string, Changes, Changes] => [
    'uncertainty of the plan’s north',
    { points: PLAN, sightlines: BETWEEN, north: `{from: ${from}}` },
    { points: PLAN, sightlines: BETWEEN, north: `{from: ${from}, uncertainty: 3′}` },
  ]),
  [
    'whether the compass bearings were corrected for declination',
    { points: PLAN, sightlines: BETWEEN, north: '{from: compass, uncertainty: 30′}' },
    { points: PLAN, sightlines: BETWEEN, north: '{from: compass, uncertainty: 30′, declination: applied}' },
  ],
  [
    'uncertainty of the grid’s convergence',
    { points: ON_GRID(', uncertainty: 1 m'), sightlines: BETWEEN, grid: '{convergence: 1° E}' },
    { points: ON_GRID(', uncertainty: 1 m'), sightlines: BETWEEN, grid: '{convergence: 1° E ± 1′}' },
  ],
  [
    'uncertainty of the point b',
    { points: PLAN.replace('50 m, uncertainty: 1 cm', '50 m'), sightlines: BETWEEN, north: NORTH },
    { points: PLAN, sightlines: BETWEEN, north: NORTH },
  ],
  [
    'uncertainty of the point b',
    { points: GEOGRAPHIC(''), sightlines: BETWEEN },
    { points: GEOGRAPHIC(', uncertainty: 2 m'), sightlines: BETWEEN },
  ],
  [
    'uncertainty of the point b',
    { points: ON_GRID(''), sightlines: BETWEEN, grid: '{zone: UTM 30 N}' },
    { points: ON_GRID(', uncertainty: 2 m'), sightlines: BETWEEN, grid: '{zone: UTM 30 N}' },
  ],
  [
    'part of b that is sighted',
    { points: PLAN.replace('50 m,', '50 m, width: 1 m,'), sightlines: BETWEEN, north: NORTH },
    {
      points: PLAN.replace('50 m,', '50 m, width: 1 m,'),
      sightlines: '{one: {from: a, to: b, sighted: left edge, horizon: 30′ ± 1′}}',
      north: NORTH,
    },
  ],
  [
    'uncertainty of the angle',
    { ...SPAN, sightlines: `{one: {span: {angle: 80°, ${LEVELS}}}}` },
    { ...SPAN, sightlines: `{one: {span: {angle: 80° ± 2′, ${LEVELS}}}}` },
  ],
  ...(['June', 'December'] as const).map((month): [string, Changes, Changes] => {
    const other = month === 'June' ? 'december' : 'june'
    return [
      `altitude of the ${month} horizon`,
      { ...SPAN, sightlines: `{one: {span: {angle: 80° ± 2′, horizons: {${other}: 0° ± 1′}}}}` },
      { ...SPAN, sightlines: `{one: {span: {angle: 80° ± 2′, ${LEVELS}}}}` },
    ]
  }),
  [
    'uncertainty of the horizon’s distance',
    horizon('{distance: 8 km, rise: 70 m ± 5 m}'),
    horizon('{distance: 8 km ± 100 m, rise: 70 m ± 5 m}'),
  ],
  [
    'uncertainty of the horizon’s height above the eye',
    horizon('{distance: 8 km ± 100 m, rise: 70 m}'),
    horizon('{distance: 8 km ± 100 m, rise: 70 m ± 5 m}'),
  ],
  [
    'refraction along the ground towards the horizon',
    horizon('{distance: 8 km ± 100 m, rise: 70 m ± 5 m}'),
    horizon('30′ ± 1′'),
  ],
  ['uncertainty of the eye’s height above the sea', horizon('{sea: 25 m}'), horizon('{sea: 25 m ± 1 m}')],
  ['refraction along the water', horizon('{sea: 25 m ± 1 m}'), horizon('-9′ ± 1′')],
  ['altitude of the horizon', { sightlines: '{one: {azimuth: 50°32′ ± 2′}}' }, horizon('0° ± 1′')],
  ['uncertainty of the horizon’s altitude', horizon('30′'), horizon('30′ ± 1′')],
  [
    'uncertainty of the horizon’s profile',
    horizon('{profile: s.csv}'),
    horizon('{profile: s.csv}'),
    [WITHOUT_SD, WITH_SD],
  ],
  [
    'the horizon beyond the profile',
    horizon('{profile: s.csv}'),
    horizon('{profile: s.csv}'),
    [WITH_SD, ALL_ROUND],
  ],
  [
    'uncertainty of the height of rock',
    { points: HEIGHTS(''), sightlines: '{one: {from: a, to: b, horizon: {point: rock}}}', north: NORTH },
    {
      points: HEIGHTS(', uncertainty: 10 cm'),
      sightlines: '{one: {from: a, to: b, horizon: {point: rock}}}',
      north: NORTH,
    },
  ],
]

describe('a value that is left out is an assumption, and one that is stated is none', () => {
  test.each(CASES.map((row, i) => [`${row[0]} (${i + 1})`, ...row] as const))(
    '%s',
    (_, what, without, stated, files = [{}, {}]) => {
      const rows = (changes: Changes, beside: Files) =>
        auditWith(claimText({ structure: PLACE, ...changes }), beside).assumptions
      const leftOut = rows(without, files[0])
      expect(leftOut.filter((row) => row.what === what).map(({ said }) => said)).toEqual(['omitted'])
      expect(rows(stated, files[1]).map((row) => row.what)).not.toContain(what)
      // Largest first; before them what leaves no date, after them what moves none.
      const effects = leftOut
        .filter(({ effect_of }) => !effect_of.includes('no date fits'))
        .map(({ effect_years }) => effect_years ?? -1)
      expect(effects).toEqual([...effects].sort((x, y) => y - x))
    },
  )
})

test('a north that is unknown is said to be so', () => {
  const { assumptions } = auditWith(claimText({ points: PLAN, sightlines: BETWEEN, north: 'unknown' }))
  const row = assumptions.find(({ what }) => what === 'uncertainty of the plan’s north')
  expect(row).toMatchObject({ said: 'unknown', used: '± 30′' })
})

test('what two lines take alike is one row', () => {
  const two = `{one: {from: a, to: b, horizon: 30′ ± 1′}, other: {from: b, to: a, horizon: 30′ ± 1′, target: {body: sun, event: december solstice, at: setting}}}`
  const { assumptions } = auditWith(claimText({ points: PLAN, sightlines: two }))
  expect(assumptions.filter(({ what }) => what === 'the plan’s north')).toHaveLength(1)
})

describe('the effect of an assumption', () => {
  // A line turned by Δ wants an obliquity other by Δ · dε/dA, dA/dε = cos ε/(cos φ cos h sin A), which comes so many years
  // later or earlier by the table of the obliquity. At latitude 50°, an azimuth of about 50.5°.
  test('of north is the years in which the obliquity turns the sunrise as far', () => {
    const { assumptions, sightlines, implied } = auditWith(
      claimText({
        structure: PLACE,
        points: PLAN.replace('61 m', '60.75 m'),
        sightlines: BETWEEN,
        north: '{from: sun}',
      }),
    )
    const row = assumptions.find(({ what }) => what === 'uncertainty of the plan’s north')!
    expect(row.used).toBe('± 1′')
    const rad = Math.PI / 180
    const year = implied[0]!.dates
      .map((date) => date.year)
      .sort((a, b) => Math.abs(a + 1999) - Math.abs(b + 1999))[0]!
    const azimuth = sightlines[0]!.azimuth_deg!.value
    const turn = Math.cos(obliquityOf(-2000) * rad) / (Math.cos(50 * rad) * Math.sin(azimuth * rad))
    const shifts = [1, -1].map((sign) => Math.abs(yearOf(obliquityBetween(year) + sign / 60 / turn) - year))
    // A parabola through three rows of the table, 1,000 years apart, leaves 0.2″ of the obliquity or less, and that in
    // all of these years alike; the centre stands 0.2° below the level, which turns by less than a hundredth.
    expectWithin(row.effect_years! / Math.max(...shifts), 1, 0.02, 'of the years')
  })
})

/** The obliquity between rows of the table about 2001 BCE, by the parabola through three of them. */
function obliquityBetween(year: number): number {
  const [before, middle, after] = [obliquityOf(-3000), obliquityOf(-2000), obliquityOf(-1000)]
  const x = (year + 2000) / 1000
  return middle + (x * (after - before)) / 2 + (x * x * (after + before - 2 * middle)) / 2
}

/** When it was so, by halving: it falls all that time. */
function yearOf(obliquity: number): number {
  let [early, late] = [-5000, 1000]
  for (let i = 0; i < 60; i++) {
    const middle = (early + late) / 2
    if (obliquityBetween(middle) > obliquity) early = middle
    else late = middle
  }
  return early
}
