import type { Measured } from './measured.ts'
import { misread, shiftReading, trimmedStretch } from './misread.ts'
import { plainCharacters } from './plain-characters.ts'
import { quoted } from './quoted.ts'
import { readUncertainty } from './read-uncertainty.ts'
import type { Misread, Reading } from './reading.ts'
import type { Unstated } from './unstated.ts'

const TOLERANCE_MARK = /±|\+\s*\/\s*-|\+-|\bwithin\b/gi
const OMITTED: Reading<number | Unstated> = { ok: true, value: 'omitted' }

/**
 * Reads a value with its uncertainty, such as `49°34′18″ ± 1′`, `1°30′ within 5′` or `12° ± unknown`, by one
 * reader for either side; both are in the same unit.
 */
export function readMeasured(
  text: string,
  readValue: (text: string) => Reading<number>,
  readTolerance: (text: string) => Reading<number>,
): Reading<Measured> {
  const [mark, second] = [...plainCharacters(text).matchAll(TOLERANCE_MARK)]
  if (second !== undefined) return twoTolerances(text, second.index)
  const start = mark?.index ?? text.length
  const before = text.slice(0, start).replace(/,\s*$/, '')
  if (before.trim() === '')
    return misread('not-readable', `${quoted(text.trim())} states no value`, trimmedStretch(text), {
      expected: 'a value before its uncertainty',
    })
  const value = readValue(before)
  if (!value.ok) return mark === undefined ? value : withBothUnits(text, start, value.misread, readTolerance)
  const sd =
    mark === undefined ? OMITTED : shiftReading(readUncertainty(text.slice(start), readTolerance), start)
  if (!sd.ok) return sd
  const warnings = [...(value.warnings ?? []), ...(sd.warnings ?? [])]
  return { ok: true, value: { value: value.value, sd: sd.value }, warnings }
}

/** `1.5 ± 0.03` lacks two units of one kind, which are told at once. */
function withBothUnits(
  text: string,
  start: number,
  value: Misread,
  readTolerance: (text: string) => Reading<number>,
): Reading<never> {
  const alone = { ok: false as const, misread: value }
  const sd = readUncertainty(text.slice(start), readTolerance)
  if (value.code !== 'unit-missing' || value.suggestion === null || sd.ok) return alone
  if (sd.misread.code !== 'tolerance-without-unit') return alone
  const bare = plainCharacters(text.slice(0, start)).trim()
  const isOneUnit = /^[-–+]?[\d.]+$/.test(bare) && !value.suggestion.includes(' or ')
  const unit = isOneUnit ? value.suggestion.slice(bare.length) : null
  const at = trimmedStretch(text)
  if (unit === null) return alone
  const suggestion = `${value.suggestion} ${text.slice(start).trim()}${unit}`
  return misread('unit-missing', `${quoted(text.trim())} does not say its units`, at, {
    expected: `${value.expected ?? 'a value'}, with the unit of the uncertainty as well`,
    suggestion,
  })
}

function twoTolerances(text: string, start: number) {
  const at = { offset: start, length: text.trimEnd().length - start }
  return misread('several-tolerances', `${quoted(text.trim())} states more than one uncertainty`, at, {
    expected: 'one ± or one within',
  })
}
