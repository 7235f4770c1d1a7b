import type { Claimed, Printed } from '../claim/claim.ts'
import { wrap180 } from '../quantity/degrees.ts'
import { formatArcmin, formatDegrees } from '../quantity/format-angle.ts'
import { formatNumber } from '../quantity/format-number.ts'
import { horizonAboveCentreArcmin } from '../site/centre-altitude.ts'
import { declinationDeg } from '../site/horizontal.ts'
import { OBLIQUITY_MODELS, type ObliquityModelName } from '../sky/obliquity-models.ts'
import type { Check, SightlineAudit } from './audit.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { targetModel } from './targets/target-model.ts'

/**
 * Each intermediate result that the source prints, redone from the printed results of the steps before it, so that
 * one slip is not counted twice. The results belong to the claim's first line.
 */
export function auditChecks(
  claimed: Claimed,
  inputs: SightlineInputs,
  line: SightlineAudit,
  formula: ObliquityModelName,
  year: number,
): Check[] {
  const model = OBLIQUITY_MODELS[formula]
  const { azimuth_deg: azimuthDeg, altitude_deg: altitudeDeg, refraction_arcmin: refractionArcmin } = line
  // An angle between two lines has none of these steps but the last.
  if (azimuthDeg === null || altitudeDeg === null || refractionArcmin === null) {
    return obliquityCheck(claimed, model, year)
  }
  const refraction = refractionArcmin.value
  const altitude = recomputedAltitude(claimed, inputs, line, refraction, year)
  const azimuth = claimed.azimuthDeg?.value ?? azimuthDeg.value
  const declination = declinationDeg(azimuth, claimed.altitudeDeg?.value ?? altitude, inputs.latitudeDeg)
  const fromAzimuth = (deg: number) =>
    declinationDeg(deg, claimed.altitudeDeg?.value ?? altitude, inputs.latitudeDeg)
  const byAzimuth =
    claimed.azimuthDeg === null ? 0 : Math.abs(fromAzimuth(azimuth + claimed.azimuthDeg.half) - declination)
  const halves = (...printed: (Printed | null)[]) =>
    printed.reduce((sum, each) => sum + (each?.half ?? 0), 0) / 60
  const ofAltitude = halves(claimed.refractionArcmin, claimed.semidiameterArcmin)
  const airSd = claimed.refractionArcmin === null ? inputs.refractionSdArcmin / 60 : 0
  const altitudeSd = Math.hypot(airSd, altitudeDeg.sd)
  return [
    ...angle('azimuth of the line', claimed.azimuthDeg, azimuthDeg.value, 0, azimuthDeg.sd),
    ...minutes('refraction', claimed.refractionArcmin, refraction, REFRACTION_MODEL_SHARE * refraction),
    ...minutes('semidiameter', claimed.semidiameterArcmin, line.semidiameter_arcmin?.value ?? 0, 0),
    ...angle('true altitude of the centre', claimed.altitudeDeg, altitude, ofAltitude, airSd),
    ...angle(
      'declination',
      claimed.declinationDeg,
      declination,
      byAzimuth + (claimed.altitudeDeg?.half ?? ofAltitude),
      claimed.altitudeDeg === null ? altitudeSd : 0,
    ),
    ...obliquityCheck(claimed, model, year),
  ]
}

function obliquityCheck(
  { obliquityDeg }: Claimed,
  model: (typeof OBLIQUITY_MODELS)[ObliquityModelName],
  year: number,
): Check[] {
  const step = `obliquity at the asserted date (${model.label})`
  return angle(step, obliquityDeg, model.obliquityDeg(year), 0, 0)
}

/**
 * Handbooks of mean refraction part by so much of it: at the horizon Allen 1976 has 35.4′, the ray trace 33.9′. The
 * scatter from day to day is no excuse for a mean.
 */
const REFRACTION_MODEL_SHARE = 0.025

/** True altitude of the centre, degrees, with the refraction and the semidiameter that the source prints. */
function recomputedAltitude(
  claimed: Claimed,
  inputs: SightlineInputs,
  line: SightlineAudit,
  refraction: number,
  year: number,
): number {
  const { target } = inputs
  // On a skyline the source, too, took the altitude where the line meets it.
  const atLine = inputs.horizon.nodes === null ? null : targetModel(inputs).altitudeDeg(year)
  const ours = atLine?.deg ?? line.centre_altitude_deg?.value ?? inputs.horizonDeg
  const byRefraction = (refraction - (claimed.refractionArcmin?.value ?? refraction)) / 60
  if (!('disc' in target) || claimed.semidiameterArcmin === null || line.semidiameter_arcmin === null) {
    return ours + byRefraction
  }
  const above = (arcmin: number) => horizonAboveCentreArcmin(target.disc, arcmin)
  const bySize = (above(line.semidiameter_arcmin.value) - above(claimed.semidiameterArcmin.value)) / 60
  return ours + byRefraction + bySize
}

/**
 * A step whose result is an angle in degrees; its difference is told in arcseconds.
 *
 * @param inputHalfDeg What half a digit of the printed results before it may move.
 * @param sdDeg What the inputs that are not printed leave open.
 */
function angle(
  step: string,
  printed: Printed | null,
  oursDeg: number,
  inputHalfDeg: number,
  sdDeg: number,
): Check[] {
  if (printed === null) return []
  const difference = wrap180(oursDeg - printed.value)
  return [
    {
      step,
      printed: printed.text,
      printed_value: printed.value,
      ours: oursDeg,
      ours_printed: formatDegrees(oursDeg),
      difference: difference * 3600,
      difference_printed: signedArcmin(difference * 60),
      unit: 'arcsec',
      verdict: verdictOf(difference, printed.half + inputHalfDeg, sdDeg),
    },
  ]
}

/** A step whose result is printed in arcminutes. */
function minutes(step: string, printed: Printed | null, ours: number, sd: number): Check[] {
  if (printed === null) return []
  const difference = ours - printed.value
  return [
    {
      step,
      printed: printed.text,
      printed_value: printed.value,
      ours,
      ours_printed: `${formatNumber(ours, 4)}′`,
      difference,
      difference_printed: signedArcmin(difference),
      unit: 'arcmin',
      verdict: verdictOf(difference, printed.half, sd),
    },
  ]
}

function signedArcmin(arcmin: number): string {
  return (arcmin > 0 ? '+' : '') + formatArcmin(arcmin)
}

/**
 * A result reproduces where it rounds to the printed one, with what rounding of the printed results before it may
 * have moved; else where air and horizon, which the source need not have taken as here, explain the rest.
 */
function verdictOf(difference: number, roundingHalf: number, airSd: number): Check['verdict'] {
  if (Math.abs(difference) <= roundingHalf * (1 + 1e-9)) return 'reproduces'
  return Math.abs(difference) <= roundingHalf + 2 * airSd ? 'within uncertainty' : 'differs'
}
