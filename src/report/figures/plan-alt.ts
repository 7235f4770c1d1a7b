import type { Audit, Placement } from '../../audit/audit.ts'
import { wrap360 } from '../../quantity/degrees.ts'
import { formatArcmin, formatDegrees } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { listed, listedShort } from '../../quantity/listed.ts'
import { measuredDegrees } from '../wording/measured-angle.ts'
import { noEvent } from '../wording/no-event.ts'
import type { PlanLayout } from './plan-layout.ts'
import { isNorthTold } from './plan-north.ts'
import { offsetLines } from './plan-offset.ts'
import type { PlanSource } from './plan-source.ts'

/** What the figure of the plan shows, in sentences with its figures. */
export function planAlt(audit: Audit, { views, scene, factor }: PlanLayout): string {
  return [
    ...(scene === null ? [] : [survey(audit)]),
    `${scene === null ? 'The' : 'Beside it the'} surroundings of ${views.length > 1 ? 'each line' : 'the line'}, stretched ${factor} times across, with wedges of ${tolerances(audit)}.`,
    ...views.flatMap(({ source }) => [lineSentence(audit, source), targetSentence(source)]),
  ].join(' ')
}

function survey(audit: Audit): string {
  const { points, north } = audit.plan
  const names = listedShort(
    points.map(({ name }) => name),
    8,
  )
  const error = north === null || north.sd_deg === 0 ? '' : ` within ${formatArcmin(north.sd_deg * 60)}`
  const up = isNorthTold(audit) ? 'true north up' : 'north up as the plan has it'
  const shown = points.length === 0 ? 'The directions' : 'The survey'
  return `${shown} from above, ${up}${error}${names === '' ? '' : `: ${names}`}.`
}

function tolerances({ plausible: { low_arcmin, high_arcmin } }: Audit): string {
  const ends = [low_arcmin, high_arcmin].filter((arcmin) => arcmin > 0).map(formatArcmin)
  return ends.length === 0 ? 'no build tolerance' : `${listed(ends)}, the build tolerances held plausible`
}

function lineSentence({ plan }: Audit, { line, measured }: PlanSource): string {
  const nameOf = (index: number | null) => (index === null ? null : (plan.points[index]?.name ?? null))
  const [from, to, second] = [nameOf(line.from), nameOf(line.to), nameOf(line.span?.to ?? null)]
  const length = line.length_m === null ? '' : `, ${formatCm(line.length_m * 100)} long`
  const places = from === null || to === null ? '' : ` from ${from} to ${to}`
  const value = measuredDegrees(measured)
  if (line.span === null) return `${line.sightline} runs${places} at ${value}${length}.`
  const first = line.azimuth_deg === null ? '' : ` at ${formatDegrees(wrap360(line.azimuth_deg), 'minute')}`
  return `${line.sightline} is the angle of ${value} between the line${places}${first} and a second one${second === null ? '' : ` to ${second}`}.`
}

function targetSentence(source: PlanSource): string {
  const { placements, sightline } = source
  if (placements.length === 0) return 'Where its target stood is not known.'
  const where = (placement: Placement) => {
    const offset = offsetLines(source, placement).join(', ')
    return `${placement.label}, ${placement.printed}, ${offset === '' ? noEvent(sightline) : offset}`
  }
  const at = sightline.length_m === null ? ', lengths at 100 m' : ''
  return `Against it the ${sightline.event} stood${at}: ${placements.map(where).join('; ')}.`
}
