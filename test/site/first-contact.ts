import { DEG, wrap360 } from '../../src/quantity/degrees.ts'
import type { TrueSkyline } from '../../src/site/true-skyline.ts'
import { type Place, skylineDistance } from './skyline-distance.ts'

/** As near as this the disc touches, degrees. */
const TOUCH_DEG = 0.01 / 3600
export interface Contact {
  centreAzimuthDeg: number
  contactAzimuthDeg: number
  hourAngleDeg: number
}

/**
 * When a disc first stands on a skyline, by following the body: its hour angle goes on by as much as the disc is off
 * the skyline, which it cannot cross in less, with the distance to every bit of the skyline nearby. A setting runs
 * backwards in time. No parallax. Null where it is on the other side of the skyline at the start, or never gets there.
 */
export function firstContact(
  skyline: TrueSkyline,
  latitudeDeg: number,
  declinationDeg: number,
  aboveCentreDeg: number,
  at: 'rising' | 'setting',
): Contact | null {
  const look = skylineDistance(skyline)
  const sign = at === 'rising' ? 1 : -1
  const margin = Math.abs(aboveCentreDeg) * 1.05 + 1e-4
  const inside = (hourAngle: number) => {
    const turn = turnInto(skyline, placeAt(hourAngle, declinationDeg, latitudeDeg).azimuthDeg)
    return turn > margin && turn < widthOf(skyline) - margin
  }
  let hourAngle = -180 * sign
  while (!inside(hourAngle)) {
    hourAngle += 0.01 * sign
    if (Math.abs(hourAngle) > 180) return null
  }
  for (let isFirst = true; inside(hourAngle); isFirst = false) {
    const place = placeAt(hourAngle, declinationDeg, latitudeDeg)
    const { distanceDeg, nearestAzimuthDeg } = look(place)
    const gap = distanceDeg + aboveCentreDeg
    if (gap > -TOUCH_DEG) {
      if (isFirst) return null
      return {
        centreAzimuthDeg: place.azimuthDeg,
        contactAzimuthDeg: nearestAzimuthDeg,
        hourAngleDeg: hourAngle,
      }
    }
    hourAngle -= sign * gap
  }
  return null
}

function placeAt(hourAngleDeg: number, declinationDeg: number, latitudeDeg: number): Place {
  const [H, d, f] = [hourAngleDeg * DEG, declinationDeg * DEG, latitudeDeg * DEG]
  const north = Math.sin(d) * Math.cos(f) - Math.cos(d) * Math.cos(H) * Math.sin(f)
  const east = -Math.cos(d) * Math.sin(H)
  const up = Math.sin(d) * Math.sin(f) + Math.cos(d) * Math.cos(H) * Math.cos(f)
  return {
    azimuthDeg: wrap360(Math.atan2(east, north) / DEG),
    altitudeDeg: Math.atan2(up, Math.hypot(north, east)) / DEG,
  }
}

function turnInto({ nodes }: Pick<TrueSkyline, 'nodes'>, azimuthDeg: number): number {
  return wrap360(azimuthDeg - nodes[0].azimuthDeg)
}

function widthOf({ nodes }: TrueSkyline): number {
  return nodes.at(-1)!.azimuthDeg - nodes[0].azimuthDeg
}
