import { misread, type Stretch, trimmedStretch } from './misread.ts'
import { quoted } from './quoted.ts'
import type { Reading } from './reading.ts'

export type Era = 'BCE' | 'CE' | 'cal BP' | 'BP'

/** One end of a stretch of years, or a whole one, as written. */
export interface YearAtom {
  /** The counted number: of a year, or of a century or millennium. */
  count: number
  /** Null where an ordinal stands alone, as in `3rd to 2nd century BCE`. */
  unit: 'year' | 'century' | 'millennium' | null
  era: Era | null
  /** `AD 600` has its era before the number, and may share it with what follows. */
  eraBefore: boolean
  circa: boolean
  /** The half-width after ±, years; null where there is none. */
  half: number | null
  /** The atom without its era, and the era as written. */
  text: string
  eraText: string | null
}

/** Tells what a date may look like, for messages. */
export const DATE_EXAMPLES = 'a date such as 9600 BCE ± 100, 2500 to 2300 BCE, AD 600 or 3200 cal BP'

/** An age instead of a date, mostly a round one. */
const AGO = /\d\s*(?:(?:thousand\s+)?(?:years?|yrs?)\s+(?:ago|old)|[ky]ya|ya|ka|kyr)\b\.?\s*$/i

/** Counts from here on are no years of anything people built. */
const TOO_MANY = 1e6
const ERA = String.raw`(?:cal\.?\s*)?(?:BCE|BC|CE|AD|BP|B\.\s?C\.\s?E\.|B\.\s?C\.|C\.\s?E\.|A\.\s?D\.|B\.\s?P\.)(?![A-Za-z])`
const TOLERANCE = String.raw`(?:±|\+\s*\/\s*-|\+-|,?\s*within\b)\s*(?<half_N_>-?\d{1,3}(?:,\d{3})+|-?\d+(?:\.\d+)?|\S+)\s*(?:(?:years?|yrs?|y|a)\b\.?)?`
const ATOM = new RegExp(
  String.raw`^\s*(?<circa>(?:circa|about|around|ca?\.?)(?=[\s\d]|$)|~|≈)?\s*(?:(?<before>${ERA})\s*)?` +
    String.raw`(?<sign>[-–+])?\s*(?<digits>\d{1,3}(?:,\d{3})+|\d+)(?<fraction>\.\d+)?` +
    String.raw`(?<ordinal>st|nd|rd|th)?\s*(?<unit>centur(?:y|ies)|millenni(?:um|a))?\s*` +
    `(?:${TOLERANCE.replace('_N_', '1')})?` +
    String.raw`\s*(?<after>${ERA})?\s*(?:${TOLERANCE.replace('_N_', '2')})?\s*$`,
  'di',
)

/** Reads one date without a range, such as `c. 9600 BCE ± 100`, `AD 600` or `3rd century BCE`. */
export function readYearAtom(text: string, plain: string): Reading<YearAtom> {
  const whole = trimmedStretch(text)
  const shown = quoted(text.trim())
  const match = ATOM.exec(plain)
  const groups = match?.groups
  if (AGO.test(plain))
    return misread('not-readable', `${shown} does not say from which year it counts`, whole, {
      expected: 'years before 1950, such as 3200 cal BP, or a date in BCE, such as 9600 BCE ± 100',
    })
  if (match === null || groups === undefined || (groups.before !== undefined && groups.after !== undefined))
    return misread('not-readable', `${shown} is not a date`, whole, { expected: DATE_EXAMPLES })
  if (groups.fraction !== undefined)
    return misread('year-fraction', `${shown} is not a whole year`, whole, { expected: DATE_EXAMPLES })
  const half = readHalf(text, match)
  if (!half.ok) return half
  const era = cutEra(text, match)
  const atom: YearAtom = {
    count: Number(groups.digits?.replaceAll(',', '')),
    unit: unitOf(groups),
    era: era.eraText === null ? null : eraOf(era.eraText),
    eraBefore: groups.before !== undefined,
    circa: groups.circa !== undefined,
    half: half.value,
    ...era,
  }
  if (atom.count >= TOO_MANY || (atom.unit !== 'year' && atom.era?.endsWith('BP')))
    return misread('not-readable', `${shown} is not a date`, whole, { expected: DATE_EXAMPLES })
  return groups.sign === undefined ? { ok: true, value: atom } : refuseSign(groups.sign, atom, match, text)
}

function cutEra(text: string, match: RegExpExecArray): { text: string; eraText: string | null } {
  const [start, end] = match.indices?.groups?.before ?? match.indices?.groups?.after ?? [0, 0]
  const rest = `${text.slice(0, start).trim()} ${text.slice(end).trim()}`.trim()
  return { text: rest, eraText: start === end ? null : text.slice(start, end) }
}

function unitOf({ ordinal, unit }: Readonly<Record<string, string | undefined>>): YearAtom['unit'] {
  if (unit === undefined) return ordinal === undefined ? 'year' : null
  return unit.toLowerCase().startsWith('c') ? 'century' : 'millennium'
}

function eraOf(text: string): Era {
  const letters = text.toUpperCase().replace(/[^A-Z]/g, '')
  if (letters.endsWith('BP')) return letters.startsWith('CAL') ? 'cal BP' : 'BP'
  return letters.includes('BC') ? 'BCE' : 'CE'
}

function readHalf(text: string, match: RegExpExecArray): Reading<number | null> {
  const group = match.groups?.half1 === undefined ? 'half2' : 'half1'
  const digits = match.groups?.[group]
  if (digits === undefined) return { ok: true, value: null }
  const half = Number(digits.replaceAll(',', ''))
  if (half >= 0 && half < TOO_MANY) return { ok: true, value: half }
  const shown = quoted(text.trim())
  const at = stretchOf(match, group)
  return half < 0
    ? misread('negative-uncertainty', `the uncertainty of ${shown} is below zero`, at, {
        expected: 'a number of years above zero',
        suggestion: digits.replace('-', ''),
      })
    : misread('not-readable', `${quoted(digits)} in ${shown} is not a number of years`, at, {
        expected: 'a number of years, such as ± 100',
      })
}

function refuseSign(sign: string, atom: YearAtom, match: RegExpExecArray, text: string): Reading<never> {
  const number = match.groups?.digits ?? ''
  const [start] = match.indices?.groups?.sign ?? [0]
  const [, end] = match.indices?.groups?.digits ?? [0, text.length]
  const at = { offset: start, length: end - start }
  const shown = quoted(text.slice(start, end))
  if (atom.era !== null)
    return misread('year-negative', `${shown} has a sign beside its era ${atom.eraText}`, at, {
      expected: 'a year counted in its era, without a sign',
      suggestion: number,
    })
  if (sign === '+')
    return misread('year-without-era', `${shown} does not name its era`, at, {
      expected: DATE_EXAMPLES,
      suggestion: `${number} CE`,
    })
  return misread('year-negative', `${shown} can mean two years, one apart`, at, {
    expected: `${atom.count + 1} BCE if it is an astronomical year number (0 is 1 BCE), ${number} BCE if the minus stands for BCE`,
    suggestion: `${atom.count + 1} BCE or ${number} BCE`,
  })
}

function stretchOf(match: RegExpExecArray, group: string): Stretch {
  const [start, end] = match.indices?.groups?.[group] ?? [0, match[0].length]
  return { offset: start, length: end - start }
}
