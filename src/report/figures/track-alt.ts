import type { Audit, ImpliedDate, NearestApproach, SightlineAudit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatYear, formatYearRange } from '../../quantity/format-year.ts'
import { listed } from '../../quantity/listed.ts'
import { measuredDegrees } from '../wording/measured-angle.ts'
import { noEvent } from '../wording/no-event.ts'
import { impliedYear } from './implied-year.ts'
import { isNeverSeen, yearsOutOfReach } from './track-reach.ts'
import type { TrackSource } from './track-source.ts'

/** What the track figure shows, in sentences with its figures. */
export function trackAlt(audit: Audit, source: TrackSource): string {
  const { tracks, sightline, implied } = source
  const [track] = tracks
  const [first, last] = [track.years[0], track.years.at(-1)]
  const span =
    first === undefined || last === undefined ? '' : `, from ${formatYear(first)} to ${formatYear(last)}`
  const measured = capitalised(sightline.measures)
  return [
    `${measured} of the target of ${sightline.name}, ${sightline.target}${span}, against the line as measured, ${measuredDegrees(track.line_deg)}.`,
    ...branches(source),
    ...(isNeverSeen(source)
      ? [`There is ${noEvent(sightline)} in any of these years.`]
      : [
          crossings(implied?.dates ?? []),
          ...approach(implied?.nearest_approach ?? null, sightline),
          ...outOfReach(source),
        ]),
    `The asserted date is ${audit.asserted.printed}.`,
  ].join(' ')
}

function capitalised(word: string): string {
  return word.charAt(0).toUpperCase() + word.slice(1)
}

function branches({ tracks }: TrackSource): string[] {
  const words = tracks.flatMap(({ branch_words }) => branch_words ?? [])
  return words.length < 2 ? [] : [`Each has its curve: ${listed(words)}.`]
}

function outOfReach(source: TrackSource): string[] {
  const stretches = yearsOutOfReach(source).map(([from, to]) => formatYearRange(from, to, 10))
  return stretches.length === 0 ? [] : [`There is ${noEvent(source.sightline)} from ${listed(stretches)}.`]
}

function crossings(dates: readonly ImpliedDate[]): string {
  if (dates.length === 0) return 'The two never meet.'
  const words = dates.map((date) => {
    const notes = [date.in_window ? '' : 'outside the window', date.future ? 'in the future' : ''].filter(
      Boolean,
    )
    return notes.length === 0 ? impliedYear(date) : `${impliedYear(date)} (${notes.join(', ')})`
  })
  return `They meet in ${listed(words)}.`
}

function approach(nearest: NearestApproach | null, sightline: SightlineAudit): string[] {
  if (nearest === null) return []
  if (nearest.offset_arcmin === null) return [`Within the window there is ${noEvent(sightline)}.`]
  const year = formatYear(nearest.year, 10)
  return [
    `Within the window they come nearest in ${year}, ${formatArcmin(Math.abs(nearest.offset_arcmin))} apart.`,
  ]
}
