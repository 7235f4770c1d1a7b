import { plausibleWords } from '../phrases.ts'
import { grammarOf } from './grammar.ts'
import { againstWords, halfBit, threeMeasures, tightestLimit } from './parts.ts'
import { NOT_DECIDED, type SummaryFacts } from './summary-facts.ts'

/** Up to which tolerance the asserted date leads, and where the plausible ones lie. */
export function premise(facts: SummaryFacts): string[] {
  return [`${lead(facts)} ${halfBit(facts)}`.trim(), `${place(facts)}${NOT_DECIDED}`]
}

function lead(facts: SummaryFacts): string {
  const { asserted, limits, sightlines } = facts
  const { lines, it, was, does, favours } = grammarOf(sightlines)
  const tightest = tightestLimit(limits)
  const other = againstWords(facts, tightest)
  const limit = tightest.ratio_3_arcmin
  if (limit === null) {
    return `At no build tolerance, not even built exactly, ${does} ${lines} favour ${asserted.printed} over ${other} by 3 to 1.`
  }
  const opening = `How exactly ${it} ${was} built decides the rest:`
  if (tightest.ratio_3_steady === false) {
    return `${opening} ${it} ${favours} ${asserted.printed} over ${other} by 3 to 1 only at some tolerances up to ${threeMeasures(facts, limit)}, one standard deviation, and at none beyond.`
  }
  return `${opening} set to within ${threeMeasures(facts, limit)}, one standard deviation, ${it} ${favours} ${asserted.printed} over ${other} by 3 to 1 or more; set less exactly, ${it} ${does} not.`
}

function place({ limits, plausible }: SummaryFacts): string {
  const limit = tightestLimit(limits).ratio_3_arcmin
  if (limit === null) return ''
  const where =
    limit < plausible.low_arcmin
      ? 'all lie beyond that limit'
      : limit > plausible.high_arcmin
        ? 'all lie within that limit'
        : 'lie on both sides of that limit'
  return `Plausible tolerances, ${plausibleWords(plausible)} ${where}. `
}
