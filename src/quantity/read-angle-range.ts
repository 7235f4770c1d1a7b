import type { AngleKind } from './angle-kind.ts'
import { misread, shiftReading, trimmedStretch } from './misread.ts'
import { plainCharacters } from './plain-characters.ts'
import { quoted } from './quoted.ts'
import { readAngle } from './read-angle.ts'
import type { Reading } from './reading.ts'

/** Reads a range of angles, such as `10′ to 1°` or `10′–1°`, in degrees; the first has to be the smaller. */
export function readAngleRange(text: string, kind: AngleKind): Reading<{ lowDeg: number; highDeg: number }> {
  const whole = trimmedStretch(text)
  const expected = 'a range such as 10′ to 1°'
  const separator = /\s+to\s+|(?<=[^\s(])\s*[-–—]\s*/i.exec(plainCharacters(text))
  const end = separator === null ? text.length : separator.index + separator[0].length
  const firstText = text.slice(0, separator?.index)
  const secondText = text.slice(end)
  if (secondText.trim() === '')
    return misread('range-missing', `${quoted(text.trim())} is not a range`, whole, { expected })
  const second = shiftReading(readAngle(secondText, kind), end)
  const first = sharedUnit(readAngle(firstText, kind), secondText)
  if (!first.ok) return first
  if (!second.ok) return second
  if (first.value < second.value) return { ok: true, value: { lowDeg: first.value, highDeg: second.value } }
  if (first.value === second.value)
    return misread('range-without-width', `${quoted(text.trim())} begins where it ends`, whole, { expected })
  return misread('range-backwards', `${quoted(text.trim())} runs backwards`, whole, {
    expected: 'the smaller angle first',
    suggestion: `${secondText.trim()} to ${firstText.trim()}`,
  })
}

/** Where the first angle has no unit, the second one's is the likely one: `10 to 30′`. */
function sharedUnit(first: Reading<number>, secondText: string): Reading<number> {
  const unit = /[°′″]$/.exec(plainCharacters(secondText).trim())?.[0]
  if (first.ok || first.misread.code !== 'unit-missing' || unit === undefined) return first
  const suggestion = first.misread.suggestion?.replace(/[°′″]$/, unit) ?? null
  return { ok: false, misread: { ...first.misread, suggestion } }
}
