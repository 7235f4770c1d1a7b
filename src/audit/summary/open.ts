import { formatArcmin } from '../../quantity/format-angle.ts'
import { setInWords } from '../phrases.ts'
import { grammarOf } from './grammar.ts'
import { halfBit, stepAt } from './parts.ts'
import { NOT_DECIDED, type SummaryFacts } from './summary-facts.ts'

/** The asserted date fits, and nothing stands against it. */
export function open(facts: SummaryFacts): string {
  const { plausible, window, sweep, sightlines, other_dates } = facts
  const { lines, it, was } = grammarOf(sightlines)
  const allowed = (arcmin: number) =>
    `at ${formatArcmin(arcmin)} the dates allowed (95 %) are ${setInWords(stepAt(sweep.steps, arcmin), window)}`
  const nothing =
    other_dates.length === 0
      ? 'The claim names no independent date to hold it against.'
      : 'The independent dates overlap the asserted one, so that none stands against it.'
  return [
    `${nothing} What ${lines} allow${sightlines.length === 1 ? 's' : ''} depends on how exactly ${it} ${was} built:`,
    `${allowed(plausible.low_arcmin)}; ${allowed(plausible.high_arcmin)}.`,
    halfBit(facts),
    NOT_DECIDED,
  ]
    .filter((words) => words !== '')
    .join(' ')
}
