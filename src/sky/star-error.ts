import { closeCompanionOf } from './close-companions.ts'
import type { Star } from './star-catalogue.ts'

/** Places are printed to 0.1 s in right ascension and 1″ in declination: ±1.5″ and ±0.5″ at most, rectangular. */
const PLACE_SD_ARCSEC = 0.5

/**
 * Standard deviation of a proper motion in one direction, arcseconds a year: the middle of the 5 to 10 mas a year
 * that motions of the Bright Star Catalogue are commonly good to.
 */
const MOTION_SD_ARCSEC_PER_YEAR = 0.0075

/**
 * Standard deviation of a star's declination of date that the catalogue leaves, degrees: its place, its proper motion
 * times the years since J2000, and for stars with a close companion the bound on its pull, taken as rectangular. The
 * precession of the frame is not in it.
 *
 * @param year Julian epoch.
 */
export function starDeclinationSdDeg(star: Star, year: number): number {
  const years = Math.abs(year - 2000)
  const drift = (closeCompanionOf(star)?.driftArcsecPerYear ?? 0) / Math.sqrt(3)
  return Math.hypot(PLACE_SD_ARCSEC, MOTION_SD_ARCSEC_PER_YEAR * years, drift * years) / 3600
}
