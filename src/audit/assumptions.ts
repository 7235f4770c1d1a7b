import type { Claim } from '../claim/claim.ts'
import { crossingYears } from '../inference/implied-dates.ts'
import type { Assumption } from './audit.ts'
import { auditBudget } from './audit-budget.ts'
import { middle, nearestYear } from './dated-label.ts'
import { YEARS_BEYOND_WINDOW } from './defaults.ts'
import type { Gap } from './gap.ts'
import { gapsOfClaim } from './gaps-of-claim.ts'
import { gapsOfLine } from './gaps-of-line.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** Step in which the effect of a change is looked for, years. */
const STEP = 80

/**
 * Everything the claim leaves out and the engine filled in, with its effect on the implied date nearest the asserted
 * one: largest first, what leaves no date at all before everything else, what moves no date last.
 */
export function listAssumptions(
  claim: Claim,
  lines: readonly SightlineInputs[],
  window: { from: number; to: number },
): Assumption[] {
  const near = middle(claim.assertedDate)
  const span = { from: window.from - YEARS_BEYOND_WINDOW, to: window.to + YEARS_BEYOND_WINDOW }
  const dateOf = (inputs: SightlineInputs) =>
    nearestYear(crossingYears(sightOf(inputs), span.from, span.to, STEP), near)
  const ofLines = claim.sightlines.flatMap((sightline, i) => {
    const inputs = lines[i]!
    const base = dateOf(inputs)
    return gapsOfLine(claim, sightline, inputs).map((gap) =>
      weigh(gap, base, (changed) => dateOf(changed), inputs),
    )
  })
  const ofClaim = gapsOfClaim(claim).map((gap) => weigh(gap, null, () => null, lines[0]!))
  return [...merged(ofLines), ...ofClaim]
    .sort((a, b) => rank(b) - rank(a))
    .map(({ vanishes: _, ...row }) => row)
}

/** What all lines take alike is one row, with the largest of its effects. */
function merged(rows: readonly Weighed[]): Weighed[] {
  const byWhat = new Map<string, Weighed>()
  for (const row of rows) {
    const held = byWhat.get(row.what)
    if (held === undefined || rank(row) > rank(held)) byWhat.set(row.what, row)
  }
  return [...byWhat.values()]
}

type Weighed = Assumption & { vanishes: boolean }

function rank({ effect_years, vanishes }: Weighed): number {
  return vanishes ? Infinity : (effect_years ?? -1)
}

function weigh(
  { what, said, used, basis, change, instead, budgetSource }: Gap,
  base: number | null,
  dateOf: (inputs: SightlineInputs) => number | null,
  inputs: SightlineInputs,
): Weighed {
  const row = { what, said: said === 'unknown' ? ('unknown' as const) : ('omitted' as const), used, basis }
  if (budgetSource !== undefined) return ownError(row, budgetSource, base, inputs)
  if (change === null) return { ...row, effect_years: null, effect_of: instead ?? '', vanishes: false }
  if (base === null) {
    return {
      ...row,
      effect_years: null,
      effect_of: `${change.words}; no date fits this line exactly, so there is none to move`,
      vanishes: false,
    }
  }
  const dates = change.of(inputs).map(dateOf)
  const shifts = dates.flatMap((date) => (date === null ? [] : [Math.abs(date - base)]))
  const largest = shifts.length === 0 ? null : Math.max(...shifts)
  const vanishes = dates.some((date) => date === null)
  const effectOf = vanishes ? `${change.words}; in one of these cases no date fits any more` : change.words
  return { ...row, effect_years: largest, effect_of: effectOf, vanishes }
}

/** The effect of an error of this program's own is its standard deviation in the budget of the date. */
function ownError(
  row: Pick<Assumption, 'what' | 'said' | 'used' | 'basis'>,
  source: string,
  base: number | null,
  inputs: SightlineInputs,
): Weighed {
  const rows = base === null ? [] : auditBudget(inputs, base).filter((held) => held.source === source)
  const effect = rows.length === 0 ? null : Math.hypot(...rows.map(({ sd }) => sd))
  const effectOf =
    base === null
      ? 'one standard deviation; no date fits this line exactly'
      : 'one standard deviation of the date'
  return { ...row, effect_years: effect, effect_of: effectOf, vanishes: false }
}
