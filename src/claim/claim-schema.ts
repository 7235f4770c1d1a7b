import { POINT_FORMS } from './read/read-breadth.ts'
import { DISC_PARTS } from './read/read-disc.ts'
import { ELLIPSOID_NAMES } from './read/read-ellipsoid.ts'
import { MODEL_NAMES } from './read/read-formula.ts'
import { MOON_MOMENTS, STANDSTILLS } from './read/read-moon-target.ts'
import { NORTH_WAYS } from './read/read-north.ts'
import { PROJECTION } from './read/read-projection.ts'
import { SIGHTED_WORDS } from './read/read-sighted.ts'
import { SPAN_MOMENTS } from './read/read-span-target.ts'
import { PAIR_EVENT } from './read/read-star-pair-target.ts'
import { EQUINOX_SENSES, SUN_EVENTS } from './read/read-sun-event.ts'
import { SUN_MOMENTS } from './read/read-sun-target.ts'
import { SPAN_EVENT } from './read/season.ts'
import { STAR_MOMENTS } from './read/star-moments.ts'

/** A part of a JSON Schema. */
export type Schema = Readonly<Record<string, unknown>>

const text = (description: string): Schema => ({ type: 'string', description })

/** A quantity is a text with its unit; where `unknown` is legal, editors offer it. */
const quantity = (description: string, ...examples: string[]): Schema => ({
  type: 'string',
  description,
  examples,
})

const word = (description: string, words: readonly string[]): Schema => ({ enum: words, description })

const unread = (description: string): Schema => ({ description: `${description} Not used by this version.` })

const mapping = (
  description: string,
  properties: Readonly<Record<string, Schema>>,
  required: readonly string[] = [],
): Schema => ({ type: 'object', description, properties, required, additionalProperties: false })

const names = (description: string, entry: Schema): Schema => ({
  type: 'object',
  description,
  minProperties: 1,
  additionalProperties: entry,
})

const disc: Schema = {
  type: 'string',
  description:
    'The part of the disc that stands on the horizon, or at noon is measured; how much of it shows; or unknown.',
  examples: [...DISC_PARTS, '2′ showing', 'unknown'],
}

const star = (description: string): Schema => ({
  type: 'string',
  description,
  not: { enum: ['sun', 'moon'] },
  examples: ['Sirius', 'alpha CMa', 'HR 2491'],
})

const target: Schema = {
  description: 'What the line is said to mark: the Sun on a day of the year, the Moon, a star, or two stars.',
  anyOf: [
    mapping(
      'The Sun on a day of the year; at noon the sightline is an altitude.',
      {
        body: word('The Sun.', ['sun']),
        event: word('The day of the year; or else day.', SUN_EVENTS),
        day: quantity('Days counted from a solstice, at most 183.', '30 days after june solstice'),
        sense: word('What is meant by an equinox.', [...EQUINOX_SENSES, 'unknown']),
        at: word('Where the Sun stands.', SUN_MOMENTS),
        disc,
      },
      ['body', 'at'],
    ),
    mapping(
      'The Sun at both solstices; the sightline is a span.',
      {
        body: word('The Sun.', ['sun']),
        event: word('Both solstices of a year.', [SPAN_EVENT]),
        at: word('Where the Sun crosses the horizon.', SPAN_MOMENTS),
        disc,
      },
      ['body', 'event', 'at'],
    ),
    mapping(
      'The Moon at a standstill, which comes every 18.6 years.',
      {
        body: word('The Moon.', ['moon']),
        event: word('Which end of its swing, and whether the widest or the narrowest swing.', STANDSTILLS),
        at: word('Where the Moon crosses the horizon.', MOON_MOMENTS),
        disc,
      },
      ['body', 'event', 'at'],
    ),
    mapping(
      'A star; at a culmination the sightline is an altitude.',
      {
        body: star('The star, by name, Bayer letter or HR number.'),
        at: word('Where the star stands.', STAR_MOMENTS),
        altitude: quantity(
          'Apparent altitude at which it was sighted; without it, where it is first visible.',
          '3° ± 0.5°',
          'unknown',
        ),
      },
      ['body', 'at'],
    ),
    mapping(
      'Two stars at the same azimuth near north.',
      {
        bodies: {
          type: 'array',
          description: 'The two stars.',
          items: star('A star, by name, Bayer letter or HR number.'),
          minItems: 2,
          maxItems: 2,
        },
        event: word('How they stand.', [PAIR_EVENT]),
        above: text('The upper one of the two; without it, or unknown, either.'),
      },
      ['bodies', 'event'],
    ),
  ],
}

/** Of the ways to write a mapping, each by the keys it cannot do without, exactly one. */
const oneOf = (...ways: readonly (readonly string[])[]): Schema => ({
  oneOf: ways.map((required) => ({ required })),
})

/** The same, of ways that may stand beside each other. */
const anyOf = (...ways: readonly (readonly string[])[]): Schema => ({
  anyOf: ways.map((required) => ({ required })),
})

const point: Schema = {
  ...mapping('A point: on the plan, in latitude and longitude, or on the grid.', {
    east: quantity('Metres east of the plan’s origin.', '84.65 m'),
    north: quantity('Metres north of the plan’s origin.', '53.09 m'),
    up: quantity('Height above the plan’s origin.', '0.4 m'),
    latitude: quantity('On WGS 84; beside east and north it ties the plan to the Earth.', '41°20′03.6″ N'),
    longitude: quantity('On WGS 84, beside latitude.', '23°15′12.4″ E'),
    easting: quantity('On the projected grid.', '273741.297 m'),
    northing: quantity('On the projected grid.', '5796489.777 m'),
    elevation: quantity('Height above sea level of a point that is not on the plan.', '1420 m'),
    uncertainty: quantity('One standard deviation in each of two directions.', '5 cm', 'unknown'),
    width: quantity('Width across the line of what stands there.', '60 cm'),
    form: word('Whether what has a width is a post or a gap between two.', POINT_FORMS),
  }),
  ...anyOf(['east', 'north'], ['latitude', 'longitude'], ['easting', 'northing']),
}

/** A setting, or a point of its name. */
const orPoint = (setting: Schema): Schema => ({ description: setting.description, anyOf: [setting, point] })

const points: Schema = {
  description: 'The points of the survey, by name; or a table of them beside the claim file.',
  anyOf: [
    text('A table beside the claim file.'),
    {
      ...names('The points by name.', point),
      properties: {
        file: orPoint(text('A table beside the claim file, with more points.')),
        uncertainty: orPoint(quantity('Of all points that state none.', '5 cm', 'unknown')),
      },
    },
  ],
}

const north: Schema = {
  description: 'How the plan’s north was found, and how well; or unknown.',
  anyOf: [
    { const: 'unknown' },
    mapping(
      'How north was found.',
      {
        from: word('The means.', NORTH_WAYS),
        uncertainty: quantity('One standard deviation.', '0.5°', 'unknown'),
        date: quantity('Of a compass: the day of the survey.', '12 June 1998', '1998-06-12'),
        declination: quantity(
          'Of a compass: by how much its north lies off true north; applied where that has been taken off.',
          '3°20′ W ± 10′',
          'applied',
        ),
        baseline: quantity('Of two GPS positions: how far apart they were.', '60 m'),
        accuracy: quantity('Of two GPS positions: one standard deviation of each.', '2 cm'),
        convergence: quantity('Of a grid: by how much its north lies off true north.', '1°35′ W ± 1′'),
      },
      ['from'],
    ),
  ],
}

const grid: Schema = {
  ...mapping('The projected grid: a zone, a projection, or its convergence alone.', {
    zone: quantity('A zone of UTM, N or S of the equator.', 'UTM 55 S'),
    central_meridian: quantity('Of a transverse Mercator projection.', '2° W'),
    latitude_of_origin: quantity('Where northings count from.', '49° N'),
    scale: { type: ['number', 'string'], description: 'On the central meridian.', examples: [0.9996012717] },
    false_easting: quantity('Easting of the central meridian.', '400 km'),
    false_northing: quantity('Northing of the latitude of origin.', '-100 km'),
    ellipsoid: word('The figure of the Earth.', ELLIPSOID_NAMES),
    convergence: quantity('By how much grid north lies off true north.', '1°35′ W ± 1′'),
  }),
  ...oneOf(['zone'], PROJECTION, ['convergence']),
}

const horizon = (description: string): Schema => ({
  description,
  anyOf: [
    quantity('Its apparent altitude.', '1°30′ ± 2′', 'unknown'),
    {
      ...mapping('What its altitude follows from.', {
        distance: quantity('How far it is.', '8 km ± 100 m'),
        rise: quantity('How much it stands above the eye.', '120 m ± 5 m'),
        point: text('A point with a height that is the horizon.'),
        sea: quantity('The open sea, by the height of the eye above it.', '25 m'),
        profile: text(
          'A table of azimuth and altitude beside the claim file; not for a span given by its angle.',
        ),
      }),
      ...oneOf(['distance', 'rise'], ['point'], ['sea'], ['profile']),
    },
  ],
})

const span = mapping('The span between both solstices: an angle, or three points.', {
  angle: quantity('As measured.', '50°31′ ± 2′'),
  from: text('The point one stands at.'),
  june: text('The point one looks at for the june solstice.'),
  december: text('The point one looks at for the december solstice.'),
  horizons: {
    description: 'The horizon at either end; or unknown.',
    anyOf: [
      { const: 'unknown' },
      mapping('The horizon at either end.', {
        june: horizon('Towards the june solstice.'),
        december: horizon('Towards the december solstice.'),
      }),
    ],
  },
})

const sighted: Schema = {
  description: 'What of a post or a gap is sighted; a plain word is of the far one.',
  anyOf: [
    word('Of the far one.', SIGHTED_WORDS),
    mapping('Of both.', {
      from: word('Of the near one.', SIGHTED_WORDS),
      to: word('Of the far one.', SIGHTED_WORDS),
    }),
  ],
}

const sightline = mapping(
  'A line: from and to, or azimuth, or altitude for a target on the meridian, or span for both solstices.',
  {
    from: text('The point one stands at.'),
    to: text('The point one looks at.'),
    sighted,
    azimuth: quantity('Measured direction from true north through east.', '49°34′18″ ± 1′'),
    altitude: quantity('Apparent altitude measured on the meridian.', '31°12′ ± 10′'),
    span,
    horizon: horizon('Where the line meets the sky.'),
    target,
  },
)

const atmosphere = mapping('The air, or the refraction that the claim took.', {
  temperature: quantity('Of the air at the place.', '15 °C', 'unknown'),
  pressure: quantity('Of the air at the place, not reduced to sea level.', '940 hPa', 'unknown'),
  humidity: quantity('Relative humidity.', '40 %', 'unknown'),
  lapse: quantity('Fall of temperature with height.', '6.5 K/km', 'unknown'),
  refraction: quantity('Refraction less parallax, used as given.', '27′20″', 'unknown'),
  refraction_uncertainty: quantity('One standard deviation from day to day.', '3′', 'unknown'),
})

const claimed = mapping('Intermediate results that the source prints; each step is checked apart.', {
  azimuth: quantity('Azimuth of the line.', '49°34′18″'),
  altitude: quantity('True altitude of the body’s centre.', '0°24′'),
  refraction: quantity('Refraction at the horizon.', '27′20″'),
  semidiameter: quantity('Half the width of the Sun or the Moon.', '15′45″'),
  declination: quantity('Declination of the body.', '23°54′30″'),
  obliquity: quantity('Obliquity of the ecliptic.', '23°54′30″'),
})

/** JSON Schema 2020-12 of the claim file, for editors that complete keys; `readClaim` checks what it cannot say. */
export const CLAIM_SCHEMA: Schema = {
  $schema: 'https://json-schema.org/draft/2020-12/schema',
  title: 'Datestone claim',
  ...mapping(
    'A claim that the alignment of a building with the sky dates it.',
    {
      claim: text('The claim in one sentence.'),
      source: text('Where it is printed.'),
      structure: mapping(
        'The building and where it is.',
        {
          name: text('Name of the building.'),
          latitude: quantity('Geographic latitude.', '41°16′12″ N'),
          longitude: quantity('Geographic longitude.', '23°05′ E'),
          elevation: quantity('Height above sea level.', '640 m', 'unknown'),
        },
        ['name', 'latitude'],
      ),
      north,
      grid,
      points,
      sightlines: names('The lines said to mark something, by name.', sightline),
      target,
      asserted_date: quantity(
        'The date that the claim asserts.',
        '9600 BCE ± 100',
        'c. 400 CE',
        '3200 cal BP',
      ),
      assumed_precision: quantity('What the claim gives the builders.', 'exact', '1′', 'unknown'),
      plausible_precision: quantity('Build tolerances to sweep over.', '10′ to 1°', 'unknown'),
      other_dates: {
        type: 'array',
        description: 'Dates of the building from independent evidence.',
        items: mapping(
          'One independent date.',
          {
            label: text('What the date rests on.'),
            date: quantity('A date or a range.', '800 to 500 BCE'),
          },
          ['label', 'date'],
        ),
      },
      window: quantity('Dates thought possible at all.', '20001 BCE to 2026 CE', 'unknown'),
      atmosphere,
      claimed,
      formula: {
        type: 'string',
        description: 'The obliquity model that the claim used, or the name of another table.',
        examples: [...MODEL_NAMES, 'unknown'],
      },
      tolerances: {
        type: 'array',
        description: 'Build tolerances that the sweep must include exactly.',
        items: quantity('A tolerance.', '5′'),
      },
      notes: text('Remarks to print in the report, in Markdown.'),
      prior: unread('A density over the window.'),
      alternatives: unread('What else may be meant.'),
      lines_tried: unread('How many lines the authors looked at.'),
    },
    ['claim', 'structure', 'sightlines', 'asserted_date'],
  ),
}
