import { refractionArcmin } from '../site/refraction.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** Refraction at an apparent altitude, and how it changes with that altitude. */
export interface RefractionAt {
  arcmin: number
  perDegree: number
  /** Whether the parallax has been taken off it already. */
  lessParallax: boolean
}

export function refractionAt(inputs: SightlineInputs, altitudeDeg: number): RefractionAt {
  const { refraction, refractionShiftArcmin, latitudeDeg } = inputs
  if (refraction.by === 'claim')
    return { arcmin: refraction.arcmin + refractionShiftArcmin, perDegree: 0, lessParallax: true }
  const at = (altitude: number) => refractionArcmin(Math.min(90, altitude), refraction.air, latitudeDeg)
  return {
    arcmin: at(altitudeDeg) + refractionShiftArcmin,
    perDegree: (at(altitudeDeg + 0.05) - at(altitudeDeg - 0.05)) / 0.1,
    lessParallax: false,
  }
}

/** Refraction where the line meets its target. */
export function refractionAtHorizon(inputs: SightlineInputs): RefractionAt {
  return refractionAt(inputs, inputs.horizonDeg)
}
