import type { Claim, Sightline } from '../claim/claim.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { listed } from '../quantity/listed.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { choicesOf } from './choices-of.ts'
import type { Gap } from './gap.ts'
import { airGaps } from './gaps-of-air.ts'
import { directionGaps } from './gaps-of-direction.ts'
import { horizonGaps } from './gaps-of-horizon.ts'
import { gapsOfTarget } from './gaps-of-target.ts'
import { inBothLines } from './in-both-lines.ts'
import { readingsOf } from './readings-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { usesHorizon } from './uses-horizon.ts'

/** What one sightline leaves open, in the order of the claim file. */
export function gapsOfLine(claim: Claim, sightline: Sightline, inputs: SightlineInputs): Gap[] {
  const of = claim.sightlines.length > 1 ? ` of ${sightline.name}` : ''
  return [
    ...(usesHorizon(inputs) ? horizonGaps(claim, sightline, inputs, of) : []),
    ...choiceGaps(sightline, inputs, of),
    ...gapsOfTarget(inputs, of),
    ...directionGaps(claim, sightline, inputs, of),
    ...(inputs.target.body === 'two stars' ? [] : refractionGaps(claim, inputs, of)),
    modelGap(inputs),
  ]
}

function modelGap(inputs: SightlineInputs): Gap {
  const ofStars = inputs.target.body === 'star' || inputs.target.body === 'two stars'
  if (ofStars) {
    return {
      what: 'long-term model of precession',
      said: 'omitted',
      used: 'Vondrák, Capitaine & Wallace 2011',
      basis: 'the only one held here that is good for long times',
      change: {
        words: 'the short polynomials of IAU 2006 instead',
        of: (line) => [{ ...line, model: 'p03' }],
      },
    }
  }
  return {
    what: 'long-term model of the obliquity',
    said: 'omitted',
    used: 'Vondrák, Capitaine & Wallace 2011',
    basis: 'the most recent model for long times; half of its distance to Laskar 2004 is in the uncertainty',
    change: { words: 'Laskar 2004 instead', of: (line) => [{ ...line, model: 'laskar2004' }] },
  }
}

/** What of the target and of the things sighted the claim leaves open, each with the other readings of it. */
function choiceGaps(stated: Sightline, inputs: SightlineInputs, of: string): Gap[] {
  return choicesOf(stated, inputs).flatMap(({ choice, said, basis }) => {
    if (!isUnstated(said)) return []
    const readings = readingsOf(inputs).filter((reading) => reading.choice === choice)
    const own = readings.find(({ isOwn }) => isOwn)
    const others = readings.filter(({ isOwn }) => !isOwn)
    return own === undefined
      ? []
      : [
          {
            what: `${choice}${of}`,
            said,
            used: own.value,
            basis,
            change: {
              words: `${listed(others.map((reading) => reading.value))} instead`,
              of: () => others.map((reading) => reading.line),
            },
          },
        ]
  })
}

function refractionGaps(claim: Claim, inputs: SightlineInputs, of: string): Gap[] {
  const { atmosphere } = claim
  const scatter: Gap[] = isUnstated(atmosphere.refractionUncertaintyArcmin)
    ? [
        {
          what: `day-to-day scatter of refraction${of}`,
          said: atmosphere.refractionUncertaintyArcmin,
          used: `± ${formatArcmin(inputs.refractionSdArcmin)}`,
          basis:
            '9.6′ e^(−h/1°), at least 0.3′ and at most 9.6′: our choice, after Schaefer & Liller 1990 and Sampson et al. 2003',
          change: {
            words: 'refraction larger or smaller by that much',
            of: (line) =>
              [inputs.refractionSdArcmin, -inputs.refractionSdArcmin].map((refractionShiftArcmin) =>
                inBothLines(line, (own) => ({ ...own, refractionShiftArcmin })),
              ),
          },
        },
      ]
    : []
  return inputs.refraction.by === 'claim' ? scatter : [...scatter, ...airGaps(claim)]
}
