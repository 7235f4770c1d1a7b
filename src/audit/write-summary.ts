import { formatArcmin } from '../quantity/format-angle.ts'
import { formatYearRange } from '../quantity/format-year.ts'
import type { Audit, DatedLabel, Implied, Limit, SweepStep } from './audit.ts'
import { YEARS_BEYOND_WINDOW } from './defaults.ts'
import { centimetres, sunWidths } from './measures.ts'
import { leadsUpTo, rivalLimits } from './outcome.ts'
import { aboutYear, datesInWindow, labelled, plausibleWords, setInWords, sideOf } from './phrases.ts'
import { inThreeMeasures, listed } from './words.ts'

/** The parts of an audit that its finding is written from. */
export type SummaryFacts = Pick<
  Audit,
  'outcome' | 'asserted' | 'other_dates' | 'plausible' | 'window' | 'sightlines' | 'sweep' | 'limits'
> & {
  /** By the default model, one for each line. */
  implied: readonly Implied[]
  /** The 95 % set at a tolerance as large as the offset at the asserted date; null where that is not reached. */
  atOffset: SweepStep | null
}

const NOT_DECIDED = 'This audit does not decide which tolerance the builders had.'

/**
 * The finding of page one: at most 150 words that a careful reader may quote. It states the tolerance at which the
 * conclusion changes, and never which tolerance the builders had.
 */
export function writeSummary(facts: SummaryFacts): string[] {
  switch (facts.outcome) {
    case 'premise':
      return [marks(facts), premise(facts), plausibleAgainstLimit(facts)]
    case 'carried':
      return [marks(facts), carried(facts)]
    case 'open':
      return [marks(facts), open(facts)]
    case 'missed':
      return missed(facts)
    case 'none':
      return none(facts)
  }
}

/** What the lines mark when they were built exactly. */
function marks(facts: SummaryFacts): string {
  const { implied, sightlines, sweep, window } = facts
  if (sightlines.length > 1) {
    return `Built exactly, the ${sightlines.length} lines together allow ${setInWords(sweep.steps[0]!, window)} (95 %).`
  }
  const { event } = sightlines[0]!
  const dates = datesInWindow(implied[0]!)
  if (dates !== null) {
    const allowed = setInWords(sweep.steps[0]!, window)
    return `Built exactly, the line marks the ${event} of ${dates}; survey, horizon and air leave, at 95 %, ${allowed}.`
  }
  const near = implied[0]!.nearest_approach
  const year = near === null ? '' : ` in ${aboutYear(near.year)}`
  return `Built exactly, the line marks the ${event} of no year of the window, but the survey’s own error reaches it${year}, where the Sun’s path turns and dates are hard to tell apart.`
}

function premise(facts: SummaryFacts): string {
  const { asserted, limits, sweep, sightlines } = facts
  const tightest = tightestLimit(limits)
  const other = labelled(facts.other_dates.find(({ label }) => label === tightest.against)!)
  const limit = tightest.ratio_3_arcmin
  const lead =
    limit === null
      ? `At no build tolerance, not even none, does the ${linesWord(sightlines)} favour ${asserted.printed} over ${other} by 3 to 1.`
      : `How exactly it was built decides the rest: set to within ${threeMeasures(facts, limit)}, one standard deviation, it favours ${asserted.printed} over ${other} by 3 to 1 or more; set less exactly, it does not.`
  return `${lead} ${halfBit(tightest, sweep.window.printed)}`.trim()
}

function plausibleAgainstLimit({ limits, plausible }: SummaryFacts): string {
  const limit = tightestLimit(limits).ratio_3_arcmin
  const range = plausibleWords(plausible)
  if (limit === null) return NOT_DECIDED
  const place =
    limit < plausible.low_arcmin
      ? 'all lie beyond that limit'
      : limit > plausible.high_arcmin
        ? 'all lie within that limit'
        : 'lie on both sides of that limit'
  return `Plausible tolerances, ${range} ${place}. ${NOT_DECIDED}`
}

function carried(facts: SummaryFacts): string {
  const { asserted, limits, plausible, other_dates: others, window, sweep } = facts
  const rivals = rivalLimits(limits)
  const ends = Math.min(...rivals.map(leadsUpTo))
  const until = Number.isFinite(ends)
    ? `It would cease to at ${threeMeasures(facts, ends)}.`
    : 'It still would at 5°, the largest tolerance looked at.'
  const at = stepAt(sweep.steps, plausible.high_arcmin)
  return [
    `At all plausible tolerances, ${plausibleWords(plausible)} it favours ${asserted.printed} over ${listed(rivals.map(({ against }) => labelled(others.find(({ label }) => label === against)!)))} by 3 to 1 or more.`,
    until,
    `At ${formatArcmin(plausible.high_arcmin)} the dates it allows (95 %) are ${setInWords(at, window)}.`,
    'So what is stated of the builders’ exactness carries the claim this far; the audit takes that statement as given and does not test it.',
    ...(narrows(at, asserted) ? [] : ['It does not narrow the date to the years asserted.']),
  ].join(' ')
}

/** Whether a 95 % set is as narrow as the asserted date itself. */
function narrows({ sets95 }: SweepStep, { from, to }: DatedLabel): boolean {
  return sets95.every(([low, high]) => from <= low && high <= to)
}

function open(facts: SummaryFacts): string {
  const { plausible, window, sweep, limits } = facts
  const at = (arcmin: number) =>
    `at ${formatArcmin(arcmin)} the dates allowed (95 %) are ${setInWords(stepAt(sweep.steps, arcmin), window)}`
  return [
    `${facts.other_dates.length === 0 ? 'The claim names no independent date' : 'No independent date differs from the asserted one enough'} to hold it against. What the line allows depends on how exactly it was built:`,
    `${at(plausible.low_arcmin)}; ${at(plausible.high_arcmin)}.`,
    halfBit(limits[0]!, sweep.window.printed),
    NOT_DECIDED,
  ].join(' ')
}

function missed(facts: SummaryFacts): string[] {
  const { sightlines, implied, asserted, window, atOffset } = facts
  const [worst, index] = worstLine(facts)
  const { event, offset_at_asserted_arcmin: offset } = worst
  const which = sightlines.length > 1 ? `the line ${worst.name}` : 'the line'
  if (offset === null) {
    return [
      `As measured, ${which} cannot mark the asserted date: in ${asserted.printed} the Sun did not reach that horizon.`,
    ]
  }
  const sd = formatArcmin(worst.offset_at_asserted_sd_arcmin ?? 0)
  const dates = datesInWindow(implied[index]!)
  return [
    `As measured, ${which} misses the asserted date. In ${asserted.printed} the ${event} stood ${threeMeasures(facts, Math.abs(offset))} ${sideOf(offset)}, give or take ${sd} (one standard deviation) for survey, horizon and air.`,
    dates === null
      ? `Built exactly, it marks that event in no year of the window, ${window.printed}.`
      : `Built exactly, it marks that event in ${dates}.`,
    `For the asserted date the builders must have been off by that much.${wide(atOffset, facts)} ${NOT_DECIDED}`,
  ]
}

function wide(atOffset: SweepStep | null, { window, sightlines }: SummaryFacts): string {
  if (atOffset === null) return ''
  return ` If such errors were usual, the ${linesWord(sightlines)} would allow, at 95 %, ${setInWords(atOffset, window)}.`
}

function none(facts: SummaryFacts): string[] {
  const { window, implied, sightlines } = facts
  const index = Math.max(
    0,
    implied.findIndex(({ dates }) => dates.length === 0),
  )
  const near = implied[index]!.nearest_approach
  const { event } = sightlines[index]!
  const which = sightlines.length > 1 ? `the line ${sightlines[index]!.name}` : 'the line'
  if (near === null || near.offset_arcmin === null) {
    return [
      `No date fits ${which}. At this latitude the Sun does not cross that horizon at the ${event.replace(/ (sunrise|sunset)$/, '')} in any year of ${window.printed}.`,
      'Either the line was meant for something else, or latitude, horizon or target are not as stated. This audit does not decide which.',
    ]
  }
  const years = formatYearRange(window.from - YEARS_BEYOND_WINDOW, window.to + YEARS_BEYOND_WINDOW)
  const sd = formatArcmin(near.sd_arcmin ?? 0)
  return [
    `No date fits ${which}. From ${years} the ${event} never stands on it. In the window it came nearest in ${aboutYear(near.year)}, and then stood ${threeMeasures(facts, Math.abs(near.offset_arcmin))} ${sideOf(near.offset_arcmin)}, give or take ${sd} (one standard deviation) for survey, horizon and air.`,
    'For any date at all the builders must have been off by at least that much; or the line was meant for something else; or the survey, the horizon or the part of the disc are not as stated. This audit does not decide which.',
  ]
}

function halfBit({ half_bit_arcmin }: Limit, window: string): string {
  if (half_bit_arcmin === null) return ''
  return `From ${formatArcmin(half_bit_arcmin)} on it tells less than half a bit about its date, of ${window}.`
}

/** The independent date over which the asserted one loses its lead first. */
export function tightestLimit(limits: readonly Limit[]): Limit {
  return rivalLimits(limits).reduce((a, b) => (leadsUpTo(b) < leadsUpTo(a) ? b : a))
}

function worstLine({ sightlines }: SummaryFacts) {
  const sizes = sightlines.map(({ offset_at_asserted_arcmin: offset }) =>
    offset === null ? Infinity : Math.abs(offset),
  )
  const index = sizes.indexOf(Math.max(...sizes))
  return [sightlines[index]!, index] as const
}

function threeMeasures({ sweep, sightlines }: SummaryFacts, arcmin: number): string {
  const { semidiameter_arcmin, altitude_deg } = sightlines[0]!
  const widths = sunWidths(arcmin, semidiameter_arcmin.value, altitude_deg.value)
  return inThreeMeasures(arcmin, centimetres(arcmin, sweep.marker), sweep.marker.distance_m, widths)
}

/** The step of a tolerance that the sweep includes exactly. */
function stepAt(steps: readonly SweepStep[], arcmin: number): SweepStep {
  const step = steps.find(({ tolerance_arcmin }) => tolerance_arcmin === arcmin)
  if (step === undefined) throw new Error(`the sweep lacks the tolerance of ${arcmin}′`)
  return step
}

function linesWord(sightlines: readonly unknown[]): string {
  return sightlines.length > 1 ? 'lines' : 'line'
}
