/**
 * The audit of one claim: one plain, frozen object that serialises to JSON as it is. Keys are snake_case,
 * a unit stands at the end of the key that needs one, years are astronomical (0 is 1 BCE) and unrounded.
 * Every number a report shows is in here; a renderer computes nothing.
 */
export interface Audit {
  /** Version of the program. */
  datestone: string
  /** Day the audit was made, ISO 8601, from the clock that was handed in. */
  made_on: string
  /** Base name of the claim file. */
  file: string
  input_sha256: string
  /** The files beside the claim file that it names, in its order. */
  attachments: readonly { path: string; sha256: string }[]
  /** The claim file's content, echoed as plain values. */
  claim: Readonly<Record<string, unknown>>
  statement: string
  source: string | null
  structure: { name: string; latitude_deg: number; longitude_deg: number | null; elevation_m: number }
  asserted: DatedLabel
  /** The independent dates, in the order of the file. */
  other_dates: readonly DatedLabel[]
  /** What the claim gives the builders: 0 is `exact`; null where it does not say. */
  assumed_precision_arcmin: number | null
  /** The plausible build tolerances; `stated` is false where the default of this program stands in. */
  plausible: { low_arcmin: number; high_arcmin: number; stated: boolean }
  window: Window
  /** Which of the four kinds of result this is; the report chooses its words by it. */
  outcome: Outcome
  /** The finding that stands on page one: paragraphs, together at most 150 words. */
  summary: readonly string[]
  findings: readonly Finding[]
  assumptions: readonly Assumption[]
  sightlines: readonly SightlineAudit[]
  /** The survey seen from above. */
  plan: Plan
  /** Where each line's target stood at the asserted date, at the independent ones, and stands today. */
  placements: readonly Placement[]
  tracks: readonly Track[]
  implied: readonly Implied[]
  checks: readonly Check[]
  reproduction: readonly Reproduction[]
  /** Of all lines jointly, or of the only one. */
  sweep: Sweep
  /** The same sweep's bits and sets over a second window, since both belong to their window. */
  second_window: SecondWindow
  limits: readonly Limit[]
  budget: readonly BudgetRow[]
  /** The budget's sum by two routes; null where no date fits. */
  budget_check: BudgetCheck | null
  alternatives: readonly Alternative[]
  /** Not computed by this version. */
  chance: null
  today: readonly Today[]
  warnings: readonly string[]
  /** Keys of the works this audit rests on; the report prints them. */
  references: readonly string[]
}

/**
 * - `premise`: the asserted date beats the independent ones only below some tolerance inside or under the
 *   plausible range: what carries the date is the premise.
 * - `carried`: it does so over the whole plausible range.
 * - `missed`: dates fit the line, but the asserted one is not among them.
 * - `none`: no date in reach fits the line.
 * - `open`: the asserted date fits, and there is no other date to hold it against: none is given, or all given
 *   ones overlap it.
 */
export type Outcome = 'premise' | 'carried' | 'missed' | 'none' | 'open'

export interface DatedLabel {
  label: string
  /** As written in the claim file. */
  text: string
  /** As the report prints it. */
  printed: string
  from: number
  to: number
}

export interface Window {
  from: number
  to: number
  printed: string
  stated: boolean
}

export interface Finding {
  question: string
  answer: string
  because: string
}

/** Something the file leaves out and the engine filled in. */
export interface Assumption {
  /** A short name such as `horizon of midsummer`. */
  what: string
  /** What the file says: nothing, or `unknown`. */
  said: 'omitted' | 'unknown'
  /** What was used, in words. */
  used: string
  /** Why this value, and whose it is. */
  basis: string
  /** Change of the implied date for the stated change of the assumption; null where it cannot be told. */
  effect_years: number | null
  /** What that change is, in words, or why there is no figure. */
  effect_of: string
}

export interface Value {
  value: number
  sd: number
}

export interface SightlineAudit {
  name: string
  body: 'sun' | 'sun at both solstices' | 'moon' | 'star' | 'two stars'
  /** What the line gives: its azimuth, an apparent altitude on the meridian, or the angle between two lines. */
  measures: 'azimuth' | 'altitude' | 'angle'
  /** The standard deviation of what was built, in build tolerances: 1, or √2 for an angle between two built lines. */
  tolerance_scale: number
  /** The event in words, such as `June solstice sunrise`. */
  event: string
  /** The target in words, such as `June solstice sunrise, upper limb on the horizon`. */
  target: string
  /** On the meridian 0 or 180; null for an angle. */
  azimuth_deg: Value | null
  /** The angle between the lines to the two solstices; null for a single line. */
  angle_deg: Value | null
  /** How the direction follows from the survey, a sentence each: bearing, convergence, declination, parts sighted. */
  survey: readonly string[]
  /**
   * Apparent altitude at which the target is seen: of the horizon, of a star's first sight, or the one measured; null
   * for an angle, whose two lines have horizons of their own.
   */
  altitude_deg: Value | null
  refraction_arcmin: Value | null
  /** Of an angle: the horizon and the refraction of each of its lines. */
  solstices:
    | readonly {
        solstice: string
        /** How its horizon was had. */
        horizon: string
        altitude_deg: Value
        refraction_arcmin: Value
      }[]
    | null
  /** The refraction that the claim took, held against the air of the place; null where it states none. */
  refraction_check: RefractionCheck | null
  /** What the line meets the sky at; null where no horizon plays a part. */
  skyline: Skyline | null
  /** Semidiameter of the body at the middle of the asserted date; null for a star. */
  semidiameter_arcmin: Value | null
  /** True altitude of the body's centre, geocentric; null for two stars one above the other. */
  centre_altitude_deg: Value | null
  /** Geocentric, of the body's centre; sd leaves the build tolerance out; null likewise. */
  declination_deg: Value | null
  /** The pressure, temperature and humidity the refraction was computed for; null where it was given. */
  air: { pressure_hpa: number; temperature_c: number; humidity: number; lapse_k_per_km: number } | null
  /** Distance from backsight to foresight, or null where the line is a bare azimuth. */
  length_m: number | null
  /** Direction the target would have at the middle of the asserted date, or null where it has none. */
  direction_at_asserted_deg: number | null
  /** The line less that direction, arcminutes. */
  offset_at_asserted_arcmin: number | null
  /** One standard deviation of that offset, the build tolerance left out. */
  offset_at_asserted_sd_arcmin: number | null
  /** In the year of the asserted date in which the line fits best; null where the target is not to be seen in any. */
  closest_in_asserted: { year: number; offset_arcmin: number; sd_arcmin: number } | null
  /** Movement of the target at the asserted date. */
  drift: Drift | null
  /** Sentences on how such a target moves or comes back. */
  notes: readonly string[]
  /** This line's own sweep; null where the claim has one line only. */
  sweep: Sweep | null
}

/** The skyline of one line, in apparent altitudes. */
export interface Skyline {
  from: 'altitude' | 'distance' | 'point' | 'sea' | 'profile' | 'level'
  /** How it was had, in a sentence. */
  words: string
  /** Where it is known from a profile, azimuths and altitudes of its nodes in degrees, ascending; else one node. */
  nodes: readonly (readonly [number, number])[]
  /** Altitude where the line meets it, degrees. */
  at_line_deg: Value
}

/** A refraction that a claim states, against the one traced through the air of the place. */
export interface RefractionCheck {
  stated_arcmin: number
  traced_arcmin: number
  /** What textbooks give at sea level, 10 °C and 1010 hPa for the same apparent altitude (Bennett 1982), or for the level where it is lower. */
  sea_level_arcmin: number
  /** Whether the one stated is, to 1.5′, the one for sea level, while that of the place is further from it. */
  is_sea_level: boolean
  /** What the difference between stated and traced does to the implied date, years; null where there is no date. */
  effect_years: number | null
}

/** Points and lines seen from above, true north up. */
export interface Plan {
  /** How north was found, in words, and one standard deviation of it; null where no line rests on a plan's north. */
  north: { words: string; sd_deg: number } | null
  /** Metres east and north of the first point. Far ones (by their coordinates on the Earth) lie where a map would have them. */
  points: readonly PlanPoint[]
  lines: readonly PlanLine[]
}

export interface PlanPoint {
  name: string
  east_m: number
  north_m: number
  sd_m: number
  /** Across the line of sight; null for a point. */
  width_m: number | null
  form: 'post' | 'gap' | null
}

/** A line of the plan; `from` and `to` are indices of its points, null for a bare direction. */
export interface PlanLine {
  sightline: string
  from: number | null
  to: number | null
  /** From true north; of an angle, its first line clockwise: null where that has no direction of its own. */
  azimuth_deg: number | null
  /** Of an angle: its second point and the angle clockwise from the first line, degrees. */
  span: { to: number | null; angle_deg: number } | null
  length_m: number | null
}

/** Where the target of one line stood at one date, when its sighted part stood on the skyline. */
export interface Placement {
  sightline: string
  kind: 'asserted' | 'independent' | 'today'
  /** Of the date: `asserted date`, that of an independent one, `today`. */
  label: string
  /** The date as the report prints it. */
  printed: string
  /** The year looked at, and the ends of the date. */
  year: number
  from: number
  to: number
  /** Direction at `year`, of that branch of the target which is nearest the line then; null where it has none. */
  direction_deg: number | null
  /** Directions over the whole date, least and greatest, of the same branch; null likewise. */
  direction_range_deg: readonly [number, number] | null
  /** The line less the direction at `year`, arcminutes. */
  offset_arcmin: number | null
  /** One standard deviation of all errors but the builders'. */
  offset_sd_arcmin: number | null
  /** The size of the offset at the marker, or at 100 m where the line's length is not known; null but for an azimuth. */
  offset_cm: number | null
  /** The body's disc as seen then: centre (apparent) and semidiameter; null for a star, on the meridian, for an angle. */
  disc: { azimuth_deg: number; altitude_deg: number; semidiameter_arcmin: number } | null
}

export interface Drift {
  /** Positive to the right, as one faces the horizon; upwards for an altitude. */
  arcmin_per_century: number
  cm_per_century: number
  /** Sun's widths along the horizon in 1,000 years. */
  sun_widths_per_millennium: number
  years_per_arcmin: number
}

/** What the figures draw: where the target stood. `direction_deg` is null in years in which it has none. */
export interface Track {
  sightline: string
  model: string
  years: readonly number[]
  /** Of several branches of one target, which: from 0. */
  branch: number
  /** What tells this branch from the others, such as `Mizar above` or `March equinox`; null where the target has one only. */
  branch_words: string | null
  direction_deg: readonly (number | null)[]
  /** One standard deviation of the comparison at τ = 0 in each year, arcminutes; null likewise. */
  sd_arcmin: readonly (number | null)[]
  /** The measured band: the line's direction and its sd. */
  line_deg: Value
}

export interface Implied {
  sightline: string
  model: string
  /** Every date in the window and within 10,000 years outside it, ascending. */
  dates: readonly ImpliedDate[]
  /** Where no date in the window fits, or none at all: the year in which the target came nearest. */
  nearest_approach: NearestApproach | null
}

export interface ImpliedDate {
  year: number
  /** The 95 % interval at τ = 0 on this branch; null where it merges with the neighbouring one. */
  low95: number | null
  high95: number | null
  in_window: boolean
  /** After the year in which the audit was made. */
  future: boolean
}

export interface NearestApproach {
  year: number
  /** The line less the target's azimuth there, arcminutes; null where the target never reaches the altitude. */
  offset_arcmin: number | null
  /** One standard deviation of that offset, the build tolerance left out. */
  sd_arcmin: number | null
  sun_widths: number | null
}

/** One step of the claimant's arithmetic, redone with the printed results of the steps before it. */
export interface Check {
  step: string
  /** As the source prints it. */
  printed: string
  printed_value: number
  ours: number
  /** As the report prints it. */
  ours_printed: string
  /** Ours less theirs, in the unit `unit`. */
  difference: number
  difference_printed: string
  unit: 'arcsec' | 'arcmin' | 'years'
  /** `rounding`: within half of the last printed digit, and one unit of rounding in the inputs. */
  verdict: 'reproduces' | 'within uncertainty' | 'differs'
}

export interface Reproduction {
  model: string
  /** As the report prints it, such as `Newcomb 1895`. */
  label: string
  /** From the declination or the azimuth that the source prints, or from the sightline as recomputed here. */
  from: 'claimed declination' | 'claimed azimuth' | 'sightline'
  sightline: string
  /** The root nearest the middle of the asserted date. */
  year: number | null
  difference_years: number | null
  within_model_range: boolean | null
  /** The range the model's authors state, in words. */
  model_range: string
  /** Error of the model against the default one at that year, years of date; null where there is none. */
  model_error_years: number | null
  /** Where `year` is null: why (not testable, or no root). */
  reason: string | null
}

export interface Sweep {
  window: Window
  /** Where `tolerance_cm` is measured: the line's length, or 100 m where it is not known or lines differ. */
  marker: { distance_m: number; measured: boolean }
  /** Ascending tolerances; those the tables print are marked. */
  steps: readonly SweepStep[]
  /** Years of the window in which the target does not reach the altitude at all, as pairs. */
  no_target: readonly (readonly [number, number])[]
}

export interface SweepStep {
  tolerance_arcmin: number
  /** The same tolerance as a distance at the marker, or at 100 m where the line's length is not known. */
  tolerance_cm: number
  tolerance_sun_widths: number
  in_table: boolean
  /** Smallest sets of dates that hold 68 % and 95 %. */
  sets68: readonly (readonly [number, number])[]
  sets95: readonly (readonly [number, number])[]
  /** The 95 % set ends at the window's edge, which cuts it. */
  open_low: boolean
  open_high: boolean
  /** Kullback-Leibler divergence from prior to posterior. */
  bits: number
  ratios: readonly Ratio[]
}

/** Averages of the weight over the asserted date and over one independent date. */
export interface Ratio {
  against: string
  /** Null where it overflows or no weight is left on either side. */
  value: number | null
  ln: number | null
  /** In the words of Kass & Raftery 1995, and for which of the two. */
  words: string
}

export interface SecondWindow {
  window: Window
  half_bit_arcmin: number | null
  steps: readonly { tolerance_arcmin: number; bits: number; sets95: readonly (readonly [number, number])[] }[]
}

export interface Limit {
  /** Label of the independent date; null where the claim names none. */
  against: string | null
  /** Whether it is much the same date as the asserted one, which no line could tell apart. */
  overlaps: boolean
  ratio_3_arcmin: number | null
  /** Whether the asserted date leads by 3 to 1 at every tolerance up to there, and not only at some. */
  ratio_3_steady: boolean | null
  other_date_in_95_arcmin: number | null
  half_bit_arcmin: number | null
  /** The same three as distances at the marker (`tolerance_cm` of the sweep), centimetres. */
  ratio_3_cm: number | null
  other_date_in_95_cm: number | null
  half_bit_cm: number | null
  /** Why a limit is null. */
  ratio_3_reason: string | null
  other_date_in_95_reason: string | null
  half_bit_reason: string | null
}

export interface BudgetRow {
  source: string
  /** Standard deviation in years of date at the implied date nearest the asserted one. */
  sd: number
  /** Share of the variance, 0 to 1. */
  share: number
}

/** The linear budget (JCGM 100) held against draws of the same errors (JCGM 101). */
export interface BudgetCheck {
  /** The implied date that both are about. */
  year: number
  linear_sd: number
  /** Null where no draw has a date. */
  sampled_sd: number | null
  /** Share of the draws for which no date fits the line at all. */
  no_date_share: number
  /** Whether the two agree to a tenth, with every draw having a date: the track is straight there. */
  agree: boolean
}

/** The claim with one open choice made otherwise. */
export interface Alternative {
  sightline: string
  /** Such as `part of the disc`. */
  choice: string
  /** Such as `centre`. */
  value: string
  /** The claim's own choice, or the default that stands in for it. */
  is_claims: boolean
  years: readonly number[]
  /** Of `years`, the one nearest the asserted date's middle. */
  nearest_year: number | null
}

/** Where the target stands on the day the audit was made. */
export interface Today {
  sightline: string
  year: number
  direction_deg: number | null
  /** The line less that direction. */
  offset_arcmin: number | null
  sun_widths: number | null
  offset_cm: number | null
  /** When and where to look for oneself; null where no chance is reckoned, `next_reason` says why. */
  next: NextChance | null
  next_reason: string | null
}

export interface NextChance {
  /** Local calendar day, ISO 8601. */
  date: string
  /** Universal time to the minute; null where the claim gives no longitude. */
  utc: string | null
  /** Other days as good, ISO 8601, first and last; null where there is only that one. */
  days: readonly [string, string] | null
  /** Where the target is then to be seen: the direction of the line's own reckoning. */
  direction_deg: number | null
  /** To have it over the foresight, stand so many metres beside the backsight, to the right positive; null where unknown. */
  stand_right_m: number | null
  /** One standard deviation of that. */
  stand_sd_m: number | null
  /** Sentences on what else matters: phase of the Moon, hour of the night. */
  notes: readonly string[]
}
