import type { Disc, EquinoxSense, Horizon, MoonTarget, SunEvent } from '../claim/claim.ts'
import type { Sight } from '../inference/sight.ts'
import type { Air } from '../site/air.ts'
import type { VisibilityRule } from '../sky/first-visibility.ts'
import type { ObliquityModelName } from '../sky/obliquity-models.ts'
import type { Star } from '../sky/star-catalogue.ts'
import type { Ends } from './survey/ends.ts'

/** One sightline with every gap filled: what its target, its dates and its declination follow from. */
export interface SightlineInputs {
  name: string
  target: SettledTarget
  latitudeDeg: number
  /** What the line gives: an azimuth from true north, an apparent altitude on the meridian, or an angle of two lines. */
  measures: Sight['measures']
  measuredDeg: number
  measuredSdDeg: number
  northSdDeg: number
  /** Which north that is; null where the direction is true by itself. */
  northOf: Sight['northOf']
  /** Names its points, whichever way round; null where it is no line between points. */
  axis: string | null
  /** What is sighted at its two ends; null likewise, and for an angle. */
  ends: Ends | null
  /** Of the line of the middles by the survey's own north, degrees; null where that is true, and for a bare direction. */
  bearingDeg: number | null
  /** How its direction follows from the survey, in sentences. */
  survey: readonly string[]
  /** Horizontal length, metres; null where the line is no line between points. */
  lengthM: number | null
  /** Apparent altitude at which the target is seen: of the horizon, or the one measured on the meridian. */
  horizonDeg: number
  horizonSdDeg: number
  /** How that altitude was had, and the skyline to both sides where it is known. */
  horizon: SettledHorizon
  /** Added to the altitudes of the skyline to both sides, degrees: 0 but where another horizon is looked at. */
  horizonShiftDeg: number
  /** Of an angle: its two lines, each with its own horizon; null for a single line. */
  pair: { june: SightlineInputs; december: SightlineInputs } | null
  refraction: Refraction
  /** Added to the refraction, arcminutes: 0 but where the effect of another refraction is looked at. */
  refractionShiftArcmin: number
  /** Day-to-day scatter of refraction, arcminutes. */
  refractionSdArcmin: number
  /** Else it is the default at the horizon's altitude, which elsewhere on a skyline is another. */
  isRefractionSdStated: boolean
  /** Of the obliquity, and of precession for a star. */
  model: ObliquityModelName
}

export interface SettledHorizon {
  from: Horizon['by'] | 'level'
  words: string
  /** How far off it is, metres; null where that is not known. */
  distanceM: number | null
  /** Azimuths from true north and apparent altitudes with their standard deviation, degrees; null: the same all round. */
  nodes: readonly { azimuthDeg: number; altitudeDeg: number; sdDeg: number }[] | null
}

export type SettledTarget =
  | { body: 'sun'; event: SettledSunEvent; at: 'rising' | 'setting' | 'noon'; disc: Disc }
  | { body: 'sun at both solstices'; at: 'rising' | 'setting'; disc: Disc }
  | { body: 'moon'; standstill: MoonTarget['standstill']; at: 'rising' | 'setting'; disc: Disc }
  | {
      body: 'star'
      star: Star
      at: 'rising' | 'setting' | 'upper culmination' | 'lower culmination'
      sighted: Sighted
    }
  | { body: 'two stars'; stars: readonly [Star, Star]; above: 0 | 1 | null }

export type SettledSunEvent =
  | Exclude<SunEvent, { name: 'equinox' }>
  | { name: 'equinox'; sense: EquinoxSense }

/** The apparent altitude at which a star was sighted, or the rule for where it is first visible. */
export type Sighted = { by: 'altitude'; deg: number; sdDeg: number } | { by: 'rule'; rule: VisibilityRule }

/** Ray-traced in the claim's air, or given by the claim, less parallax. */
export type Refraction = { by: 'ray trace'; air: Air } | { by: 'claim'; arcmin: number }
