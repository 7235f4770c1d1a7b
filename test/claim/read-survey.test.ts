import { describe, expect, test } from 'vitest'
import type { Claim } from '../../src/claim/claim.ts'
import { type Files, read } from './read.ts'
import { POINTS, SKYLINE, SURVEY, SURVEY_AND_TABLE, surveyWith } from './survey.ts'

const ARCMIN = 1 / 60
const BESIDE: Files = { 'skyline.csv': SKYLINE, 'survey.csv': POINTS }

/** The claim of a file in which nothing is wrong or doubtful. */
function claimOf(text: string, files: Files = BESIDE): Claim {
  const { claim, problems } = read(text, files)
  expect(problems).toEqual([])
  return claim!
}

function lineOf(claim: Claim, name: string) {
  return claim.sightlines.find((line) => line.name === name)!
}

describe('the survey', () => {
  const claim = claimOf(SURVEY)

  test('has points of three kinds, one of which ties the plan to the Earth', () => {
    const near = (value: number) => expect.closeTo(value, 12)
    expect(Object.fromEntries(claim.points)).toEqual({
      hearth: {
        by: 'plan',
        eastM: 0,
        northM: 0,
        tie: { latitudeDeg: near(41.27), longitudeDeg: near(23 + 5 / 60) },
        upM: 1.2,
        uncertaintyM: 'omitted',
        breadth: null,
      },
      pillar: {
        by: 'plan',
        eastM: 84.65,
        northM: 53.09,
        tie: null,
        upM: 0.4,
        uncertaintyM: 'omitted',
        breadth: { form: 'post', widthM: 0.6 },
      },
      gate: {
        by: 'plan',
        eastM: 12,
        northM: -8,
        tie: null,
        upM: null,
        uncertaintyM: 'omitted',
        breadth: { form: 'gap', widthM: 2.1 },
      },
      peak: {
        by: 'geographic',
        latitudeDeg: near(41.201), // 12′03.6″ is 0.201°
        longitudeDeg: near(23 + 15 / 60 + 12.4 / 3600),
        upM: 1420,
        uncertaintyM: 10,
        breadth: null,
      },
      cairn: {
        by: 'grid',
        eastingM: 674512.297,
        northingM: 4570889.777,
        upM: 610,
        uncertaintyM: 'omitted',
        breadth: null,
      },
    })
  })

  test('says what is sighted, and how each horizon is known', () => {
    expect(lineOf(claim, 'edge')).toMatchObject({
      direction: { by: 'points', from: 'hearth', to: 'pillar', sighted: { from: 'omitted', to: 'left' } },
      horizon: { by: 'distance', distanceM: { value: 8000, sd: 100 }, riseM: { value: 120, sd: 5 } },
    })
    expect(lineOf(claim, 'notch').horizon).toEqual({ by: 'point', point: 'peak' })
    expect(lineOf(claim, 'shore').horizon).toEqual({ by: 'sea', eyeM: { value: 25, sd: 'omitted' } })
    const nodes = [
      [118, 1.5],
      [121.5, 2],
      [125, 0.75],
    ].map(([azimuthDeg, altitudeDeg]) => ({ azimuthDeg, altitudeDeg, sdDeg: 'omitted' }))
    expect(lineOf(claim, 'skyline').horizon).toEqual({ by: 'profile', file: 'skyline.csv', nodes })
  })

  test('has a span between both solstices', () => {
    expect(lineOf(claim, 'both')).toEqual({
      name: 'both',
      direction: {
        by: 'span',
        span: { by: 'angle', angleDeg: { value: 61, sd: expect.closeTo(5 * ARCMIN, 14) } },
        horizons: { june: 'omitted', december: 'omitted' },
      },
      horizon: 'omitted',
      target: { body: 'sun at both solstices', at: 'rising', disc: 'omitted' },
    })
  })

  test('names the file that was read', () => {
    expect(claim.attachments).toEqual([{ path: 'skyline.csv', sha256: `sha256 of ${SKYLINE.length}` }])
  })
})

describe('points from a table', () => {
  const HEADS = ['name,east,north', 'name;north;east', 'north\tname\teast']

  test.each(HEADS)('with the heading %j', (heading) => {
    const separator = /[,;\t]/.exec(heading)![0]
    const columns = heading.split(separator)
    const cells: Record<string, string> = { name: 'well', east: '3', north: '4' }
    const table = `${heading}\n${columns.map((column) => cells[column]).join(separator)}\n`
    const { points } = claimOf(SURVEY_AND_TABLE, { ...BESIDE, 'survey.csv': table })
    expect(points.get('well')).toMatchObject({ by: 'plan', eastM: 3, northM: 4, tie: null, upM: null })
    expect(points.size).toBe(6)
  })

  test('with comments, empty lines, quotes, other line ends, a byte order mark and units', () => {
    const table =
      '\ufeff# surveyed in June\r\n\r\n"Name", East ,north,up,uncertainty,width,form\r\n  # by the gate\r\n"well, old", 3 m ,400 cm,,5 cm,,\r\n"the ""stone""",-12.5,7.25,0.5,unknown,0.6,gap\r\n,,,,,,\r\n'
    const { points } = claimOf(SURVEY_AND_TABLE, { ...BESIDE, 'survey.csv': table })
    expect(points.get('well, old')).toEqual({
      by: 'plan',
      eastM: 3,
      northM: 4,
      tie: null,
      upM: null,
      uncertaintyM: 0.05,
      breadth: null,
    })
    expect(points.get('the "stone"')).toMatchObject({
      upM: 0.5,
      uncertaintyM: 'unknown',
      breadth: { form: 'gap', widthM: 0.6 },
    })
  })

  test('in bare degrees, in degrees and minutes, and on the grid', () => {
    const geographic = `name,latitude,longitude,elevation\na,41.27,23.0833,640\nb,41°16'12" N,23°05' E,\nc,-41.2,"23°05'12"" E",\n`
    const { claim, problems } = read(SURVEY_AND_TABLE, { ...BESIDE, 'survey.csv': geographic })
    expect(problems.map(({ code }) => code)).toEqual(['far-from-structure'])
    expect(claim?.points.get('a')).toMatchObject({ latitudeDeg: 41.27, longitudeDeg: 23.0833, upM: 640 })
    expect(claim?.points.get('b')).toMatchObject({ latitudeDeg: expect.closeTo(41.27, 12), upM: null })
    expect(claim?.points.get('c')).toMatchObject({
      latitudeDeg: -41.2,
      longitudeDeg: expect.closeTo(23 + 5 / 60 + 12 / 3600, 12),
    })
    const grid = 'name,easting,northing\na,674512.297,4570889.777\n'
    const { points } = claimOf(SURVEY_AND_TABLE, { ...BESIDE, 'survey.csv': grid })
    expect(points.get('a')).toMatchObject({ by: 'grid', eastingM: 674512.297, northingM: 4570889.777 })
  })

  test('alone, by its name', () => {
    const text = SURVEY.replace(/points:\n(?: {2}.*\n)+/, 'points: survey.csv\n').replace(
      / {2}(?:edge|notch): .*\n/g,
      '',
    )
    const cut = text
      .replace(/^grid.*\n|^north.*\n/gm, '')
      .replace('sightlines:\n', 'sightlines:\n  a: {from: well, to: stone}\n')
    const claim = claimOf(cut)
    expect([...claim.points.keys()]).toEqual(['well', 'stone'])
    expect(claim.attachments.map(({ path }) => path)).toEqual(['survey.csv', 'skyline.csv'])
  })

  test('with the uncertainty of all that state none', () => {
    const text = SURVEY_AND_TABLE.replace('points:\n', 'points:\n  uncertainty: 2 cm\n')
    const { points } = claimOf(text, {
      ...BESIDE,
      'survey.csv': `${POINTS.replace('north', 'north,uncertainty').replace('4\n', '4,0.07\n').replace('7.25\n', '7.25,\n')}`,
    })
    const uncertainties = [...points].map(([name, { uncertaintyM }]) => [name, uncertaintyM])
    expect(Object.fromEntries(uncertainties)).toEqual({
      hearth: 0.02,
      pillar: 0.02,
      gate: 0.02,
      peak: 10,
      cairn: 0.02,
      well: 0.07,
      stone: 0.02,
    })
  })

  test('of as many rows as are read', () => {
    const rows = Array.from({ length: 20_000 }, (_, row) => `p${row},${row}.25,${row}\n`).join('')
    const { points } = claimOf(SURVEY_AND_TABLE, { ...BESIDE, 'survey.csv': `name,east,north\n${rows}` })
    expect(points.size).toBe(20_005)
  })

  test('a point may be called file or uncertainty', () => {
    const text = surveyWith(
      'points:\n',
      'points:\n  file: {east: 1 m, north: 1 m}\n  uncertainty: {east: 2 m, north: 2 m}\n',
    )
    expect([...claimOf(text).points.keys()].slice(0, 2)).toEqual(['file', 'uncertainty'])
  })
})

describe('a skyline', () => {
  const nodesOf = (table: string) => {
    const { horizon } = lineOf(claimOf(SURVEY, { 'skyline.csv': table }), 'skyline')
    return typeof horizon !== 'string' && horizon.by === 'profile' ? horizon.nodes : []
  }

  test('may pass north once', () => {
    const table = 'azimuth;altitude;uncertainty\n350;1;0.1\n355;1.5;\n2;2;unknown\n8;2;\n150;2;2′\n'
    expect(nodesOf(table).map(({ azimuthDeg, sdDeg }) => [azimuthDeg, sdDeg])).toEqual([
      [350, 0.1],
      [355, 'omitted'],
      [2, 'unknown'],
      [8, 'omitted'],
      [150, 2 * ARCMIN],
    ])
  })

  test('may go all the way round', () => {
    expect(nodesOf('azimuth,altitude\n0,1\n120,2\n240,1\n360,1\n')).toHaveLength(4)
    expect(nodesOf('azimuth,altitude\n90,1\n200,2\n300,1\n90,1\n')).toHaveLength(4)
  })

  test('is read once for several lines', () => {
    const text = surveyWith(
      '  both:',
      '  again: {azimuth: 123° ± 5′, horizon: {profile: ./skyline.csv}}\n  both:',
    )
    const claim = claimOf(text)
    expect(lineOf(claim, 'again').horizon).toEqual(lineOf(claim, 'skyline').horizon)
    expect(claim.attachments).toHaveLength(1)
    const broken = read(text, { 'skyline.csv': SKYLINE.replace('118', '91°') })
    expect(broken.problems).toEqual([])
    expect(read(text, { 'skyline.csv': SKYLINE.replace('118', 'x') }).problems).toHaveLength(1)
  })
})

describe('what is sighted', () => {
  test.each([
    ['axis', 'middle'],
    ['Middle', 'middle'],
    ['left edge', 'left'],
    ['right-edge', 'right'],
    ['left side', 'left'],
    ['right side', 'right'],
    ['unknown', 'unknown'],
  ])('%s', (word, part) => {
    const { direction } = lineOf(claimOf(surveyWith('left edge', word)), 'edge')
    expect(direction).toMatchObject({ sighted: { from: 'omitted', to: part } })
  })

  test('of both ends', () => {
    const text = surveyWith(
      'from: hearth, to: pillar, sighted: left edge',
      'from: gate, to: pillar, sighted: {from: right side, to: axis}',
    )
    expect(lineOf(claimOf(text), 'edge').direction).toMatchObject({
      sighted: { from: 'right', to: 'middle' },
    })
  })
})

// One minute of a great circle of the sphere of 6371 km is 1853 m, and of the parallel of 41° N 1399 m.
test.each([
  ['east: 1 m, north: 2 m, up: 1 m', 'east: 31 m, north: 42 m, up: 85 m'],
  [
    'easting: 674600 m, northing: 4570800 m, elevation: 900 m',
    'easting: 675600 m, northing: 4570800 m, elevation: 815 m',
  ],
  [
    'latitude: 41° N, longitude: 23° E, elevation: 10 m',
    'latitude: 41°01′ N, longitude: 23° E, elevation: 3100 m',
  ],
  [
    'latitude: 41° N, longitude: 23° E, elevation: 10 m',
    'latitude: 41° N, longitude: 23°01′ E, elevation: 2380 m',
  ],
])('a point may be as steep a horizon as any', (foot, top) => {
  const text = surveyWith('points:\n', `points:\n  foot: {${foot}}\n  top: {${top}}\n`)
  const line = '  new: {from: foot, to: pillar, horizon: {point: top}}\n  both:'
  expect(lineOf(claimOf(text.replace('  both:', line)), 'new').horizon).toEqual({ by: 'point', point: 'top' })
})

describe('a span', () => {
  const spanOf = (span: string) => lineOf(claimOf(surveyWith('{angle: 61° ± 5′}', span)), 'both').direction

  test('between the lines from a point to two others, with their horizons', () => {
    expect(
      spanOf(
        '{from: hearth, june: pillar, december: gate, horizons: {june: {point: pillar}, december: 1°20′ ± 1′}}',
      ),
    ).toEqual({
      by: 'span',
      span: { by: 'points', from: 'hearth', june: 'pillar', december: 'gate' },
      horizons: {
        june: { by: 'point', point: 'pillar' },
        december: {
          by: 'altitude',
          altitudeDeg: { value: expect.closeTo(4 / 3, 12), sd: expect.closeTo(ARCMIN, 14) },
        },
      },
    })
  })

  test('with horizons of other forms, or unknown', () => {
    expect(spanOf('{angle: 61°, horizons: {june: {sea: 3 m ± 1 m}}}')).toMatchObject({
      horizons: { june: { by: 'sea', eyeM: { value: 3, sd: 1 } }, december: 'omitted' },
    })
    const ends = 'from: hearth, june: pillar, december: gate'
    expect(spanOf(`{${ends}, horizons: {december: {profile: skyline.csv}}}`)).toMatchObject({
      horizons: { june: 'omitted', december: { by: 'profile', file: 'skyline.csv' } },
    })
    expect(spanOf('{angle: 61°, horizons: unknown}')).toMatchObject({
      horizons: { june: 'unknown', december: 'unknown' },
    })
  })
})

describe('north', () => {
  const nothing = { date: null, declination: null, convergence: null, baselineM: null, accuracyM: null }
  const northOf = (north: string) => claimOf(surveyWith('{from: sun}', north)).north

  test.each([
    ['{from: sun}', { from: 'sun' }],
    ['{from: star}', { from: 'star' }],
    ['{from: plan, uncertainty: 2°}', { from: 'plan', uncertaintyDeg: 2 }],
    ['{from: grid}', { from: 'grid' }],
    [
      '{from: grid, convergence: 1°36′ W ± 3′}',
      { from: 'grid', convergence: { value: -1.6, sd: expect.closeTo(0.05, 12) } },
    ],
    ['{from: gps, baseline: 60 m, accuracy: 2 cm}', { from: 'gps', baselineM: 60, accuracyM: 0.02 }],
    ['{from: compass}', { from: 'compass' }],
    ['{from: compass, declination: applied}', { from: 'compass', declination: 'applied' }],
    ['{from: compass, declination: 0°}', { from: 'compass', declination: { value: 0, sd: 'omitted' } }],
    [
      '{from: compass, date: 12 June 1850, declination: 20° W ± 0.5°, uncertainty: 30′}',
      {
        from: 'compass',
        uncertaintyDeg: 0.5,
        date: { year: 1850, month: 6, day: 12, text: '12 June 1850' },
        declination: { value: -20, sd: 0.5 },
      },
    ],
    [
      '{from: compass, date: 2019-06-12}',
      {
        from: 'compass',
        date: { year: 2019, month: 6, day: 12, text: '2019-06-12' },
        declination: 'of the date',
      },
    ],
  ])('%s', (north, expected) => {
    expect(northOf(north)).toEqual({ uncertaintyDeg: 'omitted', ...nothing, ...expected })
  })
})

describe('a grid', () => {
  const gridOf = (grid: string) => claimOf(surveyWith('{zone: UTM 34 N}', grid)).grid

  // NGA.SIG.0012 (2014), The universal grids: zone 34 is centred on 21° E.
  test.each(['UTM 34 N', '34N', 'utm zone 34n', 'UTM 34 north'])('zone: %s', (zone) => {
    expect(gridOf(`{zone: ${zone}}`)).toEqual({
      by: 'projection',
      name: 'UTM zone 34 N on WGS84',
      projection: {
        ellipsoid: 'WGS84',
        centralMeridianDeg: 21,
        latitudeOfOriginDeg: 0,
        scale: 0.9996,
        falseEastingM: 500_000,
        falseNorthingM: 0,
      },
    })
  })

  test('of the south counts from 10,000 km', () => {
    const text = surveyWith('{zone: UTM 34 N}', '{zone: UTM 34 S, ellipsoid: grs 80}').replace(
      '4570889.777',
      '10000000',
    )
    const { claim, problems } = read(text, BESIDE)
    expect(problems.map(({ code }) => code)).toEqual(['far-from-structure'])
    expect(claim?.grid).toMatchObject({
      name: 'UTM zone 34 S on GRS80',
      projection: { ellipsoid: 'GRS80', falseNorthingM: 1e7 },
    })
  })

  // The national grid of Great Britain: Ordnance Survey, A guide to coordinate systems in Great Britain, annex A.
  test('by its projection', () => {
    const grid =
      '{central_meridian: 2° W, latitude_of_origin: 49° N, scale: 0.9996012717, false_easting: 400 km, false_northing: -100 km, ellipsoid: airy}'
    const text = surveyWith('{zone: UTM 34 N}', grid).replace('4570889.777', '70889.777')
    const { claim, problems } = read(text, BESIDE)
    expect(problems.map(({ code }) => code)).toEqual(['far-from-structure'])
    expect(claim?.grid).toEqual({
      by: 'projection',
      name: 'transverse Mercator about 2° W on Airy 1830',
      projection: {
        ellipsoid: 'Airy 1830',
        centralMeridianDeg: -2,
        latitudeOfOriginDeg: 49,
        scale: 0.9996012717,
        falseEastingM: 400_000,
        falseNorthingM: -100_000,
      },
    })
  })

  test('by its convergence', () => {
    const text = surveyWith('{zone: UTM 34 N}', '{convergence: 1°36′ E ± 3′}')
      .replace('from: cairn, to: peak, horizon: {point: peak}', 'from: cairn, to: trig')
      .replace('  cairn:', '  trig: {easting: 675000 m, northing: 4571000 m}\n  cairn:')
    expect(claimOf(text).grid).toEqual({
      by: 'convergence',
      convergenceDeg: { value: 1.6, sd: expect.closeTo(0.05, 12) },
    })
  })
})

describe('lines join points of kinds that are tied', () => {
  test.each(['hearth, to: peak', 'gate, to: cairn', 'peak, to: pillar', 'cairn, to: peak'])(
    '{from: %s}',
    (ends) => {
      claimOf(surveyWith('  both:', `  joined: {from: ${ends}}\n  both:`))
    },
  )
})

describe('nothing is said of', () => {
  const soundWith = (points: string, line: string, from = 'points:\n', to = from) => {
    const text = surveyWith('points:\n', `points:\n${points}`).replace('  both:', `${line}  both:`)
    expect(read(text.replace(from, to), BESIDE).problems).toEqual([])
  }

  test('an unknown part of a point without a width', () => {
    soundWith('', '  new: {from: hearth, to: pillar, sighted: {from: unknown}}\n')
  })

  test('the middle of what is wider than the line is long', () => {
    const wide = '  wide: {east: 3 m, north: 4 m, width: 6 m, form: gap}\n'
    soundWith(wide, '  new: {from: wide, to: hearth, sighted: {from: middle}}\n')
  })

  test('an edge of what is just as wide as the line is long', () => {
    const wide = '  wide: {east: 3 m, north: 4 m, width: 5 m}\n'
    soundWith(wide, '  new: {from: hearth, to: wide, sighted: right edge}\n')
  })

  test('two points just as far apart as they are uncertain', () => {
    const near = '  near: {east: 3 m, north: 4 m, uncertainty: 5 m}\n'
    soundWith(near, '  new: {from: hearth, to: near}\n')
  })

  test('a span whose june end is left of the other at rising', () => {
    soundWith('', '', '{angle: 61° ± 5′}', '{from: hearth, june: pillar, december: gate}')
  })

  test('two GPS positions that leave north open by less than 30°', () => {
    soundWith('', '', '{from: sun}', '{from: gps, baseline: 10 m, accuracy: 3.7 m}')
  })

  test('two absurd GPS positions that are not used is said no more than that', () => {
    const stated = '{from: gps, baseline: 10 cm, accuracy: 1 km, uncertainty: 5′}'
    const { problems } = read(surveyWith('{from: sun}', stated), BESIDE)
    expect(problems.map(({ code }) => code)).toEqual(['unused-key', 'unused-key'])
  })
})
