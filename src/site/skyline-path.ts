import { DEG, wrap360 } from '../quantity/degrees.ts'
import { centreAltitudeDeg } from './centre-altitude.ts'
import { type DiscPlace, discPath } from './disc-path.ts'
import { declinationDeg } from './horizontal.ts'
import type { TrueSkyline } from './true-skyline.ts'

/** How a disc is sighted on a skyline, from where. */
export interface SkylineSighting {
  latitudeDeg: number
  at: 'rising' | 'setting'
  /** How far the skyline stands above the disc's centre where the two touch, arcminutes (horizonAboveCentreArcmin). */
  aboveCentreArcmin: number
  /** Horizontal parallax. */
  parallaxArcsec: number
  /** By how much the whole skyline is raised, degrees. */
  skylineShiftDeg?: number
}

/** Where the disc's centre stands when the disc stands on the skyline, clockwise, and its declination there; degrees. */
export interface SkylinePath {
  azimuths: Float64Array
  /** Geocentric and true. */
  altitudes: Float64Array
  contacts: Float64Array
  declinations: Float64Array
  /** Altitudes that the whole of it keeps between, those left out included. */
  lowestDeg: number
  highestDeg: number
}

/** A point of the path: after which of its places, and what share of the way to the next. */
export interface Passing {
  index: number
  share: number
}

/**
 * The path of a disc's centre along a skyline, with the declination a body has in each place. Of a profile that runs
 * through the azimuth of lower culmination, only the part that belongs to the sighting's half of the day.
 * @throws RangeError where the skyline is no wider than the disc.
 */
export function skylinePath(skyline: TrueSkyline, sighting: SkylineSighting): SkylinePath {
  const { latitudeDeg, aboveCentreArcmin, parallaxArcsec, skylineShiftDeg = 0 } = sighting
  const nodes = skyline.nodes.map(({ azimuthDeg, altitudeDeg }) => ({
    azimuthDeg,
    altitudeDeg: altitudeDeg + skylineShiftDeg,
  }))
  const whole = discPath({ nodes, isClosed: skyline.isClosed }, aboveCentreArcmin / 60).map((place) => ({
    ...place,
    altitudeDeg: centreAltitudeDeg(place.altitudeDeg, 0, 0, parallaxArcsec),
  }))
  if (whole.length < 2) throw new RangeError('the skyline is no wider than the disc; give more of it')
  const places = skyline.isClosed ? whole : sinceLowerCulmination(whole, sighting)
  return {
    azimuths: Float64Array.from(places, (place) => place.azimuthDeg),
    altitudes: Float64Array.from(places, (place) => place.altitudeDeg),
    contacts: Float64Array.from(places, (place) => place.contactAzimuthDeg),
    declinations: Float64Array.from(places, (place) =>
      declinationDeg(place.azimuthDeg, place.altitudeDeg, latitudeDeg),
    ),
    lowestDeg: whole.reduce((low, place) => Math.min(low, place.altitudeDeg), 90),
    highestDeg: whole.reduce((high, place) => Math.max(high, place.altitudeDeg), -90),
  }
}

/** Hour angle at a point of the path, radians, from −π at lower culmination to π at the next. */
export function hourAngleAt(path: SkylinePath, passing: Passing, latitudeDeg: number): number {
  const a = between(path.azimuths, passing) * DEG
  const h = between(path.altitudes, passing) * DEG
  const phi = latitudeDeg * DEG
  return Math.atan2(
    -Math.sin(a) * Math.cos(h),
    Math.sin(h) * Math.cos(phi) - Math.cos(h) * Math.cos(a) * Math.sin(phi),
  )
}

/** A quantity of the path at a point of it. */
export function between(values: Float64Array, { index, share }: Passing): number {
  return values[index]! + share * (values[index + 1]! - values[index]!)
}

/**
 * A rising body starts at lower culmination and goes on, clockwise in the north. What of the profile lies behind it
 * comes at the end of its day, after a stretch of which nothing is known. A setting body ends there.
 */
function sinceLowerCulmination(
  places: readonly DiscPlace[],
  { latitudeDeg, at }: SkylineSighting,
): readonly DiscPlace[] {
  const isNorth = latitudeDeg >= 0
  const start = places[0]!.azimuthDeg
  const culmination = start + wrap360((isNorth ? 0 : 180) - start)
  if (culmination === start || culmination >= places.at(-1)!.azimuthDeg) return places
  const goesOn = isNorth === (at === 'rising')
  return places.filter(({ azimuthDeg }) => (goesOn ? azimuthDeg >= culmination : azimuthDeg <= culmination))
}
