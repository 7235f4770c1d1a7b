import type { Branch } from '../../inference/sight.ts'
import type { ObliquityModelName } from '../../sky/obliquity-models.ts'
import type { SightlineInputs } from '../sightline-inputs.ts'
import type { CentreOnSkyline } from './known-skyline.ts'
import { moonTarget } from './moon.ts'
import { solsticeSpanTarget } from './solstice-span.ts'
import { starTarget } from './star.ts'
import { starPairTarget } from './star-pair.ts'
import { sunTarget } from './sun.ts'

/** What an audit asks of a target, whatever body it is. */
export interface TargetModel {
  /** Such as `June solstice sunrise`: fits `the … of about 2000 BCE` and `the … stood 3′ to the left`. */
  event: string
  /** The same with what else is settled, such as `June solstice sunrise, upper limb on the horizon`. */
  description: string
  branches: readonly Branch[]
  /** Declination of the body's centre in a year by the inputs' model, degrees; null where it has none. */
  declinationDeg: (year: number) => number | null
  /** True altitude of the body's centre where the line meets it, degrees; null likewise. */
  altitudeDeg: (year: number) => { deg: number; sdDeg: number } | null
  /** Where its centre stands when it is sighted on the line, over a skyline known to both sides; null where that is level. */
  onLine: ((year: number) => CentreOnSkyline | null) | null
  /** Apparent altitude at which it is seen where that is not the line's own; null where it is. */
  seenAt: { deg: number; sdDeg: number } | null
  /** Half the width of the body's disc; null for a star. */
  semidiameter: (year: number) => { arcmin: number; sdArcmin: number } | null
  /** The models that this target's dates can be had from. */
  models: readonly ObliquityModelName[]
  /** Sentences about how such a target moves or comes back, at a year. */
  notes: (year: number) => string[]
  /** Sentences about what is doubtful of this body. */
  warnings: readonly string[]
}

export function targetModel(inputs: SightlineInputs): TargetModel {
  const { target } = inputs
  switch (target.body) {
    case 'sun':
      return sunTarget(inputs, target)
    case 'sun at both solstices':
      return solsticeSpanTarget(inputs, target)
    case 'moon':
      return moonTarget(inputs, target)
    case 'star':
      return starTarget(inputs, target)
    case 'two stars':
      return starPairTarget(inputs, target)
  }
}
