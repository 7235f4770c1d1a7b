import { DEG } from '../quantity/degrees.ts'

/**
 * Refraction at an apparent altitude, arcminutes, by Bennett's formula: the check on the ray trace.
 *
 * @param apparentAltitudeDeg From 0° to 90°; good to 0.07′ for 1010 hPa and 10 °C.
 * Source: Bennett 1982, Journal of Navigation 35, 255, scaled by P/1010 · 283/(273 + t).
 */
export function bennettRefractionArcmin(
  apparentAltitudeDeg: number,
  temperatureC: number,
  pressureHpa: number,
): number {
  const h = apparentAltitudeDeg
  const standard = 1 / Math.tan((h + 7.31 / (h + 4.4)) * DEG)
  return standard * (pressureHpa / 1010) * (283 / (273 + temperatureC))
}
