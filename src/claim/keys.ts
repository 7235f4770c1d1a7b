import type { Target } from './claim.ts'

/** What this version does with a key. `unused`: the file format has it, and it can be left aside (a warning). */
export type KeyUse = 'required' | 'optional' | 'unused'

/** The keys a mapping may have, in the order they are named to people. */
export type KeyTable = Readonly<Record<string, KeyUse>>

/** Every mapping of the claim file with fixed keys. */
export const KEYS = {
  file: {
    claim: 'required',
    source: 'optional',
    structure: 'required',
    north: 'optional',
    grid: 'optional',
    points: 'optional',
    sightlines: 'required',
    target: 'optional',
    asserted_date: 'required',
    assumed_precision: 'optional',
    plausible_precision: 'optional',
    other_dates: 'optional',
    window: 'optional',
    atmosphere: 'optional',
    claimed: 'optional',
    formula: 'optional',
    tolerances: 'optional',
    notes: 'optional',
    prior: 'unused',
    alternatives: 'unused',
    lines_tried: 'unused',
  },
  structure: { name: 'required', latitude: 'required', longitude: 'optional', elevation: 'optional' },
  /** All but `from` and `uncertainty` belong to one way of finding north. */
  north: {
    from: 'required',
    uncertainty: 'optional',
    date: 'optional',
    declination: 'optional',
    baseline: 'optional',
    accuracy: 'optional',
    convergence: 'optional',
  },
  /** Has a zone, all of a projection, or a convergence. */
  grid: {
    zone: 'optional',
    central_meridian: 'optional',
    latitude_of_origin: 'optional',
    scale: 'optional',
    false_easting: 'optional',
    false_northing: 'optional',
    ellipsoid: 'optional',
    convergence: 'optional',
  },
  /** Beside the points, by plain values. */
  pointSettings: { file: 'optional', uncertainty: 'optional' },
  /** Has the two coordinates of one kind. */
  point: {
    east: 'optional',
    north: 'optional',
    up: 'optional',
    latitude: 'optional',
    longitude: 'optional',
    easting: 'optional',
    northing: 'optional',
    elevation: 'optional',
    uncertainty: 'optional',
    width: 'optional',
    form: 'optional',
  },
  sightline: {
    from: 'optional',
    to: 'optional',
    sighted: 'optional',
    azimuth: 'optional',
    altitude: 'optional',
    span: 'optional',
    horizon: 'optional',
    target: 'optional',
  },
  sighted: { from: 'optional', to: 'optional' },
  /** Has an angle, or three points. */
  span: {
    angle: 'optional',
    from: 'optional',
    june: 'optional',
    december: 'optional',
    horizons: 'optional',
  },
  spanHorizons: { june: 'optional', december: 'optional' },
  /** Has one form: distance and rise, or one of the others. */
  horizon: {
    distance: 'optional',
    rise: 'optional',
    point: 'optional',
    sea: 'optional',
    profile: 'optional',
  },
  /** Has an event or a day. */
  sunTarget: {
    body: 'required',
    event: 'optional',
    day: 'optional',
    sense: 'optional',
    at: 'required',
    disc: 'optional',
  },
  spanTarget: { body: 'required', event: 'required', at: 'required', disc: 'optional' },
  moonTarget: { body: 'required', event: 'required', at: 'required', disc: 'optional' },
  starTarget: { body: 'required', at: 'required', altitude: 'optional' },
  starPairTarget: { bodies: 'required', event: 'required', above: 'optional' },
  otherDate: { label: 'required', date: 'required' },
  atmosphere: {
    temperature: 'optional',
    pressure: 'optional',
    humidity: 'optional',
    lapse: 'optional',
    refraction: 'optional',
    refraction_uncertainty: 'optional',
  },
  claimed: {
    azimuth: 'optional',
    altitude: 'optional',
    refraction: 'optional',
    semidiameter: 'optional',
    declination: 'optional',
    obliquity: 'optional',
  },
} as const satisfies Readonly<Record<string, KeyTable>>

/** How a line with a key that a mapping cannot do without may look. */
export const EXAMPLES: Readonly<Record<string, string>> = {
  claim: 'claim: The east pillar marked midsummer sunrise, so the court was built in 9600 BCE.',
  structure: 'structure: {name: Thornmere court, latitude: 41°16′12″ N}',
  sightlines: 'sightlines: {midsummer: {azimuth: 57°54′28″ ± 1′, horizon: 1°30′ ± 2′}}',
  asserted_date: 'asserted_date: 9600 BCE ± 100',
  name: 'name: Thornmere court',
  latitude: 'latitude: 41°16′12″ N',
  from: 'from: compass',
  east: 'east: 84.65 m',
  north: 'north: 53.09 m',
  longitude: 'longitude: 23°05′ E',
  easting: 'easting: 273741.297 m',
  northing: 'northing: 5796489.777 m',
  grid: 'grid: {zone: UTM 55 S}, or its projection, or its convergence',
  baseline: 'baseline: 60 m',
  accuracy: 'accuracy: 2 cm',
  central_meridian: 'central_meridian: 2° W',
  latitude_of_origin: 'latitude_of_origin: 49° N',
  scale: 'scale: 0.9996',
  false_easting: 'false_easting: 400 km',
  false_northing: 'false_northing: -100 km',
  ellipsoid: 'ellipsoid: Airy 1830',
  distance: 'distance: 8 km ± 100 m',
  rise: 'rise: 120 m ± 5 m',
  span: 'span: {angle: 50°31′ ± 2′}',
  june: 'june: the point at the june solstice',
  december: 'december: the point at the december solstice',
  body: 'body: sun, body: moon, body: Sirius, or bodies: [Kochab, Mizar]',
  event: 'event: june solstice',
  at: 'at: rising',
  label: 'label: radiocarbon',
  date: 'date: 800 to 500 BCE',
}

/** A target of each kind, as it is written. */
export const TARGET_EXAMPLES = {
  sun: '{body: sun, event: june solstice, at: rising, disc: upper limb}',
  'sun at both solstices': '{body: sun, event: june to december solstice, at: rising, disc: centre}',
  moon: '{body: moon, event: northern major standstill, at: rising}',
  star: '{body: Sirius, at: rising, altitude: 3° ± 0.5°}',
  'two stars': '{bodies: [Kochab, Mizar], event: one above the other}',
} as const satisfies Readonly<Record<Target['body'], string>>
