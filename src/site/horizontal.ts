import { DEG } from '../quantity/degrees.ts'

/** How a body's azimuth answers small changes of its altitude and declination; degrees per degree. */
export interface HorizonCrossing {
  /** From true north through east, degrees, 0 to 360. */
  azimuthDeg: number
  perAltitude: number
  perDeclination: number
}

/**
 * Declination of a body at an azimuth and a true altitude, degrees: sin δ = sin φ sin h + cos φ cos h cos A.
 * All angles in degrees.
 */
export function declinationDeg(azimuthDeg: number, altitudeDeg: number, latitudeDeg: number): number {
  const a = azimuthDeg * DEG
  const h = altitudeDeg * DEG
  const phi = latitudeDeg * DEG
  const sine = Math.sin(phi) * Math.sin(h) + Math.cos(phi) * Math.cos(h) * Math.cos(a)
  return Math.asin(Math.min(1, Math.max(-1, sine))) / DEG
}

/**
 * Where a body of a declination rises or sets through a true altitude: cos A = (sin δ − sin φ sin h)/(cos φ cos h).
 * All angles in degrees. Null where it never crosses that altitude at that latitude, or only grazes it.
 * Near azimuth 0° and 180° the derivatives grow without bound.
 */
export function horizonCrossing(
  declination: number,
  altitudeDeg: number,
  latitudeDeg: number,
  at: 'rising' | 'setting',
): HorizonCrossing | null {
  const delta = declination * DEG
  const h = altitudeDeg * DEG
  const phi = latitudeDeg * DEG
  const scale = Math.cos(phi) * Math.cos(h)
  const cosine = (Math.sin(delta) - Math.sin(phi) * Math.sin(h)) / scale
  if (!(Math.abs(cosine) < 1)) return null
  const eastward = Math.acos(cosine)
  const sine = Math.sin(eastward)
  const sign = at === 'rising' ? 1 : -1
  return {
    azimuthDeg: at === 'rising' ? eastward / DEG : 360 - eastward / DEG,
    perDeclination: (-sign * Math.cos(delta)) / (scale * sine),
    perAltitude: (sign * (Math.sin(phi) - Math.sin(delta) * Math.sin(h))) / (scale * Math.cos(h) * sine),
  }
}

/**
 * ∂δ/∂h: what a degree of true altitude does to the declination at one azimuth, degrees per degree. It is the cosine of
 * the parallactic angle, (sin φ − sin δ sin h)/(cos δ cos h), and so from −1 to 1. All angles in degrees; a body at a
 * pole or in the zenith has no such angle.
 */
export function declinationPerAltitude(
  declination: number,
  altitudeDeg: number,
  latitudeDeg: number,
): number {
  const delta = declination * DEG
  const h = altitudeDeg * DEG
  const phi = latitudeDeg * DEG
  return (Math.sin(phi) - Math.sin(delta) * Math.sin(h)) / (Math.cos(delta) * Math.cos(h))
}

/** True altitudes between which a body of a declination moves in a day at a latitude; all in degrees. */
export function altitudeRangeDeg(declination: number, latitudeDeg: number): { low: number; high: number } {
  return { low: Math.abs(latitudeDeg + declination) - 90, high: 90 - Math.abs(latitudeDeg - declination) }
}
