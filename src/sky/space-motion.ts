import { ARCSEC } from '../quantity/degrees.ts'
import type { Vector } from './long-term-poles.ts'
import { cross, dot, lengthOf, plus, times, unit } from './vector.ts'

/** Where a star stands and how it moves, as a catalogue states it for one epoch. Angles in radians. */
export interface Astrometry {
  ra: number
  dec: number
  /** Change of the right ascension itself (not times the cosine of the declination), radians a Julian year. */
  raPerYear: number
  decPerYear: number
  parallaxArcsec: number
  radialVelocityKmPerS: number
}

/** A straight motion in space as seen from the Sun at an epoch: astronomical units, and units a day. */
export interface SpaceMotion {
  position: Vector
  velocity: Vector
}

const DAYS_PER_YEAR = 365.25
const SECONDS_PER_DAY = 86_400
/** Kilometres in the astronomical unit, exactly (IAU 2012). */
const KM_PER_AU = 149_597_870.7
/** Speed of light, units a day: light takes 499.004782 s for one (the value of the routines followed here). */
const LIGHT = SECONDS_PER_DAY / 499.004782

/**
 * Motion in space of a star with a parallax above 0, freed from the lag of its light (which comes the later, the
 * farther the star has gone) and from the second-order effect of its speed.
 *
 * Source: Stumpff 1985, A&A 144, 232; the routine `starpv` of the IAU's SOFA collection.
 */
export function spaceMotion(star: Astrometry): SpaceMotion {
  const distance = 1 / (star.parallaxArcsec * ARCSEC)
  const seen = tangentialFrame(star)
  const radial = (star.radialVelocityKmPerS * SECONDS_PER_DAY) / KM_PER_AU
  const alongSky = times(seen.motion, distance / DAYS_PER_YEAR)
  const inertial = inertialSpeeds(radial / LIGHT, lengthOf(alongSky) / LIGHT)
  const velocity = plus(times(seen.direction, inertial.radial * LIGHT), alongSky, inertial.stretch)
  return { position: times(seen.direction, distance), velocity }
}

/**
 * Where a star is seen a number of days after the epoch of its motion, as a vector from the Sun: the light that
 * arrives then left when the star stood there.
 */
export function positionAfter({ position, velocity }: SpaceMotion, days: number): Vector {
  const firstLag = lengthOf(position) / LIGHT
  const later = plus(position, velocity, days + firstLag)
  const along = dot(later, velocity)
  const slack = LIGHT * LIGHT - dot(velocity, velocity)
  const lag = (-along + Math.sqrt(along * along + slack * dot(later, later))) / slack
  return plus(position, velocity, days + firstLag - lag)
}

/**
 * The same star as a catalogue for a later epoch would state it.
 *
 * Source: the routine `starpm` of the IAU's SOFA collection.
 */
export function astrometryAfter(star: Astrometry, days: number): Astrometry {
  const motion = spaceMotion(star)
  const position = positionAfter(motion, days)
  const direction = unit(position)
  const radialTrue = dot(direction, motion.velocity)
  const alongSkyTrue = plus(motion.velocity, direction, -radialTrue)
  const seen = seenSpeeds(radialTrue / LIGHT, lengthOf(alongSkyTrue) / LIGHT)
  const distance = lengthOf(position)
  const perYear = times(alongSkyTrue, (seen.shrink * DAYS_PER_YEAR) / distance)
  const { ra, dec } = anglesOf(direction)
  const { east, north } = axesAt(ra, dec)
  return {
    ra,
    dec,
    raPerYear: dot(perYear, east) / Math.cos(dec),
    decPerYear: dot(perYear, north),
    parallaxArcsec: 1 / (distance * ARCSEC),
    radialVelocityKmPerS: (seen.radial * LIGHT * KM_PER_AU) / SECONDS_PER_DAY,
  }
}

/** Right ascension (0 to 2π) and declination of a direction, radians. */
export function anglesOf([x, y, z]: Vector): { ra: number; dec: number } {
  const ra = Math.atan2(y, x)
  return { ra: ra < 0 ? ra + 2 * Math.PI : ra, dec: Math.atan2(z, Math.hypot(x, y)) }
}

/** The direction of a star and its motion on the sky, radians a year. */
export function tangentialFrame(star: Omit<Astrometry, 'parallaxArcsec' | 'radialVelocityKmPerS'>) {
  const { direction, east, north } = axesAt(star.ra, star.dec)
  const eastward = times(east, star.raPerYear * Math.cos(star.dec))
  return { direction, motion: plus(eastward, north, star.decPerYear) }
}

function axesAt(ra: number, dec: number): { direction: Vector; east: Vector; north: Vector } {
  const east: Vector = [-Math.sin(ra), Math.cos(ra), 0]
  const direction: Vector = [Math.cos(ra) * Math.cos(dec), Math.sin(ra) * Math.cos(dec), Math.sin(dec)]
  return { direction, east, north: cross(direction, east) }
}

/** From observed speeds, as shares of light's, to true ones: the radial one, and what to multiply the other by. */
function inertialSpeeds(radialSeen: number, alongSkySeen: number): { radial: number; stretch: number } {
  let radial = radialSeen
  let stretch = 1
  for (let i = 0; i < 100; i++) {
    const square = radial ** 2 + (stretch * alongSkySeen) ** 2
    const second = -square / (Math.sqrt(1 - square) + 1)
    const next = 1 + radial
    const nextRadial = next * radialSeen + second
    if (next === stretch && nextRadial === radial) break
    stretch = next
    radial = nextRadial
  }
  return { radial, stretch }
}

/** The other way: the radial speed as its Doppler shift shows it, and what to multiply the speed on the sky by. */
function seenSpeeds(radialTrue: number, alongSkyTrue: number): { radial: number; shrink: number } {
  const square = radialTrue ** 2 + alongSkyTrue ** 2
  const second = -square / (Math.sqrt(1 - square) + 1)
  return { radial: (radialTrue - second) / (1 + radialTrue), shrink: 1 / (1 + radialTrue) }
}
