import { formatYearRange } from '../../quantity/format-year.ts'
import { YEARS_BEYOND_WINDOW } from '../defaults.ts'
import { aboutYear, sideOf } from '../phrases.ts'
import { takenAs } from './missed.ts'
import { whyNever } from './never.ts'
import { giveOrTake, reversedWords, threeMeasures } from './parts.ts'
import { shortened } from './shortened.ts'
import type { SummaryFacts } from './summary-facts.ts'

/** No date in reach fits. */
export function none(facts: SummaryFacts): string[] {
  const { window, implied, sightlines, misfits } = facts
  if (misfits.length === 0) {
    return [
      `No date fits all ${sightlines.length} lines together: each comes near its target at dates of its own, but not at the same ones.`,
      'Either they were not all meant so, or they were built with larger errors than this survey, horizon and air have. This audit does not decide which.',
    ]
  }
  const index = worst(facts)
  const line = sightlines[index]!
  const { event, measures, name } = line
  const others =
    misfits.length > 1 ? ` (nor ${misfits.length - 1} more of the ${sightlines.length} lines)` : ''
  const which = sightlines.length > 1 ? `the line ${shortened(name)}${others}` : 'the line'
  const near = implied[index]!.nearest_approach
  if (near === null || near.offset_arcmin === null || near.sd_arcmin === null) {
    return [
      `No date fits ${which}. At this latitude the ${event} does not come about in any year of ${window.printed}: ${whyNever(line)}. ${takenAs(facts, index)}`.trim(),
      'Either the line was meant for something else, or latitude, horizon or target are not as stated. This audit does not decide which.',
    ]
  }
  const years = formatYearRange(window.from - YEARS_BEYOND_WINDOW, window.to + YEARS_BEYOND_WINDOW)
  return [
    `No date fits ${which}. From ${years} the ${event} never stands on it. In the window it came nearest in ${aboutYear(near.year)}, and then stood ${threeMeasures(facts, Math.abs(near.offset_arcmin))} ${sideOf(near.offset_arcmin, measures)}${giveOrTake(line, near.sd_arcmin)}.${reversedWords(near.offset_arcmin)} ${takenAs(facts, index)}`.trim(),
    `${fitsOtherwise(facts, index) ? 'Taken so, for' : 'For'} any date at all the builders must have been off by about that much or more; or the line was meant for something else; or survey, horizon or target are not as stated. This audit does not decide which.`,
  ]
}

/** Whether another reading of what the claim leaves open fits. */
function fitsOtherwise({ taken }: SummaryFacts, index: number): boolean {
  return taken[index]!.some(({ fitsWith }) => fitsWith.length > 0)
}

/** Of the lines without a date the one that is furthest off in units of its own error. */
function worst({ misfits, implied }: SummaryFacts): number {
  const deviations = misfits.map((i) => {
    const near = implied[i]!.nearest_approach
    return near?.offset_arcmin == null || near.sd_arcmin == null
      ? Infinity
      : Math.abs(near.offset_arcmin) / near.sd_arcmin
  })
  return misfits[deviations.indexOf(Math.max(...deviations))]!
}
