import type { PhrasingContent } from 'mdast'
import type { Audit, SightlineAudit } from '../../audit/audit.ts'
import { listed } from '../../quantity/listed.ts'
import { widestDifference } from '../figures/track-curves.ts'
import { layTrack } from '../figures/track-layout.ts'
import { trackRange } from '../figures/track-range.ts'
import { isNeverSeen, yearsOutOfReach } from '../figures/track-reach.ts'
import { type TrackSource, trackSource } from '../figures/track-source.ts'
import { phrasing, strong } from '../nodes.ts'
import { noEvent } from '../wording/no-event.ts'

/** Tells a reader how to read the track of one sightline's target. */
export function trackCaption(audit: Audit, line: SightlineAudit): PhrasingContent[] {
  const source = trackSource(audit, line.name)
  const sentences = isNeverSeen(source)
    ? [`Nowhere: in all these years, hatched, there is ${noEvent(line)}. The band is the line as measured.`]
    : [
        curves(source),
        second(audit, source),
        part(source),
        yearsOutOfReach(source).length === 0 ? '' : `Hatched: years with ${noEvent(line)}.`,
        meetings(source),
      ]
  return phrasing([
    strong(`Where the target of ${line.name} stood over time.`),
    ` ${sentences.filter((sentence) => sentence !== '').join(' ')}`,
  ])
}

function curves({ tracks, sightline }: TrackSource): string {
  const several = tracks.length > 1
  const branches = tracks.flatMap(({ branch_words }) => branch_words ?? [])
  return [
    `The ${several ? 'curves are' : 'curve is'} the ${sightline.measures} of ${whatEvent(sightline)}, `,
    sightline.body === 'moon' ? 'as it would be in each year' : 'year by year',
    branches.length > 1 ? ` (${listed(branches)})` : '',
    `; the pale ground about ${several ? 'them' : 'it'} is one standard deviation of all errors but the builders’ own, `,
    'the band the line as measured.',
  ].join('')
}

function whatEvent({ body, measures, event }: SightlineAudit): string {
  return body === 'sun' && measures === 'altitude' ? `the Sun at ${event}` : `the ${event}`
}

function second(audit: Audit, source: TrackSource): string {
  const { seconds, sightline } = source
  if (seconds.length === 0) return ''
  const ofStars = sightline.body === 'star' || sightline.body === 'two stars'
  const what = `a second model of ${ofStars ? 'precession' : 'the Earth’s tilt'}`
  return widestDifference(source, layTrack(audit, source).plot) === null
    ? `In the years that it covers, ${what} gives the same to the eye.`
    : `Broken: by ${what}, over the years that it covers.`
}

function part(source: TrackSource): string {
  const { isCut, whole } = trackRange(source)
  if (!isCut) return ''
  return `Only the part about the line is drawn; the whole course spans ${Math.round(whole[1] - whole[0])}°.`
}

function meetings(source: TrackSource): string {
  const { implied, sightline } = source
  if ((implied?.dates.length ?? 0) > 0) {
    return `A full dot marks a date that fits, an open one a date still to come.${whyMany(sightline)}`
  }
  const nearest = implied?.nearest_approach ?? null
  const isNear =
    nearest?.offset_arcmin != null &&
    nearest.sd_arcmin !== null &&
    Math.abs(nearest.offset_arcmin) <= 2 * nearest.sd_arcmin
  return isNear
    ? 'They do not cross, but come within those errors of each other.'
    : 'They do not cross: no date fits.'
}

function whyMany({ body, event }: SightlineAudit): string {
  if (body === 'star' || body === 'two stars') {
    return ' Precession goes round in about 26,000 years, so one line may have several dates.'
  }
  return body === 'moon' || / solstice /.test(event)
    ? ' The Earth’s tilt swings to and fro, so one line may have several dates.'
    : ''
}
