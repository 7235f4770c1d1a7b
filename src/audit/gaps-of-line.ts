import type { Claim, Disc, Sightline } from '../claim/claim.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { isUnstated } from '../quantity/unstated.ts'
import type { Gap } from './gap.ts'
import { airGaps } from './gaps-of-air.ts'
import { directionGaps } from './gaps-of-direction.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** What one sightline leaves open, in the order of the claim file. */
export function gapsOfLine(claim: Claim, sightline: Sightline, inputs: SightlineInputs): Gap[] {
  const of = claim.sightlines.length > 1 ? ` of ${sightline.name}` : ''
  return [
    ...horizonGaps(sightline, inputs, of),
    ...discGap(sightline, inputs, of),
    ...directionGaps(claim, sightline, inputs, of),
    ...refractionGaps(claim, inputs, of),
    {
      what: `long-term model of the obliquity${of}`,
      said: 'omitted',
      used: 'Vondrák, Capitaine & Wallace 2011',
      basis:
        'the most recent model for long times; half of its distance to Laskar 2004 is in the uncertainty',
      change: { words: 'Laskar 2004 instead', of: (line) => [{ ...line, model: 'laskar2004' }] },
    },
  ]
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

const PARTS: readonly Disc[] = [{ part: 'upper limb' }, { part: 'centre' }, { part: 'lower limb' }]

function discGap({ target }: Sightline, inputs: SightlineInputs, of: string): Gap[] {
  if (!isUnstated(target.disc)) return []
  const others = PARTS.filter(({ part }) => part !== inputs.disc.part)
  return [
    {
      what: `part of the Sun’s disc on the horizon${of}`,
      said: target.disc,
      used: inputs.disc.part,
      basis: 'the first or last gleam, the moment easiest to see; our choice',
      change: {
        words: 'the centre or the lower limb instead',
        of: (line) => others.map((disc) => ({ ...line, disc })),
      },
    },
  ]
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
            '9.6′ e^(−h/1°), at least 0.3′: our choice, after Schaefer & Liller 1990 and Sampson et al. 2003',
          change: {
            words: 'refraction larger or smaller by that much',
            of: (line) => [
              { ...line, horizonDeg: line.horizonDeg + inputs.refractionSdArcmin / 60 },
              { ...line, horizonDeg: line.horizonDeg - inputs.refractionSdArcmin / 60 },
            ],
          },
        },
      ]
    : []
  return inputs.refraction.by === 'claim' ? scatter : [...scatter, ...airGaps(claim, of)]
}
