import { targetAzimuthDeg } from '../inference/comparison.ts'
import { wrap180 } from '../quantity/degrees.ts'
import { sunSemidiameter } from '../sky/sun.ts'
import type { Today } from './audit.ts'
import { centimetres, markerOf, sunWidths } from './measures.ts'
import { type SightlineInputs, sightOf } from './sightline-inputs.ts'

/** How far the line is from its target in the year the audit was made. */
export function auditToday(inputs: SightlineInputs, year: number): Today {
  const azimuth = targetAzimuthDeg(sightOf(inputs), year)
  if (azimuth === null) {
    return {
      sightline: inputs.name,
      year,
      azimuth_deg: null,
      offset_arcmin: null,
      sun_widths: null,
      offset_cm: null,
    }
  }
  const offset = wrap180(inputs.azimuthDeg - azimuth) * 60
  return {
    sightline: inputs.name,
    year,
    azimuth_deg: azimuth,
    offset_arcmin: offset,
    sun_widths: sunWidths(Math.abs(offset), sunSemidiameter(year, inputs.event).arcmin, inputs.horizonDeg),
    offset_cm: centimetres(Math.abs(offset), markerOf(inputs.lengthM)),
  }
}
