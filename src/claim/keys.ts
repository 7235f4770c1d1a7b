import type { Target } from './claim.ts'

/**
 * What this version does with a key. `later`: the file format has it, this version does not read it, and
 * a claim cannot be audited without it (an error). `unused`: it can be left aside (a warning).
 */
export type KeyUse = 'required' | 'optional' | 'unused' | 'later'

/** The keys a mapping may have, in the order they are named to people. */
export type KeyTable = Readonly<Record<string, KeyUse>>

/** Every mapping of the claim file with fixed keys. */
export const KEYS = {
  file: {
    claim: 'required',
    source: 'optional',
    structure: 'required',
    north: 'optional',
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
  north: { from: 'required', uncertainty: 'optional' },
  point: {
    east: 'required',
    north: 'required',
    up: 'optional',
    uncertainty: 'optional',
    latitude: 'later',
    longitude: 'later',
    elevation: 'later',
    easting: 'later',
    northing: 'later',
  },
  sightline: {
    from: 'optional',
    to: 'optional',
    azimuth: 'optional',
    altitude: 'optional',
    horizon: 'optional',
    target: 'optional',
    angle: 'later',
    span: 'later',
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
  body: 'body: sun, body: moon, body: Sirius, or bodies: [Kochab, Mizar]',
  event: 'event: june solstice',
  at: 'at: rising',
  label: 'label: radiocarbon',
  date: 'date: 800 to 500 BCE',
}

/** What to write in place of a mapping's keys that this version does not read. */
export const INSTEAD: Readonly<Partial<Record<keyof typeof KEYS, string>>> = {
  point: 'points on a local grid in metres: {east: 84.65 m, north: 53.09 m, uncertainty: 5 cm}',
  sightline: 'a line from point to point, {from: …, to: …}, or {azimuth: 49°34′18″ ± 1′}, with its horizon',
}

/** A target of each kind, as it is written. */
export const TARGET_EXAMPLES = {
  sun: '{body: sun, event: june solstice, at: rising, disc: upper limb}',
  moon: '{body: moon, event: northern major standstill, at: rising}',
  star: '{body: Sirius, at: rising, altitude: 3° ± 0.5°}',
  'two stars': '{bodies: [Kochab, Mizar], event: one above the other}',
} as const satisfies Readonly<Record<Target['body'], string>>
