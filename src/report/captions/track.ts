import type { PhrasingContent } from 'mdast'
import type { Audit, SightlineAudit } from '../../audit/audit.ts'
import { phrasing, strong } from '../nodes.ts'
import { impliedByOwnModel } from '../wording/implied-by-own-model.ts'

/** Tells a reader how to read the track of one sightline's target. */
export function trackCaption(audit: Audit, line: SightlineAudit): PhrasingContent[] {
  const dates = impliedByOwnModel(audit)
    .filter(({ sightline }) => sightline === line.name)
    .flatMap((implied) => implied.dates)
  const hasSecond = audit.tracks.filter(({ sightline }) => sightline === line.name).length > 1
  return phrasing([
    strong(`Where the target of ${line.name} stood over time.`),
    ' The curve is the azimuth at which the Sun met the horizon, year by year',
    hasSecond ? ' (broken: by a second model of the Earth’s tilt)' : '',
    '; the band is the line as measured. ',
    dates.length > 0
      ? 'A full dot marks a date that fits, an open one a date still to come. The Earth’s tilt swings to and fro, so one line may have several dates.'
      : 'They do not cross: no date fits.',
  ])
}
