import { wrap360 } from '../quantity/degrees.ts'
import { altitudeRangeDeg } from './horizontal.ts'
import { monotoneRuns } from './monotone-runs.ts'
import { sightedPassing } from './sighted-passing.ts'
import { between, type Passing, type SkylinePath, type SkylineSighting, skylinePath } from './skyline-path.ts'
import type { TrueSkyline } from './true-skyline.ts'

/** Where a body meets a skyline; degrees. */
export type SkylineCrossing =
  | {
      kind: 'crossing'
      /** Of what is sighted: of the gleam where the skyline stands above the disc's centre, else of that centre. */
      azimuthDeg: number
      centreAzimuthDeg: number
      /** Geocentric and true. */
      centreAltitudeDeg: number
      contactAzimuthDeg: number
      /** Change of `azimuthDeg` for each degree of declination. */
      perDeclination: number
    }
  /** If it happens, then where the skyline is not known. */
  | { kind: 'outside profile' }
  /** The body stays above all of the skyline that is known, or below it. */
  | { kind: 'never' }

export interface SkylineCrossings {
  crossing: (declinationDeg: number) => SkylineCrossing
}

/**
 * Where bodies rise or set over a skyline that need be neither level nor smooth, by their declination.
 *
 * All places of the disc's centre at which the disc stands on the skyline are one line, the same for every body. A
 * body of declination δ passes that line where δ = asin(sin φ sin h + cos φ cos h cos A): upwards where that falls
 * clockwise along the line, downwards where it grows, in both hemispheres. It rises at the first of these passings
 * after its lower culmination, and sets at the last before the next. Where the first one leads downwards, it had
 * risen before it came to the profile.
 *
 * A level skyline gives what horizonCrossing gives with centreAltitudeDeg. Good to 1″ of azimuth where the body
 * crosses the skyline by more than a few degrees of slope; where it all but slides along it, any error grows.
 * @throws RangeError on an impossible number, and where the skyline is no wider than the disc.
 */
export function skylineCrossings(skyline: TrueSkyline, sighting: SkylineSighting): SkylineCrossings {
  check(sighting)
  const path = skylinePath(skyline, sighting)
  const runs = monotoneRuns(path.declinations)
  const crossing = (declination: number): SkylineCrossing => {
    if (!(Math.abs(declination) <= 90))
      throw new RangeError(`a declination is from −90° to 90°, got ${declination}`)
    const passing = sightedPassing(path, runs, declination, sighting, skyline.isClosed)
    if (passing !== null) return crossingAt(path, passing, sighting)
    const { low, high } = altitudeRangeDeg(declination, sighting.latitudeDeg)
    const misses = skyline.isClosed || high < path.lowestDeg || low > path.highestDeg
    return { kind: misses ? 'never' : 'outside profile' }
  }
  return { crossing }
}

function crossingAt(
  path: SkylinePath,
  passing: Passing,
  { aboveCentreArcmin }: SkylineSighting,
): SkylineCrossing {
  const sighted = aboveCentreArcmin > 0 ? path.contacts : path.azimuths
  return {
    kind: 'crossing',
    azimuthDeg: wrap360(between(sighted, passing)),
    centreAzimuthDeg: wrap360(between(path.azimuths, passing)),
    centreAltitudeDeg: between(path.altitudes, passing),
    contactAzimuthDeg: wrap360(between(path.contacts, passing)),
    perDeclination: stepAt(sighted, passing) / stepAt(path.declinations, passing),
  }
}

function stepAt(values: Float64Array, { index }: Passing): number {
  return values[index + 1]! - values[index]!
}

function check({
  latitudeDeg,
  aboveCentreArcmin,
  parallaxArcsec,
  skylineShiftDeg = 0,
}: SkylineSighting): void {
  if (!(Math.abs(latitudeDeg) <= 90))
    throw new RangeError(`a latitude is from −90° to 90°, got ${latitudeDeg}`)
  if (!(Math.abs(aboveCentreArcmin) <= 60))
    throw new RangeError(`a skyline stands 60′ at most from a disc's centre, got ${aboveCentreArcmin}′`)
  if (!(parallaxArcsec >= 0 && parallaxArcsec <= 7200))
    throw new RangeError(`a parallax is from 0″ to 7200″, got ${parallaxArcsec}″`)
  if (!(Math.abs(skylineShiftDeg) <= 5))
    throw new RangeError(`a skyline is raised or lowered by 5° at most, got ${skylineShiftDeg}°`)
}
