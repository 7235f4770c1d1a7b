import { seenBody } from './present-sky.ts'
import type { LocatedPlace } from './sky-place.ts'

/** The almanacs' altitude of the Sun's centre at its rising over a level horizon: 34′ of refraction, 16′ of disc. */
const RISING_ALTITUDE_DEG = -50 / 60

/** Whether any of the Sun stands above a level horizon at an instant in days of UT from J2000.0. */
export function isSunUp(place: LocatedPlace, utDays: number): boolean {
  return seenBody('sun', place, utDays).altitudeDeg > RISING_ALTITUDE_DEG
}
