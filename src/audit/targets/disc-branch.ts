import type { Disc } from '../../claim/claim.ts'
import { horizonBranch, type Uncertain } from '../../inference/horizon-branch.ts'
import type { Branch } from '../../inference/sight.ts'
import { horizonAboveCentreArcmin } from '../../site/centre-altitude.ts'
import type { SightlineInputs } from '../sightline-inputs.ts'
import { type DiscBody, discAltitude, errorsOfDisc } from './disc-altitude.ts'
import { placeOnLine } from './place-on-line.ts'
import { skylineBranch } from './skyline-branch.ts'
import type { TargetModel } from './target-model.ts'

/** A body with a disc that rises or sets. */
export interface DiscTarget {
  at: 'rising' | 'setting'
  disc: Disc
  body: DiscBody
  declination: (year: number) => Uncertain | null
}

/** The course of a disc that rises or sets, over a level horizon or over the line's skyline. */
export function discBranch(inputs: SightlineInputs, { at, disc, body, declination }: DiscTarget): Branch {
  if (inputs.horizon.nodes === null) {
    const altitude = discAltitude(inputs, disc, body)
    return horizonBranch({ latitudeDeg: inputs.latitudeDeg, at, altitude, declination })
  }
  return skylineBranch(inputs, {
    declination,
    altitudeErrors: errorsOfDisc(inputs, disc, body),
    ...onSkyline({ at, disc, body }),
  })
}

/** Where the centre of a disc stands when it is sighted on the line itself; null where the line's horizon is level. */
export function discOnLine(
  inputs: SightlineInputs,
  target: Omit<DiscTarget, 'declination'>,
): TargetModel['onLine'] {
  return inputs.horizon.nodes === null ? null : placeOnLine(inputs, onSkyline(target))
}

function onSkyline({ at, disc, body }: Omit<DiscTarget, 'declination'>) {
  return {
    at,
    parallaxArcsec: body.parallaxArcsec,
    aboveCentreArcmin: (year: number) => horizonAboveCentreArcmin(disc, body.semidiameter(year).arcmin),
    seenFrom: null,
  }
}
