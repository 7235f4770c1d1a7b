import { carried } from './carried.ts'
import { fitting } from './fitting.ts'
import { marks, marksBriefly } from './marks.ts'
import { missed } from './missed.ts'
import { none } from './none.ts'
import { open } from './open.ts'
import { premise } from './premise.ts'
import type { SummaryFacts } from './summary-facts.ts'

/**
 * The finding of page one: at most 150 words that a careful reader may quote. It states the tolerance at which the
 * conclusion changes, and never which tolerance the builders had.
 */
export function writeSummary(facts: SummaryFacts): string[] {
  const paragraphs = paragraphsOf(facts)
  return facts.isUnsteady ? fitting([[...paragraphs, UNSTEADY], paragraphs]) : paragraphs
}

const UNSTEADY =
  'Here a small error of altitude turns the direction far: single dates are not to be trusted, as the warnings say.'

function paragraphsOf(facts: SummaryFacts): string[] {
  switch (facts.outcome) {
    case 'premise':
      return marked(facts, premise(facts))
    case 'carried':
      return marked(facts, [carried(facts)])
    case 'open':
      return marked(facts, [open(facts)])
    case 'missed':
      return missed(facts)
    case 'none':
      return none(facts)
  }
}

/** What the lines mark when built exactly goes first: as fully as there is room for. */
function marked(facts: SummaryFacts, paragraphs: readonly string[]): string[] {
  return fitting([
    [marks(facts), ...paragraphs],
    [marksBriefly(facts), ...paragraphs],
  ])
}
