import type { Disc } from '../claim/claim.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { formatCm } from '../quantity/format-length.ts'
import { formatNumber } from '../quantity/format-number.ts'

/** `upper limb on the horizon`. */
export function discWords(disc: Disc): string {
  if (disc.part === 'showing') return `${formatArcmin(disc.showingArcmin)} of the disc showing`
  return `${disc.part} on the horizon`
}

/** `12′ (35 cm at 100 m, 0.38 of the Sun’s width)`: one angle in the three measures that readers picture. */
export function inThreeMeasures(arcmin: number, cm: number, distanceM: number, sunWidths: number): string {
  const place = `${formatCm(cm)} at ${formatNumber(distanceM, 3)} m`
  return `${formatArcmin(arcmin)} (${place}, ${widthsInWords(sunWidths)})`
}

/** `0.38 of the Sun’s width`. */
export function widthsInWords(sunWidths: number): string {
  const figure = formatNumber(sunWidths, 2)
  return sunWidths < 1.05 ? `${figure} of the Sun’s width` : `${figure} times the Sun’s width`
}
