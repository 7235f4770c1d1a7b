import { formatArcmin } from '../quantity/format-angle.ts'
import { formatNumber } from '../quantity/format-number.ts'
import { formatYear } from '../quantity/format-year.ts'
import type { Audit, Check, Finding, Limit, Reproduction } from './audit.ts'
import { aboutYear, labelled, setInWords } from './phrases.ts'
import { listed } from './words.ts'

type Facts = Pick<
  Audit,
  | 'outcome'
  | 'asserted'
  | 'checks'
  | 'implied'
  | 'limits'
  | 'other_dates'
  | 'plausible'
  | 'reproduction'
  | 'sweep'
  | 'window'
>

/** The questions a reader brings, answered from the audit's figures, each with its reason. */
export function writeFindings(facts: Facts): Finding[] {
  return [
    reproduces(facts),
    dates(facts),
    ...facts.limits.map((limit) => exactness(facts, limit)),
    plausible(facts),
  ]
}

function reproduces({ checks, reproduction, asserted }: Facts): Finding {
  const differing = checks.filter(({ verdict }) => verdict === 'differs')
  const tested = reproduction.filter(({ within_model_range }) => within_model_range === true)
  const strayed = reproduction.find(({ within_model_range }) => within_model_range === false)
  const steps =
    checks.length === 0
      ? 'The source prints no intermediate results that could be checked.'
      : differing.length === 0
        ? `Every step that the source prints comes out again: ${listed(checks.map(stepWords))}.`
        : `Not every step comes out again: ${listed(differing.map(stepWords))}.`
  const last =
    tested.length === 0
      ? 'No formula gives a date within its range.'
      : `The date by ${listed(tested.slice(0, 3).map(dateWords))}, against the ${asserted.printed} asserted.`
  const beyond =
    strayed === undefined ? '' : ` ${strayed.label} gives ${formatYear(strayed.year!)}, outside its range.`
  const untestable = reproduction.find(
    ({ reason, model_range }) => reason !== null && model_range === 'not known here',
  )
  return {
    question: 'Does the arithmetic reproduce?',
    answer: `${steps} ${last}${beyond}`,
    because:
      untestable === undefined
        ? 'Each step was redone from the printed results of the steps before it.'
        : `The claimant’s table, ${untestable.label}, is not held here, so the last step could be redone only with others.`,
  }
}

function stepWords({ step, difference_printed, verdict }: Check): string {
  return verdict === 'reproduces' ? step : `${step} (ours ${difference_printed}, ${verdict})`
}

function dateWords({ label, year }: Reproduction): string {
  return `${label} is ${formatYear(year!)}`
}

function dates({ implied }: Facts): Finding {
  const ours = implied.filter(({ model }) => model === 'vondrak2011')
  const sentences = ours.map(({ sightline, dates, nearest_approach }) => {
    const name = ours.length > 1 ? `${sightline}: ` : ''
    if (dates.length > 0) {
      const years = dates.map(({ year, in_window, future }) => {
        const place = future ? ' (in the future)' : in_window ? '' : ' (outside the window)'
        return aboutYear(year) + place
      })
      return `${name}${listed(years)}.`
    }
    if (nearest_approach?.offset_arcmin == null) return `${name}none; the Sun does not cross that horizon.`
    return `${name}none; nearest in ${aboutYear(nearest_approach.year)}, ${formatArcmin(Math.abs(nearest_approach.offset_arcmin))} away.`
  })
  return {
    question: 'Which dates fit the line as measured, had it been built exactly?',
    answer: sentences.join(' '),
    because:
      'The obliquity of the ecliptic swings between 22.1° and 24.5° in about 41,000 years, so most directions have more than one date, or none.',
  }
}

function exactness({ other_dates, asserted, outcome }: Facts, limit: Limit): Finding {
  const half =
    limit.half_bit_arcmin === null
      ? ''
      : ` From ${formatArcmin(limit.half_bit_arcmin)} it tells less than half a bit.`
  if (limit.against === null) {
    return {
      question: 'How exactly must the builders have built?',
      answer: `Against another date this cannot be told: ${limit.ratio_3_reason}.${half}`,
      because: 'Without a second date there is nothing for the asserted one to be more likely than.',
    }
  }
  const other = labelled(other_dates.find(({ label }) => label === limit.against)!)
  const lead =
    limit.ratio_3_arcmin === null
      ? `${limit.ratio_3_reason}.`
      : `to better than ${formatArcmin(limit.ratio_3_arcmin)}, one standard deviation.`
  const inSet =
    limit.other_date_in_95_arcmin === null
      ? ''
      : ` From ${formatArcmin(limit.other_date_in_95_arcmin)} the 95 % dates hold all of ${other}.`
  return {
    question: `How exactly must they have built for ${asserted.printed} to lead over ${other} by 3 to 1?`,
    answer: `${lead.charAt(0).toUpperCase()}${lead.slice(1)}${inSet}${half}`,
    because:
      outcome === 'none' || outcome === 'missed'
        ? 'This compares misses: the line as measured fits not the asserted date, and may fit neither.'
        : 'A line built less exactly could have come out as it did at either date.',
  }
}

function plausible({ plausible: { low_arcmin, high_arcmin }, sweep, window }: Facts): Finding {
  const words = [low_arcmin, high_arcmin].map((arcmin) => {
    const step = sweep.steps.find(({ tolerance_arcmin }) => tolerance_arcmin === arcmin)!
    return `at ${formatArcmin(arcmin)} ${setInWords(step, window)}, ${formatNumber(step.bits, 2)} bits`
  })
  return {
    question: 'What do the plausible tolerances leave of the date?',
    answer: `${words.join('; ')}.`.replace(/^a/, 'A'),
    because: `Smallest sets of dates that hold 95 %, in the window ${window.printed}.`,
  }
}
