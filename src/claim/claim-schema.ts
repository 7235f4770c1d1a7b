import { DISC_PARTS } from './read/read-disc.ts'
import { MODEL_NAMES } from './read/read-formula.ts'

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

const target = mapping(
  'What the line is said to mark: the Sun at a solstice.',
  {
    body: word('The body.', ['sun']),
    event: word('The day of the year.', ['june solstice', 'december solstice']),
    at: word('Where the body crosses the horizon.', ['rising', 'setting']),
    disc: {
      type: 'string',
      description: 'The part of the disc that stands on the horizon, how much of it shows, or unknown.',
      examples: [...DISC_PARTS, '2′ showing', 'unknown'],
    },
  },
  ['body', 'event', 'at'],
)

const point = mapping(
  'A point on a local grid.',
  {
    east: quantity('Metres east of the grid’s origin.', '84.65 m'),
    north: quantity('Metres north of the grid’s origin.', '53.09 m'),
    up: quantity('Height above the grid’s origin.', '0.4 m'),
    uncertainty: quantity('One standard deviation in each of east and north.', '5 cm', 'unknown'),
  },
  ['east', 'north'],
)

const sightline = mapping('A line: either from and to, or azimuth.', {
  from: text('The point one stands at.'),
  to: text('The point one looks at.'),
  azimuth: quantity('Measured direction from true north through east.', '49°34′18″ ± 1′'),
  horizon: quantity('Apparent altitude of the horizon where the line meets it.', '1°30′ ± 2′', 'unknown'),
  target,
})

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
  altitude: quantity('True altitude of the centre of the Sun.', '0°24′'),
  refraction: quantity('Refraction at the horizon.', '27′20″'),
  semidiameter: quantity('Half the width of the Sun.', '15′45″'),
  declination: quantity('Declination of the Sun.', '23°54′30″'),
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
      north: {
        description: 'How the plan’s north was found, and how well; or unknown.',
        anyOf: [
          { const: 'unknown' },
          mapping(
            'How north was found.',
            {
              from: word('The means.', ['compass', 'gps', 'sun', 'plan']),
              uncertainty: quantity('One standard deviation.', '0.5°', 'unknown'),
            },
            ['from'],
          ),
        ],
      },
      points: names('The points of the plan, by name.', point),
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
