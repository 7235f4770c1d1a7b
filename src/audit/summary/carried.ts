import { LARGEST_TOLERANCE_ARCMIN } from '../../inference/limits.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { listedShort } from '../../quantity/listed.ts'
import { leadsUpTo, rivalLimits } from '../outcome.ts'
import { plausibleWords, setInWords } from '../phrases.ts'
import { grammarOf } from './grammar.ts'
import { againstWords, stepAt, threeMeasures } from './parts.ts'
import { NOT_DECIDED, type SummaryFacts } from './summary-facts.ts'

/** The asserted date leads over the whole plausible range. */
export function carried(facts: SummaryFacts): string {
  const { asserted, limits, plausible, window, sweep, sightlines } = facts
  const { it, favours } = grammarOf(sightlines)
  const rivals = rivalLimits(limits)
  const at = stepAt(sweep.steps, plausible.high_arcmin)
  const isNarrow = at.sets95.every(([low, high]) => asserted.from <= low && high <= asserted.to)
  return [
    `At all plausible tolerances, ${plausibleWords(plausible)} ${it} ${favours} ${asserted.printed} over ${listedShort(
      rivals.map((limit) => againstWords(facts, limit)),
      2,
    )} by 3 to 1 or more.`,
    ...until(facts),
    `At ${formatArcmin(plausible.high_arcmin)} the dates allowed (95 %) are ${setInWords(at, window)}.`,
    plausible.stated
      ? 'So what is stated of the builders’ exactness carries the claim this far; the audit does not test that statement.'
      : 'So the claim stands as far as builders kept within these tolerances, which nobody has stated of them.',
    NOT_DECIDED,
    ...(isNarrow ? [] : ['It does not narrow the date to the years asserted.']),
  ].join(' ')
}

function until(facts: SummaryFacts): string[] {
  const { limits, plausible } = facts
  const ends = Math.min(...rivalLimits(limits).map(leadsUpTo))
  if (ends > plausible.high_arcmin && Number.isFinite(ends)) {
    return [`The lead ends at ${threeMeasures(facts, ends)}.`]
  }
  const isWithin = plausible.high_arcmin < LARGEST_TOLERANCE_ARCMIN
  return Number.isFinite(ends) || !isWithin
    ? []
    : [`It still leads at ${formatArcmin(LARGEST_TOLERANCE_ARCMIN)}, the largest tolerance looked at.`]
}
