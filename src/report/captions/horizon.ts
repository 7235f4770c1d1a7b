import type { PhrasingContent } from 'mdast'
import type { Audit, SightlineAudit, Skyline } from '../../audit/audit.ts'
import { formatDegrees } from '../../quantity/format-angle.ts'
import { listed } from '../../quantity/listed.ts'
import { hasSkylineBand } from '../figures/horizon-ground.ts'
import { type HorizonPlot, layHorizon } from '../figures/horizon-layout.ts'
import { isBracketCut, isWideError } from '../figures/horizon-line.ts'
import { type HorizonMark, type HorizonSource, horizonSource } from '../figures/horizon-source.ts'
import { phrasing, strong } from '../nodes.ts'
import { noEvent } from '../wording/no-event.ts'

/** Over this altitude refraction leaves a disc round to the eye, degrees. */
const ROUND_FROM_DEG = 10

/** Tells a reader how to read the skyline of one sightline. */
export function horizonCaption(audit: Audit, line: SightlineAudit): PhrasingContent[] {
  const source = horizonSource(audit, line.name)
  const { plot } = layHorizon(source)
  const sentences = [targets(source, plot), marks(source, plot), notDrawn(source, plot)]
  return phrasing([
    strong(`The target of ${line.name} on the skyline.`),
    ` ${sentences.filter((sentence) => sentence !== '').join(' ')}`,
  ])
}

/** What stands on the skyline, and how each date is drawn. */
function targets({ sightline, skyline }: HorizonSource, { inside }: HorizonPlot): string {
  if (inside.length === 0) return ''
  const dates = datesDrawn(sightline, inside)
  if (isStar(sightline))
    return `The crosses are the ${sightline.event}${firstSeen(sightline, skyline)}: ${dates}.`
  const body = sightline.body === 'moon' ? 'Moon at its mean size' : 'Sun at its true size'
  const isFlat = skyline.at_line_deg.value < ROUND_FROM_DEG
  return [
    `The circles are the ${body} at the ${sightline.event}, to one scale both ways: ${dates}`,
    `${isFlat ? '; refraction flattens the real disc a little' : ''}.`,
  ].join('')
}

function datesDrawn(sightline: SightlineAudit, marks: readonly HorizonMark[]): string {
  const count = (kind: string) => marks.filter(({ placement }) => placement.kind === kind).length
  const others = count('independent')
  return listed([
    ...(count('asserted') > 0 ? ['thick red at the asserted date'] : []),
    ...(others > 0 ? [`grey at the independent ${others > 1 ? 'dates' : 'one'}`] : []),
    ...(count('today') > 0 ? [`${isStar(sightline) ? 'black' : 'broken'} today`] : []),
  ])
}

/** A star that is seen only higher up stands over the skyline. */
function firstSeen({ altitude_deg }: SightlineAudit, { at_line_deg }: Skyline): string {
  const isHigher = altitude_deg !== null && altitude_deg.value > at_line_deg.value
  return isHigher ? `, seen from ${formatDegrees(altitude_deg.value, 'minute')} up` : ''
}

function isStar({ body }: SightlineAudit): boolean {
  return body === 'star' || body === 'two stars'
}

/** The line, its errors and its tolerances. */
function marks(source: HorizonSource, plot: HorizonPlot): string {
  const { skyline, line } = source
  const isWide = isWideError(source, plot)
  const grey = [
    ...(line.sd > 0 && !isWide ? ['the line'] : []),
    ...(hasSkylineBand(source, plot) ? ['the skyline'] : []),
  ]
  return [
    'The upright is the line as measured, the bracket under it the build tolerances held plausible',
    ...(isBracketCut(source, plot) ? [' (an arrow head where they reach beyond the picture)'] : []),
    ...(isWide ? [', the whisker at its foot one standard deviation of the line'] : []),
    ...(grey.length > 0 ? [`, the grey about ${listed(grey)} one standard deviation`] : []),
    ...(plot.spreads.length > 0 ? [', a bar on a stem the directions over the whole of that date'] : []),
    ...(skyline.nodes.length === 1 ? ['; the skyline is drawn level'] : []),
    '.',
  ].join('')
}

/** What is not in the picture. */
function notDrawn({ unseen, sightline }: HorizonSource, { outside }: HorizonPlot): string {
  const dates = unseen.map(({ label, kind, printed }) =>
    kind === 'today' ? label : `in ${printed} (${label})`,
  )
  return [
    ...(outside.length > 0 ? ['An arrow points to what lies beyond the picture.'] : []),
    ...(dates.length > 0 ? [`There is ${noEvent(sightline)} ${listed(dates)}.`] : []),
  ].join(' ')
}
