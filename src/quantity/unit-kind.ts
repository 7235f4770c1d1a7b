/** What a reader of a number with a unit has to know. Limits are in the base unit and included. */
export interface UnitKind {
  /** With its article, such as `a length`. */
  name: string
  example: string
  /** The unit to suggest where none is written. */
  usualUnit: string
  /** The unit to suggest for a bare number below one, where that is another. */
  unitBelowOne?: string
  /** Those to suggest where the number is out of the limits in the usual one. */
  otherUnits?: readonly string[]
  /** Each unit as written, in lower case, and how a number in it becomes one in the base unit; `''`: a bare number. */
  units: ReadonlyMap<string, (number: number) => number>
  low: number
  high: number
  /** Both limits in words. */
  limits: string
}

/** Metres. The foot is the international one of 1959, 0.3048 m exactly. */
export const LENGTH: UnitKind = {
  name: 'a length',
  example: '84.65 m',
  usualUnit: 'm',
  units: factors({
    m: 1,
    metre: 1,
    metres: 1,
    meter: 1,
    meters: 1,
    cm: 0.01,
    mm: 0.001,
    km: 1000,
    ft: 0.3048,
  }),
  low: -1e6,
  high: 1e6,
  limits: 'from −1000 km to 1000 km',
}

/** The same lengths where a heading has said that a bare number is in metres; other units may still be written. */
export function inMetres(kind: UnitKind, example: string): UnitKind {
  return { ...kind, example, usualUnit: 'm', units: new Map([...kind.units, ['', (metres) => metres]]) }
}

/** Height above sea level, metres: from the shore of the Dead Sea to the highest summit, rounded outwards. */
export const ELEVATION: UnitKind = {
  ...LENGTH,
  name: 'an elevation',
  example: '640 m',
  low: -500,
  high: 9000,
  limits: 'from −500 m to 9000 m',
}

/** Degrees Celsius; the limits are the extremes on record, rounded outwards. */
export const TEMPERATURE: UnitKind = {
  name: 'a temperature',
  example: '15 °C',
  usualUnit: '°C',
  units: new Map([
    ['°c', (celsius: number) => celsius],
    ['℃', (celsius: number) => celsius],
    ['c', (celsius: number) => celsius],
    ['k', (kelvin: number) => kelvin - 273.15],
    ['°f', (fahrenheit: number) => (fahrenheit - 32) / 1.8],
    ['℉', (fahrenheit: number) => (fahrenheit - 32) / 1.8],
    ['f', (fahrenheit: number) => (fahrenheit - 32) / 1.8],
  ]),
  low: -90,
  high: 60,
  limits: 'from −90 °C to 60 °C',
}

/** Air pressure at the place, hectopascals; 133.322 387 415 Pa is one mmHg (13.5951 × 9.80665). */
export const PRESSURE: UnitKind = {
  name: 'an air pressure',
  example: '1013 hPa',
  usualUnit: 'hPa',
  otherUnits: ['mmHg', 'kPa', 'Pa'],
  units: factors({ hpa: 1, mbar: 1, mb: 1, kpa: 10, pa: 0.01, mmhg: 1.33322387415 }),
  low: 300,
  high: 1100,
  limits: 'from 300 hPa (the highest summit) to 1100 hPa',
}

/** Fall of temperature with height, kelvins per kilometre. */
export const LAPSE: UnitKind = {
  name: 'a fall of temperature with height',
  example: '6.5 K/km',
  usualUnit: 'K/km',
  units: factors({ 'k/km': 1, '°c/km': 1, 'c/km': 1, 'k/m': 1000, '°c/m': 1000 }),
  low: 1,
  high: 12,
  limits: 'from 1 K/km to 12 K/km (6.5 K/km is usual)',
}

/** Relative humidity as a fraction. It is always written with its %: a bare 1 could be either. */
export const HUMIDITY: UnitKind = {
  name: 'a relative humidity',
  example: '40 %',
  usualUnit: '%',
  units: factors({ '%': 0.01 }),
  low: 0,
  high: 1,
  limits: 'from 0 % to 100 %',
}

function factors(units: Readonly<Record<string, number>>): UnitKind['units'] {
  return new Map(Object.entries(units).map(([unit, factor]) => [unit, (number: number) => number * factor]))
}
