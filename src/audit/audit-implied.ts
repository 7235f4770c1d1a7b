import { nearestOffset } from '../inference/comparison.ts'
import { impliedDates, nearestApproach } from '../inference/implied-dates.ts'
import type { ObliquityModelName } from '../sky/obliquity-models.ts'
import type { Implied, ImpliedDate, NearestApproach } from './audit.ts'
import { widthAltitude } from './audit-sightline.ts'
import { YEARS_BEYOND_WINDOW } from './defaults.ts'
import { sunWidths } from './measures.ts'
import { computableStretch, sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { yardstickSemidiameterArcmin } from './sun-yardstick.ts'

interface Stretch {
  from: number
  to: number
}

/**
 * Every date at which the target stands on the line by one model, in the window and just outside it.
 *
 * @param yardstickYear Year whose Sun angles are told in, the same throughout an audit.
 */
export function auditImplied(
  line: SightlineInputs,
  model: ObliquityModelName,
  window: Stretch,
  presentYear: number,
  yardstickYear: number,
): Implied {
  const inputs = { ...line, model }
  const sight = sightOf(inputs)
  const span = computableStretch(model, window.from - YEARS_BEYOND_WINDOW, window.to + YEARS_BEYOND_WINDOW)
  const dates = impliedDates(sight, span.from, span.to).map(
    ({ year, interval95 }): ImpliedDate => ({
      year,
      low95: interval95?.[0] ?? null,
      high95: interval95?.[1] ?? null,
      in_window: window.from <= year && year <= window.to,
      future: year >= presentYear + 1,
    }),
  )
  const inWindow = dates.some((date) => date.in_window)
  return {
    sightline: line.name,
    model,
    dates,
    nearest_approach: inWindow
      ? null
      : approachOf(inputs, computableStretch(model, window.from, window.to), yardstickYear),
  }
}

function approachOf(inputs: SightlineInputs, { from, to }: Stretch, yardstickYear: number): NearestApproach {
  const sight = sightOf(inputs)
  const { year, offsetDeg } = nearestApproach(sight, from, to)
  const sd = nearestOffset(sight, year)?.sdDeg ?? null
  if (offsetDeg === null || sd === null)
    return { year, offset_arcmin: null, sd_arcmin: null, sun_widths: null }
  const semidiameter = yardstickSemidiameterArcmin(yardstickYear)
  return {
    year,
    offset_arcmin: offsetDeg * 60,
    sd_arcmin: sd * 60,
    sun_widths: sunWidths(Math.abs(offsetDeg) * 60, semidiameter, widthAltitude(inputs)),
  }
}
