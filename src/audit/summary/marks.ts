import { datesInWindow, datesOutside, setInWords } from '../phrases.ts'
import { sourcesOf } from './sources-of.ts'
import type { SummaryFacts } from './summary-facts.ts'

/** Bits below which a line, built exactly, is said to tell nothing of its date. */
const TELLS_NOTHING = 0.05

/** What the lines mark when they were built exactly, and what the measurement alone leaves. */
export function marks(facts: SummaryFacts): string {
  const { implied, sightlines, sweep, window, northTaken } = facts
  const exact = sweep.steps[0]!
  const allowed = setInWords(exact, window)
  const survey = sourcesOf(sightlines[0]!).replace(
    'survey',
    northTaken ? 'survey (its north taken as true)' : 'survey',
  )
  if (sightlines.length > 1) return marksBriefly(facts)
  const { event } = sightlines[0]!
  const inside = datesInWindow(implied[0]!)
  const outside = datesOutside(implied[0]!, window)
  if (inside !== null) {
    const beyond = outside === null ? '' : `, and outside the window of ${outside}`
    return `Built exactly, the line marks the ${event} of ${inside}${beyond}; ${survey} leave, at 95 %, ${allowed}.`
  }
  if (exact.bits < TELLS_NOTHING && sweep.no_target.length === 0) {
    return `Even built exactly, the line tells nothing of its date: within the error of ${survey} the ${event} stands there in all years of the window alike.`
  }
  const where = outside === null ? 'in no year' : `only of ${outside}, outside the window;`
  return outside === null
    ? `Even built exactly, the line meets the ${event} ${where}, but comes within the error of ${survey}; at 95 % that leaves ${allowed}.`
    : `Built exactly, the line marks the ${event} ${where} in the window ${survey} leave, at 95 %, ${allowed}.`
}

/** The same without the dates themselves. */
export function marksBriefly({ sightlines, sweep, window, northTaken }: SummaryFacts): string {
  const them = sightlines.length > 1 ? `the ${sightlines.length} lines together allow` : 'the line allows'
  return `Built exactly, ${them} ${setInWords(sweep.steps[0]!, window)} (95 %${northTaken ? ', north taken as true' : ''}).`
}
