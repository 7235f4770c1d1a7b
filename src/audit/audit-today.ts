import { nearestOffset } from '../inference/comparison.ts'
import type { Today } from './audit.ts'
import { widthAltitude } from './audit-sightline.ts'
import { centimetres, markerOf, sunWidths } from './measures.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { yardstickSemidiameterArcmin } from './sun-yardstick.ts'

/** How far the line is from its target in the year the audit was made. */
export function auditToday(inputs: SightlineInputs, year: number): Today {
  const nearest = nearestOffset(sightOf(inputs), year)
  if (nearest === null) {
    return {
      sightline: inputs.name,
      year,
      direction_deg: null,
      offset_arcmin: null,
      sun_widths: null,
      offset_cm: null,
    }
  }
  const offset = nearest.offsetDeg * 60
  return {
    sightline: inputs.name,
    year,
    direction_deg: nearest.directionDeg,
    offset_arcmin: offset,
    sun_widths: sunWidths(Math.abs(offset), yardstickSemidiameterArcmin(year), widthAltitude(inputs)),
    offset_cm: centimetres(Math.abs(offset), markerOf(inputs.lengthM)),
  }
}
