import { mapReading, misread, type Stretch, trimmedStretch } from '../../quantity/misread.ts'
import { foldWord, nearMiss } from '../../quantity/near-miss.ts'
import { plainCharacters } from '../../quantity/plain-characters.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Reading } from '../../quantity/reading.ts'
import type { Solstice, SunEvent } from '../claim.ts'
import { SOLSTICES, solsticesOfSeason } from './season.ts'

type SunDay = Extract<SunEvent, { name: 'day' }>

/** Half a year: a day further from one solstice is nearer to the other. */
const MOST_DAYS = 183
const COUNTED =
  /^\s*(?<sign>[-–+])?\s*(?<number>\d+(?:[.,]\d+)?)\s*(?<unit>days?)?\s+(?<way>after|before)\s+(?:the\s+)?(?<from>\S.*?)\s*$/di
const SUMMED = /^\s*(?<from>[a-z_ -]*[a-z])\s*(?<sign>[-–+])\s*(?<number>\d+)\s*(?:days?)?\s*$/i

export const DAY_EXPECTED = 'days counted from a solstice, such as 30 days after june solstice'

/** Reads a day of the year: `30 days after june solstice`, `1 day before december solstice`; whole days, at most 183. */
export function readSunDay(text: string): Reading<SunDay> {
  const plain = plainCharacters(text)
  const match = COUNTED.exec(plain)
  if (match === null) return notCounted(text, plain)
  const { sign, number = '', unit, way = '', from = '' } = match.groups ?? {}
  const after = readSolstice(text, stretchOf(match, 'from'), from)
  if (!after.ok) return after
  const days = readCount(number, stretchOf(match, 'number'), unit !== undefined)
  if (!days.ok) return days
  const isBefore = way.toLowerCase() === 'before'
  if (sign === '-' || sign === '–')
    return backwards(text, days.value, isBefore ? 'after' : 'before', after.value)
  return mapReading(days, (count) => ({
    name: 'day',
    days: isBefore && count > 0 ? -count : count,
    after: after.value,
  }))
}

function readSolstice(text: string, at: Stretch, from: string): Reading<Solstice> {
  const solstice = SOLSTICES.find((word) => foldWord(word) === foldWord(from))
  if (solstice !== undefined) return { ok: true, value: solstice }
  const written = quoted(text.slice(at.offset, at.offset + at.length))
  const season = solsticesOfSeason(from)
  if (season === null)
    return misread('not-readable', `${written} is not a solstice to count days from`, at, {
      expected: SOLSTICES.join(' or '),
      suggestion: nearMiss(from, SOLSTICES),
    })
  const { north, south } = season
  return misread('not-readable', `${written} falls in another month south of the equator`, at, {
    expected: `${north} (in the north) or ${south} (in the south)`,
    suggestion: `${north} or ${south}`,
  })
}

function readCount(number: string, at: Stretch, hasUnit: boolean): Reading<number> {
  const count = Number(number.replace(',', '.'))
  if (!/^\d+$/.test(number))
    return misread('not-readable', `${quoted(number)} is not a whole number of days`, at, {
      expected: 'whole days: a rising falls on one day or the next',
      suggestion: count < MOST_DAYS ? `${Math.floor(count)} or ${Math.floor(count) + 1}` : null,
    })
  if (count > MOST_DAYS)
    return misread('out-of-range', `${quoted(number)} days are more than half a year`, at, {
      expected: `at most ${MOST_DAYS} days, counted from the nearer solstice`,
    })
  if (hasUnit) return { ok: true, value: count }
  return misread('unit-missing', `${quoted(number)} does not say that it counts days`, at, {
    expected: DAY_EXPECTED,
    suggestion: `${number} ${count === 1 ? 'day' : 'days'}`,
  })
}

function backwards(text: string, days: number, way: 'after' | 'before', solstice: Solstice): Reading<never> {
  return misread('not-readable', `${quoted(text.trim())} counts backwards`, trimmedStretch(text), {
    expected: 'days after a solstice, or before it, without a sign',
    suggestion: inWords(days, way, solstice),
  })
}

function notCounted(text: string, plain: string): Reading<never> {
  const { sign, number = '', from = '' } = SUMMED.exec(plain)?.groups ?? {}
  const solstice = SOLSTICES.find((word) => foldWord(word) === foldWord(from))
  const isSum = solstice !== undefined && Number(number) <= MOST_DAYS
  return misread(
    'not-readable',
    `${quoted(text.trim())} is not a day of the Sun’s year`,
    trimmedStretch(text),
    {
      expected: `${DAY_EXPECTED}; dates of a calendar drift`,
      suggestion: isSum ? inWords(Number(number), sign === '+' ? 'after' : 'before', solstice) : null,
    },
  )
}

function inWords(days: number, way: 'after' | 'before', solstice: Solstice): string {
  return `${days} ${days === 1 ? 'day' : 'days'} ${way} ${solstice}`
}

function stretchOf(match: RegExpExecArray, group: string): Stretch {
  const [start, end] = match.indices?.groups?.[group] ?? [0, match[0].length]
  return { offset: start, length: end - start }
}
