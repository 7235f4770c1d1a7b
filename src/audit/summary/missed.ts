import { formatYear } from '../../quantity/format-year.ts'
import { listed } from '../../quantity/listed.ts'
import type { SightlineAudit } from '../audit.ts'
import { datesInWindow, datesOutside, setInWords, sideOf } from '../phrases.ts'
import { fitting } from './fitting.ts'
import { whyNever } from './never.ts'
import { giveOrTake, reversedWords, threeMeasures } from './parts.ts'
import { shortened } from './shortened.ts'
import { sourcesOf } from './sources-of.ts'
import { NOT_DECIDED, type SummaryFacts } from './summary-facts.ts'

/** Dates fit, but the asserted one is not among them. */
export function missed(facts: SummaryFacts): string[] {
  const { asserted, sightlines, sweep, window, misfits } = facts
  if (misfits.length === 0) {
    return [
      `No year of the asserted date, ${asserted.printed}, fits all ${sightlines.length} lines: each fits in some of them, but not in the same.`,
      `Built exactly, the lines together allow ${setInWords(sweep.steps[0]!, window)} (95 %).`,
      NOT_DECIDED,
    ]
  }
  const index = worstOf(facts)
  const line = sightlines[index]!
  const told = (taken: string, usual: string) => [
    `${miss(facts, line)} ${taken}`.trim(),
    exactDates(facts, index),
    [builders(line), usual, NOT_DECIDED].filter((words) => words !== '').join(' '),
  ]
  const taken = takenAs(facts, index)
  return fitting([told(taken, usualErrors(facts)), told(taken, ''), told('', '')])
}

function miss(facts: SummaryFacts, line: SightlineAudit): string {
  const { asserted } = facts
  const opening = `As measured, ${nameOf(facts, line)} misses the asserted date, ${asserted.printed}.`
  const closest = line.closest_in_asserted
  if (closest === null)
    return `${opening} In none of these years did the ${line.event} come about: ${whyNever(line)}.`
  const year = asserted.to - asserted.from < 1 ? 'Then' : `At its nearest, in ${formatYear(closest.year)},`
  return `${opening} ${year} the ${line.event} stood ${threeMeasures(facts, Math.abs(closest.offset_arcmin))} ${sideOf(closest.offset_arcmin, line.measures)}${giveOrTake(line, closest.sd_arcmin)}.${reversedWords(closest.offset_arcmin)}`
}

/** What this rests on that the claim does not say, and how else it might be read. */
export function takenAs({ taken, northTaken }: SummaryFacts, index: number): string {
  const open = taken[index]!
  const words = [
    ...open.map(({ what, used }) => `${what} as ${used}`),
    ...(northTaken ? ['the plan’s north as true'] : []),
  ]
  if (words.length === 0) return ''
  const others = open.flatMap(({ fitsWith }) => fitsWith)
  const otherwise = others.length === 0 ? '' : `; taken as ${listed(others)}, it fits`
  return `This takes ${listed(words)}, which the claim leaves open${otherwise}.`
}

function exactDates({ implied, window }: SummaryFacts, index: number): string {
  const inside = datesInWindow(implied[index]!)
  const outside = datesOutside(implied[index]!, window)
  if (inside === null && outside === null) {
    return 'Built exactly, it marks that event in no year, though near some within the error of the measurement.'
  }
  if (inside === null)
    return `Built exactly, it marks that event only in ${outside}, outside the window, ${window.printed}.`
  return `Built exactly, it marks that event in ${inside}${outside === null ? '' : `, and outside the window in ${outside}`}.`
}

function builders(line: SightlineAudit): string {
  return line.closest_in_asserted === null
    ? ''
    : `For the asserted date the builders must have been off by about that much, unless ${sourcesOf(line).replace(' and ', ' or ')} are further out than stated.`
}

function usualErrors({ atOffset, window, sightlines }: SummaryFacts): string {
  if (atOffset === null) return ''
  const those = sightlines.length === 1 ? 'the line' : 'the lines'
  return `If such errors were usual, ${those} would allow, at 95 %, ${setInWords(atOffset, window)}.`
}

/** Of the lines that do not fit the one that is furthest off in units of its own error. */
export function worstOf({ misfits, sightlines }: SummaryFacts): number {
  const deviations = misfits.map((i) => {
    const closest = sightlines[i]!.closest_in_asserted
    return closest === null ? Infinity : Math.abs(closest.offset_arcmin) / closest.sd_arcmin
  })
  return misfits[deviations.indexOf(Math.max(...deviations))]!
}

/** `the line`, or which of several, and how many of them. */
export function nameOf({ sightlines, misfits }: SummaryFacts, { name }: SightlineAudit): string {
  if (sightlines.length === 1) return 'the line'
  const others = misfits.length > 1 ? ` (${misfits.length} of the ${sightlines.length} lines do so)` : ''
  return `the line ${shortened(name)}${others}`
}
