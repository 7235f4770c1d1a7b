import type { Uncertain } from '../../inference/horizon-branch.ts'
import type { Branch } from '../../inference/sight.ts'
import { DEG } from '../../quantity/degrees.ts'
import { refractionAtHorizon } from '../refraction-at.ts'
import type { SightlineInputs } from '../sightline-inputs.ts'

/** A body on the meridian. */
export interface MeridianTarget {
  culmination: 'upper' | 'lower'
  declination: (year: number) => Uncertain | null
  /** How far the part of the disc that was measured stands above the centre, arcminutes. */
  aboveCentreArcmin: (year: number) => number
  parallaxArcsec: number
}

/** The apparent altitude of a body on the meridian, year by year; null where it is below the horizon then. */
export function meridianBranch(inputs: SightlineInputs, target: MeridianTarget): Branch {
  const refraction = refractionAtHorizon(inputs)
  const parallax = refraction.lessParallax ? 0 : target.parallaxArcsec
  const apparent = (year: number) => {
    const declination = target.declination(year)
    if (declination === null) return null
    const { deg, per } = meridianAltitude(target.culmination, declination.deg, inputs.latitudeDeg)
    const topocentric = deg - (parallax / 3600) * Math.cos(deg * DEG)
    const directionDeg = topocentric + (refraction.arcmin + target.aboveCentreArcmin(year)) / 60
    return { directionDeg, per, errors: declination.errors }
  }
  return {
    predict: (year) => {
      const seen = apparent(year)
      if (seen === null || seen.directionDeg < 0) return null
      return {
        directionDeg: seen.directionDeg,
        errors: [
          { source: 'refraction of the day', effectDeg: inputs.refractionSdArcmin / 60, shared: false },
          ...seen.errors.map(({ source, sdDeg, shared }) => ({
            source,
            effectDeg: seen.per * sdDeg,
            shared: shared === true,
          })),
        ],
      }
    },
    shortfallDeg: (year) => {
      const seen = apparent(year)
      return seen === null ? null : Math.max(0, -seen.directionDeg)
    },
  }
}

/** True altitude on the meridian, degrees, and its change with the declination. */
function meridianAltitude(culmination: 'upper' | 'lower', declination: number, latitudeDeg: number) {
  if (culmination === 'upper') {
    return { deg: 90 - Math.abs(latitudeDeg - declination), per: declination < latitudeDeg ? 1 : -1 }
  }
  return { deg: Math.abs(latitudeDeg + declination) - 90, per: Math.sign(latitudeDeg + declination) }
}
