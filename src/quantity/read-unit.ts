import { misread, trimmedStretch } from './misread.ts'
import { plainCharacters } from './plain-characters.ts'
import { quoted } from './quoted.ts'
import type { Reading } from './reading.ts'
import type { UnitKind } from './unit-kind.ts'

const NUMBER_AND_UNIT = /^([-–+]?)\s*(\d+(?:\.\d+)?|\.\d+)\s*(.*)$/s

/** Reads a number with its unit, such as `84.65 m`, `−5 °C` or `40 %`, into the base unit of its kind. */
export function readUnit(text: string, kind: UnitKind): Reading<number> {
  const whole = trimmedStretch(text)
  const shown = quoted(text.trim())
  const expected = `${kind.name} such as ${kind.example}`
  const match = NUMBER_AND_UNIT.exec(plainCharacters(text).trim())
  if (match === null) return misread('not-readable', `${shown} is not ${kind.name}`, whole, { expected })
  const [, sign = '', digits = '', unit = ''] = match
  if (/^,\d/.test(unit)) return commaInside(text, kind)
  if (/^(?:±|\+\s*\/\s*-|\+-|within\b)|[ \w](?:±|\+\s*\/\s*-|\+-|within\b)/i.test(unit))
    return misread('unexpected-tolerance', `${shown} states an uncertainty, which has no place here`, whole, {
      expected,
    })
  if (unit === '' && !kind.units.has(''))
    return misread('unit-missing', `${shown} is a number without a unit`, whole, {
      expected,
      suggestion: withUsualUnit(sign, digits, kind),
    })
  const value = inBase(sign, digits, unit.replace(/\s*\/\s*/, '/'), kind)
  if (Number.isNaN(value)) return misread('not-readable', `${shown} is not ${kind.name}`, whole, { expected })
  if (isWithin(value, kind)) return { ok: true, value: value === 0 ? 0 : value }
  return misread('out-of-range', `${shown} cannot be ${kind.name}`, whole, {
    expected: `${kind.name} ${kind.limits}`,
  })
}

/** The number in the likeliest unit in which it is within the limits; null where there is none. */
function withUsualUnit(sign: string, digits: string, kind: UnitKind): string | null {
  const minus = sign === '' || sign === '+' ? '' : '−'
  const isFraction = Number(digits) < 1 && Number(digits) > 0
  const isPart = isFraction && kind.usualUnit === '%'
  const number = isPart ? String(Number((Number(digits) * 100).toPrecision(12))) : digits
  const first = isFraction ? (kind.unitBelowOne ?? kind.usualUnit) : kind.usualUnit
  const unit = [first, ...(kind.otherUnits ?? [])].find((each) =>
    isWithin(inBase(minus, number, each, kind), kind),
  )
  return unit === undefined ? null : `${minus}${number} ${unit}`
}

/** NaN where the kind has no such unit. */
function inBase(sign: string, digits: string, unit: string, { units }: UnitKind): number {
  const size = Number(digits)
  return units.get(unit.toLowerCase())?.(sign === '' || sign === '+' ? size : -size) ?? Number.NaN
}

function isWithin(value: number, { low, high }: UnitKind): boolean {
  return value >= low && value <= high
}

function commaInside(text: string, kind: UnitKind): Reading<never> {
  const written = text.trim()
  const message = `${quoted(written)} has a comma inside its number`
  const asPoint = written.replace(',', '.')
  const withoutCommas = written.replaceAll(',', '')
  const manyCommas = written.split(',').length > 2
  const couldBeEither = /^\D*\d{1,3},\d{3}(?!\d)/.test(written)
  const single = couldBeEither ? `${asPoint} or ${withoutCommas}` : asPoint
  return misread('decimal-comma', message, trimmedStretch(text), {
    expected: `${kind.name} with a decimal point and no commas`,
    suggestion: manyCommas ? withoutCommas : single,
  })
}
