/** What a reader of angles has to know about the angle a key takes. Limits are in degrees and included. */
export interface AngleKind {
  /** With its article, such as `a latitude`. */
  name: string
  example: string
  lowDeg: number
  highDeg: number
  /** Both limits in words. */
  limits: string
  /** The compass letters that may stand beside it: the positive one, then the negative one. */
  letters: readonly [string, string] | null
  /** One of its letters has to stand there: without it the sign could be meant either way. */
  needsLetter?: boolean
  /** The unit to suggest where a bare number is written. */
  usualUnit: '°' | '′'
  /** A bare number is in degrees: in tables the heading has said so. */
  takesBareDegrees?: boolean
}

export const LATITUDE: AngleKind = {
  name: 'a latitude',
  example: '41°16′12″ N',
  lowDeg: -90,
  highDeg: 90,
  limits: 'from 90° S to 90° N',
  letters: ['N', 'S'],
  usualUnit: '°',
}

export const LONGITUDE: AngleKind = {
  name: 'a longitude',
  example: '23°05′ E',
  lowDeg: -180,
  highDeg: 180,
  limits: 'from 180° W to 180° E',
  letters: ['E', 'W'],
  usualUnit: '°',
}

export const AZIMUTH: AngleKind = {
  name: 'an azimuth',
  example: '49°34′18″',
  lowDeg: 0,
  highDeg: 360,
  limits: 'from 0° to 360°, counted from true north through east',
  letters: null,
  usualUnit: '°',
}

/** Apparent altitude of a horizon. Below −5° no place on Earth sees one; past 60° no line of sight is one. */
export const HORIZON_ALTITUDE: AngleKind = {
  name: 'the altitude of a horizon',
  example: '1°30′ ± 2′',
  lowDeg: -5,
  highDeg: 60,
  limits: 'from −5° to 60°',
  letters: null,
  usualUnit: '°',
}

/** A build tolerance or a precision; past 45° a direction says nothing. */
export const TOLERANCE: AngleKind = {
  name: 'an angle',
  example: '10′',
  lowDeg: 0,
  highDeg: 45,
  limits: 'from 0′ to 45°',
  letters: null,
  usualUnit: '′',
}
