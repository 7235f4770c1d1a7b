import type { Claim } from '../claim/claim.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { formatYearRange } from '../quantity/format-year.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { DEFAULTS } from './defaults.ts'
import type { Gap } from './gap.ts'

/** What belongs to the claim as a whole and moves no date that fits the line, but what is made of it. */
export function gapsOfClaim(claim: Claim): Gap[] {
  const gaps: Gap[] = []
  if (isUnstated(claim.window)) {
    gaps.push({
      what: 'dates thought possible',
      said: claim.window,
      used: formatYearRange(DEFAULTS.window.from, DEFAULTS.window.to),
      basis: 'all of the time in which people built, and more; our choice',
      change: null,
      instead: 'moves no date that fits; changes bits and sets, which a second window shows',
    })
  }
  gaps.push({
    what: 'weight of the dates before the line is looked at',
    said: 'omitted',
    used: 'the same for every year of the window',
    basis: 'prefers no date; our choice',
    change: null,
    instead: 'moves no date that fits; the ratios against the independent dates do not use it',
  })
  if (isUnstated(claim.plausiblePrecision)) {
    const { lowArcmin, highArcmin } = DEFAULTS.plausible
    gaps.push({
      what: 'plausible build tolerances',
      said: claim.plausiblePrecision,
      used: `${formatArcmin(lowArcmin)} to ${formatArcmin(highArcmin)}`,
      basis:
        'from the finest ancient orientations known (Petrie 1883: 4′ to 14′) to the preferred directions of many sites (Ruggles 1984: 1° to 2°); our choice',
      change: null,
      instead: 'moves no date that fits; marks the figure and words the finding',
    })
  }
  for (const { date, label } of [{ date: claim.assertedDate, label: 'asserted date' }, ...claim.otherDates]) {
    if (date.circaYears === 0) continue
    gaps.push({
      what: `what “c.” means in the ${label}`,
      said: 'omitted',
      used: `± ${date.circaYears} years`,
      basis: 'our choice',
      change: null,
      instead: 'moves no date that fits; widens the date it is held against',
    })
  }
  return gaps
}
