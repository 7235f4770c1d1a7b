import { DEG } from '../quantity/degrees.ts'
import type { StarPlace } from './star-place.ts'

/** Azimuth from true north, −180 to 180, eastward positive, and true altitude; degrees. */
export interface HorizontalPlace {
  azimuthDeg: number
  altitudeDeg: number
}

/** Where a star of a place of date stands at a local sidereal time, given as an angle in degrees, at a latitude. */
export function horizontalPlace(
  { raDeg, decDeg }: StarPlace,
  siderealDeg: number,
  latitudeDeg: number,
): HorizontalPlace {
  const hourAngle = (siderealDeg - raDeg) * DEG
  const [dec, phi] = [decDeg * DEG, latitudeDeg * DEG]
  const west = Math.cos(dec) * Math.sin(hourAngle)
  const north = Math.sin(dec) * Math.cos(phi) - Math.cos(dec) * Math.cos(hourAngle) * Math.sin(phi)
  const up = Math.sin(dec) * Math.sin(phi) + Math.cos(dec) * Math.cos(hourAngle) * Math.cos(phi)
  return {
    azimuthDeg: Math.atan2(-west, north) / DEG,
    altitudeDeg: Math.atan2(up, Math.hypot(west, north)) / DEG,
  }
}
