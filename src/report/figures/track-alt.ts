import type { Audit, ImpliedDate, NearestApproach } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { joinList } from '../wording/join-list.ts'
import { measuredDegrees } from '../wording/measured-angle.ts'
import { impliedYear } from './implied-year.ts'
import type { TrackSource } from './track-layout.ts'

/** What the track figure shows, in sentences with its figures. */
export function trackAlt(audit: Audit, source: TrackSource): string {
  const { track, sightline } = source
  const [first, last] = [track.years[0], track.years.at(-1)]
  const span =
    first === undefined || last === undefined ? '' : ` from ${formatYear(first)} to ${formatYear(last)}`
  return [
    `Azimuth of the target of ${sightline.name} (${sightline.target})${span}, against the line as measured, ${measuredDegrees(track.line_deg)}.`,
    crossings(source.implied?.dates ?? []),
    ...approach(source.implied?.nearest_approach ?? null),
    `The asserted date is ${audit.asserted.printed}.`,
  ].join(' ')
}

function crossings(dates: readonly ImpliedDate[]): string {
  if (dates.length === 0) return 'The two never meet.'
  const words = dates.map((date) => {
    const notes = [date.in_window ? '' : 'outside the window', date.future ? 'in the future' : ''].filter(
      Boolean,
    )
    return notes.length === 0 ? impliedYear(date) : `${impliedYear(date)} (${notes.join(', ')})`
  })
  return `They meet in ${joinList(words)}.`
}

function approach(nearest: NearestApproach | null): string[] {
  if (nearest === null) return []
  const year = formatYear(nearest.year, 10)
  if (nearest.offset_arcmin === null) return [`Within the window the target never stands at that altitude.`]
  return [
    `Within the window they come nearest in ${year}, ${formatArcmin(Math.abs(nearest.offset_arcmin))} apart.`,
  ]
}
