import { nearestOffset } from '../inference/comparison.ts'
import { bestFit } from '../inference/fit.ts'
import { driftDegPerYear } from '../inference/implied-dates.ts'
import { declinationDeg } from '../site/horizontal.ts'
import type { Drift, SightlineAudit, Sweep, Value } from './audit.ts'
import { middle } from './dated-label.ts'
import { centimetres, markerOf, sunWidths } from './measures.ts'
import { nearestBranch } from './nearest-branch.ts'
import { refractionAt, refractionAtHorizon } from './refraction-at.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { yardstickSemidiameterArcmin } from './sun-yardstick.ts'
import { type TargetModel, targetModel } from './targets/target-model.ts'

/** What one line says at the middle of the asserted date, with the body's size of that epoch. */
export function auditSightline(
  inputs: SightlineInputs,
  asserted: { from: number; to: number },
  sweep: Sweep | null,
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
    event: target.event,
    target: target.description,
    azimuth_deg: azimuthOf(inputs, target, year),
    altitude_deg: { value: seen.deg, sd: seen.sdDeg },
    refraction_arcmin: { value: refractionAt(inputs, seen.deg).arcmin, sd: inputs.refractionSdArcmin },
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

/** A measured altitude stands on the meridian, on the side of the target. */
function azimuthOf(inputs: SightlineInputs, target: TargetModel, year: number): Value {
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
  return altitude === null ? null : { value: altitude.deg, sd: altitude.sdDeg }
}

/** Errors of direction and altitude carried into the declination, by the derivatives of sin δ. */
function declinationOf(inputs: SightlineInputs, target: TargetModel, altitude: Value, year: number): Value {
  const azimuth = azimuthOf(inputs, target, year)
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
  return measures === 'azimuth' ? horizonDeg : 0
}
