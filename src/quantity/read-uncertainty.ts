import {
  describeMisread,
  mapReading,
  misread,
  type Stretch,
  shiftReading,
  trimmedStretch,
} from './misread.ts'
import { plainCharacters } from './plain-characters.ts'
import { quoted } from './quoted.ts'
import type { Reading } from './reading.ts'

const MARK = /^\s*(±|\+\s*\/\s*-|\+-|within\b)?\s*/i

/**
 * Reads an uncertainty: `2′` or `± 2′` is one standard deviation, `within 2′` a hard limit, whose standard
 * deviation is the limit over √3 (JCGM 100:2008, 4.3.7); `unknown` is legal. Zero is read with a warning.
 * `read` reads the quantity behind the mark.
 */
export function readUncertainty(
  text: string,
  read: (text: string) => Reading<number>,
): Reading<number | 'unknown'> {
  const plain = plainCharacters(text)
  const mark = MARK.exec(plain)
  const start = mark?.[0].length ?? 0
  const size = text.slice(start)
  const at = trimmedStretch(text)
  const isLimit = mark?.[1]?.toLowerCase() === 'within'
  if (/^unknown\s*$/i.test(size) && !isLimit) return { ok: true, value: 'unknown' }
  if (size.trim() === '')
    return misread('not-readable', `${quoted(text.trim())} names no uncertainty`, at, above)
  if (/^[-–]/.test(plain.slice(start)))
    return misread('negative-uncertainty', `${quoted(text.trim())} is below zero`, at, above)
  const reading = shiftReading(read(size), start)
  if (!reading.ok && reading.misread.code === 'unit-missing')
    return withoutUnit(text, start, reading.misread.suggestion, at)
  if (reading.ok && reading.value === 0) return { ...reading, warnings: [zeroWarning(text, at)] }
  return mapReading(reading, (size) => (isLimit ? size / Math.sqrt(3) : size))
}

const above = { expected: 'an uncertainty above zero, or unknown' }

function withoutUnit(text: string, start: number, suggestion: string | null, at: Stretch) {
  return misread('tolerance-without-unit', `${quoted(text.trim())} does not say in which unit`, at, {
    expected: 'the unit of the uncertainty',
    suggestion: suggestion === null ? null : text.slice(at.offset, Math.max(start, at.offset)) + suggestion,
  })
}

function zeroWarning(text: string, at: Stretch) {
  const message = `${quoted(text.trim())} states an uncertainty of zero; no measurement is exact`
  return describeMisread('zero-uncertainty', message, at, {
    expected: 'the uncertainty of the measurement, or unknown',
  })
}
