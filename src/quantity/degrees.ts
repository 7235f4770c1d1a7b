/** Radians in one degree, one arcminute and one arcsecond. */
export const DEG = Math.PI / 180
export const ARCMIN = DEG / 60
export const ARCSEC = DEG / 3600

/** The same direction, in degrees from −180 (included) to 180 (left out). */
export function wrap180(deg: number): number {
  return deg - 360 * Math.round(deg / 360)
}

/** The same direction, in degrees from 0 (included) to 360 (left out). */
export function wrap360(deg: number): number {
  const turned = deg % 360
  const positive = turned < 0 ? turned + 360 : turned
  return positive === 360 ? 0 : positive
}
