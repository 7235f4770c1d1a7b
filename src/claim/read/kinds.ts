import { type AngleKind, TOLERANCE } from '../../quantity/angle-kind.ts'
import { LENGTH, type UnitKind } from '../../quantity/unit-kind.ts'

/** A place on the plan, metres; beyond 1000 km the unit is a slip. */
export const PLAN_LENGTH: UnitKind = { ...LENGTH, name: 'a place on the plan' }

/** Standard deviation of a point on the plan. */
export const POINT_UNCERTAINTY: UnitKind = {
  ...LENGTH,
  name: 'the uncertainty of a point',
  example: '5 cm',
  usualUnit: 'cm',
  low: 0,
  high: 1000,
  limits: 'from 0 to 1 km',
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
