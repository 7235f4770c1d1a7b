import type { Disc } from '../claim/claim.ts'
import type { Sight } from '../inference/sight.ts'
import type { Air } from '../site/air.ts'
import { centreAltitudeDeg, horizonAboveCentreArcmin } from '../site/centre-altitude.ts'
import { refractionArcmin } from '../site/refraction.ts'
import { OBLIQUITY_MODELS, type ObliquityModelName } from '../sky/obliquity-models.ts'
import { modelSpreadSdDeg, NUTATION_SD_DEG, solsticeDeclinationDeg } from '../sky/solstice-declination.ts'
import { hemisphere, type SolsticeEvent, SUN_PARALLAX_ARCSEC, sunSemidiameter } from '../sky/sun.ts'

/** One sightline with every gap filled: what its target, its dates and its declination follow from. */
export interface SightlineInputs {
  name: string
  event: SolsticeEvent
  at: 'rising' | 'setting'
  disc: Disc
  latitudeDeg: number
  azimuthDeg: number
  azimuthSdDeg: number
  northSdDeg: number
  /** Horizontal length, metres; null where the line is a bare azimuth. */
  lengthM: number | null
  horizonDeg: number
  horizonSdDeg: number
  refraction: Refraction
  /** Day-to-day scatter of refraction, arcminutes. */
  refractionSdArcmin: number
  model: ObliquityModelName
}

/** Ray-traced in the claim's air, or given by the claim, less parallax. */
export type Refraction = { by: 'ray trace'; air: Air } | { by: 'claim'; arcmin: number }

/** Refraction at the horizon's apparent altitude, and how it changes with that altitude. */
export interface RefractionAtHorizon {
  arcmin: number
  perDegree: number
  /** Horizontal parallax still to be taken into account, arcseconds. */
  parallaxArcsec: number
}

export function refractionAtHorizon(inputs: SightlineInputs): RefractionAtHorizon {
  const { refraction, horizonDeg, latitudeDeg } = inputs
  if (refraction.by === 'claim') return { arcmin: refraction.arcmin, perDegree: 0, parallaxArcsec: 0 }
  const at = (altitudeDeg: number) => refractionArcmin(altitudeDeg, refraction.air, latitudeDeg)
  return {
    arcmin: at(horizonDeg),
    perDegree: (at(horizonDeg + 0.05) - at(horizonDeg - 0.05)) / 0.1,
    parallaxArcsec: SUN_PARALLAX_ARCSEC,
  }
}

/** The sightline as the inference sees it. */
export function sightOf(inputs: SightlineInputs): Sight {
  const { event, model } = inputs
  const refraction = refractionAtHorizon(inputs)
  const horizonSd = inputs.horizonSdDeg * (1 - refraction.perDegree / 60)
  return {
    name: inputs.name,
    latitudeDeg: inputs.latitudeDeg,
    at: inputs.at,
    azimuthDeg: inputs.azimuthDeg,
    azimuthSdDeg: inputs.azimuthSdDeg,
    northSdDeg: inputs.northSdDeg,
    altitudeDeg: (year) => centreAltitude(inputs, refraction, sunSemidiameter(year, event).arcmin),
    altitudeSdDeg: (year) =>
      Math.hypot(horizonSd, inputs.refractionSdArcmin / 60, sunSemidiameter(year, event).sdArcmin / 60),
    declinationDeg: (year) => solsticeDeclinationDeg(year, event, model),
    declinationSdDeg: (year) => Math.hypot(modelSpreadSdDeg(year), NUTATION_SD_DEG),
    declinationSign: hemisphere(event),
  }
}

/** True altitude of the Sun's centre for a semidiameter in arcminutes, degrees. */
export function centreAltitude(
  inputs: SightlineInputs,
  refraction: RefractionAtHorizon,
  semidiameterArcmin: number,
): number {
  const above = horizonAboveCentreArcmin(inputs.disc, semidiameterArcmin)
  return centreAltitudeDeg(inputs.horizonDeg, refraction.arcmin, above, refraction.parallaxArcsec)
}

/** The part of a stretch of years for which a model gives numbers. */
export function computableStretch(
  model: ObliquityModelName,
  from: number,
  to: number,
): { from: number; to: number } {
  const { computable } = OBLIQUITY_MODELS[model]
  return { from: Math.max(from, computable.from), to: Math.min(to, computable.to) }
}
