import { offsetDeg, offsetSdDeg, targetAzimuthDeg } from '../inference/comparison.ts'
import { driftDegPerYear } from '../inference/implied-dates.ts'
import { declinationDeg, horizonCrossing } from '../site/horizontal.ts'
import { solsticeDwellDays, sunSemidiameter } from '../sky/sun.ts'
import type { Drift, SightlineAudit, Sweep } from './audit.ts'
import { centimetres, markerOf, sunWidths } from './measures.ts'
import { centreAltitude, refractionAtHorizon, type SightlineInputs, sightOf } from './sightline-inputs.ts'
import { eventWords, targetWords } from './words.ts'

/** What one line says at the middle of the asserted date, with the Sun's semidiameter of that epoch. */
export function auditSightline(inputs: SightlineInputs, year: number, sweep: Sweep | null): SightlineAudit {
  const sight = sightOf(inputs)
  const refraction = refractionAtHorizon(inputs)
  const semidiameter = sunSemidiameter(year, inputs.event)
  const altitude = centreAltitude(inputs, refraction, semidiameter.arcmin)
  const azimuth = targetAzimuthDeg(sight, year)
  const offset = offsetDeg(sight, year)
  const offsetSd = offsetSdDeg(sight, year)
  return {
    name: inputs.name,
    event: eventWords(inputs),
    target: targetWords(inputs),
    azimuth_deg: { value: inputs.azimuthDeg, sd: Math.hypot(inputs.azimuthSdDeg, inputs.northSdDeg) },
    altitude_deg: { value: inputs.horizonDeg, sd: inputs.horizonSdDeg },
    refraction_arcmin: { value: refraction.arcmin, sd: inputs.refractionSdArcmin },
    semidiameter_arcmin: { value: semidiameter.arcmin, sd: semidiameter.sdArcmin },
    centre_altitude_deg: { value: altitude, sd: sight.altitudeSdDeg(year) },
    declination_deg: {
      value: declinationDeg(inputs.azimuthDeg, altitude, inputs.latitudeDeg),
      sd: declinationSd(inputs, altitude, sight.altitudeSdDeg(year)),
    },
    air: airOf(inputs),
    length_m: inputs.lengthM,
    azimuth_at_asserted_deg: azimuth,
    offset_at_asserted_arcmin: offset === null ? null : offset * 60,
    offset_at_asserted_sd_arcmin: offsetSd === null ? null : offsetSd * 60,
    drift: driftOf(inputs, year),
    dwell_days: dwellDays(inputs, year),
    sweep,
  }
}

/** Errors of direction and altitude carried into the declination, by the derivatives of sin δ. */
function declinationSd(inputs: SightlineInputs, altitude: number, altitudeSd: number): number {
  const step = 1e-3
  const at = (azimuth: number, h: number) => declinationDeg(azimuth, h, inputs.latitudeDeg)
  const { azimuthDeg } = inputs
  const perAzimuth = (at(azimuthDeg + step, altitude) - at(azimuthDeg - step, altitude)) / (2 * step)
  const perAltitude = (at(azimuthDeg, altitude + step) - at(azimuthDeg, altitude - step)) / (2 * step)
  return Math.hypot(
    perAzimuth * inputs.azimuthSdDeg,
    perAzimuth * inputs.northSdDeg,
    perAltitude * altitudeSd,
  )
}

function airOf({ refraction }: SightlineInputs): SightlineAudit['air'] {
  if (refraction.by === 'claim') return null
  const { pressureHpa, temperatureC, humidity, lapseKPerKm } = refraction.air
  return { pressure_hpa: pressureHpa, temperature_c: temperatureC, humidity, lapse_k_per_km: lapseKPerKm }
}

function driftOf(inputs: SightlineInputs, year: number): Drift | null {
  const perYear = driftDegPerYear(sightOf(inputs), year)
  if (perYear === null || perYear === 0) return null
  const arcminPerYear = perYear * 60
  const semidiameter = sunSemidiameter(year, inputs.event).arcmin
  return {
    arcmin_per_century: arcminPerYear * 100,
    cm_per_century: centimetres(arcminPerYear * 100, markerOf(inputs.lengthM)),
    sun_widths_per_millennium: sunWidths(Math.abs(arcminPerYear) * 1000, semidiameter, inputs.horizonDeg),
    years_per_arcmin: 1 / Math.abs(arcminPerYear),
  }
}

/** The Sun's declination may fall short of its extreme by so much that its azimuth moves by 1′. */
function dwellDays(inputs: SightlineInputs, year: number): number | null {
  const sight = sightOf(inputs)
  const declination = sight.declinationDeg(year)
  const crossing = horizonCrossing(declination, sight.altitudeDeg(year), inputs.latitudeDeg, inputs.at)
  if (crossing === null) return null
  const marginDeg = 1 / 60 / Math.abs(crossing.perDeclination)
  return solsticeDwellDays(year, inputs.event, Math.abs(declination), marginDeg)
}
