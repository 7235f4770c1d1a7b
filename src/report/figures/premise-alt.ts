import type { Audit, DatedLabel, Limit, SweepStep } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatYearRange } from '../../quantity/format-year.ts'
import { listed } from '../../quantity/listed.ts'
import { dateSets } from '../wording/date-sets.ts'
import { premiseYears } from './premise-years.ts'

/** What the premise figure shows, in sentences with its figures. */
export function premiseAlt(audit: Audit): string {
  return [opening(audit), setsSentence(audit), datesSentence(audit)].join(' ')
}

function opening(audit: Audit): string {
  const { steps, window } = audit.sweep
  const widest = formatArcmin(steps.at(-1)?.tolerance_arcmin ?? 0)
  const { shown, isPart } = premiseYears(audit)
  const part = isPart ? ` Of the window, ${formatYearRange(...shown, 10)} is drawn.` : ''
  return `Date against assumed build tolerance, from exact to ${widest}, for the window ${window.printed}.${part}`
}

/** The 95 % set at tolerance 0 and at both ends of the plausible range. */
function setsSentence(audit: Audit): string {
  const { low_arcmin, high_arcmin } = audit.plausible
  const wanted = [0, low_arcmin, high_arcmin]
  const steps = [...new Set(wanted.map((arcmin) => nearestStep(audit.sweep.steps, arcmin)))]
  const parts = steps
    .filter((step) => step !== undefined)
    .map((step) => `${tolerance(step)} ${setsInWords(step, audit)}`)
  const lead =
    audit.outcome === 'none'
      ? `No date in reach fits ${audit.sightlines.length === 1 ? 'the line' : 'the lines together'}; the 95 % sets hold the dates that weigh most among misses`
      : 'The 95 % set holds'
  return parts.length === 0 ? 'No sets were found.' : `${lead}: ${parts.join('; ')}.`
}

function tolerance({ tolerance_arcmin }: SweepStep): string {
  return tolerance_arcmin === 0 ? 'for exact building' : `at ${formatArcmin(tolerance_arcmin)}`
}

function setsInWords({ sets95 }: SweepStep, { sweep: { window } }: Audit): string {
  if (sets95.length === 0) return 'no date'
  return listed(sets95.map((stretch) => dateSets([stretch], window)))
}

function nearestStep(steps: readonly SweepStep[], arcmin: number): SweepStep | undefined {
  return steps.reduce<SweepStep | undefined>((best, step) => {
    const isNearer = best === undefined || distance(step, arcmin) < distance(best, arcmin)
    return isNearer ? step : best
  }, undefined)
}

function distance(step: SweepStep, arcmin: number): number {
  return Math.abs(step.tolerance_arcmin - arcmin)
}

function datesSentence(audit: Audit): string {
  const asserted = `The asserted date is ${audit.asserted.printed}`
  if (audit.other_dates.length === 0) return `${asserted}; no independent date is given.`
  return `${asserted}; ${audit.other_dates.map((date, index) => comparison(date, audit.limits[index])).join('; ')}.`
}

function comparison({ label, printed }: DatedLabel, limit: Limit | undefined): string {
  if (typeof limit?.ratio_3_arcmin === 'number') {
    const until = limit.ratio_3_steady === false ? 'at some tolerances, last at' : 'up to'
    return `it beats ${label} (${printed}) by 3 to 1 ${until} ${formatArcmin(limit.ratio_3_arcmin)}`
  }
  return `against ${label} (${printed}), ${limit?.ratio_3_reason ?? 'there is no 3-to-1 limit'}`
}
