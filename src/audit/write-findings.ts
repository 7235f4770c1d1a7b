import { formatArcmin } from '../quantity/format-angle.ts'
import { formatNumber } from '../quantity/format-number.ts'
import { formatYear } from '../quantity/format-year.ts'
import { listed } from '../quantity/listed.ts'
import type { Audit, Check, Finding, Limit, Reproduction } from './audit.ts'
import { aboutYear, labelled, setInWords } from './phrases.ts'

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
  const route = reproduction[0]!
  const rows = reproduction.filter(
    ({ from, sightline }) => from === route.from && sightline === route.sightline,
  )
  const untestable = rows.find(({ model_range }) => model_range === 'not known here')
  return {
    question: 'Does the arithmetic reproduce?',
    answer: `${stepsWords(checks)} ${lastStepWords(rows, asserted.printed)}`,
    because:
      untestable === undefined
        ? 'Each step was redone from the printed results of the steps before it.'
        : `The claimant’s table, ${untestable.label}, is not held here, so the last step could be redone only with others.`,
  }
}

function stepsWords(checks: readonly Check[]): string {
  if (checks.length === 0) return 'The source prints no intermediate results that could be checked.'
  const by = (verdict: Check['verdict']) => checks.filter((check) => check.verdict === verdict).map(stepWords)
  return [
    ...sentence(by('reproduces'), 'comes out again', 'come out again'),
    ...sentence(
      by('within uncertainty'),
      'differs by no more than air and horizon explain',
      'differ by no more than air and horizon explain',
    ),
    ...sentence(by('differs'), 'does not come out again', 'do not come out again'),
  ].join(' ')
}

function sentence(steps: readonly string[], one: string, several: string): string[] {
  if (steps.length === 0) return []
  const words = listed(steps)
  return [`${words.charAt(0).toUpperCase()}${words.slice(1)} ${steps.length === 1 ? one : several}.`]
}

const ROUTES = {
  'claimed declination': 'From the declination printed',
  'claimed azimuth': 'From the azimuth printed',
  sightline: 'From the line as it stands',
} as const

/** The last step by the first of its routes, the claimant's formula first. */
function lastStepWords(rows: readonly Reproduction[], asserted: string): string {
  const { from, sightline } = rows[0]!
  const route = from === 'sightline' ? `${ROUTES[from]} (${sightline})` : ROUTES[from]
  const dated = rows.filter(({ within_model_range }) => within_model_range === true)
  const strayed = rows.find(({ within_model_range }) => within_model_range === false)
  const beyond =
    strayed === undefined ? '' : ` ${strayed.label} gives ${formatYear(strayed.year!)}, outside its range.`
  if (dated.length === 0) return `${route} no formula gives a date within its range.${beyond}`
  return `${route} the date by ${listed(dated.slice(0, 3).map(dateWords))}, against the ${asserted} asserted.${beyond}`
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
      return `${name}${listed([...new Set(years)])}.`
    }
    if (nearest_approach?.offset_arcmin == null)
      return `${name}none; it does not come about in any year of the window.`
    return `${name}none; nearest in ${aboutYear(nearest_approach.year)}, ${formatArcmin(Math.abs(nearest_approach.offset_arcmin))} away.`
  })
  return {
    question: 'Which dates fit the line as measured, had it been built exactly?',
    answer: sentences.join(' '),
    because: implied.some(({ model }) => model === 'laskar2004')
      ? 'The obliquity of the ecliptic swings between 22.1° and 24.5° in about 41,000 years, so a direction may have several dates, or none.'
      : 'Precession carries the pole of the sky once round in about 26,000 years, so a direction may have several dates, or none.',
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
