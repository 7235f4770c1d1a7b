import type { Measured } from '../quantity/measured.ts'
import type { Unstated } from '../quantity/unstated.ts'
import type { YearRange } from '../quantity/year-range.ts'

/** A claim as its file states it: units settled, names resolved, nothing filled in. */
export interface Claim {
  /** The claim's own sentence. */
  statement: string
  source: string | null
  structure: Structure
  north: North | Unstated
  points: ReadonlyMap<string, LocalPoint>
  sightlines: readonly Sightline[]
  assertedDate: YearRange
  /** What the claim gives the builders, as an angle in arcminutes; 0 is `exact`. */
  assumedPrecisionArcmin: number | Unstated
  plausiblePrecision: { lowArcmin: number; highArcmin: number } | Unstated
  otherDates: readonly { label: string; date: YearRange }[]
  window: YearRange | Unstated
  atmosphere: Atmosphere
  claimed: Claimed
  formula: Formula | Unstated
  /** Build tolerances the sweep must include exactly, arcminutes, ascending. */
  tolerancesArcmin: readonly number[]
  /** Markdown, not yet parsed. */
  notes: string | null
  /** The file's content as plain JSON values, for the audit's echo. */
  echo: Readonly<Record<string, unknown>>
}

export interface Structure {
  name: string
  /** Geographic latitude, degrees, north positive. */
  latitudeDeg: number
  /** Degrees, east positive; null where not given (nothing computed needs it yet). */
  longitudeDeg: number | null
  elevationM: number | Unstated
}

/** How the plan's north was found; its uncertainty is shared by every line between points. */
export interface North {
  from: 'compass' | 'gps' | 'sun' | 'plan'
  uncertaintyDeg: number | Unstated
}

/** A point on the local grid, metres; `uncertaintyM` is one standard deviation in each of east and north. */
export interface LocalPoint {
  eastM: number
  northM: number
  upM: number | null
  uncertaintyM: number | Unstated
}

export interface Sightline {
  name: string
  direction: Direction
  /** Apparent altitude of the horizon where the line meets it, degrees; not used where the line is an altitude. */
  horizonDeg: Measured | Unstated
  target: Target
}

/** An azimuth, a line between two points, or, for a target on the meridian, an altitude. */
export type Direction =
  | { by: 'azimuth'; azimuthDeg: Measured }
  | { by: 'points'; from: string; to: string }
  | { by: 'altitude'; altitudeDeg: Measured }

export type Target = SunTarget | MoonTarget | StarTarget | StarPairTarget

export type Solstice = 'june solstice' | 'december solstice'

/** The Sun on one day of the year. At `noon` the sightline is an altitude. */
export interface SunTarget {
  body: 'sun'
  event: SunEvent
  at: 'rising' | 'setting' | 'noon'
  disc: Disc | Unstated
}

export type SunEvent =
  | { name: Solstice }
  | { name: 'equinox'; sense: EquinoxSense | Unstated }
  /** So many days after a solstice; negative before it. */
  | { name: 'day'; days: number; after: Solstice }
  | { name: 'zenith passage' }

export type EquinoxSense = 'declination zero' | 'midway in days' | 'midway in direction'

export interface MoonTarget {
  body: 'moon'
  standstill: { side: 'northern' | 'southern'; size: 'major' | 'minor' }
  at: 'rising' | 'setting'
  disc: Disc | Unstated
}

/** A star, by its number in the Bright Star Catalogue (HR) and as the claim writes it. */
export interface StarTarget {
  body: 'star'
  star: NamedStar
  at: 'rising' | 'setting' | 'upper culmination' | 'lower culmination'
  /** Apparent altitude at which it was sighted; unstated: where it is first visible. Not used at a culmination. */
  altitudeDeg: Measured | Unstated
}

/** Two stars one above the other, at the same azimuth near north. */
export interface StarPairTarget {
  body: 'two stars'
  stars: readonly [NamedStar, NamedStar]
  /** Index in `stars` of the upper one; unstated: either. */
  above: 0 | 1 | Unstated
}

export interface NamedStar {
  hr: number
  text: string
}

/** The part of the disc that stands on the horizon; `showing` is how much of it is above. */
export type Disc =
  | { part: 'upper limb' | 'centre' | 'lower limb' }
  | { part: 'showing'; showingArcmin: number }

export interface Atmosphere {
  temperatureC: number | Unstated
  pressureHpa: number | Unstated
  /** Relative humidity, 0 to 1. */
  humidity: number | Unstated
  /** Fall of temperature with height, K/km, positive. */
  lapseKPerKm: number | Unstated
  /** Used as given, less parallax, in place of the ray trace. */
  refractionArcmin: number | Unstated
  refractionUncertaintyArcmin: number | Unstated
}

/** Intermediate results the source prints, each with the text it was printed as. */
export interface Claimed {
  azimuthDeg: Printed | null
  /** True altitude of the body's centre. */
  altitudeDeg: Printed | null
  refractionArcmin: Printed | null
  semidiameterArcmin: Printed | null
  declinationDeg: Printed | null
  obliquityDeg: Printed | null
}

export interface Printed {
  value: number
  text: string
  /** Half a unit of the last printed digit, in the unit of `value`. */
  half: number
}

/** The claimant's obliquity model, or the name of a table this program does not have. */
export type Formula = { model: ObliquityModelName } | { lacking: string }

export type ObliquityModelName =
  | 'vondrak2011'
  | 'laskar2004'
  | 'laskar1986'
  | 'p03'
  | 'iau1976'
  | 'newcomb1895'
