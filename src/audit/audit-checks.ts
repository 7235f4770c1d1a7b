import type { Claimed, Printed } from '../claim/claim.ts'
import { wrap180 } from '../quantity/degrees.ts'
import { formatArcmin, formatDegrees } from '../quantity/format-angle.ts'
import { formatNumber } from '../quantity/format-number.ts'
import { declinationDeg } from '../site/horizontal.ts'
import { OBLIQUITY_MODELS, type ObliquityModelName } from '../sky/obliquity-models.ts'
import { sunSemidiameter } from '../sky/sun.ts'
import type { Check, SightlineAudit } from './audit.ts'
import { centreAltitude, refractionAtHorizon, type SightlineInputs } from './sightline-inputs.ts'

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
  const ours = refractionAtHorizon(inputs)
  const semidiameter = claimed.semidiameterArcmin?.value ?? sunSemidiameter(year, inputs.event).arcmin
  const refraction =
    claimed.refractionArcmin === null ? ours : { ...ours, arcmin: claimed.refractionArcmin.value }
  const recomputed = centreAltitude(inputs, refraction, semidiameter)
  const altitude = claimed.altitudeDeg?.value ?? recomputed
  const azimuth = claimed.azimuthDeg?.value ?? inputs.azimuthDeg
  const model = OBLIQUITY_MODELS[formula]
  return [
    ...angle('azimuth of the line', claimed.azimuthDeg, inputs.azimuthDeg, line.azimuth_deg.sd),
    ...minutes(
      'refraction on that horizon',
      claimed.refractionArcmin,
      ours.arcmin,
      inputs.refractionSdArcmin,
    ),
    ...minutes(
      'semidiameter of the Sun',
      claimed.semidiameterArcmin,
      sunSemidiameter(year, inputs.event).arcmin,
      0,
    ),
    ...angle(
      'true altitude of the Sun’s centre',
      claimed.altitudeDeg,
      recomputed,
      line.centre_altitude_deg.sd,
    ),
    ...angle(
      'declination',
      claimed.declinationDeg,
      declinationDeg(azimuth, altitude, inputs.latitudeDeg),
      line.declination_deg.sd,
    ),
    ...angle(
      `obliquity at the asserted date (${model.label})`,
      claimed.obliquityDeg,
      model.obliquityDeg(year),
      0,
    ),
  ]
}

/** A step whose result is an angle in degrees; its difference is told in arcseconds. */
function angle(step: string, printed: Printed | null, oursDeg: number, sdDeg: number): Check[] {
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
      verdict: verdictOf(difference, printed.half, sdDeg),
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

/** A result reproduces where it agrees to one unit of the last printed digit. */
function verdictOf(difference: number, half: number, sd: number): Check['verdict'] {
  if (Math.abs(difference) <= 2 * half) return 'reproduces'
  return Math.abs(difference) <= 2 * sd ? 'within uncertainty' : 'differs'
}
