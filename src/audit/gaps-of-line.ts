import type { Claim, Sightline } from '../claim/claim.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { listed } from '../quantity/listed.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { choicesOf } from './choices-of.ts'
import type { Gap } from './gap.ts'
import { airGaps } from './gaps-of-air.ts'
import { directionGaps } from './gaps-of-direction.ts'
import { gapsOfTarget } from './gaps-of-target.ts'
import { readingsOf } from './readings-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { usesHorizon } from './uses-horizon.ts'

/** What one sightline leaves open, in the order of the claim file. */
export function gapsOfLine(claim: Claim, sightline: Sightline, inputs: SightlineInputs): Gap[] {
  const of = claim.sightlines.length > 1 ? ` of ${sightline.name}` : ''
  return [
    ...(usesHorizon(inputs) ? horizonGaps(sightline, inputs, of) : []),
    ...targetGaps(sightline, inputs, of),
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

function horizonGaps({ horizonDeg: horizon }: Sightline, inputs: SightlineInputs, of: string): Gap[] {
  const either = (line: SightlineInputs) => [
    { ...line, horizonDeg: line.horizonDeg + line.horizonSdDeg },
    { ...line, horizonDeg: line.horizonDeg - line.horizonSdDeg },
  ]
  const sd = formatArcmin(inputs.horizonSdDeg * 60)
  if (isUnstated(horizon)) {
    return [
      {
        what: `altitude of the horizon${of}`,
        said: horizon,
        used: `level, 0° ± ${sd}`,
        basis: 'a level horizon, widened for hills that nobody measured; our choice',
        change: { words: `a horizon ${sd} higher or lower`, of: either },
      },
    ]
  }
  if (!isUnstated(horizon.sd)) return []
  return [
    {
      what: `uncertainty of the horizon’s altitude${of}`,
      said: horizon.sd,
      used: `± ${sd}`,
      basis: 'a careful reading with a theodolite or clinometer of a clear skyline; our choice',
      change: { words: `a horizon ${sd} higher or lower`, of: either },
    },
  ]
}

/** What of the target the claim leaves open, each with the other readings of it. */
function targetGaps({ target: stated }: Sightline, inputs: SightlineInputs, of: string): Gap[] {
  return choicesOf(stated).flatMap(({ choice, said, basis }) => {
    if (!isUnstated(said)) return []
    const readings = readingsOf(inputs.target).filter((reading) => reading.choice === choice)
    const own = readings.find((reading) => reading.target === inputs.target)
    const others = readings.filter((reading) => reading.target !== inputs.target)
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
              of: (line: SightlineInputs) => others.map(({ target }) => ({ ...line, target })),
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
            of: (line) => [
              { ...line, refractionShiftArcmin: inputs.refractionSdArcmin },
              { ...line, refractionShiftArcmin: -inputs.refractionSdArcmin },
            ],
          },
        },
      ]
    : []
  return inputs.refraction.by === 'claim' ? scatter : [...scatter, ...airGaps(claim)]
}
