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
  /** The projected grid that points with an easting and a northing stand on, or that the plan's north is that of. */
  grid: Grid | null
  points: ReadonlyMap<string, Point>
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
  /** The files beside the claim file that it names: points, skylines. */
  attachments: readonly Attachment[]
  /** The file's content as plain JSON values, for the audit's echo. */
  echo: Readonly<Record<string, unknown>>
}

/** A file beside the claim file, as it was read. */
export interface Attachment {
  /** As the claim file writes it. */
  path: string
  sha256: string
}

export interface Structure {
  name: string
  /** Geographic latitude, degrees, north positive. */
  latitudeDeg: number
  /** Degrees, east positive; null where not given (nothing computed needs it yet). */
  longitudeDeg: number | null
  elevationM: number | Unstated
}

/** How the north of the local plan was found; its uncertainty is shared by every line between local points. */
export interface North {
  from: 'compass' | 'gps' | 'sun' | 'star' | 'plan' | 'grid'
  uncertaintyDeg: number | Unstated
  /**
   * Of a compass: the plan's north is the needle's, by so much off true north (positive where it points east of it);
   * `applied` where the surveyor has taken it off already; `of the date` where a model gives it for `date`.
   */
  declination: Measured | 'applied' | 'of the date' | null
  /** Of a compass: the day of the survey. */
  date: CalendarDate | null
  /** Of grid north: by how much it lies east of true north, degrees; null: that of `grid` at the place. */
  convergence: Measured | null
  /** Of two GPS positions: how far they stood apart, and the standard deviation of each, metres. */
  baselineM: number | null
  accuracyM: number | null
}

/** A day of the Gregorian calendar, UTC. */
export interface CalendarDate {
  year: number
  /** 1 to 12. */
  month: number
  day: number
  /** As the claim file writes it. */
  text: string
}

/** A projected grid: a transverse Mercator projection, or nothing but how far its north is off. */
export type Grid =
  | { by: 'projection'; projection: GridProjection; name: string }
  /** Grid north lies so much east of true north, degrees. */
  | { by: 'convergence'; convergenceDeg: Measured }

export interface GridProjection {
  ellipsoid: EllipsoidName
  centralMeridianDeg: number
  latitudeOfOriginDeg: number
  scale: number
  falseEastingM: number
  falseNorthingM: number
}

export type EllipsoidName =
  | 'WGS84'
  | 'GRS80'
  | 'Airy 1830'
  | 'Bessel 1841'
  | 'Clarke 1866'
  | 'Clarke 1880 (IGN)'
  | 'International 1924'
  | 'Krassovsky 1940'

/** A point of the survey. `uncertaintyM` is one standard deviation in each of east and north. */
export type Point = (LocalPoint | GeographicPoint | GridPoint) & {
  uncertaintyM: number | Unstated
  /** Height on the plan's or the map's own scale, metres; null where not given. */
  upM: number | null
  /** What stands there has a width across the line, metres: a post, or a gap between two; null: a point. */
  breadth: { form: 'post' | 'gap'; widthM: number } | null
}

/** On the local plan, metres. */
export interface LocalPoint {
  by: 'plan'
  eastM: number
  northM: number
  /** Where this one point of the plan is on the Earth, which ties the plan to points given so; null elsewhere. */
  tie: { latitudeDeg: number; longitudeDeg: number } | null
}

/** On WGS84, degrees, north and east positive. */
export interface GeographicPoint {
  by: 'geographic'
  latitudeDeg: number
  longitudeDeg: number
}

/** On the claim's projected grid, metres. */
export interface GridPoint {
  by: 'grid'
  eastingM: number
  northingM: number
}

export interface Sightline {
  name: string
  direction: Direction
  /** Where the line meets the sky; not used where the line is an altitude or a span. */
  horizon: Horizon | Unstated
  target: Target
}

/**
 * An azimuth, a line between two points, an altitude for a target on the meridian, or, for a target of two solstices,
 * the span between two lines from one place.
 */
export type Direction =
  | { by: 'azimuth'; azimuthDeg: Measured }
  | { by: 'points'; from: string; to: string; sighted: { from: SightedPart; to: SightedPart } }
  | { by: 'altitude'; altitudeDeg: Measured }
  | { by: 'span'; span: Span; horizons: { june: Horizon | Unstated; december: Horizon | Unstated } }

/** Of a post its axis or an edge, of a gap its middle or a side; left and right as one looks from `from` to `to`. */
export type SightedPart = 'middle' | 'left' | 'right' | Unstated

/** An angle as measured, degrees, or three points of one kind. */
export type Span =
  | { by: 'angle'; angleDeg: Measured }
  | { by: 'points'; from: string; june: string; december: string }

export type Horizon =
  /** Its apparent altitude, degrees. */
  | { by: 'altitude'; altitudeDeg: Measured }
  /** How far it is and how much it stands above the eye, metres. */
  | { by: 'distance'; distanceM: Measured; riseM: Measured }
  /** A point of the survey with a height, seen from the line's first point. */
  | { by: 'point'; point: string }
  /** The open sea, from a height of the eye in metres. */
  | { by: 'sea'; eyeM: Measured }
  | { by: 'profile'; file: string; nodes: readonly SkylineNode[] }

/** A place of a skyline: azimuth from true north through east and apparent altitude, degrees. */
export interface SkylineNode {
  azimuthDeg: number
  altitudeDeg: number
  sdDeg: number | Unstated
}

export type Target = SunTarget | SolsticeSpanTarget | MoonTarget | StarTarget | StarPairTarget

/** The Sun at both solstices of a year: what the span between two lines from one place is held against. */
export interface SolsticeSpanTarget {
  body: 'sun at both solstices'
  at: 'rising' | 'setting'
  disc: Disc | Unstated
}

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
