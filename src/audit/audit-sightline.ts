import { nearestOffset } from '../inference/comparison.ts'
import { bestFit } from '../inference/fit.ts'
import { driftDegPerYear } from '../inference/implied-dates.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { listed } from '../quantity/listed.ts'
import { declinationDeg } from '../site/horizontal.ts'
import type { Drift, RefractionCheck, SightlineAudit, Sweep, Value } from './audit.ts'
import { auditSkyline } from './audit-skyline.ts'
import { middle } from './dated-label.ts'
import { centimetres, markerOf, sunWidths } from './measures.ts'
import { nearestBranch } from './nearest-branch.ts'
import { refractionAt, refractionAtHorizon } from './refraction-at.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { yardstickSemidiameterArcmin } from './sun-yardstick.ts'
import { partWords, turnByParts } from './survey/ends.ts'
import { type TargetModel, targetModel } from './targets/target-model.ts'

/** What one line says at the middle of the asserted date, with the body's size of that epoch. */
export function auditSightline(
  inputs: SightlineInputs,
  asserted: { from: number; to: number },
  sweep: Sweep | null,
  refractionCheck: RefractionCheck | null,
): SightlineAudit {
  const year = middle(asserted)
  const target = targetModel(inputs)
  const offset = nearestOffset(sightOf(inputs), year)
  const semidiameter = target.semidiameter(year)
  const altitude = centreAltitudeOf(inputs, target, year)
  const seen = target.seenAt ?? { deg: inputs.horizonDeg, sdDeg: inputs.horizonSdDeg }
  return {
    name: inputs.name,
    body: inputs.target.body,
    measures: inputs.measures,
    tolerance_scale: sightOf(inputs).toleranceScale,
    event: target.event,
    target: target.description,
    azimuth_deg: azimuthOf(inputs, target, year),
    angle_deg: inputs.pair === null ? null : { value: inputs.measuredDeg, sd: inputs.measuredSdDeg },
    survey: surveyOf(inputs),
    altitude_deg: inputs.pair === null ? { value: seen.deg, sd: seen.sdDeg } : null,
    refraction_arcmin:
      inputs.pair === null
        ? { value: refractionAt(inputs, seen.deg).arcmin, sd: inputs.refractionSdArcmin }
        : null,
    solstices: solsticesOf(inputs),
    refraction_check: refractionCheck,
    skyline: auditSkyline(inputs),
    semidiameter_arcmin:
      semidiameter === null ? null : { value: semidiameter.arcmin, sd: semidiameter.sdArcmin },
    centre_altitude_deg: altitude,
    declination_deg: altitude === null ? null : declinationOf(inputs, target, altitude, year),
    air: airOf(inputs),
    length_m: inputs.lengthM,
    direction_at_asserted_deg: offset === null ? null : offset.directionDeg,
    offset_at_asserted_arcmin: offset === null ? null : offset.offsetDeg * 60,
    offset_at_asserted_sd_arcmin: offset === null ? null : offset.sdDeg * 60,
    closest_in_asserted: closestIn(inputs, asserted),
    drift: driftOf(inputs, year),
    notes: target.notes(year),
    sweep,
  }
}

/** The offset in the year of a stretch in which the line fits best. */
function closestIn(
  inputs: SightlineInputs,
  asserted: { from: number; to: number },
): SightlineAudit['closest_in_asserted'] {
  const sight = sightOf(inputs)
  const { year } = bestFit([sight], asserted)
  const offset = nearestOffset(sight, year)
  return offset === null ? null : { year, offset_arcmin: offset.offsetDeg * 60, sd_arcmin: offset.sdDeg * 60 }
}

/** How the direction follows from the survey, and what was sighted of things that have a width. */
function surveyOf({ survey, ends, lengthM }: SightlineInputs): string[] {
  if (ends === null || lengthM === null) return [...survey]
  const wide = [ends.from, ends.to].filter(({ form }) => form !== null)
  if (wide.length === 0) return [...survey]
  const parts = wide.map((end) => `${partWords(end)} of ${end.name}`)
  const turn = turnByParts(ends, lengthM)
  const effect =
    turn === 0
      ? ''
      : `, which turns the line by ${formatArcmin(Math.abs(turn) * 60)} to the ${turn > 0 ? 'right' : 'left'}`
  return [...survey, `Sighted: ${listed(parts)}${effect}.`]
}

function solsticesOf({ pair }: SightlineInputs): SightlineAudit['solstices'] {
  if (pair === null) return null
  return (['june', 'december'] as const).map((side) => {
    const { horizon, horizonDeg, horizonSdDeg, refractionSdArcmin } = pair[side]
    return {
      solstice: side === 'june' ? 'June' : 'December',
      horizon: horizon.words,
      altitude_deg: { value: horizonDeg, sd: horizonSdDeg },
      refraction_arcmin: { value: refractionAtHorizon(pair[side]).arcmin, sd: refractionSdArcmin },
    }
  })
}

/** A measured altitude stands on the meridian, on the side of the target; an angle has no direction. */
function azimuthOf(inputs: SightlineInputs, target: TargetModel, year: number): Value | null {
  if (inputs.measures === 'angle') return null
  if (inputs.measures === 'azimuth') {
    return { value: inputs.measuredDeg, sd: Math.hypot(inputs.measuredSdDeg, inputs.northSdDeg) }
  }
  return { value: isNorthOfZenith(inputs, target, year) ? 0 : 180, sd: 0 }
}

function isNorthOfZenith(
  { target: { body, ...settled }, latitudeDeg }: SightlineInputs,
  target: TargetModel,
  year: number,
) {
  const declination = target.declinationDeg(year) ?? 0
  const isLower = body === 'star' && 'at' in settled && settled.at === 'lower culmination'
  return isLower ? latitudeDeg + declination > 0 : declination > latitudeDeg
}

/** On the meridian, the measured altitude less refraction; elsewhere where the body's centre meets the horizon. */
function centreAltitudeOf(inputs: SightlineInputs, target: TargetModel, year: number): Value | null {
  if (inputs.measures === 'altitude') {
    const sd = Math.hypot(inputs.measuredSdDeg, inputs.refractionSdArcmin / 60)
    return { value: inputs.measuredDeg - refractionAtHorizon(inputs).arcmin / 60, sd }
  }
  const altitude = target.altitudeDeg(year)
  if (altitude === null) return null
  if (target.onLine === null) return { value: altitude.deg, sd: altitude.sdDeg }
  const onLine = target.onLine(year)
  return onLine === null ? null : { value: onLine.altitudeDeg, sd: altitude.sdDeg }
}

/** Errors of direction and altitude carried into the declination, by the derivatives of sin δ. */
function declinationOf(
  inputs: SightlineInputs,
  target: TargetModel,
  altitude: Value,
  year: number,
): Value | null {
  const ofLine = azimuthOf(inputs, target, year)
  if (ofLine === null) return null
  // On a slope the centre does not stand straight below the point that is touched.
  const azimuth = { value: target.onLine?.(year)?.azimuthDeg ?? ofLine.value, sd: ofLine.sd }
  const at = (azimuthDeg: number, h: number) => declinationDeg(azimuthDeg, h, inputs.latitudeDeg)
  const step = 1e-3
  const perAzimuth =
    (at(azimuth.value + step, altitude.value) - at(azimuth.value - step, altitude.value)) / (2 * step)
  const perAltitude =
    (at(azimuth.value, altitude.value + step) - at(azimuth.value, altitude.value - step)) / (2 * step)
  return {
    value: at(azimuth.value, altitude.value),
    sd: Math.hypot(perAzimuth * azimuth.sd, perAltitude * altitude.sd),
  }
}

function airOf({ refraction }: SightlineInputs): SightlineAudit['air'] {
  if (refraction.by === 'claim') return null
  const { pressureHpa, temperatureC, humidity, lapseKPerKm } = refraction.air
  return { pressure_hpa: pressureHpa, temperature_c: temperatureC, humidity, lapse_k_per_km: lapseKPerKm }
}

/** Of the branch that stands nearest to the line in that year. */
function driftOf(inputs: SightlineInputs, year: number): Drift | null {
  const sight = sightOf(inputs)
  const branch = nearestBranch(sight, year)
  const perYear = driftDegPerYear(sight, branch, year)
  if (perYear === null || perYear === 0) return null
  const arcminPerYear = perYear * 60
  const semidiameter = yardstickSemidiameterArcmin(year)
  return {
    arcmin_per_century: arcminPerYear * 100,
    cm_per_century: centimetres(arcminPerYear * 100, markerOf(inputs.lengthM)),
    sun_widths_per_millennium: sunWidths(Math.abs(arcminPerYear) * 1000, semidiameter, widthAltitude(inputs)),
    years_per_arcmin: 1 / Math.abs(arcminPerYear),
  }
}

/** Along the horizon a disc is wider the higher it stands; up the meridian it is not. */
export function widthAltitude({ measures, horizonDeg }: SightlineInputs): number {
  return measures === 'altitude' ? 0 : horizonDeg
}
