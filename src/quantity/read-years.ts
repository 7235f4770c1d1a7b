import { describeMisread, misread, type Stretch, shiftReading, trimmedStretch } from './misread.ts'
import { plainCharacters } from './plain-characters.ts'
import { quoted } from './quoted.ts'
import type { Reading } from './reading.ts'
import { DATE_EXAMPLES, readYearAtom, type YearAtom } from './year-atom.ts'
import type { YearRange } from './year-range.ts'

/** Half-width in years of a date with `c.` that states none; a value of this program, listed as an assumption. */
export const CIRCA_YEARS = 50

const YEARS_IN = { year: 1, century: 100, millennium: 1000 } as const
const SEPARATOR = /\s+to\s+|(?<=[\w.])(?<!(?:^|\s)ca?\.?)\s*[-–—]\s*/gi

/**
 * Reads a date or a range of dates as people print them: `9600 BCE ± 100`, `12000 BC`, `AD 600`,
 * `2500 to 2300 BCE`, `c. 400 CE`, `3200 cal BP` (years before 1950), `3rd century BCE`. A number without an era
 * is refused, and so are year 0 and a range that runs backwards. Years are astronomical.
 */
export function readYears(text: string): Reading<YearRange> {
  const plain = plainCharacters(text)
  const separators = [...plain.matchAll(SEPARATOR)]
  const [separator, another] = separators
  if (another !== undefined)
    return misread('not-readable', `${quoted(text.trim())} is not one range of dates`, trimmedStretch(text), {
      expected: DATE_EXAMPLES,
    })
  if (separator === undefined) return readOne(text, plain)
  return readTwo(text, plain, separator.index, separator.index + separator[0].length)
}

function readOne(text: string, plain: string): Reading<YearRange> {
  const atom = readYearAtom(text, plain)
  return atom.ok ? rangeOf(text, atom.value, atom.value, trimmedStretch(text)) : atom
}

function readTwo(text: string, plain: string, endOfFirst: number, startOfSecond: number): Reading<YearRange> {
  if (text.slice(startOfSecond).trim() === '')
    return misread(
      'not-readable',
      `${quoted(text.trim())} is a range without its end`,
      trimmedStretch(text),
      {
        expected: DATE_EXAMPLES,
      },
    )
  const first = readYearAtom(text.slice(0, endOfFirst), plain.slice(0, endOfFirst))
  if (!first.ok) return first
  const second = shiftReading(
    readYearAtom(text.slice(startOfSecond), plain.slice(startOfSecond)),
    startOfSecond,
  )
  if (!second.ok) return second
  const [start, end] = shareEra(first.value, second.value)
  if (start.half !== null || end.half !== null)
    return misread(
      'unexpected-tolerance',
      `${quoted(text.trim())} has both a range and a ±`,
      trimmedStretch(text),
      {
        expected: 'either a range or one date with ±',
      },
    )
  return rangeOf(text, start, end, trimmedStretch(text))
}

/** `2500 to 2300 BCE` and `AD 600 to 700` name their era once; `3rd to 2nd century BCE` its unit as well. */
function shareEra(first: YearAtom, second: YearAtom): [YearAtom, YearAtom] {
  const start = first.unit === null ? { ...first, unit: second.unit } : first
  if (first.era === null) return [{ ...start, era: second.era }, second]
  return [start, second.era === null && first.eraBefore ? { ...second, era: first.era } : second]
}

function rangeOf(text: string, start: YearAtom, end: YearAtom, at: Stretch): Reading<YearRange> {
  const shown = quoted(text.trim())
  if (start.unit === null || end.unit === null)
    return misread('not-readable', `${shown} is not a date`, at, { expected: DATE_EXAMPLES })
  if (hasYearZero(start) || hasYearZero(end))
    return misread('year-zero', `${shown} names a year 0, which no era has`, at, {
      expected: '1 BCE, or 1 CE, which follows it',
    })
  if (start.era === null || end.era === null)
    return misread('year-without-era', `${shown} does not name its era`, at, {
      expected: DATE_EXAMPLES,
      suggestion: suggestEra(text, start, end),
    })
  const circaYears = (start.circa || end.circa) && start.half === null ? CIRCA_YEARS : 0
  const from = spanOf(start).from - (start.half ?? (start.circa ? circaYears : 0))
  const to = spanOf(end).to + (end.half ?? (end.circa ? circaYears : 0))
  if (spanOf(start).from > spanOf(end).to)
    return misread('range-backwards', `${shown} runs backwards in time`, at, {
      expected: 'the earlier date first',
      suggestion: swapped(start, end),
    })
  const value = { from, to, text: text.trim(), circaYears }
  return start.era === 'BP' || end.era === 'BP'
    ? { ok: true, value, warnings: [bareBp(shown, at)] }
    : { ok: true, value }
}

function spanOf({ count, unit, era }: YearAtom): { from: number; to: number } {
  const length = YEARS_IN[unit ?? 'year']
  const [first, last] = [length * (count - 1) + 1, length * count]
  if (era === 'CE') return { from: first, to: last }
  if (era === 'BCE') return { from: 1 - last, to: 1 - first }
  return { from: 1950 - last, to: 1950 - first }
}

function hasYearZero({ count, unit, era }: YearAtom): boolean {
  return count === 0 && (unit !== 'year' || (era !== 'BP' && era !== 'cal BP'))
}

function suggestEra(text: string, start: YearAtom, end: YearAtom): string {
  const written = text.trim()
  const falls = start.count > end.count
  if (start === end) return `${written} CE or ${written} BCE`
  return `${written} ${falls ? 'BCE' : 'CE'}`
}

function swapped(start: YearAtom, end: YearAtom): string {
  const shared = start.eraText === null || end.eraText === null
  const era = start.eraText ?? end.eraText ?? ''
  if (!shared) return `${whole(end)} to ${whole(start)}`
  return start.eraBefore ? `${era} ${end.text} to ${start.text}` : `${end.text} to ${start.text} ${era}`
}

function whole({ text, eraText, eraBefore }: YearAtom): string {
  return eraBefore ? `${eraText} ${text}` : `${text} ${eraText}`
}

function bareBp(shown: string, at: Stretch) {
  const message = `${shown} says BP, mostly a radiocarbon age, which is not a calendar date; it is read as cal BP`
  return describeMisread('radiocarbon-age', message, at, {
    expected: 'cal BP, or a calibrated date in BCE or CE',
  })
}
