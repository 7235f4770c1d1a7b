import type { Disc } from '../../claim/claim.ts'
import type { Uncertain } from '../../inference/horizon-branch.ts'
import { centreAltitudeDeg, horizonAboveCentreArcmin } from '../../site/centre-altitude.ts'
import { refractionAtHorizon } from '../refraction-at.ts'
import type { SightlineInputs } from '../sightline-inputs.ts'

/** Name of the error of the Moon's distance in the budget. */
export const MOON_DISTANCE = 'the Moon’s distance'

/** A body with a disc: half its width, and its horizontal parallax. */
export interface DiscBody {
  semidiameter: (year: number) => { arcmin: number; sdArcmin: number }
  parallaxArcsec: number
  /** Standard deviation of distance as a share of its mean, which parallax and width follow together. */
  nearnessSd: number
}

/** True altitude of the body's centre, year by year, when a part of its disc stands on the line's horizon. */
export function discAltitude(
  inputs: SightlineInputs,
  disc: Disc,
  body: DiscBody,
): (year: number) => Uncertain {
  const refraction = refractionAtHorizon(inputs)
  const parallax = refraction.lessParallax ? 0 : body.parallaxArcsec
  const horizonSd = inputs.horizonSdDeg * (1 - refraction.perDegree / 60)
  const ofDisc = errorsOfDisc(inputs, disc, body)
  return (year) => {
    const above = horizonAboveCentreArcmin(disc, body.semidiameter(year).arcmin)
    return {
      deg: centreAltitudeDeg(inputs.horizonDeg, refraction.arcmin, above, parallax),
      errors: [
        { source: 'altitude of the horizon', sdDeg: horizonSd },
        { source: 'refraction of the day', sdDeg: inputs.refractionSdArcmin / 60 },
        ...ofDisc(year),
      ],
    }
  }
}

/** Errors of the altitude that come of the body's size and distance. */
export function errorsOfDisc(
  inputs: SightlineInputs,
  disc: Disc,
  body: DiscBody,
): (year: number) => Uncertain['errors'] {
  const parallax = inputs.refraction.by === 'claim' ? 0 : body.parallaxArcsec
  return (year) => {
    const { arcmin, sdArcmin } = body.semidiameter(year)
    const nearness = (parallax / 60 - horizonAboveCentreArcmin(disc, arcmin)) * body.nearnessSd
    return [
      ...(sdArcmin > 0 ? [{ source: 'the Sun’s size', sdDeg: sdArcmin / 60 }] : []),
      ...(nearness !== 0 ? [{ source: MOON_DISTANCE, sdDeg: nearness / 60 }] : []),
    ]
  }
}
