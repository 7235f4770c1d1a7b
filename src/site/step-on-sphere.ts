import { DEG } from '../quantity/degrees.ts'

/**
 * The point at an angular distance from another in a bearing, the bearing from the zenith through growing azimuth:
 * sin h′ = sin h cos r + cos h sin r cos θ, tan ΔA = sin θ sin r cos h/(cos r − sin h sin h′). All in degrees.
 */
export function stepOnSphere(
  azimuthDeg: number,
  altitudeDeg: number,
  bearingDeg: number,
  distanceDeg: number,
): { azimuthDeg: number; altitudeDeg: number } {
  const h = altitudeDeg * DEG
  const r = distanceDeg * DEG
  const theta = bearingDeg * DEG
  const sine = Math.sin(h) * Math.cos(r) + Math.cos(h) * Math.sin(r) * Math.cos(theta)
  const turn = Math.atan2(Math.sin(theta) * Math.sin(r) * Math.cos(h), Math.cos(r) - Math.sin(h) * sine)
  return { azimuthDeg: azimuthDeg + turn / DEG, altitudeDeg: Math.asin(Math.min(1, sine)) / DEG }
}
