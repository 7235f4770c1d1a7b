import { nearestOffset } from '../inference/comparison.ts'
import type { SkyPlace } from '../sky/sky-place.ts'
import type { Today } from './audit.ts'
import { widthAltitude } from './audit-sightline.ts'
import { centimetres, markerOf, sunWidths } from './measures.ts'
import { nextChance } from './next-chance.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { yardstickSemidiameterArcmin } from './sun-yardstick.ts'

/**
 * How far the line is from its target in the year the audit was made, and when it is next to be seen.
 *
 * @param yardstickYear Year whose Sun angles are told in, the same throughout an audit.
 */
export function auditToday(
  inputs: SightlineInputs,
  place: SkyPlace,
  now: Date,
  yardstickYear: number,
): Today {
  const year = now.getUTCFullYear()
  const { next, reason } = nextChance(inputs, place, now)
  const nearest = nearestOffset(sightOf(inputs), year)
  if (nearest === null) {
    return {
      sightline: inputs.name,
      year,
      direction_deg: null,
      offset_arcmin: null,
      sun_widths: null,
      offset_cm: null,
      next,
      next_reason: reason,
    }
  }
  const offset = nearest.offsetDeg * 60
  return {
    sightline: inputs.name,
    year,
    direction_deg: nearest.directionDeg,
    offset_arcmin: offset,
    sun_widths: sunWidths(
      Math.abs(offset),
      yardstickSemidiameterArcmin(yardstickYear),
      widthAltitude(inputs),
    ),
    offset_cm: inputs.measures === 'angle' ? null : centimetres(Math.abs(offset), markerOf(inputs.lengthM)),
    next,
    next_reason: reason,
  }
}
