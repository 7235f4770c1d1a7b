import { type AngleKind, LATITUDE, LONGITUDE, TOLERANCE } from '../../quantity/angle-kind.ts'
import { LENGTH, type UnitKind } from '../../quantity/unit-kind.ts'

/** A place on the plan, metres; beyond 1000 km the unit is a slip. */
export const PLAN_LENGTH: UnitKind = { ...LENGTH, name: 'a place on the plan' }

/** Standard deviation of a point on the plan. */
export const POINT_UNCERTAINTY: UnitKind = {
  ...LENGTH,
  name: 'the uncertainty of a point',
  example: '5 cm',
  usualUnit: 'cm',
  unitBelowOne: 'm',
  low: 0,
  high: 1000,
  limits: 'from 0 to 1 km',
}

/** Easting of a projected grid, metres. Some grids write the number of the zone, up to 60, before the million. */
export const EASTING: UnitKind = {
  ...LENGTH,
  name: 'an easting',
  example: '273741.297 m',
  low: -1e7,
  high: 6.1e7,
  limits: 'from −10,000 km to 61,000 km',
}

/** Northing of a projected grid, metres: a meridian is 10,002 km long from the equator to a pole. */
export const NORTHING: UnitKind = {
  ...LENGTH,
  name: 'a northing',
  example: '5796489.777 m',
  low: -1.5e7,
  high: 2.1e7,
  limits: 'from −15,000 km to 21,000 km',
}

/** Width of a post or of a gap across the line, metres. */
export const WIDTH: UnitKind = {
  ...LENGTH,
  name: 'a width',
  example: '60 cm',
  low: 0.001,
  high: 1000,
  limits: 'from 1 mm to 1 km',
}

/** How far a horizon is off, metres; the farthest seen from the ground are some 450 km off. */
export const HORIZON_DISTANCE: UnitKind = {
  ...LENGTH,
  name: 'the distance of a horizon',
  example: '8 km ± 100 m',
  usualUnit: 'km',
  otherUnits: ['m'],
  low: 1,
  high: 500_000,
  limits: 'from 1 m to 500 km',
}

/** How much a horizon stands above the eye, metres. */
export const RISE: UnitKind = {
  ...LENGTH,
  name: 'the rise of a horizon above the eye',
  example: '120 m ± 5 m',
  low: -9000,
  high: 9000,
  limits: 'from −9000 m to 9000 m',
}

/** Height of the eye above the sea, metres. */
export const EYE_HEIGHT: UnitKind = {
  ...LENGTH,
  name: 'the height of the eye above the sea',
  example: '25 m',
  low: 0,
  high: 9000,
  limits: 'from 0 m to 9000 m',
}

/** Standard deviation of a height or a distance of a horizon, metres. */
export const LENGTH_UNCERTAINTY: UnitKind = {
  ...LENGTH,
  name: 'the uncertainty of a length',
  example: '5 m',
  low: 0,
  high: 100_000,
  limits: 'from 0 to 100 km',
}

/** Distance between two receivers of a satellite system, metres. */
export const BASELINE: UnitKind = {
  ...LENGTH,
  name: 'the distance of two positions',
  example: '60 m',
  low: 0.1,
  limits: 'from 10 cm to 1000 km',
}

/** The scale of a projection on its central meridian, a bare number. */
export const SCALE: UnitKind = {
  name: 'a scale',
  example: '0.9996',
  usualUnit: '',
  units: new Map([['', (number: number) => number]]),
  low: 0.9,
  high: 1.1,
  limits: 'from 0.9 to 1.1',
}

export const CENTRAL_MERIDIAN: AngleKind = { ...LONGITUDE, name: 'a central meridian', example: '2° W' }

/** Short of the poles, where a transverse Mercator grid has no origin. */
export const LATITUDE_OF_ORIGIN: AngleKind = {
  ...LATITUDE,
  name: 'a latitude of origin',
  example: '49° N',
  lowDeg: -89,
  highDeg: 89,
  limits: 'from 89° S to 89° N',
}

/** By how much grid north lies off true north. In the zones in use it keeps within some 15°. */
export const CONVERGENCE: AngleKind = {
  ...TOLERANCE,
  name: 'a convergence',
  example: '1°35′ W ± 1′',
  lowDeg: -20,
  highDeg: 20,
  limits: 'from 20° W to 20° E',
  letters: ['E', 'W'],
  needsLetter: true,
  usualUnit: '°',
}

/** By how much magnetic north lies off true north; near the magnetic poles any angle. */
export const MAGNETIC_DECLINATION: AngleKind = {
  ...TOLERANCE,
  name: 'a declination of the compass',
  example: '3°20′ W ± 10′',
  lowDeg: -180,
  highDeg: 180,
  limits: 'from 180° W to 180° E',
  letters: ['E', 'W'],
  needsLetter: true,
  usualUnit: '°',
}

/** The angle between two lines from one place. */
export const SPAN: AngleKind = {
  ...TOLERANCE,
  name: 'a span',
  example: '50°31′ ± 2′',
  lowDeg: 1 / 60,
  highDeg: 180,
  limits: 'from 1′ to 180°',
  usualUnit: '°',
}

/** Standard deviation of a measured direction or of north. */
export const DIRECTION_UNCERTAINTY: AngleKind = {
  ...TOLERANCE,
  name: 'the uncertainty of a direction',
  example: '1′',
  highDeg: 30,
  limits: 'from 0′ to 30°',
}

/** An apparent altitude of a body: on the meridian, or where a star was sighted. Below −5° no place on Earth sees one. */
export const APPARENT_ALTITUDE: AngleKind = {
  ...TOLERANCE,
  name: 'an apparent altitude',
  example: '31°12′ ± 10′',
  lowDeg: -5,
  highDeg: 90,
  limits: 'from −5° to 90°',
  usualUnit: '°',
}

/** Standard deviation of a measured altitude, or of refraction. */
export const ALTITUDE_UNCERTAINTY: AngleKind = {
  ...TOLERANCE,
  name: 'the uncertainty of an altitude',
  example: '2′',
  highDeg: 10,
  limits: 'from 0′ to 10°',
}

/** How much of the disc is above the horizon; the Sun's is never wider than 33′, the Moon's hardly ever. */
export const SHOWING: AngleKind = {
  ...TOLERANCE,
  name: 'a part of the disc that shows',
  example: '2′',
  highDeg: 33 / 60,
  limits: 'from 0′ to 33′, the width of the disc',
}

/** Refraction at a horizon. Sampson et al. 2003 (PASP 115, 1256) saw 0.40° to 2.08° at a low one. */
export const REFRACTION: AngleKind = {
  ...TOLERANCE,
  name: 'a refraction',
  example: '27′20″',
  lowDeg: -1,
  highDeg: 5,
  limits: 'from −1° to 5°',
}

/** A semidiameter of the Sun or the Moon as printed. */
export const SEMIDIAMETER: AngleKind = {
  ...TOLERANCE,
  name: 'a semidiameter of the Sun or the Moon',
  example: '15′45″',
  lowDeg: 14 / 60,
  highDeg: 18 / 60,
  limits: 'from 14′ to 18′',
}

/** A true altitude of a body's centre as printed. */
export const TRUE_ALTITUDE: AngleKind = {
  ...TOLERANCE,
  name: 'an altitude',
  example: '0°24′',
  lowDeg: -10,
  highDeg: 90,
  limits: 'from −10° to 90°',
  usualUnit: '°',
}

/** A declination as printed. */
export const DECLINATION: AngleKind = {
  ...TOLERANCE,
  name: 'a declination',
  example: '23°54′30″',
  lowDeg: -90,
  highDeg: 90,
  limits: 'from −90° to 90°',
  usualUnit: '°',
}

/** The obliquity of the ecliptic as printed; in the last million years it kept to 22.0° to 24.6°. */
export const OBLIQUITY: AngleKind = {
  ...TOLERANCE,
  name: 'an obliquity of the ecliptic',
  example: '23°54′30″',
  lowDeg: 20,
  highDeg: 27,
  limits: 'from 20° to 27°',
  usualUnit: '°',
}
