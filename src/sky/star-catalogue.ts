import { BRIGHT_STAR_TABLE, type BrightStarRow } from './bright-star-table.ts'

/** A star of the catalogue; place and motion in the mean equator and equinox of J2000, at the epoch J2000. */
export interface Star {
  /** Number in the Bright Star Catalogue, which continues the Harvard Revised Photometry. */
  hr: number
  /** Bayer's Greek letter in Latin, such as `alpha`; null for a star without one. */
  bayer: string | null
  /** The number after the letter, where several stars share it, as in `alpha2 Centauri`; else null. */
  bayerNumber: number | null
  /** The IAU abbreviation; null where the catalogue names the star by its number alone. */
  constellation: string | null
  flamsteed: number | null
  /** The proper name, or null. Companions of one another share theirs. */
  name: string | null
  raDeg: number
  decDeg: number
  /** Motion on the sky, the change of right ascension times the cosine of the declination. */
  properMotionRaArcsecPerYear: number
  properMotionDecArcsecPerYear: number
  parallaxArcsec: number | null
  /** Positive where the star recedes. */
  radialVelocityKmPerS: number | null
  /** Apparent magnitude V; smaller is brighter. */
  magnitude: number
}

/** The stars as bright as this and brighter are all in the catalogue. */
export const FAINTEST_MAGNITUDE = 4

/** Every star of V ≤ 4.0, brightest first. Source: `BRIGHT_STAR_TABLE`. */
export const STARS: readonly Star[] = BRIGHT_STAR_TABLE.map(starOf)

/** As a person would write it: the name, or `alpha2 CVn`, `51 And`, `HR 5958`. */
export function labelOfStar(star: Star): string {
  return star.name ?? designationOf(star)
}

/** The scientific designation: Bayer's letter, else Flamsteed's number, else the HR number. */
export function designationOf({ hr, bayer, bayerNumber, constellation, flamsteed }: Star): string {
  if (bayer !== null) return `${bayer}${bayerNumber ?? ''} ${constellation}`
  return flamsteed === null ? `HR ${hr}` : `${flamsteed} ${constellation}`
}

function starOf(row: BrightStarRow): Star {
  const [hr, letter, constellation, flamsteed, name, raDeg, decDeg, motionRa, motionDec] = row
  const [, bayer = null, digit] = /^([a-z]+)(\d?)$/.exec(letter ?? '') ?? []
  return {
    hr,
    bayer,
    bayerNumber: digit ? Number(digit) : null,
    constellation,
    flamsteed,
    name,
    raDeg,
    decDeg,
    properMotionRaArcsecPerYear: motionRa,
    properMotionDecArcsecPerYear: motionDec,
    parallaxArcsec: row[9],
    radialVelocityKmPerS: row[10],
    magnitude: row[11],
  }
}
